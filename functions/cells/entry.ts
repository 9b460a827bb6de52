import type { Source } from "../sources";
import type { Fault } from "./fault";
import type { CellError } from "./host";
import type { Input } from "./inputs";
import type { Quantity } from "./quantities";
import type { Loop } from "./quick-column";
import type { Twin } from "./twin";

/** What a cell of a result may hold before it goes to the host. */
export type Value = number | string | boolean;

/** A spilling result: named columns, quantities across, one row per item. */
export interface Table {
  columns: readonly { name: string; unit: string }[];
  /**
   * The numeric columns that make a curve: abscissa and ordinates by name, for the pane's plot. Rows in which the column
   * `alone` isn't 0 are no points of it: they hold a share of the whole that comes at one abscissa.
   */
  curve?: { x: string; y: readonly string[]; alone?: string };
}

/** The value types of a list of inputs, in order: what compute and the limits are called with. */
export type ValuesOf<I extends readonly Input<any>[]> = { [K in keyof I]: I[K] extends Input<infer T> ? T : never };

/** An assumption of a model as a number with two bounds: it holds up to the first and fails past the second. */
export interface Limit<V extends readonly unknown[] = any> {
  /** What is assumed, as a statement: "the sheath is collisionless". */
  assumption: string;
  /** The symbol of the number that tells: "λ_i/s". */
  measure: string;
  /** That number at these inputs; what is missing to know it; or undefined where the limit does not apply. */
  value: (...values: V) => number | NotTested | undefined;
  holds: number;
  fails: number;
  /** What is wrong when it fails, in one sentence: "the sheath is thicker than the ion mean free path". */
  reason: string;
  source: Source;
  /**
   * Set where the model stands on this assumption, as Child's law on free fall: while it could not be tested, others that
   * hold don't make the model hold.
   */
  decisive?: true;
}

/** The measure needs an input that was left blank. */
export class NotTested {
  constructor(readonly needs: string) {}
}

export interface Facts<I extends readonly Input<any>[]> {
  inputs: I;
  /** An input that may follow those, any number of times. */
  repeats?: Input<any>;
  result: Quantity | Table;
  /** Numbers in the inputs' own units in, the result's own unit out; a Fault where the model has no solution. */
  compute: (...values: ValuesOf<I>) => number | string | (Value | CellError)[][] | Fault;
  /** Put in by the build, for speed alone. */
  loop?: Loop;
  /** The equation for display, TeX. */
  equation: string;
  /** The function as plain spreadsheet arithmetic, or why there is none. */
  twin?: Twin | string;
  limits?: readonly Limit<ValuesOf<I>>[];
  sources: readonly Source[];
  /** What each version changed in what this function returns. */
  changes: Record<string, string>;
  /** Argument cells that work, in order. */
  example: readonly (Value | Value[][])[];
  /** Stated accuracy of the numerical evaluation. */
  accuracy: string;
}

/** Everything there is to know of one custom function, except the words: those stand in its JSDoc. */
export interface Entry<I extends readonly Input<any>[] = readonly Input<any>[]> extends Omit<
  Facts<I>,
  "compute" | "limits"
> {
  name: string;
  compute: (...values: any[]) => number | string | (Value | CellError)[][] | Fault;
  limits: readonly Limit[];
  /** Whether a last argument [unit] follows the inputs. */
  takesUnit: boolean;
}

export function entry<const I extends readonly Input<any>[]>(name: string, facts: Facts<I>): Entry<I> {
  const takesUnit = !isTable(facts.result) && facts.result.unit !== "";
  return { ...facts, name, limits: facts.limits ?? [], takesUnit } as Entry<I>;
}

export function isTable(result: Quantity | Table): result is Table {
  return "columns" in result;
}

/** The functions of one folder, in the catalogue's order, under the heading the pane shows. */
export interface Family {
  title: string;
  entries: readonly Entry<any>[];
}
