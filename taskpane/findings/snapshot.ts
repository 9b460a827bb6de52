import { isCellError } from "../../functions/cells/host";
import { cellsIn, rangesText, type Area } from "./area";
import type { Book } from "./book";
import type { Fill } from "./fill";
import { fingerprint } from "./fingerprint";

/** What one fill was like when the report was written. */
export interface Snapshot {
  sheet: string;
  cells: string;
  formula: string;
  functions: string;
  /** A line for each input: "n_e in Chamber!C6:C45: 2e16; 2.12e16". */
  inputs: string;
  values: string;
  version: string;
}

export function snapshotOf(book: Book, fills: readonly Fill[], version: string): Snapshot[] {
  return fills.map((fill) => ({
    sheet: fill.sheet,
    cells: rangesText(fill.areas, Infinity),
    formula: formulaAt(book, fill) ?? fill.text,
    functions: [...new Set(fill.calls)].join(", "),
    inputs: [...fill.inputs.values()].flatMap(({ name, areas }) => inputLines(book, name, areas.list)).join("\n"),
    values: listed(valuesIn(book, fill.sheet, rangesText(fill.areas, Infinity))),
    version,
  }));
}

/** The formula of the first cell that is told, from which the others' follow. */
function formulaAt(book: Book, { sheet, areas }: Fill): string | undefined {
  return book.sheet(sheet)?.formula(areas[0].row, areas[0].column);
}

function inputLines(book: Book, name: string, areas: readonly Area[]): string[] {
  return areas.map((area) => {
    const range = rangesText([area]);
    return `${name} in ${area.sheet}!${range}: ${listed(valuesIn(book, area.sheet, range))}`;
  });
}

/** The contents of cells as they are told, in the order of the ranges. */
export function valuesIn(book: Book, sheet: string, cells: string): string[] {
  const found = book.sheet(sheet);
  return found ? cellsIn(cells).map(({ row, column }) => told(found.argument(row, column))) : [];
}

/** A content with all its digits; text stands in quotes, so that it can't be taken for anything else. */
export function told(cell: unknown): string {
  if (cell === null || cell === undefined || cell === "") return "";
  if (typeof cell === "number") return String(cell);
  if (typeof cell === "boolean") return cell ? "TRUE" : "FALSE";
  return isCellError(cell) ? (cell as { code: string }).code : JSON.stringify(cell);
}

/** Cells hold 32,767 characters; long lists are told by their number and a fingerprint. */
const longest = 8000;

export function listed(values: readonly string[]): string {
  const list = values.join("; ");
  return list.length <= longest ? list : `${values.length} cells: ${fingerprint(values)}`;
}

/** The list again; undefined where only its fingerprint was kept. */
export function unlisted(list: string): string[] | undefined {
  if (/^\d+ cells: \w+$/.test(list)) return undefined;
  const found = [""];
  // A semicolon inside quotes separates nothing.
  for (const [part] of list.matchAll(/"(?:[^"\\]|\\.)*"|[^;"]+|;/g)) {
    if (part === ";") found.push("");
    else found[found.length - 1] += part;
  }
  return found.map((each, i) => (i === 0 ? each : each.slice(1)));
}

export interface SnapshotInput {
  name: string;
  sheet: string;
  range: string;
  values: string;
}

export function inputsOf({ inputs }: Snapshot): SnapshotInput[] {
  return inputs.split("\n").flatMap((line) => {
    const found = /^(.+?) in (.+)!([A-Z]+\d+(?::[A-Z]+\d+)?): (.*)$/.exec(line);
    return found ? [{ name: found[1], sheet: found[2], range: found[3], values: found[4] }] : [];
  });
}
