import { describe, expect, test } from "vitest";
import { RFFLOATINGSHIFT as entry } from "../../functions/rf/entries";
import { RFFLOATINGSHIFT } from "../../functions/rf/functions";
import { logBesselI0 } from "../../functions/numerics/bessel";
import { rfFloatingShift } from "../../functions/rf/model";
import { judgeAll } from "../../functions/cells/verdict";

const shift = (V_rf: unknown, T_e: unknown, unit?: unknown) =>
  RFFLOATINGSHIFT([[V_rf]], [[T_e]], [[unit ?? null]])[0][0];

describe("RFFLOATINGSHIFT", () => {
  test("30 V across a sheath at 3 eV moves a floating wall by −23.829 V", () => {
    // Source: Garscadden & Emeleus 1962 for the formula; the value recomputed with mpmath.
    expect(shift(30, 3)).toBeCloseTo(-23.829, 3);
  });

  test("I₀(1) is 1.2660658778", () => {
    // Source: Abramowitz & Stegun, table 9.8 (from memory, recomputed with mpmath).
    expect(Math.exp(logBesselI0(1))).toBeCloseTo(1.2660658778, 10);
  });

  test("a small amplitude shifts by V_rf²/(4T_e), the rectified curvature of the characteristic", () => {
    // Source: the power series, Abramowitz & Stegun 9.6.12.
    const [V_rf, T_e] = [1e-6, 3];
    expect(rfFloatingShift(V_rf, T_e) / (-(V_rf ** 2) / (4 * T_e))).toBeCloseTo(1, 12);
  });

  test("a large amplitude shifts by V_rf less ½T_e ln(2πV_rf/T_e)", () => {
    // Source: the asymptotic series, Abramowitz & Stegun 9.7.1.
    const [V_rf, T_e] = [3e8, 3];
    expect(rfFloatingShift(V_rf, T_e)).toBeCloseTo(-V_rf + 0.5 * T_e * Math.log((2 * Math.PI * V_rf) / T_e), 6);
  });

  test("the shift is the mean of exp(V/T_e) over a cycle, whatever the amplitude", () => {
    // The defining integral, by the trapezium rule, which is exact for periodic functions. Garscadden & Emeleus 1962.
    for (const x of [0.1, 1, 5, 19, 21, 60]) {
      const phases = Array.from({ length: 400 }, (_, k) => Math.exp(x * Math.cos((2 * Math.PI * k) / 400)));
      const mean = phases.reduce((sum, each) => sum + each) / 400;
      expect(rfFloatingShift(3 * x, 3) / (-3 * Math.log(mean))).toBeCloseTo(1, 12);
    }
  });

  test("without RF there is no shift: the wall floats as a plain wall does", () => {
    expect(shift(0, 3)).toBe(0);
  });

  test("no amplitude overflows", () => {
    expect(shift(1e300, 1e-3)).toBe(-1e300);
    expect(rfFloatingShift(Number.MAX_VALUE, 1e-300)).toBe(-Number.MAX_VALUE);
    expect(rfFloatingShift(Number.MAX_VALUE, 3)).toBe(-Number.MAX_VALUE);
  });

  test("peak-to-peak and rms amplitudes are brought to zero-to-peak", () => {
    expect(shift("60 Vpp", 3)).toBe(shift(30, 3));
    expect(shift("30 Vp", 3)).toBe(shift(30, 3));
    expect(shift("120 Vrms", 3)).toBeCloseTo(shift(120 * Math.SQRT2, 3), 10);
  });

  test("the shift comes in the unit asked for", () => {
    expect(shift(30, 3, "mV")).toBeCloseTo(1000 * shift(30, 3), 8);
  });

  test("a negative amplitude is refused with what to type", () => {
    expect(shift(-30, 3).message).toMatch(/V_rf.*type.*300 Vpp/);
  });

  test("a swing so large that even a wall in xenon would rise above the edge fails, a moderate one holds", () => {
    const word = (V_rf: number) => judgeAll(entry, [V_rf, 3])[0].word;
    expect(word(30)).toBe("holds");
    expect(word(3000)).toBe("marginal");
    expect(word(3e4)).toBe("fails");
  });
});
