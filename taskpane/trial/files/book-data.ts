import {
  BooleanNumber,
  CellValueType,
  LocaleType,
  type ICellData,
  type IWorkbookData,
  type IWorksheetData,
} from "@univerjs/core";
import { cornersOf } from "../../workbook/address";
import type { FileBook, FileCell, FileName, FileSheet } from "../../workbook/xlsx-book";
import { filledBy } from "../../workbook/xlsx-read";
import type { SheetTable } from "../grid/tables";
import { gridStyle } from "./styles";

/** A book as the grid takes it, and what the grid can't hold beside it. */
export interface GridBook {
  data: IWorkbookData;
  tables: SheetTable[];
}

/** Every book has an id of its own: the grid keeps much by it, and would mix two of the same. */
export function newBookId(): string {
  return `book-${Date.now().toString(36)}-${Math.random().toString(36).slice(2, 8)}`;
}

/** A book read from a file. */
export function toGridBook({ sheets, names, styles }: FileBook, title: string): GridBook {
  const id = newBookId();
  const ids = sheets.map((_, i) => `${id}-${i + 1}`);
  // Cells name their style by its place.
  const looks = Object.fromEntries(styles.map((style, i) => [`s${i}`, gridStyle(style)]));
  return {
    data: {
      id,
      name: title,
      appVersion: "",
      locale: LocaleType.EN_US,
      styles: looks,
      sheetOrder: ids,
      sheets: Object.fromEntries(sheets.map((sheet, i) => [ids[i], sheetData(sheet, ids[i])])),
      resources: [{ name: "SHEET_DEFINED_NAME_PLUGIN", data: JSON.stringify(definedNames(names, sheets, ids)) }],
    },
    tables: sheets.flatMap(({ tables }, i) => tables.map((table) => ({ ...table, sheetId: ids[i] }))),
  };
}

function sheetData(sheet: FileSheet, id: string): Partial<IWorksheetData> {
  const filled = filledBy(sheet);
  const cellData: Record<number, Record<number, ICellData>> = {};
  let columns = 0;
  sheet.cells.forEach((cells, row) => {
    const written: Record<number, ICellData> = {};
    cells?.forEach((cell, column) => {
      if (!cell) return;
      written[column] = cellOfGrid(cell, filled.has(`${row},${column}`));
      columns = Math.max(columns, column + 1);
    });
    cellData[row] = written;
  });
  const { rows = 0, columns: left = 0 } = sheet.frozen ?? {};
  return {
    id,
    name: sheet.name,
    hidden: sheet.hidden ? BooleanNumber.TRUE : BooleanNumber.FALSE,
    cellData,
    rowCount: Math.max(200, sheet.cells.length + 50),
    columnCount: Math.max(26, columns + 8),
    defaultColumnWidth: 88,
    defaultRowHeight: 22,
    columnData: mapped(sheet.widths, (w) => ({ w })),
    rowData: mapped(sheet.heights, (h) => ({ h, ia: BooleanNumber.FALSE })),
    mergeData: sheet.merged.map((range) => {
      const { from, to } = cornersOf(range);
      return { startRow: from.row, startColumn: from.column, endRow: to.row, endColumn: to.column };
    }),
    ...(rows || left ? { freeze: { ySplit: rows, startRow: rows || -1, xSplit: left, startColumn: left || -1 } } : {}),
  };
}

function mapped<T>(sizes: Readonly<Record<number, number>>, make: (size: number) => T): Record<number, T> {
  return Object.fromEntries(Object.entries(sizes).map(([at, size]) => [at, make(size)]));
}

/** What a formula fills is left to the formula: a value of its own would be in the way. */
function cellOfGrid({ value, formula, style }: FileCell, isFilled: boolean): ICellData {
  const look = style ? { s: `s${style}` } : {};
  if (isFilled && formula === undefined) return look;
  return { ...look, ...(formula === undefined ? {} : { f: formula }), ...valueOfGrid(value) };
}

function valueOfGrid(value: FileCell["value"]): ICellData {
  if (value === null) return {};
  if (typeof value === "object") return { v: value.error, t: CellValueType.STRING };
  if (typeof value === "boolean") return { v: value ? 1 : 0, t: CellValueType.BOOLEAN };
  return { v: value, t: typeof value === "number" ? CellValueType.NUMBER : CellValueType.STRING };
}

/** As the grid keeps defined names; one that every sheet knows has this in place of a sheet. */
export const everySheet = "AllDefaultWorkbook";

function definedNames(names: readonly FileName[], sheets: readonly FileSheet[], ids: readonly string[]) {
  return Object.fromEntries(
    names.map(({ name, refers, sheet }, i) => {
      const at = sheets.findIndex((each) => each.name === sheet);
      const id = `name-${i + 1}`;
      return [id, { id, name, formulaOrRefString: refers, localSheetId: at < 0 ? everySheet : ids[at] }];
    }),
  );
}
