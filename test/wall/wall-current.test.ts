import fc from "fast-check";
import { describe, expect, test } from "vitest";
import {
  ELECTRONFLUX,
  FLOATINGPOTENTIAL,
  IONCURRENTDENSITY,
  WALLCURRENT,
  WALLFLUX,
  WALLVOLTAGE,
} from "../../functions/wall/functions";

const one = (value: unknown) => [[value]];
const call = (f: (...cells: any[]) => any[][], ...cells: unknown[]) => f(...cells.map(one))[0][0];

describe("what the wall draws", () => {
  // The catalogue's worked case, recomputed by hand: exp(−1/2)·10¹⁷·2691.83.
  test("10¹⁷ m⁻³ of argon plasma at 3 eV sends 1.6327×10²⁰ ions per m² and s, or 26.158 A/m²", () => {
    expect(call(WALLFLUX, 1e17, 3, "Ar+") / 1e20).toBeCloseTo(1.6327, 4);
    expect(call(IONCURRENTDENSITY, 1e17, 3, "Ar+")).toBeCloseTo(26.158, 3);
  });

  test("electrons' random flux is n/√(2π) times 4.19×10⁷ √T_e cm/s (NRL, from memory)", () => {
    const flux = call(ELECTRONFLUX, "1e10 cm^-3", 3, 0, 1, "cm^-2 s^-1");
    expect(flux / ((1e10 / Math.sqrt(2 * Math.PI)) * 4.19e7 * Math.sqrt(3))).toBeCloseTo(1, 2);
  });

  test("charge Z divides the flux of ions and leaves their current: only √Z remains, through the Bohm speed", () => {
    // Twice the charge at twice the mass keeps Z/M, hence the Bohm speed.
    const [single, double] = [WALLFLUX(one(1e17), one(3), one("D+")), WALLFLUX(one(1e17), one(3), one("He++"))];
    expect(double[0][0] / single[0][0]).toBeCloseTo(0.5, 2);
    expect(call(IONCURRENTDENSITY, 1e17, 3, "He++") / call(IONCURRENTDENSITY, 1e17, 3, "D+")).toBeCloseTo(1, 2);
  });

  test("a field at 30° to the wall halves the ions' flux and current", () => {
    expect(call(WALLFLUX, 1e17, 3, "Ar+", 0, null, 30)).toBeCloseTo(call(WALLFLUX, 1e17, 3, "Ar+") / 2, -6);
    expect(call(IONCURRENTDENSITY, 1e17, 3, "Ar+", 0, null, 30)).toBeCloseTo(26.158388 / 2, 5);
  });

  test("no net current flows at the floating potential", () => {
    const V_f = call(FLOATINGPOTENTIAL, 3, "Ar+", 0.3, 0.4);
    expect(Math.abs(call(WALLCURRENT, V_f, 1e17, 3, "Ar+", 0.3, null, 0.4))).toBeLessThan(1e-12);
  });

  test("far below the edge only the ions' current is left", () => {
    expect(call(WALLCURRENT, -3000, 1e17, 3, "Ar+")).toBe(call(IONCURRENTDENSITY, 1e17, 3, "Ar+"));
  });

  test("at and above the edge's potential all electrons arrive and the emitted ones return", () => {
    const above = call(WALLCURRENT, 20, 1e17, 3, "Ar+", 0, null, 0.5);
    expect(call(WALLCURRENT, 0, 1e17, 3, "Ar+")).toBe(above);
    expect(call(WALLCURRENT, -1e-9, 1e17, 3, "Ar+", 0, null, 0.5)).toBeGreaterThan(above / 1.9);
    expect(call(ELECTRONFLUX, 1e17, 3, 50)).toBe(call(ELECTRONFLUX, 1e17, 3, 0));
  });

  test("the electrons' current is that of their flux", () => {
    const electrons = call(IONCURRENTDENSITY, 1e17, 3, "Ar+") - call(WALLCURRENT, -8, 1e17, 3, "Ar+");
    expect(electrons / (1.602176634e-19 * call(ELECTRONFLUX, 1e17, 3, -8))).toBeCloseTo(1, 12);
  });
});

describe("the inverse", () => {
  test("gives back the potential of any current, to 1e-10", () => {
    fc.assert(
      fc.property(
        fc.double({ min: -12, max: -1e-3, noNaN: true }),
        fc.double({ min: 13, max: 21, noNaN: true }),
        fc.double({ min: 0.1, max: 300, noNaN: true }),
        fc.constantFrom("H+", "D+", "He++", "O2+", "Ar+", "Xe^3+", "W+"),
        fc.double({ min: 0, max: 2, noNaN: true }),
        fc.double({ min: 0.1, max: 1, noNaN: true }),
        fc.double({ min: 0, max: 0.8, noNaN: true }),
        (drop, power, T_e, ion, ratio, edge, delta) => {
          const rest = [10 ** power, T_e, ion, ratio * T_e, edge, delta];
          const V_w = drop * T_e;
          const J = call(WALLCURRENT, V_w, ...rest);
          return J === 0 || Math.abs(call(WALLVOLTAGE, J, ...rest) / V_w - 1) < 1e-10;
        },
      ),
      { numRuns: 500 },
    );
  });

  test("no current means the floating potential", () => {
    expect(call(WALLVOLTAGE, 0, 1e17, 3, "Ar+")).toBeCloseTo(call(FLOATINGPOTENTIAL, 3, "Ar+"), 13);
  });

  test("the ions' saturation current is refused with its value", () => {
    for (const J of [26.16, 100]) {
      expect(call(WALLVOLTAGE, J, 1e17, 3, "Ar+").message).toMatch(/saturation current 26\.16 A\/m²/);
    }
    const saturation = call(IONCURRENTDENSITY, 1e17, 3, "Ar+");
    expect(call(WALLVOLTAGE, saturation, 1e17, 3, "Ar+").code).toBe("#N/A");
  });

  test("a current beyond that at 0 V is refused with its value, and the end itself is not", () => {
    const end = call(WALLCURRENT, 0, 1e17, 3, "Ar+");
    expect(call(WALLVOLTAGE, end, 1e17, 3, "Ar+")).toBeCloseTo(0, 12);
    expect(call(WALLVOLTAGE, end - 1, 1e17, 3, "Ar+").message).toMatch(/-2790 A\/m² .*V_w = 0/);
    // Emission keeps half of the electrons from counting, so the end comes sooner.
    expect(call(WALLVOLTAGE, -2000, 1e17, 3, "Ar+", 0, null, 0.5).message).toMatch(/-1382 A\/m²/);
  });

  test("the end at 0 V belongs to it at every density and temperature, whichever way rounding goes", () => {
    for (let i = 0; i < 300; i++) {
      const rest = [1e15 * 1.05 ** i, 0.5 * 1.02 ** i, "Ar+"];
      const V_w = call(WALLVOLTAGE, call(WALLCURRENT, 0, ...rest), ...rest);
      expect(V_w).toBeLessThanOrEqual(0);
      expect(V_w).toBeGreaterThan(-1e-12);
    }
  });

  test("a yield at the limit of emission is refused with the limit", () => {
    expect(call(WALLVOLTAGE, 0, 1e17, 3, "Ar+", 0, null, 0.97).message).toMatch(/limit 0\.9698 of Ar\+/);
    expect(call(WALLVOLTAGE, 0, 1e17, 3, 0.003, 0, null, 1.2).message).toMatch(/delta_e 1\.2/);
  });
});
