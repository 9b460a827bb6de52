import { a1, cellsIn as cellsOfRange, cornersOf, type Cell } from "../workbook/address";

/** A rectangle of cells on one sheet; rows and columns are counted from 0. */
export interface Area extends Cell {
  sheet: string;
  rows: number;
  columns: number;
}

/** The corners of a range such as "B5:D9" on a sheet. */
export function areaOf(sheet: string, range: string): Area {
  const { from, to } = cornersOf(range);
  return { sheet, ...from, rows: to.row - from.row + 1, columns: to.column - from.column + 1 };
}

export function rangeText({ row, column, rows, columns }: Area): string {
  const first = a1({ row, column });
  return rows * columns === 1 ? first : `${first}:${a1({ row: row + rows - 1, column: column + columns - 1 })}`;
}

export function contains(area: Area, { row, column }: Cell): boolean {
  return row >= area.row && row < area.row + area.rows && column >= area.column && column < area.column + area.columns;
}

/** A cell of a sheet as one number, so that 100,000 of them cost little; sheets end at column 16,384. */
export type Packed = number;

const columnsInSheet = 16384;

export function pack(row: number, column: number): Packed {
  return row * columnsInSheet + column;
}

export function unpack(packed: Packed): Cell {
  return { row: Math.floor(packed / columnsInSheet), column: packed % columnsInSheet };
}

/** Cells in any order as few rectangles: down the columns first, then neighbouring columns of equal height together. */
export function rectanglesOf(sheet: string, cells: readonly Packed[]): Area[] {
  const downwards = [...new Set(cells)].map(unpack).sort((a, b) => a.column - b.column || a.row - b.row);
  const found: Area[] = [];
  for (const { row, column } of downwards) {
    const last = found.at(-1);
    if (last && last.column === column && last.row + last.rows === row) last.rows++;
    else found.push({ sheet, row, column, rows: 1, columns: 1 });
  }
  return besideEachOther(found);
}

function besideEachOther(columns: readonly Area[]): Area[] {
  const found: Area[] = [];
  const open = new Map<string, Area>();
  for (const next of columns) {
    const key = `${next.row},${next.rows}`;
    const left = open.get(key);
    if (left && left.column + left.columns === next.column) left.columns++;
    else {
      const area = { ...next };
      found.push(area);
      open.set(key, area);
    }
  }
  return found;
}

/** Cells as ranges: "C5:C84, E5"; long lists end with how many more there are. */
export function rangesText(areas: readonly Area[], most = 6): string {
  const shown = areas.slice(0, most).map(rangeText).join(", ");
  return areas.length > most ? `${shown} and ${areas.length - most} more` : shown;
}

/** All cells of ranges written by rangesText without a bound. */
export function cellsIn(ranges: string): Cell[] {
  return ranges.split(", ").flatMap(cellsOfRange);
}

/** Areas met one by one, kept as few: one right below the last of its columns joins it, one met before is let go. */
export class Areas {
  private readonly found: Area[] = [];
  private readonly lowest = new Map<string, Area>();

  add(area: Area): void {
    const key = `${area.column},${area.columns},${area.sheet}`;
    const last = this.lowest.get(key);
    if (last && area.row >= last.row && area.row + area.rows <= last.row + last.rows) return;
    if (last && area.row === last.row + last.rows) {
      last.rows += area.rows;
      return;
    }
    const own = { ...area };
    this.lowest.set(key, own);
    this.found.push(own);
  }

  get list(): readonly Area[] {
    return this.found;
  }
}
