/** Ions that strike the wall with energies around `energy`, as their share of all ions per eV. */
export interface ImpactBin {
  energy: number;
  density: number;
}

/**
 * Energies at the wall of a singly charged ion that exchanges charge with its gas on the way through the potential
 * −V(1 − x/s)²: it starts at rest where it last did, at x/s = 1 − √(1 − E/V), so that
 *   f(E) = (s/(2 V λ_i)) (1 − E/V)^(−1/2) exp[−(s/λ_i)(1 − √(1 − E/V))].
 * Davis & Vanderslice, Phys. Rev. 131 (1963) 219. f has no end at E = V, so that equal bins hold its mean, which is exact:
 * the bins add up to 1 − exp(−s/λ_i), and the primaries are the rest.
 */
export function impactBins(V_s: number, s: number, lambda_i: number, bins: number): ImpactBin[] {
  return Array.from({ length: bins }, (_, i) => ({
    energy: (V_s * (i + 0.5)) / bins,
    density: (shareBetween(i / bins, (i + 1) / bins, s / lambda_i) * bins) / V_s,
  }));
}

/** Ions that cross without a collision and strike with all of V. */
export function primaries(s: number, lambda_i: number): number {
  return Math.exp(-s / lambda_i);
}

/** Share of all ions between two energies, given as fractions of V: those that last started between two depths. */
export function shareBetween(low: number, high: number, paths: number): number {
  const [near, far] = [Math.sqrt(1 - low), Math.sqrt(1 - high)];
  const start = low / (1 + near);
  const width = (high - low) / (near + far);
  return -Math.exp(-paths * start) * Math.expm1(-paths * width);
}
