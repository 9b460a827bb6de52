import { expect, test } from "vitest";
import { IONMIXFLUXES } from "../../functions/ion-mix/entries";
import { commonSpeed, edgeSpeed } from "../../functions/ion-mix/model";
import { e, u } from "../../functions/matter/constants";
import reference from "../published/ion-mix.json";
import { ulpsFrom } from "../ulp";

/** Source: mpmath at 50 digits, test/published/ion-mix.py, the common speed as the root of the Bohm condition. */
const mixes = reference.map(({ species, ...rest }) => ({
  ...rest,
  species,
  mix: species.map(({ mass, charge, fraction }) => ({ ion: { mass: mass * u, charge, label: "" }, fraction })),
}));

test("the common speed of 60 mixtures is within 4 ulp of 50-digit arithmetic", () => {
  expect(Math.max(...mixes.map(({ T_e, mix, common }) => ulpsFrom(commonSpeed(T_e, mix), common)))).toBeLessThanOrEqual(
    4,
  );
});

test("each species' own speed is within 4 ulp of 50-digit arithmetic", () => {
  const ulps = mixes.flatMap(({ T_e, mix, species }) =>
    species.map(({ own }, k) => ulpsFrom(edgeSpeed(T_e, mix[k].ion, mix, "own"), own)),
  );
  expect(Math.max(...ulps)).toBeLessThanOrEqual(4);
});

test("the fluxes of 60 mixtures are within 4 ulp of 50-digit arithmetic", () => {
  const ulps = mixes.flatMap(({ T_e, n_edge, mix, species }) => {
    const ions = mix.map(({ ion }) => ion);
    const fractions = mix.map(({ fraction }) => fraction);
    const rows = IONMIXFLUXES.compute(n_edge, T_e, ions, fractions, "common", 1) as [string, number, number][];
    return rows.map(([, flux], k) => ulpsFrom(flux, species[k].commonFlux));
  });
  expect(Math.max(...ulps)).toBeLessThanOrEqual(4);
});

test("both rules meet the Bohm condition of a mixture with equality", () => {
  // Source: Riemann 1995, Σ f_j Z_j² eT_e/(M_j u_j²) = 1.
  for (const { T_e, mix } of mixes) {
    for (const rule of ["common", "own"] as const) {
      const sum = mix.reduce((total, { ion, fraction }) => {
        const speed = edgeSpeed(T_e, ion, mix, rule);
        return total + (fraction * ion.charge ** 2 * e * T_e) / (ion.mass * speed ** 2);
      }, 0);
      expect(sum).toBeCloseTo(1, 13);
    }
  }
});
