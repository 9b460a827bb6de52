import { slope } from "../numerics/derivative";
import { normalNumbers, xoshiro128 } from "../numerics/random";

/** A measured argument: its value, its standard uncertainty, and the closed interval that a function takes it from. */
export interface Measured {
  value: number;
  u: number;
  least: number;
  most: number;
}

/** The function of its measured arguments; NaN where it has no value. */
export type MeasurementModel = (values: readonly number[]) => number;

/** Standard uncertainty of the result, and what part of its square each argument brings. */
export interface FirstOrder {
  u: number;
  shares: number[];
}

/** The slope along this argument is not known well enough. */
export class NoSlope {
  constructor(readonly index: number) {}
}

/** How far the slopes may be off in all, as part of the standard uncertainty that they give. */
const allowance = 1e-3;

/** First order in independent arguments: u² = Σ (∂f/∂x_i)² u_i². JCGM 100:2008, 5.1.2. */
export function propagate(f: MeasurementModel, measured: readonly Measured[]): FirstOrder | NoSlope {
  const at = measured.map(({ value }) => value);
  const parts: number[] = [];
  const doubts: number[] = [];
  for (const [i, { value, u, least, most }] of measured.entries()) {
    const along = (x: number) => {
      at[i] = x;
      const y = f(at);
      at[i] = value;
      return y;
    };
    const found = u === 0 ? { value: 0, error: 0 } : slope(along, value, { least, most, scale: u });
    if (!found) return new NoSlope(i);
    parts.push(Math.abs(found.value) * u);
    doubts.push(found.error * u);
  }
  const u = Math.hypot(...parts);
  const worst = doubts.indexOf(Math.max(...doubts));
  if (worst >= 0 && doubts[worst] > allowance * u) return new NoSlope(worst);
  return { u, shares: parts.map((part) => (u === 0 ? 0 : (part / u) ** 2)) };
}

/** Mean, standard uncertainty and 95 % interval of the values drawn, and how many draws the function had no value for. */
export interface Drawn {
  mean: number;
  u: number;
  low: number;
  high: number;
  outside: number;
}

export const draws = 100_000;

/** Any four words that are not all zero; the same for every call, so that a cell keeps its value. */
const seed = [0x9e3779b9, 0x243f6a88, 0xb7e15162, 0x6a09e667] as const;

/**
 * Propagation of distributions by drawing each argument from its normal distribution, JCGM 101:2008, 7; the interval is
 * the probabilistically symmetric one, 7.7. Draws outside an argument's own interval or the function's domain are left
 * out of the statistics and counted. Too few of the rest leave NaN.
 */
export function propagateByDraws(f: MeasurementModel, measured: readonly Measured[]): Drawn {
  const normal = normalNumbers(xoshiro128(seed));
  const results = new Float64Array(draws);
  const at = measured.map(({ value }) => value);
  let kept = 0;
  for (let draw = 0; draw < draws; draw++) {
    let inside = true;
    for (let i = 0; i < measured.length; i++) {
      const { value, u, least, most } = measured[i];
      if (u === 0) continue;
      const x = value + u * normal();
      at[i] = x;
      if (x < least || x > most) inside = false;
    }
    const y = inside ? f(at) : NaN;
    if (Number.isFinite(y)) results[kept++] = y;
  }
  return { ...statistics(results.subarray(0, kept)), outside: draws - kept };
}

function statistics(results: Float64Array): Omit<Drawn, "outside"> {
  const count = results.length;
  let mean = 0;
  for (let i = 0; i < count; i++) mean += (results[i] - mean) / (i + 1);
  let squares = 0;
  for (const y of results) squares += (y - mean) ** 2;
  const sorted = results.sort();
  // JCGM 101, 7.7.2: q values inside, r below, r counted from 1.
  const q = Math.floor(0.95 * count + 0.5);
  const r = Math.floor((count - q + 1) / 2);
  return { mean, u: Math.sqrt(squares / (count - 1)), low: sorted[r - 1], high: sorted[r + q - 1] };
}
