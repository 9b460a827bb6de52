import { entryNamed } from "../../functions/catalogue";
import { isTable, type Entry } from "../../functions/cells/entry";
import { prettyUnit } from "../../functions/cells/format";
import type { Quantity } from "../../functions/cells/quantities";
import { conversionTo, numberAndUnit } from "../../functions/cells/quantity-text";
import { unitInHeading } from "../../functions/cells/series";
import { pack } from "./area";
import type { Book, Sheet } from "./book";
import type { Expression } from "./expression";
import type { Fill } from "./fill";
import { cellOf, linesOf, type Line } from "./lines";
import type { Tally } from "./tally";

/** Notes bare numbers that a function reads in one unit while their heading names another. */
export function noteHeadings(book: Book, fill: Fill, tally: Tally): void {
  for (const { input, name, areas, call } of fill.inputs.values()) {
    if (!input?.quantity?.unit || input.kind === "block") continue;
    for (const line of linesOf(areas.list)) {
      const other = otherUnit(book.sheet(line.sheet)!, line, input.quantity);
      if (other === undefined) continue;
      const what = `${name} is read in ${unitOf(input.quantity)}, the heading says ${other}`;
      noteLine(book, line, what, fill.calls[call], tally);
    }
  }
}

/** Notes results in one unit under a heading that names another; only where the call is the whole formula. */
export function noteResultHeadings(book: Book, fill: Fill, expression: Expression, tally: Tally): void {
  if (expression.is !== "sheath") return;
  const entry = entryNamed(expression.name);
  const unit = entry && resultUnit(entry, expression.args);
  if (!entry || isTable(entry.result) || unit === undefined) return;
  const quantity: Quantity = { ...entry.result, unit };
  for (const line of linesOf(fill.areas)) {
    const other = otherUnit(book.sheet(line.sheet)!, line, quantity);
    if (other === undefined) continue;
    noteLine(book, line, `${entry.name} gives ${unitOf(quantity)}, the heading says ${other}`, entry.name, tally);
  }
}

/** Undefined where the result has no unit, or one that only a cell tells. */
function resultUnit(
  { takesUnit, inputs, result }: Entry<any>,
  args: readonly (Expression | undefined)[],
): string | undefined {
  if (!takesUnit || isTable(result)) return undefined;
  const asked = args[inputs.length];
  if (!asked) return result.unit;
  return asked.is === "constant" && typeof asked.cells[0][0] === "string" ? asked.cells[0][0].trim() : undefined;
}

function unitOf({ unit }: Quantity): string {
  return prettyUnit(unit);
}

function noteLine(book: Book, line: Line, what: string, name: string, tally: Tally): void {
  const sheet = book.sheet(line.sheet)!;
  for (let i = 0; i < line.length; i++) {
    const { row, column } = cellOf(line, i);
    // Text has its unit in it, and is taken at its word.
    if (typeof sheet.value(row, column) !== "number") continue;
    tally
      .draft(`heading|${line.sheet}|${line.across ? row : column}|${what}`, () => ({
        cause: "heading",
        sheet: line.sheet,
        what,
      }))
      .by([name])
      .add(pack(row, column));
  }
}

/** How far from its numbers a heading may stand. */
const reach = 3;

/** The unit in the nearest heading that is one for this quantity, where a bare number would mean something else in it. */
function otherUnit(sheet: Sheet, { row, column, across, length }: Line, quantity: Quantity): string | undefined {
  const before: [number, number][] = across || length === 1 ? [[0, -1]] : [];
  for (const [down, right] of [...before, ...(across ? [] : ([[-1, 0]] as [number, number][]))]) {
    for (let i = 1; i <= reach; i++) {
      const text = sheet.value(row + i * down, column + i * right);
      if (typeof text !== "string" || text === "") break;
      const found = unitIn(text, quantity);
      if (found) return found.isOwn ? undefined : found.text;
    }
  }
  return undefined;
}

function unitIn(heading: string, quantity: Quantity): { text: string; isOwn: boolean } | undefined {
  for (const text of [unitInHeading(heading), heading.trim()]) {
    if (text === undefined || text.length > 24) continue;
    // "10^16 m^-3" heads numbers that are sixteen powers short of the unit.
    const power = numberAndUnit(text);
    const conversion = conversionTo(quantity, power ? power.unitText : text);
    if (!conversion || (power && (power.unitText === "" || Number.isNaN(power.value)))) continue;
    const isOwn = conversion.scale * (power?.value ?? 1) === 1 && conversion.offset === 0;
    return { text, isOwn };
  }
  return undefined;
}
