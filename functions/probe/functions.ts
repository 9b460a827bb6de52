import { evaluate } from "../cells/evaluate";
import * as entries from "./entries";

/**
 * From where a plasma potential counts.
 * @customenum {string}
 */
export enum ProbeReference {
  /** The plasma's body: the presheath's drop is included. */
  plasma = "plasma",
  /** The sheath edge: the presheath's drop is left out. */
  edge = "edge",
}

/**
 * What a fitted sweep says, one name for each column.
 * @customenum {string}
 */
export enum ProbePart {
  /** The sweep's number. */
  sweep = "sweep",
  /** Electron temperature, eV. */
  T_e = "T_e",
  /** Its standard error, eV. */
  T_e_error = "T_e_error",
  /** Floating potential, V. */
  V_f = "V_f",
  /** Its standard error, V. */
  V_f_error = "V_f_error",
  /** Plasma potential, V. */
  V_p = "V_p",
  /** Its standard error, V. */
  V_p_error = "V_p_error",
  /** How it was found: "knee" or "floating". */
  V_p_from = "V_p_from",
  /** Ion current at the floating potential, A. */
  I_sat = "I_sat",
  /** Its standard error, A. */
  I_sat_error = "I_sat_error",
  /** Density of the plasma's body, m⁻³. */
  n_bulk = "n_bulk",
  /** Its standard error, m⁻³. */
  n_bulk_error = "n_bulk_error",
  /** Lowest voltage of the window fitted, V. */
  window_from = "window_from",
  /** Highest voltage of the window fitted, V. */
  window_to = "window_to",
  /** Points fitted. */
  points = "points",
  /** Why a value is missing or doubtful, and what was done to the readings. */
  remarks = "remarks",
}

/**
 * Plasma density from the ion current of a probe whose sheath is thin beside it.
 * @customfunction PROBEDENSITY
 * @helpurl https://localhost:3000/taskpane.html#PROBEDENSITY
 * @param I_sat Ion saturation current, A; its sign is ignored.
 * @param area Collecting area, m².
 * @param T_e Electron temperature, eV.
 * @param ion Ion as a formula or a mass in u.
 * @param [edge_ratio] Density at the sheath edge over that of the body, 0 to 1; exp(-1/2) unless given, 0.5 is usual too.
 * @param [gamma_ion] Electrons that the probe emits per ion; 0 unless given.
 * @param [radius] Radius of the probe, m: only for the check that the sheath is thin.
 * @param [unit] Unit of the result, m⁻³ unless given.
 */
export function PROBEDENSITY(
  I_sat: any[][],
  area: any[][],
  T_e: any[][],
  ion: any[][],
  edge_ratio?: any[][],
  gamma_ion?: any[][],
  radius?: any[][],
  unit?: any[][],
): any[][] {
  return evaluate(entries.PROBEDENSITY, [I_sat, area, T_e, ion, edge_ratio, gamma_ion, radius, unit]);
}

/**
 * Electron temperature from the distance between plasma and floating potential.
 * @customfunction PROBETEMPERATURE
 * @helpurl https://localhost:3000/taskpane.html#PROBETEMPERATURE
 * @param V_p Plasma potential, V.
 * @param V_f Floating potential, V, against the same ground.
 * @param ion Ion as a formula or a mass in u.
 * @param [from] What V_p is the potential of: the "plasma" unless given, or the sheath "edge".
 * @param [edge_ratio] Density at the sheath edge over that of the body, 0 to 1; exp(-1/2) unless given; used from "plasma" only.
 * @param [unit] Unit of the result, eV unless given.
 */
export function PROBETEMPERATURE(
  V_p: any[][],
  V_f: any[][],
  ion: any[][],
  from?: ProbeReference[][],
  edge_ratio?: any[][],
  unit?: any[][],
): any[][] {
  return evaluate(entries.PROBETEMPERATURE, [V_p, V_f, ion, from, edge_ratio, unit]);
}

/**
 * Ion current of a wire much thinner than the Debye length, which ions reach on open orbits.
 * @customfunction ORBITALCURRENT
 * @helpurl https://localhost:3000/taskpane.html#ORBITALCURRENT
 * @param V Voltage between plasma and wire, V; its sign is ignored, the wire attracts ions.
 * @param n_bulk Electron density of the plasma's body, m⁻³.
 * @param radius Radius of the wire, m.
 * @param length Length of the wire, m.
 * @param ion Ion as a formula or a mass in u.
 * @param [unit] Unit of the result, A unless given.
 */
export function ORBITALCURRENT(
  V: any[][],
  n_bulk: any[][],
  radius: any[][],
  length: any[][],
  ion: any[][],
  unit?: any[][],
): any[][] {
  return evaluate(entries.ORBITALCURRENT, [V, n_bulk, radius, length, ion, unit]);
}

/**
 * Plasma density from the ion current of a wire much thinner than the Debye length: the inverse of ORBITALCURRENT.
 * @customfunction ORBITALDENSITY
 * @helpurl https://localhost:3000/taskpane.html#ORBITALDENSITY
 * @param I Ion current, A; its sign is ignored.
 * @param V Voltage between plasma and wire, V; its sign is ignored.
 * @param radius Radius of the wire, m.
 * @param length Length of the wire, m.
 * @param ion Ion as a formula or a mass in u.
 * @param [unit] Unit of the result, m⁻³ unless given.
 */
export function ORBITALDENSITY(
  I: any[][],
  V: any[][],
  radius: any[][],
  length: any[][],
  ion: any[][],
  unit?: any[][],
): any[][] {
  return evaluate(entries.ORBITALDENSITY, [I, V, radius, length, ion, unit]);
}

/**
 * Electron temperature, floating and plasma potential, ion current and density from swept probe characteristics, each with
 * its standard error. Spills one row for each sweep; where a sweep cannot support a fit the row says why. Readings may be
 * noisy, unsorted and of either sign. A constant offset of the current shifts V_f and I_sat but not T_e.
 * @customfunction PROBEFIT
 * @helpurl https://localhost:3000/taskpane.html#PROBEFIT
 * @param V Column of probe voltages, V.
 * @param I Column of probe currents, A; electrons may count positive or negative.
 * @param [sweep] Column that numbers the sweeps, one number or name for each reading; blank is one sweep.
 * @param [area] Collecting area, m²; wanted for the density.
 * @param [ion] Ion as a formula or a mass in u; wanted for the density, and for V_p where the sweep has no knee.
 * @param [part] Name of one column to return instead of all, such as "T_e".
 */
export function PROBEFIT(
  V: any[][],
  I: any[][],
  sweep?: any[][],
  area?: any[][],
  ion?: any[][],
  part?: ProbePart[][],
): any[][] {
  return evaluate(entries.PROBEFIT, [V, I, sweep, area, ion, part]);
}
