/** The README's pictures, taken from the real page: npm run pictures. They are kept beside this script, as readers see them there. */
import { fileURLToPath } from "node:url";
import { chromium, type Page } from "playwright-core";
import type { Workbook } from "../../taskpane/workbook/workbook";
import { serve } from "../../taskpane/trial/serve.js";
import { findBrowser } from "../browser/find-browser";

declare global {
  interface Window {
    wallfallWorkbook: Workbook;
  }
}

const pictures: Record<string, (page: Page) => Promise<void>> = {
  "trial-sheet": async (page) => select(page, "F18"),
  "function-page": async (page) => {
    await page.locator(`#pane a[href="#SHEATHWIDTH"]`).click();
    await page.locator("#pane h1, #pane h2").first().waitFor();
  },
  "chuck-bias": async (page) => openSample(page, "Chuck bias study", "C10"),
  "heat-budget": async (page) => openSample(page, "Wall heat-load budget", "H22"),
};

const { server, origin } = await serve();
const browser = await chromium.launch(await findBrowser());
for (const [name, arrange] of Object.entries(pictures)) {
  const context = await browser.newContext({ viewport: { width: 1120, height: 640 }, colorScheme: "light" });
  const page = await context.newPage();
  await page.goto(`${origin}/trial.html`);
  await page.waitForFunction(() => Boolean(window.wallfallWorkbook));
  await arrange(page);
  // The grid draws a moment after it has calculated.
  await page.waitForTimeout(2500);
  await page.screenshot({ path: fileURLToPath(new URL(`${name}.png`, import.meta.url)) });
  await context.close();
}
await browser.close();
server.close();

async function openSample(page: Page, title: string, address: string): Promise<void> {
  await page.getByRole("button", { name: "Other workbooks" }).click();
  await page.getByRole("button", { name: title }).click();
  await page.waitForFunction(() => document.querySelector(".notice")?.textContent?.includes("is open"));
  await page.getByRole("button", { name: "Close", exact: true }).click();
  await select(page, address);
}

async function select(page: Page, address: string): Promise<void> {
  await page.locator("#grid input").first().fill(address);
  await page.locator("#grid input").first().press("Enter");
}
