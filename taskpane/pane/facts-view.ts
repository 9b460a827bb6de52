import type { Entry } from "../../functions/cells/entry";
import type { Source } from "../../functions/sources";
import { equationView } from "./equation";
import { h } from "./h";
import { labels } from "./labels";
import { section } from "./section";

/** What stands below the calculation: equation, accuracy, sources, and what each version changed. */
export function factsView(entry: Entry<any>): HTMLElement[] {
  const equation = equationView(entry.name);
  const changes = Object.entries(entry.changes).map(([version, change]) =>
    h("li", {}, h("b", {}, version), ` ${change}`),
  );
  return [
    ...(equation ? [section(labels.equation, equation)] : []),
    section(labels.accuracy, h("p", {}, `${entry.accuracy[0].toUpperCase()}${entry.accuracy.slice(1)}.`)),
    section(labels.sources, h("ul", { class: "sources" }, ...sourcesOf(entry).map(sourceView))),
    section(labels.changes, h("ul", { class: "changes" }, ...changes)),
  ];
}

/** Those of the model and those of its limits, each once. */
function sourcesOf(entry: Entry<any>): Source[] {
  return [...new Set([...entry.sources, ...entry.limits.map(({ source }) => source)])];
}

function sourceView({ key, text }: Source): HTMLElement {
  return h("li", {}, h("b", {}, key), ` ${text}`);
}
