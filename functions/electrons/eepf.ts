import { Fault, noSolution } from "../cells/fault";
import { format } from "../cells/format";
import type { Series } from "../cells/series";
import { estimateNoise, variance, type Noise } from "../numerics/noise";
import { cumulate, type Crossing } from "./crossing";
import { readEepfTable, type EepfTable } from "./eepf-table";
import { addPiece, addWeights, moments, type Piece } from "./product-integration";
import { fitLogSlope, refineLogSlope, type LogSlope } from "./slope";

/** A measured probability function made ready for integrals: pieces from zero energy up, then an exponential tail. */
export interface Eepf {
  /** From zero energy to the last resolved one, without gaps. */
  pieces: Piece[];
  tail: LogSlope & { from: number };
  crossing: Crossing;
  /** ∫ F E^p dE for p = −1/2, 1/2, 1 and 3/2, tail included. */
  sums: Float64Array;
  /** Variance of each point and its weights in the sums, so that noise can be followed into any result. */
  variances: Float64Array;
  weights: Float64Array;
  /** How far the sums may be off for other reasons: the end at zero energy, the spacing, the tail. */
  doubts: Float64Array[];
  energy: Float64Array;
  /** Number of measured points that the integrals use: those up to the noise. */
  points: number;
  notes: string[];
}

/** The two columns of a measurement, read, mended and said what was done; or why nothing can be made of them. */
export function readEepf(energy: Series, eepf: Series): Eepf | Fault {
  let ofEnergy = known.get(energy);
  if (!ofEnergy) known.set(energy, (ofEnergy = new WeakMap()));
  let found = ofEnergy.get(eepf);
  if (!found) {
    const table = readEepfTable(energy, eepf);
    ofEnergy.set(eepf, (found = table instanceof Fault ? table : prepare(table)));
  }
  return found;
}

/** One measurement with a long column of ions is prepared once. */
const known = new WeakMap<Series, WeakMap<Series, Eepf | Fault>>();

function prepare({ energy, F, notes }: EepfTable): Eepf | Fault {
  const noise = noiseOf(energy, F);
  const varianceOf = (value: number) => variance(noise, value);
  const last = lastResolved(F, varianceOf);
  const tail = tailFrom(energy, F, varianceOf, last);
  if (tail === undefined) {
    return noSolution(
      `The function does not clearly fall towards its last energy ${format(energy[last])} eV; measure further, or with less noise.`,
    );
  }
  const low = energy[0] > 0 ? lowEnd(energy, F, varianceOf) : undefined;
  const all = Array.from({ length: last + 1 }, (_, i) => i);
  const pieces = piecesThrough(all, energy, F, varianceOf, low?.value);
  const beyond = tailPiece(tail);
  const inTail = sumsOf([beyond]);
  const sums = sumsOf([...pieces, beyond]);
  const weights = weightsOf(pieces, last + 1, low !== undefined);
  const doubts = [tailDoubt(inTail, tail), spacingDoubt(all, energy, F, varianceOf, low?.value)];
  if (low) doubts.push(lowDoubt(pieces[0], low));
  const variances = Float64Array.from(F.subarray(0, last + 1), varianceOf);
  const crossing = cumulate(pieces, tail);
  const eepf: Eepf = { pieces, tail, crossing, sums, variances, weights, doubts, energy, points: last + 1, notes };
  notes.push(...notesOn(eepf, F, inTail[1] / sums[1], low !== undefined));
  return eepf;
}

/**
 * Noise from how far each point lies off a cubic through its four neighbours, drawn through F or, where that bends less,
 * through ln F. The first look takes whichever is nearer; the second ln F where all five points are clear of that noise.
 */
function noiseOf(energy: Float64Array, F: Float64Array): Noise {
  const through = neighbours(energy);
  const residuals = (squareOf: (i: number) => number) => F.map((_, i) => squareOf(i));
  const straight = (i: number) => squaredResidual(F, through[i], i);
  const curved = (i: number) => squaredLogResidual(F, through[i], i);
  const allAbove = (i: number, least: (F: number) => number) =>
    [i, ...through[i].map(([k]) => k)].every((k) => F[k] > least(F[k]));
  const rough = estimateNoise(
    F,
    residuals((i) => (allAbove(i, () => 0) ? Math.min(straight(i), curved(i)) : straight(i))),
  );
  const level = (value: number) => 5 * Math.sqrt(variance(rough, value));
  return estimateNoise(
    F,
    residuals((i) => (allAbove(i, level) ? curved(i) : straight(i))),
  );
}

