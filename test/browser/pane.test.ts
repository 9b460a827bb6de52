import type { Page } from "playwright-core";
import { describe, expect, inject, test } from "vitest";
import { catalogue } from "../../functions/catalogue";
import { violations } from "./accessibility";
import { openPage } from "./chromium";

const names = catalogue.map(({ name }) => name);

/** Follows an address inside the pane, as a link does. */
async function go(page: Page, address: string): Promise<void> {
  await page.evaluate((hash) => (location.hash = hash), address);
  const shown = address === "" ? ".functions" : `.page[data-function="${address}"]`;
  await page.locator(shown).first().waitFor();
}

describe.each(["light", "dark"] as const)("in %s", (colorScheme) => {
  test.each([320, 800])("every page is accessible and fits into %i px", { timeout: 300_000 }, async (width) => {
    const page = await openPage("taskpane.html", { colorScheme, viewport: { width, height: 900 } });
    for (const address of ["", ...names]) {
      await go(page, address);
      expect(await violations(page), address).toEqual([]);
      const overhang = await page.evaluate(() => document.documentElement.scrollWidth - innerWidth);
      expect(overhang, `#${address} is wider than the window`).toBeLessThanOrEqual(0);
    }
  });
});

test("every function's help link opens its page, whose example gives a result", { timeout: 300_000 }, async () => {
  const page = await openPage("taskpane.html");
  const links = await helpLinks(page);
  for (const { name, equation } of catalogue) {
    await page.goto("about:blank");
    await page.goto(links.get(name)!);
    await page.locator(`.page[data-function="${name}"]`).waitFor();
    expect(await page.locator("h2").first().textContent()).toBe(name);
    expect(await page.locator(".page .problem").allTextContents(), name).toEqual([]);
    expect(await page.locator(".outcome").innerText(), name).toMatch(/\S/);
    expect(await page.locator(".lead").innerText(), name).toMatch(/\S/);
    expect((await page.locator(".equation math").count()) > 0, name).toBe(equation !== "");
    for (const math of await page.locator(".equation math").all())
      expect((await math.boundingBox())!.height).toBeGreaterThan(4);
  }
});

test("equations are set in the font that comes with the build", async () => {
  const page = await openPage("taskpane.html#DEBYELENGTH");
  await page.locator(".equation math").first().waitFor();
  const loaded = await page.evaluate(async () => {
    await document.fonts.ready;
    return [...document.fonts]
      .filter(({ status }) => status === "loaded")
      .map(({ family }) => family.replaceAll('"', ""));
  });
  expect(loaded).toEqual(["STIX Two Math"]);
});

test("Tab goes through a page in reading order: views, back, inputs, unit, button, sweep, equation", async () => {
  const page = await openPage("taskpane.html#DEBYELENGTH");
  await page.locator(".page").waitFor();
  const stops: string[] = [];
  for (let i = 0; i < 10; i++) {
    await page.keyboard.press("Tab");
    stops.push(
      await page.evaluate(
        () => document.activeElement!.id || document.activeElement!.className || document.activeElement!.textContent!,
      ),
    );
  }
  expect(stops).toEqual([
    "Functions",
    "Findings",
    "back",
    "wallfall-input-n_e",
    "wallfall-input-T_e",
    "wallfall-input-T_i",
    "wallfall-unit",
    "Copy formula",
    "Sweep an input",
    "equation",
  ]);
});

test("every stop shows where the focus is, and nothing covers it", async () => {
  const page = await openPage("taskpane.html#WALLHEATFLUX", { viewport: { width: 320, height: 700 } });
  await page.locator(".page").waitFor();
  const focused = () =>
    page.evaluate(() => {
      const element = document.activeElement!;
      if (element === document.body) return undefined;
      const { left, top, height } = element.getBoundingClientRect();
      const on = element.contains(document.elementFromPoint(left + 6, top + height / 2));
      return { name: element.id || element.className, outline: getComputedStyle(element).outlineStyle, on };
    });
  let stops = 0;
  await page.keyboard.press("Tab");
  for (let stop = await focused(); stop; stop = await focused()) {
    expect(stop).toMatchObject({ outline: "solid", on: true });
    stops++;
    await page.keyboard.press("Tab");
  }
  expect(stops).toBeGreaterThan(10);
});

test("the keyboard alone searches, opens a function, and comes back to where it was", async () => {
  const page = await openPage("taskpane.html");
  await page.locator("#wallfall-search").waitFor();
  // Past the two views to the search.
  for (let i = 0; i < 3; i++) await page.keyboard.press("Tab");
  await page.keyboard.type("debye");
  await page.keyboard.press("ArrowDown");
  const first = await page.evaluate(() => document.activeElement!.getAttribute("href"));
  expect(first).toBe("#DEBYELENGTH");
  await page.keyboard.press("Enter");
  await page.locator(".page").waitFor();
  expect(await page.evaluate(() => document.activeElement!.textContent)).toBe("DEBYELENGTH");
  await page.keyboard.press("Shift+Tab");
  await page.keyboard.press("Enter");
  await page.locator(".functions").waitFor();
  expect(await page.evaluate(() => document.activeElement!.getAttribute("href"))).toBe("#DEBYELENGTH");
  expect(await page.locator("#wallfall-search").inputValue()).toBe("debye");
});

// NRL Plasma Formulary: 743 cm √(T/n), n in cm⁻³: 7.43 µm √3 at 10¹² cm⁻³ and 3 eV.
test("a value typed with a unit is computed at once, and refused with a message where it can't be", async () => {
  const page = await openPage("taskpane.html#DEBYELENGTH");
  await page.locator("#wallfall-input-n_e").fill("1e12 cm^-3");
  await page.locator("#wallfall-unit").selectOption("um");
  await page.waitForFunction(() => document.querySelector(".formula")!.textContent!.includes("um"));
  expect(parseFloat(await page.locator(".value").innerText())).toBeCloseTo(7.43 * Math.sqrt(3), 1);
  await page.locator("#wallfall-input-n_e").fill("1e12 kg");
  await page.locator(".outcome .problem").waitFor();
  expect(await page.locator(".outcome .problem").innerText()).toMatch(/#VALUE!\s+n_e: /);
});

test("a plain page copies the formula", async () => {
  const page = await openPage("taskpane.html#DEBYELENGTH", { permissions: ["clipboard-read", "clipboard-write"] });
  await page.getByRole("button", { name: "Copy formula" }).click();
  await page.getByText("Copied: paste it").waitFor();
  expect(await page.evaluate(() => navigator.clipboard.readText())).toBe("=SHEATH.DEBYELENGTH(1E16,3)");
});

/** Where functions.json sends the reader of each function, on the server of this test. */
async function helpLinks(page: Page): Promise<Map<string, string>> {
  const answer = await page.request.get(`${inject("origin")}/functions.json`);
  const { functions } = (await answer.json()) as { functions: { name: string; helpUrl: string }[] };
  return new Map(
    functions.map(({ name, helpUrl }) => {
      const { pathname, hash } = new URL(helpUrl);
      return [name, inject("origin") + pathname + hash];
    }),
  );
}
