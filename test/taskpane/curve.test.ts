// @vitest-environment jsdom
import { expect, test } from "vitest";
import { entryNamed } from "../../functions/catalogue";
import { frontDoors } from "../../functions/front-doors";
import { asksForLogarithm, axisFor } from "../../taskpane/pane/curve-axis";
import { curveOf, panelsOf, type Curve } from "../../taskpane/pane/curve-data";
import { drawCurve } from "../../taskpane/pane/curve-draw";
import { quantity, scaledUnit, span } from "../../taskpane/pane/curve-unit";
import { curveWords } from "../../taskpane/pane/curve-words";

const cell = (value: unknown) => [[value]];
const profile = (header: boolean) =>
  curveOf(
    entryNamed("SHEATHPROFILE")!,
    frontDoors.SHEATHPROFILE(cell(300), cell(1e16), cell(3), cell(null), cell(20), cell(header)),
  )!;

test("a profile is drawn as its potential over its two densities, from the wall on, with its title row or without", () => {
  for (const curve of [profile(false), profile(true)]) {
    expect(panelsOf(curve).map((traces) => traces.map(({ name }) => name))).toEqual([["potential"], ["Z n_i", "n_e"]]);
    expect(curve.fromWall).toBe(true);
    expect(curve.x.values).toHaveLength(20);
    expect(curve.x.values[0]).toBe(0);
    expect(curve.y[0].values[0]).toBe(-300);
  }
});

test("ions that arrive without a collision stand beside the curve of impact energies, not on it", () => {
  const result = frontDoors.IMPACTDISTRIBUTION(cell(300), cell(5e-3), cell(2e-3), cell(10));
  const curve = curveOf(entryNamed("IMPACTDISTRIBUTION")!, result)!;
  expect(curve.x.values).toHaveLength(10);
  // exp(−s/λ_i), the law of free flights.
  expect(curve.alone).toEqual({ name: "primaries", x: 300, share: expect.closeTo(Math.exp(-2.5), 12) });
});

test("a refused call and a table that makes no curve draw nothing", () => {
  expect(
    curveOf(entryNamed("SHEATHPROFILE")!, frontDoors.SHEATHPROFILE(cell(300), cell("OL"), cell(3))),
  ).toBeUndefined();
  expect(curveOf(entryNamed("EMISSIONLIMIT")!, frontDoors.EMISSIONLIMIT(cell("Ar+")))).toBeUndefined();
});

// SI prefixes: SI Brochure, 9th ed., table 7; they go with a unit's symbol, and a power would take the prefix with it.
test.each([
  ["m", 0.0046, "mm"],
  ["m", 3e-5, "µm"],
  ["V", 300, "V"],
  ["V", 25_000, "kV"],
  ["V/m", 1.1e5, "kV/m"],
  ["m^-3", 1e16, "10¹⁵ m⁻³"],
  ["m^-2 s^-1", 1.6e20, "10¹⁸ m⁻² s⁻¹"],
  ["eV^-1", 0.004, "10⁻³ eV⁻¹"],
  ["", 0.5, ""],
  ["kg", 6.6e-26, "10⁻²⁷ kg"],
])("a value in %s of size %d is counted in %s", (unit, size, text) => {
  const scaled = scaledUnit(unit, size);
  expect(scaled.text).toBe(text);
  expect(size / scaled.factor).toBeLessThan(1e4);
});

test("both ends of a range stand in one unit, unless they are many decades apart", () => {
  expect(span(0.000574, 0.01815, "m")).toBe("0.574 to 18.15 mm");
  expect(span(1.444e-60, 2.221e8, "A/m^2")).toBe("1.444 × 10⁻⁶⁰ to 2.221 × 10⁸ A/m²");
  expect(quantity(1e16, "m^-3")).toBe("10¹⁶ m⁻³");
  expect(quantity(30, "deg")).toBe("30°");
});

const curve = (x: number[], y: number[]): Curve => ({
  x: { name: "x", unit: "m", values: x },
  y: [{ name: "V", unit: "V", values: y }],
  logarithmicX: false,
  fromWall: false,
});

test.each([
  [[1, 2, 3], "V rises from 1 to 3 V"],
  [[3, 2, 1], "V falls from 3 to 1 V"],
  [[2, 2, 2], "V stays at 2 V"],
  [[2, 1, 3], "V goes from 2 to 3 V, least 1 V at x = 1 m"],
  [[2, 5, 3], "V goes from 2 to 3 V, greatest 5 V at x = 1 m"],
  [[NaN, 1, 2], "V rises from 1 to 2 V"],
])("the curve through %j is told as: %s", (values, told) => {
  expect(curveWords(curve([0, 1, 2], values))).toBe(`From x = 0 to 2 m: ${told}.`);
});

test("an axis is logarithmic where every trace spans two decades above zero", () => {
  const trace = (...values: number[]) => ({ name: "", unit: "", values });
  expect(asksForLogarithm([trace(1, 10, 100)])).toBe(true);
  expect(asksForLogarithm([trace(1, 10, 99)])).toBe(false);
  expect(asksForLogarithm([trace(0, 10, 1000)])).toBe(false);
  expect(asksForLogarithm([trace(1, 1000), trace(1, 2)])).toBe(false);
});

test("labels of an axis keep apart, whatever its range and width", () => {
  for (const logarithmic of [false, true]) {
    for (const [low, high] of [
      [20, 2000],
      [1e-30, 1e20],
      [1, 3],
      [300, 4500],
      [-150, -1.5],
    ]) {
      for (const width of [220, 560]) {
        const wanted = { pixels: [40, 40 + width] as [number, number], logarithmic, vertical: false, unit: "" };
        const { ticks } = axisFor([low, high], wanted);
        const shown = ticks.filter(({ label }) => label !== "").sort((a, b) => a.at - b.at);
        expect(shown.length, `${low} to ${high}`).toBeGreaterThan(0);
        shown.slice(1).forEach(({ at, label }, i) => {
          expect(at - shown[i].at).toBeGreaterThan(((label.length + shown[i].label.length) / 2) * 7.6);
        });
      }
    }
  }
});

test("a gap in the values is a gap in the line", () => {
  const d = drawCurve(curve([0, 1, 2, 3, 4], [1, 2, NaN, 3, 4]), 300)
    .querySelector(".trace")!
    .getAttribute("d")!;
  expect(d.match(/M/g)).toHaveLength(2);
  expect(d).not.toContain("NaN");
});

test("stretches lie where their values do, also where the values run downwards", () => {
  const stretches = [
    { first: 0, last: 0, word: "fails" as const, reason: "" },
    { first: 1, last: 2, word: "holds" as const, reason: "" },
  ];
  const bandOf = (x: number[]) => {
    const band = drawCurve({ ...curve(x, [1, 2, 3]), stretches }, 300).querySelector(".band")!;
    return ["x", "width"].map((name) => Number(band.getAttribute(name)));
  };
  const [[left], [right]] = [bandOf([0, 10, 20]), bandOf([20, 10, 0])];
  expect(left).toBeLessThan(100);
  expect(right).toBeGreaterThan(200);
});
