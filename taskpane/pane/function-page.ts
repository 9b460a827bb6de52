import type { Entry } from "../../functions/cells/entry";
import type { Workbook } from "../workbook/workbook";
import { breakable } from "./breakable";
import { calculationView, type Drafts } from "./calculation";
import { factsView } from "./facts-view";
import { signature } from "./fields";
import { h } from "./h";
import { labels } from "./labels";
import { section } from "./section";
import type { Words } from "./words";

/** All there is to know of one function, and the function itself at the values typed in. */
export function functionPage(
  entry: Entry<any>,
  words: Words | undefined,
  drafts: Drafts,
  workbook: Workbook,
): HTMLElement {
  const limits = h("div");
  const calculation = calculationView(entry, words, drafts, workbook, (next) => limits.replaceChildren(next));
  return h(
    "article",
    { class: "page", "data-function": entry.name },
    h("nav", { "aria-label": labels.back }, h("a", { class: "back", href: "#" }, labels.allFunctions)),
    h("h2", { tabindex: -1 }, entry.name),
    words?.meaning && h("p", { class: "lead" }, words.meaning),
    h("code", { class: "signature" }, ...breakable(signature(entry))),
    section(labels.limits, limits),
    ...calculation,
    ...factsView(entry),
  );
}
