import { NormalEquations } from "../numerics/normal-equations";
import { variance } from "../numerics/noise";
import type { Characteristic } from "./characteristic";
import { likeness } from "./correlation";
import { firstLook } from "./knee";
import { covarianceOf, electronsAt, floatingPotentialOf, gradientAt, ionsAt, type RetardingFit } from "./retarding-fit";
import { kneeOf, type Knee } from "./saturation";
import { chooseWindow, notRising } from "./window";

/** A value and its standard error. */
export interface Estimate {
  value: number;
  error: number;
}

/** What a sweep says of its plasma. */
export interface ProbeResult {
  T_e: Estimate;
  /** Floating potential and ion current at it, where the sweep crosses zero; with the covariances that their use needs. */
  floating?: Floating;
  /** Plasma potential where exponential and electron saturation meet, where the sweep gets there. */
  knee?: Knee;
  window: readonly [from: number, to: number];
  points: number;
  /** Why the errors are wider than the scatter of the readings makes them. */
  widened: string[];
}

export interface Floating {
  V_f: Estimate;
  I_sat: Estimate;
  /** Covariances of T_e with V_f and with I_sat. */
  withV_f: number;
  withI_sat: number;
  /** Growth of the ion current per T_e of voltage over the current itself. */
  growth: Estimate;
  /** Mean voltage of the points on the ions' side. */
  V_ions: number;
}

const fewest = 12;

/** What the model may be off by, in parts of the current: no characteristic follows it closer, few as loosely. */
const close = 1e-3;
const loose = 1e-2;

/** The points where ions alone arrive, several T below the last crossing of zero. */
function ionSideEnd({ V, I }: Characteristic, { T }: { T: number }): number {
  let zero = I.length - 1;
  while (zero > 0 && I[zero] > 0) zero--;
  return V.findIndex((each) => each > V[zero] - 3 * T);
}

/** The result of one sweep, or in words why there is none. */
export function fitCharacteristic(curve: Characteristic): ProbeResult | string {
  const points = curve.V.length;
  if (points < fewest) return `only ${points} usable points; a fit needs at least ${fewest}`;
  const look = firstLook(curve);
  if (!look) return notRising;
  const alike = likeness(curve, ionSideEnd(curve, look), look.T, close);
  const weighed = { ...curve, likeness: alike };
  const closely = chooseWindow(weighed, look, close);
  const fit = typeof closely === "string" ? chooseWindow(weighed, look, loose) : closely;
  if (typeof fit === "string") return fit;
  const T_e = { value: fit.parameters[3], error: Math.sqrt(fit.covariance[15]) };
  return {
    T_e,
    floating: floatingOf(curve, fit),
    knee: kneeOf(curve, fit, look.knee),
    window: [fit.lowest, fit.V_0],
    points: fit.to - fit.from,
    widened: [
      ...(alike > 1 ? ["neighbouring readings are alike, as a filter makes them"] : []),
      ...(fit === closely ? [] : [`the current is an exponential to ${100 * loose} % only`]),
    ],
  };
}

function slopeAt(fit: RetardingFit, V: number): number {
  return electronsAt(fit, V) / fit.parameters[3] + fit.parameters[2];
}

function floatingOf(curve: Characteristic, fit: RetardingFit): Floating | undefined {
  const V_f = floatingPotentialOf(fit);
  if (V_f === undefined) return undefined;
  const b = fit.parameters[2];
  const slope = slopeAt(fit, V_f);
  const onV_f = gradientAt(fit, V_f).map((each) => -each / slope);
  const I_sat = -ionsAt(fit, V_f);
  const onI_sat = [0, 1, V_f - fit.V_0, 0].map((each, j) => -(each + b * onV_f[j]));
  return {
    V_f: { value: V_f, error: Math.sqrt(covarianceOf(fit, onV_f, onV_f)) },
    I_sat: { value: I_sat, error: Math.sqrt(covarianceOf(fit, onI_sat, onI_sat)) },
    withV_f: covarianceOf(fit, onV_f, [0, 0, 0, 1]),
    withI_sat: covarianceOf(fit, onI_sat, [0, 0, 0, 1]),
    ...ionSide(curve, fit, V_f, I_sat),
  };
}

/** The slope of the ion current over all points well below floating, also where the window leaves most of them out. */
function ionSide({ V, I, count }: Characteristic, fit: RetardingFit, V_f: number, I_sat: number) {
  const T = fit.parameters[3];
  const line = new NormalEquations(2);
  let [sum, points] = [0, 0];
  for (let i = 0; i < V.length && V[i] < V_f - T; i++) {
    line.add([1, V[i] - V_f], I[i] - electronsAt(fit, V[i]), count[i] / variance(fit.noise, I_sat));
    sum += V[i];
    points++;
  }
  const solved = line.solve();
  const growth = solved
    ? { value: (solved.solution[1] * T) / I_sat, error: (Math.sqrt(solved.covariance[3]) * T) / I_sat }
    : { value: 0, error: Infinity };
  return { growth, V_ions: sum / points };
}
