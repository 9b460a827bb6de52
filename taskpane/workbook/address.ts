/** A1 addresses within one sheet; rows and columns are counted from 0. */

export interface Cell {
  row: number;
  column: number;
}

/** "A" for 0, "Z" for 25, "AA" for 26. */
export function columnLetters(column: number): string {
  const last = String.fromCharCode(65 + (column % 26));
  return column < 26 ? last : columnLetters(Math.floor(column / 26) - 1) + last;
}

export function a1({ row, column }: Cell): string {
  return `${columnLetters(column)}${row + 1}`;
}

/** The cell at an address such as "B5" or "$B$5". */
export function cellOf(address: string): Cell {
  const [, letters, digits] = /^\$?([A-Z]{1,3})\$?(\d+)$/i.exec(address.trim()) ?? [];
  if (!letters) throw new Error(`"${address}" is not the address of a cell, such as B5.`);
  const column = [...letters.toUpperCase()].reduce((sum, letter) => sum * 26 + letter.charCodeAt(0) - 64, 0) - 1;
  return { row: Number(digits) - 1, column };
}

/** The first and the last cell of a range such as "B5:D9"; a single cell is both. */
export function cornersOf(range: string): { from: Cell; to: Cell } {
  const [first, last = first] = range.split(":");
  return { from: cellOf(first), to: cellOf(last) };
}

/** Every cell of a range, row by row. */
export function cellsIn(range: string): Cell[] {
  const { from, to } = cornersOf(range);
  const columns = to.column - from.column + 1;
  return Array.from({ length: (to.row - from.row + 1) * columns }, (_, i) => ({
    row: from.row + Math.floor(i / columns),
    column: from.column + (i % columns),
  }));
}
