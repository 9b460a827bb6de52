import type { Entry } from "../../functions/cells/entry";
import { noPlainForm, plainCells } from "../twin/plain-cells";
import { cellOf } from "../workbook/address";
import { firstFilled } from "../workbook/filled";
import type { Workbook } from "../workbook/workbook";
import { h } from "./h";
import { labels } from "./labels";
import { answered, spell } from "./write-view";

/**
 * The button that writes the call of the moment as ordinary arithmetic, for readers who have no such functions and for
 * auditors. Undefined where there is no sheet to write to; where the function has no plain form, why.
 */
export function plainCellsView(
  entry: Entry<any>,
  workbook: Workbook,
  args: () => readonly unknown[],
): HTMLElement | undefined {
  if (!workbook.capabilities.has("write")) return undefined;
  if (typeof entry.twin !== "object") return h("p", { class: "write" }, noPlainForm(entry.twin));
  const said = h("p", { class: "said", role: "status" });
  const press = async () => (said.textContent = await answered(writePlainCells(entry, workbook, args())));
  return h("div", { class: "write" }, h("button", { type: "button", click: press }, labels.writePlainCells), said);
}

/** Writes from the selected cell on, and only where nothing stands: what would be lost is more than one cell. */
export async function writePlainCells(
  entry: Entry<any>,
  workbook: Workbook,
  args: readonly unknown[],
): Promise<string> {
  const from = await workbook.selection();
  if (!from) return "No cell is selected: select one in the sheet first.";
  const block = plainCells(entry, args, cellOf(from.address));
  if (typeof block === "string") return block;
  const [rows, columns] = [block.cells.length, block.cells[0].length];
  const filled = await firstFilled(workbook, from, rows, columns);
  if (filled) {
    return `${spell(filled)} is filled. Select a cell with ${rows} rows and ${columns} columns free below and beside it.`;
  }
  await workbook.write(from, block.cells);
  return `Written from ${spell(from)} on, ${rows} rows by ${columns} columns.`;
}
