import { evaluate } from "../cells/evaluate";
import * as entries from "./entries";

/**
 * Where a potential is counted from.
 * @customenum {string}
 */
export enum ReferencePoint {
  /** The sheath edge, where ions reach the Bohm speed. */
  edge = "edge",
  /** The plasma's body: the presheath's drop is included. */
  plasma = "plasma",
}

/**
 * Floating potential: the potential at which a wall draws no net current, negative where it repels electrons.
 * @customfunction FLOATINGPOTENTIAL
 * @helpurl https://localhost:3000/taskpane.html#FLOATINGPOTENTIAL
 * @param T_e Electron temperature, eV.
 * @param ion Ion as a formula or a mass in u.
 * @param [T_i] Ion temperature, eV; 0 unless given.
 * @param [delta_e] Electrons emitted per electron that strikes the wall; 0 unless given, below the limit of EMISSIONLIMIT.
 * @param [from] Where it is counted from: "edge" unless given, or "plasma".
 * @param [edge_ratio] Density at the sheath edge over that of the body, 0 to 1; exp(-1/2) unless given; used from "plasma" only.
 * @param [unit] Unit of the result, V unless given.
 */
export function FLOATINGPOTENTIAL(
  T_e: any[][],
  ion: any[][],
  T_i?: any[][],
  delta_e?: any[][],
  from?: ReferencePoint[][],
  edge_ratio?: any[][],
  unit?: any[][],
): any[][] {
  return evaluate(entries.FLOATINGPOTENTIAL, [T_e, ion, T_i, delta_e, from, edge_ratio, unit]);
}

/**
 * Flux of ions to a wall.
 * @customfunction WALLFLUX
 * @helpurl https://localhost:3000/taskpane.html#WALLFLUX
 * @param n_bulk Electron density of the plasma's body, m⁻³.
 * @param T_e Electron temperature, eV.
 * @param ion Ion as a formula or a mass in u.
 * @param [T_i] Ion temperature, eV; 0 unless given.
 * @param [edge_ratio] Density at the sheath edge over that of the body, 0 to 1; exp(-1/2) unless given.
 * @param [angle] Angle between a strong magnetic field and the wall, degrees; 90 unless given, and a 0 counts as not given.
 * @param [unit] Unit of the result, m⁻² s⁻¹ unless given.
 */
export function WALLFLUX(
  n_bulk: any[][],
  T_e: any[][],
  ion: any[][],
  T_i?: any[][],
  edge_ratio?: any[][],
  angle?: any[][],
  unit?: any[][],
): any[][] {
  return evaluate(entries.WALLFLUX, [n_bulk, T_e, ion, T_i, edge_ratio, angle, unit]);
}

/**
 * Current density of ions to a wall.
 * @customfunction IONCURRENTDENSITY
 * @helpurl https://localhost:3000/taskpane.html#IONCURRENTDENSITY
 * @param n_bulk Electron density of the plasma's body, m⁻³.
 * @param T_e Electron temperature, eV.
 * @param ion Ion as a formula or a mass in u.
 * @param [T_i] Ion temperature, eV; 0 unless given.
 * @param [edge_ratio] Density at the sheath edge over that of the body, 0 to 1; exp(-1/2) unless given.
 * @param [angle] Angle between a strong magnetic field and the wall, degrees; 90 unless given, and a 0 counts as not given.
 * @param [unit] Unit of the result, A/m² unless given.
 */
export function IONCURRENTDENSITY(
  n_bulk: any[][],
  T_e: any[][],
  ion: any[][],
  T_i?: any[][],
  edge_ratio?: any[][],
  angle?: any[][],
  unit?: any[][],
): any[][] {
  return evaluate(entries.IONCURRENTDENSITY, [n_bulk, T_e, ion, T_i, edge_ratio, angle, unit]);
}

/**
 * Flux of electrons that strike a wall; above the sheath edge potential it stays at the random flux.
 * @customfunction ELECTRONFLUX
 * @helpurl https://localhost:3000/taskpane.html#ELECTRONFLUX
 * @param n_bulk Electron density of the plasma's body, m⁻³.
 * @param T_e Electron temperature, eV.
 * @param V_w Potential of the wall relative to the sheath edge, V; negative where it repels electrons.
 * @param [edge_ratio] Density at the sheath edge over that of the body, 0 to 1; exp(-1/2) unless given.
 * @param [unit] Unit of the result, m⁻² s⁻¹ unless given.
 */
export function ELECTRONFLUX(
  n_bulk: any[][],
  T_e: any[][],
  V_w: any[][],
  edge_ratio?: any[][],
  unit?: any[][],
): any[][] {
  return evaluate(entries.ELECTRONFLUX, [n_bulk, T_e, V_w, edge_ratio, unit]);
}

