import { gaussLegendre } from "../numerics/gauss-legendre";

/**
 * Integrals of a probability function F(E) with the weights E^(−1/2), E^(1/2), E and E^(3/2), taken over one piece of it.
 * With s = √E the weights become 2, 2s², 2s³ and 2s⁴: the singular one is gone, and what is left of a straight or an
 * exponential piece is smooth enough for Gauss–Legendre points to reach the last digits.
 */
export const moments = 4;

/** Eight points and weights on 0 to 1. */
const { nodes, weights } = gaussLegendre(8);
const gauss = Array.from(nodes, (x, i) => [(1 + x) / 2, weights[i] / 2] as const);

/** A piece of F from energy a to b, with its values there: straight, or exponential where both are positive. */
export interface Piece {
  a: number;
  b: number;
  F_a: number;
  F_b: number;
  exponential: boolean;
}

/** F at a fraction t of a piece. */
export function valueAt({ F_a, F_b, exponential }: Piece, t: number): number {
  return exponential ? F_a * Math.pow(F_b / F_a, t) : F_a + (F_b - F_a) * t;
}

/** Adds the four integrals over a piece to `sums`. */
export function addPiece(piece: Piece, sums: Float64Array): void {
  eachPoint(piece, (E, weight, t) => {
    const F = weight * valueAt(piece, t);
    const s = Math.sqrt(E);
    sums[0] += F;
    sums[1] += F * E;
    sums[2] += F * E * s;
    sums[3] += F * E * E;
  });
}

/**
 * Adds what each end's value counts for in the four integrals, as if the piece were straight: by these weights the
 * noise of single points goes into the sums. Weights of point i stand at 4i.
 */
export function addWeights(piece: Piece, weights: Float64Array, left: number, right: number): void {
  eachPoint(piece, (E, weight, t) => {
    let power = weight;
    const s = Math.sqrt(E);
    for (let p = 0; p < moments; p++) {
      weights[moments * left + p] += power * (1 - t);
      weights[moments * right + p] += power * t;
      power *= p === 0 ? E : s;
    }
  });
}

/** Calls back at the Gauss points in s = √E with E, the weight of E^(−1/2) dE, and the fraction of the piece. */
function eachPoint({ a, b, F_a, F_b, exponential }: Piece, use: (E: number, weight: number, t: number) => void): void {
  // A steep piece is cut so that each part falls by less than a factor 4. The logarithms are taken apart because the ratio
  // of a denormal number and an ordinary one overflows, and infinitely many parts would never end.
  const parts = exponential ? Math.max(1, Math.ceil(Math.abs(Math.log(F_b) - Math.log(F_a)) / 1.4)) : 1;
  const part = (b - a) / parts;
  for (let k = 0; k < parts; k++) {
    const from = Math.sqrt(a + k * part);
    // Differences of squares, so that a narrow piece at a high energy keeps its digits.
    const width = part / (from + Math.sqrt(a + (k + 1) * part));
    for (const [x, w] of gauss) {
      const above = width * x * (2 * from + width * x);
      use(a + k * part + above, 2 * width * w, (k + above / part) / parts);
    }
  }
}
