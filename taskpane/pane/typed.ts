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
  return rowsOf(partsOf(text, ",;\t\n"), "\n");
}

/** Arguments by line, and in each rows by semicolon and columns by comma, as in an array constant. */
export function readTypedArguments(text: string): Typed[][][] {
  return grouped(partsOf(text.trimEnd(), ",;\t\n"), "\n").map((line) => rowsOf(line, ";"));
}

/** A piece of the text and the separator behind it. */
interface Part {
  text: string;
  separator: string | undefined;
}

/** A part that stands in quotes as a whole keeps the separators inside it. */
function partsOf(text: string, separators: string): Part[] {
  const part = new RegExp(`[^\\S${separators}]*"(?:[^"]|"")*"\\s*?(?=[${separators}]|$)|[^${separators}]*`, "y");
  const parts: Part[] = [];
  for (let at = 0; at <= text.length; at = part.lastIndex + 1) {
    part.lastIndex = at;
    const [found] = part.exec(text)!;
    part.lastIndex = at + found.length;
    parts.push({ text: found, separator: text[part.lastIndex] });
  }
  return parts;
}

function grouped(parts: readonly Part[], separator: string): Part[][] {
  const groups: Part[][] = [[]];
  for (const part of parts) {
    groups.at(-1)!.push(part);
    if (part.separator === separator) groups.push([]);
  }
  return groups.filter((group) => group.length > 0);
}

/** Empty lines are no rows, and a separator at a line's end, as a sheet's copy may leave it, opens no further cell. */
function rowsOf(parts: readonly Part[], separator: string): Typed[][] {
  return grouped(parts, separator)
    .map((row) => row.map(({ text }) => readTyped(text)))
    .map((row) => (row.at(-1)!.cell === null ? row.slice(0, -1) : row))
    .filter((row) => row.length > 0);
}

/** The other way: a cell value as one would type it. */
export function typedText(cell: unknown): string {
  if (cell === null || cell === undefined) return "";
  if (Array.isArray(cell)) return typedRows(cell, "\n");
  if (typeof cell === "number") return typedNumber(cell);
  if (typeof cell === "boolean") return cell ? "TRUE" : "FALSE";
  const text = String(cell);
  return readTyped(text).cell === text ? text : quoted(text);
}

/** A range as one would type it, its rows apart as told. */
export function typedRows(rows: readonly (readonly unknown[])[], between: string): string {
  const typed = (cell: unknown) =>
    typeof cell === "string" && (cell === "" || /[,;\t\n"]/.test(cell)) ? quoted(cell) : typedText(cell);
  return rows.map((row) => row.map(typed).join(", ")).join(between);
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
