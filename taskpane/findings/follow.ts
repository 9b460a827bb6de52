import { commonShape, shapeOf, type Cells } from "../../functions/cells/broadcast";
import { Fault } from "../../functions/cells/fault";
import { isCellError } from "../../functions/cells/host";
import type { Cell } from "../workbook/address";
import type { Area } from "./area";
import { asTruth, binaryOperators, functionsOfOne, unaryOperators } from "./arithmetic";
import type { Book, Table } from "./book";
import type { Coordinate, Expression, Parser } from "./expression";

/** What a part of a formula comes to, and where it stands when it is a plain reference. */
export interface Known {
  cells: Cells;
  area?: Area;
}

/** A part of a formula that cannot be followed: nothing is computed from it. */
export class NotFollowed {
  constructor(readonly why: string) {}
}

/** A call of one of our functions, or with arguments, that only another version knows. */
export class UnknownFunction extends NotFollowed {}

export type Followed = Known | NotFollowed;

/** A call of one of our functions whose arguments are known; an argument left out is undefined. */
export interface Call {
  name: string;
  id: number;
  args: readonly (Known | undefined)[];
  /** Whether result cells lie in the sheet as they lie in the result: nothing around the call rearranges them. */
  inPlace: boolean;
}

/** Where a formula stands and what happens to the calls in it. */
export interface Scope extends Cell {
  book: Book;
  parser: Parser;
  sheet: string;
  /** Computes a call; undefined where the function is not known here. */
  call(call: Call): Cells | undefined;
  names?: ReadonlyMap<string, Followed>;
  depth?: number;
}

export function follow(expression: Expression, scope: Scope, inPlace = true): Followed {
  switch (expression.is) {
    case "constant":
      return { cells: expression.cells };
    case "unknown":
      return new NotFollowed(expression.why);
    case "range":
      return followRange(expression, scope);
    case "name":
      return followName(expression.name, scope);
    case "table":
      return followTable(expression, scope);
    case "unary":
      return followUnary(expression.operator, follow(expression.of, scope, inPlace), scope);
    case "binary": {
      const sides = [follow(expression.left, scope, inPlace), follow(expression.right, scope, inPlace)];
      const compute = binaryOperators[expression.operator];
      return compute
        ? elementwise(sides, compute)
        : new NotFollowed(`the operator "${expression.operator}" is not followed`);
    }
    case "let":
      return followLet(expression, scope, inPlace);
    case "sheath":
      return followCall(expression, scope, inPlace);
    case "native":
      return followNative(expression.name, expression.args, scope, inPlace);
  }
}

/** Element by element over ranges of one shape, or of one that repeats. */
function elementwise(parts: readonly Followed[], compute: (...cells: any[]) => unknown): Followed {
  const known: Known[] = [];
  for (const part of parts) {
    if (part instanceof NotFollowed) return part;
    known.push(part);
  }
  if (known.every(({ cells }) => cells.length === 1 && cells[0].length === 1))
    return { cells: [[compute(...known.map(({ cells }) => cells[0][0]))]] };
  const shapes = known.map(({ cells }) => shapeOf(cells));
  const shape = commonShape(
    shapes,
    shapes.map(() => ""),
  );
  if (shape instanceof Fault) return new NotFollowed("ranges of different sizes are combined");
  return {
    cells: Array.from({ length: shape.rows }, (_, i) =>
      Array.from({ length: shape.columns }, (_, j) => compute(...known.map(({ cells }) => cellIn(cells, i, j)))),
    ),
  };
}

/** A lone row or column repeats. */
export function cellIn(cells: Cells, i: number, j: number): unknown {
  return cells[cells.length === 1 ? 0 : i][cells[0].length === 1 ? 0 : j];
}

type RangeExpression = Extract<Expression, { is: "range" }>;

