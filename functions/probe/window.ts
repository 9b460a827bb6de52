import { format } from "../cells/format";
import { chiSquareBeyond } from "../numerics/chi-square";
import { variance } from "../numerics/noise";
import type { Characteristic } from "./characteristic";
import type { FirstLook } from "./knee";
import { electronsAt, fitRetarding, floatingPotentialOf, ionsAt, type RetardingFit } from "./retarding-fit";

/** Windows tried: how far below the floating potential they begin, how far below the knee they end, in T. */
const bottoms = [Infinity, 15, 10, 7, 5];
const tops = [0.5, 1, 1.5, 2, 2.5, 3, 4];

/** Below this probability a misfit is not noise; a window picked among many has more to show. */
const significance = 1e-3;
const significanceOfPicked = 0.05;

/** A window reaches so many T above the floating potential and has so many points there, and so many on the ions' side. */
const leastReach = 1;
const fewestAbove = 5;
const fewestBelow = 4;
const largestError = 0.3;

/** Ions in orbital motion gain 1/(2η) of their current per T_e, a tenth where the probe floats; nothing gains more. */
const largestGrowth = 0.12;

export const notRising = "the current does not rise with voltage as electrons against a retarding probe would";

/** A temperature that moves by more than this when ions from further down are let in is not that of the bulk. */
const largestChange = 0.03;

/**
 * The fit in the widest window where it leaves nothing but noise. The first choice, everything up to half a temperature
 * below the knee, mostly stands; only where it doesn't are shorter windows tried, and of those that stand the one that
 * knows the temperature best is taken. In words where none will do.
 */
export function chooseWindow(curve: Characteristic, { T, knee }: FirstLook, tolerance: number): RetardingFit | string {
  const first = fitRetarding(curve, 0, topBelow(curve, knee, tops[0] * T), T, tolerance);
  if (!first) return "no exponential on an ion line fits below the knee";
  const poor = whyPoor(curve, first);
  if (poor === undefined && lackOfFit(curve, first) > significance) return first;
  const shorter = shorterWindows(curve, knee, first.parameters[3], tolerance);
  const standing = shorter.filter(
    (fit) => whyPoor(curve, fit) === undefined && lackOfFit(curve, fit) > significanceOfPicked,
  );
  if (standing.length === 0) {
    return (
      poor ?? "the electron current is no single exponential anywhere: more than one temperature, or a distorted sweep"
    );
  }
  // What is left of a misfit at the upper end still tilts the slope: take one that a longer window stands beside.
  const backed = standing.filter((fit) => standing.some((longer) => longer.from === fit.from && longer.to > fit.to));
  const candidates = backed.length > 0 ? backed : standing;
  const best = candidates.reduce((a, b) => (relativeError(b) < relativeError(a) ? b : a));
  if (steepensAbove(curve, best, topBelow(curve, knee, 0))) {
    return `above ${format(best.V_0)} V the electron current rises faster than the ${format(best.parameters[3])} eV below allow: more than one temperature`;
  }
  return dependsOnBottom(curve, best, tolerance)
    ? "the ions' side bends so much that T_e depends on where it is cut: hot electrons, or a sheath that grows with voltage"
    : best;
}

/** Whether the ions' side that the window leaves out would give another temperature: a slow tail of electrons reaches there. */
function dependsOnBottom(curve: Characteristic, fit: RetardingFit, tolerance: number): boolean {
  if (fit.from === 0) return false;
  const whole = fitRetarding(curve, 0, fit.to, fit.parameters[3], tolerance);
  return !whole || Math.abs(whole.parameters[3] / fit.parameters[3] - 1) > largestChange;
}

/** Points up to so far below the knee; all where the sweep ends below its knee. */
function topBelow({ V }: Characteristic, knee: number, margin: number): number {
  if (knee >= V.length) return V.length;
  let to = knee;
  while (to > 0 && V[to - 1] > V[knee] - margin) to--;
  return to;
}

