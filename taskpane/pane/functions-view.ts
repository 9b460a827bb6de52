import { entryNamed } from "../../functions/catalogue";
import type { Workbook } from "../workbook/workbook";
import { functionList } from "./function-list";
import type { Drafts } from "./calculation";
import { functionPage } from "./function-page";
import { h } from "./h";
import { labels } from "./labels";
import type { View } from "./view";
import type { Words } from "./words";

/** The list of all functions at "#", and each function's page at "#NAME", which is also its help link. */
export function functionsView(words: ReadonlyMap<string, Words>, workbook: Workbook): View {
  const drafts: Drafts = new Map();
  let query = "";
  const list = () => functionList(words, query, (typed) => (query = typed));
  return {
    label: labels.functions,
    home: "",
    // All that no other view opens.
    opens: () => false,
    show(address) {
      const entry = entryNamed(address);
      if (entry) return functionPage(entry, words.get(entry.name), drafts, workbook);
      // Hosts put addresses of their own behind the "#": only what looks like a function is missed aloud.
      const missing =
        /^[A-Z][A-Z.]+$/i.test(address) && h("p", { class: "problem" }, `There is no function named ${address} here.`);
      return h("div", {}, missing, list());
    },
  };
}
