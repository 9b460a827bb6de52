import { describe, expect, test } from "vitest";
import { catalogue } from "../../functions/catalogue";
import { isTable, type Entry } from "../../functions/cells/entry";
import { conversionTo } from "../../functions/cells/quantity-text";
import { frontDoors } from "../../functions/front-doors";

/** Functions of single cells: what broadcasts. */
const broadcasting = catalogue.filter(
  ({ inputs, result, example }) =>
    !isTable(result) &&
    inputs.length > 0 &&
    inputs.every(({ kind }) => kind !== "block") &&
    !example.some(Array.isArray),
);
const named = (entries: readonly Entry[]) => entries.map((entry) => [entry.name, entry] as const);
const call = (entry: Entry, cells: readonly unknown[]) =>
  frontDoors[entry.name](...cells.map((cell) => (Array.isArray(cell) ? cell : [[cell]])));

/** The example with its numbers a little larger and smaller, row by row. */
function variations(entry: Entry): unknown[][] {
  return [1, 1.01, 0.99, 1.002].map((factor) =>
    entry.example.map((cell) => (typeof cell === "number" ? cell * factor : cell)),
  );
}

describe.each(named(broadcasting))("%s", (_name, entry) => {
  test("over a column gives what single calls give", () => {
    const rows = variations(entry);
    const columns = entry.example.map((_, i) => rows.map((row) => [row[i]]));
    expect(call(entry, columns)).toEqual(rows.map((row) => call(entry, row)[0]));
  });

  test("over a row gives the column turned", () => {
    const rows = variations(entry);
    const across = entry.example.map((_, i) => [rows.map((row) => row[i])]);
    expect(call(entry, across)).toEqual([rows.map((row) => call(entry, row)[0][0])]);
  });
});

const quantitative = catalogue.filter(({ inputs, example }) =>
  inputs.some((input, i) => input.quantity?.unit && typeof example[i] === "number"),
);

describe.each(named(quantitative))("%s", (_name, entry) => {
  test("reads a number with its unit as the bare number", () => {
    const texts = entry.example.map((cell, i) => {
      const unit = entry.inputs[i].quantity?.unit;
      return typeof cell === "number" && unit ? `${cell} ${unit}` : cell;
    });
    expect(call(entry, texts)).toEqual(call(entry, entry.example));
  });
});

const otherUnits: Record<string, string> = {
  m: "mm",
  "m/s": "km/s",
  V: "kV",
  eV: "J",
  Hz: "MHz",
  "m^-3": "cm^-3",
  "m^-2 s^-1": "cm^-2 s^-1",
  "A/m^2": "mA/cm^2",
  "W/m^2": "W/cm^2",
  "V/m": "kV/cm",
  s: "ns",
  "F/m^2": "pF/cm^2",
  "ohm m^2": "ohm cm^2",
  deg: "rad",
  A: "mA",
  kg: "u",
  T: "G",
};
const withUnit = catalogue.filter(({ takesUnit }) => takesUnit);

describe.each(named(withUnit))("%s", (_name, entry) => {
  test("gives its result in another unit on request", () => {
    if (isTable(entry.result)) return;
    const unit = otherUnits[entry.result.unit];
    expect(unit, entry.result.unit).toBeDefined();
    const blanks = new Array(entry.inputs.length - entry.example.length).fill(null);
    const [[own]] = call(entry, entry.example);
    const [[other]] = call(entry, [...entry.example, ...blanks, unit]);
    expect((other * conversionTo(entry.result, unit)!.scale) / own).toBeCloseTo(1, 13);
  });
});
