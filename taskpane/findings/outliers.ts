import { format } from "../../functions/cells/format";
import { pack } from "./area";
import type { Book, Sheet } from "./book";
import type { Fill } from "./fill";
import { cellOf, linesOf, type Line } from "./lines";
import type { Tally } from "./tally";

/** The usual slips of units are a factor of a thousand and more; steps of a sweep are not. */
const jump = 300;
/** What neighbours may differ by and still say together what the cell between them should be like. */
const likeness = 30;

/**
 * Notes a number that stands alone against its neighbours in the column: one reading in cm⁻³ among others in m⁻³ may
 * well be a plausible density. Cells that were doubted already are not doubted twice.
 */
export function noteOutliers(book: Book, fill: Fill, tally: Tally): void {
  for (const { input, name, areas, call } of fill.inputs.values()) {
    if (!input?.band || input.kind === "block") continue;
    for (const line of linesOf(areas.list)) {
      const sheet = book.sheet(line.sheet)!;
      const sizes = Array.from({ length: line.length }, (_, i) => sizeAt(sheet, line, i));
      const alone = sizes.flatMap((size, i) => {
        const expected = expectedAt(sizes, i);
        return expected !== undefined && Math.max(size / expected, expected / size) >= jump
          ? [{ i, size, expected }]
          : [];
      });
      // Where many stand alone, the column is meant to go up and down.
      if (alone.length > Math.max(2, line.length / 10)) continue;
      for (const each of alone) note(each, line, name, fill.calls[call], tally);
    }
  }
}

function note(
  { i, size, expected }: { i: number; size: number; expected: number },
  line: Line,
  name: string,
  call: string,
  tally: Tally,
): void {
  const { sheet } = line;
  const { row, column } = cellOf(line, i);
  const cell = pack(row, column);
  if (tally.has("doubtful", sheet, cell)) return;
  const what = `${name} stands alone against the cells around it; another unit meant?`;
  tally
    .draft(`outlier|${sheet}|${line.across ? row : column}`, () => ({
      cause: "doubtful",
      sheet,
      what,
      subject: "outlier",
    }))
    .by([call])
    .add(cell, () => `${format(size)} among ${format(expected)}`);
}

/** The size of a number that was typed; NaN for anything else, and for 0, which no factor can judge. */
function sizeAt(sheet: Sheet, line: Line, i: number): number {
  const { row, column } = cellOf(line, i);
  const value = sheet.value(row, column);
  return typeof value === "number" && value !== 0 && sheet.formula(row, column) === undefined ? Math.abs(value) : NaN;
}

/** What two neighbours that agree with each other would expect here; at an end, the two next to it. */
function expectedAt(sizes: readonly number[], i: number): number | undefined {
  if (Number.isNaN(sizes[i])) return undefined;
  const last = sizes.length - 1;
  const [a, b] =
    i === 0 ? [sizes[1], sizes[2]] : i === last ? [sizes[last - 1], sizes[last - 2]] : [sizes[i - 1], sizes[i + 1]];
  const apart = Math.max(a / b, b / a);
  // At an end a steep sweep may run on: its own step is allowed for.
  const isEnd = i === 0 || i === last;
  return apart <= (isEnd ? 3 : likeness) ? Math.sqrt(a * b) : undefined;
}
