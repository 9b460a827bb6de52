import { isCellError, type CellError } from "../../../functions/cells/host";
import { frontDoors } from "../../../functions/front-doors";
import { a1, cellOf, cornersOf } from "../../workbook/address";
import type { CellContent } from "../../workbook/workbook";
import type { FileCell, FileSheet, FileTable } from "../../workbook/xlsx-book";
import { places, type Look } from "./looks";

type Typed = number | string | boolean;

/** An argument of a call: cells of a sample sheet, or what is typed in its place; undefined leaves it out. */
export type Argument = Cells | Typed | undefined;

/** Cells by their address, and how a formula names them where that is not the address. */
export interface Cells {
  sheet: SampleSheet;
  range: string;
  named?: string;
}

/** A sheet of a sample workbook, made cell by cell. What a call comes to is computed by our own functions. */
export class SampleSheet {
  readonly cells: FileSheet["cells"] = [];
  readonly tables: FileTable[] = [];
  /** Pixels, by column and by row from 0. */
  widths: number[] = [];
  readonly heights: Record<number, number> = {};
  frozenRows = 0;

  constructor(readonly name: string) {}

  type(address: string, value: Typed, look: Look = "typed", format?: string): this {
    return this.put(address, { value: value === "" ? null : value }, look, format);
  }

  /** A formula of the spreadsheet's own functions, with what it comes to by other means; LibreOffice checks it. */
  native(address: string, formula: string, value: number | string, look: Look = "calculated", format?: string): this {
    return this.put(address, { value, formula }, look, format);
  }

  /** A call of one of our functions, which fills as many cells as its result has. */
  call(address: string, name: string, args: readonly Argument[], look: Look = "calculated", format?: string): this {
    const result = frontDoors[name](...args.map(toMatrix)) as unknown[][];
    const at = cellOf(address);
    result.forEach((row, i) =>
      row.forEach((value, j) =>
        this.put(a1({ row: at.row + i, column: at.column + j }), { value: contentOf(value) }, look, format),
      ),
    );
    const anchor = this.cells[at.row]![at.column]!;
    anchor.formula = `=SHEATH.${name}(${args.map((arg) => this.spell(arg)).join(",")})`;
    const last = a1({ row: at.row + result.length - 1, column: at.column + result[0].length - 1 });
    if (last !== address) anchor.fills = `${address}:${last}`;
    return this;
  }

  at(range: string, named?: string): Cells {
    return { sheet: this, range, named };
  }

  value(address: string): CellContent {
    const { row, column } = cellOf(address);
    return this.cells[row]?.[column]?.value ?? null;
  }

  number(address: string): number {
    const value = this.value(address);
    if (typeof value !== "number") throw new Error(`${this.name}!${address} holds no number`);
    return value;
  }

  numbers(range: string): number[] {
    return cellsIn(range).map((address) => this.number(address));
  }

  done(): FileSheet {
    return {
      name: this.name,
      cells: this.cells,
      tables: this.tables,
      widths: Object.fromEntries(this.widths.map((width, at) => [at, width])),
      heights: this.heights,
      ...(this.frozenRows ? { frozen: { rows: this.frozenRows, columns: 0 } } : {}),
      merged: [],
    };
  }

  private put(address: string, cell: FileCell, look: Look, format?: string): this {
    const { row, column } = cellOf(address);
    (this.cells[row] ??= [])[column] = { ...cell, style: places.at(look, format) };
    return this;
  }

  private spell(arg: Argument): string {
    if (arg === undefined) return "";
    if (typeof arg === "string") return `"${arg.replace(/"/g, '""')}"`;
    if (typeof arg !== "object") return String(arg).toUpperCase();
    if (arg.named) return arg.named;
    return arg.sheet === this ? arg.range : `${quoted(arg.sheet.name)}!${arg.range}`;
  }
}

export function quoted(sheet: string): string {
  return /^\w+$/.test(sheet) ? sheet : `'${sheet.replace(/'/g, "''")}'`;
}

function toMatrix(arg: Argument): unknown[][] | null {
  if (arg === undefined) return null;
  if (typeof arg !== "object") return [[arg]];
  const { from, to } = cornersOf(arg.range);
  return Array.from({ length: to.row - from.row + 1 }, (_, i) =>
    Array.from({ length: to.column - from.column + 1 }, (_, j) =>
      arg.sheet.value(a1({ row: from.row + i, column: from.column + j })),
    ),
  );
}

export function cellsIn(range: string): string[] {
  const { from, to } = cornersOf(range);
  const columns = to.column - from.column + 1;
  return Array.from({ length: (to.row - from.row + 1) * columns }, (_, k) =>
    a1({ row: from.row + Math.floor(k / columns), column: from.column + (k % columns) }),
  );
}

function contentOf(value: unknown): CellContent {
  return isCellError(value) ? { error: (value as CellError).code } : (value as Typed);
}
