import type { Entry } from "../../functions/cells/entry";
import { Fault } from "../../functions/cells/fault";
import type { Input } from "../../functions/cells/inputs";
import { frontDoors } from "../../functions/front-doors";
import { sweepValues, type Spacing } from "./values";

/**
 * The inputs of a function that can run down a column of numbers, by their place. None where its result is text, or a
 * table of several rows, which would have to stand once in every row of the sweep.
 */
export function sweptInputs(entry: Entry<any>): number[] {
  const { inputs, repeats, example, name } = entry;
  if (repeats || inputs.some(({ kind }: Input) => kind === "block")) return [];
  const result = frontDoors[name](...example.map((cell) => [[cell]]));
  if (result.length > 1 || typeof result[0][0] !== "number") return [];
  return inputs.flatMap(({ kind }: Input, i: number) => (kind === "quantity" || kind === "ion" ? [i] : []));
}

export interface Ends {
  from: number;
  to: number;
  spacing: Spacing;
}

/** Where a sweep begins and ends unless told: a decade to either side of the value in the form. */
export function usualEnds(input: Input, typed: unknown): Ends {
  if (input.kind === "ion") return { from: 1, to: 200, spacing: "logarithmic" };
  const value = numberIn(input, typed);
  const [least, most] = plausible(input, value);
  if (value === 0)
    return { from: 0, to: Math.min(most, numberIn(input, input.quantity!.example) || 1), spacing: "linear" };
  const within = (end: number) => Math.min(most, Math.max(least, end));
  const tidy = (end: number) => Number(end.toPrecision(3));
  return { from: within(tidy(value / 10)), to: within(tidy(value * 10)), spacing: "logarithmic" };
}

/** As far as the input allows, and no further than is plausible where the value itself is. */
function plausible({ least, most, band }: Input, value: number): [number, number] {
  if (!band || value < 0 || value < band.low || value > band.high) return [least, most];
  return [Math.max(least, band.low), Math.min(most, band.high)];
}

/** The value in the form as a number; where it is none, what a blank stands for, or an example of its kind. */
function numberIn(input: Input, typed: unknown): number {
  const read = typed === null ? undefined : input.read(typed);
  if (typeof read === "number") return read;
  if (typeof input.blank === "number" && Number.isFinite(input.blank)) return input.blank;
  const example = input.read(input.quantity!.example);
  return typeof example === "number" ? example : 1;
}

/** The values typed for a sweep, in the input's own unit; or why they can't be used. */
export function valuesTyped(
  input: Input,
  { from, to, count, spacing }: { from: unknown; to: unknown; count: unknown; spacing: Spacing },
): number[] | string {
  const [first, last] = [from, to].map((cell) => endIn(input, cell));
  if (typeof first === "string") return first;
  if (typeof last === "string") return last;
  return sweepValues(first, last, typeof count === "number" ? count : NaN, spacing);
}

function endIn(input: Input, cell: unknown): number | string {
  if (cell === null) return `A sweep of ${input.name} needs both ends.`;
  if (input.kind === "ion")
    return typeof cell === "number" && !(input.read(cell) instanceof Fault)
      ? cell
      : `${input.name}: a sweep runs over masses in u; type a number such as 40.`;
  const read = input.read(cell);
  if (read instanceof Fault) return read.message;
  return typeof read === "number" ? read : `${input.name}: a sweep runs over numbers; "${read}" is none.`;
}
