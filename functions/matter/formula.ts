import { atomicWeights, symbolsByName } from "./atomic-weights";

/** A formula that cannot be read: what is wrong with it, and what to type instead where that is known. */
export class FormulaError {
  constructor(
    readonly problem: string,
    readonly advice?: string,
  ) {}
}

/** Mass in u of one neutral formula unit: "Ar", "SF5", "(Ar2)", "Al2O3". */
export function formulaWeight(formula: string): number | FormulaError {
  const token = /([A-Z][a-z]?)|(\()|(\))|(\d+)/y;
  const open: number[] = [];
  let total = 0;
  let last = 0;
  while (token.lastIndex < formula.length) {
    const at = token.lastIndex;
    const found = token.exec(formula);
    if (!found) return unreadable(formula, at);
    const [, symbol, opens, closes, digits] = found;
    if (symbol) {
      const weight = elementWeight(symbol);
      if (weight === undefined) return unknownElement(symbol, formula);
      last = weight;
      total += last;
    } else if (opens) {
      open.push(total);
      total = 0;
      last = 0;
    } else if (closes) {
      if (open.length === 0) return unreadable(formula, at);
      last = total;
      total += open.pop()!;
    } else if (digits) {
      const count = Number(digits);
      if (!(last > 0) || count < 1) return unreadable(formula, at);
      total += last * (count - 1);
      last = 0;
    }
  }
  return open.length === 0 && total > 0 ? total : unreadable(formula, formula.length);
}

/** Own properties only: "constructor" is not an element. */
function elementWeight(symbol: string): number | undefined {
  return Object.hasOwn(atomicWeights, symbol) ? atomicWeights[symbol] : undefined;
}

function unreadable(formula: string, at: number): FormulaError {
  const name = formula.toLowerCase();
  if (Object.hasOwn(symbolsByName, name))
    return new FormulaError("is a name", `type the symbol "${symbolsByName[name]}"`);
  const where = at < formula.length ? `"${formula.slice(at, at + 6)}" cannot be read` : "it ends too early";
  return new FormulaError(`is not a chemical formula (${where})`, suggestion(formula));
}

function unknownElement(symbol: string, formula: string): FormulaError {
  const name = formula.toLowerCase();
  if (Object.hasOwn(symbolsByName, name))
    return new FormulaError("is a name", `type the symbol "${symbolsByName[name]}"`);
  return new FormulaError(`has no element "${symbol}" with a standard atomic weight`, suggestion(formula, symbol));
}

function suggestion(...texts: string[]): string | undefined {
  const near = [...new Set(texts.flatMap(nearestSymbols))].slice(0, 4);
  return near.length > 0 ? `nearest symbols: ${near.join(", ")}; or type a mass in u` : undefined;
}

/** Symbols a slip of case or of one letter away, closest first. */
export function nearestSymbols(text: string): string[] {
  const typed = text.replace(/[^A-Za-z]/g, "").toLowerCase();
  if (!typed) return [];
  const distance = (symbol: string) => {
    const lower = symbol.toLowerCase();
    if (lower === typed) return 0;
    if (lower[0] === typed[0]) return lower.length === typed.length ? 1 : 2;
    return lower.length === typed.length && lower.at(-1) === typed.at(-1) ? 2 : 9;
  };
  return Object.keys(atomicWeights)
    .map((symbol) => ({ symbol, far: distance(symbol) }))
    .filter(({ far }) => far <= 2)
    .sort((a, b) => a.far - b.far)
    .slice(0, 4)
    .map(({ symbol }) => symbol);
}
