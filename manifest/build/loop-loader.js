import ts from "typescript";

/**
 * Gives every closed form a loop over rows of its own. One loop shared by all functions makes the engine box each number
 * on its way in and out, because it cannot tell which function it will call; in a loop of its own the function melts
 * into the loop, and a column costs about what a loop written by hand does. Nothing but speed depends on it: without it
 * cells/rows.ts goes down the rows itself, which is good enough for what takes longer to compute.
 */
export default function giveLoops(code) {
  return entryFacts(code, this.resourcePath)
    .filter((facts) => isObject(facts, "twin") && !isObject(facts, "result"))
    .map((facts) => ({ at: factNamed(facts, "compute").end, count: inputCount(facts) }))
    .filter(({ count }) => count > 0)
    .reduceRight((rest, { at, count }) => `${rest.slice(0, at)}, loop: ${loop(count)}${rest.slice(at)}`, code);
}

/** The object literals that entry("NAME", {…}) is called with. */
function entryFacts(code, path) {
  const found = [];
  const visit = (node) => {
    const isEntry = ts.isCallExpression(node) && node.expression.getText() === "entry";
    const facts = isEntry ? node.arguments.find(ts.isObjectLiteralExpression) : undefined;
    if (facts) found.push(facts);
    ts.forEachChild(node, visit);
  };
  visit(ts.createSourceFile(path, code, ts.ScriptTarget.Latest, true));
  return found;
}

function factNamed(facts, name) {
  return facts.properties.find((property) => property.name?.getText() === name);
}

/** A plain form is an object where there is one; a result is one where it is a table, which comes from a single row. */
function isObject(facts, name) {
  const fact = factNamed(facts, name)?.initializer;
  return fact !== undefined && ts.isObjectLiteralExpression(fact);
}

/** How many inputs there are, where that can be read off the list. */
function inputCount(facts) {
  const inputs = factNamed(facts, "inputs")?.initializer;
  const isListed = inputs && ts.isArrayLiteralExpression(inputs) && !inputs.elements.some(ts.isSpreadElement);
  return isListed ? inputs.elements.length : 0;
}

/** The Loop of cells/rows.ts for so many columns. */
function loop(count) {
  const each = (letter) => Array.from({ length: count }, (_, i) => `${letter}${i}`).join(",");
  const cells = Array.from({ length: count }, (_, i) => `c${i}[i*s${i}]`).join(",");
  return `(compute: any, [${each("c")}]: any, [${each("s")}]: any, out: any, odd: any) => {
    let others;
    for (let i = 0; i < out.length; i++) {
      if (odd !== undefined && odd[i] !== 0) continue;
      const result = compute(${cells});
      if (typeof result === "number") out[i] = result;
      else (others ??= new Map()).set(i, result);
    }
    return others;
  }`;
}
