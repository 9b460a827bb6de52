import { isCellError } from "../../functions/cells/host";

/** What spreadsheets in general do with the operators of a formula, cell by cell. Errors go on as they are. */
export type Cell = unknown;

const valueError = { code: "#VALUE!" };
const divisionByZero = { code: "#DIV/0!" };
const notANumber = { code: "#NUM!" };

type Binary = (a: Cell, b: Cell) => Cell;

export const binaryOperators: Readonly<Record<string, Binary>> = {
  "+": numeric((a, b) => a + b),
  "-": numeric((a, b) => a - b),
  "*": numeric((a, b) => a * b),
  "/": numeric((a, b) => (b === 0 ? divisionByZero : a / b)),
  "^": numeric((a, b) => (a === 0 && b === 0 ? notANumber : a ** b)),
  "&": (a, b) => firstError(a, b) ?? asText(a) + asText(b),
  "=": comparing((order) => order === 0),
  "<>": comparing((order) => order !== 0),
  "<": comparing((order) => order < 0),
  ">": comparing((order) => order > 0),
  "<=": comparing((order) => order <= 0),
  ">=": comparing((order) => order >= 0),
};

export const unaryOperators: Readonly<Record<string, (a: Cell) => Cell>> = {
  "+": (a) => a,
  "-": ofNumber((a) => -a),
  "%": ofNumber((a) => a / 100),
};

/** The few functions of one value that stand around arguments most often. */
export const functionsOfOne: Readonly<Record<string, (a: Cell) => Cell>> = {
  ABS: ofNumber(Math.abs),
  SQRT: ofNumber(Math.sqrt),
  EXP: ofNumber(Math.exp),
  LN: ofNumber(Math.log),
  LOG10: ofNumber(Math.log10),
  NOT: (a) => firstError(a) ?? !asTruth(a),
  ISNUMBER: (a) => typeof a === "number",
  ISTEXT: (a) => typeof a === "string",
  ISBLANK: (a) => a === null,
  ISERROR: (a) => isCellError(a),
  ISNA: (a) => isCellError(a) && (a as { code: string }).code === "#N/A",
};

export function asTruth(cell: Cell): boolean {
  return typeof cell === "string" ? cell.toUpperCase() === "TRUE" : Boolean(cell);
}

export function firstError(...cells: Cell[]): Cell | undefined {
  return cells.find(isCellError);
}

function numeric(compute: (a: number, b: number) => Cell): Binary {
  return (a, b) => {
    const error = firstError(a, b);
    if (error !== undefined) return error;
    const [x, y] = [asNumber(a), asNumber(b)];
    return x === undefined || y === undefined ? valueError : finite(compute(x, y));
  };
}

function ofNumber(compute: (a: number) => number): (a: Cell) => Cell {
  return (a) => {
    const error = firstError(a);
    if (error !== undefined) return error;
    const x = asNumber(a);
    return x === undefined ? valueError : finite(compute(x));
  };
}

function finite(value: Cell): Cell {
  return typeof value !== "number" || Number.isFinite(value) ? value : notANumber;
}

function asNumber(cell: Cell): number | undefined {
  if (typeof cell === "number") return cell;
  if (cell === null || cell === undefined) return 0;
  if (typeof cell === "boolean") return cell ? 1 : 0;
  return typeof cell === "string" && /^\s*[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?\s*$/i.test(cell)
    ? Number(cell)
    : undefined;
}

/** Sheets keep 15 digits when a number becomes text. */
function asText(cell: Cell): string {
  if (cell === null || cell === undefined) return "";
  if (typeof cell === "boolean") return cell ? "TRUE" : "FALSE";
  return typeof cell === "number" ? String(Number(cell.toPrecision(15))) : String(cell);
}

function comparing(holds: (order: number) => boolean): Binary {
  return (a, b) => firstError(a, b) ?? holds(order(a, b));
}

/** Numbers come before text and text before truth; an empty cell is the other's nothing. */
function order(a: Cell, b: Cell): number {
  const [x, y] = [a ?? nothingLike(b), b ?? nothingLike(a)];
  if (rank(x) !== rank(y)) return rank(x) - rank(y);
  if (typeof x === "string" && typeof y === "string") {
    const [s, t] = [x.toLowerCase(), y.toLowerCase()];
    return s < t ? -1 : s > t ? 1 : 0;
  }
  return Number(x) - Number(y);
}

function nothingLike(cell: Cell): Cell {
  return typeof cell === "string" ? "" : typeof cell === "boolean" ? false : 0;
}

function rank(cell: Cell): number {
  return typeof cell === "number" ? 0 : typeof cell === "string" ? 1 : 2;
}
