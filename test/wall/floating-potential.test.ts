import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { parseIon, type Ion } from "../../functions/matter/ion";
import { emissionLimit } from "../../functions/wall/emission-limit";
import { EMISSIONLIMIT, FLOATINGPOTENTIAL, IONIMPACTENERGY } from "../../functions/wall/functions";
import * as model from "../../functions/wall/model";

const one = (value: unknown) => [[value]];
const floating = (...cells: unknown[]) => FLOATINGPOTENTIAL(...(cells.map(one) as [any[][], any[][]]))[0][0];

describe("against published values", () => {
  test("a floating wall sits 2.8 electron temperatures below the edge in hydrogen (LL, from memory)", () => {
    expect(-floating(1, "H+")).toBeCloseTo(2.8, 1);
  });

  test("a floating wall sits 4.7 electron temperatures below the edge in argon (LL, from memory)", () => {
    expect(-floating(1, "Ar+")).toBeCloseTo(4.7, 1);
  });

  test("in deuterium with T_i = T_e it floats at −2.84 T_e (S00, from memory)", () => {
    expect(floating(1, "D+", 1)).toBeCloseTo(-2.84, 2);
  });

  test("argon ions strike a floating wall with 5.18 T_e (LL print 5.2, from memory)", () => {
    expect(IONIMPACTENERGY(one(1), one("Ar+"))[0][0]).toBeCloseTo(5.18, 2);
  });

  test("seen from the plasma argon floats another T_e/2 lower, at −5.18 T_e (LL print 5.2, from memory)", () => {
    expect(floating(1, "Ar+", null, null, "plasma")).toBeCloseTo(-5.18, 2);
  });
});

describe("limits and scalings", () => {
  test("it grows in proportion to the electron temperature", () => {
    expect(floating(30, "Ar+")).toBeCloseTo(10 * floating(3, "Ar+"), 12);
  });

  test("emission that halves the electrons' net flux lifts it by T_e ln 2", () => {
    expect(floating(3, "Ar+", 0, 0.5) - floating(3, "Ar+")).toBeCloseTo(3 * Math.LN2, 13);
  });

  test("it depends on the charge through the Bohm speed only: Ar++ floats T_e ln(2)/2 above Ar+ (but for the mass of an electron)", () => {
    expect(floating(1, "Ar++") - floating(1, "Ar+")).toBeCloseTo(Math.LN2 / 2, 4);
  });

  test("from the plasma it is lower by T_e ln(1/edge_ratio)", () => {
    expect(floating(3, "Ar+", 0, 0, "plasma", 0.4)).toBeCloseTo(floating(3, "Ar+") + 3 * Math.log(0.4), 13);
  });

  test("as many electrons stay on the wall as ions bring charges, for any ion, temperatures and yield", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.1, max: 1000, noNaN: true }),
        fc.double({ min: 0, max: 3, noNaN: true }),
        fc.double({ min: 0, max: 0.8, noNaN: true }),
        fc.constantFrom("H+", "D+", "He++", "N2+", "Ar+", "Ar++", "Xe+"),
        (T_e, ratio, delta, name) => {
          const ion = parseIon(name) as Ion;
          const V_f = model.floatingPotential(T_e, ion, ratio * T_e, delta);
          const stay = (1 - delta) * model.electronFlux(1e17, T_e, V_f);
          const charges = ion.charge * model.ionFlux(1e17, T_e, ion, ratio * T_e, 90);
          // Only where the wall repels electrons: emission and hot ions together can end that.
          return V_f >= 0 || Math.abs(stay / charges - 1) < 1e-10;
        },
      ),
    );
  });
});

describe("where there is none", () => {
  test("a yield at the space-charge limit is refused with the limit and where the wall stays", () => {
    const limit = EMISSIONLIMIT(one("Ar+"))[0][0];
    const refused = floating(3, "Ar+", 0, limit);
    expect(refused.code).toBe("#N/A");
    expect(refused.message).toMatch(/delta_e 0\.97 .*space-charge limit 0\.9698 of Ar\+ \(EMISSIONLIMIT\).*-3\.04 V/);
    expect(floating(3, "Ar+", 0, limit * (1 - 1e-12))).toBeLessThan(0);
  });

  test("percent typed bare is far beyond the limit and refused with it", () => {
    expect(floating(3, "H+", 0, 50).message).toMatch(/0\.8235/);
    expect(floating(3, "H+", 0, "50 %")).toBeCloseTo(floating(3, "H+", 0, 0.5), 14);
  });

  test("ions as hot as 300 T_e arrive as fast as electrons, and nothing floats below the edge", () => {
    expect(floating(1, "H+", 300).code).toBe("#N/A");
    expect(floating(1, "H+", 300).message).toMatch(/check T_e, T_i and delta_e/);
  });

  test("a wrong reference point is answered with the right words", () => {
    expect(floating(1, "H+", 0, 0, "ground").message).toMatch(/"ground".*type "edge" or "plasma"/);
  });

  test("one bad row leaves its neighbours' values", () => {
    const column = FLOATINGPOTENTIAL([[1], [1], [1]], one("H+"), undefined, [[0], [0.9], [0.5]]).flat();
    expect(column.map((each) => typeof each)).toEqual(["number", "object", "number"]);
  });

  test("the same ion asked for again, and others between, give the same limit", () => {
    const [argon, helium] = ["Ar+", "He++"].map((name) => emissionLimit(parseIon(name) as Ion)!);
    expect(emissionLimit(parseIon("Ar+") as Ion)).toEqual(argon);
    expect(emissionLimit(parseIon("He++") as Ion)).toEqual(helium);
    expect(argon.delta).not.toBe(helium.delta);
  });
});
