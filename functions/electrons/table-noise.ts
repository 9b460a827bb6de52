import { estimateNoise, variance, type Noise } from "../numerics/noise";

/**
 * Noise from how far each point lies off a cubic through its four neighbours, drawn through F or, where that bends less,
 * through ln F. The first look takes whichever is nearer; the second ln F where all five points are clear of that noise.
 */
export function noiseOf(energy: Float64Array, F: Float64Array): Noise {
  const through = neighbours(energy);
  const residuals = (squareOf: (i: number) => number) => F.map((_, i) => squareOf(i));
  const straight = (i: number) => squaredResidual(F, through[i], i);
  const curved = (i: number) => squaredLogResidual(F, through[i], i);
  const allAbove = (i: number, least: (F: number) => number) =>
    [i, ...through[i].map(([k]) => k)].every((k) => F[k] > least(F[k]));
  const rough = estimateNoise(
    F,
    residuals((i) => (allAbove(i, () => 0) ? Math.min(straight(i), curved(i)) : straight(i))),
  );
  const level = (value: number) => 5 * Math.sqrt(variance(rough, value));
  return estimateNoise(
    F,
    residuals((i) => (allAbove(i, level) ? curved(i) : straight(i))),
  );
}

type Shares = readonly (readonly [index: number, share: number])[];

/** For each energy the four nearest in the row, and their shares in the value of the cubic there (Lagrange). */
function neighbours(energy: Float64Array): Shares[] {
  return Array.from(energy, (E, i) => {
    const start = Math.min(Math.max(i - 2, 0), energy.length - 5);
    const others = [0, 1, 2, 3, 4].map((k) => start + k).filter((k) => k !== i);
    return others.map((k) => {
      const factors = others.filter((j) => j !== k).map((j) => (E - energy[j]) / (energy[k] - energy[j]));
      return [k, factors.reduce((product, factor) => product * factor, 1)] as const;
    });
  });
}

function squaredResidual(F: Float64Array, shares: Shares, i: number): number {
  const predicted = shares.reduce((sum, [k, share]) => sum + share * F[k], 0);
  return (F[i] - predicted) ** 2 / gain(shares);
}

function squaredLogResidual(F: Float64Array, shares: Shares, i: number): number {
  const predicted = shares.reduce((sum, [k, share]) => sum + share * Math.log(F[k]), 0);
  return (F[i] - Math.exp(predicted)) ** 2 / gain(shares);
}

/** The variance of such a difference over that of one point. */
function gain(shares: Shares): number {
  return shares.reduce((sum, [, share]) => sum + share * share, 1);
}
