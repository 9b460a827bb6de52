import type { CellPlace, Workbook } from "../../taskpane/workbook/workbook";
import { noWorkbook } from "../../taskpane/workbook/none";

/** A sheet of one selected cell at a time, which remembers what is written to it. */
export function fakeWorkbook(filled: Record<string, unknown> = {}) {
  const cells: Record<string, unknown> = { ...filled };
  const state = { selected: { sheet: "Chamber", address: "B5" } as CellPlace | undefined };
  const workbook: Workbook = {
    ...noWorkbook,
    capabilities: new Set(["write"]),
    selection: () => Promise.resolve(state.selected),
    isFilled: ({ address }) => Promise.resolve(cells[address] !== undefined),
    write: ({ address }, [[formula]]) => Promise.resolve(void (cells[address] = formula)),
  };
  return { workbook, cells, state };
}
