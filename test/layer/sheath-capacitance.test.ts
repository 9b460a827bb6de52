import { describe, expect, test } from "vitest";
import { debyeLength } from "../../functions/edge/model";
import * as model from "../../functions/layer/model";
import { eps0 } from "../../functions/matter/constants";

/** d/dV of the charge ε₀ E by central differences, extrapolated to no step (Richardson). */
function slopeOfCharge(V_s: number, u_ratio: number): number {
  const charge = (V: number) => eps0 * model.wallField(V, 1e16, 3, u_ratio);
  const central = (step: number) => (charge(V_s + step) - charge(V_s - step)) / (2 * step);
  const [h, half] = [central(2e-3 * V_s), central(1e-3 * V_s)];
  return (4 * half - h) / 3;
}

describe("SHEATHCAPACITANCE", () => {
  test.each([
    [3e-6, 1],
    [3e-6, 1.5],
    [0.3, 1],
    [3, 1.2],
    [6, 1],
    [30, 3],
    [3000, 1],
    [3e5, 2],
  ])("at %f V and u_ratio %f it is the slope of ε₀ times WALLFIELD", (V_s, u_ratio) => {
    const capacitance = model.sheathCapacitance(V_s, 1e16, 3, u_ratio);
    expect(slopeOfCharge(V_s, u_ratio) / capacitance).toBeCloseTo(1, 9);
  });

  test("near the edge it vanishes as √(1.5 V_s/T_e) at the Bohm speed, and stays finite above it", () => {
    const perDebye = eps0 / debyeLength(1e16, 3);
    expect(model.sheathCapacitance(3e-10, 1e16, 3, 1) / perDebye / Math.sqrt(1.5e-10)).toBeCloseTo(1, 9);
    expect(model.sheathCapacitance(3e-10, 1e16, 3, 2) / perDebye / Math.sqrt(0.75)).toBeCloseTo(1, 9);
    expect(model.sheathCapacitance(0, 1e16, 3, 2) / perDebye).toBeCloseTo(Math.sqrt(0.75), 15);
    expect(model.sheathCapacitance(0, 1e16, 3, 1)).toBe(0);
  });
});
