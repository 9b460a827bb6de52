import { describe, expect, test } from "vitest";
import { LIMITCHECK } from "../../functions/checks/functions";
import { freeEdgeRatio } from "../../functions/edge/model";
import { e, m_e, u } from "../../functions/matter/constants";
import type { Ion } from "../../functions/matter/ion";
import { SHEATHRESISTANCE } from "../../functions/rf/functions";
import { sheathResistance } from "../../functions/rf/model";

const helium: Ion = { mass: 4.0026 * u, charge: 2, label: "He^2+" };

describe("SHEATHRESISTANCE", () => {
  test("the resistance is the inverse slope of the wall's current at the floating potential", () => {
    // Source: the characteristic e n [u_B − ¼v̄_e exp(V/T_e)] (LL), differentiated numerically about its zero.
    for (const [n, T_e] of [
      [1e16, 3],
      [3e17, 12],
    ]) {
      const u_B = Math.sqrt((2 * e * T_e) / helium.mass);
      const electrons = 0.25 * Math.sqrt((8 * e * T_e) / (Math.PI * m_e));
      const current = (V: number) => e * n * (u_B - electrons * Math.exp(V / T_e));
      const V_f = -T_e * Math.log(electrons / u_B);
      const step = 1e-5 * T_e;
      const slope = (current(V_f + step) - current(V_f - step)) / (2 * step);
      expect(sheathResistance(n, T_e, helium) * -slope).toBeCloseTo(1, 8);
    }
  });

  test("the resistance is T_e over the ion saturation current, as probe practice has it", () => {
    // Source: LL on probes; the ion current of 10¹⁷ m⁻³, 3 eV, argon is 26.158 A/m² (recomputed).
    expect(SHEATHRESISTANCE([[1e17]], [[3]], [["Ar+"]])[0][0]).toBeCloseTo(3 / 26.158, 5);
  });

  test("without an edge ratio the edge has exp(−½) of the body's density", () => {
    const ask = (ratio: unknown) => SHEATHRESISTANCE([[1e17]], [[3]], [["Ar+"]], [[ratio]])[0][0];
    expect(ask(null)).toBe(ask(freeEdgeRatio));
  });

  test("the slope is that of the tail, which argon of 3 eV may have lost and argon of 2 eV has not", () => {
    const check = (T_e: number) => LIMITCHECK([["SHEATHRESISTANCE"]], [[1e17]], [[T_e]], [["Ar+"]])[0][0];
    expect(check(2)).toBe("holds");
    expect(check(3)).toMatch(/^marginal: \|V_w\|\/first excitation energy 1\.22/);
  });

  test("resistance times area comes in Ω cm² on request", () => {
    const ask = (unit: unknown) => SHEATHRESISTANCE([[1e17]], [[3]], [["Ar+"]], [[null]], [[unit]])[0][0];
    expect(ask("ohm cm^2") / ask(null)).toBeCloseTo(1e4, 6);
  });
});
