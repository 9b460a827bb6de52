import { shapeOf, spell, type Cells } from "../cells/broadcast";
import { isBlank } from "../cells/column";
import { isTable, type Entry } from "../cells/entry";
import { notFinite, oddResult, readInputs, type Reading, type Result } from "../cells/evaluate";
import { badInput, Fault, noSolution } from "../cells/fault";
import { format } from "../cells/format";
import type { CellError } from "../cells/host";
import type { Input } from "../cells/inputs";
import type { Quantity } from "../cells/quantities";
import { readOutputUnit, type Conversion } from "../cells/quantity-text";
import { functionIn, isEntry, type Directory } from "./directory";
import { isUnstated, standardUncertainty } from "./standard-uncertainty";
import { draws, NoSlope, propagate, propagateByDraws, type FirstOrder, type Measured } from "./propagation";

export const methods = ["linear", "montecarlo"] as const;
export type Method = (typeof methods)[number];

/** Each row costs 10⁵ evaluations, so a call takes so many rows at most. */
export const mostDrawnRows = 20;

type Row = Result[number];

/** Value, standard uncertainty and shares of a named function at each row of values. */
export function uncertainty(
  directory: Directory,
  name: unknown,
  values: Cells,
  relative: Cells | undefined,
  absolute: Cells | undefined,
  method: Method,
  part: string | undefined,
): Result {
  const entry = functionIn(directory, name);
  if (!isEntry(entry)) return [[entry]];
  const problem = unfit(entry, values, method) ?? misfit(values, relative, absolute);
  if (problem) return [[problem]];
  const { columns } = shapeOf(values);
  const names = columnNames(entry, columns, method);
  const picked = part === undefined ? undefined : names.findIndex((each) => each.toLowerCase() === part.toLowerCase());
  if (picked !== undefined && picked < 0) {
    return [[badInput("part", `"${part}" is none of its columns`, `type one of ${names.join(", ")}`)]];
  }
  const argumentColumns = Array.from({ length: columns }, (_, j) => values.map((row) => [row[j]]));
  const reading = readInputs(entry.inputs, argumentColumns);
  if (reading instanceof Fault) return [[reading]];
  return values.map((given, i) => {
    const row = caseRow(
      { entry, reading, given, relative: rowOf(relative, i), absolute: rowOf(absolute, i), method },
      i,
    );
    if (picked === undefined) return [...row, ...new Array<string>(names.length - row.length).fill("")];
    return [row.length === 1 ? row[0] : row[picked]];
  });
}

/** The columns of the result, by the names that `part` picks them by. */
function columnNames(entry: Entry, columns: number, method: Method): string[] {
  const shares = entry.inputs.slice(0, columns).map(({ name }) => name);
  return method === "linear" ? ["value", "u", ...shares] : ["value", "u", "low", "high", "outside", ...shares];
}

/** Functions and blocks that this can't be done for. */
function unfit(entry: Entry, values: Cells, method: Method): Fault | undefined {
  if (isTable(entry.result) || entry.inputs.some(({ kind }) => kind === "block")) {
    const wanted = "name one that returns one number from single cells";
    return badInput("function_name", `${entry.name} spills or takes whole ranges`, wanted);
  }
  const { rows, columns } = shapeOf(values);
  const takes = entry.inputs.length + (entry.takesUnit ? 1 : 0);
  if (columns > takes) {
    const names = entry.inputs.map((input) => input.name).join(", ");
    return badInput(
      "values",
      `${entry.name} takes ${takes} columns at most, not ${columns}`,
      `give ${names}, a row for each case`,
    );
  }
  if (method === "montecarlo" && rows > mostDrawnRows) {
    const given = `"montecarlo" draws ${format(draws)} times for each of ${rows} rows`;
    return badInput("values", given, `give at most ${mostDrawnRows} rows in one call, or use "linear"`);
  }
  return undefined;
}

/** Uncertainties stand in one row for all cases or in one for each, and in one cell for all columns or in one for each. */
function misfit(values: Cells, relative: Cells | undefined, absolute: Cells | undefined): Fault | undefined {
  const of = shapeOf(values);
  for (const [name, cells] of [
    ["rel_unc", relative],
    ["abs_unc", absolute],
  ] as const) {
    if (!cells) continue;
    const { rows, columns } = shapeOf(cells);
    if ((rows === 1 || rows === of.rows) && (columns === 1 || columns === of.columns)) continue;
    const wanted = "give one row for all or one for each, with one cell for all columns or one for each";
    return badInput(name, `${spell({ rows, columns })} do not match values of ${spell(of)}`, wanted);
  }
  if (relative || absolute) return undefined;
  return badInput("rel_unc", "neither rel_unc nor abs_unc is given", 'type standard uncertainties such as "5 %"');
}

