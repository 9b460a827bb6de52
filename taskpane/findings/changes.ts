import { entryNamed } from "../../functions/catalogue";
import { a1, cellOf } from "../workbook/address";
import { cellsIn, rangesText, rectanglesOf, pack } from "./area";
import { Parser } from "./expression";
import type { Fill } from "./fill";
import type { Look } from "./look";
import { inputsOf, listed, unlisted, valuesIn, type Snapshot } from "./snapshot";
import { counted } from "./words";

/** What is not as it was when the report was written, and why. */
export interface Change {
  sheet: string;
  cells: string;
  what: string;
  /** A reason each: an input, the formula, a version of the function. */
  why: string[];
}

/** Compares a workbook with the snapshot of its report; `version` is that of the functions now. */
export function changesSince(then: readonly Snapshot[], { book, fills }: Look, version: string): Change[] {
  const now = fillsByCell(fills);
  const parser = new Parser();
  const known = new Set<Fill>();
  const changes = then.flatMap((before) => {
    const fill = cellsIn(before.cells)
      .map((cell) => now.get(place(before.sheet, a1(cell))))
      .find(Boolean);
    if (!fill)
      return [
        {
          sheet: before.sheet,
          cells: before.cells,
          what: "no longer calls a function",
          why: [`it was ${before.formula}`],
        },
      ];
    known.add(fill);
    return changeOf(before, fill);
  });
  const added = fills.filter((fill) => !known.has(fill));
  return [
    ...changes,
    ...added.map(({ sheet, areas, text }) => ({
      sheet,
      cells: rangesText(areas),
      what: "is new",
      why: [`it is ${text}`],
    })),
  ];

  function changeOf(before: Snapshot, fill: Fill): Change[] {
    const first = a1(cellsIn(before.cells)[0]);
    const own = book.sheet(before.sheet)?.formula(cellOf(first).row, cellOf(first).column);
    const isOtherFormula =
      own !== undefined && parser.parse(before.formula, cellOf(first)).form !== parser.parse(own, cellOf(first)).form;
    const values = valuesIn(book, before.sheet, before.cells);
    const cells = differing(before.cells, before.values, values);
    if (cells.length === 0 && !isOtherFormula) return [];
    const why = [
      ...(isOtherFormula ? [`the formula was ${before.formula}`] : []),
      ...inputsOf(before).flatMap(({ name, sheet, range, values: were }) => {
        const other = differing(range, were, valuesIn(book, sheet, range));
        return other.length === 0 ? [] : [inputChange(name, sheet === before.sheet ? "" : `${sheet}!`, other)];
      }),
      ...versionChanges(fill.calls, before.version, version),
    ];
    const what = cells.length === 0 ? "has another formula and the same value" : valueChange(cells);
    const where = cells.length === 0 || cells[0].cell === "" ? before.cells : rangesOf(before.sheet, cells);
    return [
      { sheet: before.sheet, cells: where, what, why: why.length > 0 ? why : ["nothing that it reads has changed"] },
    ];
  }
}

interface Difference {
  /** "" where only the list as a whole is known to differ. */
  cell: string;
  was: string;
  is: string;
}

function differing(cells: string, were: string, are: readonly string[]): Difference[] {
  const before = unlisted(were);
  if (!before) return were === listed(are) ? [] : [{ cell: "", was: "", is: "" }];
  return cellsIn(cells).flatMap((cell, i) => {
    const [was = "", is = ""] = [before[i], are[i]];
    return isSame(was, is) ? [] : [{ cell: a1(cell), was, is }];
  });
}

/** As for saved values: machines differ in the last digits. */
function isSame(a: string, b: string): boolean {
  if (a === b) return true;
  const [x, y] = [Number(a), Number(b)];
  return a !== "" && b !== "" && Math.abs(x - y) <= 1e-9 * Math.max(Math.abs(x), Math.abs(y));
}

function valueChange(differences: readonly Difference[]): string {
  const [{ cell, was, is }] = differences;
  if (cell === "") return "some of its values changed";
  const more = differences.length > 1 ? `, ${counted(differences.length - 1, "more value")} changed` : "";
  return `${cell} was ${was || "blank"}, is ${is || "blank"}${more}`;
}

function inputChange(name: string, sheet: string, differences: readonly Difference[]): string {
  const [{ cell, was, is }] = differences;
  if (cell === "") return `input ${name}: some of its cells changed`;
  const more = differences.length > 1 ? `, and ${counted(differences.length - 1, "more cell")}` : "";
  return `input ${name}: ${sheet}${cell} was ${was || "blank"}, is ${is || "blank"}${more}`;
}

function rangesOf(sheet: string, differences: readonly Difference[]): string {
  const cells = differences.map(({ cell }) => cellOf(cell)).map(({ row, column }) => pack(row, column));
  return rangesText(rectanglesOf(sheet, cells));
}

/** What the functions' own histories say of the versions since. */
function versionChanges(calls: readonly string[], before: string, version: string): string[] {
  return [...new Set(calls)].flatMap((name) =>
    Object.entries(entryNamed(name)?.changes ?? {})
      .filter(([since]) => isLater(since, before) && !isLater(since, version))
      .map(([since, change]) => `${name} changed in version ${since}: ${change}`),
  );
}

/** Whether a version such as 1.10.0 comes after another; one that is no number comes after none. */
export function isLater(a: string, b: string): boolean {
  const [x, y] = [a, b].map((version) => version.split(".").map(Number));
  if ([...x, ...y].some(Number.isNaN)) return false;
  const at = x.findIndex((part, i) => part !== (y[i] ?? 0));
  return at >= 0 && x[at] > (y[at] ?? 0);
}

function fillsByCell(fills: readonly Fill[]): Map<string, Fill> {
  const found = new Map<string, Fill>();
  for (const fill of fills)
    for (const cell of cellsIn(rangesText(fill.areas, Infinity))) found.set(place(fill.sheet, a1(cell)), fill);
  return found;
}

function place(sheet: string, address: string): string {
  return `${sheet}!${address}`;
}
