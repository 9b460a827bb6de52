import { CellValueType, type ICellData, type IObjectMatrixPrimitiveType, type Nullable } from "@univerjs/core";
import {
  ERROR_TYPE_SET,
  ErrorType,
  type FormulaDataModel,
  type FWorkbook,
  type FWorksheet,
} from "@univerjs/preset-sheets-core";
import { a1, type Cell } from "../../workbook/address";
import type { CellContent, SheetContent } from "../../workbook/workbook";
import type { Messages } from "./messages";
import { namespace } from "./sheath-function";

/** What the grid's cells hold, with the parts that it keeps apart put together: spilled values, formulas, messages. */
export class Contents {
  constructor(
    private readonly workbook: FWorkbook,
    private readonly formulas: FormulaDataModel,
    private readonly messages: Messages,
  ) {}

  value(sheet: FWorksheet, cell: Cell): CellContent {
    const own = sheet.getSheet().getCellRaw(cell.row, cell.column);
    const spilled = this.spilledCells(sheet)?.[cell.row]?.[cell.column];
    const value = plainValue(isEmpty(own) ? spilled : own);
    return isErrorCode(value) ? { error: value, message: this.message(sheet, cell, value) } : value;
  }

  formula(sheet: FWorksheet, { row, column }: Cell): string | undefined {
    const { f, si } = sheet.getSheet().getCellRaw(row, column) ?? {};
    if (!f && !si) return undefined;
    return this.formulas.getFormulaStringByCell(row, column, sheet.getSheetId(), this.workbook.getId()) ?? undefined;
  }

  isFilled(sheet: FWorksheet, cell: Cell): boolean {
    return this.formula(sheet, cell) !== undefined || this.value(sheet, cell) !== null;
  }

  spills(sheet: FWorksheet): SheetContent["spills"] {
    return this.spilledRanges(sheet).map(({ startRow, startColumn, endRow, endColumn }) => {
      const anchor = a1({ row: startRow, column: startColumn });
      return { anchor, range: `${anchor}:${a1({ row: endRow, column: endColumn })}` };
    });
  }

  /** The cell whose formula filled this one with its value. */
  filledFrom(sheet: FWorksheet, { row, column }: Cell): string | undefined {
    const range = this.spilledRanges(sheet).find(
      ({ startRow, startColumn, endRow, endColumn }) =>
        row >= startRow && row <= endRow && column >= startColumn && column <= endColumn,
    );
    if (!range || (range.startRow === row && range.startColumn === column)) return undefined;
    return a1({ row: range.startRow, column: range.startColumn });
  }

  /** The last row and column that hold anything, spilled values included; -1 where the sheet is empty. */
  extent(sheet: FWorksheet): Cell {
    const last = { row: -1, column: -1 };
    const reach = (row: number, column: number, cell: Nullable<ICellData>) => {
      if (isEmpty(cell)) return;
      last.row = Math.max(last.row, row);
      last.column = Math.max(last.column, column);
    };
    sheet.getSheet().getCellMatrix().forValue(reach);
    for (const { row, column, cell } of allCells(this.spilledCells(sheet))) reach(row, column, cell);
    return last;
  }

  private spilledRanges(sheet: FWorksheet) {
    const anchors = this.formulas.getArrayFormulaRange()[this.workbook.getId()]?.[sheet.getSheetId()];
    // The grid lists the range of a spill that found no room, too.
    const isBlocked = (row: number, column: number) => sheet.getSheet().getCellRaw(row, column)?.v === ErrorType.SPILL;
    return allCells(anchors)
      .filter(({ row, column }) => !isBlocked(row, column))
      .map(({ cell }) => cell);
  }

  private spilledCells(sheet: FWorksheet) {
    return this.formulas.getArrayFormulaCellData()[this.workbook.getId()]?.[sheet.getSheetId()];
  }

  private message(sheet: FWorksheet, cell: Cell, code: string): string | undefined {
    const callsUs = (row: number, column: number) =>
      this.formula(sheet, { row, column })?.toUpperCase().includes(`${namespace}.`) ?? false;
    return this.messages.at(sheet.getSheetId(), cell.row, cell.column, code, callsUs);
  }
}

/** The filled places of the grid's sparse matrices. */
function allCells<T>(
  matrix: Nullable<IObjectMatrixPrimitiveType<Nullable<T>>>,
): { row: number; column: number; cell: T }[] {
  return Object.entries(matrix ?? {}).flatMap(([row, cells]) =>
    Object.entries(cells ?? {}).flatMap(([column, cell]) =>
      cell ? [{ row: Number(row), column: Number(column), cell: cell as T }] : [],
    ),
  );
}

function isEmpty(cell: Nullable<ICellData>): boolean {
  return !cell || ((cell.v === undefined || cell.v === null) && !cell.f && !cell.si && !cell.p);
}

function plainValue(cell: Nullable<ICellData>): Exclude<CellContent, object> {
  if (!cell) return null;
  // Cells typed with line breaks hold a small document.
  const value = cell.v ?? cell.p?.body?.dataStream.trim();
  if (value === undefined || value === null) return null;
  if (cell.t === CellValueType.BOOLEAN) return value === 1 || value === true || value === "TRUE";
  return cell.t === CellValueType.NUMBER ? Number(value) : value;
}

function isErrorCode(value: CellContent): value is string {
  return typeof value === "string" && ERROR_TYPE_SET.has(value as ErrorType);
}
