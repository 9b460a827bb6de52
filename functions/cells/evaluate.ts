import { commonShape, spell, toCells, type Cells, type Shape } from "./broadcast";
import { BLANK, readColumn, stretchTo, type Column } from "./column";
import { isTable, type Entry, type Value } from "./entry";
import { Fault } from "./fault";
import { toCellError, type CellError } from "./host";
import type { Input } from "./inputs";
import { readOutputUnit, type Conversion } from "./quantity-text";
import type { Quantity } from "./quantities";
import { quickColumn } from "./quick-column";
import { applyRows, unexpected } from "./rows";
import { giveBack } from "./scratch";

export type Result = (Value | CellError)[][];

/** The value of one catalogue entry on the cells of a call: one result per row, each with its own error where it has none. */
export function evaluate(entry: Entry<any>, args: readonly unknown[]): Result {
  try {
    return isTable(entry.result) ? evaluateTable(entry, args) : evaluateRows(entry, args, entry.result);
  } catch (error) {
    // A bug must stay in its own cell: the host would blank the whole spill, and the next functions with it.
    return [[toCellError(unexpected(error))]];
  }
}

/** The inputs of a call read and lined up: what evaluation, limit checks and uncertainties start from. */
export interface Reading {
  shape: Shape;
  columns: Column[];
  /** Rows of the common shape that some cell has no value for. */
  odd: Uint8Array | undefined;
}

export function readInputs(inputs: readonly Input<any>[], args: readonly unknown[]): Reading | Fault {
  const cells = inputs.map((_, i) => toCells(args[i]));
  const ragged = raggedRange(inputs, cells);
  if (ragged) return ragged;
  const columns = inputs.map((input, i) => readColumn(input, cells[i]));
  const shape = commonShape(
    columns.map((column) => column.shape),
    inputs.map(({ name }) => name),
  );
  if (shape instanceof Fault) return shape;
  const stretched = columns.map((column) =>
    column.values.length === 1 || column.values.length === shape.rows * shape.columns
      ? column
      : stretchTo(column, shape),
  );
  return { shape, columns: stretched, odd: oddRows(stretched, shape.rows * shape.columns) };
}

function raggedRange(inputs: readonly Input<any>[], cells: Cells[]): Fault | undefined {
  const at = cells.findIndex(isRagged);
  return at < 0 ? undefined : new Fault("#VALUE!", `${inputs[at].name}: the range is not a rectangle; select one.`);
}

/** A plain loop: on long columns a callback for each row costs more than the physics. */
function isRagged(rows: Cells): boolean {
  const width = rows[0].length;
  for (let i = 0; i < rows.length; i++) if (rows[i].length !== width) return true;
  return width === 0;
}

function oddRows(columns: readonly Column[], size: number): Uint8Array | undefined {
  let odd: Uint8Array | undefined;
  for (const column of columns) {
    if (!column.odd) continue;
    odd ??= new Uint8Array(size);
    if (column.values.length === 1 && size > 1) odd.fill(1);
    else for (const index of column.odd.keys()) odd[index] = 1;
  }
  return odd;
}

/** What stands in a row that has no complete inputs: "" where the row is empty, else the first error. */
export function oddResult(inputs: readonly Input<any>[], reading: Reading, row: number): "" | CellError {
  const many = reading.shape.rows * reading.shape.columns > 1;
  let blank: Input | undefined;
  let filled = false;
  let error: CellError | undefined;
  for (let i = 0; i < inputs.length; i++) {
    const column = reading.columns[i];
    const index = column.values.length === 1 ? 0 : row;
    const oddity = column.odd?.get(index);
    if (oddity === BLANK) blank ??= inputs[i];
    else if (oddity) error ??= oddity;
    // One cell shared by all rows doesn't make a row half filled, nor does a 0 that may itself be an empty cell.
    else if (!inputs[i].optional && !(many && column.values.length === 1) && column.values[index] !== 0) filled = true;
  }
  if (error) return error;
  if (!filled) return "";
  return toCellError(blankFault(blank!));
}

/** An empty cell arrives as 0 on some hosts, so where a 0 counts as blank the message can't tell which it was. */
function blankFault({ name, kind, zeroIsValue, example }: Input): Fault {
  const found = kind === "quantity" && !zeroIsValue ? "blank or 0" : "blank";
  const wanted = example ? `a value such as ${example}` : "a value";
  return new Fault("#VALUE!", `${name} is ${found}; ${kind === "block" ? "give" : "type"} ${wanted}.`);
}

function evaluateRows(entry: Entry<any>, args: readonly unknown[], result: Quantity): Result {
  const inputs = entry.takesUnit ? [...entry.inputs, unitInput(result)] : entry.inputs;
  const quick = quickColumn(entry, inputs, args);
  if (quick) return quick;
  const reading = readInputs(inputs, args);
  if (reading instanceof Fault) return [[toCellError(reading)]];
  const { shape, columns, odd } = reading;
  const size = shape.rows * shape.columns;
  const values = columns.slice(0, entry.inputs.length).map((column) => column.values);
  const { numbers, others } = applyRows(entry.compute, values, size, odd);
  if (entry.takesUnit) convert(numbers, columns[columns.length - 1].values);
  const special = (index: number): Value | CellError => {
    if (odd?.[index]) return oddResult(inputs, reading, index);
    const other = others?.get(index);
    if (other === undefined) return toCellError(notFinite(entry, numbers[index]));
    return other instanceof Fault ? toCellError(other) : (other as Value);
  };
  const isSpecial = odd || others ? (index: number) => odd?.[index] === 1 || others?.has(index) === true : undefined;
  const out = shape.columns === 1 ? asColumn(numbers, special, isSpecial) : asTable(numbers, shape, special, isSpecial);
  giveBack([...values, numbers]);
  return out;
}

