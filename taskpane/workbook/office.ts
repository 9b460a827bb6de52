/// <reference types="office-js" />
/**
 * The host's workbook behind the pane's interface. None of it could be tried in a real host: each fact taken from the
 * platform's documentation stands in one small function, so that one that proves wrong is mended in one place.
 */
import { a1, cellOf, cornersOf } from "./address";
import type {
  CellContent,
  CellPlace,
  Chart,
  SheetContent,
  SheetLook,
  Workbook,
  WorkbookContent,
  Written,
} from "./workbook";

export function officeWorkbook(): Workbook {
  return {
    capabilities: new Set(["write", "read", "settings", "chart"]),
    selection: () => Excel.run(async (context) => placeOf(context, context.workbook.getActiveCell())),
    onSelection: watchSelection,
    isFilled: (place) => Excel.run((context) => isFilled(context, place)),
    write: (from, cells) =>
      Excel.run((context) => write(context, sheetNamed(context, from.sheet), from.address, cells)),
    goTo: (place) => Excel.run((context) => goTo(context, place)),
    read: (progress, signal) => Excel.run((context) => readAll(context, progress, signal)),
    replaceSheet: (name, cells, look) => Excel.run((context) => replaceSheet(context, name, cells, look)),
    copySheet: (name, copy) => Excel.run((context) => copySheet(context, name, copy)),
    addChart: (chart) => Excel.run((context) => addChart(context, chart)),
    getSetting: (key) => Excel.run((context) => getSetting(context, key)),
    setSetting: (key, value) =>
      Excel.run(async (context) => {
        context.workbook.settings.add(settingKey(key), value);
        await context.sync();
      }),
  };
}

async function placeOf(context: Excel.RequestContext, cell: Excel.Range): Promise<CellPlace> {
  cell.load("address");
  cell.worksheet.load("name");
  await context.sync();
  return { sheet: cell.worksheet.name, address: plainAddress(cell.address) };
}

/** The host says "'My sheet'!$B$5"; the pane says "B5". */
function plainAddress(address: string): string {
  return address.slice(address.lastIndexOf("!") + 1).replaceAll("$", "");
}

function sheetNamed(context: Excel.RequestContext, name: string): Excel.Worksheet {
  return context.workbook.worksheets.getItem(name);
}

function watchSelection(listener: (place: CellPlace) => void): () => void {
  const added = Excel.run(async (context) => {
    const handler = context.workbook.onSelectionChanged.add(() =>
      Excel.run(async (inner) => listener(await placeOf(inner, inner.workbook.getActiveCell()))),
    );
    await context.sync();
    return handler;
  });
  return () => void added.then(forget, () => undefined);
}

/** A handler is removed through the context it was added in. */
async function forget(handler: OfficeExtension.EventHandlerResult<Excel.SelectionChangedEventArgs>): Promise<void> {
  await Excel.run(handler.context as Excel.RequestContext, async (context) => {
    handler.remove();
    await context.sync();
  });
}

/** A spilled cell shows no formula of its own in every host, but it has a value. */
async function isFilled(context: Excel.RequestContext, { sheet, address }: CellPlace): Promise<boolean> {
  const range = sheetNamed(context, sheet).getRange(address);
  range.load(["formulas", "valueTypes"]);
  await context.sync();
  return (
    range.formulas.flat().some((formula) => formula !== "") || range.valueTypes.flat().some((type) => type !== "Empty")
  );
}

async function write(
  context: Excel.RequestContext,
  sheet: Excel.Worksheet,
  address: string,
  cells: readonly (readonly Written[])[],
): Promise<void> {
  const width = Math.max(0, ...cells.map((row) => row.length));
  if (width === 0) return;
  const even = cells.map((row) => Array.from({ length: width }, (_, i) => written(row[i] ?? null)));
  const { row, column } = cellOf(address);
  for (const block of blocksOf(even.length, width)) {
    const range = sheet.getRangeByIndexes(row + block.from, column, block.count, width);
    range.formulas = even.slice(block.from, block.from + block.count);
    await context.sync();
  }
}

/** The host reads text as if it were typed ("1/2" turns into a date, "-50 V" into a broken formula); an apostrophe stops it. */
function written(value: Written): string | number | boolean | null {
  if (typeof value === "object" && value !== null) return value.text === "" ? "" : `'${value.text}`;
  return typeof value !== "string" || value === "" || value.startsWith("=") ? value : `'${value}`;
}

