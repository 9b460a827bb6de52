import { a1 } from "../workbook/address";
import type { CellContent } from "../workbook/workbook";
import { h } from "../pane/h";
import { selectedCell, type Grid } from "./grid/grid";

const idle = "Select a cell that shows an error to read its message here. F6 moves between the sheet and the pane.";

/** Under the grid: the whole message of the selected cell's error, now and after every calculation. */
export function mountStatusLine(place: HTMLElement, grid: Grid): void {
  let shown = "";
  const show = () => {
    const { sheet, cell } = selectedCell(grid);
    const text = saidOf(a1(cell), grid.contents.value(sheet, cell));
    // Unchanged text must not be written again: a screen reader would read it out again.
    if (text.join() === shown) return;
    shown = text.join();
    const [code, message] = text;
    place.replaceChildren(...(message ? [h("strong", {}, code), " ", message] : [code]));
  };
  grid.onSelection(show);
  grid.onCalculated(show);
  show();
}

function saidOf(address: string, content: CellContent): string[] {
  if (content === null || typeof content !== "object") return [idle];
  return [`${address} ${content.error}`, content.message ?? unexplained(content.error)];
}

/** Errors without a message of ours: of the grid's own functions, or passed on by a function from the cells it reads. */
function unexplained(code: string): string {
  if (code === "#NAME?") return "There is no function or name of this spelling; ours begin with SHEATH.";
  if (code === "#SPILL!") return "The result needs more cells than are empty below and beside this one.";
  if (code === "#DIV/0!") return "A division by zero, here or in a cell that this formula reads.";
  return "The error comes from a cell that this formula reads; select that cell to read why.";
}
