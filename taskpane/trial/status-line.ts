import { a1 } from "../workbook/address";
import type { CellContent } from "../workbook/workbook";
import { h } from "../pane/h";
import { selectedCell, type Grid } from "./grid/grid";

const idle =
  "Select a cell to read its whole content here, or why it shows an error. F6 moves between the sheet and the pane.";

/** Under the grid: the selected cell's error with its message, or its whole content, now and after every calculation. */
export function mountStatusLine(place: HTMLElement, grid: Grid): void {
  let shown = "";
  const show = () => {
    const { sheet, cell } = selectedCell(grid);
    const content = grid.contents.value(sheet, cell);
    const text = saidOf(a1(cell), content, grid.contents.filledFrom(sheet, cell));
    // Unchanged text must not be written again: a screen reader would read it out again.
    if (text.join() === shown) return;
    shown = text.join();
    const [code, message] = text;
    place.replaceChildren(...(message ? [h("strong", {}, code), " ", message] : [code]));
  };
  grid.onSelection(show);
  grid.onCalculated(show);
  grid.onOpened(show);
  show();
}

/** An error with its message, a number with all its digits, or what else the cell holds; the cells are a mere picture. */
function saidOf(address: string, content: CellContent, filledFrom: string | undefined): string[] {
  if (content === null || content === "") return [idle];
  if (typeof content === "object")
    return [`${address} ${content.error}`, content.message ?? unexplained(content.error)];
  return [address, filledFrom ? `${spell(content)} (filled by the formula in ${filledFrom})` : spell(content)];
}

function spell(content: number | string | boolean): string {
  if (typeof content === "boolean") return content ? "TRUE" : "FALSE";
  return typeof content === "number" && Math.abs(content) >= 1e9 ? content.toExponential() : String(content);
}

/** Errors without a message of ours: of the grid's own functions, or passed on by a function from the cells it reads. */
function unexplained(code: string): string {
  if (code === "#NAME?") return "There is no function or name of this spelling; ours begin with SHEATH.";
  if (code === "#SPILL!") return "The result needs more cells than are empty below and beside this one.";
  if (code === "#DIV/0!") return "A division by zero, here or in a cell that this formula reads.";
  return "The error arises in this formula, or in a cell that it reads: select that cell to read why.";
}