async function goTo(context: Excel.RequestContext, { sheet, address }: CellPlace): Promise<void> {
  const target = sheetNamed(context, sheet);
  target.activate();
  target.getRange(address).select();
  await context.sync();
}

async function replaceSheet(
  context: Excel.RequestContext,
  name: string,
  cells: readonly (readonly Written[])[],
  look?: SheetLook,
): Promise<void> {
  const found = context.workbook.worksheets.getItemOrNullObject(name);
  await context.sync();
  const sheet = found.isNullObject ? context.workbook.worksheets.add(name) : found;
  if (!found.isNullObject) sheet.getRange().clear();
  await write(context, sheet, "A1", cells);
  if (look) dress(sheet, look);
  await context.sync();
}

async function copySheet(context: Excel.RequestContext, name: string, copy: string): Promise<void> {
  sheetNamed(context, name).copy("End").name = copy;
  await context.sync();
}

/** The host measures columns in points, of which 72 make an inch; a pixel is one of 96. */
const pointsInPixel = 72 / 96;

function dress(sheet: Excel.Worksheet, { widths, wrapped, headings }: SheetLook): void {
  widths.forEach((pixels, column) => {
    sheet.getRangeByIndexes(0, column, 1, 1).format.columnWidth = pixels * pointsInPixel;
  });
  const { format } = sheet.getRangeByIndexes(0, 0, Math.max(1, wrapped), widths.length);
  format.wrapText = true;
  format.verticalAlignment = "Top";
  for (const row of headings) sheet.getRangeByIndexes(row, 0, 1, widths.length).format.font.bold = true;
}

/** Points joined by lines over a measured abscissa: of the host's kinds of chart only the scatter kinds have one. */
async function addChart(context: Excel.RequestContext, { sheet, cells, at, ...chart }: Chart): Promise<void> {
  const target = sheetNamed(context, sheet);
  const drawn = target.charts.add("XYScatterLinesNoMarkers", target.getRange(cells), "Columns");
  const { categoryAxis, valueAxis } = drawn.axes;
  drawn.title.text = chart.title;
  categoryAxis.title.text = chart.titleX;
  if (chart.titleY !== "") {
    valueAxis.title.text = chart.titleY;
    drawn.legend.visible = false;
  }
  if (chart.logarithmicX) categoryAxis.scaleType = "Logarithmic";
  drawn.setPosition(at.from, at.to);
  await context.sync();
}

/** Settings of all add-ins of one maker may share a workbook. */
function settingKey(key: string): string {
  return `wallfall.${key}`;
}

async function getSetting(context: Excel.RequestContext, key: string): Promise<string | undefined> {
  const setting = context.workbook.settings.getItemOrNullObject(settingKey(key));
  setting.load("value");
  await context.sync();
  return setting.isNullObject ? undefined : String(setting.value);
}

async function readAll(
  context: Excel.RequestContext,
  progress: (done: number) => void = () => undefined,
  signal?: AbortSignal,
): Promise<WorkbookContent> {
  const { worksheets, names } = context.workbook;
  worksheets.load("items/name");
  names.load("items/name,items/formula");
  await context.sync();
  const content: WorkbookContent = { sheets: [], names: definedNames(names.items) };
  const count = worksheets.items.length;
  for (const [i, sheet] of worksheets.items.entries()) {
    if (signal?.aborted) break;
    content.sheets.push(await readSheet(context, sheet, (done) => progress((i + done) / count), signal));
    progress((i + 1) / count);
  }
  return content;
}

/** The host says "=Inputs!$B$2" for what a name refers to. */
function definedNames(items: readonly Excel.NamedItem[]): Record<string, string> {
  return Object.fromEntries(items.map(({ name, formula }) => [name, String(formula).replace(/^=/, "")]));
}

async function readSheet(
  context: Excel.RequestContext,
  sheet: Excel.Worksheet,
  progress: (done: number) => void,
  signal?: AbortSignal,
): Promise<SheetContent> {
  const used = sheet.getUsedRangeOrNullObject();
  used.load(["rowIndex", "columnIndex", "rowCount", "columnCount"]);
  await context.sync();
  const content: SheetContent = { name: sheet.name, origin: "A1", values: [], formulas: [], spills: [], tables: [] };
  if (used.isNullObject) return content;
  const { rowIndex: row, columnIndex: column, rowCount, columnCount } = used;
  content.origin = a1({ row, column });
  for (const { from, count } of blocksOf(rowCount, columnCount)) {
    if (signal?.aborted) return content;
    const block = sheet.getRangeByIndexes(row + from, column, count, columnCount);
    block.load(["values", "valueTypes", "formulas"]);
    await context.sync();
    content.values.push(
      ...block.values.map((cells, i) => cells.map((cell, j) => readValue(cell, block.valueTypes[i][j]))),
    );
    content.formulas.push(...block.formulas.map((cells) => cells.map(readFormula)));
    progress((from + count) / rowCount);
  }
  content.spills = await readSpills(context, sheet, content, signal);
  for (const { range, anchor } of content.spills) keepOnlyAnchor(content, range, anchor);
  content.tables = await readTables(context, sheet);
  return content;
}

