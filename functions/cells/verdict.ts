import { NotTested, type Entry, type Limit } from "./entry";
import { Fault } from "./fault";
import { format } from "./format";

/** The words that cells and pane share. */
export type Word = "holds" | "marginal" | "fails" | "not tested";

export interface Verdict {
  limit: Limit;
  word: Word;
  /** The measure, where it could be known. */
  value?: number;
  /** The input to give so that the limit can be tested. */
  needs?: string;
}

/** What a limit says at these inputs; undefined where it does not apply. */
export function judge(limit: Limit, values: readonly unknown[]): Verdict | undefined {
  const value = limit.value(...values);
  if (value === undefined) return undefined;
  if (value instanceof NotTested) return { limit, word: "not tested", needs: value.needs };
  if (Number.isNaN(value)) return { limit, word: "not tested", needs: "inputs with a solution" };
  return { limit, word: wordFor(limit, value), value };
}

function wordFor({ holds, fails }: Limit, value: number): Word {
  const larger = holds >= fails;
  if (larger ? value >= holds : value <= holds) return "holds";
  return (larger ? value < fails : value > fails) ? "fails" : "marginal";
}

/** Every limit of an entry that applies at these inputs, in the entry's order. */
export function judgeAll(entry: Entry<any>, values: readonly unknown[]): Verdict[] {
  return entry.limits.map((limit) => judge(limit, values)).filter((verdict) => verdict !== undefined);
}

/** One verdict as a cell shows it. */
export function verdictText({ limit, word, value, needs }: Verdict): string {
  if (word === "not tested") return `not tested: give ${needs}`;
  if (word === "holds") return "holds";
  const [holds, fails] = [format(limit.holds), format(limit.fails)];
  const bounds = limit.holds === limit.fails ? `${holds} or more` : `${holds}…${fails}`;
  const measured = `${limit.measure} ${telling(limit, value!, word)} (${bounds})`;
  return word === "marginal" ? `marginal: ${measured}` : `fails: ${limit.reason}: ${measured}`;
}

/** "holds up to 0.1, fails above 0.5": the bounds in the order in which the measure meets them. */
export function boundsText(limit: Limit): string {
  const [holds, fails] = [format(limit.holds), format(limit.fails)];
  if (limit.holds === limit.fails) return `holds from ${holds} up, else fails`;
  return limit.holds > limit.fails
    ? `holds from ${holds} up, fails below ${fails}`
    : `holds up to ${holds}, fails above ${fails}`;
}

/** The measure in so many digits that it stands on the side of the bounds where it is: 2.998 of 3, not 3 of 3. */
function telling(limit: Limit, value: number, word: Word): string {
  let digits = 3;
  while (digits < 15 && wordFor(limit, Number(format(value, digits))) !== word) digits++;
  return format(value, digits);
}

/** What could not be tested says nothing against the model, unless it is what the model stands on. */
function severity({ limit, word }: Verdict): number {
  if (word === "not tested") return limit.decisive ? 2 : 0;
  return word === "fails" ? 4 : word === "marginal" ? 3 : 1;
}

/** The worst of several verdicts, the first of its kind. */
export function worst(verdicts: readonly Verdict[]): Verdict | undefined {
  return verdicts.reduce<Verdict | undefined>(worse, undefined);
}

/** The worst verdict of an entry's limits at these inputs; undefined where none applies. */
export function worstOf(entry: Entry<any>, values: readonly unknown[]): Verdict | undefined {
  let found: Verdict | undefined;
  for (const limit of entry.limits) {
    const verdict = judge(limit, values);
    if (verdict) found = worse(found, verdict);
  }
  return found;
}

function worse(found: Verdict | undefined, next: Verdict): Verdict {
  return found === undefined || severity(next) > severity(found) ? next : found;
}

/** A model that has no solution fails, with the reason its own message gives. */
export function unsolved(fault: Fault): string {
  return `fails: ${fault.message.replace(/\.$/, "")}`;
}
