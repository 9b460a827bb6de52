import type { ICellData, IColumnData, IRowData, IStyleData, IWorksheetData, Nullable } from "@univerjs/core";
import type { FWorksheet } from "@univerjs/preset-sheets-core";
import { a1, cornersOf } from "../../workbook/address";
import type { FileBook, FileCell, FileSheet, FileStyle, FileTable } from "../../workbook/xlsx-book";
import type { Grid } from "../grid/grid";
import { everySheet } from "./book-data";
import { fileStyle } from "./styles";

/** The workbook that the grid shows, as a file holds it: formulas, what they come to, looks, tables and names. */
export function toFileBook(grid: Grid): FileBook {
  const { workbook } = grid;
  const saved = workbook.save();
  const styles = new Styles(saved.styles as Record<string, Nullable<IStyleData>>);
  return {
    sheets: workbook.getSheets().map((sheet) => toFileSheet(grid, sheet, saved.sheets[sheet.getSheetId()], styles)),
    names: workbook.getDefinedNames().map((name) => {
      const sheet = name.getLocalSheetId();
      const local = sheet && sheet !== everySheet ? workbook.getSheetBySheetId(sheet)?.getSheetName() : undefined;
      return { name: name.getName(), refers: name.getFormulaOrRefString(), ...(local ? { sheet: local } : {}) };
    }),
    styles: styles.all,
    leftOut: [],
  };
}

function toFileSheet(grid: Grid, sheet: FWorksheet, saved: Partial<IWorksheetData>, styles: Styles): FileSheet {
  const { contents } = grid;
  const last = contents.extent(sheet);
  const own = (saved.cellData ?? {}) as Record<number, Record<number, Nullable<ICellData>>>;
  const fills = new Map(contents.spills(sheet).map(({ anchor, range }) => [anchor, range]));
  const rows = Math.max(last.row + 1, ...Object.keys(own).map((row) => Number(row) + 1));
  const cells: FileSheet["cells"] = [];
  for (let row = 0; row < rows; row++) {
    const columns = Math.max(
      row <= last.row ? last.column + 1 : 0,
      ...Object.keys(own[row] ?? {}).map((at) => Number(at) + 1),
    );
    for (let column = 0; column < columns; column++) {
      const style = styles.at(own[row]?.[column]?.s, saved.defaultStyle);
      const formula = contents.formula(sheet, { row, column });
      const value = contents.value(sheet, { row, column });
      const cell: FileCell = {
        value: formula !== undefined && value === null ? 0 : value,
        ...(formula === undefined ? {} : { formula }),
        ...(style ? { style } : {}),
      };
      const range = fills.get(a1({ row, column }));
      if (range && range !== `${a1({ row, column })}:${a1({ row, column })}`) cell.fills = range;
      if (cell.value !== null || cell.style || formula !== undefined) (cells[row] ??= [])[column] = cell;
    }
  }
  return {
    name: sheet.getSheetName(),
    ...(sheet.isSheetHidden() ? { hidden: true } : {}),
    cells,
    tables: grid.tables.on(sheet.getSheetId()).map((table) => withHeadings(table, cells)),
    widths: sizes(saved.columnData, ({ w }: Partial<IColumnData>) => w),
    heights: sizes(saved.rowData, ({ h, ia }: Partial<IRowData>) => (ia ? undefined : h)),
    ...(saved.freeze && (saved.freeze.ySplit || saved.freeze.xSplit)
      ? { frozen: { rows: saved.freeze.ySplit, columns: saved.freeze.xSplit } }
      : {}),
    merged: (saved.mergeData ?? []).map(
      ({ startRow, startColumn, endRow, endColumn }) =>
        `${a1({ row: startRow, column: startColumn })}:${a1({ row: endRow, column: endColumn })}`,
    ),
  };
}

function sizes<T>(data: unknown, size: (of: T) => number | undefined): Record<number, number> {
  return Object.fromEntries(
    Object.entries((data ?? {}) as Record<string, T>).flatMap(([at, each]) => {
      const found = each && size(each);
      return found === undefined ? [] : [[at, found]];
    }),
  );
}

/** A spreadsheet finds a table damaged whose columns are not called what their headings say, each once. */
function withHeadings(table: FileTable, cells: FileSheet["cells"]): FileTable {
  const { from } = cornersOf(table.range);
  const taken = new Set<string>();
  const columns = table.columns.map((column, i) => {
    const row = (cells[from.row] ??= []);
    const heading = row[from.column + i];
    const value = heading?.value;
    const typed = value === null || value === undefined || typeof value === "object" ? "" : String(value).trim();
    let name = typed || column.name;
    for (let more = 2; taken.has(name.toLowerCase()); more++) name = `${typed || column.name}${more}`;
    taken.add(name.toLowerCase());
    row[from.column + i] = { ...(heading?.style ? { style: heading.style } : {}), value: name };
    return { ...column, name };
  });
  return { ...table, columns };
}

/** The styles in use, each once; a cell names its own by the grid's id, or holds it. */
class Styles {
  readonly all: FileStyle[] = [{}];
  private readonly places = new Map<string, number>([["{}", 0]]);
  private readonly known = new Map<string, number>();

  constructor(private readonly named: Readonly<Record<string, Nullable<IStyleData>>>) {}

  at(style: ICellData["s"], fallback: IWorksheetData["defaultStyle"] | undefined): number {
    const given = style ?? fallback;
    if (!given) return 0;
    const key = typeof given === "string" ? given : JSON.stringify(given);
    const known = this.known.get(key);
    if (known !== undefined) return known;
    const place = this.placeOf(fileStyle((typeof given === "string" ? this.named[given] : given) ?? {}));
    this.known.set(key, place);
    return place;
  }

  private placeOf(style: FileStyle): number {
    const key = JSON.stringify(style);
    if (!this.places.has(key)) {
      this.places.set(key, this.all.length);
      this.all.push(style);
    }
    return this.places.get(key)!;
  }
}
