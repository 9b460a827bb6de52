import { checks, entryNamed } from "../../functions/catalogue";
import type { SheetLook, Workbook, Written } from "../workbook/workbook";
import type { FileBook, FileCell, FileSheet } from "../workbook/xlsx-book";
import { cellsIn, rangesText } from "./area";
import type { Sheet } from "./book";
import type { Fill } from "./fill";
import type { Finding } from "./finding";
import { asValue } from "./keep";
import type { Look } from "./look";
import { findingText } from "./words";

/** What readers who don't have the add-in get beside the sheets that call our functions. */
export interface ReadersCopy {
  /** Sheets to copy, under what name, and what to write over the copy from A1 on: a value for every formula. */
  copies: { of: string; name: string; values: Written[][] }[];
  /** A sheet of formulas as text, and what holds of them. */
  list: { name: string; cells: Written[][]; look: SheetLook };
}

export function readersCopy(look: Look): ReadersCopy {
  const taken = new Set(look.book.sheets.map(({ name }) => name.toLowerCase()));
  const sheets = look.book.sheets.filter(({ name }) => look.fills.some(({ sheet }) => sheet === name));
  return {
    copies: sheets.map((sheet) => ({
      of: sheet.name,
      name: freeName(`${sheet.name} values`, taken),
      values: Array.from({ length: sheet.rows }, (_, row) =>
        Array.from({ length: sheet.lengthOf(row) }, (_, column) => valueOver(sheet, row, column)),
      ),
    })),
    list: {
      name: freeName("Formulas and verdicts", taken),
      cells: listOf(look),
      look: { widths: listWidths, wrapped: look.fills.length + 1, headings: [0] },
    },
  };
}

const listWidths = [110, 150, 320, 180, 420, 320];

/** Nothing for what was typed: it is in the copy already. */
function valueOver(sheet: Sheet, row: number, column: number): Written {
  const isTyped = sheet.formula(row, column) === undefined && !sheet.isFilled(row, column);
  return isTyped ? null : asValue(sheet.value(row, column));
}

/** The values over a copy, sheet by sheet, then the list; nothing else is written to. */
export async function writeReadersCopy(workbook: Workbook, { copies, list }: ReadersCopy): Promise<string[]> {
  for (const { of, name, values } of copies) {
    await workbook.copySheet(of, name);
    await workbook.write({ sheet: name, address: "A1" }, values);
  }
  await workbook.replaceSheet(list.name, list.cells, list.look);
  return [...copies.map(({ name }) => name), list.name];
}

/** A name that no sheet has; hosts allow 31 characters. */
function freeName(wanted: string, taken: Set<string>): string {
  for (let nth = 1; ; nth++) {
    const ending = nth === 1 ? "" : ` ${nth}`;
    const name = wanted.slice(0, 31 - ending.length) + ending;
    if (taken.has(name.toLowerCase())) continue;
    taken.add(name.toLowerCase());
    return name;
  }
}

/** The same as a file: every sheet with its looks, values in place of formulas, and the list of formulas as a last sheet. */
export function readersFile(book: FileBook, look: Look): FileBook {
  const taken = new Set(book.sheets.map(({ name }) => name.toLowerCase()));
  const list: FileSheet = {
    name: freeName("Formulas and verdicts", taken),
    cells: listOf(look).map((row) => row.map((cell) => ({ value: plain(cell) }))),
    tables: [],
    widths: { ...listWidths },
    heights: {},
    merged: [],
  };
  const sheets = book.sheets.map((sheet) => ({
    ...sheet,
    tables: sheet.tables.map((table) => ({ ...table, columns: table.columns.map(({ name }) => ({ name })) })),
    cells: sheet.cells.map((row) => row?.map((cell) => cell && withoutFormula(cell))),
  }));
  return { ...book, sheets: [...sheets, list], names: [] };
}

function withoutFormula({ value, style }: FileCell): FileCell {
  return { value: plain(asValue(value)), ...(style ? { style } : {}) };
}

function plain(cell: Written): FileCell["value"] {
  return typeof cell === "object" && cell !== null ? cell.text : cell;
}

function listOf({ fills, findings }: Look): Written[][] {
  const rows = fills.map((fill) => [
    fill.sheet,
    fill.range,
    fill.text,
    [...new Set(fill.calls)].join(", "),
    verdictOf(fill, findings),
    sourcesOf(fill),
  ]);
  const heading = ["Sheet", "Cells", "Formula of the first cell", "Functions", "What holds of it", "Sources"];
  return [heading, ...rows].map((row) => row.map((text) => ({ text })));
}

/** How many rows hold, as VERDICT counts them, and what was found in the fill's cells. */
function verdictOf(fill: Fill, findings: readonly Finding[]): string {
  const { holds, marginal, fails } = fill.verdicts;
  const counts = [
    holds > 0 && `${holds} ${holds === 1 ? "holds" : "hold"}`,
    marginal > 0 && `${marginal} marginal`,
    fails > 0 && `${fails} ${fails === 1 ? "fails" : "fail"}`,
  ].filter(Boolean);
  const own = new Set(cellsIn(rangesText(fill.areas, Infinity)).map(({ row, column }) => `${row},${column}`));
  const found = findings.filter(
    ({ sheet, cells }) => sheet === fill.sheet && cellsIn(cells).some(({ row, column }) => own.has(`${row},${column}`)),
  );
  const limits = fill.calls.every(isCheck) ? "its cells say" : counts.join(", ") || "no limit was tested";
  return [limits, ...found.map(findingText)].join("; ");
}

function isCheck(name: string): boolean {
  return checks.family.entries.some((entry) => entry.name === name);
}

function sourcesOf({ calls }: Fill): string {
  const texts = [...new Set(calls)].flatMap((name) => entryNamed(name)?.sources.map(({ text }) => text) ?? []);
  return [...new Set(texts)].join("; ");
}
