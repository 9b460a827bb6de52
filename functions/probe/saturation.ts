import { chiSquareBeyond } from "../numerics/chi-square";
import { NormalEquations } from "../numerics/normal-equations";
import { findRoot } from "../numerics/root";
import { variance } from "../numerics/noise";
import { neighbourSquares, type Characteristic } from "./characteristic";
import type { Estimate } from "./fit";
import { covarianceOf, electronsAt, gradientAt, ionsAt, type RetardingFit } from "./retarding-fit";

export interface Knee {
  /** Plasma potential in V. */
  V: Estimate;
  /** How far an RF swing that rounds the knee like this has pulled V_f down: T ln I₀ in V. */
  shift: Estimate;
}

const fewestAbove = 5;

export function kneeOf(curve: Characteristic, fit: RetardingFit, knee: number): Knee | undefined {
  const { V } = curve;
  const line = saturationOf(curve, fit, knee);
  if (!line) return undefined;
  // Above the plasma potential ions turn back: the electrons alone meet their saturation, on what an offset leaves them.
  const alone = (at: number) => electronsAt(fit, at) + Math.max(0, ionsAt(fit, at));
  const V_p = findRoot((at) => alone(at) - saturationAt(line, at), fit.V_0, V[V.length - 1]);
  if (Number.isNaN(V_p)) return undefined;
  const x = V_p - fit.V_0;
  const onElectrons = gradientAt(fit, V_p).map((each, j) => (j === 1 || j === 2 ? 0 : each));
  const ofLine = line.covariance[0] + 2 * x * line.covariance[1] + x * x * line.covariance[3];
  const slope = electronsAt(fit, V_p) / fit.parameters[3] - line.slope;
  const error = Math.sqrt(covarianceOf(fit, onElectrons, onElectrons) + ofLine) / slope;
  return { V: { value: V_p, error }, shift: roundingOf(curve, fit, line, V_p, error) };
}

/** Electron saturation as a straight line in V − V_0, from a point on. */
interface Saturation {
  start: number;
  V_0: number;
  level: number;
  slope: number;
  covariance: Float64Array;
}

function saturationAt({ V_0, level, slope }: Saturation, V: number): number {
  return level + slope * (V - V_0);
}

/** The line through the points from one T above the knee on, or from further up where only those are straight. */
function saturationOf(curve: Characteristic, fit: RetardingFit, knee: number): Saturation | undefined {
  const { V } = curve;
  const T = fit.parameters[3];
  for (let above = 1; ; above += 0.5) {
    const start = V.findIndex((each, i) => i >= knee && each >= V[knee] + above * T);
    if (start < 0 || V.length - start < fewestAbove) return undefined;
    const line = lineFrom(curve, fit.V_0, start);
    if (line && isStraight(curve, line)) return line;
  }
}

/** The line of least squares, its errors from the squares it leaves. */
function lineFrom({ V, I, count }: Characteristic, V_0: number, start: number): Saturation | undefined {
  const equations = new NormalEquations(2);
  for (let i = start; i < V.length; i++) equations.add([1, V[i] - V_0], I[i], count[i]);
  const solved = equations.solve();
  if (!solved) return undefined;
  const [level, slope] = solved.solution;
  const line = { start, V_0, level, slope, covariance: solved.covariance };
  let squares = 0;
  for (let i = start; i < V.length; i++) squares += count[i] * (I[i] - saturationAt(line, V[i])) ** 2;
  const each = squares / (V.length - start - 2);
  return { ...line, covariance: solved.covariance.map((value) => value * each) };
}

/** Whether neighbours scatter about the line as independently as they do about each other, by the means of five runs. */
function isStraight(curve: Characteristic, line: Saturation): boolean {
  const { V, I, count } = curve;
  const size = V.length - line.start;
  const scatter = neighbourSquares(curve, line.start, V.length, (i) => I[i]);
  const smallest = (1e-3 * line.level) ** 2;
  const single = Math.max(
    smallest,
    scatter.reduce((sum, each) => sum + each / scatter.length, 0),
  );
  const run = Math.max(2, Math.ceil(size / 5));
  let [squares, runs] = [0, 0];
  for (let from = line.start; from < V.length; from += run) {
    let [sum, weight] = [0, 0];
    for (let i = from; i < Math.min(V.length, from + run); i++) {
      sum += count[i] * (I[i] - saturationAt(line, V[i]));
      weight += count[i];
    }
    squares += (sum * sum) / weight / single;
    runs++;
  }
  return chiSquareBeyond(squares, Math.max(1, runs - 2)) > 0.01;
}

/**
 * The area between an abrupt knee and the measured one, over the saturation current. For an RF swing across the sheath it
 * is T ln I₀(V_rf/T) whatever the swing, just what the swing pulls V_f down by: averaging min(1, exp(V + c)) over a shift c
 * of mean 0 leaves its integral as it is, while the abrupt knee through the raised exponential gains ln⟨exp c⟩.
 */
function roundingOf(
  { V, I, count }: Characteristic,
  fit: RetardingFit,
  line: Saturation,
  V_p: number,
  error: number,
): Estimate {
  let [area, square] = [0, 0];
  for (let i = fit.to; i < line.start; i++) {
    const width = (V[i + 1] - V[i - 1]) / 2;
    const abrupt = V[i] < V_p ? electronsAt(fit, V[i]) + ionsAt(fit, V[i]) : saturationAt(line, V[i]);
    area += width * (abrupt - I[i]);
    square += (width * width * variance(fit.noise, I[i])) / count[i];
  }
  const electrons = electronsAt(fit, V_p);
  return { value: area / electrons, error: Math.sqrt(square / (electrons * electrons) + error * error) };
}
