import { eepfDensity, eepfFlux, eepfMeanEnergy, eepfScreening, eepfTemperature } from "./model";
import type { Eepf } from "./eepf";
import { moments } from "./product-integration";

/** A result and the bound within which its error stays in 95 of 100 cases. */
export interface Bounded {
  value: number;
  error: number;
}

/** The five results in the order of their columns. */
export const results = [eepfDensity, eepfMeanEnergy, eepfTemperature, eepfScreening, eepfFlux];

/** A result with what noise, spacing and the two unmeasured ends may have done to it. */
export function bounded(
  of: (M: ArrayLike<number>) => number,
  { sums, doubts, weights, variances, points }: Eepf,
): Bounded {
  const value = of(sums);
  const slopes = slopesOf(of, sums, value);
  let noise = 0;
  for (let i = 0; i < points; i++) noise += along(slopes, weights, moments * i) ** 2 * variances[i];
  const others = doubts.reduce((total, doubt) => total + along(slopes, doubt, 0) ** 2, 0);
  return { value, error: Math.sqrt(coverage(points) ** 2 * noise + others) };
}

/** Derivatives with respect to the four integrals, by a step small beside them. */
function slopesOf(of: (M: ArrayLike<number>) => number, sums: Float64Array, value: number): Float64Array {
  return sums.map((sum, p) => {
    const moved = Float64Array.from(sums);
    moved[p] = sum * (1 + 1e-6);
    return (of(moved) - value) / (sum * 1e-6);
  });
}

function along(slopes: Float64Array, steps: ArrayLike<number>, from: number): number {
  let total = 0;
  for (let p = 0; p < moments; p++) total += slopes[p] * steps[from + p];
  return total;
}

/** Student's t for 95 %, ν = points/3: noise seen through four neighbours is known that well (Abramowitz & Stegun 26.7.5). */
export function coverage(points: number): number {
  return 1.96 + 2.37 / (points / 3);
}
