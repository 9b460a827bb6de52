import { readTyped, readTypedBlock, type Typed } from "./typed";

/** One field's text, and whether it stands for a whole range. */
export interface FieldText {
  name: string;
  text: string;
  block: boolean;
}

/** What a cell takes; text inside a formula has a limit of its own. */
const longestFormula = 8192;
const longestText = 255;

/**
 * The formula with its arguments as literals. Written with commas and decimal points: that is what the host's
 * programming interface takes in every language.
 */
export function formulaText(name: string, fields: readonly FieldText[]): string {
  const literals = fields.map(({ text, block }) =>
    block ? blockLiteral(readTypedBlock(text)) : readTyped(text).literal,
  );
  while (literals.length > 0 && literals.at(-1) === "") literals.pop();
  return `=SHEATH.${name}(${literals.join(",")})`;
}

/** Why a sheet would refuse the formula, or undefined. */
export function formulaProblem(formula: string, fields: readonly FieldText[]): string | undefined {
  if (formula.length > longestFormula) {
    return `The formula has ${formula.length} characters and a cell takes ${longestFormula}: put the values in cells and give their range instead.`;
  }
  const ragged = fields.find(({ text, block }) => block && isRagged(readTypedBlock(text)));
  if (ragged) return `${ragged.name}: the lines have different numbers of values; give each line as many.`;
  const long = fields.find(({ text, block }) => {
    const typed = block ? readTypedBlock(text).flat() : [readTyped(text)];
    return typed.some(({ cell }) => typeof cell === "string" && cell.length > longestText);
  });
  return long && `${long.name}: text inside a formula has at most ${longestText} characters; put it in a cell instead.`;
}

function blockLiteral(rows: readonly Typed[][]): string {
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
