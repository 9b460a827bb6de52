import { execFile } from "node:child_process";
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { pathToFileURL } from "node:url";
import { promisify } from "node:util";
import * as XLSX from "@e965/xlsx";
import { a1 } from "../../taskpane/workbook/address";

export type Written = string | number | null;

/** What a cell holds after LibreOffice computed it; an error by its code. */
export type Computed = string | number | boolean | undefined | { error: string };

/**
 * Sheets of values and formulas as LibreOffice computes them. The file it is given holds no computed value, and what it
 * saves has 15 digits.
 */
export async function recalculated(
  soffice: string,
  sheets: Record<string, Written[][]>,
): Promise<Record<string, Computed[][]>> {
  const folder = mkdtempSync(join(tmpdir(), "plain-cells-"));
  try {
    const [given, saved] = [join(folder, "given.xlsx"), join(folder, "saved", "given.xlsx")];
    writeWorkbook(given, sheets);
    const profile = `-env:UserInstallation=${pathToFileURL(join(folder, "profile")).href}`;
    const args = [profile, "--headless", "--convert-to", "xlsx", "--outdir", join(folder, "saved"), given];
    await promisify(execFile)(soffice, args, { timeout: 300_000 });
    return readWorkbook(saved);
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

function writeWorkbook(path: string, sheets: Record<string, Written[][]>): void {
  const book = XLSX.utils.book_new();
  for (const [name, rows] of Object.entries(sheets)) XLSX.utils.book_append_sheet(book, sheetOf(rows), name);
  writeFileSync(path, XLSX.write(book, { type: "buffer", bookType: "xlsx" }));
}

function sheetOf(rows: Written[][]): XLSX.WorkSheet {
  const sheet: XLSX.WorkSheet = {};
  const width = Math.max(...rows.map((row) => row.length));
  rows.forEach((cells, row) =>
    cells.forEach((cell, column) => {
      if (cell !== null) sheet[a1({ row, column })] = cellOf(cell);
    }),
  );
  sheet["!ref"] = `A1:${a1({ row: rows.length - 1, column: width - 1 })}`;
  return sheet;
}

function cellOf(cell: string | number): XLSX.CellObject {
  if (typeof cell === "number") return { t: "n", v: cell };
  return cell.startsWith("=") ? { t: "n", f: cell.slice(1) } : { t: "s", v: cell };
}

function readWorkbook(path: string): Record<string, Computed[][]> {
  const { Sheets } = XLSX.read(readFileSync(path));
  return Object.fromEntries(Object.entries(Sheets).map(([name, sheet]) => [name, readSheet(sheet)]));
}

function readSheet(sheet: XLSX.WorkSheet): Computed[][] {
  const { e } = XLSX.utils.decode_range(sheet["!ref"]!);
  return Array.from({ length: e.r + 1 }, (_, row) =>
    Array.from({ length: e.c + 1 }, (_, column): Computed => {
      const cell: XLSX.CellObject | undefined = sheet[a1({ row, column })];
      return cell?.t === "e" ? { error: String(cell.w ?? cell.v) } : (cell?.v as Computed);
    }),
  );
}