/** Requests and answers of the host on the web are limited to a few MB: no more cells at once than surely fit. */
const cellsAtOnce = 20_000;

function* blocksOf(rows: number, columns: number): Generator<{ from: number; count: number }> {
  const most = Math.max(1, Math.floor(cellsAtOnce / Math.max(1, columns)));
  for (let from = 0; from < rows; from += most) yield { from, count: Math.min(most, rows - from) };
}

/** The host gives an empty cell as "" and an error as its code, both of which text could be: the type tells. */
function readValue(value: unknown, type: string): CellContent {
  if (type === "Empty") return null;
  if (type === "Error") return { error: String(value) };
  return value as number | string | boolean;
}

function readFormula(formula: unknown): string | undefined {
  return typeof formula === "string" && formula.startsWith("=") ? formula : undefined;
}

async function readSpills(
  context: Excel.RequestContext,
  sheet: Excel.Worksheet,
  content: SheetContent,
  signal?: AbortSignal,
): Promise<SheetContent["spills"]> {
  if (!canTellSpills()) return [];
  const origin = cellOf(content.origin);
  const asked = possibleAnchors(content).map(({ row, column }) => {
    const anchor = a1({ row: origin.row + row, column: origin.column + column });
    return { anchor, target: sheet.getRange(anchor).getSpillingToRangeOrNullObject() };
  });
  for (let from = 0; from < asked.length && !signal?.aborted; from += 500) {
    asked.slice(from, from + 500).forEach(({ target }) => target.load("address"));
    await context.sync();
  }
  return asked
    .filter(({ target }) => !signal?.aborted && !target.isNullObject)
    .map(({ anchor, target }) => ({ anchor, range: plainAddress(target.address) }))
    .filter(({ anchor, range }) => range !== anchor);
}

function canTellSpills(): boolean {
  return Office.context.requirements.isSetSupported("ExcelApi", "1.12");
}

/**
 * Each formula costs a request, so ask only of those that may fill cells beside them: the neighbour holds something and
 * no other formula. (Whether the host gives a spilled cell the anchor's formula or none was not seen: both count.)
 */
function possibleAnchors({ values, formulas }: SheetContent): { row: number; column: number }[] {
  const fills = (own: string, row: number, column: number) => {
    const value = values[row]?.[column];
    const formula = formulas[row]?.[column];
    return value !== undefined && value !== null && (formula === undefined || formula === own);
  };
  return formulas.flatMap((cells, row) =>
    cells.flatMap((own, column) =>
      own !== undefined && (fills(own, row, column + 1) || fills(own, row + 1, column)) ? [{ row, column }] : [],
    ),
  );
}

function keepOnlyAnchor(content: SheetContent, range: string, anchor: string): void {
  const origin = cellOf(content.origin);
  const { from, to } = cornersOf(range);
  for (let row = from.row; row <= to.row; row++) {
    for (let column = from.column; column <= to.column; column++) {
      const cells = content.formulas[row - origin.row];
      if (cells && a1({ row, column }) !== anchor) cells[column - origin.column] = undefined;
    }
  }
}

async function readTables(context: Excel.RequestContext, sheet: Excel.Worksheet): Promise<SheetContent["tables"]> {
  sheet.tables.load("items/name,items/showTotals,items/columns/items/name");
  await context.sync();
  const ranges = sheet.tables.items.map((table) => table.getRange());
  ranges.forEach((range) => range.load("address"));
  await context.sync();
  return sheet.tables.items.map(({ name, columns, showTotals }, i) => ({
    name,
    range: withoutTotals(plainAddress(ranges[i].address), showTotals),
    columns: columns.items.map((column) => column.name),
  }));
}

function withoutTotals(range: string, showTotals: boolean): string {
  const { from, to } = cornersOf(range);
  return showTotals ? `${a1(from)}:${a1({ ...to, row: to.row - 1 })}` : range;
}