type Shares = readonly (readonly [index: number, share: number])[];

/** For each energy the four nearest in the row, and their shares in the value of the cubic there (Lagrange). */
function neighbours(energy: Float64Array): Shares[] {
  return Array.from(energy, (E, i) => {
    const start = Math.min(Math.max(i - 2, 0), energy.length - 5);
    const others = [0, 1, 2, 3, 4].map((k) => start + k).filter((k) => k !== i);
    return others.map((k) => {
      const factors = others.filter((j) => j !== k).map((j) => (E - energy[j]) / (energy[k] - energy[j]));
      return [k, factors.reduce((product, factor) => product * factor, 1)] as const;
    });
  });
}

function squaredResidual(F: Float64Array, shares: Shares, i: number): number {
  const predicted = shares.reduce((sum, [k, share]) => sum + share * F[k], 0);
  return (F[i] - predicted) ** 2 / gain(shares);
}

function squaredLogResidual(F: Float64Array, shares: Shares, i: number): number {
  const predicted = shares.reduce((sum, [k, share]) => sum + share * Math.log(F[k]), 0);
  return (F[i] - Math.exp(predicted)) ** 2 / gain(shares);
}

/** The variance of such a difference over that of one point. */
function gain(shares: Shares): number {
  return shares.reduce((sum, [, share]) => sum + share * share, 1);
}

/** How many standard errors a mean of five neighbours must stand above zero to be more than noise. */
const clearOfNoise = 3;

/** The last point before the function first sinks into its noise, coming from its largest value. */
function lastResolved(F: Float64Array, varianceOf: (F: number) => number): number {
  let i = F.indexOf(Math.max(...F));
  for (; i < F.length - 1; i++) {
    const from = Math.max(0, Math.min(i - 1, F.length - 5));
    let [mean, square] = [0, 0];
    for (let k = from; k < from + 5; k++) {
      mean += F[k] / 5;
      square += varianceOf(F[k]) / 25;
    }
    if (!(mean > clearOfNoise * Math.sqrt(square))) break;
  }
  while (!(F[i] > 0)) i--;
  return i;
}

/**
 * The exponential that continues the function: through its last half e-fold, or from further up until it clearly falls,
 * and through all points in the noise beyond, which may hide a hot group.
 */
function tailFrom(
  energy: Float64Array,
  F: Float64Array,
  varianceOf: (F: number) => number,
  last: number,
): Eepf["tail"] | undefined {
  const peak = F.indexOf(Math.max(...F));
  const at = energy[last];
  for (let from = last - 3; from >= peak; from--) {
    const line = fitLogSlope(energy, F, varianceOf, from, last, at);
    if (!line || !(line.steepness > 4 * line.steepnessError)) continue;
    if (from > peak && line.steepness * (at - energy[from]) < 0.5) continue;
    const refined = refineLogSlope(line, energy, F, varianceOf, from, at) ?? line;
    return { ...refined, from: at };
  }
  return undefined;
}

function tailPiece({ from, value, steepness }: Eepf["tail"]): Piece {
  // Beyond 45 e-folds nothing is left that a double could hold beside the rest.
  return { a: from, b: from + 45 / steepness, F_a: value, F_b: value * Math.exp(-45), exponential: true };
}

/**
 * There may be no tail at all, or twice as much, and its steepness has an error of its own: the integrals go with up to the
 * third power of it.
 */
function tailDoubt(inTail: Float64Array, { steepness, steepnessError }: LogSlope): Float64Array {
  const doubt = 1 + 2 * 3 * (steepnessError / steepness);
  return inTail.map((sum) => doubt * sum);
}

