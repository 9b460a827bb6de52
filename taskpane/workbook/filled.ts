import { a1, cellOf } from "./address";
import type { CellPlace, Workbook } from "./workbook";

/** The cell of a block that writing to it would destroy, the first in reading order; undefined where all are empty. */
export async function firstFilled(
  workbook: Workbook,
  { sheet, address }: CellPlace,
  rows: number,
  columns: number,
): Promise<CellPlace | undefined> {
  const { row, column } = cellOf(address);
  const places = Array.from({ length: rows * columns }, (_, i) => ({
    sheet,
    address: a1({ row: row + Math.floor(i / columns), column: column + (i % columns) }),
  }));
  const filled = await Promise.all(places.map((place) => workbook.isFilled(place)));
  return places[filled.indexOf(true)];
}
