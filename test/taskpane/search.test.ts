import { expect, test } from "vitest";
import { search } from "../../taskpane/pane/search";
import { firstSentence, type Words } from "../../taskpane/pane/words";

const words = (meaning: string, ...parameters: [string, string][]): Words => ({
  meaning,
  parameters: parameters.map(([name, meaning]) => ({ name, meaning, optional: false, repeating: false })),
});
const functions = [
  {
    name: "DEBYELENGTH",
    family: "Edge",
    words: words("Distance over which a plasma screens a charge.", ["n_e", "Electron density, m⁻³."]),
  },
  {
    name: "MEANFREEPATH",
    family: "Edge",
    words: words("Mean free path of ions in a gas.", ["p", "Gas pressure, Pa."]),
  },
  {
    name: "SHEATHWIDTH",
    family: "Layer",
    words: words("Width of a sheath, in Debye lengths and more.", ["V_s", "Sheath voltage, V."]),
  },
  { name: "NEWCOMER", family: "Layer", words: undefined },
];
const found = (query: string) => search(functions, query).map(({ name }) => name);

test("a function is found by a part of its name, its meaning, or an input's name and meaning", () => {
  expect(found("freepath")).toEqual(["MEANFREEPATH"]);
  expect(found("screens")).toEqual(["DEBYELENGTH"]);
  expect(found("v_s")).toEqual(["SHEATHWIDTH"]);
  expect(found("pressure")).toEqual(["MEANFREEPATH"]);
});

test("names come before meanings", () => expect(found("debye")).toEqual(["DEBYELENGTH", "SHEATHWIDTH"]));

test("every word of the query must be found", () => {
  expect(found("debye sheath")).toEqual(["SHEATHWIDTH"]);
  expect(found("debye pressure")).toEqual([]);
});

test("a formula pasted into the search finds its function", () => {
  expect(found("=SHEATH.DebyeLength")).toEqual(["DEBYELENGTH"]);
});

test("a function without a description is still found by name", () => expect(found("newc")).toEqual(["NEWCOMER"]));

test("the first sentence ends at its full stop, not inside a number or a name", () => {
  expect(firstSentence("About 0.5 T_e. More follows.")).toBe("About 0.5 T_e.");
  expect(firstSentence("No stop")).toBe("No stop");
});
