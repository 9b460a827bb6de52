import vm from "node:vm";
import { describe, expect, test } from "vitest";
import { shownOnly } from "../../manifest/build/leave-out-loader.js";
import { catalogue } from "../../functions/catalogue";
import { isTable, type Entry } from "../../functions/cells/entry";
import { frontDoors, type FrontDoor } from "../../functions/front-doors";
import { samplesOf, seeded } from "../twin/samples";
import { readBuilt } from "./built";

/** functions.js as built, which has loops of its own and lacks what only the pane shows. */
const built: Record<string, FrontDoor> = {};
vm.runInNewContext(readBuilt("functions.js"), {
  CustomFunctions: { associate: (id: string, door: FrontDoor) => (built[id] = door) },
});

const closedForms = catalogue.filter(({ twin, result }) => typeof twin === "object" && !isTable(result));

test("every function is registered under its own name", () => {
  expect(Object.keys(built).sort()).toEqual(catalogue.map(({ name }) => name).sort());
});

test("every example gives what the sources give", () => {
  for (const { name, example } of catalogue) {
    if (name === "ABOUT") continue;
    const args = example.map((cell) => (Array.isArray(cell) ? cell : [[cell]]));
    expect(plain(built[name](...args)), name).toEqual(plain(frontDoors[name](...args)));
  }
});

describe.each(closedForms.map((entry) => [entry.name, entry] as const))("%s", (name, entry) => {
  test("a column of good and bad rows gives what the sources give, row by row", () => {
    const columns = columnsOf(entry);
    const ours = plain(built[name](...columns));
    expect(ours).toEqual(plain(frontDoors[name](...columns)));
    expect(ours.some(([cell]) => typeof cell === "number")).toBe(true);
    if (entry.inputs.some(({ optional }) => !optional)) expect(ours.at(-2)).toEqual([""]);
    expect(ours.at(-1)).toEqual([expect.objectContaining({ code: "#VALUE!" })]);
  });
});

test("what only readers see is not in functions.js", () => {
  expect(/\\frac|\\sqrt|SUMPRODUCT|RADIANS|J\. Phys|Lieberman/.exec(readBuilt("functions.js"))?.[0]).toBeUndefined();
});

test("no function needs what only readers see", () => {
  const examples = catalogue.map(({ name, example }) => [name, example] as const);
  const limits = catalogue.flatMap((entry) => entry.limits);
  const hidden = [...catalogue, ...limits].map((each) => [each, Object.getOwnPropertyDescriptors(each)] as const);
  for (const entry of catalogue) for (const fact of shownOnly) hide(entry, fact);
  for (const limit of limits) hide(limit, "source");
  try {
    for (const [name, example] of examples) {
      const args = example.map((cell) => (Array.isArray(cell) ? cell : [[cell]]));
      expect(JSON.stringify(frontDoors[name](...args)), name).not.toContain("is not in functions.js");
    }
  } finally {
    for (const [each, facts] of hidden) Object.defineProperties(each, facts);
  }
});

function hide(from: object, fact: string): void {
  const get = () => {
    throw new Error(`${fact} is not in functions.js`);
  };
  Object.defineProperty(from, fact, { configurable: true, enumerable: false, get });
}

/** Samples of the trade's inputs one below the other, with a blank row and one that an instrument could not read. */
function columnsOf(entry: Entry): unknown[][][] {
  const rows = samplesOf(entry, 20, seeded(7)).map((args) => entry.inputs.map((_, i) => args[i]?.[0][0] ?? null));
  const blank = entry.inputs.map(() => null);
  const unread = entry.inputs.map(() => "OL");
  return entry.inputs.map((_, i) => [...rows, blank, unread].map((row) => [row[i]]));
}

/** Across the border of the context only plain content is equal. */
function plain(result: unknown[][]): any[][] {
  return JSON.parse(JSON.stringify(result));
}
