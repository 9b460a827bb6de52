import { describe, expect, test } from "vitest";
import { m_e } from "../../functions/matter/constants";
import { ionOfMass, parseIon, type Ion } from "../../functions/matter/ion";
import { emissionLimit, type EmissionLimit } from "../../functions/wall/emission-limit";
import { EMISSIONLIMIT } from "../../functions/wall/functions";

const named = (name: string) => emissionLimit(parseIon(name) as Ion)!;

describe("against Hobbs & Wesson (1967)", () => {
  test("infinitely heavy ions: 1 − 8.3 √(m/M), 1.02 T_e and 0.58 T_e are printed (from memory)", () => {
    const M = 1e12 * m_e;
    const { delta, drop, edgeEnergy } = emissionLimit({ mass: M, charge: 1, label: "" })!;
    expect((1 - delta) / 1e-6).toBeCloseTo(8.3, 1);
    expect(drop).toBeCloseTo(1.02, 1);
    expect(edgeEnergy).toBeCloseTo(0.58, 2);
    // The same limits recomputed to more digits.
    expect((1 - delta) / 1e-6).toBeCloseTo(8.265, 3);
    expect(drop).toBeCloseTo(1.0253, 4);
    expect(edgeEnergy).toBeCloseTo(0.5781, 4);
  });

  // Recomputed values; printed ones agree where they are given.
  test.each([
    ["H+", 0.82348, 0.94651, 0.57445],
    ["Ar+", 0.96981, 1.0125, 0.57756],
  ])("%s: δ_c %f, a drop of %f T_e, ions of %f T_e at the edge", (name, delta, drop, energy) => {
    const limit = named(name);
    expect(limit.delta).toBeCloseTo(delta, 4);
    expect(limit.drop).toBeCloseTo(drop, 4);
    expect(limit.edgeEnergy).toBeCloseTo(energy, 4);
  });

  test("doubly charged helium: δ_c 0.87153", () => {
    expect(named("He++").delta).toBeCloseTo(0.87153, 5);
  });
});

describe("the solution itself", () => {
  /** Net charge density at a drop η from the edge, in units of the ions' there. */
  const netCharge = ({ drop, edgeEnergy }: EmissionLimit, flux: number, eta: number) => {
    const atEdge = flux * Math.sqrt(edgeEnergy / drop);
    const secondaries = flux * Math.sqrt(edgeEnergy / (drop - eta));
    return 1 / Math.sqrt(1 + eta / edgeEnergy) - (1 - atEdge) * Math.exp(-eta) - secondaries;
  };
  const emitted = (limit: EmissionLimit, ion: Ion) =>
    (limit.delta / (1 - limit.delta)) * Math.sqrt((ion.charge * m_e) / ion.mass);

  /** The charge between the drops 0 and `to`, by the midpoint rule in the root of what is left: smooth at the wall. */
  const charge = (limit: EmissionLimit, flux: number, to: number) => {
    const points = 4000;
    const [high, low] = [Math.sqrt(limit.drop), Math.sqrt(limit.drop - to)];
    let sum = 0;
    for (let i = 0; i < points; i++) {
      const root = low + ((i + 0.5) * (high - low)) / points;
      sum += 2 * root * netCharge(limit, flux, limit.drop - root * root);
    }
    return (sum * (high - low)) / points;
  };

  test.each(["H+", "D+", "He++", "Ne+", "Ar+", "Xe+"])(
    "%s: the field falls to zero at the wall and nowhere before, and vanishes at the edge with its slope",
    (name) => {
      const ion = parseIon(name) as Ion;
      const limit = emissionLimit(ion)!;
      const flux = emitted(limit, ion);
      expect(Math.abs(charge(limit, flux, limit.drop))).toBeLessThan(1e-7);
      for (let k = 1; k < 20; k++) expect(charge(limit, flux, (limit.drop * k) / 20)).toBeGreaterThan(0);
      expect(netCharge(limit, flux, 0)).toBeCloseTo(0, 12);
      expect(netCharge(limit, flux, 1e-5) / 1e-5).toBeCloseTo(0, 4);
    },
  );

  test("no net current flows at the limit", () => {
    const ion = parseIon("Ar+") as Ion;
    const { delta, drop, edgeEnergy } = emissionLimit(ion)!;
    const primaries = 1 - emitted(named("Ar+"), ion) * Math.sqrt(edgeEnergy / drop);
    // Fluxes in √(eT_e/m): a quarter of the mean speed √(8/π), against √(2ε m/M).
    const arriving = primaries * 0.25 * Math.sqrt(8 / Math.PI) * Math.exp(-drop);
    expect(((1 - delta) * arriving) / Math.sqrt((2 * edgeEnergy * m_e) / ion.mass)).toBeCloseTo(1, 12);
  });

  test("it depends on M/Z alone", () => {
    const double = { mass: 2 * ionOfMass(4).mass, charge: 2, label: "" };
    expect(emissionLimit(double)).toEqual(emissionLimit(ionOfMass(4)));
  });

  test("heavier ions stand more emission", () => {
    const masses = Array.from({ length: 200 }, (_, i) => 0.01 * 1.07 ** i);
    const limits = masses.map((mass) => emissionLimit(ionOfMass(mass))!.delta);
    for (let i = 1; i < limits.length; i++) expect(limits[i]).toBeGreaterThan(limits[i - 1]);
  });

  test("towards M/Z = 2πm the limit falls to none, and lighter ions have no solution", () => {
    const lightest = (2 * Math.PI * m_e) / ionOfMass(1).mass;
    expect(emissionLimit(ionOfMass(1.01 * lightest))!.delta).toBeLessThan(1e-4);
    const refused = EMISSIONLIMIT([[0.99 * lightest]])[0][0];
    expect(refused.code).toBe("#N/A");
    expect(refused.message).toMatch(/2π electron masses/);
  });

  test("a column of ions spills a row of three for each", () => {
    const rows = EMISSIONLIMIT([["H+"], ["Ar+"], ["Xe+"]]);
    expect(rows.map((row) => row.length)).toEqual([3, 3, 3]);
    expect(rows[1][0]).toBeCloseTo(0.96981, 5);
  });
});
