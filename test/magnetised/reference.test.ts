import { describe, expect, test } from "vitest";
import * as model from "../../functions/magnetised/model";
import { u } from "../../functions/matter/constants";
import type { Ion } from "../../functions/matter/ion";
import reference from "../published/magnetised.json";
import { ulpsFrom } from "../ulp";

const ion = (mass: number, charge: number): Ion => ({ mass: mass * u, charge, label: "" });

/** Source: mpmath at 50 digits, test/published/magnetised.py. */
const functions: Record<keyof typeof reference, (...inputs: number[]) => number> = {
  gyroradius: (T, B, mass, charge) => model.gyroradius(T, B, ion(mass, charge)),
  width: (T_e, mass, charge, B, angle, T_i) => model.magneticPresheathWidth(T_e, ion(mass, charge), B, angle, T_i),
  drop: model.magneticPresheathDrop,
  grazing: (mass, charge, ratio) => model.grazingLimit(ion(mass, charge), ratio),
};

describe.each(Object.keys(functions) as (keyof typeof reference)[])("%s", (name) => {
  test("is within 4 ulp of 50-digit arithmetic", () => {
    const worst = Math.max(...reference[name].map(({ inputs, value }) => ulpsFrom(functions[name](...inputs), value)));
    expect(worst).toBeLessThanOrEqual(4);
  });
});