/**
 * Net current density to a wall, positive where ions prevail. Above the sheath edge potential the wall takes back what it emits.
 * @customfunction WALLCURRENT
 * @helpurl https://localhost:3000/taskpane.html#WALLCURRENT
 * @param V_w Potential of the wall relative to the sheath edge, V; negative where it repels electrons.
 * @param n_bulk Electron density of the plasma's body, m⁻³.
 * @param T_e Electron temperature, eV.
 * @param ion Ion as a formula or a mass in u.
 * @param [T_i] Ion temperature, eV; 0 unless given.
 * @param [edge_ratio] Density at the sheath edge over that of the body, 0 to 1; exp(-1/2) unless given.
 * @param [delta_e] Electrons emitted per electron that strikes the wall; 0 unless given.
 * @param [unit] Unit of the result, A/m² unless given.
 */
export function WALLCURRENT(
  V_w: any[][],
  n_bulk: any[][],
  T_e: any[][],
  ion: any[][],
  T_i?: any[][],
  edge_ratio?: any[][],
  delta_e?: any[][],
  unit?: any[][],
): any[][] {
  return evaluate(entries.WALLCURRENT, [V_w, n_bulk, T_e, ion, T_i, edge_ratio, delta_e, unit]);
}

/**
 * Potential at which a wall draws a given net current: the inverse of WALLCURRENT where the wall repels electrons.
 * @customfunction WALLVOLTAGE
 * @helpurl https://localhost:3000/taskpane.html#WALLVOLTAGE
 * @param J Net current density into the wall, A/m²; positive where ions prevail, below their saturation current.
 * @param n_bulk Electron density of the plasma's body, m⁻³.
 * @param T_e Electron temperature, eV.
 * @param ion Ion as a formula or a mass in u.
 * @param [T_i] Ion temperature, eV; 0 unless given.
 * @param [edge_ratio] Density at the sheath edge over that of the body, 0 to 1; exp(-1/2) unless given.
 * @param [delta_e] Electrons emitted per electron that strikes the wall; 0 unless given, below the limit of EMISSIONLIMIT.
 * @param [unit] Unit of the result, V unless given.
 */
export function WALLVOLTAGE(
  J: any[][],
  n_bulk: any[][],
  T_e: any[][],
  ion: any[][],
  T_i?: any[][],
  edge_ratio?: any[][],
  delta_e?: any[][],
  unit?: any[][],
): any[][] {
  return evaluate(entries.WALLVOLTAGE, [J, n_bulk, T_e, ion, T_i, edge_ratio, delta_e, unit]);
}

/**
 * Directed energy with which ions strike a wall after a sheath without collisions.
 * @customfunction IONIMPACTENERGY
 * @helpurl https://localhost:3000/taskpane.html#IONIMPACTENERGY
 * @param T_e Electron temperature, eV.
 * @param ion Ion as a formula or a mass in u.
 * @param [T_i] Ion temperature, eV; 0 unless given.
 * @param [V_w] Potential of the wall relative to the sheath edge, V, 0 or below; or "floating", as when blank.
 * @param [unit] Unit of the result, eV unless given.
 */
export function IONIMPACTENERGY(T_e: any[][], ion: any[][], T_i?: any[][], V_w?: any[][], unit?: any[][]): any[][] {
  return evaluate(entries.IONIMPACTENERGY, [T_e, ion, T_i, V_w, unit]);
}

/**
 * Heat flux that ions and electrons bring to a wall; light from the plasma, fast neutrals and reflected ions are left out.
 * @customfunction WALLHEATFLUX
 * @helpurl https://localhost:3000/taskpane.html#WALLHEATFLUX
 * @param n_bulk Electron density of the plasma's body, m⁻³.
 * @param T_e Electron temperature, eV.
 * @param ion Ion as a formula or a mass in u.
 * @param [T_i] Ion temperature, eV; 0 unless given.
 * @param [V_w] Potential of the wall relative to the sheath edge, V, 0 or below; or "floating", as when blank.
 * @param [edge_ratio] Density at the sheath edge over that of the body, 0 to 1; exp(-1/2) unless given.
 * @param [delta_e] Electrons emitted per electron that strikes the wall; 0 unless given.
 * @param [surface_energy] Energy that each ion sets free on the surface (neutralisation, recombination), eV; 0 unless given.
 * @param [angle] Angle between a strong magnetic field and the wall, degrees; 90 unless given, and a 0 counts as not given.
 * @param [unit] Unit of the result, W/m² unless given.
 */
