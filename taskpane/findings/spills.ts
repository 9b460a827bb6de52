import type { Cells } from "../../functions/cells/broadcast";
import { isCellError } from "../../functions/cells/host";
import { pack, rangesText, rectanglesOf, type Area, type Packed } from "./area";
import type { Sheet } from "./book";
import type { Fill } from "./fill";
import type { Tally } from "./tally";

/** Notes a result that finds no room in the sheet, and what is in its way; whether it was so. */
export function noteBlocked(sheet: Sheet, anchor: Area, result: Cells, fill: Fill, tally: Tally): boolean {
  const saved = sheet.value(anchor.row, anchor.column);
  const needed = result.length * result[0].length;
  if (needed === 1 || typeof saved !== "object" || saved === null || anchor.rows * anchor.columns > 1) return false;
  // A saved file has another code in place of #SPILL!: then there must be something in the way.
  const inTheWay = obstacles(sheet, anchor, result);
  const isOwn = isCellError(result[0][0]) && (result[0][0] as { code: string }).code === saved.error;
  if (saved.error !== "#SPILL!" && (isOwn || inTheWay.length === 0)) return false;
  tally
    .draft(`spill|${fill.id}`, () => ({ cause: "spill", sheet: fill.sheet, what: "the result finds no room" }))
    .by(fill.calls)
    .add(pack(anchor.row, anchor.column), () => blockedBy(sheet, inTheWay, result));
  return true;
}

function obstacles(sheet: Sheet, { row, column }: Area, result: Cells): Packed[] {
  const found: Packed[] = [];
  for (let i = 0; i < result.length; i++) {
    for (let j = 0; j < result[0].length; j++) {
      if (i + j === 0) continue;
      const filled = sheet.value(row + i, column + j) !== null || sheet.formula(row + i, column + j) !== undefined;
      if (filled) found.push(pack(row + i, column + j));
    }
  }
  return found;
}

function blockedBy(sheet: Sheet, cells: readonly Packed[], result: Cells): string {
  const room = `it needs ${result.length} by ${result[0].length} cells`;
  return cells.length === 0 ? room : `${room}; clear ${rangesText(rectanglesOf(sheet.name, cells))}`;
}
