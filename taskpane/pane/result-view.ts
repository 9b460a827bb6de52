import { isTable, type Entry } from "../../functions/cells/entry";
import type { Result } from "../../functions/cells/evaluate";
import { prettyUnit } from "../../functions/cells/format";
import { h } from "./h";
import { labels } from "./labels";
import { numberText } from "./number-text";

/** A result as the pane shows it, by its form: one value, or what spills. */
export function resultView(entry: Entry<any>, result: Result, unit: string): HTMLElement {
  if (result.length === 1 && result[0].length === 1) return valueView(result[0][0], unit);
  return tableView(entry, result);
}

/** The message where the whole result is one error. */
export function problemOf(result: Result): string | undefined {
  const cell = result[0]?.[0];
  return result.length === 1 && typeof cell === "object" ? (cell.message ?? cell.code) : undefined;
}

function valueView(cell: Result[number][number], unit: string): HTMLElement {
  if (typeof cell === "object") return h("p", { class: "problem" }, h("code", {}, cell.code), " ", cell.message);
  if (cell === "") return h("p", { class: "value none" }, "Blank, as the inputs are.");
  if (typeof cell !== "number") return h("p", { class: "value words" }, cellText(cell));
  // The unit is in sight as the choice beside the value; read out it belongs to the number.
  return h(
    "p",
    { class: "value" },
    numberText(cell),
    unit !== "" && h("span", { class: "unseen" }, ` ${prettyUnit(unit)}`),
  );
}

const rowsShown = 12;

function tableView(entry: Entry<any>, result: Result): HTMLElement {
  const columns = isTable(entry.result) ? entry.result.columns : [];
  // Some functions spill their own title row on request; the headings here already say as much.
  const titled =
    columns.length > 0 &&
    result.length > 1 &&
    result[0].every((cell) => typeof cell === "string" && cell !== "") &&
    result[1].some((cell) => typeof cell === "number");
  const rows = titled ? result.slice(1) : result;
  const heading = columns.map(({ name, unit }) =>
    h("th", { scope: "col" }, name, unit && h("span", { class: "unit" }, ` ${prettyUnit(unit)}`)),
  );
  const table = h(
    "table",
    {},
    heading.length > 0 && h("thead", {}, h("tr", {}, ...heading)),
    h("tbody", {}, ...rows.slice(0, rowsShown).map((row) => h("tr", {}, ...row.map(dataCell)))),
  );
  const hidden = rows.length - rowsShown;
  return h(
    "div",
    { class: "spill" },
    h("div", { class: "scroller", tabindex: 0, role: "group", "aria-label": labels.spilledTable }, table),
    hidden > 0 && h("p", { class: "more" }, `${hidden} more ${hidden === 1 ? "row" : "rows"} in the sheet.`),
  );
}

function dataCell(cell: Result[number][number]): HTMLElement {
  return h("td", { class: typeof cell === "number" ? "number" : undefined }, cellText(cell));
}

function cellText(cell: Result[number][number]): string {
  if (typeof cell === "object") return `${cell.code} ${cell.message ?? ""}`.trim();
  if (typeof cell === "number") return numberText(cell, 6);
  return typeof cell === "boolean" ? (cell ? "TRUE" : "FALSE") : cell;
}
