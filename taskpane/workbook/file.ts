/** A saved workbook behind the pane's interface: it is read, and never changed. */
import { strFromU8, unzipSync } from "fflate";
import { a1, cornersOf } from "./address";
import { noWorkbook } from "./none";
import type { SheetContent, Workbook, WorkbookContent } from "./workbook";
import { FileProblem, type FileBook, type FileSheet, type FileTable } from "./xlsx-book";
import { readBook } from "./xlsx-read";
import { childrenOf, parseXml, type Element } from "./xml";

/** The workbook in a file's bytes; throws a FileProblem that says what to do where there is none. */
export function fileWorkbook(bytes: Uint8Array): Workbook {
  const book = readBook(bytes);
  if (book.leftOut.includes("macros"))
    throw new FileProblem(
      "The file carries macros, and what they would change can't be told. Save a copy without them as .xlsx.",
    );
  return {
    ...noWorkbook,
    capabilities: new Set(["read"]),
    read: async (progress) => {
      progress?.(1);
      return contentOf(book);
    },
    getSetting: async (key) => settings(bytes).get(`wallfall.${key}`),
  };
}

export function contentOf({ sheets, names }: FileBook): WorkbookContent {
  return {
    sheets: sheets.map(sheetContent),
    names: Object.fromEntries(names.map(({ name, refers, sheet }) => [sheet ? `${sheet}!${name}` : name, refers])),
  };
}

const none: never[] = [];

/** Rows are as long as their own last cell: a cell far out must not make a million rows wide. */
function sheetContent({ name, cells, tables }: FileSheet): SheetContent {
  const rows = Array.from(cells, (row) => row ?? none);
  return {
    name,
    origin: "A1",
    values: rows.map((row) => Array.from(row, (cell) => cell?.value ?? null)),
    formulas: rows.map((row) => Array.from(row, (cell) => cell?.formula)),
    spills: rows.flatMap((row, i) =>
      row.flatMap((cell, j) => (cell?.fills ? [{ anchor: a1({ row: i, column: j }), range: cell.fills }] : [])),
    ),
    tables: tables.map((table) => ({
      name: table.name,
      range: withoutTotals(table),
      columns: table.columns.map((column) => column.name),
    })),
  };
}

function withoutTotals({ range, totalsRow }: FileTable): string {
  if (!totalsRow) return range;
  const { from, to } = cornersOf(range);
  return `${a1(from)}:${a1({ ...to, row: to.row - 1 })}`;
}

/** Settings that the add-in kept in the workbook: properties of its web extension part, each a JSON text ([MS-OWEXML], from memory). */
function settings(bytes: Uint8Array): Map<string, string> {
  const parts = unzipSync(bytes, { filter: ({ name }) => /^xl\/webextensions\/webextension\d*\.xml$/i.test(name) });
  const properties = Object.values(parts).flatMap((part) => propertiesIn(parseXml(strFromU8(part))));
  return new Map(properties.map(({ attributes: { name, value } }) => [name, unquoted(value)]));
}

function propertiesIn(extension: Element): Element[] {
  return childrenOf(extension, "properties").flatMap((list) => childrenOf(list, "property"));
}

function unquoted(value: string): string {
  try {
    const text: unknown = JSON.parse(value);
    return typeof text === "string" ? text : value;
  } catch {
    return value;
  }
}