/** The line that continues the function to zero energy: through as few first points as make it certain to 5 %. */
function lowEnd(energy: Float64Array, F: Float64Array, varianceOf: (F: number) => number): LogSlope | undefined {
  let line: LogSlope | undefined;
  for (let to = 2; to < F.length && (to < 4 || energy[to] <= 3 * energy[0]); to++) {
    line = fitLogSlope(energy, F, varianceOf, 0, to, 0);
    if (line && line.valueError < 0.05) break;
  }
  return line;
}

/** Straight pieces between the points; exponential ones where both ends stand well clear of the noise. */
function piecesThrough(
  indices: readonly number[],
  energy: Float64Array,
  F: Float64Array,
  varianceOf: (F: number) => number,
  atZero: number | undefined,
): Piece[] {
  // The logarithm of a noisy value is too low on average, by half its relative variance.
  const clear = (value: number) => value > 10 * Math.sqrt(varianceOf(value));
  const pieces: Piece[] = [];
  const first = indices[0];
  if (atZero !== undefined) {
    pieces.push({ a: 0, b: energy[first], F_a: atZero, F_b: F[first], exponential: F[first] > 0 });
  }
  for (let k = 1; k < indices.length; k++) {
    const [i, j] = [indices[k - 1], indices[k]];
    const exponential = F[i] > 0 && F[j] > 0 && clear(F[i]) && clear(F[j]);
    pieces.push({ a: energy[i], b: energy[j], F_a: F[i], F_b: F[j], exponential });
  }
  return pieces;
}

function sumsOf(pieces: readonly Piece[]): Float64Array {
  const sums = new Float64Array(moments);
  for (const piece of pieces) addPiece(piece, sums);
  return sums;
}

/** The weights of the measured points; that of the continued value at zero is left to the doubt about it. */
function weightsOf(pieces: readonly Piece[], points: number, continued: boolean): Float64Array {
  const weights = new Float64Array(moments * (points + 1));
  pieces.forEach((piece, k) => {
    const right = continued ? k : k + 1;
    addWeights(piece, weights, right === 0 ? points : right - 1, right);
  });
  return weights.subarray(0, moments * points);
}

/** What coarser tables of every other point would change, halved: errors of second order shrink to a third. */
function spacingDoubt(
  all: readonly number[],
  energy: Float64Array,
  F: Float64Array,
  varianceOf: (F: number) => number,
  atZero: number | undefined,
): Float64Array {
  const sumsWith = (indices: readonly number[]) => sumsOf(piecesThrough(indices, energy, F, varianceOf, atZero));
  const whole = sumsWith(all);
  const coarse = [0, 1].map((odd) => sumsWith(all.filter((i) => i === 0 || i === all.length - 1 || i % 2 === odd)));
  return whole.map((sum, p) => 0.5 * ((coarse[0][p] + coarse[1][p]) / 2 - sum));
}

/** The value at zero energy may be anything between no further rise and twice the rise, besides its noise. */
function lowDoubt(piece: Piece, low: LogSlope): Float64Array {
  const weights = new Float64Array(2 * moments);
  addWeights(piece, weights, 0, 1);
  const doubt = Math.abs(low.value - piece.F_b) + 2 * low.valueError * low.value;
  return weights.subarray(0, moments).map((weight) => weight * doubt);
}

function notesOn({ points, energy, tail }: Eepf, F: Float64Array, tailShare: number, continued: boolean): string[] {
  const notes: string[] = [];
  const negative = F.subarray(0, points).filter((value) => value < 0).length;
  if (negative > 0)
    notes.push(`${negative} negative ${negative === 1 ? "value" : "values"} kept: they balance the noise`);
  const peak = F.indexOf(Math.max(...F));
  if (peak > 2 && F[0] < 0.8 * F[peak])
    notes.push(`falls towards zero energy below ${format(energy[peak])} eV; kept as measured`);
  if (continued) notes.push(`no point at zero energy: continued along the slope from ${format(energy[0])} eV`);
  const ends =
    points < F.length ? `sinks into the noise above ${format(tail.from)} eV` : `ends at ${format(tail.from)} eV`;
  notes.push(
    `${ends}: continued exponentially with ${format(1 / tail.steepness)} eV, ${format(100 * tailShare, 2)} % of the density`,
  );
  return notes;
}
