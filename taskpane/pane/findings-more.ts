import type { Use } from "../findings/look";
import { counted } from "../findings/words";
import type { Found } from "./findings-found";
import { placesView } from "./findings-places";
import { h } from "./h";
import { labels } from "./labels";

/** What stands below the findings: what changed since the report, what was not followed, and every call. */
export function moreOf(found: Found): HTMLElement[] {
  return [changesView(found), notFollowedView(found), callsView(found)].filter((each) => each !== undefined);
}

function changesView({ workbook, report, changes }: Found): HTMLElement | undefined {
  if (!report || report.snapshot.length === 0) return undefined;
  const list = changes.map(({ sheet, cells, what, why }) =>
    h(
      "li",
      { class: "finding" },
      h("p", { class: "where" }, ...placesView(workbook, sheet, cells), h("span", { class: "on" }, ` on ${sheet}`)),
      h("p", { class: "what" }, what[0].toUpperCase() + what.slice(1), "."),
      h("p", { class: "detail" }, `${why.join("; ")}.`),
    ),
  );
  return h(
    "section",
    { class: "group" },
    h("h3", {}, labels.changesSince),
    list.length === 0 ? h("p", {}, "No value and no formula has changed.") : h("ul", { class: "found-list" }, ...list),
  );
}

function notFollowedView({ workbook, look }: Found): HTMLElement | undefined {
  if (look.notFollowed.length === 0) return undefined;
  const list = look.notFollowed.map(({ sheet, cells, count, why }) =>
    h(
      "li",
      { class: "finding" },
      h(
        "p",
        { class: "where" },
        ...placesView(workbook, sheet, cells),
        h("span", { class: "on" }, ` on ${sheet}${count > 1 ? `, ${count} formulas` : ""}`),
      ),
      h("p", { class: "detail" }, `${why[0].toUpperCase()}${why.slice(1)}.`),
    ),
  );
  return h(
    "section",
    { class: "group" },
    h("h3", {}, labels.notFollowed),
    h("p", { class: "hint" }, "These formulas were neither computed again nor judged as a whole; nothing was guessed."),
    h("ul", { class: "found-list" }, ...list),
  );
}

function callsView({ workbook, look }: Found): HTMLElement | undefined {
  if (look.uses.length === 0) return undefined;
  const rows = look.uses.map(({ function: name, calls, where }: Use) =>
    h(
      "li",
      { class: "finding" },
      h(
        "p",
        { class: "where" },
        h("a", { href: `#${name}` }, name),
        h("span", { class: "on" }, ` ${counted(calls, "call")}`),
      ),
      ...where.map(({ sheet, cells }) =>
        h("p", { class: "detail" }, ...placesView(workbook, sheet, cells), ` on ${sheet}`),
      ),
    ),
  );
  return h("details", { class: "group" }, h("summary", {}, labels.calls), h("ul", { class: "found-list" }, ...rows));
}
