import { addPiece, addWeights, moments, type Piece } from "./product-integration";

/** Straight pieces between the points; exponential ones where both ends stand well clear of the noise. */
export function piecesThrough(
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

export function sumsOf(pieces: readonly Piece[]): Float64Array {
  const sums = new Float64Array(moments);
  for (const piece of pieces) addPiece(piece, sums);
  return sums;
}

/** The weights of the measured points; that of the continued value at zero is left to the doubt about it. */
export function weightsOf(pieces: readonly Piece[], points: number, continued: boolean): Float64Array {
  const weights = new Float64Array(moments * (points + 1));
  pieces.forEach((piece, k) => {
    const right = continued ? k : k + 1;
    addWeights(piece, weights, right === 0 ? points : right - 1, right);
  });
  return weights.subarray(0, moments * points);
}

/** What coarser tables of every other point would change, halved: errors of second order shrink to a third. */
export function spacingDoubt(
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
