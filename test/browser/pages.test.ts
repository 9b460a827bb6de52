import { describe, expect, inject, test } from "vitest";
import { browser, openPage } from "./chromium";

interface Declared {
  functions: { id: string }[];
}

test("the functions' own page binds every function of functions.json, with no right but to run its own scripts", async () => {
  const page = await openPage("functions.html");
  const bound = await page.evaluate(() => Object.keys((globalThis as any).CustomFunctions._association.mappings));
  const declared: Declared = await (await fetch(`${inject("origin")}/functions.json`)).json();
  expect(declared.functions.length).toBeGreaterThan(0);
  expect(bound.sort()).toEqual(declared.functions.map(({ id }) => id).sort());
});

test("in a plain browser the host library says at once that there is no host, and sends nothing out", async () => {
  const page = await openPage("taskpane.html");
  const { host } = await page.evaluate(() => (globalThis as any).Office.onReady());
  expect(host).toBeNull();
  // What the library ships for this case opens its telemetry frame three seconds after it loads.
  await page.waitForTimeout(3500);
  expect(page.frames()).toHaveLength(1);
});

/** How a host introduces itself to the library, read off the loader in office.js: name, platform, version, language. */
const hosts = ["Excel$Web$16.00$en-US$id$$", "Excel|Win32|16.01|en-US|id||", "Excel|Mac|16.00|en-US|id||"];

describe.each(hosts)("a page opened by %s", (host) => {
  test.each(["taskpane.html", "functions.html"])("gets every file that the host library asks for: %s", async (path) => {
    const { found, missing } = await askedFor(path, host);
    expect(missing).toEqual([]);
    expect(found.filter((file) => /^\/excel-.*\.js$/.test(file))).toHaveLength(1);
  });
});

test("in another language the host library falls back to its English messages", async () => {
  const { found, missing } = await askedFor("taskpane.html", "Excel|Win32|16.01|de-DE|id||");
  expect(missing).toEqual(["/de-de/office_strings.js"]);
  expect(found).toContain("/en-us/office_strings.js");
});

/** What a page asks for when a host seems to open it. No host answers, so what happens after that is not looked at. */
async function askedFor(path: string, host: string): Promise<{ found: string[]; missing: string[] }> {
  const context = await (await browser()).newContext();
  const page = await context.newPage();
  const found: string[] = [];
  const missing: string[] = [];
  page.on("response", (response) => (response.ok() ? found : missing).push(new URL(response.url()).pathname));
  const english = page.waitForResponse(/en-us\/office_strings\.js$/);
  await page.goto(`${inject("origin")}/${path}?_host_Info=${encodeURIComponent(host)}`);
  await english;
  await page.waitForLoadState("networkidle");
  await context.close();
  return { found, missing };
}