type Special = (index: number) => Value | CellError;
type IsSpecial = ((index: number) => boolean) | undefined;

/** The usual long way down: one number per row, so this loop is as lean as a loop written for one function. */
function asColumn(numbers: Float64Array, special: Special, isSpecial: IsSpecial): Result {
  const out: Result = new Array(numbers.length);
  for (let i = 0; i < numbers.length; i++) {
    const value = numbers[i];
    // NaN − NaN and ∞ − ∞ are both NaN: one test for either.
    if (value - value === 0 && (isSpecial === undefined || !isSpecial(i))) out[i] = [value];
    else out[i] = [special(i)];
  }
  return out;
}

function asTable(numbers: Float64Array, shape: Shape, special: Special, isSpecial: IsSpecial): Result {
  return Array.from({ length: shape.rows }, (_, i) =>
    Array.from({ length: shape.columns }, (_, j) => {
      const index = i * shape.columns + j;
      const value = numbers[index];
      return value - value === 0 && !isSpecial?.(index) ? value : special(index);
    }),
  );
}

/** Numbers in the quantity's own unit to those of the unit asked for, in place. */
function convert(numbers: Float64Array, units: ArrayLike<Conversion | undefined>): void {
  if (units.length === 1) {
    const unit = units[0];
    if (!unit || (unit.scale === 1 && unit.offset === 0)) return;
    for (let i = 0; i < numbers.length; i++) numbers[i] = (numbers[i] - unit.offset) / unit.scale;
    return;
  }
  for (let i = 0; i < numbers.length; i++) {
    const unit = units[i];
    if (unit) numbers[i] = (numbers[i] - unit.offset) / unit.scale;
  }
}

/** The last argument of a function that returns a quantity; left blank, the result needs no conversion. */
function unitInput(result: Quantity): Input<Conversion | undefined> {
  return {
    name: "unit",
    optional: true,
    blank: undefined,
    zeroIsValue: false,
    least: 1,
    most: 0,
    kind: "text",
    read: (cell) =>
      typeof cell === "string"
        ? readOutputUnit(result, cell)
        : new Fault("#VALUE!", `unit: a unit is text; type one such as "${result.unit}".`),
  };
}

export function notFinite(entry: Entry, value: number): Fault {
  const what = Number.isNaN(value) ? "has no value" : "is larger than any number a cell can hold";
  return new Fault("#N/A", `${entry.name}: the result ${what} at these inputs; check their units and sizes.`);
}

/** A table spills from one set of inputs; where every set gives a single row, a column of sets gives a column of rows. */
function evaluateTable(entry: Entry<any>, args: readonly unknown[]): Result {
  const inputs = inputsFor(entry, args.length);
  const reading = readInputs(inputs, args);
  if (reading instanceof Fault) return [[toCellError(reading)]];
  const { shape, columns, odd } = reading;
  const size = shape.rows * shape.columns;
  if (shape.columns > 1) return [[toCellError(tableOverRow(entry, shape))]];
  const { others } = applyRows(
    entry.compute,
    columns.map((column) => column.values),
    size,
    odd,
  );
  if (size === 1) {
    if (odd?.[0]) return [[oddResult(inputs, reading, 0)]];
    return finishTable(entry, others!.get(0));
  }
  const out: Result = [];
  for (let i = 0; i < size; i++) {
    const rows = odd?.[i] ? [[oddResult(inputs, reading, i)]] : finishTable(entry, others!.get(i));
    if (rows.length !== 1) return [[toCellError(tableOverRow(entry, shape))]];
    out.push(rows[0]);
  }
  // A spill is a rectangle: a row that ends early, or is one error, is filled with empty text.
  const width = Math.max(...out.map((row) => row.length));
  return out.map((row) => (row.length === width ? row : [...row, ...new Array(width - row.length).fill("")]));
}

/** The inputs of a call with so many arguments: where one repeats, as often as it is given. */
function inputsFor({ inputs, repeats }: Entry, count: number): readonly Input<any>[] {
  const more = count - inputs.length;
  return repeats && more > 0 ? [...inputs, ...new Array<Input<any>>(more).fill(repeats)] : inputs;
}

function tableOverRow(entry: Entry, shape: Shape): Fault {
  return new Fault("#VALUE!", `${entry.name} spills a table of its own; give single cells, not ${spell(shape)}.`);
}

function finishTable(entry: Entry<any>, table: unknown): Result {
  if (table instanceof Fault) return [[toCellError(table)]];
  const rows = table as (Value | Fault)[][];
  return rows.map((row) =>
    row.map((value) => {
      if (value instanceof Fault) return toCellError(value);
      return typeof value !== "number" || value - value === 0 ? value : toCellError(notFinite(entry, value));
    }),
  );
}
