import { describe, expect, test } from "vitest";
import { HEATFACTOR, IONIMPACTENERGY, WALLFLUX, WALLHEATFLUX } from "../../functions/wall/functions";

const e = 1.602176634e-19;
const one = (value: unknown) => [[value]];
const call = (f: (...cells: any[]) => any[][], ...cells: unknown[]) => f(...cells.map(one))[0][0];

describe("against published values", () => {
  test.each([
    ["H+", 7.992],
    ["D+", 8.339],
    ["T+", 8.54],
  ])("the heat factor of %s with T_i = T_e is %f (recomputed)", (ion, value) => {
    expect(call(HEATFACTOR, 1, ion, 1)).toBeCloseTo(value, 3);
  });

  test.each([
    ["H+", 6.99],
    ["D+", 7.34],
  ])("without the ions' directed energy at the edge %s has %f (S00, from memory)", (ion, value) => {
    // ½M u_B² is (Z T_e + T_i)/2, one T_e here.
    expect(call(HEATFACTOR, 1, ion, 1) - 1).toBeCloseTo(value, 2);
  });

  test("cold argon brings 7.18 T_e per ion to a floating wall (LL print 7.2, from memory)", () => {
    expect(call(HEATFACTOR, 1, "Ar+")).toBeCloseTo(7.18, 2);
  });
});

describe("where the energy goes", () => {
  test("heat flux is factor times e T_e times ion flux", () => {
    const expected = call(HEATFACTOR, 5, "D+", 4, -20, 0.2) * e * 5 * call(WALLFLUX, 1e18, 5, "D+", 4, 0.5);
    expect(call(WALLHEATFLUX, 1e18, 5, "D+", 4, -20, 0.5, 0.2) / expected).toBeCloseTo(1, 13);
  });

  test("at a strong bias it is the ions' impact energy and nothing else", () => {
    const expected = e * call(WALLFLUX, 1e17, 3, "Ar+") * call(IONIMPACTENERGY, 3, "Ar+", null, -1000);
    expect(call(WALLHEATFLUX, 1e17, 3, "Ar+", null, -1000) / expected).toBeCloseTo(1, 13);
  });

  test("each ion adds what the surface sets free", () => {
    const more =
      call(WALLHEATFLUX, 1e17, 3, "Ar+", 0, -50, null, 0, 15.76) - call(WALLHEATFLUX, 1e17, 3, "Ar+", 0, -50);
    expect(more / (e * 15.76 * call(WALLFLUX, 1e17, 3, "Ar+"))).toBeCloseTo(1, 12);
  });

  test("a field at 30° to the wall halves it, floating or biased", () => {
    for (const V_w of ["floating", -40]) {
      const steep = call(WALLHEATFLUX, 1e17, 3, "D+", 3, V_w);
      expect(call(WALLHEATFLUX, 1e17, 3, "D+", 3, V_w, null, 0, 0, 30) / steep).toBeCloseTo(0.5, 13);
    }
  });

  test("emission lets more electrons through to a floating wall, so that it takes more heat", () => {
    const more = call(HEATFACTOR, 1, "D+", 1, "floating", 0.5) - call(HEATFACTOR, 1, "D+", 1);
    // The drop shrinks by ln 2 while the electrons double: 2·2 − 2 − ln 2.
    expect(more).toBeCloseTo(2 - Math.LN2, 12);
  });

  test("floating is what a blank V_w means, and the same as typing that potential", () => {
    const V_f = -14.036790554017086; // FLOATINGPOTENTIAL(3, "Ar+")
    for (const f of [IONIMPACTENERGY, HEATFACTOR]) {
      expect(call(f, 3, "Ar+", 0, "Floating")).toBe(call(f, 3, "Ar+"));
      expect(call(f, 3, "Ar+", 0, V_f)).toBeCloseTo(call(f, 3, "Ar+"), 12);
    }
  });

  test("a doubly charged ion gains twice as much", () => {
    expect(call(IONIMPACTENERGY, 3, "Ar++", 0, -300)).toBe(603);
  });
});

describe("bad input", () => {
  test.each([
    ["IONIMPACTENERGY", () => call(IONIMPACTENERGY, 3, "Ar+", 0, 300)],
    ["WALLHEATFLUX", () => call(WALLHEATFLUX, 1e17, 3, "Ar+", 0, 300)],
    ["HEATFACTOR", () => call(HEATFACTOR, 3, "Ar+", 0, 300)],
  ])("%s refuses a wall that repels ions and says how a bias is typed", (_name, refused) => {
    expect(refused().code).toBe("#N/A");
    expect(refused().message).toMatch(/V_w 300 V would repel the ions.*negative, -300/);
  });

  test("another word in V_w is answered with the one it takes", () => {
    expect(call(IONIMPACTENERGY, 3, "Ar+", 0, "grounded").message).toMatch(/"grounded".*"floating"/);
  });

  test("a floating wall at the limit of emission has no heat flux, a biased one has", () => {
    expect(call(WALLHEATFLUX, 1e17, 3, "Ar+", 0, "floating", null, 0.98).message).toMatch(/0\.9698/);
    expect(call(WALLHEATFLUX, 1e17, 3, "Ar+", 0, -100, null, 0.98)).toBeGreaterThan(0);
  });
});