function followRange(range: RangeExpression, scope: Scope): Followed {
  const sheet = scope.book.sheet(range.sheet ?? scope.sheet);
  if (!sheet) return new NotFollowed(`there is no sheet named "${range.sheet}"`);
  // Whole columns and rows end where the sheet does.
  const [top, bottom] = span(range.rows, scope.row, sheet.rows);
  const [left, right] = span(range.columns, scope.column, sheet.columns);
  if (top < 0 || left < 0) return { cells: [[{ code: "#REF!" }]] };
  return areaOf(
    { sheet: sheet.name, row: top, column: left, rows: bottom - top + 1, columns: right - left + 1 },
    scope,
  );
}

function span(ends: [Coordinate, Coordinate] | undefined, own: number, length: number): [number, number] {
  if (!ends) return [0, Math.max(0, length - 1)];
  const [a, b] = ends.map(({ at, absolute }) => (absolute ? at : own + at));
  return a <= b ? [a, b] : [b, a];
}

const mostCells = 5_000_000;

function areaOf(area: Area, { book }: Scope): Followed {
  if (area.rows * area.columns > mostCells) return new NotFollowed("a range of more than 5 million cells");
  return { cells: book.cells(area), area };
}

function followName(name: string, scope: Scope): Followed {
  const local = scope.names?.get(name.toLowerCase());
  if (local) return local;
  const refers = scope.book.name(name, scope.sheet);
  if (refers === undefined) return new NotFollowed(`there is no name "${name}" in this workbook`);
  const depth = (scope.depth ?? 0) + 1;
  if (depth > 20) return new NotFollowed(`the name "${name}" refers to itself`);
  const { expression } = scope.parser.parse(refers.startsWith("=") ? refers : `=${refers}`, { row: 0, column: 0 });
  if (expression.is === "range" && isRelative(expression))
    return new NotFollowed(`the name "${name}" refers to a cell relative to the one it stands in`);
  return follow(expression, { ...scope, depth, names: undefined }, false);
}

function isRelative({ rows, columns }: RangeExpression): boolean {
  return [...(rows ?? []), ...(columns ?? [])].some(({ absolute }) => !absolute);
}

function followTable({ table: name, columns, sections }: Extract<Expression, { is: "table" }>, scope: Scope): Followed {
  const table = name === "" ? scope.book.tableAround(scope.sheet, scope) : scope.book.table(name);
  if (!table) return new NotFollowed(name === "" ? "it names a column outside a table" : `there is no table "${name}"`);
  const rows = tableRows(table, sections, scope);
  const across = tableColumns(table, columns);
  if (!rows || !across)
    return new NotFollowed(`"${[...sections, ...columns].join(", ")}" is not followed in ${table.name}`);
  return areaOf({ sheet: table.area.sheet, ...rows, ...across }, scope);
}

function tableRows({ area }: Table, sections: readonly string[], { row }: Scope) {
  const [section = "data", ...more] = sections.map((each) => each.toLowerCase());
  if (more.length > 0) return undefined;
  if (section === "data") return { row: area.row + 1, rows: Math.max(1, area.rows - 1) };
  if (section === "this row") return { row, rows: 1 };
  if (section === "headers") return { row: area.row, rows: 1 };
  return section === "all" ? { row: area.row, rows: area.rows } : undefined;
}

function tableColumns({ area, columns: names }: Table, wanted: readonly string[]) {
  if (wanted.length === 0) return { column: area.column, columns: area.columns };
  const [first, last = first] = wanted.map((name) =>
    names.findIndex((each) => each.toLowerCase() === name.toLowerCase()),
  );
  return first < 0 || last < first ? undefined : { column: area.column + first, columns: last - first + 1 };
}

function followUnary(operator: string, of: Followed, scope: Scope): Followed {
  if (of instanceof NotFollowed) return of;
  if (operator === "#") return spillAt(of, scope);
  if (operator === "@") return intersect(of, scope);
  const compute = unaryOperators[operator];
  return compute ? elementwise([of], compute) : new NotFollowed(`the operator "${operator}" is not followed`);
}

