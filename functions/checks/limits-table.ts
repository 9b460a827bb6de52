import { toCells } from "../cells/broadcast";
import type { Entry, Limit, Value } from "../cells/entry";
import { oddResult, readInputs, type Result } from "../cells/evaluate";
import { badInput, Fault } from "../cells/fault";
import { doubtOf } from "../cells/inputs";
import { boundsText, judge, unsolved, type Verdict } from "../cells/verdict";
import { functionIn, isEntry, tooManyInputs, type Directory } from "./directory";
import { problemWith } from "./limit-check";

/** The columns of every table of limits. */
export const limitColumns = ["assumption", "measure", "value", "bounds", "verdict"].map((name) => ({ name, unit: "" }));

/**
 * Every limit of a named function at one set of inputs. Rows before them say so where the model has no solution there or
 * an input is doubtful.
 */
export function limitsTable(directory: Directory, name: unknown, args: readonly unknown[]): Result {
  const entry = functionIn(directory, name);
  if (!isEntry(entry)) return [[entry]];
  const surplus = tooManyInputs(entry, args);
  if (surplus) return [[surplus]];
  const reading = readInputs(entry.inputs, args);
  if (reading instanceof Fault) return [[reading]];
  if (reading.shape.rows * reading.shape.columns > 1) {
    return [[badInput("inputs", "LIMITS takes one set of them", "give single cells, or use LIMITCHECK for a column")]];
  }
  if (reading.odd?.[0]) return [[oddResult(entry.inputs, reading, 0)]];
  const values = reading.columns.map((column) => column.values[0]);
  const problem = problemWith(entry, entry.compute(...values));
  if (problem && problem.code !== "#N/A") return [[problem]];
  return [
    ...(problem ? [["the model has a solution", "", "", "", unsolved(problem as Fault)]] : []),
    ...doubtRows(entry, args),
    ...(entry.limits.length === 0 ? [[`${entry.name} states no limits`, "", "", "", "not tested"]] : []),
    ...entry.limits.map((limit) => limitRow(limit, judge(limit, values))),
  ];
}

/** One limit with what it says; undefined where it does not apply. */
export function limitRow(limit: Limit, verdict: Verdict | undefined): Value[] {
  return [limit.assumption, limit.measure, verdict?.value ?? "", boundsText(limit), shortText(verdict)];
}

/** The verdict where measure and bounds stand beside it. */
function shortText(verdict: Verdict | undefined): string {
  if (!verdict) return "not tested: does not apply here";
  if (verdict.word === "not tested") return `not tested: give ${verdict.needs}`;
  return verdict.word === "fails" ? `fails: ${verdict.limit.reason}` : verdict.word;
}

function doubtRows(entry: Entry, args: readonly unknown[]): Value[][] {
  return entry.inputs.flatMap((input, i) => {
    const doubt = input.kind === "block" ? undefined : doubtOf(input, toCells(args[i])[0][0]);
    return doubt === undefined ? [] : [["the input is plausible", input.name, "", "", `doubtful input: ${doubt}`]];
  });
}
