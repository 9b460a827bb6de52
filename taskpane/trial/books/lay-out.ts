import { CellValueType, LocaleType, type ICellData, type IWorkbookData, type IWorksheetData } from "@univerjs/core";
import { columnLetters } from "../../workbook/address";
import { looksFor, type Look } from "./looks";
import type { Addresses, CellValue, Column, OpeningSheet, Setting } from "./opening-sheet";

/** The workbook that the grid opens with. */
export function layOut(sheets: readonly OpeningSheet[], dark: boolean): IWorkbookData {
  const looks = looksFor(dark);
  const ids = sheets.map((_, i) => `sheet-${i + 1}`);
  return {
    id: "trial",
    name: "Trial",
    appVersion: "",
    locale: LocaleType.EN_US,
    styles: {},
    sheetOrder: ids,
    sheets: Object.fromEntries(sheets.map((sheet, i) => [ids[i], layOutSheet(ids[i], sheet, looks)])),
  };
}

/** Rows from 0: the title, two lines of text, settings, then the tables with three or four rows of heading. */
const settingsRow = 3;
const settingsInARow = 4;
const titleHeight = 30;
const headingHeight = 36;
const columnWidth = 74;
/** Room for the twelve digits that the grid shows of a number without a format of its own. */
const spareColumnWidth = 100;
const rowHeight = 22;

function rowsOf(sheet: OpeningSheet) {
  const group = settingsRow + Math.ceil(sheet.settings.length / settingsInARow);
  const band = group + (sheet.columns.some((column) => column.group) ? 1 : 0);
  return { group, band, heading: band + 1, unit: band + 2, first: band + 3, last: band + 2 + sheet.rows };
}

type Looks = ReturnType<typeof looksFor>;

function layOutSheet(id: string, sheet: OpeningSheet, looks: Looks): Partial<IWorksheetData> {
  const { heading, first, last } = rowsOf(sheet);
  return {
    id,
    name: sheet.name,
    cellData: cellsOf(sheet, looks),
    rowCount: Math.max(200, last + 50),
    columnCount: Math.max(26, sheet.columns.length + 8),
    defaultColumnWidth: spareColumnWidth,
    defaultRowHeight: rowHeight,
    defaultStyle: looks.words,
    rowData: { 0: { h: titleHeight, ia: 0 }, [heading]: { h: headingHeight, ia: 0 } },
    columnData: Object.fromEntries(sheet.columns.map(({ width }, i) => [i, { w: width ?? columnWidth }])),
    rowHeader: { width: 40 },
    freeze: { startRow: first, ySplit: first, startColumn: -1, xSplit: 0 },
  };
}

/** Cells by row and column. */
class Cells {
  readonly data: Record<number, Record<number, ICellData>> = {};

  constructor(private readonly looks: Looks) {}

  put(row: number, column: number, look: Look, content?: CellValue, pattern?: string): void {
    const s = pattern ? { ...this.looks[look], n: { pattern } } : this.looks[look];
    (this.data[row] ??= {})[column] = { s, ...contentOf(content) };
  }
}

function contentOf(content: CellValue | undefined): ICellData {
  if (content === undefined) return {};
  if (typeof content === "string")
    return content.startsWith("=") ? { f: content } : { v: content, t: CellValueType.STRING };
  if (typeof content === "boolean") return { v: content ? 1 : 0, t: CellValueType.BOOLEAN };
  return { v: content, t: CellValueType.NUMBER };
}

function cellsOf(sheet: OpeningSheet, looks: Looks): Cells["data"] {
  const cells = new Cells(looks);
  for (let row = 0; row < rowsOf(sheet).band; row++) sheet.columns.forEach((_, at) => cells.put(row, at, "head"));
  cells.put(0, 0, "title", sheet.title);
  sheet.about.forEach((line, i) => cells.put(1 + i, 0, "about", line));
  sheet.settings.forEach((_, i) => putSetting(cells, sheet, i));
  sheet.columns.forEach((_, at) => putColumn(cells, sheet, at));
  return cells.data;
}

