/** What the grid's formula engine does to our cost, set right from outside; each is tried in test/browser. */
import {
  CELL_INVERTED_INDEX_CACHE,
  LexerTreeBuilder,
  sequenceNodeType,
  type ISequenceNode,
} from "@univerjs/preset-sheets-core";

export function repairFormulaEngine(): void {
  switchOffInvertedIndex();
  keepNumbersAsTyped();
}

/** Its look-up index makes spilling quadratic in the rows; without it a search scans, which is quick enough. */
function switchOffInvertedIndex(): void {
  CELL_INVERTED_INDEX_CACHE.set = () => {};
  CELL_INVERTED_INDEX_CACHE.setContinueBuildingCache = () => {};
}

/**
 * When a formula is entered, numbers in it are spelt anew ("5e-3" as "0.005"), and text in quotes behind them is then
 * cut out of the wrong place. Numbers that would change are passed off as something that is left alone.
 */
function keepNumbersAsTyped(): void {
  const { prototype } = LexerTreeBuilder;
  const original = prototype.getSequenceNode;
  prototype.getSequenceNode = function (sequence) {
    const nodes = original.call(this, sequence);
    // A lone number has nothing behind it, and is a number only when spelt anew.
    if (nodes.length < 2) return nodes;
    return nodes.map((node) => (isRespelt(node) ? { ...node, nodeType: sequenceNodeType.ARRAY } : node));
  };
}

function isRespelt(node: string | ISequenceNode): node is ISequenceNode {
  if (typeof node === "string" || node.nodeType === sequenceNodeType.REFERENCE) return false;
  const typed = node.token.trim();
  return /^\$?[\d.]/.test(typed) && String(parseFloat(typed)) !== typed;
}
