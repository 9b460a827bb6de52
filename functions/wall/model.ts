import { bohmSpeed, meanElectronSpeed } from "../edge/model";
import { e, h, k_B, m_e } from "../matter/constants";
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

/** Flux ¼ n_edge v̄_e exp(V_w/T_e) of electrons that strike the wall, in m⁻² s⁻¹; at V_w ≥ 0 all that come. LL. */
export function electronFlux(n_edge: number, T_e: number, V_w: number): number {
  const random = 0.25 * n_edge * meanElectronSpeed(T_e);
  return V_w < 0 ? random * Math.exp(V_w / T_e) : random;
}

/**
 * Net current density e n_edge [u_B − (1−δ) ¼v̄_e exp(V_w/T_e)] in A/m², positive into the wall. A wall at or above the
 * edge takes back the electrons it emits, so the current jumps at V_w = 0. LL; Hobbs & Wesson (1967) for δ.
 */
export function wallCurrent(V_w: number, n_edge: number, T_e: number, ion: Ion, T_i: number, delta_e: number): number {
  const kept = V_w < 0 ? 1 - delta_e : 1;
  return e * (n_edge * bohmSpeed(T_e, ion, T_i) - kept * electronFlux(n_edge, T_e, V_w));
}

/** The wall potential in V at which wallCurrent is J, where that is below 0; T_e ln[(J_i − J)/((1−δ) ¼e n_edge v̄_e)]. */
export function wallVoltage(J: number, n_edge: number, T_e: number, ion: Ion, T_i: number, delta_e: number): number {
  const electrons = e * n_edge * bohmSpeed(T_e, ion, T_i) - J;
  return T_e * Math.log(electrons / ((1 - delta_e) * e * electronFlux(n_edge, T_e, 0)));
}

/** Directed energy −Z V_w + ½M u_B²/e in eV of ions that strike the wall. LL. */
export function impactEnergy(T_e: number, ion: Ion, T_i: number, V_w: number): number {
  return -ion.charge * V_w + 0.5 * (ion.charge * T_e + T_i);
}

/** Electrons that strike the wall for each ion that does, Z v̄_e/(4u_B) exp(V_w/T_e). */
export function electronsPerIon(T_e: number, ion: Ion, T_i: number, V_w: number): number {
  return ion.charge * electronExcess(T_e, ion, T_i) * Math.exp(V_w / T_e);
}

/** Electrons that strike a floating wall for each ion, of which δ are replaced by emission: Z/(1−δ). */
export function electronsPerIonFloating(ion: Ion, delta_e: number): number {
  return ion.charge / (1 - delta_e);
}

/**
 * Energy in eV brought to the wall per ion: the ion's −Z V_w + ½M u_B²/e + 5/2 T_i, and 2 T_e with each electron.
 * Stangeby (2000).
 */
export function energyPerIon(T_e: number, ion: Ion, T_i: number, V_w: number, electrons: number): number {
  return impactEnergy(T_e, ion, T_i, V_w) + 2.5 * T_i + 2 * T_e * electrons;
}

/** Richardson's constant 4πm e k_B²/h³ in A m⁻² K⁻². */
export const richardsonConstant = ((4 * Math.PI * m_e * e * k_B) / h) * (k_B / h / h);

/** Thermionic current density A T² exp(−eW/(k_B T)) in A/m²; T in K, W in eV. Dushman, Phys. Rev. 21 (1923) 623. */
export function richardsonCurrent(T_wall: number, work_function: number, A_R: number): number {
  return A_R * T_wall * T_wall * Math.exp(-(work_function / T_wall) * kelvinPerElectronvolt);
}

const kelvinPerElectronvolt = e / k_B;

/** Speed Γ Y m/ρ in m/s at which a surface recedes; m in kg the mass of a formula unit, Y in such units per ion. */
export function erosionRate(flux: number, sputter_yield: number, mass: number, density: number): number {
  return (flux * sputter_yield * mass) / density;
}

/** Electrons set free per slow ion by its neutralisation, 0.016 (E_iz − 2W) and never below 0; both in eV. LL. */
export function ionEmission(E_iz: number, work_function: number): number {
  return Math.max(0, 0.016 * (E_iz - 2 * work_function));
}

/** Long columns are mostly at normal incidence, where there is nothing to work out. */
function sine(degrees: number): number {
  return degrees === 90 ? 1 : Math.sin((degrees * Math.PI) / 180);
}
