import type { LogSlope } from "./slope";
import type { Piece } from "./product-integration";

/**
 * Electrons above each piece's lower end a, from the tail inwards: their number ∫ F dE and their current ∫ (E − a) F dE.
 * Straight and exponential pieces have both in closed form.
 */
export interface Crossing {
  number: Float64Array;
  current: Float64Array;
}

export function cumulate(pieces: readonly Piece[], tail: LogSlope): Crossing {
  const size = pieces.length;
  const number = new Float64Array(size + 1);
  const current = new Float64Array(size + 1);
  number[size] = tail.value / tail.steepness;
  current[size] = number[size] / tail.steepness;
  for (let k = size - 1; k >= 0; k--) {
    const piece = pieces[k];
    number[k] = number[k + 1] + numberAbove(piece, piece.a);
    current[k] = current[k + 1] + (piece.b - piece.a) * number[k + 1] + currentAbove(piece, piece.a);
  }
  return { number, current };
}

/** ∫ F dE over the part of a piece above V. */
export function numberAbove(piece: Piece, V: number): number {
  const w = piece.b - V;
  if (!piece.exponential) return 0.5 * w * (straightAt(piece, V) + piece.F_b);
  return piece.F_b * w * phi1(steepness(piece) * w);
}

/** ∫ (E − V) F dE over the part of a piece above V. */
export function currentAbove(piece: Piece, V: number): number {
  const w = piece.b - V;
  if (!piece.exponential) return w * w * (straightAt(piece, V) / 6 + piece.F_b / 3);
  return piece.F_b * w * w * phi2(steepness(piece) * w);
}

function steepness({ a, b, F_a, F_b }: Piece): number {
  return Math.log(F_a / F_b) / (b - a);
}

function straightAt({ a, b, F_a, F_b }: Piece, E: number): number {
  return F_b + ((F_a - F_b) * (b - E)) / (b - a);
}

/** (e^x − 1)/x. */
function phi1(x: number): number {
  return x === 0 ? 1 : Math.expm1(x) / x;
}

/** (e^x − 1 − x)/x², by its series where the difference would cancel. */
function phi2(x: number): number {
  if (Math.abs(x) > 1) return (Math.expm1(x) - x) / (x * x);
  let term = 0.5;
  let sum = 0.5;
  for (let k = 3; Math.abs(term) > 1e-17 * sum; k++) {
    term *= x / k;
    sum += term;
  }
  return sum;
}
