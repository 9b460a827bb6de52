import { shapeOf, type Cells, type Shape } from "../../functions/cells/broadcast";
import { BLANK, isBlank } from "../../functions/cells/column";
import type { Entry } from "../../functions/cells/entry";
import { oddResult, readInputs, type Reading } from "../../functions/cells/evaluate";
import { Fault } from "../../functions/cells/fault";
import { isCellError } from "../../functions/cells/host";
import { doubtOf, type Input } from "../../functions/cells/inputs";
import { judgeAll, verdictText, worst, type Verdict } from "../../functions/cells/verdict";
import { pack, type Packed } from "./area";
import type { FoundError } from "./book";
import type { Fill } from "./fill";
import { cellIn, type Known } from "./follow";
import type { Tally } from "./tally";

/** A call of one of our functions at known arguments, and where what is found of it is noted. */
export interface Judged {
  entry: Entry<any>;
  args: readonly (Known | undefined)[];
  /** The cell in which row i, column j of the call's result shows. */
  cellAt(i: number, j: number): Packed;
  fill: Fill;
  call: number;
  tally: Tally;
}

/** Notes limits that do not hold, inputs that are doubted and blanks that some hosts take for 0; traces incoming errors. */
export function judgeCall(judged: Judged, result: Cells, traces: Traces): void {
  const { entry, args, fill, call } = judged;
  entry.inputs.forEach((input: Input, k: number) => judgeDoubts(judged, input, args[k]));
  const reading = readInputs(
    entry.inputs,
    args.map((arg) => arg?.cells),
  );
  if (reading instanceof Fault) return;
  const { shape } = reading;
  fill.rows[call] = (fill.rows[call] ?? 0) + filledRows(result, shape);
  traceErrors(judged, result, shape, traces);
  judgeBlanks(judged, reading);
  if (entry.limits.length > 0) judgeLimits(judged, reading, result);
}

/** Rows of inputs that are not blank altogether. */
function filledRows(result: Cells, { rows, columns }: Shape): number {
  let count = 0;
  for (let i = 0; i < rows; i++) for (let j = 0; j < columns; j++) if (cellIn(result, i, j) !== "") count++;
  return count;
}

export type Place = FoundError["from"];
/** The cell that an error came from, and what it shows. */
export type Origin = Place & { code: string };

/** Where error cells of results come from, by the error itself: a message does not travel from cell to cell. */
export class Traces {
  private readonly origins = new WeakMap<object, Origin>();
  private readonly inputs = new WeakMap<object, Place>();

  /** The cell whose error was passed on. */
  origin(error: unknown): Origin | undefined {
    const { code, from } = error as Partial<FoundError>;
    return from ? { ...from, code: code! } : this.origins.get(error as object);
  }

  /** The cell that holds what could not be used. */
  input(error: unknown): Place | undefined {
    return this.inputs.get(error as object);
  }

  passedOn(error: object, from: Origin): void {
    this.origins.set(error, from);
  }

  readFrom(error: object, place: Place): void {
    this.inputs.set(error, place);
  }
}

function traceErrors(judged: Judged, result: Cells, shape: Shape, traces: Traces): void {
  const own = shapeOf(result);
  for (let i = 0; i < own.rows; i++) {
    for (let j = 0; j < own.columns; j++) {
      if (!isCellError(result[i][j])) continue;
      // One error may stand in many cells; each needs its own trace.
      const { code, message } = result[i][j] as { code: string; message?: string };
      const error = (result[i][j] = { code, message });
      const at: [number, number] = [shape.rows === 1 ? 0 : i, shape.columns === 1 ? 0 : j];
      const from = incoming(judged, at, traces);
      if (from) traces.passedOn(error, from);
      else {
        const place = blamed(judged, at, message ?? "");
        if (place) traces.readFrom(error, place);
      }
    }
  }
}

/** The first argument that is an error in this row; of one that is read whole, any of its cells. */
function incoming({ args, entry }: Judged, [i, j]: [number, number], traces: Traces): Origin | undefined {
  for (const [k, arg] of args.entries()) {
    if (!arg) continue;
    const isWhole = entry.inputs[k]?.kind === "block" || k >= entry.inputs.length;
    const cells = isWhole ? arg.cells.flat() : [cellIn(arg.cells, i, j)];
    for (const cell of cells) {
      const origin = isCellError(cell) ? traces.origin(cell) : undefined;
      if (origin) return origin;
    }
  }
  return undefined;
}

/** A message begins with the name of the input it is about. */
function blamed({ args, entry }: Judged, [i, j]: [number, number], message: string): Place | undefined {
  const k = entry.inputs.findIndex(
    ({ name }: Input) => message.startsWith(`${name}:`) || message.startsWith(`${name} is blank`),
  );
  const { cells, area } = args[k] ?? {};
  if (!cells || !area || entry.inputs[k].kind === "block") return undefined;
  const row = area.row + (cells.length === 1 ? 0 : i);
  return { sheet: area.sheet, row, column: area.column + (cells[0].length === 1 ? 0 : j) };
}

