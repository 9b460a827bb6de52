/** A straight line ln F = ln value − steepness·(E − at) through some points. */
export interface LogSlope {
  /** F on the line at `at`, and the standard error of its logarithm. */
  value: number;
  valueError: number;
  /** Fall of ln F per eV, 1/T for a Maxwellian, and its standard error. */
  steepness: number;
  steepnessError: number;
}

/**
 * The line through the points `from` to `to`, inclusive, by weighted least squares on ln F; undefined with fewer than two
 * points above 0. Points at the height of their own noise belong in `refineLogSlope`.
 */
export function fitLogSlope(
  energy: ArrayLike<number>,
  F: ArrayLike<number>,
  varianceOf: (F: number) => number,
  from: number,
  to: number,
  at: number,
): LogSlope | undefined {
  let [w, x, y, xx, xy] = [0, 0, 0, 0, 0];
  let count = 0;
  for (let i = from; i <= to; i++) {
    if (!(F[i] > 0)) continue;
    count++;
    // The error of ln F is δF/F; without noise all points weigh the same.
    const weight = 1 / (varianceOf(F[i]) / (F[i] * F[i]) + 1e-20);
    const dx = energy[i] - at;
    const ln = Math.log(F[i]);
    w += weight;
    x += weight * dx;
    y += weight * ln;
    xx += weight * dx * dx;
    xy += weight * dx * ln;
  }
  const determinant = w * xx - x * x;
  if (count < 2 || !(determinant > 0)) return undefined;
  return {
    value: Math.exp((xx * y - x * xy) / determinant),
    valueError: Math.sqrt(xx / determinant),
    steepness: -(w * xy - x * y) / determinant,
    steepnessError: Math.sqrt(w / determinant),
  };
}

/**
 * The exponential through the same points and all that follow, by weighted least squares on F itself, so that points
 * within the noise, the negative ones too, pull as they should: Gauss–Newton from a line near it. Undefined where that
 * leads nowhere.
 */
export function refineLogSlope(
  line: LogSlope,
  energy: ArrayLike<number>,
  F: ArrayLike<number>,
  varianceOf: (F: number) => number,
  from: number,
  at: number,
): LogSlope | undefined {
  let refined = line;
  for (let round = 0; round < 30; round++) {
    let [ww, wx, xx, wr, xr] = [0, 0, 0, 0, 0];
    for (let i = from; i < F.length; i++) {
      const dx = energy[i] - at;
      const model = refined.value * Math.exp(-refined.steepness * dx);
      const weight = 1 / (varianceOf(model) + 1e-20 * refined.value * refined.value);
      const slope = -dx * model;
      ww += weight * model * model;
      wx += weight * model * slope;
      xx += weight * slope * slope;
      wr += weight * model * (F[i] - model);
      xr += weight * slope * (F[i] - model);
    }
    const determinant = ww * xx - wx * wx;
    const onLevel = (xx * wr - wx * xr) / determinant;
    const onSteepness = (ww * xr - wx * wr) / determinant;
    // No step may change the exponential out of recognition: the problem is far from linear there.
    const value = refined.value * Math.exp(Math.max(-0.7, Math.min(0.7, onLevel)));
    const steepness = Math.max(
      0.6 * refined.steepness,
      Math.min(1.7 * refined.steepness, refined.steepness + onSteepness),
    );
    const settled = Math.abs(steepness / refined.steepness - 1) < 1e-6;
    refined = {
      value,
      steepness,
      valueError: Math.sqrt(xx / determinant),
      steepnessError: Math.sqrt(ww / determinant),
    };
    if (!(determinant > 0) || !(value > 0) || !Number.isFinite(steepness)) return undefined;
    if (settled) return refined;
  }
  return undefined;
}
