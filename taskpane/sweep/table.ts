import { isTable, type Entry } from "../../functions/cells/entry";
import { prettyUnit } from "../../functions/cells/format";
import type { Input } from "../../functions/cells/inputs";
import { a1, type Cell } from "../workbook/address";
import { labels } from "../pane/labels";
import type { Typed } from "../pane/typed";
import type { Written } from "../workbook/workbook";

/** A sweep as it was asked for: one input runs through values, the others stand as typed. */
export interface Sweep {
  entry: Entry<any>;
  /** Which input runs, by its place. */
  swept: number;
  values: readonly number[];
  /** What stands in the form, one for each input. */
  typed: readonly Typed[];
  /** The unit in which the result is wanted; blank is the function's own. */
  unit: Typed;
}

export interface SweepTable {
  cells: Written[][];
  size: { rows: number; columns: number };
  /** What a chart draws: the headed columns of the swept input and of the result. */
  plotted: { from: Cell; to: Cell };
  headings: string[];
}

/**
 * The sweep as cells from a corner on. Above, the inputs that stand still, each with its name, so that one cell changes
 * the whole sweep; below, a headed column of values, the result that one formula fills down, and what the limits say.
 */
export function sweepTable(sweep: Sweep, corner: Cell): SweepTable {
  const { entry, swept, values, typed } = sweep;
  const still = typed.flatMap(({ cell }, i) => (i !== swept && cell !== null ? [i] : []));
  const head = still.length === 0 ? 0 : still.length + 1;
  const first = corner.row + head + 1;
  const last = first + values.length - 1;
  const reference = typed.map((_, i) => {
    if (i === swept) return `${a1({ row: first, column: corner.column })}:${a1({ row: last, column: corner.column })}`;
    return still.includes(i) ? a1({ row: corner.row + still.indexOf(i), column: corner.column + 1 }) : "";
  });
  const results = resultHeadings(sweep);
  const checked = entry.limits.length > 0;
  const headings = [heading(entry.inputs[swept]), ...results];
  const formula = call(entry.name, [...reference, ...(entry.takesUnit ? [sweep.unit.literal] : [])]);
  const check = call("LIMITCHECK", [`"${entry.name}"`, ...reference]);
  // The result's further columns belong to its formula.
  const filled = new Array<null>(results.length - 1).fill(null);
  const cells = [
    ...still.map((i) => [heading(entry.inputs[i], typed[i].cell), asTyped(typed[i].cell)]),
    ...(head > 0 ? [[]] : []),
    [...headings, ...(checked ? [labels.limits] : [])],
    [values[0], formula, ...filled, ...(checked ? [check] : [])],
    ...values.slice(1).map((value) => [value]),
  ];
  return {
    cells,
    size: { rows: cells.length, columns: Math.max(still.length > 0 ? 2 : 0, headings.length + (checked ? 1 : 0)) },
    plotted: {
      from: { row: first - 1, column: corner.column },
      to: { row: last, column: corner.column + results.length },
    },
    headings,
  };
}

/** Text in the form is text in the cell, whatever it begins with. */
function asTyped(cell: Typed["cell"]): Written {
  return typeof cell === "string" ? { text: cell } : cell;
}

function call(name: string, args: readonly string[]): string {
  const given = [...args];
  while (given.at(-1) === "") given.pop();
  return `=SHEATH.${name}(${given.join(",")})`;
}

/** "n_edge (m⁻³)"; text that brings its own unit needs none. */
function heading({ name, kind, quantity }: Input, cell: unknown = 0): string {
  const unit = kind === "ion" ? "u" : (quantity?.unit ?? "");
  return titled(name, typeof cell === "number" ? unit : "");
}

function resultHeadings({ entry, unit }: Sweep): string[] {
  if (isTable(entry.result)) return entry.result.columns.map((column) => titled(column.name, column.unit));
  return [titled(entry.name, typeof unit.cell === "string" ? unit.cell : entry.result.unit)];
}

function titled(name: string, unit: string): string {
  return unit === "" ? name : `${name} (${prettyUnit(unit)})`;
}
