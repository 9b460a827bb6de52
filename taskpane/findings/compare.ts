import type { Cells } from "../../functions/cells/broadcast";
import { isCellError } from "../../functions/cells/host";
import type { CellContent } from "../workbook/workbook";
import { pack, type Area } from "./area";
import type { Sheet } from "./book";
import type { Fill } from "./fill";
import { saidApart } from "./said";
import type { Draft, Tally } from "./tally";

/** Saved numbers may differ from new ones by this much of their size: different machines round differently. */
const tolerance = 1e-9;

/** Notes cells whose saved value is not what the formula now gives. `filled` is what the formula fills in the sheet. */
export function compareSaved(sheet: Sheet, filled: Area, result: Cells, fill: Fill, tally: Tally): void {
  const rows = Math.min(filled.rows, result.length);
  const columns = Math.min(filled.columns, result[0].length);
  for (let i = 0; i < rows; i++) {
    for (let j = 0; j < columns; j++) {
      const saved = sheet.value(filled.row + i, filled.column + j);
      if (isSame(saved, result[i][j])) continue;
      staleDraft(fill, tally).add(
        pack(filled.row + i, filled.column + j),
        () => difference(saved, result[i][j]),
        apart(saved, result[i][j]),
      );
    }
  }
  const isWhole = filled.rows === result.length && filled.columns === result[0].length;
  if (!isWhole && filled.rows * filled.columns > 1) {
    const size = (r: number, c: number) => `${r} by ${c} cells`;
    const detail = `${size(filled.rows, filled.columns)} are filled, a new calculation fills ${size(result.length, result[0].length)}`;
    staleDraft(fill, tally).add(pack(filled.row, filled.column), () => detail, Infinity);
  }
}

function staleDraft(fill: Fill, tally: Tally): Draft {
  const what = "the saved value is not what the formula gives now";
  return tally
    .draft(`stale|${fill.id}`, () => ({ cause: "stale", sheet: fill.sheet, what, subject: fill.calls.join() }))
    .in(fill, fill.calls, () => fill.cells.length);
}

export function isSame(saved: CellContent, now: unknown): boolean {
  if (typeof saved === "number" && typeof now === "number")
    return Math.abs(saved - now) <= tolerance * Math.max(Math.abs(saved), Math.abs(now));
  if (isCellError(now))
    return typeof saved === "object" && saved !== null && saved.error === (now as { code: string }).code;
  return (saved ?? "") === (now ?? "");
}

function difference(saved: CellContent, now: unknown): string {
  const before = typeof saved === "object" && saved !== null ? { code: saved.error } : saved;
  const [was, is] = saidApart(before, now);
  const message = isCellError(now) ? (now as { message?: string }).message : undefined;
  return `${was} is saved, a new calculation gives ${is}${message ? ` (${message})` : ""}`;
}

/** How far two values are apart, so that the worst is told. */
function apart(saved: CellContent, now: unknown): number {
  if (typeof saved !== "number" || typeof now !== "number") return 1e9;
  return Math.abs(saved - now) / Math.max(Math.abs(saved), Math.abs(now));
}
