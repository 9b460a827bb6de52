import ts from "typescript";

/** Facts of an entry that only readers see, in the pane: no function needs them to compute. */
export const shownOnly = ["equation", "twin", "accuracy", "changes"];

/**
 * Takes them out of the entries that go into functions.js, which every workbook with a SHEATH formula loads: together
 * they weigh more than the physics of a family.
 */
export default function leaveOut(code) {
  const source = ts.createSourceFile(this.resourcePath, code, ts.ScriptTarget.Latest, true);
  const cuts = [];
  const visit = (node) => {
    const isEntry = ts.isCallExpression(node) && ts.isIdentifier(node.expression) && node.expression.text === "entry";
    const facts = isEntry ? node.arguments.find(ts.isObjectLiteralExpression) : undefined;
    for (const fact of facts?.properties ?? []) {
      if (!fact.name || !shownOnly.includes(fact.name.getText())) continue;
      const comma = code[fact.getEnd()] === "," ? 1 : 0;
      cuts.push([fact.getFullStart(), fact.getEnd() + comma]);
    }
    ts.forEachChild(node, visit);
  };
  visit(source);
  return cuts.reduceRight((rest, [from, to]) => rest.slice(0, from) + rest.slice(to), code);
}
