import { addWeights, moments, type Piece } from "./product-integration";
import { fitLogSlope, refineLogSlope, type LogSlope } from "./slope";

/** The exponential beyond the last resolved energy. */
export type Tail = LogSlope & { from: number };

/** The index of the largest value. */
export function peakOf(F: Float64Array): number {
  return F.reduce((peak, value, i) => (value > F[peak] ? i : peak), 0);
}

/** How many standard errors a mean of five neighbours must stand above zero to be more than noise. */
const clearOfNoise = 3;

/** The last point before the function first sinks into its noise, coming from its largest value. */
export function lastResolved(F: Float64Array, varianceOf: (F: number) => number): number {
  let i = peakOf(F);
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
export function tailFrom(
  energy: Float64Array,
  F: Float64Array,
  varianceOf: (F: number) => number,
  last: number,
): Tail | undefined {
  const peak = peakOf(F);
  const at = energy[last];
  for (let more = 3; last - more >= peak; more += Math.max(1, more >> 3)) {
    const from = last - more;
    const line = fitLogSlope(energy, F, varianceOf, from, last, at);
    if (!line || !(line.steepness > 4 * line.steepnessError)) continue;
    if (last - more > peak && line.steepness * (at - energy[from]) < 0.5) continue;
    const refined = refineLogSlope(line, energy, F, varianceOf, from, at) ?? line;
    return { ...refined, from: at };
  }
  return undefined;
}

export function tailPiece({ from, value, steepness }: Tail): Piece {
  // Beyond 45 e-folds nothing is left that a double could hold beside the rest.
  return { a: from, b: from + 45 / steepness, F_a: value, F_b: value * Math.exp(-45), exponential: true };
}

/**
 * There may be no tail at all, or twice as much, and its steepness has an error of its own: the integrals go with up to the
 * third power of it.
 */
export function tailDoubt(inTail: Float64Array, { steepness, steepnessError }: LogSlope): Float64Array {
  const doubt = 1 + 2 * 3 * (steepnessError / steepness);
  return inTail.map((sum) => doubt * sum);
}

/**
 * The line that continues the function to zero energy: through as few first points as make it certain to 5 %. Where no two
 * of them are above 0 it is flat, and nobody knows.
 */
export function lowEnd(energy: Float64Array, F: Float64Array, varianceOf: (F: number) => number): LogSlope {
  let line: LogSlope | undefined;
  for (let to = 2; to < F.length && (to < 4 || energy[to] <= 3 * energy[0]); to++) {
    line = fitLogSlope(energy, F, varianceOf, 0, to, 0);
    if (line && line.valueError < 0.05) break;
  }
  return line ?? { value: Math.max(0, F[0]), valueError: 1, steepness: 0, steepnessError: Infinity };
}

/** The value at zero energy may be anything between no further rise and twice the rise, besides its noise. */
export function lowDoubt(piece: Piece, low: LogSlope): Float64Array {
  const weights = new Float64Array(2 * moments);
  addWeights(piece, weights, 0, 1);
  const doubt = Math.abs(low.value - piece.F_b) + 2 * low.valueError * low.value;
  return weights.subarray(0, moments).map((weight) => weight * doubt);
}
