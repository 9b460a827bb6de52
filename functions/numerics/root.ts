/**
 * The root of f between a and b, where f changes sign: Brent's method (R. P. Brent, Algorithms for Minimization without
 * Derivatives, 1973, ch. 4). Converges to the last bits of x unless a wider relative `tolerance` is given. NaN where the
 * ends do not bracket a sign change.
 */
export function findRoot(f: (x: number) => number, a: number, b: number, tolerance = 0): number {
  let fa = f(a);
  let fb = f(b);
  if (fa === 0) return a;
  if (fb === 0) return b;
  if (!(fa < 0 !== fb < 0) || Number.isNaN(fa) || Number.isNaN(fb)) return NaN;
  let c = a;
  let fc = fa;
  let step = b - a;
  let before = step;
  for (let i = 0; i < 200; i++) {
    if (Math.abs(fc) < Math.abs(fb)) {
      [a, b, c] = [b, c, b];
      [fa, fb, fc] = [fb, fc, fb];
    }
    const least = 2 * Number.EPSILON * Math.abs(b) + 0.5 * tolerance * Math.abs(b) + Number.MIN_VALUE;
    const middle = 0.5 * (c - b);
    if (Math.abs(middle) <= least || fb === 0) return b;
    if (Math.abs(before) >= least && Math.abs(fa) > Math.abs(fb)) {
      // Inverse quadratic interpolation, or the secant where only two points differ; bisection where it runs away.
      const s = fb / fa;
      let p: number;
      let q: number;
      if (a === c) {
        p = 2 * middle * s;
        q = 1 - s;
      } else {
        const t = fa / fc;
        const r = fb / fc;
        p = s * (2 * middle * t * (t - r) - (b - a) * (r - 1));
        q = (t - 1) * (r - 1) * (s - 1);
      }
      if (p > 0) q = -q;
      p = Math.abs(p);
      if (2 * p < Math.min(3 * middle * q - Math.abs(least * q), Math.abs(before * q))) {
        before = step;
        step = p / q;
      } else {
        step = middle;
        before = middle;
      }
    } else {
      step = middle;
      before = middle;
    }
    a = b;
    fa = fb;
    b += Math.abs(step) > least ? step : Math.sign(middle) * least;
    fb = f(b);
    if (fb < 0 === fc < 0) {
      c = a;
      fc = fa;
      step = b - a;
      before = step;
    }
  }
  return b;
}
