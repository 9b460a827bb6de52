import { readFileSync } from "node:fs";
import { expect, test } from "vitest";
import { labels } from "../../taskpane/pane/labels";

const rows = readFileSync("taskpane/labels.md", "utf8")
  .split("\n")
  .filter((line) => line.startsWith("|"))
  .slice(2)
  .map((line) => line.split("|").map((cell) => cell.trim()));

test("every label of the pane stands in the list, and no other", () => {
  expect(rows.map(([, label]) => label).sort()).toEqual([...new Set(Object.values(labels))].sort());
});

test("every label has an origin: trade, standard or ours", () => {
  for (const [, label, origin] of rows) expect(origin, label).toMatch(/^(trade|standard|ours)\b/);
});
