import { contains, pack, type Area, type Packed } from "./area";
import type { Sheet } from "./book";
import type { Expression } from "./expression";
import { NotFollowed } from "./follow";
import type { Recalculation } from "./recalculation";
import { breaksIn, type Break, type Item } from "./runs";
import { said } from "./said";

type Place = { row: number; column: number };

/** Notes cells that break a run of matching formulas, first down the columns, then along the rows. */
export async function noteBreaks(
  looking: Recalculation,
  sheet: Sheet,
  kept: readonly Area[],
  pace: () => Promise<void>,
): Promise<void> {
  const noted = new Set<Packed>();
  const note = (found: Break, place: Place, isMeant: () => boolean) => {
    const cell = pack(place.row, place.column);
    if (
      noted.has(cell) ||
      looking.tally.has("newer", sheet.name, cell) ||
      isMeant() ||
      kept.some((area) => contains(area, place))
    )
      return;
    noted.add(cell);
    noteBreak(looking, sheet, found, place);
  };
  const { columns, rows } = extents(sheet);
  for (const [column, extent] of columns) {
    const items = span(extent, (row) => itemAt(looking, sheet, row, column));
    for (const found of breaksIn(items)) {
      const row = extent.from + found.at;
      const beside = [column - 1, column + 1].map((each) => itemAt(looking, sheet, row, each));
      note(found, { row, column }, () => beside.some((each) => isLike(items[found.at], each)));
    }
    await pace();
  }
  for (const [row, extent] of rows) {
    const items = span(extent, (column) => itemAt(looking, sheet, row, column));
    for (const found of breaksIn(items)) {
      const column = extent.from + found.at;
      const beside = [row - 1, row + 1].map((each) => itemAt(looking, sheet, each, column));
      const isTyped = (each: Item) => each !== undefined && "typed" in each;
      note(found, { row, column }, () =>
        beside.some((each) => isLike(items[found.at], each) || (isTyped(items[found.at]) && isTyped(each))),
      );
    }
    await pace();
  }
}

interface Extent {
  from: number;
  to: number;
  formulas: number;
}

/** A run and its break have at least this many formulas. */
const fewest = 3;

/** From the first formula to the last, in every column and row that has enough of them. */
function extents(sheet: Sheet): { columns: Map<number, Extent>; rows: Map<number, Extent> } {
  const columns = new Map<number, Extent>();
  const rows = new Map<number, Extent>();
  for (const { row, column } of sheet.formulas()) {
    extend(columns, column, row);
    extend(rows, row, column);
  }
  for (const lines of [columns, rows])
    for (const [line, { formulas }] of lines) if (formulas < fewest) lines.delete(line);
  return { columns, rows };
}

function extend(lines: Map<number, Extent>, line: number, at: number): void {
  const extent = lines.get(line);
  if (!extent) {
    lines.set(line, { from: at, to: at, formulas: 1 });
    return;
  }
  extent.from = Math.min(extent.from, at);
  extent.to = Math.max(extent.to, at);
  extent.formulas++;
}

function span({ from, to }: Extent, at: (i: number) => Item): Item[] {
  return Array.from({ length: to - from + 1 }, (_, i) => at(from + i));
}

function itemAt(looking: Recalculation, sheet: Sheet, row: number, column: number): Item {
  const parsed = looking.parsed(sheet, row, column);
  if (parsed) return { form: parsed.form };
  const typed = sheet.value(row, column);
  if (typed === null || typed === "" || sheet.isFilled(row, column)) return undefined;
  return { typed };
}

/** The same formula beside a break, or text beside text: a row of another kind that runs across the table, and meant. */
function isLike(own: Item, other: Item): boolean {
  if (!own || !other) return false;
  if ("form" in own) return "form" in other && other.form === own.form;
  return "typed" in other && typeof own.typed === "string" && typeof other.typed === "string";
}

function noteBreak(looking: Recalculation, sheet: Sheet, { form, kind }: Break, place: Place): void {
  const cell = pack(place.row, place.column);
  const { calls, expression } = looking.parser.known(form);
  const would = wouldGive(looking, sheet, place, expression);
  const [what, detail] =
    kind === "typed"
      ? [
          "a value stands where its neighbours have a formula",
          () => `it holds ${said(sheet.argument(place.row, place.column))}`,
        ]
      : ["the formula differs from those around it", () => `it is ${sheet.formula(place.row, place.column)}`];
  const cause = kind === "typed" ? "overwritten" : "inconsistent";
  looking.tally
    .draft(`${cause}|${sheet.name}|${place.column}|${form}`, () => ({ cause, sheet: sheet.name, what }))
    .by(calls)
    .add(cell, () => `${detail()}${would}`);
}

function wouldGive(looking: Recalculation, sheet: Sheet, { row, column }: Place, expression: Expression): string {
  const value = looking.valueAt(sheet, row, column, expression);
  return value instanceof NotFollowed ? "" : `; theirs would give ${said(value.cells[0][0])}`;
}
