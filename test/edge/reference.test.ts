import { describe, expect, test } from "vitest";
import * as model from "../../functions/edge/model";
import { u } from "../../functions/matter/constants";
import type { Ion } from "../../functions/matter/ion";
import reference from "../published/edge.json";
import { ulpsFrom } from "../ulp";

const ion = (mass: number, charge: number): Ion => ({ mass: mass * u, charge, label: "" });

/** Source: mpmath at 50 digits, test/published/edge.py. */
const functions: Record<keyof typeof reference, (...inputs: number[]) => number> = {
  debye: model.debyeLength,
  debyeWithIons: model.debyeLengthWithIons,
  plasma: (n, mass, charge) => model.plasmaFrequency(n, mass * u, charge),
  path: model.meanFreePath,
  bohm: (T_e, mass, charge, T_i, gamma) => model.bohmSpeed(T_e, ion(mass, charge), T_i, gamma),
  collisional: (T_e, mass, charge, n, path) => model.collisionalBohmSpeed(T_e, ion(mass, charge), n, path),
  decay: (n, T_e, mass, charge, u_0) => model.edgeDecayLength(n, T_e, ion(mass, charge), u_0),
  slab: (size, path) => model.edgeRatio("slab", size, path),
  cylinder: (size, path) => model.edgeRatio("cylinder", size, path),
  drop: model.presheathDrop,
  toEdge: model.wallToEdge,
};

/** Near the Bohm speed the rounding of u_B itself is amplified by u_B²/(u_0² − u_B²): the condition of the problem. */
const allowed: Partial<Record<keyof typeof reference, number>> = { decay: 30 };

describe.each(Object.keys(functions) as (keyof typeof reference)[])("%s", (name) => {
  test(`is within ${allowed[name] ?? 4} ulp of 50-digit arithmetic`, () => {
    const worst = Math.max(...reference[name].map(({ inputs, value }) => ulpsFrom(functions[name](...inputs), value)));
    expect(worst).toBeLessThanOrEqual(allowed[name] ?? 4);
  });
});
