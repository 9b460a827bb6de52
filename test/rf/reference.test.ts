import { describe, expect, test } from "vitest";
import { u } from "../../functions/matter/constants";
import type { Ion } from "../../functions/matter/ion";
import { logBesselI0 } from "../../functions/numerics/bessel";
import * as model from "../../functions/rf/model";
import reference from "../published/rf.json";
import { ulpsFrom } from "../ulp";

const ion = (mass: number, charge: number): Ion => ({ mass: mass * u, charge, label: "" });

/** Source: mpmath at 50 digits, test/published/rf.py. */
const functions: Record<keyof typeof reference.tables, (...inputs: number[]) => number> = {
  logBesselI0,
  shift: model.rfFloatingShift,
  spread: (V_dc, V_rf, s, f, mass, charge) => model.ionEnergySpread(V_dc, V_rf, s, f, ion(mass, charge)),
  child: (V_dc, s_m, mass, charge) => model.rfChildCurrent(V_dc, s_m, ion(mass, charge)),
  childCollisional: (V_dc, s_m, mass, charge, path) =>
    model.rfChildCurrentCollisional(V_dc, s_m, ion(mass, charge), path),
  width: model.rfSheathWidth,
  resistance: (n_edge, T_e, mass, charge) => model.sheathResistance(n_edge, T_e, ion(mass, charge)),
};

describe.each(Object.keys(functions) as (keyof typeof functions)[])("%s", (name) => {
  test("is within 4 ulp of 50-digit arithmetic", () => {
    const worst = Math.max(
      ...reference.tables[name].map(({ inputs, value }) => ulpsFrom(functions[name](...inputs), value)),
    );
    expect(worst).toBeLessThanOrEqual(4);
  });
});

describe("the coefficients of the RF Child laws", () => {
  test("the collisionless one is the time-averaged equations integrated, 200/243", () => {
    // Source: test/published/rf.py; printed as 0.82 (Lieberman 1988, from memory).
    expect(ulpsFrom(model.collisionlessCoefficient, reference.coefficients.collisionless)).toBeLessThanOrEqual(4);
    expect(model.collisionlessCoefficient).toBeCloseTo(0.82, 2);
  });

  test("the collisional one is the time-averaged equations integrated, which print rounds to 1.68", () => {
    // Source: test/published/rf.py; printed as 1.68 (Lieberman 1989, from memory).
    expect(ulpsFrom(model.collisionalCoefficient, reference.coefficients.collisional)).toBeLessThanOrEqual(1);
    expect(model.collisionalCoefficient).toBeCloseTo(1.68, 2);
  });
});
