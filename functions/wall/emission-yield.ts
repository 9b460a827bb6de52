/**
 * Electron-induced yield averaged over Maxwellian electrons striking a wall, ∫E δ(E) e^(−E/T) dE/T², for Sternglass's
 * universal curve δ(E) = δ_max e² (E/E_max) exp(−2√(E/E_max)) (1954). With E = T y² and k = √(T/E_max) it is
 * 2 e² δ_max k² I₅(k), I_n(k) = ∫₀^∞ y^n exp(−y² − 2ky) dy.
 */
export function emissionYield(T_e: number, delta_max: number, E_max: number): number {
  const k = Math.sqrt(T_e / E_max);
  return 2 * Math.exp(2) * delta_max * k * k * fifthMoment(k);
}

/**
 * I₅(k) to 1e-14: its power series below k = 0.6, where few terms do and little cancels; above, a continued fraction of positive terms.
 */
export function fifthMoment(k: number): number {
  return k < 0.6 ? bySeries(k) : byFraction(k);
}

/** Σ ½Γ(3 + j/2) (−2k)^j/j!: even and odd terms each follow from the one before of their kind. */
function bySeries(k: number): number {
  let even = 1;
  let odd = (-15 / 8) * Math.sqrt(Math.PI) * k;
  let sum = even + odd;
  for (let j = 0; even > 1e-18; j += 2) {
    even *= (4 * k * k * (3 + j / 2)) / ((j + 1) * (j + 2));
    odd *= (4 * k * k * (3.5 + j / 2)) / ((j + 2) * (j + 3));
    sum += even + odd;
  }
  return sum;
}

/**
 * Integration by parts gives I_(n+1) = (n/2) I_(n−1) − k I_n, so the ratios r_n = I_n/I_(n−1) obey r_n = (n/2)/(k + r_(n+1)),
 * followed downwards from so far out that the start is forgotten, which a small k makes slower; and I₁ = ½ − k I₀ gives I₀ = ½/(k + r₁). Abramowitz & Stegun 7.2.
 */
function byFraction(k: number): number {
  const start = 30 + Math.ceil(160 / (k * k));
  let ratio = 0.5 * (Math.sqrt(k * k + 2 * start) - k);
  let product = 1;
  for (let n = start; n >= 1; n--) {
    ratio = (0.5 * n) / (k + ratio);
    if (n <= 5) product *= ratio;
  }
  return (0.5 * product) / (k + ratio);
}
