import { toCells, type Cells } from "./broadcast";
import { quickRange, readColumn } from "./column";
import type { Entry, Value } from "./entry";
import type { Input } from "./inputs";
import type { Conversion } from "./quantity-text";

/**
 * All rows of one function from the cells as they are: reads, computes and writes each row, and returns the first row
 * that needs a closer look, or their number. The build gives each closed form a loop of its own
 * (manifest/build/loop-loader.js); it brings its variables along as arguments that are left out.
 */
export type Loop = (
  compute: (...values: any[]) => any,
  out: number[][],
  scale: number,
  offset: number,
  i: undefined,
  value: undefined,
  args: readonly Argument[],
) => number;

/** An argument's cells, 0 for a lone cell or 1 to go down them, and the range of numbers that need no closer look. */
type Argument = readonly [cells: Cells, step: 0 | 1, least: number, most: number];

const own: Conversion = { scale: 1, offset: 0 };

/**
 * A result down columns of plain numbers, which most are, in one pass and without anything in between: what a loop
 * written by hand for this function would do. Undefined where anything needs more than that.
 */
export function quickColumn(
  entry: Entry<any>,
  inputs: readonly Input<any>[],
  args: readonly unknown[],
): Value[][] | undefined {
  if (!entry.loop) return undefined;
  const cells = inputs.map((_, i) => toCells(args[i]));
  const rows = Math.max(...cells.map(({ length }) => length));
  if (rows < 2) return undefined;
  const columns: Cells[] = [];
  for (const [i, input] of inputs.entries()) {
    const column = cells[i].length === 1 ? loneCell(input, cells[i]) : cells[i];
    const isLong = column?.length === rows && column[0].length === 1 && input.kind === "quantity";
    if (!column || !(column.length === 1 || isLong)) return undefined;
    columns.push(column);
  }
  const { scale, offset } = entry.takesUnit ? ((columns.pop()![0][0] as Conversion | undefined) ?? own) : own;
  const out: number[][] = new Array(rows);
  const list = columns.map((column, i): Argument => [column, column.length === 1 ? 0 : 1, ...quickRange(inputs[i])]);
  try {
    const done = entry.loop(entry.compute, out, scale, offset, undefined, undefined, list);
    return done === rows ? out : undefined;
  } catch {
    return undefined;
  }
}

/** What one cell stands for, as a cell; undefined where it stands for nothing, or is no cell. */
function loneCell(input: Input<any>, cells: Cells): Cells | undefined {
  if (cells[0].length !== 1 || input.kind === "block") return undefined;
  const { values, odd } = readColumn(input, cells);
  return odd ? undefined : [[values[0]]];
}
