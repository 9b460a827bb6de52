import { BooleanNumber, CellValueType, type ICellData } from "@univerjs/core";
import type { FWorksheet } from "@univerjs/preset-sheets-core";
import { selectedCell, type Grid } from "../trial/grid/grid";
import { a1, cellOf, cellsIn, type Cell } from "./address";
import type { CellContent, CellPlace, SheetContent, SheetLook, Workbook, WorkbookContent, Written } from "./workbook";

/** The trial sheet's grid behind the pane's interface. */
export function trialWorkbook(grid: Grid): Workbook {
  return {
    capabilities: new Set(["write", "read", "settings"]),
    selection: () => Promise.resolve(placeOf(grid)),
    onSelection: (listener) => watchSelection(grid, listener),
    isFilled: async ({ sheet, address }) =>
      cellsIn(address).some((cell) => grid.contents.isFilled(sheetNamed(grid, sheet), cell)),
    async write(from, cells) {
      await grid.workbook.endEditingAsync(true);
      write(sheetNamed(grid, from.sheet), cellOf(from.address), cells);
      await grid.calculated();
    },
    async goTo(place) {
      const sheet = sheetNamed(grid, place.sheet);
      const { row, column } = cellOf(place.address);
      await grid.workbook.endEditingAsync(true);
      grid.workbook.setActiveSheet(sheet);
      sheet.setActiveRange(sheet.getRange(row, column));
      bringIntoView(sheet, { row, column });
    },
    read: (progress, signal) => read(grid, progress, signal),
    async replaceSheet(name, cells, look) {
      const { workbook } = grid;
      await workbook.endEditingAsync(true);
      const shown = workbook.getActiveSheet();
      const found = workbook.getSheetByName(name);
      found?.clear();
      const sheet = found ?? workbook.insertSheet(name);
      write(sheet, { row: 0, column: 0 }, cells);
      if (look) dress(sheet, look);
      workbook.setActiveSheet(shown);
      await grid.calculated();
    },
    async copySheet(name, copy) {
      const { workbook } = grid;
      await workbook.endEditingAsync(true);
      const shown = workbook.getActiveSheet();
      const made = workbook.duplicateSheet(sheetNamed(grid, name));
      made.setName(copy);
      workbook.setActiveSheet(made);
      workbook.moveActiveSheet(workbook.getSheets().length - 1);
      workbook.setActiveSheet(shown);
      await grid.calculated();
    },
    addChart: () => Promise.reject(new Error("the trial sheet draws no charts")),
    getSetting: (key) => Promise.resolve(getSetting(storageKey(grid, key))),
    setSetting: (key, value) => Promise.resolve(setSetting(storageKey(grid, key), value)),
  };
}

function placeOf(grid: Grid): CellPlace {
  const { sheet, cell } = selectedCell(grid);
  return { sheet: sheet.getSheetName(), address: a1(cell) };
}

/** The grid also calls at once, and when the same cell is selected again. */
function watchSelection(grid: Grid, listener: (place: CellPlace) => void): () => void {
  let last = placeOf(grid);
  return grid.onSelection(() => {
    const place = placeOf(grid);
    if (place.sheet === last.sheet && place.address === last.address) return;
    last = place;
    listener(place);
  });
}

function sheetNamed({ workbook }: Grid, name: string): FWorksheet {
  const sheet = workbook.getSheetByName(name);
  if (!sheet) throw new Error(`there is no sheet named "${name}"`);
  return sheet;
}

/** Scrolls only where it must, and then leaves some cells above and before: the grid counts rows under a frozen head. */
function bringIntoView(sheet: FWorksheet, { row, column }: Cell): void {
  const seen = sheet.getVisibleRange();
  const inside = (at: number, from: number, to: number) => at >= from && at < to;
  if (
    seen &&
    (inside(row, seen.startRow, seen.endRow) || row < sheet.getFrozenRows()) &&
    inside(column, seen.startColumn, seen.endColumn)
  )
    return;
  sheet.scrollToCell(Math.max(0, row - 5), Math.max(0, column - 2));
}

