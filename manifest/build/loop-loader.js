import ts from "typescript";

/**
 * Gives every closed form a loop over rows of its own. One loop shared by all functions makes the engine box each number
 * on its way in and out, because it cannot tell which function it will call; in a loop of its own the function melts
 * into the loop, and a column costs about what a loop written by hand does. Nothing but speed depends on it: without it
 * cells/rows.ts goes down the rows, which is good enough for what takes longer to compute.
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

/**
 * The Loop of cells/quick-column.ts for so many inputs. A number alone equals itself after +; a fault makes no number.
 * All variables are declared input by input, so that short names come out alike in every loop and compress to little.
 */
function loop(count) {
  const each = (text) => Array.from({ length: count }, (_, k) => text.replaceAll("#", k));
  return `(compute: any, out: any, scale: any, offset: any, i: any, value: any, [${each("[c#, s#, l#, m#, r#, x#]")}]: any) => {
    for (i = 0; i < out.length; i++) {
      ${each(`x# = (r# = c#[i * s#])[0];
      if (s# !== 0 && !(x# >= l# && x# <= m# && x# === +x# && r#.length === 1)) return i;`).join("\n")}
      value = (compute(${each("x#")}) - offset) / scale;
      if (value - value !== 0) return i;
      out[i] = [value];
    }
    return i;
  }`;
}
