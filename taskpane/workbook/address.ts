/** A1 addresses of one sheet, rows and columns counted from 0. */

/** "A" for 0, "Z" for 25, "AA" for 26. */
export function columnLetters(column: number): string {
  const last = String.fromCharCode(65 + (column % 26));
  return column < 26 ? last : columnLetters(Math.floor(column / 26) - 1) + last;
}

export function toA1(row: number, column: number): string {
  return `${columnLetters(column)}${row + 1}`;
}

export function fromA1(address: string): { row: number; column: number } {
  const [, letters, digits] = /^\$?([A-Z]{1,3})\$?(\d+)$/i.exec(address.trim()) ?? [];
  if (!letters) throw new Error(`"${address}" is not the address of a cell, such as B5.`);
  const column = [...letters.toUpperCase()].reduce((sum, letter) => sum * 26 + letter.charCodeAt(0) - 64, 0) - 1;
  return { row: Number(digits) - 1, column };
}
