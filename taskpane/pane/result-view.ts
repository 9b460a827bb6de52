import { isTable, type Entry, type Table } from "../../functions/cells/entry";
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
  const rows = withoutTitles(columns, result);
  const hidden = rows.length - rowsShown;
  return h(
    "div",
    { class: "spill" },
    h(
      "div",
      { class: "scroller", tabindex: 0, role: "group", "aria-label": labels.spilledTable },
      rows.length === 1 && columns.length > 1 ? standing(columns, rows[0]) : lying(columns, rows.slice(0, rowsShown)),
    ),
    hidden > 0 && h("p", { class: "more" }, `${hidden} more ${hidden === 1 ? "row" : "rows"} in the sheet.`),
  );
}

/** Some functions spill a title row of their own on request; the headings here already say as much. */
function withoutTitles(columns: Columns, result: Result): Result {
  const titled =
    result.length > 1 &&
    columns.length > 0 &&
    result[0].every((cell) => typeof cell === "string" && cell !== "") &&
    result[1].some((cell) => typeof cell === "number");
  return titled ? result.slice(1) : result;
}

type Columns = Table["columns"];

/** Columns as in the sheet. */
function lying(columns: Columns, rows: Result): HTMLElement {
  return h(
    "table",
    {},
    columns.length > 0 && h("thead", {}, h("tr", {}, ...columns.map((column) => heading(column, "col")))),
    h("tbody", {}, ...rows.map((row) => h("tr", {}, ...row.map(dataCell)))),
  );
}

/** A single row reads better downwards; the last column may spill on to the right. */
function standing(columns: Columns, row: Result[number]): HTMLElement {
  const lines = row.map((cell, i) => h("tr", {}, heading(columns[i] ?? columns.at(-1)!, "row"), dataCell(cell)));
  return h("table", {}, h("tbody", {}, ...lines));
}

function heading({ name, unit }: Columns[number], scope: "col" | "row"): HTMLElement {
  return h("th", { scope }, name, unit !== "" && h("span", { class: "unit" }, ` ${prettyUnit(unit)}`));
}

function dataCell(cell: Result[number][number]): HTMLElement {
  return h("td", { class: typeof cell === "number" ? "number" : "text" }, cellText(cell));
}

function cellText(cell: Result[number][number]): string {
  if (typeof cell === "object") return `${cell.code} ${cell.message ?? ""}`.trim();
  if (typeof cell === "number") return numberText(cell, 6);
  return typeof cell === "boolean" ? (cell ? "TRUE" : "FALSE") : cell;
}
