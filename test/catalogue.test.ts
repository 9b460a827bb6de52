import { describe, expect, test } from "vitest";
import { catalogue, entryNamed } from "../functions/catalogue";
import { isTable } from "../functions/cells/entry";
import { prettyUnit } from "../functions/cells/format";
import { isCellError } from "../functions/cells/host";
import { parseUnit } from "../functions/cells/units";
import { frontDoors } from "../functions/front-doors";
import { metadata, type Declaration } from "./declarations";

const { functions, enums } = await metadata();
const declared = new Map(functions.map((each) => [each.id, each]));

/** So that an entry without a front door fails its own tests instead of all. */
const undeclared: Declaration = { id: "", description: "", helpUrl: "", parameters: [] };

test("every entry has a front door and a declaration, and there are no others", () => {
  const names = catalogue.map(({ name }) => name).sort();
  expect(Object.keys(frontDoors).sort()).toEqual(names);
  expect([...declared.keys()].sort()).toEqual(names);
});

describe.each(catalogue.map((entry) => [entry.name, entry] as const))("%s", (name, entry) => {
  const declaration = declared.get(name) ?? undeclared;
  const parameters = declaration.parameters.filter(({ repeating }) => !repeating);

  test("its declaration names its inputs in order, with the same optional ones", () => {
    const inputs = entry.inputs.map((input) => [input.name, input.optional]);
    const wanted = entry.takesUnit ? [...inputs, ["unit", true]] : inputs;
    expect(parameters.map((each) => [each.name, each.optional ?? false])).toEqual(wanted);
    expect(declaration.parameters.every(({ dimensionality }) => dimensionality === "matrix")).toBe(true);
    const repeating = declaration.parameters.filter((each) => each.repeating).map((each) => each.name);
    expect(repeating).toEqual(entry.repeats ? [entry.repeats.name] : []);
  });

  test("the description of each quantity states the unit that it is read in", () => {
    entry.inputs.forEach(({ quantity }, i) => {
      if (!quantity?.unit) return;
      const unit = prettyUnit(quantity.unit).replace("°", "degrees");
      expect(parameters[i].description).toContain(unit);
    });
    if (entry.takesUnit && !isTable(entry.result)) {
      const unit = prettyUnit(entry.result.unit).replace(/^°$/, "degrees");
      expect(parameters.at(-1)!.description).toContain(unit);
    }
  });

  test("closed lists of words are the same in the formula bar's completion and in the entry", () => {
    parameters.forEach(({ customEnumId }, i) => {
      if (!customEnumId) return;
      const words = enums.find(({ id }) => id === customEnumId)!.values.map((each) => each.stringValue);
      expect(words).toEqual([...entry.inputs[i].words!]);
    });
  });

  test("it says what it is, where help is, from which source, and what changed", () => {
    expect(declaration.description.length).toBeGreaterThan(20);
    expect(declaration.helpUrl).toBe(`https://localhost:3000/taskpane.html#${name}`);
    expect(entry.sources.length).toBeGreaterThan(0);
    expect(Object.keys(entry.changes)).toContain("1.0.0");
    expect(entry.accuracy).not.toBe("");
  });

  test("its example gives a result without an error", () => {
    const result = frontDoors[name](...entry.example.map((cell) => (Array.isArray(cell) ? cell : [[cell]])));
    for (const cell of result.flat()) expect(isCellError(cell), JSON.stringify(cell)).toBe(false);
    expect(result.flat().some((cell) => cell !== "")).toBe(true);
  });

  test("its units are units", () => {
    const units = isTable(entry.result) ? entry.result.columns.map(({ unit }) => unit) : [entry.result.unit];
    for (const unit of units) if (unit !== "") expect(parseUnit(unit), unit).toBeDefined();
  });

  test("each limit has a reason, a source and two bounds", () => {
    for (const limit of entry.limits) {
      expect(limit.reason.length).toBeGreaterThan(10);
      expect(limit.source.text).not.toBe("");
      expect(Number.isFinite(limit.holds) && Number.isFinite(limit.fails)).toBe(true);
    }
  });
});

test("entries are found by name in any case, with or without the namespace", () => {
  expect(entryNamed("sheath.DebyeLength")?.name).toBe("DEBYELENGTH");
  expect(entryNamed(" BOHMSPEED ")?.name).toBe("BOHMSPEED");
  expect(entryNamed("NOSUCH")).toBeUndefined();
});
