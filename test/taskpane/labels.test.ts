import { readFileSync } from "node:fs";
import { expect, test } from "vitest";
import { causes } from "../../taskpane/findings/causes";
import { labels } from "../../taskpane/pane/labels";

const rows = readFileSync("taskpane/labels.md", "utf8")
  .split("\n")
  .filter((line) => line.startsWith("|"))
  .slice(2)
  .map((line) => line.split("|").map((cell) => cell.trim()));

test("every label of the pane, and every cause of a finding, stands in the list, and no other", () => {
  const fixed = [...Object.values(labels), ...Object.values(causes)];
  expect(rows.map(([, label]) => label).sort()).toEqual([...new Set(fixed)].sort());
});

test("every label has an origin: trade, standard or ours", () => {
  for (const [, label, origin] of rows) expect(origin, label).toMatch(/^(trade|standard|ours)\b/);
});