function shorterWindows(curve: Characteristic, knee: number, T: number, tolerance: number): RetardingFit[] {
  const { V } = curve;
  const ends = new Set(
    tops.map((top) =>
      knee < V.length ? topBelow(curve, knee, top * T) : topBelow(curve, V.length - 1, (top - tops[0]) * T),
    ),
  );
  // All begin where ions arrive: a window above would take hot electrons for an ion line.
  const zero = V[zeroCrossing(curve)];
  const starts = new Set(bottoms.map((bottom) => V.findIndex((each) => each >= zero - bottom * T)));
  const fits: RetardingFit[] = [];
  for (const from of starts) {
    for (const to of ends) {
      const fit = to - from >= fewestAbove + fewestBelow ? fitRetarding(curve, from, to, T, tolerance) : undefined;
      if (fit) fits.push(fit);
    }
  }
  return fits;
}

/** The last point around which the current is still below zero on the mean of five; the first of all where it never is. */
function zeroCrossing({ I }: Characteristic): number {
  for (let i = I.length - 3; i > 1; i--) {
    if (I[i - 2] + I[i - 1] + I[i] + I[i + 1] + I[i + 2] < 0) return i;
  }
  return 0;
}

function relativeError({ parameters, covariance }: RetardingFit): number {
  return Math.sqrt(covariance[15]) / parameters[3];
}

/** Why a fit says nothing, however well it follows the points. */
function whyPoor(curve: Characteristic, fit: RetardingFit): string | undefined {
  const [A, , b, T] = fit.parameters;
  if (!(A > 0)) return notRising;
  const error = relativeError(fit);
  if (!(error < largestError)) return `the noise leaves T_e uncertain by ${format(100 * error, 2)} %`;
  const rising = curve.V.subarray(fit.from, fit.to).filter((each) => each > fit.V_0 - 3 * T).length;
  if (rising < fewestAbove) return `only ${rising} points where the electrons rise; step the voltage more finely`;
  const V_f = floatingPotentialOf(fit);
  if (V_f === undefined) {
    // Without a crossing an ion line shifted by an offset is still flat; a steep one is electrons.
    return b > 3 * Math.sqrt(fit.covariance[10])
      ? "the current falls all the way down and never crosses zero: sweep down to where ions alone arrive"
      : undefined;
  }
  const above = curve.V.subarray(fit.from, fit.to).filter((each) => each > V_f).length;
  const below = fit.to - fit.from - above;
  if (above < fewestAbove) return `only ${above} points between floating and knee; step the voltage more finely`;
  if (below < fewestBelow) return `only ${below} points below floating; sweep further down`;
  if (fit.V_0 - V_f < leastReach * T) return "the sweep, or its straight part, ends within one T_e above floating";
  const [growth, unsure] = [(b * T) / -ionsAt(fit, V_f), (Math.sqrt(fit.covariance[10]) * T) / -ionsAt(fit, V_f)];
  return growth - 3 * unsure > largestGrowth
    ? "below floating the current falls on more steeply than ions do: hot electrons, or a leak"
    : undefined;
}

/** The probability that noise alone leaves neighbouring residuals as alike as these, by their means over short runs. */
export function lackOfFit({ I }: Characteristic, { from, to, fitted, variances }: RetardingFit): number {
  const size = to - from;
  const run = Math.max(3, Math.round(size / 16));
  let [squares, runs] = [0, 0];
  for (let start = 0; start + run <= size; start += run) {
    let [sum, weight] = [0, 0];
    for (let i = start; i < start + run; i++) {
      sum += (I[from + i] - fitted[i]) / variances[i];
      weight += 1 / variances[i];
    }
    squares += (sum * sum) / weight;
    runs++;
  }
  return chiSquareBeyond(squares, Math.max(1, runs - 4));
}

/** Whether the points above the window rise well over the fit's own continuation, anywhere up to the limit. */
function steepensAbove({ V, I, count }: Characteristic, fit: RetardingFit, limit: number): boolean {
  let [excess, expected, square] = [0, 0, 0];
  for (let i = fit.to; i < limit; i++) {
    const electrons = electronsAt(fit, V[i]);
    const all = electrons + ionsAt(fit, V[i]);
    excess += I[i] - all;
    expected += electrons;
    square += variance(fit.noise, all) / count[i];
    if (i >= fit.to + 2 && excess > 0.1 * expected && excess > 4 * Math.sqrt(square)) return true;
  }
  return false;
}
