import { evaluate } from "../cells/evaluate";
import * as entries from "./entries";

/**
 * Thermal gyroradius of one species in a magnetic field: of electrons unless an ion is named.
 * @customfunction GYRORADIUS
 * @helpurl https://localhost:3000/taskpane.html#GYRORADIUS
 * @param T Temperature of that species, eV.
 * @param B Magnetic field, T.
 * @param [ion] Ion as a formula or a mass in u; electrons unless given.
 * @param [unit] Unit of the result, m unless given.
 */
export function GYRORADIUS(T: any[][], B: any[][], ion?: any[][], unit?: any[][]): any[][] {
  return evaluate(entries.GYRORADIUS, [T, B, ion, unit]);
}

/**
 * Width of the magnetic presheath, the layer before a wall in an oblique field where ions turn from the field to the wall.
 * @customfunction MAGNETICPRESHEATHWIDTH
 * @helpurl https://localhost:3000/taskpane.html#MAGNETICPRESHEATHWIDTH
 * @param T_e Electron temperature, eV.
 * @param ion Ion as a formula or a mass in u.
 * @param B Magnetic field, T.
 * @param angle Angle between field line and wall surface, degrees: 90 is along the normal, where the width is 0.
 * @param [T_i] Ion temperature, eV; 0 unless given.
 * @param [unit] Unit of the result, m unless given.
 */
export function MAGNETICPRESHEATHWIDTH(
  T_e: any[][],
  ion: any[][],
  B: any[][],
  angle: any[][],
  T_i?: any[][],
  unit?: any[][],
): any[][] {
  return evaluate(entries.MAGNETICPRESHEATHWIDTH, [T_e, ion, B, angle, T_i, unit]);
}

/**
 * Potential drop across the magnetic presheath, a magnitude. It is part of the floating drop, not added to it: the Debye
 * sheath keeps the rest.
 * @customfunction MAGNETICPRESHEATHDROP
 * @helpurl https://localhost:3000/taskpane.html#MAGNETICPRESHEATHDROP
 * @param T_e Electron temperature, eV.
 * @param angle Angle between field line and wall surface, degrees: 90 is along the normal, where the drop is 0.
 * @param [unit] Unit of the result, V unless given.
 */
export function MAGNETICPRESHEATHDROP(T_e: any[][], angle: any[][], unit?: any[][]): any[][] {
  return evaluate(entries.MAGNETICPRESHEATHDROP, [T_e, angle, unit]);
}

/**
 * Angle between field line and wall surface below which no Debye sheath remains: the magnetic presheath then carries the
 * whole floating drop.
 * @customfunction GRAZINGLIMIT
 * @helpurl https://localhost:3000/taskpane.html#GRAZINGLIMIT
 * @param ion Ion as a formula or a mass in u.
 * @param [T_e] Electron temperature, eV; needed where T_i is given, since only their ratio counts.
 * @param [T_i] Ion temperature, eV; 0 unless given.
 * @param [unit] Unit of the result, degrees unless given.
 */
export function GRAZINGLIMIT(ion: any[][], T_e?: any[][], T_i?: any[][], unit?: any[][]): any[][] {
  return evaluate(entries.GRAZINGLIMIT, [ion, T_e, T_i, unit]);
}
