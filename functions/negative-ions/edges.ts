import { findRoot } from "../numerics/root";
import { edgeDrop } from "./model";

/**
 * All α_s > 0 with α_b = α_s exp[(1+α_s)(γ−1)/(2(1+α_sγ))], the edges that a plasma with α_b = n₋/n_e in its body may
 * have, in the order met coming from the body: smallest drop first. Both species are Boltzmann, the ions fall freely. BT59.
 *
 * Solved for ln α_s. Between its folds the map from edge to body turns back; each of the three branches is monotonic and
 * has a root just where the map passes ln α_b between its ends, so none is lost. Two roots closer than the rounding of
 * α_b can tell apart are one, at the fold.
 */
export function negativeIonEdges(alpha_b: number, gamma: number): number[] {
  if (alpha_b === 0) return [0];
  const target = Math.log(alpha_b);
  const over = (t: number) => logBody(t, gamma) - target;
  // (γ−1) times a drop between ½ and 1/(2γ).
  const farthest = 0.5 * (gamma - 1);
  const nearest = farthest / gamma;
  const size = 1 + Math.abs(farthest) + Math.abs(nearest) + Math.abs(target);
  const least = target - Math.max(farthest, nearest) - 1e-9 * size;
  const most = target - Math.min(farthest, nearest) + 1e-9 * size;
  const folds = edgeFolds(gamma);
  const roots = folds
    ? branchRoots(over, least, folds, most, 2 * Number.EPSILON * size)
    : [Math.exp(findRoot(over, least, most))];
  return gamma < 1 ? roots : roots.reverse();
}

/** The roots on the three branches, smallest first; `noise` is how far rounding moves the map. */
function branchRoots(
  over: (t: number) => number,
  least: number,
  [low, high]: Folds,
  most: number,
  noise: number,
): number[] {
  const [a, b] = [Math.log(low), Math.log(high)];
  const [top, bottom] = [over(a), over(b)];
  const between = (from: number, to: number) => Math.exp(findRoot(over, from, to));
  if (Math.abs(top) <= noise && Math.abs(bottom) <= noise) return [Math.sqrt(low * high)];
  const roots: number[] = [];
  if (Math.abs(top) <= noise) roots.push(low);
  else if (top > 0) roots.push(between(least, a));
  if (top > noise && bottom < -noise) roots.push(between(a, b));
  if (Math.abs(bottom) <= noise) roots.push(high);
  else if (bottom < 0) roots.push(between(b, most));
  return roots;
}

type Folds = readonly [low: number, high: number];

/**
 * Where the map from edge to body turns back: 2γ²α² + (4γ − (γ−1)²)α + 2 = 0, from its derivative 1/α − (γ−1)²/(2(1+αγ)²).
 * Undefined where it never does, for γ between 5−√24 and 5+√24. The product of the two is 1/γ².
 */
export function edgeFolds(gamma: number): Folds | undefined {
  // γ² − 10γ + 1 in factors keeps its digits near the cusp.
  const discriminant = (gamma - 5 - root24) * (gamma - 5 + root24);
  if (!(discriminant > 0)) return undefined;
  const high = ((gamma - 1) ** 2 - 4 * gamma + Math.abs(gamma - 1) * Math.sqrt(discriminant)) / (4 * gamma * gamma);
  return [1 / (gamma * gamma * high), high];
}

const root24 = Math.sqrt(24);

/** n₋/n_e in the body whose edge has α_s. BT59. */
export function bodyRatio(alpha_s: number, gamma: number): number {
  return alpha_s * Math.exp((gamma - 1) * edgeDrop(alpha_s, gamma));
}

/** ln α_b of the body whose edge has ln α_s = t. */
function logBody(t: number, gamma: number): number {
  return t + (gamma - 1) * edgeDrop(Math.exp(t), gamma);
}
