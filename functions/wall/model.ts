import { bohmSpeed } from "../edge/model";
import { e, m_e } from "../matter/constants";
import type { Ion } from "../matter/ion";

/** Where the potential of a floating wall is counted from. */
export const referencePoints = ["edge", "plasma"] as const;
export type ReferencePoint = (typeof referencePoints)[number];

/**
 * Flux of electrons that an unbiased wall would draw over that of the ions' charge, v̄_e/(4u_B) = √(M T_e/(2πm(Z T_e + T_i))),
 * both at the same edge density. Stangeby (2000).
 */
export function electronExcess(T_e: number, ion: Ion, T_i: number): number {
  return Math.sqrt(((ion.mass / m_e) * T_e) / (2 * Math.PI * (ion.charge * T_e + T_i)));
}

/**
 * Potential −T_e ln[(1−δ) v̄_e/(4u_B)] in V at which a wall draws no net current, against the sheath edge; T in eV, δ the
 * electron-induced yield. Stangeby (2000).
 */
export function floatingPotential(T_e: number, ion: Ion, T_i: number, delta_e: number): number {
  return -T_e * (Math.log(electronExcess(T_e, ion, T_i)) + Math.log1p(-delta_e));
}

/** Ion flux n_edge u_B sin(angle)/Z in m⁻² s⁻¹; n an electron density in m⁻³, the angle in degrees. LL; Stangeby (2000). */
export function ionFlux(n_edge: number, T_e: number, ion: Ion, T_i: number, angle: number): number {
  return ((n_edge * bohmSpeed(T_e, ion, T_i)) / ion.charge) * sine(angle);
}

/** Ion current density e n_edge u_B sin(angle) in A/m²: Z e times the flux. */
export function ionCurrentDensity(n_edge: number, T_e: number, ion: Ion, T_i: number, angle: number): number {
  return e * n_edge * bohmSpeed(T_e, ion, T_i) * sine(angle);
}

/** Long columns are mostly at normal incidence, where there is nothing to work out. */
function sine(degrees: number): number {
  return degrees === 90 ? 1 : Math.sin((degrees * Math.PI) / 180);
}
