import { describe, expect, test } from "vitest";
import type { Cells } from "../../functions/cells/broadcast";
import { UNCERTAINTY } from "../../functions/checks/functions";
import { draws } from "../../functions/checks/propagation";
import { mostDrawnRows, uncertainty, type Method } from "../../functions/checks/uncertainty";
import { CELSIUS, CUBEROOT, directoryOf, NARROW, NOLIMITS, SHARP, SQUARE, SUM4 } from "./fakes";

const directory = directoryOf(CELSIUS, CUBEROOT, NARROW, NOLIMITS, SHARP, SQUARE, SUM4);
interface Call {
  rel?: Cells;
  abs?: Cells;
  method?: Method;
  part?: string;
}
const of = (name: string, values: Cells, { rel, abs, method = "linear", part }: Call): any[][] =>
  uncertainty(directory, name, values, rel, abs, method, part);
/** A function of the catalogue, through its front door. */
const door = (...args: unknown[]) => (UNCERTAINTY as (...args: any[]) => any[][])(...args);

describe("one case", () => {
  test("gives the value, its standard uncertainty and the share of each argument", () => {
    // λ_D ∝ √(T/n): half of each relative uncertainty, in quadrature.
    const [[value, u, ofDensity, ofTemperature]] = door([["DEBYELENGTH"]], [[1e16, 3]], [[0.2, 0.1]]);
    expect(value).toBeCloseTo(1.2876e-4, 9);
    expect(u / value).toBeCloseTo(Math.hypot(0.1, 0.05), 8);
    expect(ofDensity).toBeCloseTo(0.8, 8);
    expect(ofTemperature).toBeCloseTo(0.2, 8);
  });

  test("Child's width goes as V^(3/4) n^(−1/2) T^(−1/4)", () => {
    const [[value, u]] = door([["SHEATHWIDTH"]], [[300, 1e16, 3, "child"]], [["4 %", "10 %", "8 %", ""]]);
    expect(value).toBeCloseTo(3.22809e-3, 7);
    expect(u / value).toBeCloseTo(Math.hypot(0.03, 0.05, 0.02), 8);
  });

  test("takes text arguments and quantity text, and gives them no share of their own", () => {
    const [[value, u, ofTemperature, ofIon]] = door([["bohmspeed"]], [["34813.5 K", "Ar+"]], [["10 %"]]);
    expect(value).toBeCloseTo(2691.83, 1);
    expect(u / value).toBeCloseTo(0.05, 8);
    expect([ofTemperature, ofIon]).toEqual([1, 0]);
  });

  test("absolute uncertainties are in the argument's unit, or in one they state", () => {
    const bare = door([["BOHMSPEED"]], [[3, "Ar+"]], null, [[0.3, ""]]);
    const stated = door([["BOHMSPEED"]], [[3, "Ar+"]], null, [["300 meV", ""]]);
    expect(bare[0][1]).toBeCloseTo(2691.83 * 0.05, 1);
    expect(stated[0][1]).toBeCloseTo(bare[0][1], 9);
  });

  test("an uncertainty of 5 °C is one of 5 K", () => {
    const [[value, u]] = of("CELSIUS", [["20 °C"]], { abs: [["5 °C"]] });
    expect(value).toBeCloseTo(2 * 293.15, 9);
    expect(u).toBeCloseTo(10, 9);
  });

  test("a relative and an absolute uncertainty of one argument add in quadrature", () => {
    const [[, u]] = of("SUM4", [[10, 0, 0, 0]], { rel: [[0.3, 0, 0, 0]], abs: [[4, 0, 0, 0]] });
    expect(u).toBeCloseTo(5, 10);
  });

  test("the result comes in the unit that its last argument asks for", () => {
    const [[value, u]] = door([["DEBYELENGTH"]], [[1e16, 3, "", "mm"]], [[0, 0.1, 0, 0]]);
    expect(value).toBeCloseTo(0.12876, 6);
    expect(u).toBeCloseTo(0.12876 * 0.05, 6);
    const [[shifted, same]] = of("CELSIUS", [[300, "°C"]], { abs: [[5]] });
    expect(shifted).toBeCloseTo(600 - 273.15, 9);
    expect(same).toBeCloseTo(10, 9);
  });

  test("a part is picked by its name in any case", () => {
    const call = { rel: [[0.1, 0.1, 0.1, 0.1]] };
    expect(of("SUM4", [[1, 2, 3, 4]], { ...call, part: "value" })).toEqual([[10]]);
    expect(of("SUM4", [[1, 2, 3, 4]], { ...call, part: "U" })[0][0]).toBeCloseTo(Math.sqrt(0.3), 10);
    expect(of("SUM4", [[1, 2, 3, 4]], { ...call, part: "x4" })[0][0]).toBeCloseTo(16 / 30, 8);
    expect(of("SUM4", [[1, 2, 3, 4]], { ...call, part: "x5" })[0][0].message).toBe(
      'part: "x5" is none of its columns; type one of value, u, x1, x2, x3, x4.',
    );
  });
});

