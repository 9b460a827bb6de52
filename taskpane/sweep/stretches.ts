import type { Entry, Limit } from "../../functions/cells/entry";
import { readInputs, type Result } from "../../functions/cells/evaluate";
import { Fault } from "../../functions/cells/fault";
import { doubtOf } from "../../functions/cells/inputs";
import { worstOf, type Word } from "../../functions/cells/verdict";
import { numberText } from "../pane/number-text";

/** Neighbouring rows of a sweep of which the same is to be said. Rows are counted from 0; both ends belong to it. */
export interface Stretch {
  first: number;
  last: number;
  word: Word | "doubtful input" | "no value";
  reason: string;
}

type Said = Pick<Stretch, "word" | "reason">;

/** What the limits of a function say along a sweep, in the words of its LIMITCHECK column. */
export function stretchesOf(entry: Entry<any>, args: readonly unknown[][][], swept: number, result: Result): Stretch[] {
  const reading = readInputs(entry.inputs, args);
  if (reading instanceof Fault) return [];
  const stretches: Stretch[] = [];
  result.forEach((row, i) => {
    const values = reading.columns.map(({ values }) => values[values.length === 1 ? 0 : i]);
    const said = problemIn(row) ?? verdictAt(entry, values, doubtOf(entry.inputs[swept], args[swept][i][0]));
    const before = stretches.at(-1);
    if (before && isSame(before, said)) before.last = i;
    else stretches.push({ first: i, last: i, ...said });
  });
  return stretches;
}

/** Messages of rows without a value differ in the values they name: the first speaks for all. */
function isSame(a: Said, b: Said): boolean {
  return a.word === b.word && (a.word === "no value" || a.reason === b.reason);
}

function problemIn(row: Result[number]): Said | undefined {
  const error = row.find((cell) => typeof cell === "object");
  return error && { word: "no value", reason: (error.message ?? error.code).replace(/\.$/, "") };
}

/** A doubtful input ranks before a limit that is marginal, and behind one that fails. */
function verdictAt(entry: Entry<any>, values: readonly unknown[], doubt: string | undefined): Said {
  const worst = worstOf(entry, values);
  if (doubt !== undefined && worst?.word !== "fails") return { word: "doubtful input", reason: hintOf(doubt) };
  if (!worst) return { word: "not tested", reason: "" };
  const { word, limit, needs } = worst;
  if (word === "not tested") return { word, reason: `give ${needs}` };
  return { word, reason: word === "holds" ? "" : word === "fails" ? limit.reason : between(limit) };
}

function between({ measure, holds, fails }: Limit): string {
  const [low, high] = [Math.min(holds, fails), Math.max(holds, fails)];
  return `${measure} between ${numberText(low, 3)} and ${numberText(high, 3)}`;
}

/** "n_e 1e11 m⁻³; cm⁻³ meant?" without the value, which differs from row to row. */
function hintOf(doubt: string): string {
  return doubt.slice(doubt.indexOf(";") + 2);
}
