import { bohmSpeed } from "../edge/model";
import { e } from "../matter/constants";
import type { Ion } from "../matter/ion";

/** One kind of ion in a mixture, its density as a fraction of the electron density: Σ Z f = 1. */
export interface Share {
  ion: Ion;
  fraction: number;
}

export const mixRules = ["common", "own"] as const;
export type MixRule = (typeof mixRules)[number];

/** Charge Σ Z f that the ions carry, over that of the electrons. */
export function chargeSum(mix: readonly Share[]): number {
  let sum = 0;
  for (const { ion, fraction } of mix) sum += ion.charge * fraction;
  return sum;
}

/** The speed √(Σ f Z² eT_e/M) in m/s that all ions share when they drag each other along. */
export function commonSpeed(T_e: number, mix: readonly Share[]): number {
  let sum = 0;
  for (const { ion, fraction } of mix) sum += (fraction * ion.charge * ion.charge) / ion.mass;
  return Math.sqrt(e * T_e * sum);
}

/**
 * Speed of one species of the mixture at the sheath edge in m/s, by either rule. Both meet the Bohm condition of a
 * mixture, Σ f Z² eT_e/(M u²) = 1, with equality. Riemann, IEEE Trans. Plasma Sci. 23 (1995) 709.
 */
export function edgeSpeed(T_e: number, ion: Ion, mix: readonly Share[], rule: MixRule): number {
  return rule === "common" ? commonSpeed(T_e, mix) : bohmSpeed(T_e, ion);
}
