import type { Cells } from "../../functions/cells/broadcast";
import type { Packed } from "./area";
import type { Fill } from "./fill";
import type { Tally } from "./tally";

/** What a failing check begins with: "fails: …", or the count of a summary, "2 of 12 fail: …". */
const failing = /^(?:fails:\s*(.*)|\d+ of \d+ fails?\b.*)$/is;

/** Notes cells of a check that say it fails, with the reason they give. */
export function noteFailingChecks(
  result: Cells,
  cellAt: (i: number, j: number) => Packed,
  name: string,
  fill: Fill,
  tally: Tally,
): void {
  result.forEach((row, i) =>
    row.forEach((cell, j) => {
      const found = typeof cell === "string" ? failing.exec(cell.trim()) : null;
      if (!found) return;
      tally
        .draft(`check|${fill.id}`, () => ({ cause: "check", sheet: fill.sheet, what: "the check fails" }))
        .in(fill, [name], () => fill.cells.length)
        .add(cellAt(i, j), () => found[1] ?? found[0]);
    }),
  );
}
