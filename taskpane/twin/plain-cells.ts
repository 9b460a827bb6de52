import type { Entry } from "../../functions/cells/entry";
import { readInputs } from "../../functions/cells/evaluate";
import { Fault } from "../../functions/cells/fault";
import { prettyUnit } from "../../functions/cells/format";
import { isCellError } from "../../functions/cells/host";
import type { Input } from "../../functions/cells/inputs";
import type { Twin } from "../../functions/cells/twin";
import { frontDoors } from "../../functions/front-doors";
import type { Ion } from "../../functions/matter/ion";
import { a1, type Cell } from "../workbook/address";
import { withReferences } from "./references";
import { constantRows, inputRows, resultRows, stepRows, type Row } from "./rows";

/** A block of cells that computes what one call of a function does, in three columns: what, value, unit. */
export interface PlainCells {
  cells: (string | number | null)[][];
  /** The rows of the block that hold what the function returns, in its order. */
  results: number[];
}

/** One call of a function as plain cells whose top left corner will stand at `corner`; or why it can't be written so. */
export function plainCells(entry: Entry<any>, args: readonly unknown[], corner: Cell): PlainCells | string {
  const { twin } = entry;
  if (twin === undefined || typeof twin === "string") return noPlainForm(twin);
  const values = valuesOf(entry, args);
  if (typeof values === "string") return values;
  const word = exceptedWord(entry, twin, values);
  if (word) return noPlainForm(`${word} takes more than cell arithmetic`);
  return plainForm(entry, twin, values, entry.takesUnit ? textOf(args[entry.inputs.length]) : "", corner);
}

/** What the inputs stand for, then the constants, the steps, and the result, also in `unit` where one is named. */
export function plainForm(entry: Entry<any>, twin: Twin, read: unknown[], unit: string, corner: Cell): PlainCells {
  const values = withoutBlankItems(read);
  const inputs = entry.inputs.flatMap((input: Input, i: number) => inputRows(input, values[i], twin));
  const results = resultRows(entry, twin, unit, (values.find(Array.isArray) as Ion[] | undefined) ?? []);
  const rows = [...inputs, ...constantRows(twin, inputs), ...stepRows(twin), ...results];
  const returned = typeof twin.formula === "string" ? 1 : results.length;
  return {
    cells: layOut(entry, rows, twin.untested, corner),
    results: Array.from({ length: returned }, (_, i) => 1 + rows.length - returned + i),
  };
}

export function noPlainForm(reason: string | undefined): string {
  return `There is no plain form of this function${reason ? `: ${reason}` : ""}.`;
}

/** What the function's inputs stand for in its cells; a message where it has no single result there. */
function valuesOf(entry: Entry<any>, args: readonly unknown[]): unknown[] | string {
  const [[first]] = frontDoors[entry.name](...args);
  if (isCellError(first)) return first.message ?? first.code;
  if (first === "") return "The inputs are blank: type values first.";
  const reading = readInputs(entry.inputs, args);
  if (reading instanceof Fault) return reading.message;
  const { shape, columns } = reading;
  if (shape.rows * shape.columns > 1) return "Plain cells hold one set of inputs: give single values.";
  return columns.map(({ values }) => values[0]);
}

/** The lists of a mixture without the rows that are blank. */
function withoutBlankItems(values: unknown[]): unknown[] {
  const lists = values.filter(Array.isArray);
  const isComplete = (item: number) => lists.every((list) => list[item] !== undefined);
  return values.map((value) => (Array.isArray(value) ? value.filter((_, item) => isComplete(item)) : value));
}

function exceptedWord(entry: Entry<any>, { except = {} }: Twin, values: readonly unknown[]): string | undefined {
  const input: Input | undefined = entry.inputs.find(({ name }: Input, i: number) =>
    except[name]?.includes(values[i] as string),
  );
  return input && `${input.name} "${values[entry.inputs.indexOf(input)]}"`;
}

function textOf(argument: unknown): string {
  const cell = Array.isArray(argument) ? argument.flat()[0] : argument;
  return typeof cell === "string" ? cell.trim() : "";
}

function layOut({ name }: Entry<any>, rows: readonly Row[], untested: string | undefined, corner: Cell) {
  const referenceOf = referencesTo(rows, { row: corner.row + 1, column: corner.column + 1 }, name);
  const valueOf = ({ value, formula, item }: Row) =>
    formula === undefined ? (value ?? null) : `=${withReferences(formula, (each) => referenceOf(each, item))}`;
  return [
    [`${name} as plain cells`, "value", "unit"],
    ...rows.map((row) => [row.what, valueOf(row), row.unit ? prettyUnit(row.unit) : null]),
    ...(untested ? [[`Not noticed here: ${untested}.`, null, null]] : []),
  ];
}

/** A name as the address of its value; a list as its range, or as one of its cells in a formula for that item. */
function referencesTo(rows: readonly Row[], first: Cell, entryName: string) {
  return (name: string, item: number | undefined): string => {
    const places = rows
      .map((row, i) => ({ is: row.name === name, address: a1({ row: first.row + i, column: first.column }) }))
      .filter(({ is }) => is)
      .map(({ address }) => address);
    if (places.length === 0) throw new Error(`${entryName}: its plain form speaks of ${name}, which it does not have`);
    if (places.length === 1) return places[0];
    return item === undefined ? `${places[0]}:${places.at(-1)}` : places[item];
  };
}
