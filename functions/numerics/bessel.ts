/** Above it 25 asymptotic terms reach the last bit; below, at most 40 terms of the power series do. */
const changeover = 20;

const halfLog2Pi = 0.5 * Math.log(2 * Math.PI);

/**
 * ln I₀(x) for x ≥ 0, to 4 ulp at any size: the modified Bessel function itself overflows from x = 714. Small x: the
 * power series of I₀ − 1 (Abramowitz & Stegun 9.6.12) through log1p, so that ln I₀ ≈ x²/4 keeps its digits. Large x:
 * the asymptotic series of the scaled function √(2πx) e^(−x) I₀ (A&S 9.7.1).
 */
export function logBesselI0(x: number): number {
  return x < changeover ? Math.log1p(powerSeries(0.25 * x * x)) : x - 0.5 * Math.log(x) - halfLog2Pi + tail(x);
}

/** I₀ − 1 = Σ (x²/4)^k/(k!)², k ≥ 1, with q = x²/4: all terms are positive, nothing cancels. */
function powerSeries(q: number): number {
  let term = q;
  let sum = q;
  for (let k = 2; term > 1e-17 * sum; k++) {
    term *= q / (k * k);
    sum += term;
  }
  return sum;
}

/** ln of 1 + Σ ((2k−1)!!)²/(k! (8x)^k), cut where a term no longer counts. */
function tail(x: number): number {
  let term = 1;
  let sum = 0;
  for (let k = 1; term > 1e-17; k++) {
    term *= (2 * k - 1) ** 2 / (8 * k * x);
    sum += term;
  }
  return Math.log1p(sum);
}
