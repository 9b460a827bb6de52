import { describe, expect, test } from "vitest";
import { shareBetween } from "../../functions/layer/impact-distribution";
import * as model from "../../functions/layer/model";
import { bohmEnd, field, netCharge } from "../../functions/layer/nonlinear-sheath";
import { u } from "../../functions/matter/constants";
import type { Ion } from "../../functions/matter/ion";
import reference from "../published/layer.json";
import { ulpsFrom } from "../ulp";

const ion = (mass: number, charge: number): Ion => ({ mass: mass * u, charge, label: "" });

/** Source: mpmath at 50 digits, test/published/layer.py. */
type Name = Exclude<keyof typeof reference, "end">;
type Functions = Partial<Record<Name, (...inputs: number[]) => number>>;

const closedForms: Functions = {
  field,
  child: model.childWidth,
  matrix: model.matrixWidth,
  collisional: model.collisionalWidth,
  wallField: model.wallField,
  current: (V_s, s, mass, charge) => model.childCurrent(V_s, s, ion(mass, charge)),
  collisionalCurrent: (V_s, s, mass, charge, path) => model.collisionalCurrent(V_s, s, ion(mass, charge), path),
  width: (V_s, J, mass, charge) => model.widthFromCurrent(V_s, J, ion(mass, charge)),
  collisionalWidth: (V_s, J, mass, charge, path) => model.collisionalWidthFromCurrent(V_s, J, ion(mass, charge), path),
  transit: (V_s, s, mass, charge) => model.ionTransitTime(V_s, s, ion(mass, charge)),
  pulsed: (V_s, n_edge, T_e, mass, charge, t) => model.pulsedWidth(V_s, n_edge, T_e, ion(mass, charge), t),
};

const nearlyCancelling: Functions = { charge: netCharge, capacitance: model.sheathCapacitance };

const rows = (name: Name) => reference[name] as { inputs: number[]; value: string }[];

const worstUlps = (name: Name, f: (...inputs: number[]) => number) =>
  Math.max(...rows(name).map(({ inputs, value }) => ulpsFrom(f(...inputs), value)));

const worstRelative = (name: Name, f: (...inputs: number[]) => number) =>
  Math.max(...rows(name).map(({ inputs, value }) => Math.abs(f(...inputs) / Number(value) - 1)));

test.each(Object.entries(closedForms))("%s is within 4 ulp of 50-digit arithmetic", (name, f) => {
  expect(worstUlps(name as Name, f)).toBeLessThanOrEqual(4);
});

test.each(Object.entries(nearlyCancelling))("%s is within 8 ulp, although its terms nearly cancel", (name, f) => {
  expect(worstUlps(name as Name, f)).toBeLessThanOrEqual(8);
});

test.each([
  ["full", model.fullWidth, 1e-13],
  ["potential", model.sheathPotential, 1e-11],
] as const)("%s is within its accuracy from 0.12 to 10⁵ electron temperatures", (name, f, accuracy) => {
  expect(worstRelative(name, f)).toBeLessThan(accuracy);
});

describe("what the tables reach", () => {
  test("the field is tested down to a drop of 10⁻¹⁰ electron temperatures, at the Bohm speed and just above it", () => {
    const deepest = rows("field").filter(({ inputs: [eta] }) => eta === 1e-10);
    expect(deepest.map(({ inputs }) => inputs[1])).toEqual(expect.arrayContaining([1, 1 + 1e-12, 3, 100]));
  });

  test("potentials are tested from next to the wall to 10⁻⁶ of the drop and less", () => {
    const shares = rows("potential").map(({ inputs, value }) => -Number(value) / inputs[1]);
    expect(Math.max(...shares)).toBeGreaterThan(0.99);
    expect(Math.min(...shares)).toBeLessThan(1e-6);
  });
});

test("at the Bohm speed the sheath ends 0.11307 electron temperatures below the edge", () => {
  expect(ulpsFrom(bohmEnd, reference.end)).toBeLessThanOrEqual(4);
});

test("the share of ions between two energies is within 1e-13 of its density integrated", () => {
  const share = (paths: number, low: number, high: number) => shareBetween(low, high, paths) / (high - low);
  expect(worstRelative("impact", share)).toBeLessThan(1e-13);
});
