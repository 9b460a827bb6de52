import { NormalEquations } from "../numerics/normal-equations";
import { findRoot } from "../numerics/root";
import { estimateNoise, variance, type Noise } from "../numerics/noise";
import { neighbourSquares, type Characteristic } from "./characteristic";

/**
 * I(V) = A exp((V − V_0)/T) + a + b (V − V_0): Maxwellian electrons against a retarding probe, and an ion line. V_0 is
 * the top of the window.
 */
export interface RetardingFit {
  from: number;
  to: number;
  /** Voltages of the window's ends. */
  lowest: number;
  V_0: number;
  /** A, a, b in A, A, A/V, and T in eV. */
  parameters: readonly [A: number, a: number, b: number, T: number];
  /** Their covariance, 4 by 4 in rows. */
  covariance: Float64Array;
  noise: Noise;
  /** Fitted current and variance of each point in the window. */
  fitted: Float64Array;
  variances: Float64Array;
}

/** Current of the electrons at V on the fitted exponential. */
export function electronsAt({ V_0, parameters: [A, , , T] }: RetardingFit, V: number): number {
  return A * Math.exp((V - V_0) / T);
}

/** Current on the ion line at V, negative where ions arrive. */
export function ionsAt({ V_0, parameters: [, a, b] }: RetardingFit, V: number): number {
  return a + b * (V - V_0);
}

/** Covariance of two functions of the fit's parameters, by their gradients. */
export function covarianceOf({ covariance }: RetardingFit, f: readonly number[], g: readonly number[]): number {
  let total = 0;
  for (let j = 0; j < 4; j++) for (let k = 0; k < 4; k++) total += f[j] * covariance[4 * j + k] * g[k];
  return total;
}

/** Derivatives of the fitted current at V with respect to A, a, b and T. */
export function gradientAt(fit: RetardingFit, V: number): number[] {
  const [A, , , T] = fit.parameters;
  const x = V - fit.V_0;
  return [electronsAt(fit, V) / A, 1, x, (-electronsAt(fit, V) * x) / (T * T)];
}

/** Where electrons and ions of the fit cancel, below the top of its window; undefined where they do nowhere there. */
export function floatingPotentialOf(fit: RetardingFit): number | undefined {
  const net = (V: number) => electronsAt(fit, V) + ionsAt(fit, V);
  if (!(net(fit.V_0) > 0)) return undefined;
  // Down from the top: the first sign change, in case a tilted ion line makes another far below.
  let high = fit.V_0;
  for (let V = high - 0.5 * fit.parameters[3]; high > fit.lowest; V -= 0.5 * fit.parameters[3]) {
    const low = Math.max(V, fit.lowest);
    if (net(low) <= 0) return findRoot(net, low, high);
    high = low;
  }
  return undefined;
}

/**
 * The fit to the points `from` to `to` (exclusive), from a temperature near the right one; undefined where it fails. The
 * tolerance is what the model itself may be off by, in parts of the current.
 */
export function fitRetarding(
  curve: Characteristic,
  from: number,
  to: number,
  T: number,
  tolerance: number,
): RetardingFit | undefined {
  const size = to - from;
  let fit: RetardingFit = {
    from,
    to,
    lowest: curve.V[from],
    V_0: curve.V[to - 1],
    parameters: [0, 0, 0, T],
    covariance: new Float64Array(16),
    noise: { constant: 0, relative: 0 },
    fitted: new Float64Array(size),
    variances: new Float64Array(size).fill(1),
  };
  const start = linearPart(curve, fit);
  if (!start) return undefined;
  fit.parameters = [...start, T];
  // The noise gives the weights and the fit the noise: a few rounds agree to far less than the errors.
  for (let round = 0; round < 6; round++) {
    const before = fit.parameters[3];
    const next = gaussNewton(curve, fit);
    if (!next) return undefined;
    const noise = noiseAround(curve, next);
    // What neighbours have in common doesn't average out.
    noise.constant *= curve.likeness ?? 1;
    noise.relative *= curve.likeness ?? 1;
    const variances = next.fitted.map(
      (I, i) => variance(noise, I) / curve.count[from + i] + (tolerance * sizeAt(next, curve.V[from + i])) ** 2,
    );
    fit = { ...next, noise, variances };
    if (round > 1 && Math.abs(fit.parameters[3] / before - 1) < 1e-4) break;
  }
  return fit;
}

/** The currents of electrons and ions together, whatever their signs. */
function sizeAt(fit: RetardingFit, V: number): number {
  return Math.abs(electronsAt(fit, V)) + Math.abs(ionsAt(fit, V));
}

/** A, a and b at the temperature given. */
function linearPart({ V, I }: Characteristic, { from, to, V_0, parameters: [, , , T], variances }: RetardingFit) {
  const equations = new NormalEquations(3);
  const row = [0, 1, 0];
  for (let i = from; i < to; i++) {
    row[0] = Math.exp((V[i] - V_0) / T);
    row[2] = V[i] - V_0;
    equations.add(row, I[i], 1 / variances[i - from]);
  }
  const solved = equations.solve();
  return solved && ([...solved.solution] as [number, number, number]);
}

/** All four parameters to least weighted squares, from those given; no step changes the temperature by more than half. */
function gaussNewton({ V, I }: Characteristic, start: RetardingFit): RetardingFit | undefined {
  const { from, to, V_0, variances } = start;
  let [A, a, b, T] = start.parameters;
  const fitted = new Float64Array(to - from);
  const row = [0, 1, 0, 0];
  for (let round = 0; round < 60; round++) {
    const equations = new NormalEquations(4);
    for (let i = from; i < to; i++) {
      const x = V[i] - V_0;
      const E = Math.exp(x / T);
      fitted[i - from] = A * E + a + b * x;
      row[0] = E;
      row[2] = x;
      row[3] = (-A * E * x) / (T * T);
      equations.add(row, I[i] - fitted[i - from], 1 / variances[i - from]);
    }
    const solved = equations.solve();
    if (!solved) return undefined;
    const change = solved.solution[3] / T;
    if (Math.abs(change) < 1e-7) return { ...start, parameters: [A, a, b, T], covariance: solved.covariance, fitted };
    const damping = Math.min(1, 0.5 / Math.abs(change));
    A += damping * solved.solution[0];
    a += damping * solved.solution[1];
    b += damping * solved.solution[2];
    T += damping * solved.solution[3];
  }
  return undefined;
}

/** Noise from how far each residual lies off the line through its two neighbours: a bend the fit missed hardly counts. */
function noiseAround(curve: Characteristic, { from, to, fitted }: RetardingFit): Noise {
  const residual = (i: number) => curve.I[i] - fitted[i - from];
  return estimateNoise(fitted.subarray(1, to - from - 1), neighbourSquares(curve, from, to, residual));
}