/** A label reaches to the left over an empty cell, its value stands at its right: three columns for each setting. */
function settingCell(i: number): [row: number, column: number] {
  return [settingsRow + Math.floor(i / settingsInARow), 3 * (i % settingsInARow) + 3];
}

function putSetting(cells: Cells, sheet: OpeningSheet, i: number): void {
  const { label, value, format } = sheet.settings[i];
  const [row, column] = settingCell(i);
  cells.put(row, column - 1, "label", label);
  const isWords = format === "words";
  if (typeof value === "function")
    cells.put(row, column, isWords ? "words" : "calculated", value(inRows(sheet, 0)), isWords ? undefined : format);
  else cells.put(row, column, "typed", value, format);
}

function putColumn(cells: Cells, sheet: OpeningSheet, at: number): void {
  const column = sheet.columns[at];
  if (column.gap) return;
  const { group, band, heading, unit, first } = rowsOf(sheet);
  if (column.group) cells.put(group, at, "group", column.group);
  cells.put(band, at, "band", bandOver(sheet.columns, at));
  cells.put(heading, at, column.format === "words" ? "wordsHeading" : "heading", column.heading);
  cells.put(unit, at, "unit", column.unit);
  for (let i = 0; i < rowsIn(sheet, column); i++) {
    const { look, pattern } = lookInRow(column, i);
    cells.put(first + i, at, look, contentInRow(sheet, column, i), pattern);
  }
}

function lookInRow({ titled, typed, format }: Column, i: number): { look: Look; pattern?: string } {
  if (titled && i === 0) return { look: "heading" };
  const own = typeof format === "function" ? format(i) : format;
  const isWords = own === "words";
  return { look: typed ? "typed" : isWords ? "words" : "calculated", pattern: isWords ? undefined : own };
}

/** The word over the first of neighbouring columns that are all typed or all calculated. */
function bandOver(columns: readonly Column[], at: number): string | undefined {
  const isTyped = (i: number) => columns[i]?.typed !== undefined;
  if (at > 0 && !columns[at - 1].gap && isTyped(at) === isTyped(at - 1)) return undefined;
  return isTyped(at) ? "Typed in" : "Calculated";
}

function rowsIn(sheet: OpeningSheet, { rows }: Column): number {
  return rows ?? sheet.rows;
}

function contentInRow(sheet: OpeningSheet, column: Column, i: number): CellValue | undefined {
  if (column.typed) return column.typed[i];
  const own = column.each?.(inRow(sheet, i), i, (other) => inRow(sheet, other), inRows(sheet, 0));
  if (own !== undefined) return own;
  const every = column.every ?? rowsIn(sheet, column);
  return column.fills && i % every === 0 ? column.fills(inRows(sheet, i, column.every)) : undefined;
}

/** The cells of one row. */
function inRow(sheet: OpeningSheet, i: number): Addresses {
  return addresses(sheet, (letter, first) => `${letter}${first + i}`);
}

/** The columns as ranges: so many of their rows, or all. */
function inRows(sheet: OpeningSheet, from: number, count?: number): Addresses {
  return addresses(sheet, (letter, first, rows) => {
    const start = first + from;
    return `${letter}${start}:${letter}${start + (count ?? rows) - 1}`;
  });
}

function addresses(sheet: OpeningSheet, ofColumn: (letter: string, first: number, rows: number) => string): Addresses {
  const { first } = rowsOf(sheet);
  const columns = sheet.columns.map((column, at) => [
    column.key,
    ofColumn(columnLetters(at), first + 1, rowsIn(sheet, column)),
  ]);
  return { ...Object.fromEntries(columns), ...settingAddresses(sheet.settings) };
}

function settingAddresses(settings: readonly Setting[]): Addresses {
  return Object.fromEntries(
    settings.map(({ key }, i) => {
      const [row, column] = settingCell(i);
      return [key, `$${columnLetters(column)}$${row + 1}`];
    }),
  );
}
