import { readFileSync } from "node:fs";
import type { Page } from "playwright-core";
import { expect } from "vitest";
import type { FileBook, FileCell } from "../../taskpane/workbook/xlsx-book";
import { readBook } from "../../taskpane/workbook/xlsx-read";
import { a1 } from "../../taskpane/workbook/address";

export const notice = (page: Page) => page.locator(".notice [role=status]");
export const keeping = (page: Page) => page.locator(".keeping");

/** Opens a file as chosen from disk. */
export async function openFile(page: Page, name: string, bytes: Uint8Array): Promise<void> {
  await page
    .locator("input[type=file]")
    .setInputFiles({ name, mimeType: "application/octet-stream", buffer: Buffer.from(bytes) });
}

/** What is offered under "Other workbooks". */
export async function offer(page: Page, name: string | RegExp): Promise<void> {
  await page.getByRole("button", { name: "Other workbooks" }).click();
  await page.locator("#more").getByRole("button", { name }).first().click();
}

/** The copy that the page hands to the browser, and its name. */
export async function saveCopy(page: Page): Promise<{ name: string; bytes: Uint8Array; book: FileBook }> {
  const [download] = await Promise.all([
    page.waitForEvent("download"),
    page.getByRole("button", { name: "Save a copy" }).click(),
  ]);
  const bytes = new Uint8Array(readFileSync(await download.path()));
  return { name: download.suggestedFilename(), bytes, book: readBook(bytes) };
}

/** Waits until the work is stored. */
export async function kept(page: Page): Promise<void> {
  await expect.poll(() => keeping(page).innerText(), { timeout: 15_000 }).toBe("Kept in this browser");
}

/** All cells that hold anything, by sheet and address; without their looks. */
export function contents({ sheets }: FileBook): Record<string, Omit<FileCell, "style">> {
  return Object.fromEntries(
    sheets.flatMap(({ name, cells }) =>
      cells.flatMap((row, i) =>
        (row ?? []).flatMap((cell, column) => {
          if (!cell || (cell.value === null && !cell.formula)) return [];
          const { value, formula, fills } = cell;
          const content = { value, ...(formula && { formula }), ...(fills && { fills }) };
          return [[`${name}!${a1({ row: i, column })}`, content]];
        }),
      ),
    ),
  );
}
