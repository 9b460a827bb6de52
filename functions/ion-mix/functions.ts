import { evaluate } from "../cells/evaluate";
import * as entries from "./entries";

/**
 * How fast the species of a mixture leave.
 * @customenum {string}
 */
export enum IonMixRule {
  /** All at one speed: comparable densities, electrons far hotter than ions. */
  common = "common",
  /** Each at its own Bohm speed: a minority of one species, weak coupling. */
  own = "own",
}

/**
 * Speeds of several ion species at the sheath edge: one row each with ion, speed in m/s, and speed over its own Bohm speed.
 * @customfunction IONMIXSPEEDS
 * @helpurl https://localhost:3000/taskpane.html#IONMIXSPEEDS
 * @param T_e Electron temperature, eV.
 * @param ions A range of ions, formulas or masses in u; blank rows are skipped.
 * @param fractions A range of the same size: density of each ion at the edge over that of the electrons, so that Z times fraction sums to 1.
 * @param [rule] "common" unless given, one speed for all; or "own", each at its own Bohm speed.
 */
export function IONMIXSPEEDS(T_e: any[][], ions: any[][], fractions: any[][], rule?: IonMixRule[][]): any[][] {
  return evaluate(entries.IONMIXSPEEDS, [T_e, ions, fractions, rule]);
}

/**
 * Fluxes of several ion species to a wall: one row each with ion, flux in m⁻² s⁻¹, and current density in A/m².
 * @customfunction IONMIXFLUXES
 * @helpurl https://localhost:3000/taskpane.html#IONMIXFLUXES
 * @param n_bulk Electron density of the plasma body, m⁻³.
 * @param T_e Electron temperature, eV.
 * @param ions A range of ions, formulas or masses in u; blank rows are skipped.
 * @param fractions A range of the same size: density of each ion at the edge over that of the electrons, so that Z times fraction sums to 1.
 * @param [rule] "common" unless given, one speed for all; or "own", each at its own Bohm speed.
 * @param [edge_ratio] Density at the sheath edge over that of the body, 0 to 1; exp(-1/2) unless given.
 */
export function IONMIXFLUXES(
  n_bulk: any[][],
  T_e: any[][],
  ions: any[][],
  fractions: any[][],
  rule?: IonMixRule[][],
  edge_ratio?: any[][],
): any[][] {
  return evaluate(entries.IONMIXFLUXES, [n_bulk, T_e, ions, fractions, rule, edge_ratio]);
}
