import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { CHILDCURRENT, CHILDWIDTH, SHEATHPOTENTIAL, SHEATHWIDTH } from "../../functions/layer/functions";
import { bohmEnd, bohmWidth, distance, dropAtEnd, netCharge } from "../../functions/layer/nonlinear-sheath";

const call = (door: unknown, ...values: unknown[]) =>
  (door as any)(...values.map((value) => (Array.isArray(value) ? value : [[value]])));
const one = (door: unknown, ...values: unknown[]) => call(door, ...values)[0][0];

describe("the full width by its series", () => {
  test("is the quadrature it was made from, within 3e-13, from a hair above the sheath's end to 10⁸ T_e", () => {
    fc.assert(
      fc.property(fc.double({ min: Math.log(1e-6), max: Math.log(1e9), noNaN: true }), (v) => {
        const eta = bohmEnd * (1 + Math.exp(v));
        expect(Math.abs(bohmWidth(eta) / distance(bohmEnd, eta, 1) - 1)).toBeLessThan(3e-13);
      }),
      { numRuns: 3000 },
    );
  });

  test("joins its closed form without a step where the electrons end", () => {
    expect(bohmWidth(38.000001) - bohmWidth(38)).toBeCloseTo(1e-6 / Math.sqrt(2 * Math.sqrt(77) - 4), 10);
  });
});

test("the sheath ends where the net charge is 1 %, nearer the edge the faster the ions come", () => {
  const ends = [1, 1.0001, 1.2, 2, 50].map((mu) => {
    expect(netCharge(dropAtEnd(mu), mu)).toBeCloseTo(0.01, 15);
    return dropAtEnd(mu);
  });
  expect(ends[0]).toBeCloseTo(0.11307, 5);
  expect([...ends].sort((a, b) => b - a)).toEqual(ends);
});

describe("what cannot be answered says why", () => {
  test("a drop below 0.113 T_e has no full width", () => {
    expect(one(SHEATHWIDTH, 0.3, 1e16, 3, "full")).toMatchObject({
      code: "#N/A",
      message:
        "V_s is 0.1 T_e, but the net charge only reaches 1 % of e n_edge where the potential has dropped by 0.1131 T_e; " +
        "give a larger V_s (SHEATHPOTENTIAL and WALLFIELD take any).",
    });
    expect(one(SHEATHWIDTH, 0.34, 1e16, 3, "full")).toBeGreaterThan(0);
  });

  test.each([
    ["SHEATHWIDTH", SHEATHWIDTH, [300, 1e16, 3]],
    ["CHILDCURRENT", CHILDCURRENT, [300, 1e-3, "Ar+"]],
    ["CHILDWIDTH", CHILDWIDTH, [300, 44, "Ar+"]],
  ])("%s asks a collisional law for its mean free path", (_name, door, inputs) => {
    expect(one(door, ...inputs, "collisional")).toMatchObject({
      code: "#VALUE!",
      message: expect.stringMatching(/^lambda_i: it is blank while model is "collisional"; type .* such as 0.5 mm/),
    });
    expect(one(door, ...inputs, "Collisional", "0.5 mm")).toBeGreaterThan(0);
  });

  test("words of another function's list are answered with the right ones", () => {
    expect(one(SHEATHWIDTH, 300, 1e16, 3, "collisionless").message).toMatch(
      /type "child", "matrix", "full" or "collisional"/,
    );
    expect(one(CHILDWIDTH, 300, 44, "Ar+", "child").message).toMatch(/type "collisionless" or "collisional"/);
  });

  test("a current that flows out of the wall, or none, carries no ion sheath", () => {
    expect(one(CHILDWIDTH, 300, -44, "Ar+").message).toMatch(/^J: -44 is below the lowest value; .* above 0/);
    expect(one(CHILDWIDTH, 300, 0, "Ar+").message).toMatch(/^J is blank/);
  });

  test("no drop counts as a blank, and its row stays empty in a sweep from 0 V", () => {
    expect(one(SHEATHWIDTH, 0, 1e16, 3).message).toMatch(/^V_s is blank or 0; type a value such as 300 V/);
    expect(call(SHEATHWIDTH, [[0], [100]], 1e16, 3)[0][0]).toBe("");
  });
});

test("a sweep over drops and models gives a table, in any unit of length", () => {
  // Recomputed with mpmath for the full widths; the other two from their equations.
  const table = call(SHEATHWIDTH, [[30], [300]], "1e10 cm^-3", "3 eV", [["child", "matrix", "full"]], null, "um");
  expect(table.map((row: number[]) => row.map((s) => s.toPrecision(4)))).toEqual([
    ["574.0", "575.8", "1636"],
    ["3228", "1821", "4649"],
  ]);
});

test("far outside the sheath the potential is still a number, up to where it is too small for one", () => {
  const column = call(SHEATHPOTENTIAL, [[0.1], [10], [1e5], [1e300]], 300, 1e16, 3, [[1, 1.5]]);
  expect(column.flat().every((value: unknown) => typeof value === "number" && value <= 0)).toBe(true);
  expect(column[3]).toEqual([0, 0]);
});
