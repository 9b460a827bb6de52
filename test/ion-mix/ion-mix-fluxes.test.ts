import { describe, expect, test } from "vitest";
import { judgeAll } from "../../functions/cells/verdict";
import { freeEdgeRatio } from "../../functions/edge/model";
import { IONMIXFLUXES as entry } from "../../functions/ion-mix/entries";
import { IONMIXFLUXES, IONMIXSPEEDS } from "../../functions/ion-mix/functions";
import { e } from "../../functions/matter/constants";
import { parseIon, type Ion } from "../../functions/matter/ion";
import { ionCurrentDensity, ionFlux } from "../../functions/wall/model";

const ion = (text: string) => parseIon(text) as Ion;
const fluxes = (ions: unknown[], fractions: unknown[], rule: any = null, ratio: any = null) =>
  IONMIXFLUXES(
    [[1e17]],
    [[3]],
    ions.map((cell) => [cell]),
    fractions.map((cell) => [cell]),
    [[rule]],
    [[ratio]],
  ) as any[][];

describe("IONMIXFLUXES", () => {
  test("one species has the plain wall flux and current density", () => {
    const [[label, flux, current]] = fluxes(["Ar^2+"], [0.5]);
    expect(label).toBe("Ar^2+");
    expect(flux / ionFlux(freeEdgeRatio * 1e17, 3, ion("Ar^2+"), 0, 90)).toBeCloseTo(1, 14);
    expect(current / ionCurrentDensity(freeEdgeRatio * 1e17, 3, ion("Ar^2+"), 0, 90)).toBeCloseTo(1, 14);
  });

  test("10¹⁷ m⁻³ of 3 eV argon alone gives 1.6326×10²⁰ m⁻² s⁻¹", () => {
    // Source: the plain wall flux (LL), recomputed with mpmath.
    expect(fluxes(["Ar+"], [1])[0][1] / 1.6326e20).toBeCloseTo(1, 4);
  });

  test("at a common speed the fluxes stand as the densities", () => {
    const [[, argon], [, helium]] = fluxes(["Ar+", "He+"], [0.75, 0.25]);
    expect(argon / helium).toBeCloseTo(3, 13);
  });

  test("at their own speeds light ions leave in excess, by the root of the mass ratio", () => {
    // Source: Riemann 1995, each species at its own Bohm speed.
    const [[, argon], [, helium]] = fluxes(["Ar+", "He+"], [0.5, 0.5], "own");
    expect(helium / argon).toBeCloseTo(Math.sqrt(ion("Ar+").mass / ion("He+").mass), 12);
  });

  test("each flux is the species' edge density times its speed, and carries its charge", () => {
    const ions = [["Ar+"], ["Ar++"], ["He+"]];
    const fractions = [[0.4], [0.1], [0.4]];
    const speeds = IONMIXSPEEDS([[3]], ions, fractions, [["own" as any]]) as any[][];
    const rows = IONMIXFLUXES([[1e17]], [[3]], ions, fractions, [["own" as any]], [[0.5]]) as any[][];
    rows.forEach(([, flux, current], k) => {
      expect(flux / (fractions[k][0] * 0.5e17 * speeds[k][1])).toBeCloseTo(1, 14);
      expect(current / ((k === 1 ? 2 : 1) * e * flux)).toBeCloseTo(1, 14);
    });
  });

  test("fractions that do not carry the charge are refused with their sum", () => {
    expect(fluxes(["Ar+", "Ar++"], [0.5, 0.5])[0][0].message).toMatch(/sum to 1.5, not 1/);
  });

  test("a rule that is not known is answered with the two that are", () => {
    expect(fluxes(["Ar+"], [1], "system")[0][0].message).toMatch(/"common" or "own"/);
  });

  test("a mixture is judged by its rule and by its Debye sphere", () => {
    const values = [1e17, 3, [ion("Ar+"), ion("He+")], [0.6, 0.4], "common", 0.6];
    expect(judgeAll(entry, values).map(({ word }) => word)).toEqual(["holds", "holds"]);
  });
});
