import type { CellPlace, Workbook } from "../../taskpane/workbook/workbook";
import { a1, cellOf, cellsIn } from "../../taskpane/workbook/address";
import { noWorkbook } from "../../taskpane/workbook/none";

/** A sheet with one selected cell, which remembers what is written to it. */
export function fakeWorkbook(filled: Record<string, unknown> = {}) {
  const cells: Record<string, unknown> = { ...filled };
  const state = { selected: { sheet: "Chamber", address: "B5" } as CellPlace | undefined };
  const workbook: Workbook = {
    ...noWorkbook,
    capabilities: new Set(["write"]),
    selection: () => Promise.resolve(state.selected),
    isFilled: async ({ address }) => cellsIn(address).some((cell) => cells[a1(cell)] !== undefined),
    write: async ({ address }, rows) => {
      const from = cellOf(address);
      rows.forEach((row, i) =>
        row.forEach((cell, j) => {
          if (cell !== null) cells[a1({ row: from.row + i, column: from.column + j })] = cell;
        }),
      );
    },
  };
  return { workbook, cells, state };
}