/** Cells are written as what they are, never parsed: the text "1/2" stays text. */
function write(sheet: FWorksheet, from: Cell, cells: readonly (readonly Written[])[]): void {
  const rows = cells.length;
  const columns = Math.max(0, ...cells.map((row) => row.length));
  if (rows === 0 || columns === 0) return;
  if (sheet.getMaxRows() < from.row + rows) sheet.setRowCount(from.row + rows);
  if (sheet.getMaxColumns() < from.column + columns) sheet.setColumnCount(from.column + columns);
  const filled: Record<number, Record<number, ICellData>> = {};
  cells.forEach((row, i) =>
    row.forEach((value, j) => {
      if (value !== null) (filled[from.row + i] ??= {})[from.column + j] = cellData(value);
    }),
  );
  sheet.getRange(from.row, from.column, rows, columns).setValues(filled);
}

function dress(sheet: FWorksheet, { widths, wrapped, headings }: SheetLook): void {
  widths.forEach((pixels, column) => sheet.setColumnWidth(column, pixels));
  sheet.getRange(0, 0, Math.max(1, wrapped), widths.length).setWrap(true).setVerticalAlignment("top");
  for (const row of headings) sheet.getRange(row, 0, 1, widths.length).setFontWeight("bold");
}

/** What stood there goes, whatever its kind: a formula, a formula shared with its neighbours, a small document. */
function cellData(value: Exclude<Written, null>): ICellData {
  const none = { f: null, si: null, p: null };
  if (value === "") return { ...none, v: null, t: null };
  if (typeof value === "object") return { ...none, v: value.text, t: CellValueType.STRING };
  if (typeof value === "number") return { ...none, v: value, t: CellValueType.NUMBER };
  if (typeof value === "boolean")
    return { ...none, v: value ? BooleanNumber.TRUE : BooleanNumber.FALSE, t: CellValueType.BOOLEAN };
  return value.startsWith("=")
    ? { ...none, f: value, v: null, t: null }
    : { ...none, v: value, t: CellValueType.STRING };
}

async function read(
  grid: Grid,
  progress: (done: number) => void = () => undefined,
  signal?: AbortSignal,
): Promise<WorkbookContent> {
  await grid.workbook.endEditingAsync(true);
  const sheets = grid.workbook.getSheets();
  const names = grid.workbook.getDefinedNames().map((name) => [name.getName(), name.getFormulaOrRefString()] as const);
  const content: WorkbookContent = { sheets: [], names: Object.fromEntries(names) };
  for (const [i, sheet] of sheets.entries()) {
    if (signal?.aborted) break;
    content.sheets.push(await readSheet(grid, sheet, (done) => progress((i + done) / sheets.length), signal));
  }
  return content;
}

/** So many cells are read before the page may answer the user again. */
const cellsAtOnce = 20_000;

async function readSheet(
  { contents, tables }: Grid,
  sheet: FWorksheet,
  progress: (done: number) => void,
  signal?: AbortSignal,
): Promise<SheetContent> {
  const last = contents.extent(sheet);
  const columns = Array.from({ length: last.column + 1 }, (_, column) => column);
  const values: CellContent[][] = [];
  const formulas: (string | undefined)[][] = [];
  for (let row = 0; row <= last.row && !signal?.aborted; row++) {
    values.push(columns.map((column) => contents.value(sheet, { row, column })));
    formulas.push(columns.map((column) => contents.formula(sheet, { row, column })));
    if (row % Math.ceil(cellsAtOnce / columns.length) === 0) await pause();
    progress((row + 1) / (last.row + 1));
  }
  return {
    name: sheet.getSheetName(),
    origin: "A1",
    values,
    formulas,
    spills: contents.spills(sheet),
    tables: tables.contents(sheet),
  };
}

function pause(): Promise<void> {
  return new Promise((resolve) => setTimeout(resolve));
}

/** Settings live as long as the page, and longer where the browser lets it store anything. */
const kept = new Map<string, string>();

/** Each workbook has its own. */
function storageKey({ workbook }: Grid, key: string): string {
  return `wallfall.trial.${workbook.getId()}.${key}`;
}

function getSetting(key: string): string | undefined {
  try {
    return kept.get(key) ?? localStorage.getItem(key) ?? undefined;
  } catch {
    return undefined;
  }
}

function setSetting(key: string, value: string): void {
  kept.set(key, value);
  try {
    localStorage.setItem(key, value);
  } catch {
    // Stored in the page's memory above.
  }
}
