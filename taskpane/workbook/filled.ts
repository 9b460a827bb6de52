import { a1, cellOf } from "./address";
import type { CellPlace, Workbook } from "./workbook";

/**
 * The cell of a block that writing to it would destroy, the first in reading order; undefined where all are empty. Each
 * question costs a trip to the host: one tells of a whole block that it is empty, and halving finds the cell where not.
 */
export async function firstFilled(
  workbook: Workbook,
  { sheet, address }: CellPlace,
  rows: number,
  columns: number,
): Promise<CellPlace | undefined> {
  const { row: top, column: left } = cellOf(address);
  const isFilled = (from: number, to: number, first: number, last: number) =>
    workbook.isFilled({ sheet, address: `${a1({ row: from, column: first })}:${a1({ row: to, column: last })}` });
  const [bottom, right] = [top + rows - 1, left + columns - 1];
  if (!(await isFilled(top, bottom, left, right))) return undefined;
  const row = await firstOf(top, bottom, (from, to) => isFilled(from, to, left, right));
  const column = await firstOf(left, right, (from, to) => isFilled(row, row, from, to));
  return { sheet, address: a1({ row, column }) };
}

/** The first of some numbers that something is true of, which is true of one at least. */
async function firstOf(
  low: number,
  high: number,
  among: (from: number, to: number) => Promise<boolean>,
): Promise<number> {
  if (low === high) return low;
  const middle = Math.floor((low + high) / 2);
  return (await among(low, middle)) ? firstOf(low, middle, among) : firstOf(middle + 1, high, among);
}
