import * as XLSX from "@e965/xlsx";
import { beforeAll, describe, expect, test } from "vitest";
import { look } from "../../taskpane/findings/look";
import { samples } from "../../taskpane/trial/samples/list";
import { makeSamples } from "../../taskpane/trial/samples/make";
import { fileWorkbook } from "../../taskpane/workbook/file";
import type { FileBook } from "../../taskpane/workbook/xlsx-book";
import { readBook } from "../../taskpane/workbook/xlsx-read";
import { writeBook } from "../../taskpane/workbook/xlsx-write";
import { findLibreOffice } from "../twin/find-libreoffice";
import { longBook } from "../workbooks/long-book";
import { savedByLibreOffice } from "../workbooks/libreoffice";
import { cell, enter, openTrial } from "./trial-sheet";
import { contents, notice, offer, openFile, saveCopy } from "./workbook-files";

const made = makeSamples();
const isOurs = (formula: string | undefined) => /SHEATH\./.test(formula ?? "");

/** Within what a sum in another order may differ by. */
function expectSame(found: unknown, expected: unknown, where: string): void {
  if (typeof expected !== "number") return expect(found, where).toEqual(expected);
  expect(typeof found, where).toBe("number");
  expect(Math.abs((found as number) - expected), where).toBeLessThanOrEqual(1e-12 * Math.abs(expected));
}

describe("each sample, opened, edited, saved, and opened again", () => {
  const saved: Record<string, Uint8Array> = {};

  test.each(samples)("$file keeps formulas, values, formats and tables", async ({ file, title }) => {
    const original = readBook(made[file]);
    const page = await openTrial();
    await offer(page, title);
    await expect.poll(() => notice(page).innerText()).toContain(`“${title}” is open`);
    await enter(page, "P1", "seen");
    await expect.poll(() => cell(page, "P1", original.sheets[0].name)).toBe("seen");
    const first = await saveCopy(page);
    expect(first.name).toBe(`${title}.xlsx`);
    saved[file] = first.bytes;

    const before = contents(original);
    const after = contents(first.book);
    const { [`${original.sheets[0].name}!P1`]: edit, ...rest } = after;
    expect(edit).toEqual({ value: "seen" });
    expect(Object.keys(rest).sort()).toEqual(Object.keys(before).sort());
    for (const [where, { value, ...formula }] of Object.entries(before)) {
      const { value: found, ...its } = rest[where];
      expect(its, where).toEqual(formula);
      expectSame(found, value, where);
    }
    expect(first.book.sheets.map(({ tables }) => tables)).toEqual(original.sheets.map(({ tables }) => tables));
    expect(formats(first.book)).toEqual(formats(original));

    await openFile(page, "again.xlsx", first.bytes);
    await expect.poll(() => notice(page).innerText()).toContain("“again” is open");
    const second = await saveCopy(page);
    expect(contents(second.book)).toEqual(after);
  });

  describe("by other eyes", () => {
    let opened: Record<string, Uint8Array>;

    beforeAll(async () => {
      const files = Object.entries(saved);
      const natives = files.map(([file, bytes]): [string, Uint8Array] => [
        `native-${file}`,
        onlyNatives(readBook(bytes)),
      ]);
      opened = await savedByLibreOffice(findLibreOffice(), { ...saved, ...Object.fromEntries(natives) });
    });

    test.each(samples)("LibreOffice opens $file as saved, and finds the values of its native formulas", ({ file }) => {
      const book = readBook(saved[file]);
      const whole = XLSX.read(opened[file]);
      expect(whole.SheetNames).toEqual(book.sheets.map(({ name }) => name));
      const natives = XLSX.read(opened[`native-${file}`]);
      let compared = 0;
      for (const [where, { value, formula, fills }] of Object.entries(contents(book))) {
        const [sheet, address] = where.split("!");
        // A call that fills a range shows #NAME? there, as the function itself is missing.
        if (!fills && !isOurs(formula) && !isFilled(book, sheet, address))
          expect(close(whole.Sheets[sheet][address]?.v, value), where).toBe(true);
        if (formula === undefined || isOurs(formula)) continue;
        expect(close(natives.Sheets[sheet][address]?.v, value), where).toBe(true);
        compared++;
      }
      expect(compared).toBeGreaterThan(4);
    });

    test.each(samples)("the findings of $file as saved are none", async ({ file }) => {
      const { findings, calls } = await look(await fileWorkbook(saved[file]).read());
      expect(findings).toEqual([]);
      expect(calls).toBeGreaterThan(5);
    });
  });
});

test("a workbook of 20,000 rows opens, is calculated anew, follows an edit, and is saved", async () => {
  const page = await openTrial();
  await openFile(page, "long.xlsx", longBook(20_000));
  await expect.poll(() => notice(page).innerText(), { timeout: 30_000 }).toContain("“long” is open");
  // NRL Plasma Formulary: 7.43×10² √(T/n) cm, T in eV and n in cm⁻³; row 20,001 holds 2×10¹⁵ m⁻³ and 4 eV.
  const debye = 7.43 * Math.sqrt(4 / 2e9);
  await expect.poll(() => cell(page, "C20001", "Long"), { timeout: 30_000 }).toBeCloseTo(debye, 6);
  expect(await cell(page, "D20001", "Long")).toBe(8);
  await page.evaluate(() => window.wallfallWorkbook.write({ sheet: "Long", address: "B20001" }, [[16]]));
  await expect.poll(() => cell(page, "C20001", "Long"), { timeout: 30_000 }).toBeCloseTo(2 * debye, 6);
  const { book } = await saveCopy(page);
  expect(book.sheets[0].cells[20_000]![2]!.value).toBeCloseTo(2 * debye, 6);
  expect(book.sheets[0].cells[1]![2]).toMatchObject({ fills: "C2:C20001" });
});

/** LibreOffice saves 15 digits. */
function close(found: unknown, value: unknown): boolean {
  if (typeof value !== "number" || typeof found !== "number") return found === value;
  return Math.abs(found - value) <= 1e-13 * Math.abs(value);
}

function isFilled(book: FileBook, name: string, address: string): boolean {
  const { cells } = book.sheets.find((sheet) => sheet.name === name)!;
  return cells.some((row) =>
    row?.some(({ fills } = { value: null }) => fills && XLSX.utils.decode_range(fills) && inside(fills, address)),
  );
}

function inside(range: string, address: string): boolean {
  const { s, e } = XLSX.utils.decode_range(range);
  const { r, c } = XLSX.utils.decode_cell(address);
  return r >= s.r && r <= e.r && c >= s.c && c <= e.c;
}

/** The book with our calls as mere values and without any result of the others: who opens it must compute them. */
function onlyNatives(book: FileBook): Uint8Array {
  const sheets = book.sheets.map((sheet) => ({
    ...sheet,
    cells: sheet.cells.map((row) =>
      row?.map((cell) => {
        if (!cell?.formula) return cell;
        return isOurs(cell.formula) ? { value: cell.value, style: cell.style } : { ...cell, value: null };
      }),
    ),
    tables: sheet.tables.map((table) => ({ ...table, columns: table.columns.map(({ name }) => ({ name })) })),
  }));
  return writeBook({ ...book, sheets });
}

/** The number formats of typed and calculated cells. */
function formats({ sheets, styles }: FileBook): (string | undefined)[] {
  return sheets.flatMap(({ cells }) =>
    cells.flatMap((row) =>
      (row ?? []).flatMap((cell) => (typeof cell?.value === "number" ? [styles[cell.style ?? 0].format] : [])),
    ),
  );
}
