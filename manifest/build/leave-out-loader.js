import ts from "typescript";

/** What only readers see, in the pane: facts of an entry, and the source of each of its limits. */
export const shownOnly = ["equation", "twin", "accuracy", "changes", "sources", "example"];

/**
 * Takes it out of functions.js, which every workbook with a SHEATH formula loads: no function needs it to compute, and
 * together it weighs more than the physics of a family.
 */
export default function leaveOut(code) {
  const cuts = [];
  const visit = (node) => {
    if (ts.isPropertyAssignment(node) && isShownOnly(node)) {
      cuts.push([node.pos, node.end + (code[node.end] === "," ? 1 : 0)]);
    } else ts.forEachChild(node, visit);
  };
  visit(ts.createSourceFile(this.resourcePath, code, ts.ScriptTarget.Latest, true));
  return cuts.reduceRight((rest, [from, to]) => rest.slice(0, from) + rest.slice(to), code);
}

function isShownOnly(property) {
  const name = property.name.getText();
  return (isFactOfEntry(property) && shownOnly.includes(name)) || (name === "source" && isNamedSource(property));
}

function isFactOfEntry({ parent }) {
  const call = parent.parent;
  return ts.isCallExpression(call) && call.expression.getText() === "entry";
}

/** "source: R91", by the name that functions/sources.ts gives it. */
function isNamedSource({ initializer }) {
  return ts.isIdentifier(initializer) && /^[A-Z]+\d*[A-Z]*$/.test(initializer.text);
}
