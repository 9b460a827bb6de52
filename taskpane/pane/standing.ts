import type { Entry, Limit } from "../../functions/cells/entry";
import { readInputs } from "../../functions/cells/evaluate";
import { Fault } from "../../functions/cells/fault";
import { doubtOf } from "../../functions/cells/inputs";
import { judge, verdictText, worst, type Verdict } from "../../functions/cells/verdict";

/** A limit at the inputs of the moment: its verdict, or that it does not apply, or that the inputs are not complete. */
export interface Standing {
  limit: Limit;
  verdict: Verdict | "does not apply" | "no inputs";
}

/** Every limit of an entry, in its order, at these arguments. */
export function standings(entry: Entry<any>, args: readonly unknown[]): Standing[] {
  const values = valuesAt(entry, args);
  return entry.limits.map((limit) => ({
    limit,
    verdict: values === undefined ? "no inputs" : (judge(limit, values) ?? "does not apply"),
  }));
}

/** The inputs of the first row as numbers; undefined where one is missing or unusable. */
function valuesAt(entry: Entry<any>, args: readonly unknown[]): unknown[] | undefined {
  const reading = readInputs(entry.inputs, args);
  if (reading instanceof Fault || reading.odd?.[0]) return undefined;
  return reading.columns.map(({ values }) => values[0]);
}

/** The worst of all as one line, and how many could not be tested beside it. */
export function summary(standings: readonly Standing[]): { verdict: Verdict; text: string } | undefined {
  const verdicts = standings.map(({ verdict }) => verdict).filter((verdict) => typeof verdict !== "string");
  const verdict = worst(verdicts);
  if (!verdict) return undefined;
  const untested = verdicts.filter(({ word }) => word === "not tested").length;
  const rest = verdict.word === "not tested" || untested === 0 ? "" : `; ${untested} not tested`;
  return { verdict, text: verdictText(verdict) + rest };
}

/** Why the value of each input is doubted, by its name. */
export function doubts(entry: Entry<any>, args: readonly unknown[]): Map<string, string> {
  const found = new Map<string, string>();
  entry.inputs.forEach((input: Entry["inputs"][number], i: number) => {
    const argument = args[i];
    const cell = input.kind !== "block" && Array.isArray(argument) ? argument[0][0] : undefined;
    const doubt = doubtOf(input, cell);
    if (doubt !== undefined) found.set(input.name, doubt);
  });
  return found;
}
