import type { CellPlace, Workbook } from "../workbook/workbook";
import { breakable } from "./breakable";
import { h } from "./h";
import { labels } from "./labels";

/** The formula of the moment, and the way it gets into the sheet, or onto the clipboard where there is none. */
export interface WriteView {
  element: HTMLElement;
  /** A formula to write, or why a sheet would refuse it. */
  offer(formula: string, problem: string | undefined): void;
}

export function writeView(workbook: Workbook): WriteView {
  const shown = h("code", { class: "formula" });
  const said = h("p", { class: "said", role: "status" });
  const say = (text: string) => (said.textContent = text);
  let formula = "";
  let problem: string | undefined;
  const act = workbook.capabilities.has("write") ? writer(workbook) : copy;
  const label = workbook.capabilities.has("write") ? labels.writeToCell : labels.copyFormula;
  const press = async () => say(problem ?? (await answered(act(formula))));
  const element = h("div", { class: "write" }, shown, h("button", { type: "button", click: press }, label), said);
  const offer = (next: string, refused: string | undefined) => {
    if (next !== formula) say("");
    formula = next;
    problem = refused;
    shown.replaceChildren(...breakable(next));
  };
  return { element, offer };
}

/** Writes to the selected cell; where something stands there, only when asked again for the same cell and formula. */
export function writer(workbook: Workbook): (formula: string) => Promise<string> {
  let asked = "";
  return async (formula) => {
    const place = await workbook.selection();
    if (!place) return "No cell is selected: select one in the sheet first.";
    const asking = `${spell(place)} ${formula}`;
    if (asking !== asked && (await workbook.isFilled(place))) {
      asked = asking;
      return `${spell(place)} is filled. Press again to overwrite it.`;
    }
    asked = "";
    await workbook.write(place, [[formula]]);
    return `Written to ${spell(place)}.`;
  };
}

async function copy(formula: string): Promise<string> {
  try {
    await navigator.clipboard.writeText(formula);
  } catch {
    return "This page may not use the clipboard: select the formula above and copy it.";
  }
  return "Copied: paste it into a cell of a sheet that has these functions.";
}

/** What an action says, or why it did not work. */
export async function answered(action: Promise<string>): Promise<string> {
  try {
    return await action;
  } catch (error) {
    return `That did not work: ${error instanceof Error ? error.message : String(error)}`;
  }
}

export function spell({ sheet, address }: CellPlace): string {
  return `${address} on “${sheet}”`;
}