function judgeDoubts({ cellAt, fill, call, tally, entry }: Judged, input: Input, arg: Known | undefined): void {
  if (!arg || !input.band || input.kind === "block") return;
  const { cells, area } = arg;
  for (let i = 0; i < cells.length; i++) {
    for (let j = 0; j < cells[i].length; j++) {
      const doubt = isRefused(input, cells[i][j]) ? undefined : doubtOf(input, cells[i][j]);
      if (doubt === undefined) continue;
      const [amount, hint] = doubt.split("; ");
      const subject = `${input.quantity?.name ?? input.kind}; ${hint}`;
      const sheet = area?.sheet ?? fill.sheet;
      const what = hint.startsWith("unusually") ? `${input.name} is ${hint}` : `${input.name}: ${hint}`;
      const key = area ? `${sheet}|${area.column + j}` : `${fill.id}|${call}`;
      tally
        .draft(`doubtful|${key}|${subject}`, () => ({ cause: "doubtful", sheet, what, subject }))
        .by([entry.name])
        .add(area ? pack(area.row + i, area.column + j) : cellAt(i, j), () => amount);
    }
  }
}

/** A number outside the input's range is an error already. */
function isRefused({ kind, least, most }: Input, cell: unknown): boolean {
  return kind === "quantity" && typeof cell === "number" && (cell < least || cell > most);
}

/**
 * Blanks in inputs where 0 is a value: one host hands an empty cell over as blank, another as 0, and the result depends
 * on which. Where it does not, nothing is noted.
 */
function judgeBlanks(judged: Judged, reading: Reading): void {
  const { entry, args } = judged;
  entry.inputs.forEach((input: Input, k: number) => {
    const arg = args[k];
    if (!arg?.area || !input.zeroIsValue || input.kind !== "quantity") return;
    const { cells, area } = arg;
    for (let i = 0; i < cells.length; i++) {
      for (let j = 0; j < cells[i].length; j++) {
        if (!isBlank(input, cells[i][j]) || !zeroMatters(judged, reading, k, rowsFor(reading.shape, cells, i, j)))
          continue;
        const { sheet } = area;
        const what = `${input.name} is blank; some hosts hand an empty cell over as 0, which is a value here`;
        judged.tally
          .draft(`blank|${sheet}|${area.column + j}|${input.name}`, () => ({ cause: "blank", sheet, what }))
          .by([entry.name])
          .add(pack(area.row + i, area.column + j));
      }
    }
  });
}

/** The rows of the result that cell (i, j) of an argument takes part in; the first stands for all where it repeats. */
function rowsFor(shape: Shape, cells: Cells, i: number, j: number): number {
  return (cells.length === 1 ? 0 : i) * shape.columns + (cells[0].length === 1 ? 0 : j);
}

function zeroMatters({ entry }: Judged, reading: Reading, k: number, row: number): boolean {
  const { columns, odd } = reading;
  const input: Input = entry.inputs[k];
  if (odd?.[row])
    return (
      !input.optional &&
      columns[k].odd?.get(columns[k].values.length === 1 ? 0 : row) === BLANK &&
      oddResult(entry.inputs, reading, row) !== ""
    );
  const values = valuesAt(reading, row);
  return !Object.is(
    outcome(entry, values),
    outcome(
      entry,
      values.map((value, i) => (i === k ? 0 : value)),
    ),
  );
}

function outcome(entry: Entry<any>, values: readonly unknown[]): unknown {
  const result = entry.compute(...values);
  return typeof result === "object" ? JSON.stringify(result) : result;
}

function valuesAt({ columns }: Reading, row: number): unknown[] {
  return columns.map(({ values }) => values[values.length === 1 ? 0 : row]);
}

function judgeLimits(judged: Judged, reading: Reading, result: Cells): void {
  const { entry, cellAt } = judged;
  const { shape, odd } = reading;
  for (let i = 0; i < shape.rows; i++) {
    for (let j = 0; j < shape.columns; j++) {
      const index = i * shape.columns + j;
      // A row without a result is an error already.
      if (odd?.[index] || isCellError(cellIn(result, i, j))) continue;
      const verdicts = judgeAll(entry, valuesAt(reading, index));
      for (const verdict of verdicts) noteVerdict(judged, verdict, cellAt(i, j));
      const most = worst(verdicts);
      if (most) judged.fill.verdicts[most.word]++;
    }
  }
}

function noteVerdict({ entry, fill, call, tally }: Judged, verdict: Verdict, cell: Packed): void {
  const { limit, word, value } = verdict;
  if (word !== "fails" && word !== "marginal") return;
  const what = word === "fails" ? limit.reason : `marginal: ${limit.assumption}`;
  const subject = `${entry.name}|${limit.assumption}`;
  const beyond = limit.holds >= limit.fails ? -value! : value!;
  tally
    .draft(`${word}|${fill.id}|${call}|${limit.assumption}`, () => ({ cause: word, sheet: fill.sheet, what, subject }))
    .in(fill, [entry.name], () => fill.rows[call])
    .add(cell, () => measured(verdict), beyond);
}

/** "s/λ_i 4 (1…3)": the number and its bounds, as a check in a cell writes them. */
function measured(verdict: Verdict): string {
  const text = verdictText(verdict);
  return text.slice(text.lastIndexOf(verdict.limit.measure));
}
