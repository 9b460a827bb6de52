import type { Cause } from "./causes";

/** One finding: everything of one kind in one filled range. */
export interface Finding {
  /** The same whenever this is found again, whatever its cells and numbers then are. */
  key: string;
  cause: Cause;
  sheet: string;
  /** The cells it is about, as ranges: "C7, C9:C12". */
  cells: string;
  /** The cell to look at first: the worst where there is one. */
  first: string;
  count: number;
  /** How many cells or rows were looked at where these were found; equal to count where that says nothing more. */
  of: number;
  /** The functions concerned. */
  functions: readonly string[];
  /** What is the matter, in a few words. */
  what: string;
  /** How far, and where it is worst: a number with its bounds, a message, two values. */
  detail?: string;
  /** The cells that are to blame, where those are others. */
  from?: { sheet: string; cells: string };
  /** Changes whenever the finding does: cells, numbers or words. */
  print: string;
}
