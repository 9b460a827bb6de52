import type { FileCell } from "../../taskpane/workbook/xlsx-book";
import { writeBook } from "../../taskpane/workbook/xlsx-write";

/**
 * A workbook of so many rows: densities, temperatures, a Debye length filled by one call, twice the temperature row by
 * row. The values stored for its formulas are wrong on purpose: what is right was calculated by whoever opened it.
 */
export function longBook(rows: number): Uint8Array {
  const last = rows + 1;
  const cells: FileCell[][] = [["n", "T_e", "Debye length", "2 T_e"].map((value) => ({ value }))];
  for (let row = 2; row <= last; row++)
    cells.push([
      { value: 1e15 * (1 + (row % 100)) },
      { value: 2 + (row % 7) },
      { value: -1 },
      { value: -1, formula: `=B${row}*2` },
    ]);
  cells[1][2] = { value: -1, formula: `=SHEATH.DEBYELENGTH(A2:A${last},B2:B${last})`, fills: `C2:C${last}` };
  const sheet = { name: "Long", cells, tables: [], widths: {}, heights: {}, merged: [] };
  return writeBook({ sheets: [sheet], names: [], styles: [{}], leftOut: [] });
}
