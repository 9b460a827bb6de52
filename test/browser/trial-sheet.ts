import type { BrowserContextOptions, Page } from "playwright-core";
import { expect } from "vitest";
import type { CellContent, SheetContent, Workbook } from "../../taskpane/workbook/workbook";
import { openPage } from "./chromium";

declare global {
  interface Window {
    wallfallWorkbook: Workbook;
  }
}

/** The trial sheet, opened and calculated. */
export async function openTrial(path = "trial.html", options: BrowserContextOptions = {}): Promise<Page> {
  const page = await openPage(path, { viewport: { width: 1400, height: 900 }, ...options });
  await ready(page);
  return page;
}

export async function ready(page: Page): Promise<void> {
  await page.waitForFunction(() => Boolean(window.wallfallWorkbook));
  await expect.poll(() => uncalculated(page)).toBe(0);
}

async function uncalculated(page: Page): Promise<number> {
  const { sheets } = await page.evaluate(() => window.wallfallWorkbook.read());
  return sheets.flatMap(({ values, formulas }) =>
    formulas.flatMap((row, i) => row.filter((formula, j) => formula !== undefined && values[i][j] === null)),
  ).length;
}

/** Selects a cell as a reader would: its address typed into the name box. */
export async function select(page: Page, address: string): Promise<void> {
  const nameBox = page.locator("#grid input").first();
  await nameBox.fill(address);
  await nameBox.press("Enter");
  await expect.poll(() => selected(page)).toBe(address);
}

export async function selected(page: Page): Promise<string | undefined> {
  return page.evaluate(async () => (await window.wallfallWorkbook.selection())?.address);
}

/** Types into a cell, key by key, and enters it. */
export async function enter(page: Page, address: string, typed: string): Promise<void> {
  await select(page, address);
  await page.keyboard.type(typed);
  await page.keyboard.press("Enter");
}

/** What the status line says of a cell once it is selected; waits for the calculation that brings it. */
export async function expectStatus(page: Page, address: string, said: RegExp | string): Promise<void> {
  await select(page, address);
  const status = page.locator("#status");
  if (typeof said === "string") await expect.poll(() => status.innerText()).toBe(`${address} ${said}`);
  else await expect.poll(() => status.innerText()).toMatch(said);
}

export async function readSheet(page: Page, name = "Pre-clean"): Promise<SheetContent> {
  const { sheets } = await page.evaluate(() => window.wallfallWorkbook.read());
  return sheets.find((sheet) => sheet.name === name)!;
}

/** A column by its letter, from the first row of figures to the last. */
export async function column(page: Page, letter: string, first = 8, last = 47): Promise<CellContent[]> {
  const { values } = await readSheet(page);
  return values.slice(first - 1, last).map((row) => row[letter.charCodeAt(0) - 65] ?? null);
}

export async function cell(page: Page, address: string, name = "Pre-clean"): Promise<CellContent> {
  const place = { row: Number(address.slice(1)) - 1, column: address.charCodeAt(0) - 65, name };
  return page.evaluate(async ({ row, column, name }) => {
    const { sheets } = await window.wallfallWorkbook.read();
    return sheets.find((sheet) => sheet.name === name)?.values[row]?.[column] ?? null;
  }, place);
}
