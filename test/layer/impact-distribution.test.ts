import { describe, expect, test } from "vitest";
import { IMPACTDISTRIBUTION } from "../../functions/layer/functions";
import { impactBins, primaries } from "../../functions/layer/impact-distribution";

const cells = (...values: unknown[]): any[][] => (IMPACTDISTRIBUTION as any)(...values.map((value) => [[value]]));

describe("IMPACTDISTRIBUTION", () => {
  test.each([
    [300, 5e-3, 2e-3, 50],
    [300, 5e-3, 1, 50],
    [2000, 5e-3, 1e-5, 2000],
    [1, 1, 1, 2],
  ])("at %f V, s %f m, λ_i %f m the shares of %i bins and the primaries add up to 1", (V_s, s, lambda_i, bins) => {
    const rows = cells(V_s, s, lambda_i, bins);
    expect(rows).toHaveLength(bins + 1);
    const sum = rows.reduce((total, [, density, primary]) => total + density * (V_s / bins) + primary, 0);
    expect(sum).toBeCloseTo(1, 13);
  });

  test("its last row are the primaries, exp(−s/λ_i) of all, with all the energy", () => {
    expect(cells(-300, "5 mm", "2 mm", 4, true).at(-1)).toEqual([300, 0, Math.exp(-2.5)]);
  });

  test("many short paths leave an exponential of temperature 2 V λ_i/s", () => {
    // Davis & Vanderslice, Phys. Rev. 131 (1963) 219 (from memory): f → (s/2Vλ) exp(−sE/2Vλ).
    const [V, s, path] = [1000, 1, 1e-3];
    const bins = impactBins(V, s, path, 2000);
    const slope = Math.log(bins[0].density / bins[1].density) / (bins[1].energy - bins[0].energy);
    expect(slope * ((2 * V * path) / s)).toBeCloseTo(1, 2);
    const mean = bins.reduce((total, { energy, density }) => total + energy * density * (V / 2000), 0);
    expect(mean / ((2 * V * path) / s)).toBeCloseTo(1, 1);
  });

  test("the mean energy is that of the integral over the depth of the last exchange", () => {
    // ∫(2y − y²) a e^(−ay) dy over (0, 1) plus e^(−a), by parts: (2/a)(1 − (1 − e^(−a))/a), a = s/λ_i.
    const [V, a] = [500, 2.5];
    const mean = impactBins(V, a, 1, 2000).reduce(
      (total, { energy, density }) => total + energy * density * (V / 2000),
      V * primaries(a, 1),
    );
    expect(mean / V).toBeCloseTo((2 / a) * (1 - (1 - Math.exp(-a)) / a), 6);
  });

  test("ions followed one by one, path after path, fill the bins alike", () => {
    const [V, s, path, bins, ions] = [300, 1, 0.4, 10, 200_000];
    const counts = new Array(bins).fill(0);
    let through = 0;
    const next = generator(20260131);
    for (let k = 0; k < ions; k++) {
      let start = s;
      for (let at = s; at > 0; at += path * Math.log(1 - next())) start = at;
      const energy = V - V * (1 - start / s) ** 2;
      if (start === s) through++;
      else counts[Math.min(bins - 1, Math.floor((energy / V) * bins))]++;
    }
    const within = (count: number, share: number) => Math.abs(count - ions * share) / Math.sqrt(ions * share);
    impactBins(V, s, path, bins).forEach(({ density }, i) => {
      expect(within(counts[i], (density * V) / bins)).toBeLessThan(4);
    });
    expect(within(through, primaries(s, path))).toBeLessThan(4);
  });
});

/** Park & Miller's minimal generator, Commun. ACM 31 (1988) 1192. */
function generator(seed: number): () => number {
  let state = seed % 2147483647;
  return () => (state = (state * 48271) % 2147483647) / 2147483647;
}