/** A1#: all that the formula in A1 fills. */
function spillAt({ area }: Known, scope: Scope): Followed {
  const sheet = area && scope.book.sheet(area.sheet);
  if (!area || !sheet || area.rows * area.columns > 1)
    return new NotFollowed('"#" stands behind something else than a cell');
  const filled = sheet.spill(area.row, area.column);
  if (filled) return areaOf(filled, scope);
  if (sheet.formula(area.row, area.column) !== undefined) return areaOf(area, scope);
  return { cells: [[{ code: "#REF!" }]] };
}

/** @A1:A5: the cell of a range in the formula's own row or column. */
function intersect({ cells, area }: Known, scope: Scope): Followed {
  if (cells.length === 1 && cells[0].length === 1) return { cells, ...(area ? { area } : {}) };
  if (!area) return { cells: [[cells[0][0]]] };
  const row = area.rows === 1 ? area.row : scope.row;
  const column = area.columns === 1 ? area.column : scope.column;
  const inside =
    row >= area.row && row < area.row + area.rows && column >= area.column && column < area.column + area.columns;
  if (!inside) return { cells: [[{ code: "#VALUE!" }]] };
  return areaOf({ sheet: area.sheet, row, column, rows: 1, columns: 1 }, scope);
}

function followLet({ names, body }: Extract<Expression, { is: "let" }>, scope: Scope, inPlace: boolean): Followed {
  const known = new Map(scope.names);
  const inner = { ...scope, names: known };
  for (const { name, value } of names) known.set(name, follow(value, inner, inPlace));
  return follow(body, inner, inPlace);
}

function followCall(
  { name, args, id }: Extract<Expression, { is: "sheath" }>,
  scope: Scope,
  inPlace: boolean,
): Followed {
  const known: (Known | undefined)[] = [];
  let missed: NotFollowed | undefined;
  for (const arg of args) {
    const value = arg && follow(arg, scope, inPlace);
    if (value instanceof NotFollowed) missed ??= value;
    else known.push(value);
  }
  if (missed) return missed;
  const cells = scope.call({ name, id, args: known, inPlace });
  return cells ? { cells } : new UnknownFunction(`this version does not know the call of ${name}`);
}

type Arguments = readonly (Expression | undefined)[];

/** Functions that choose between arguments follow only the one chosen: what is not computed in the sheet is not judged. */
function followNative(name: string, args: Arguments, scope: Scope, inPlace: boolean): Followed {
  const at = (i: number): Followed => (args[i] ? follow(args[i], scope, inPlace) : { cells: [[null]] });
  if (name === "IF") return followIf(at, args.length);
  if (name === "IFERROR") return unlessError(at, isCellError);
  if (name === "IFNA")
    return unlessError(at, (cell) => isCellError(cell) && (cell as { code: string }).code === "#N/A");
  if (name === "PI" && args.length === 0) return { cells: [[Math.PI]] };
  if ((name === "TRUE" || name === "FALSE") && args.length === 0) return { cells: [[name === "TRUE"]] };
  const ofOne = functionsOfOne[name];
  if (ofOne && args.length === 1) return elementwise([at(0)], ofOne);
  // The calls inside it are still computed in the sheet, and can be judged by themselves.
  args.forEach((arg) => arg && follow(arg, scope, false));
  return new NotFollowed(`${name} is not followed`);
}

function followIf(at: (i: number) => Followed, count: number): Followed {
  const condition = at(0);
  if (condition instanceof NotFollowed) return condition;
  const [[cell]] = condition.cells;
  if (condition.cells.length > 1 || condition.cells[0].length > 1)
    return new NotFollowed("IF over a range is not followed");
  if (isCellError(cell)) return condition;
  if (asTruth(cell)) return at(1);
  return count > 2 ? at(2) : { cells: [[false]] };
}

function unlessError(at: (i: number) => Followed, isCaught: (cell: unknown) => boolean): Followed {
  const first = at(0);
  if (first instanceof NotFollowed || !first.cells.some((row) => row.some(isCaught))) return first;
  return elementwise([{ cells: first.cells }, at(1)], (cell, instead) => (isCaught(cell) ? instead : cell));
}
