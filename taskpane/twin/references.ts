/** Text, a number, a function with its bracket, or a name. */
const token = /"(?:[^"]|"")*"|\d[\d.]*(?:[eE][+-]?\d+)?|[A-Za-z_]\w*(?=\()|[A-Za-z_]\w*/g;

function isName(text: string, at: number, formula: string): boolean {
  return /^[A-Za-z_]/.test(text) && formula[at + text.length] !== "(";
}

/** The names a formula uses, each once. */
export function namesIn(formula: string): string[] {
  const names = [...formula.matchAll(token)].filter(({ 0: text, index }) => isName(text, index, formula));
  return [...new Set(names.map(([name]) => name))];
}

/** The formula with a reference in place of each name. */
export function withReferences(formula: string, referenceOf: (name: string) => string): string {
  return formula.replace(token, (text, at: number) => (isName(text, at, formula) ? referenceOf(text) : text));
}
