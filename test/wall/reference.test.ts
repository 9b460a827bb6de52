import { describe, expect, test } from "vitest";
import { Fault } from "../../functions/cells/fault";
import { u } from "../../functions/matter/constants";
import type { Ion } from "../../functions/matter/ion";
import { emissionLimit } from "../../functions/wall/emission-limit";
import { emissionYield } from "../../functions/wall/emission-yield";
import * as entries from "../../functions/wall/entries";
import * as model from "../../functions/wall/model";
import { voltageOrWhyNot } from "../../functions/wall/potentials";
import reference from "../published/wall.json";
import { ulp, ulpsFrom } from "../ulp";

interface Row {
  inputs: any[];
  value: string;
  /** How strongly the problem itself amplifies the rounding of what goes into it. */
  condition?: number;
  /** The size of an exponent, whose rounding comes out multiplied by it. */
  exponent?: number;
}

const ion = (mass: number, charge: number): Ion => ({ mass: mass * u, charge, label: "" });
const wallAt = (V: number | null) => V ?? "floating";

/** Source: mpmath at 50 digits, test/published/wall.py. */
const functions: Record<string, (...inputs: any[]) => unknown> = {
  floating: (T, mass, Z, T_i, delta) => entries.FLOATINGPOTENTIAL.compute(T, ion(mass, Z), T_i, delta, "edge", 1),
  ionFlux: (n, T, mass, Z, T_i, angle) => entries.WALLFLUX.compute(n, T, ion(mass, Z), T_i, 1, angle),
  ionCurrent: (n, T, mass, Z, T_i, angle) => entries.IONCURRENTDENSITY.compute(n, T, ion(mass, Z), T_i, 1, angle),
  electronFlux: (n, T, V) => entries.ELECTRONFLUX.compute(n, T, V, 1),
  wallVoltage: (J, n, T, mass, Z, T_i, delta) => voltageOrWhyNot(J, n, T, ion(mass, Z), T_i, delta),
  impact: (T, mass, Z, T_i, V) => entries.IONIMPACTENERGY.compute(T, ion(mass, Z), T_i, wallAt(V)),
  heatFlux: (n, T, mass, Z, T_i, V, delta, surface, angle) =>
    entries.WALLHEATFLUX.compute(n, T, ion(mass, Z), T_i, wallAt(V), 1, delta, surface, angle),
  heatFactor: (T, mass, Z, T_i, V, delta) => entries.HEATFACTOR.compute(T, ion(mass, Z), T_i, wallAt(V), delta),
  richardson: (T, W, A_R) => model.richardsonCurrent(T, W, A_R ?? model.richardsonConstant),
  erosion: (flux, sputtered, mass, density) => model.erosionRate(flux, sputtered, mass * u, density),
  ionEmission: model.ionEmission,
};

describe.each(Object.keys(functions))("%s", (name) => {
  test("is within 4 ulp of 50-digit arithmetic, times what the problem itself amplifies", () => {
    for (const { inputs, value, condition = 1, exponent = 0 } of reference[name as keyof typeof reference] as Row[]) {
      const given = functions[name](...inputs);
      expect(given, JSON.stringify(inputs)).not.toBeInstanceOf(Fault);
      expect(ulpsFrom(given as number, value), JSON.stringify(inputs)).toBeLessThanOrEqual(4 * condition + exponent);
    }
  });
});

test("the potential from the plasma keeps 4 ulp of the larger of its two parts", () => {
  for (const { inputs, value } of reference.fromPlasma) {
    const [T, mass, Z, T_i, delta, ratio] = inputs;
    const V_f = entries.FLOATINGPOTENTIAL.compute(T, ion(mass, Z), T_i, delta, "plasma", ratio) as number;
    expect(Math.abs(V_f - Number(value))).toBeLessThanOrEqual(4 * ulp(T + Math.abs(Number(value))));
  }
});

test("the net current is within 1e-14 of the larger of the two that cancel", () => {
  for (const { inputs, value, scale } of reference.wallCurrent) {
    const [V, n, T, mass, Z, T_i, delta] = inputs;
    const J = model.wallCurrent(V, n, T, ion(mass, Z), T_i, delta);
    expect(Math.abs(J - Number(value))).toBeLessThanOrEqual(1e-14 * scale);
  }
});

test("the emission limit is solved to 1e-12, from ions of 0.02 u per charge to 4000", () => {
  for (const { inputs, value } of reference.emissionLimit) {
    const { delta, drop, edgeEnergy } = emissionLimit(ion(inputs[0], 1))!;
    [delta, drop, edgeEnergy].forEach((each, i) => {
      expect(Math.abs(each / Number(value[i]) - 1), `${inputs[0]} u`).toBeLessThan(1e-12);
    });
    // What is left to lose, 1 − δ, matters as much as δ.
    expect(Math.abs((1 - delta) / (1 - Number(value[0])) - 1)).toBeLessThan(1e-11);
  }
});

test("the mean yield is good to 1e-13 by either of its two methods", () => {
  for (const { inputs, value } of reference.emissionYield) {
    const [T, delta_max, E_max] = inputs;
    expect(Math.abs(emissionYield(T, delta_max, E_max) / Number(value) - 1)).toBeLessThan(1e-13);
  }
});
