import type { Cells } from "../../functions/cells/broadcast";
import type { Entry } from "../../functions/cells/entry";
import { isCellError } from "../../functions/cells/host";
import type { Input } from "../../functions/cells/inputs";
import { catalogue, checks } from "../../functions/catalogue";
import { nearest } from "../../functions/checks/nearest";
import { frontDoors } from "../../functions/front-doors";
import { pack, type Area, type Packed } from "./area";
import type { Book, Sheet } from "./book";
import { noteFailingChecks } from "./check-text";
import { compareSaved } from "./compare";
import { noteError } from "./errors";
import { Parser, type Expression, type Parsed } from "./expression";
import { Fill } from "./fill";
import { follow, NotFollowed, UnknownFunction, type Call, type Followed, type Known, type Scope } from "./follow";
import { judgeCall, Traces } from "./judge";
import { noteBlocked } from "./spills";
import { Tally } from "./tally";

const entries = new Map<string, Entry<any>>(catalogue.map((entry) => [entry.name, entry]));

/** Checks say themselves what they found, so their own limits are not judged a second time. */
const isCheck = new Set<string>(checks.family.entries.map(({ name }) => name));

/** Checks of another function: the name of that function, then its inputs. */
const checksOfOthers = new Set(["LIMITCHECK", "LIMITS"]);

/** Its result is of the version that computes it, not of the cells. */
const tellsOfItself = "ABOUT";

/** Computes formulas again from the cells they read, one at a time, and notes what is the matter with each. */
export class Recalculation {
  readonly parser = new Parser();
  readonly tally = new Tally();
  readonly fills = new Map<string, Fill>();
  /** By sheet: why cells could not be computed again. */
  readonly notFollowed = new Map<string, { fill: Fill; why: string; cells: Packed[] }>();
  private readonly traces = new Traces();
  private readonly known = new Map<Sheet, Map<Packed, Parsed>>();

  constructor(readonly book: Book) {}

  /** The formula of a cell in relative form. */
  parsed(sheet: Sheet, row: number, column: number): Parsed | undefined {
    const formula = sheet.formula(row, column);
    if (formula === undefined) return undefined;
    let known = this.known.get(sheet);
    if (!known) this.known.set(sheet, (known = new Map()));
    const cell = pack(row, column);
    let parsed = known.get(cell);
    if (!parsed) known.set(cell, (parsed = this.parser.parse(formula, { row, column })));
    return parsed;
  }

  /** Looks at the formula of one cell; what it fills is looked at with it. */
  look(sheet: Sheet, row: number, column: number, formula: string): void {
    const parsed = this.parsed(sheet, row, column)!;
    if (parsed.calls.length === 0) return;
    const filled = sheet.spill(row, column) ?? { sheet: sheet.name, row, column, rows: 1, columns: 1 };
    const fill = this.fillOf(sheet.name, parsed, formula);
    fill.add(filled);
    const result = follow(parsed.expression, this.scope(sheet, filled, fill));
    if (result instanceof UnknownFunction) return;
    if (result instanceof NotFollowed) this.noteUnseen(sheet, filled, fill, result.why);
    else this.noteResult(sheet, filled, fill, result, parsed.expression);
  }

  /** What a formula would give in a cell that does not hold it. */
  valueAt(sheet: Sheet, row: number, column: number, expression: Expression): Followed {
    const call = ({ name, args }: Call) => frontDoors[name]?.(...args.map(cellsOf));
    return follow(expression, { book: this.book, parser: this.parser, sheet: sheet.name, row, column, call });
  }

  private fillOf(sheet: string, { form, calls }: Parsed, formula: string): Fill {
    const key = `${sheet}!${form}`;
    let fill = this.fills.get(key);
    if (!fill) this.fills.set(key, (fill = new Fill(this.fills.size, sheet, form, formula, calls)));
    return fill;
  }

  private scope(sheet: Sheet, filled: Area, fill: Fill): Scope {
    const { row, column } = filled;
    return {
      book: this.book,
      parser: this.parser,
      sheet: sheet.name,
      row,
      column,
      call: (call) => this.call(call, filled, fill),
    };
  }

