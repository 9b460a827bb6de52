import type { Characteristic } from "./characteristic";

/** A first look at a characteristic: its electron temperature, and where electron saturation begins. */
export interface FirstLook {
  /** eV. */
  T: number;
  /** Index of the first point above the knee; the number of points where the sweep ends below it. */
  knee: number;
}

const temperatures = 48;
const fewestBelow = 6;
const fewestAbove = 5;

/**
 * An exponential on a straight line up to a knee and another straight line from there: all knees and a grid of
 * temperatures are tried, and the least sum of squares wins. Sums that run along the points make each try a handful of
 * operations. A knee costs three more unknowns and must earn them (Schwarz, Ann. Stat. 6 (1978) 461).
 */
export function firstLook({ V, I }: Characteristic): FirstLook | undefined {
  const n = V.length;
  const span = V[n - 1] - V[0];
  const largest = I.reduce((most, each) => Math.max(most, Math.abs(each)), 0);
  if (!(span > 0) || !(largest > 0) || n < fewestBelow) return undefined;
  const v = V.map((each) => (each - V[n - 1]) / span);
  const y = I.map((each) => each / largest);
  const above = sumsAbove(v, y);
  let best: (FirstLook & { score: number }) | undefined;
  for (let k = 0; k < temperatures; k++) {
    // From half a step to half the sweep, in the sweep's own unit.
    const T = (0.5 / n) * (0.5 / (0.5 / n)) ** (k / (temperatures - 1));
    eachKnee(v, y, T, (knee, below) => {
      if (knee < n && n - knee < fewestAbove) return;
      const squares = below + (knee < n ? above[knee] : 0);
      const score = n * Math.log(Math.max(squares, 1e-13 * n)) + (knee < n ? 7 : 4) * Math.log(n);
      if (!best || score < best.score) best = { T: T * span, knee, score };
    });
  }
  return best;
}

/** The squares left by a straight line through the points from each index on. */
function sumsAbove(v: Float64Array, y: Float64Array): Float64Array {
  const left = new Float64Array(v.length + 1);
  let [one, x, xx, s, sx, ss] = [0, 0, 0, 0, 0, 0];
  for (let i = v.length - 1; i >= 0; i--) {
    one += 1;
    x += v[i];
    xx += v[i] * v[i];
    s += y[i];
    sx += y[i] * v[i];
    ss += y[i] * y[i];
    const [cxx, cxy, cyy] = [xx - (x * x) / one, sx - (x * s) / one, ss - (s * s) / one];
    left[i] = Math.max(0, cxx > 0 ? cyy - (cxy * cxy) / cxx : cyy);
  }
  return left;
}

/** Calls back with the squares that the exponential on its line leaves below each possible knee. */
function eachKnee(v: Float64Array, y: Float64Array, T: number, use: (knee: number, squares: number) => void): void {
  // Sums of 1, v, E, products of them and with y.
  let [one, sv, sE, vv, vE, EE, sy, vy, Ey, yy] = [0, 0, 0, 0, 0, 0, 0, 0, 0, 0];
  for (let i = 0; i < v.length; i++) {
    const E = Math.exp(v[i] / T);
    one += 1;
    sv += v[i];
    sE += E;
    vv += v[i] * v[i];
    vE += v[i] * E;
    EE += E * E;
    sy += y[i];
    vy += v[i] * y[i];
    Ey += E * y[i];
    yy += y[i] * y[i];
    if (i + 1 < fewestBelow) continue;
    // Centred, then the line's slope taken out, then the exponential's share.
    const [cvv, cvE, cEE] = [vv - (sv * sv) / one, vE - (sv * sE) / one, EE - (sE * sE) / one];
    const [cvy, cEy, cyy] = [vy - (sv * sy) / one, Ey - (sE * sy) / one, yy - (sy * sy) / one];
    const pure = cEE - (cvE * cvE) / cvv;
    const gain = cEy - (cvE * cvy) / cvv;
    if (!(pure > 1e-9 * EE) || gain <= 0) continue;
    use(i + 1, Math.max(0, cyy - (cvy * cvy) / cvv - (gain * gain) / pure));
  }
}
