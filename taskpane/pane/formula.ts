import { readTyped, readTypedArguments, readTypedBlock, type Typed } from "./typed";

/** One field's text, and what it stands for: a cell, a range, or any number of further arguments. */
export interface FieldText {
  name: string;
  text: string;
  takes: "cell" | "range" | "arguments";
}

/** The arguments in a field, each as rows of cells; blank at the end, they are left out. */
export function typedArguments({ text, takes }: FieldText): Typed[][][] {
  if (takes === "cell") return [[[readTyped(text)]]];
  if (takes === "range") return [readTypedBlock(text)];
  return readTypedArguments(text);
}

/** What a cell takes; text inside a formula has a limit of its own. */
const longestFormula = 8192;
const longestText = 255;

/**
 * The formula with its arguments as literals. Written with commas and decimal points: that is what the host's
 * programming interface takes in every language.
 */
export function formulaText(name: string, fields: readonly FieldText[]): string {
  const literals = fields.flatMap(typedArguments).map(literalOf);
  while (literals.length > 0 && literals.at(-1) === "") literals.pop();
  return `=SHEATH.${name}(${literals.join(",")})`;
}

/** Why a sheet would refuse the formula, or undefined. */
export function formulaProblem(formula: string, fields: readonly FieldText[]): string | undefined {
  if (formula.length > longestFormula) {
    return `The formula has ${formula.length} characters and a cell takes ${longestFormula}: put the values in cells and give their range instead.`;
  }
  const ragged = fields.find((field) => typedArguments(field).some(isRagged));
  if (ragged) return `${ragged.name}: the lines have different numbers of values; give each line as many.`;
  const long = fields.find((field) => typedArguments(field).flat(2).some(isLongText));
  return long && `${long.name}: text inside a formula has at most ${longestText} characters; put it in a cell instead.`;
}

function literalOf(rows: readonly Typed[][]): string {
  if (rows.length === 0) return "";
  if (rows.length === 1 && rows[0].length === 1) return rows[0][0].literal;
  return `{${rows.map((row) => row.map(constant).join(",")).join(";")}}`;
}

/** Inside braces a sheet takes neither a percent sign nor an empty place. */
function constant({ cell, literal }: Typed): string {
  if (cell === null) return '""';
  return literal.endsWith("%") && typeof cell === "number" ? String(cell).toUpperCase() : literal;
}

function isRagged(rows: readonly Typed[][]): boolean {
  return rows.some((row) => row.length !== rows[0].length);
}

function isLongText({ cell }: Typed): boolean {
  return typeof cell === "string" && cell.length > longestText;
}
