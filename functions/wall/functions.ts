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
 * @param [angle] Angle between a strong magnetic field and the wall, degrees; 90 unless given.
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
 * @param [angle] Angle between a strong magnetic field and the wall, degrees; 90 unless given.
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
