/**
 * What a reader of the trial sheet waits for, in a real browser with nothing cached. Times are upper bounds: to see a cell
 * from here, the whole workbook is read.
 */
import { chromium, type Page } from "playwright-core";
import type { Workbook } from "../../taskpane/workbook/workbook";
import { serve } from "../../taskpane/trial/serve.js";
import { findBrowser } from "../browser/find-browser";
import { longBook } from "../workbooks/long-book";
import { median, type Row } from "./measure";

declare global {
  interface Window {
    wallfallWorkbook: Workbook;
    /** Lengths of the blocks in which the page answered nobody, ms. */
    blocks: number[];
  }
}

const rounds = 3;

export async function trial(): Promise<Row[]> {
  const [{ server, origin }, browser] = [await serve(), await chromium.launch(await findBrowser())];
  try {
    const found: Record<string, number[]> = {};
    for (let round = 0; round < rounds; round++) {
      const page = await (await browser.newContext({ viewport: { width: 1400, height: 900 } })).newPage();
      for (const [what, value] of Object.entries(await visit(page, `${origin}/trial.html`)))
        (found[what] ??= []).push(value);
      await page.context().close();
    }
    return Object.entries(found).map(([what, values]) => ({ what, value: median(values), unit: "ms" }));
  } finally {
    await browser.close();
    server.close();
  }
}

async function visit(page: Page, address: string): Promise<Record<string, number>> {
  await page.addInitScript(() => {
    window.blocks = [];
    new PerformanceObserver((list) => window.blocks.push(...list.getEntries().map(({ duration }) => duration))).observe(
      {
        type: "longtask",
        buffered: true,
      },
    );
  });
  const start = performance.now();
  await page.goto(address);
  await page.waitForFunction(() => Boolean(window.wallfallWorkbook));
  const loaded = performance.now() - start;
  await page.locator("#grid input").first().fill("N8");
  await page.locator("#grid input").first().press("Enter");
  await page.keyboard.type("7");
  await page.keyboard.press("Enter");
  await until(page, { sheet: "Pre-clean", row: 7, column: 13 }, (value) => value === 7);
  const firstKey = performance.now() - start;
  const edited = await timed(page, () => edit(page, "E8", 5, { sheet: "Pre-clean", row: 7, column: 5 }));
  const opened = await timed(page, () => openLong(page));
  const followed = await timed(page, () => edit(page, "B2", 16, { sheet: "Long", row: 1, column: 2 }));
  return {
    "Page loaded, nothing cached": loaded,
    "First value typed stands in its cell, from the start": firstKey,
    "Edit to filled column, 40 rows, opening example": edited.took,
    "20,000 rows: file chosen to all calculated": opened.took,
    "20,000 rows: longest block of the page while it opens": opened.block,
    "20,000 rows: edit to filled column": followed.took,
    "20,000 rows: longest block of the page after an edit": followed.block,
  };
}

async function timed(page: Page, act: () => Promise<void>): Promise<{ took: number; block: number }> {
  await page.waitForTimeout(1500);
  await page.evaluate(() => void (window.blocks.length = 0));
  const start = performance.now();
  await act();
  const took = performance.now() - start;
  await page.waitForTimeout(500);
  return { took, block: await page.evaluate(() => Math.max(0, ...window.blocks)) };
}

interface Place {
  sheet: string;
  row: number;
  column: number;
}

/** Writes into a cell, until what a call fills in its row has changed: the call fills all of its column at once. */
async function edit(page: Page, address: string, value: number, filled: Place): Promise<void> {
  const before = await read(page, filled);
  await page.evaluate(({ sheet, address, value }) => window.wallfallWorkbook.write({ sheet, address }, [[value]]), {
    sheet: filled.sheet,
    address,
    value,
  });
  await until(page, filled, (after) => after !== before);
}

/** Until the last row shows a positive number: what the file held was none. */
async function openLong(page: Page): Promise<void> {
  const buffer = Buffer.from(longBook(20_000));
  await page.locator("input[type=file]").setInputFiles({ name: "long.xlsx", mimeType: "application/zip", buffer });
  await page.waitForFunction(() => document.querySelector(".notice")?.textContent?.includes("is open"));
  await until(page, { sheet: "Long", row: 20_000, column: 2 }, (value) => Number(value) > 0);
}

async function until(page: Page, place: Place, holds: (value: unknown) => boolean): Promise<void> {
  const end = performance.now() + 60_000;
  while (!holds(await read(page, place))) {
    if (performance.now() > end) throw new Error(`${place.sheet}: row ${place.row + 1} did not follow within a minute`);
    await page.waitForTimeout(20);
  }
}

async function read(page: Page, place: Place): Promise<unknown> {
  return page.evaluate(
    async ({ sheet, row, column }) =>
      (await window.wallfallWorkbook.read()).sheets.find(({ name }) => name === sheet)?.values[row]?.[column],
    place,
  );
}
