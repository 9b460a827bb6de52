/**
 * What is typed into a field of the form, as an argument of a formula: the cell value a function would see, and the
 * literal that stands for it in the formula.
 */
export type Cell = number | string | boolean | null;

export interface Typed {
  cell: Cell;
  literal: string;
}

/** A number, TRUE or FALSE, or text; text in quotes is text whatever it looks like, as in a formula. */
export function readTyped(text: string): Typed {
  const typed = text.trim();
  if (typed === "") return { cell: null, literal: "" };
  const word = typed.toUpperCase();
  if (word === "TRUE" || word === "FALSE") return { cell: word === "TRUE", literal: word };
  const number = plainNumber.exec(typed);
  if (number) {
    const [, sign, digits, power = "", percent = ""] = number;
    const literal = `${sign === "-" ? "-" : ""}${withBothEnds(digits)}${power.toUpperCase()}`;
    const value = Number(literal) / (percent ? 100 : 1);
    if (Number.isFinite(value)) return { cell: value, literal: literal + percent };
  }
  const inside = /^"(.*)"$/s.exec(typed);
  const plain = inside ? inside[1].replaceAll('""', '"') : typed;
  return { cell: plain, literal: quoted(plain) };
}

/** Rows by line, columns by comma, semicolon or tab, so that cells copied from a sheet can be pasted. */
export function readTypedBlock(text: string): Typed[][] {
  const lines = text.split(/\r?\n/).filter((line) => line.trim() !== "");
  return lines.map((line) =>
    line
      .replace(/[,;\t]\s*$/, "")
      .split(/[,;\t]/)
      .map(readTyped),
  );
}

/** The other way: a cell value as one would type it. */
export function typedText(cell: unknown): string {
  if (cell === null || cell === undefined) return "";
  if (Array.isArray(cell)) return cell.map((row) => row.map(typedText).join(", ")).join("\n");
  if (typeof cell === "number") return typedNumber(cell);
  if (typeof cell === "boolean") return cell ? "TRUE" : "FALSE";
  const text = String(cell);
  return readTyped(text).cell === text ? text : quoted(text);
}

const plainNumber = /^([+-]?)(\d+\.?\d*|\.\d+)([eE][+-]?\d+)?\s*(%)?$/;

/** Not every sheet reads ".5" or "5." inside a formula. */
function withBothEnds(digits: string): string {
  return (digits.startsWith(".") ? `0${digits}` : digits).replace(/\.$/, "");
}

function quoted(text: string): string {
  return `"${text.replaceAll('"', '""')}"`;
}

function typedNumber(value: number): string {
  const size = Math.abs(value);
  const text = value !== 0 && (size >= 1e5 || size < 1e-3) ? value.toExponential() : String(value);
  return text.replace("e+", "e");
}
