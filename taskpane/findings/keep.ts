import { translateFormulaToA1 } from "@borgar/fx";
import { a1 } from "../workbook/address";
import type { CellContent, Workbook, WorkbookContent, Written } from "../workbook/workbook";
import { areaOf, cellsIn, rangesText, rectanglesOf, unpack, type Area } from "./area";
import { Book } from "./book";
import type { Fill } from "./fill";
import { fingerprint } from "./fingerprint";
import { told } from "./snapshot";

/** Cells that hold values in place of a formula, and the way back. */
export interface Kept {
  sheet: string;
  /** All cells that became values. */
  cells: string;
  /** Those of them that held the formula; the others were filled by it. */
  anchors: string;
  /** The formula in relative form, from which each cell's own is made. */
  form: string;
  /** Formulas that are not letter for letter what the form makes of them, by address. */
  others: Record<string, string>;
  functions: string;
  /** Of the values written: whether somebody has changed them since can be told. */
  print: string;
}

const setting = "kept";

export async function readKept(workbook: Workbook): Promise<Kept[]> {
  try {
    const found: unknown = JSON.parse((await workbook.getSetting(setting)) ?? "[]");
    return Array.isArray(found) ? (found as Kept[]) : [];
  } catch {
    return [];
  }
}

/** By sheet: the cells that hold values on purpose. */
export function keptAreas(kept: readonly Kept[]): Map<string, Area[]> {
  const areas = new Map<string, Area[]>();
  for (const { sheet, cells } of kept)
    areas.set(sheet, [...(areas.get(sheet) ?? []), ...cells.split(", ").map((range) => areaOf(sheet, range))]);
  return areas;
}

/** Writes what the cells of these fills show over their formulas, which are remembered in the workbook first. */
export async function keepAsValues(workbook: Workbook, book: Book, fills: readonly Fill[]): Promise<void> {
  const kept = fills.map((fill) => keptFrom(book, fill));
  // First the way back, then the change: what goes wrong in between can be brought back.
  await workbook.setSetting(setting, JSON.stringify([...(await readKept(workbook)), ...kept]));
  for (const { areas, sheet } of fills)
    for (const area of areas) await workbook.write(placeOf(area), valuesOf(book, sheet, area));
}

function keptFrom(book: Book, { sheet, form, areas, anchors, calls }: Fill): Kept {
  const found = book.sheet(sheet)!;
  const cells = rangesText(areas, Infinity);
  const others: Record<string, string> = {};
  for (const anchor of anchors) {
    const { row, column } = unpack(anchor);
    const address = a1({ row, column });
    const formula = found.formula(row, column)!;
    if (madeFrom(form, address) !== formula) others[address] = formula;
  }
  return {
    sheet,
    cells,
    anchors: rangesText(rectanglesOf(sheet, anchors), Infinity),
    form,
    others,
    functions: [...new Set(calls)].join(", "),
    print: printOf(cellsIn(cells).map(({ row, column }) => found.value(row, column))),
  };
}

/** A cell's own formula; undefined where the form can't be read back. */
function madeFrom(form: string, address: string): string | undefined {
  try {
    return translateFormulaToA1(form, address);
  } catch {
    return undefined;
  }
}

function placeOf({ sheet, row, column }: Area) {
  return { sheet, address: a1({ row, column }) };
}

function valuesOf(book: Book, sheet: string, { row, column, rows, columns }: Area): Written[][] {
  const found = book.sheet(sheet)!;
  return Array.from({ length: rows }, (_, i) =>
    Array.from({ length: columns }, (_, j) => asValue(found.value(row + i, column + j))),
  );
}

/** What a cell shows as something to write: an error becomes the text of its code, as it looks in the cell. */
export function asValue(value: CellContent): Written {
  if (value === null || value === "") return "";
  if (typeof value === "string") return { text: value };
  return typeof value === "object" ? { text: value.error } : value;
}

function printOf(values: readonly CellContent[]): string {
  return fingerprint(values.map((value) => told(asText(asValue(value)))));
}

function asText(value: Written): unknown {
  return typeof value === "object" && value !== null ? value.text : value;
}

/** Whether the cells still hold the values that were kept. */
export function isUntouched(content: WorkbookContent, { sheet, cells, print }: Kept): boolean {
  const found = new Book(content).sheet(sheet);
  if (!found) return false;
  const places = cellsIn(cells);
  if (places.some(({ row, column }) => found.formula(row, column) !== undefined)) return false;
  return printOf(places.map(({ row, column }) => found.value(row, column))) === print;
}

/** Puts the formulas back and forgets that they were gone. */
export async function bringBack(workbook: Workbook, kept: Kept): Promise<void> {
  const formulas = new Map(
    cellsIn(kept.anchors).map((cell) => [a1(cell), kept.others[a1(cell)] ?? madeFrom(kept.form, a1(cell))!]),
  );
  for (const range of kept.cells.split(", ")) {
    const area = areaOf(kept.sheet, range);
    const cells = Array.from({ length: area.rows }, (_, i) =>
      Array.from(
        { length: area.columns },
        (_, j) => formulas.get(a1({ row: area.row + i, column: area.column + j })) ?? "",
      ),
    );
    await workbook.write(placeOf(area), cells);
  }
  const rest = (await readKept(workbook)).filter((each) => each.sheet !== kept.sheet || each.cells !== kept.cells);
  await workbook.setSetting(setting, JSON.stringify(rest));
}