function rowOf(cells: Cells | undefined, i: number): unknown[] | undefined {
  return cells?.[cells.length === 1 ? 0 : i];
}

interface Case {
  entry: Entry;
  reading: Reading;
  given: unknown[];
  relative: unknown[] | undefined;
  absolute: unknown[] | undefined;
  method: Method;
}

function caseRow(of: Case, row: number): Row {
  const { entry, reading, given, method } = of;
  if (reading.odd?.[row]) return [oddResult(entry.inputs, reading, row)];
  const unit = outputUnit(entry, given[entry.inputs.length]);
  if (unit instanceof Fault) return [unit];
  const values = reading.columns.map(({ values }) => values[values.length === 1 ? 0 : row]);
  const uncertain = uncertainArguments(of, values);
  if (!Array.isArray(uncertain)) return [uncertain];
  const { f, fault } = modelOf(entry, values, uncertain);
  const value = f(uncertain.map((each) => each.value));
  if (!Number.isFinite(value)) return [fault() ?? notFinite(entry, value)];
  const first = propagate(f, uncertain);
  if (first instanceof NoSlope && method === "linear") return [noSlope(entry, uncertain[first.index])];
  const shares: (number | "")[] = entry.inputs.slice(0, given.length).map(() => 0);
  if (first instanceof NoSlope) shares.fill("");
  else uncertain.forEach(({ index }, i) => (shares[index] = first.shares[i]));
  if (method === "linear") return [inUnit(value, unit), (first as FirstOrder).u / unit.scale, ...shares];
  const drawn = propagateByDraws(f, uncertain);
  if (drawn.outside > draws / 2) return [mostlyOutside(entry, drawn.outside)];
  const { mean, u, low, high, outside } = drawn;
  const said = outside === 0 ? 0 : `${outside} of ${draws} draws outside`;
  return [inUnit(mean, unit), u / unit.scale, inUnit(low, unit), inUnit(high, unit), said, ...shares];
}

const inUnit = (value: number, unit: Conversion) => (value - unit.offset) / unit.scale;

function outputUnit(entry: Entry, cell: unknown): Conversion | Fault {
  const asked = entry.takesUnit && typeof cell === "string" && cell.trim() !== "";
  return asked ? readOutputUnit(entry.result as Quantity, cell) : { scale: 1, offset: 0 };
}

interface Uncertain extends Measured {
  input: Input;
  /** Which of the function's inputs it is. */
  index: number;
}

/** The arguments that are numbers in this row. Text has no uncertainty, and neither has what a blank stands for. */
function uncertainArguments({ entry, given, relative, absolute }: Case, values: unknown[]): Uncertain[] | CellError {
  const found: Uncertain[] = [];
  for (const [index, input] of entry.inputs.slice(0, given.length).entries()) {
    const value = values[index];
    if (input.kind === "quantity" && typeof value === "number" && !isBlank(input, given[index])) {
      const stated = { relative: cellAt(relative, index), absolute: cellAt(absolute, index) };
      const u = standardUncertainty(input, value, stated);
      if (typeof u !== "number") return u;
      found.push({ input, index, value, u, least: input.least, most: input.most });
    } else if (![relative, absolute].every((row) => row === undefined || row.length === 1 || isUnstated(row[index]))) {
      const what = isBlank(input, given[index]) ? "is blank" : "is no number";
      return badInput(input.name, `it ${what} and can't have an uncertainty`, "leave its uncertainty blank");
    }
  }
  return found;
}

/** One cell serves all columns. */
function cellAt(row: unknown[] | undefined, index: number): unknown {
  return row?.[row.length === 1 ? 0 : index];
}

/** The function of its uncertain arguments alone, and the last fault that it gave instead of a number. */
function modelOf({ compute }: Entry, values: readonly unknown[], uncertain: readonly Uncertain[]) {
  const all = [...values];
  let fault: Fault | undefined;
  const f = (at: readonly number[]): number => {
    for (let i = 0; i < uncertain.length; i++) all[uncertain[i].index] = at[i];
    const result = compute(...all);
    if (typeof result === "number") return result;
    fault = result instanceof Fault ? result : noNumber;
    return NaN;
  };
  return { f, fault: () => fault };
}

const noNumber = badInput("function_name", "it returns text", "name a function that returns a number");

function noSlope(entry: Entry, { input, value }: Uncertain): Fault {
  const where = `${entry.name} has no definite slope along ${input.name} at ${format(value, 4)}`;
  return noSolution(`${where}, so first order says nothing there; use method "montecarlo"`);
}

function mostlyOutside(entry: Entry, outside: number): Fault {
  return noSolution(
    `${outside} of ${draws} draws lie where ${entry.name} has no value: the uncertainties are too large for it here`,
  );
}