describe("many cases", () => {
  const values = [
    [1, 2, 3, 4],
    [10, 20, 30, 40],
  ];

  test("share one row of uncertainties, one cell, or have a row each", () => {
    const u = (call: Call) => of("SUM4", values, { ...call, part: "u" }).flat();
    expect(u({ abs: [[3, 4, 0, 0]] })).toEqual([expect.closeTo(5, 9), expect.closeTo(5, 9)]);
    expect(u({ abs: [[1]] })).toEqual([expect.closeTo(2, 9), expect.closeTo(2, 9)]);
    expect(u({ abs: [[1], [2]] })).toEqual([expect.closeTo(2, 9), expect.closeTo(4, 9)]);
    expect(u({ rel: [["10 %"]] })).toEqual([expect.closeTo(Math.sqrt(0.3), 9), expect.closeTo(Math.sqrt(30), 9)]);
  });

  test("a bad row has its error, an empty one nothing, and the others keep their values", () => {
    const rows = of(
      "SUM4",
      [
        [1, 2, 3, 4],
        ["OL", 2, 3, 4],
        ["", null, "", ""],
        [1, 2, 3, 4],
      ],
      { rel: [[0.1]] },
    );
    expect(rows[0]).toEqual(rows[3]);
    expect(rows[1][0].message).toMatch(/^x1: "OL" is an instrument's word/);
    expect(rows[1].slice(1)).toEqual(["", "", "", "", ""]);
    expect(rows[2]).toEqual(["", "", "", "", "", ""]);
  });

  test("a row's numbers do not depend on the rows around it", () => {
    const alone = of("SQUARE", [[3]], { rel: [[0.1]], method: "montecarlo" });
    const among = of("SQUARE", [[1], [3], [2]], { rel: [[0.1]], method: "montecarlo" });
    expect(among[1]).toEqual(alone[0]);
  });
});

describe("drawing", () => {
  test("gives the mean, u, the 95 % interval, the draws outside, and the first-order shares", () => {
    const [row] = of("SUM4", [[1, 2, 3, 4]], { abs: [[3, 4, 0, 0]], method: "montecarlo" });
    const [value, u, low, high, outside, ...shares] = row;
    expect(Math.abs(value - 10)).toBeLessThan(0.05);
    expect(Math.abs(u - 5)).toBeLessThan(0.04);
    expect(Math.abs(low - (10 - 1.96 * 5))).toBeLessThan(0.15);
    expect(Math.abs(high - (10 + 1.96 * 5))).toBeLessThan(0.15);
    expect(outside).toBe(0);
    expect(shares).toEqual([expect.closeTo(0.36, 8), expect.closeTo(0.64, 8), 0, 0]);
  });

  test("agrees with first order for small uncertainties of a sheath width", () => {
    const call = [[["SHEATHWIDTH"]], [[300, 1e16, 3]], [["1 %"]]];
    const [[, linear]] = door(...call);
    const [[, drawn]] = door(...call, null, [["montecarlo"]]);
    expect(drawn / linear).toBeCloseTo(1, 2);
  });

  test("differs where electrons climb a repelling wall: the flux is lognormal, and first order misses a third of u", () => {
    // Γ ∝ exp(V_w/T_e), u(V_w) = T_e: relative u is √(exp(1) − 1) of the mean exp(½) Γ(V_w), and 1 in first order.
    const call = [[["ELECTRONFLUX"]], [[1e16, 3, -30]], null, [[0, 0, 3]]];
    const [[value, linear]] = door(...call);
    const [[mean, u]] = door(...call, [["montecarlo"]]);
    expect(linear / value).toBeCloseTo(1, 6);
    expect(Math.abs(mean / value / Math.exp(0.5) - 1)).toBeLessThan(0.02);
    expect(Math.abs(u / mean / Math.sqrt(Math.E - 1) - 1)).toBeLessThan(0.06);
  });

  test("says how many draws lie where the function has no value", () => {
    const [[, , low, , outside]] = of("CUBEROOT", [[1]], { rel: [[0.5]], method: "montecarlo" });
    // Two standard deviations: 2.275 % of the draws.
    expect(outside).toMatch(/^2\d\d\d of 100000 draws outside$/);
    expect(low).toBeGreaterThan(0);
    expect(of("CUBEROOT", [[1]], { rel: [[0.01]], method: "montecarlo" })[0][4]).toBe(0);
  });

  test("gives up where most of them do", () => {
    const [[error]] = of("NARROW", [[1.5]], { abs: [[10]], method: "montecarlo" });
    expect(error.code).toBe("#N/A");
    expect(error.message).toMatch(/^9\d\d\d\d of 100000 draws lie where NARROW has no value/);
    expect(of("NARROW", [[1.5]], { abs: [[0.1]], method: "montecarlo" })[0][4]).toBe(0);
  });

  test("leaves the shares blank where first order has no slope", () => {
    const [[mean, u, , , , share]] = of("SHARP", [[0]], { abs: [[1]], method: "montecarlo" });
    expect(mean).toBeCloseTo(Math.sqrt(2 / Math.PI), 2);
    expect(u).toBeCloseTo(Math.sqrt(1 - 2 / Math.PI), 2);
    expect(share).toBe("");
  });

  test("takes so many rows in one call and no more, since each costs 10⁵ evaluations", () => {
    expect(draws).toBe(100_000);
    const rows = Array.from({ length: mostDrawnRows + 1 }, () => [1]);
    expect(of("SQUARE", rows, { rel: [[0.1]], method: "montecarlo" })[0][0].message).toMatch(/give at most 20 rows/);
    expect(of("SQUARE", rows, { rel: [[0.1]] })).toHaveLength(mostDrawnRows + 1);
  });
});

describe("what cannot be done is told", () => {
  const message = (name: string, values: Cells, call: Call) => of(name, values, call)[0][0].message;

  test.each([
    ["SHARP", [[0]], { abs: [[1]] }, /no definite slope along x at 0.*use method "montecarlo"/],
    ["SQUARE", [[1]], {}, /neither rel_unc nor abs_unc is given/],
    ["SQUARE", [[1, 2]], { rel: [[0.1]] }, /SQUARE takes 1 columns? at most, not 2; give x, a row for each case/],
    ["SUM4", [[1, 2, 3, 4]], { rel: [[0.1, 0.1]] }, /rel_unc: 1 row by 2 columns do not match values of 1 row by 4/],
    ["SUM4", [[1, 2, 3, 4]], { abs: [[1], [1]] }, /abs_unc: 2 rows by 1 column do not match/],
    ["SQUARE", [[1]], { rel: [[-0.1]] }, /rel_unc: -0.1 is no uncertainty/],
    ["SQUARE", [[1]], { rel: [[20]] }, /^rel_unc: 20 is 2000 % of the value; type one such as 0\.05 or "5 %"\.$/],
    ["SQUARE", [[1]], { rel: [["wide"]] }, /rel_unc: "wide" is not a ratio/],
    ["CUBEROOT", [[8]], { abs: [["2 mm"]] }, /abs_unc of V: "mm" is a unit of length/],
    ["SQUARE", [[1]], { abs: [[true]] }, /abs_unc: the cell holds no number/],
    ["CUBEROOT", [[-8]], { rel: [[0.1]] }, /Below 0 V there is no root/],
    ["CUBEROOT", [[8, "Ar+"]], { rel: [[0.1, 0.1]] }, /ion: it is no number and can't have an uncertainty/],
    ["CUBEROOT", [[8, "Ar+", ""]], { rel: [[0.1, 0, 0.1]] }, /W: it is blank and can't have an uncertainty/],
    ["CUBEROOT", [[8, "Ar+", "floating"]], { abs: [[0.1, 0, 0.1]] }, /W: it is no number/],
    ["NOSUCH", [[1]], { rel: [[0.1]] }, /there is no function "NOSUCH"/],
  ] as [string, Cells, Call, RegExp][])("%s of %j with %j", (name, values, call, says) => {
    expect(message(name, values, call)).toMatch(says);
  });

  test("functions that spill, take whole ranges or return text have no uncertainty", () => {
    expect(door([["EMISSIONLIMIT"]], [["Ar+"]], [[0.1]])[0][0].message).toMatch(/EMISSIONLIMIT spills/);
    expect(door([["WITHIN"]], [[1, 2, 0.1]], [[0.1]])[0][0].message).toMatch(/returns text/);
    expect(door([["LIMITCHECK"]], [[1]], [[0.1]])[0][0].message).toMatch(/is itself a check/);
  });

  test("an error in the name or an uncertainty passes on", () => {
    expect(of("SQUARE", [[1]], { rel: [[{ code: "#N/A" }]] })[0][0]).toMatchObject({ code: "#N/A" });
    expect(door([[{ code: "#DIV/0!" }]], [[1]], [[0.1]])[0][0]).toMatchObject({ code: "#DIV/0!" });
  });
});
