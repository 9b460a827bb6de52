import { cellOf } from "../workbook/address";
import type { CellContent, SheetContent, WorkbookContent } from "../workbook/workbook";
import { areaOf, contains, pack, type Area, type Packed } from "./area";

/** An error as one function hands it to the next: its code alone, and the place it was read from so that it can be traced. */
export interface FoundError {
  code: string;
  from: { sheet: string; row: number; column: number };
}

/** One sheet by row and column, whatever its used part starts with. */
export class Sheet {
  readonly name: string;
  readonly row: number;
  readonly column: number;
  /** One past the last row and column in use. */
  readonly rows: number;
  readonly columns: number;
  private readonly spillAt = new Map<Packed, Area>();

  constructor(readonly content: SheetContent) {
    this.name = content.name;
    const origin = cellOf(content.origin);
    this.row = origin.row;
    this.column = origin.column;
    this.rows = this.row + content.values.length;
    this.columns = this.column + content.values.reduce((width, row) => Math.max(width, row.length), 0);
    for (const { anchor, range } of content.spills) {
      const { row, column } = cellOf(anchor);
      this.spillAt.set(pack(row, column), areaOf(this.name, range));
    }
  }

  /** One past the last column of a row; rows may be of very different lengths. */
  lengthOf(row: number): number {
    const cells = this.content.values[row - this.row];
    return cells ? this.column + cells.length : 0;
  }

  value(row: number, column: number): CellContent {
    return this.content.values[row - this.row]?.[column - this.column] ?? null;
  }

  formula(row: number, column: number): string | undefined {
    return this.content.formulas[row - this.row]?.[column - this.column];
  }

  /** Every formula, row by row. Rows may be of very different lengths, and most of them empty. */
  *formulas(): Generator<{ row: number; column: number; formula: string }> {
    for (const [i, cells] of this.content.formulas.entries()) {
      for (let j = 0; j < cells.length; j++) {
        const formula = cells[j];
        if (formula !== undefined) yield { row: this.row + i, column: this.column + j, formula };
      }
    }
  }

  /** What the formula in this cell fills, the cell itself included; undefined where it fills no other. */
  spill(row: number, column: number): Area | undefined {
    return this.spillAt.get(pack(row, column));
  }

  /** Whether a formula in another cell fills this one. */
  isFilled(row: number, column: number): boolean {
    for (const area of this.spillAt.values()) if (contains(area, { row, column })) return true;
    return false;
  }

  /** The cell's content as a function gets it. */
  argument(row: number, column: number): unknown {
    const value = this.value(row, column);
    if (typeof value !== "object" || value === null) return value;
    return { code: value.error, from: { sheet: this.name, row, column } } satisfies FoundError;
  }
}

/** A table as a formula names it: headings in the first row, data below. */
export interface Table {
  name: string;
  area: Area;
  columns: readonly string[];
}

/** A workbook's content, found by sheet, name, table and range. */
export class Book {
  readonly sheets: readonly Sheet[];
  private readonly byName: Map<string, Sheet>;
  private readonly tables: readonly Table[];
  private readonly names: Map<string, string>;
  private readonly read = new Map<string, unknown[][]>();
  private cellsRead = 0;

  constructor(content: WorkbookContent) {
    this.sheets = content.sheets.map((sheet) => new Sheet(sheet));
    this.byName = new Map(this.sheets.map((sheet) => [sheet.name.toLowerCase(), sheet]));
    this.tables = content.sheets.flatMap(({ name: sheet, tables }) =>
      tables.map(({ name, range, columns }) => ({ name, area: areaOf(sheet, range), columns })),
    );
    this.names = new Map(Object.entries(content.names).map(([name, refers]) => [name.toLowerCase(), refers]));
  }

  sheet(name: string): Sheet | undefined {
    return this.byName.get(name.toLowerCase());
  }

  /** What a defined name refers to; one of the sheet's own comes before one of the workbook. */
  name(name: string, sheet: string): string | undefined {
    return this.names.get(`${sheet}!${name}`.toLowerCase()) ?? this.names.get(name.toLowerCase());
  }

  table(name: string): Table | undefined {
    return this.tables.find((table) => table.name.toLowerCase() === name.toLowerCase());
  }

  tableAround(sheet: string, cell: { row: number; column: number }): Table | undefined {
    return this.tables.find(({ area }) => area.sheet === sheet && contains(area, cell));
  }

  /** All cells of an area as functions get them. Ranges are kept: formulas down a column share them. */
  cells(area: Area): unknown[][] {
    const sheet = this.sheet(area.sheet)!;
    if (area.rows * area.columns === 1) return [[sheet.argument(area.row, area.column)]];
    const key = `${area.sheet}!${area.row},${area.column},${area.rows},${area.columns}`;
    const known = this.read.get(key);
    if (known) return known;
    const cells = Array.from({ length: area.rows }, (_, i) =>
      Array.from({ length: area.columns }, (_, j) => sheet.argument(area.row + i, area.column + j)),
    );
    this.cellsRead += area.rows * area.columns;
    if (this.cellsRead > mostKept) {
      this.read.clear();
      this.cellsRead = area.rows * area.columns;
    }
    this.read.set(key, cells);
    return cells;
  }
}

const mostKept = 2_000_000;