export function WALLHEATFLUX(
  n_bulk: any[][],
  T_e: any[][],
  ion: any[][],
  T_i?: any[][],
  V_w?: any[][],
  edge_ratio?: any[][],
  delta_e?: any[][],
  surface_energy?: any[][],
  angle?: any[][],
  unit?: any[][],
): any[][] {
  return evaluate(entries.WALLHEATFLUX, [n_bulk, T_e, ion, T_i, V_w, edge_ratio, delta_e, surface_energy, angle, unit]);
}

/**
 * Sheath heat transmission factor: heat flux to the wall over that of the ions carrying one T_e each. The directed energy
 * of the ions at the edge counts; the usual 7 to 8 for hydrogen leaves it out and is 1 lower at T_i = T_e.
 * @customfunction HEATFACTOR
 * @helpurl https://localhost:3000/taskpane.html#HEATFACTOR
 * @param T_e Electron temperature, eV.
 * @param ion Ion as a formula or a mass in u.
 * @param [T_i] Ion temperature, eV; 0 unless given.
 * @param [V_w] Potential of the wall relative to the sheath edge, V, 0 or below; or "floating", as when blank.
 * @param [delta_e] Electrons emitted per electron that strikes the wall; 0 unless given.
 */
export function HEATFACTOR(T_e: any[][], ion: any[][], T_i?: any[][], V_w?: any[][], delta_e?: any[][]): any[][] {
  return evaluate(entries.HEATFACTOR, [T_e, ion, T_i, V_w, delta_e]);
}

/**
 * Space-charge limit of electron emission from a floating wall: the largest yield, the drop from the sheath edge to the
 * wall in T_e, and the energy per charge of the ions at the edge in T_e, side by side. The ions are cold; the electrons of
 * the plasma are taken in full equilibrium, though those that reach the wall do not return.
 * @customfunction EMISSIONLIMIT
 * @helpurl https://localhost:3000/taskpane.html#EMISSIONLIMIT
 * @param ion Ion as a formula or a mass in u; only its mass over its charge matters.
 */
export function EMISSIONLIMIT(ion: any[][]): any[][] {
  return evaluate(entries.EMISSIONLIMIT, [ion]);
}

/**
 * Thermionic current density of a hot wall: all that leaves it, before space charge turns any back.
 * @customfunction RICHARDSONCURRENT
 * @helpurl https://localhost:3000/taskpane.html#RICHARDSONCURRENT
 * @param T_wall Temperature of the wall, K.
 * @param work_function Work function of the wall, eV.
 * @param [A_R] Richardson constant, A m⁻² K⁻²; 1.20173e6, that of free electrons, unless given.
 * @param [unit] Unit of the result, A/m² unless given.
 */
export function RICHARDSONCURRENT(T_wall: any[][], work_function: any[][], A_R?: any[][], unit?: any[][]): any[][] {
  return evaluate(entries.RICHARDSONCURRENT, [T_wall, work_function, A_R, unit]);
}

/**
 * Speed at which a sputtered surface recedes.
 * @customfunction EROSIONRATE
 * @helpurl https://localhost:3000/taskpane.html#EROSIONRATE
 * @param flux Flux of ions to the wall, m⁻² s⁻¹.
 * @param sputter_yield Formula units of the surface removed per ion.
 * @param formula What the surface is made of, such as Si or Al2O3, or the mass of a formula unit in u.
 * @param density Mass density of the surface, kg/m³.
 * @param [unit] Unit of the result, m/s unless given; nm/min for instance.
 */
export function EROSIONRATE(
  flux: any[][],
  sputter_yield: any[][],
  formula: any[][],
  density: any[][],
  unit?: any[][],
): any[][] {
  return evaluate(entries.EROSIONRATE, [flux, sputter_yield, formula, density, unit]);
}

/**
 * Electron-induced yield of a wall, averaged over the Maxwellian electrons that strike it, by the universal curve.
 * @customfunction EMISSIONYIELD
 * @helpurl https://localhost:3000/taskpane.html#EMISSIONYIELD
 * @param T_e Electron temperature, eV.
 * @param delta_max Largest yield of the material over all energies.
 * @param E_max Energy of the striking electron at which the yield is largest, eV.
 */
export function EMISSIONYIELD(T_e: any[][], delta_max: any[][], E_max: any[][]): any[][] {
  return evaluate(entries.EMISSIONYIELD, [T_e, delta_max, E_max]);
}

/**
 * Electrons that a slow ion sets free from a clean metal as it is neutralised: an estimate. Fast ions and dirty walls give more.
 * @customfunction IONEMISSION
 * @helpurl https://localhost:3000/taskpane.html#IONEMISSION
 * @param E_iz Ionisation energy of the ion's atom, eV.
 * @param work_function Work function of the wall, eV.
 */
export function IONEMISSION(E_iz: any[][], work_function: any[][]): any[][] {
  return evaluate(entries.IONEMISSION, [E_iz, work_function]);
}
