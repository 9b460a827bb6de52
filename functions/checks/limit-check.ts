import { commonShape, indexIn, shapeOf, toCells, type Cells, type Shape } from "../cells/broadcast";
import type { Entry } from "../cells/entry";
import { notFinite, oddResult, readInputs, type Result } from "../cells/evaluate";
import { Fault } from "../cells/fault";
import { isCellError, type CellError } from "../cells/host";
import { doubtOf, type Input } from "../cells/inputs";
import { unexpected } from "../cells/rows";
import { unsolved, verdictText, worstOf } from "../cells/verdict";
import { functionIn, isEntry, tooManyInputs, type Directory } from "./directory";

/**
 * The worst verdict of a named function at each row of inputs: fails, then doubtful input, marginal, holds, not tested;
 * what the model stands on counts before holds where it was not tested.
 * A failing row with a doubtful input tells both, since the one often causes the other.
 */
export function limitCheck(directory: Directory, names: Cells, args: readonly unknown[]): Result {
  const known = new Map<unknown, Result>();
  const checkedBy = (name: unknown): Result => {
    let result = known.get(name);
    if (!result) {
      const found = functionIn(directory, name);
      known.set(name, (result = isEntry(found) ? verdictsOf(found, args) : [[found]]));
    }
    return result;
  };
  const checks = names.map((row) => row.map(checkedBy));
  return checks.length === 1 && checks[0].length === 1 ? checks[0][0] : pick(checks);
}

/** Where several functions are named, each cell shows the one named in its row and column. */
function pick(checks: Result[][]): Result {
  const results = [...new Set(checks.flat())];
  const names = shapeOf(checks);
  const shape = commonShape([names, ...results.map(shapeOf)], ["function_name", ...results.map(() => "inputs")]);
  if (shape instanceof Fault) return [[shape]];
  return Array.from({ length: shape.rows }, (_, i) =>
    Array.from({ length: shape.columns }, (_, j) => {
      const result = at(checks, names, i, j);
      return at(result, shapeOf(result), i, j);
    }),
  );
}

function at<T>(cells: readonly (readonly T[])[], { rows, columns }: Shape, i: number, j: number): T {
  return cells[rows === 1 ? 0 : i][columns === 1 ? 0 : j];
}

function verdictsOf(entry: Entry, args: readonly unknown[]): Result {
  const surplus = tooManyInputs(entry, args);
  if (surplus) return [[surplus]];
  const reading = readInputs(entry.inputs, args);
  if (reading instanceof Fault) return [[reading]];
  const { shape, columns, odd } = reading;
  const doubts = entry.inputs.map((input, i) => doubtsIn(input, args[i])).filter((each) => each !== undefined);
  const values: unknown[] = new Array(columns.length);
  const verdictAt = (index: number, i: number, j: number): string | CellError => {
    if (odd?.[index]) return oddResult(entry.inputs, reading, index);
    for (let k = 0; k < columns.length; k++) {
      const all = columns[k].values;
      values[k] = all[all.length === 1 ? 0 : index];
    }
    const verdict = checked(entry, values);
    return doubts.length === 0 ? verdict : doubted(verdict, firstDoubt(doubts, i, j));
  };
  return Array.from({ length: shape.rows }, (_, i) =>
    Array.from({ length: shape.columns }, (_, j) => verdictAt(i * shape.columns + j, i, j)),
  );
}

/** What the limits say at one complete set of inputs; the error where one of them cannot be used after all. */
function checked(entry: Entry, values: readonly unknown[]): string | CellError {
  try {
    const fault = problemWith(entry, entry.compute(...values));
    if (fault) return fault instanceof Fault && fault.code === "#N/A" ? unsolved(fault) : fault;
    if (entry.limits.length === 0) return `not tested: ${entry.name} states no limits`;
    const verdict = worstOf(entry, values);
    return verdict ? verdictText(verdict) : `not tested: no limit of ${entry.name} applies here`;
  } catch (error) {
    return unexpected(error);
  }
}

/** Why a model gave no usable result. */
export function problemWith(entry: Entry, result: unknown): Fault | CellError | undefined {
  if (result instanceof Fault) return result;
  if (typeof result === "number") return Number.isFinite(result) ? undefined : notFinite(entry, result);
  if (!Array.isArray(result)) return undefined;
  for (const cell of result.flat()) {
    if (isCellError(cell)) return cell;
    if (typeof cell === "number" && !Number.isFinite(cell)) return notFinite(entry, cell);
  }
  return undefined;
}

interface Doubts {
  shape: Shape;
  /** By the cell's index in its own range. */
  texts: Map<number, string>;
}

/** Why cells of one argument are doubted; undefined where none is. */
function doubtsIn(input: Input, argument: unknown): Doubts | undefined {
  if (!input.band || input.kind === "block") return undefined;
  const cells = toCells(argument);
  const shape = shapeOf(cells);
  const texts = new Map<number, string>();
  for (let i = 0; i < shape.rows; i++) {
    for (let j = 0; j < shape.columns; j++) {
      const text = doubtOf(input, cells[i][j]);
      if (text !== undefined) texts.set(i * shape.columns + j, text);
    }
  }
  return texts.size > 0 ? { shape, texts } : undefined;
}

function firstDoubt(doubts: readonly Doubts[], i: number, j: number): string | undefined {
  for (const { shape, texts } of doubts) {
    const text = texts.get(indexIn(shape, i, j));
    if (text !== undefined) return text;
  }
  return undefined;
}

function doubted(verdict: string | CellError, doubt: string | undefined): string | CellError {
  if (doubt === undefined || typeof verdict !== "string") return verdict;
  const said = `doubtful input: ${doubt}`;
  return verdict.startsWith("fails") ? `${verdict}; ${said}` : said;
}