  private call(call: Call, filled: Area, fill: Fill): Cells | undefined {
    const { name, args, id } = call;
    const entry = entries.get(name);
    const door = frontDoors[name];
    const surplus = entry && !entry.repeats ? args.length - entry.inputs.length - (entry.takesUnit ? 1 : 0) : 0;
    if (!entry || !door || surplus > 0) {
      this.noteNewer(call, filled, fill, entry && args.length - surplus);
      return undefined;
    }
    args.forEach((arg, k) => arg?.area && readAt(fill, id, k, entry, arg.area));
    const result = door(...args.map(cellsOf));
    const cellAt = cellsOfCall(filled, call.inPlace);
    const judged = { entry, args, cellAt, fill, call: id, tally: this.tally };
    if (!isCheck.has(name)) judgeCall(judged, result, this.traces);
    else judgeCall({ ...judged, ...checkedBy(name, entry, args) }, result, this.traces);
    return result;
  }

  private noteNewer({ name, id }: Call, filled: Area, fill: Fill, takes: number | undefined): void {
    const { sheet } = fill;
    const what = () =>
      takes === undefined
        ? `there is no function ${name} in this version; the nearest are ${nearest(name, [...entries.keys()]).join(", ")}`
        : `${name} takes ${takes} arguments in this version`;
    this.tally
      .draft(`newer|${fill.id}|${id}`, () => ({ cause: "newer", sheet, what: what(), subject: name }))
      .in(fill, [name], () => fill.cells.length)
      .add(pack(filled.row, filled.column));
  }

  private noteUnseen(sheet: Sheet, { row, column }: Area, fill: Fill, why: string): void {
    const cell = pack(row, column);
    const key = `${fill.sheet}|${why}`;
    const known = this.notFollowed.get(key);
    if (known) known.cells.push(cell);
    else this.notFollowed.set(key, { fill, why, cells: [cell] });
    const saved = sheet.value(row, column);
    if (typeof saved === "object" && saved !== null)
      noteError(cell, { code: saved.error, message: saved.message }, fill, this.tally, this.traces);
  }

  private noteResult(sheet: Sheet, filled: Area, fill: Fill, { cells }: Known, expression: Expression): void {
    if (noteBlocked(sheet, filled, cells, fill, this.tally)) return;
    const name = expression.is === "sheath" ? expression.name : undefined;
    if (name === tellsOfItself) return;
    compareSaved(sheet, filled, cells, fill, this.tally);
    const cellAt = cellsOfCall(filled, true);
    cells.slice(0, filled.rows).forEach((row, i) =>
      row.slice(0, filled.columns).forEach((cell, j) => {
        if (isCellError(cell)) noteError(cellAt(i, j), cell, fill, this.tally, this.traces);
      }),
    );
    if (name !== undefined && isCheck.has(name)) noteFailingChecks(cells, cellAt, name, fill, this.tally);
  }
}

function readAt(fill: Fill, call: number, k: number, entry: Entry<any>, area: Area): void {
  const input: Input | undefined = entry.inputs[k];
  fill.read(call, k, input?.name ?? entry.repeats?.name ?? "unit", input, area);
}

function cellsOf(arg: Known | undefined): unknown {
  return arg?.cells ?? null;
}

/** Where row i, column j of a result shows: in its own cell of what the formula fills, or in the formula's. */
function cellsOfCall({ row, column, rows, columns }: Area, inPlace: boolean): (i: number, j: number) => Packed {
  return (i, j) => (inPlace && i < rows && j < columns ? pack(row + i, column + j) : pack(row, column));
}

/** The inputs that a check hands to another function are doubted as they would be there; its limits it tells itself. */
function checkedBy(name: string, entry: Entry<any>, args: Call["args"]): { entry: Entry<any>; args: Call["args"] } {
  const named = args[0]?.cells[0][0];
  const other =
    checksOfOthers.has(name) && typeof named === "string"
      ? entries.get(
          named
            .trim()
            .replace(/^SHEATH\./i, "")
            .toUpperCase(),
        )
      : undefined;
  return other
    ? { entry: { ...other, limits: [] }, args: args.slice(1, 1 + other.inputs.length) }
    : { entry: { ...entry, limits: [] }, args };
}
