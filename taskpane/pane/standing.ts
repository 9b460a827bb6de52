import type { Entry, Limit } from "../../functions/cells/entry";
import { readInputs } from "../../functions/cells/evaluate";
import { Fault } from "../../functions/cells/fault";
import { doubtOf } from "../../functions/cells/inputs";
import { judge, verdictText, worst, type Verdict, type Word } from "../../functions/cells/verdict";
import { labels } from "./labels";

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

/** The worst of all as one line; what could not be tested, and which inputs are doubted, beside it. */
export function summary(
  standings: readonly Standing[],
  doubted: readonly string[],
): { word: Word; text: string } | undefined {
  const verdicts = standings.map(({ verdict }) => verdict).filter((verdict) => typeof verdict !== "string");
  const verdict = worst(verdicts);
  const doubt = doubted.length > 0 && `${labels.doubtfulInput}: ${doubted.join(", ")}`;
  if (!verdict) return doubt ? { word: labels.notTested, text: doubt } : undefined;
  const untested = verdicts.filter(({ word }) => word === labels.notTested).length;
  const rest = verdict.word !== labels.notTested && untested > 0 && `${untested} ${labels.notTested}`;
  return { word: verdict.word, text: [verdictText(verdict), rest, doubt].filter((part) => part !== false).join("; ") };
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
