import type { Cells, Shape } from "./broadcast";
import { indexIn, shapeOf } from "./broadcast";
import { Fault } from "./fault";
import { isCellError, passOn, toCellError, type CellError } from "./host";
import type { Input } from "./inputs";
import { take } from "./scratch";

/** A required cell that is blank. */
export const BLANK = Symbol("blank");

/** One argument read through its input: a value per cell, and apart from them the cells that have none. */
export interface Column {
  values: ArrayLike<any>;
  shape: Shape;
  /** By index: a blank, or the error that the cell gives. Undefined where every cell has a value. */
  odd: Map<number, typeof BLANK | CellError> | undefined;
}

export function isBlank(input: Input, cell: unknown): boolean {
  return (
    cell === null ||
    cell === undefined ||
    cell === "" ||
    (cell === 0 && !input.zeroIsValue) ||
    (typeof cell === "string" && cell.trim() === "")
  );
}

/** Reads an argument: a value per cell, by the quick way where cells are numbers in the input's range. */
export function readColumn(input: Input, cells: Cells): Column {
  if (input.kind === "block") return readBlock(input, cells);
  const shape = shapeOf(cells);
  // A lone cell gains nothing from the quick way, and what it may hold would teach the compiler to expect anything there.
  const isLong = shape.rows * shape.columns > 1;
  return (isLong && input.kind === "quantity" && readNumbers(input, cells, shape)) || readAny(input, cells, shape);
}

function readAny(input: Input, cells: Cells, shape: Shape): Column {
  const values: unknown[] = new Array(shape.rows * shape.columns);
  let odd: Column["odd"];
  let index = 0;
  for (const row of cells) {
    for (const cell of row) {
      const value = readCell(input, cell);
      if (value === BLANK || isError(value)) (odd ??= new Map()).set(index, value as typeof BLANK | CellError);
      values[index++] = value;
    }
  }
  return { values, shape, odd };
}

/** The quick way, for cells that are numbers or have no value; undefined where a blank or a word stands for something else. */
function readNumbers(input: Input, cells: Cells, shape: Shape): Column | undefined {
  const values = take(shape.rows * shape.columns);
  let odd: Column["odd"];
  for (let from = 0; (from = copyNumbers(input, cells, shape, values, from)) < values.length; from++) {
    const value = readCell(input, cells[Math.floor(from / shape.columns)][from % shape.columns]);
    if (typeof value === "number") values[from] = value;
    else if (value === BLANK || isError(value)) (odd ??= new Map()).set(from, value as typeof BLANK | CellError);
    else return undefined;
  }
  return { values, shape, odd };
}

/** The numbers that need no further look: where 0 counts as blank, those above it. */
export function quickRange({ least, most, zeroIsValue }: Input): readonly [least: number, most: number] {
  return [zeroIsValue || least > 0 ? least : Number.MIN_VALUE, most];
}

/** Copies cells from an index on while they are numbers in the input's range; returns where it stopped. */
function copyNumbers(input: Input, cells: Cells, { rows, columns }: Shape, values: Float64Array, from: number): number {
  const [least, most] = quickRange(input);
  if (columns === 1) {
    for (let i = from; i < rows; i++) {
      const cell = cells[i][0];
      if (typeof cell !== "number" || !(cell >= least && cell <= most)) return i;
      values[i] = cell;
    }
    return rows;
  }
  for (let index = from; index < values.length; index++) {
    const cell = cells[Math.floor(index / columns)][index % columns];
    if (typeof cell !== "number" || !(cell >= least && cell <= most)) return index;
    values[index] = cell;
  }
  return values.length;
}

function readBlock(input: Input, cells: Cells): Column {
  const shape = { rows: 1, columns: 1 };
  if (cells.every((row) => row.every((cell) => isBlank(input, cell)))) {
    return { values: [input.blank], shape, odd: input.optional ? undefined : new Map([[0, BLANK]]) };
  }
  const error = input.seesErrors ? undefined : cells.flat().find(isCellError);
  const value = error === undefined ? input.read(cells) : passOn(error, input.name);
  const odd = value instanceof Fault ? toCellError(value) : error === undefined ? undefined : (value as CellError);
  return { values: [value], shape, odd: odd && new Map([[0, odd]]) };
}

function isError(value: unknown): boolean {
  return value instanceof Fault || isCellError(value);
}

function readCell(input: Input, cell: unknown): unknown {
  if (isBlank(input, cell)) return input.optional ? input.blank : BLANK;
  if (isCellError(cell)) return passOn(cell, input.name);
  const value = input.read(cell);
  return value instanceof Fault ? toCellError(value) : value;
}

/** The column stretched to a shape, so that its cells line up with the result's. */
export function stretchTo(column: Column, shape: Shape): Column {
  const own = column.shape;
  if (own.rows === shape.rows && own.columns === shape.columns) return column;
  const size = shape.rows * shape.columns;
  const values = column.values instanceof Float64Array ? new Float64Array(size) : new Array(size);
  let odd: Column["odd"];
  for (let i = 0, at = 0; i < shape.rows; i++) {
    for (let j = 0; j < shape.columns; j++, at++) {
      const from = indexIn(own, i, j);
      values[at] = column.values[from];
      const oddity = column.odd?.get(from);
      if (oddity !== undefined) (odd ??= new Map()).set(at, oddity);
    }
  }
  return { values, shape, odd };
}
