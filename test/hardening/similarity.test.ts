import { describe, expect, test } from "vitest";
import { catalogue } from "../../functions/catalogue";
import { isTable, type Entry } from "../../functions/cells/entry";
import { evaluate } from "../../functions/cells/evaluate";

/**
 * The sheath equations keep their form when all energies grow by s and all densities by k: lengths then grow by
 * √(s/k), times by 1/√k, and so on. Every function must follow, whatever its formula: dimensional analysis with m_e, e
 * and ε₀ held, since those can't be scaled. Exponents [a, b] mean s^a k^b, by the unit of the quantity.
 */
const exponents: Record<string, [energy: number, density: number]> = {
  "": [0, 0],
  eV: [1, 0],
  V: [1, 0],
  "m^-3": [0, 1],
  m: [0.5, -0.5],
  s: [0, -0.5],
  Hz: [0, 0.5],
  "m/s": [0.5, 0],
  "V/m": [0.5, 0.5],
  "A/m^2": [0.5, 1],
  "m^-2 s^-1": [0.5, 1],
  "W/m^2": [1.5, 1],
  "F/m^2": [-0.5, 0.5],
  "m^2": [1, -1],
  A: [1.5, 0],
  "ohm m^2": [0.5, -1],
  T: [0, 0.5],
  deg: [0, 0],
  "eV^-1.5 m^-3": [-1.5, 1],
};

/** Functions of matter rather than of the sheath: their formulas hold constants that do not scale along. */
const apart = new Set(["MEANFREEPATH", "RICHARDSONCURRENT", "EROSIONRATE", "IONEMISSION", "IONMASS"]);

const lawful = catalogue.filter(
  (entry) =>
    !apart.has(entry.name) &&
    !isTable(entry.result) &&
    entry.result.unit in exponents &&
    entry.inputs.every(({ kind, quantity }) => kind !== "text" && (!quantity || quantity.unit in exponents)) &&
    entry.inputs.length > 0 &&
    entry.name !== "CONSTANT",
);

const scaled = (value: number, unit: string, s: number, k: number) => {
  const [a, b] = exponents[unit];
  return value * s ** a * k ** b;
};

function scaledExample(entry: Entry, s: number, k: number): unknown[] {
  return entry.example.map((cell, i) => {
    const unit = entry.inputs[i].quantity?.unit;
    if (unit === undefined) return cell;
    if (Array.isArray(cell))
      return cell.map((row) => row.map((x) => (typeof x === "number" ? scaled(x, unit, s, k) : x)));
    return typeof cell === "number" ? scaled(cell, unit, s, k) : cell;
  });
}

test("most functions of the catalogue are held to the law", () => {
  expect(lawful.length).toBeGreaterThan(catalogue.length / 2);
});

describe.each(lawful.map((entry) => [entry.name, entry] as const))("%s", (_name, entry) => {
  test.each([
    [2, 1],
    [1, 3],
    [0.3, 7],
  ])("follows energies times %f and densities times %f", (s, k) => {
    const value = (factors: [number, number]) => evaluate(entry, scaledExample(entry, ...factors))[0][0];
    const [before, after] = [value([1, 1]), value([s, k])];
    if (typeof before !== "number") return expect(typeof before).toBe("string");
    if (isTable(entry.result)) return;
    const expected = scaled(before, entry.result.unit, s, k);
    expect(typeof after, JSON.stringify(after)).toBe("number");
    expect(Math.abs((after as number) - expected)).toBeLessThanOrEqual(1e-9 * Math.abs(expected));
  });
});
