import { evaluate } from "../cells/evaluate";
import * as entries from "./entries";

/**
 * How ions move through an RF sheath.
 * @customenum {string}
 */
export enum RfChildModel {
  /** Free fall through the mean potential. */
  collisionless = "collisionless",
  /** Many collisions, a mean free path that does not depend on speed. */
  collisional = "collisional",
}

/**
 * Shift of a floating wall's mean potential by a sinusoidal RF voltage across its sheath: negative, as RF draws extra electrons.
 * @customfunction RFFLOATINGSHIFT
 * @helpurl https://localhost:3000/taskpane.html#RFFLOATINGSHIFT
 * @param V_rf Zero-to-peak amplitude across the sheath, V; "300 Vpp" and "120 Vrms" are converted. 0 is no RF.
 * @param T_e Electron temperature, eV.
 * @param [unit] Unit of the result, V unless given.
 */
export function RFFLOATINGSHIFT(V_rf: any[][], T_e: any[][], unit?: any[][]): any[][] {
  return evaluate(entries.RFFLOATINGSHIFT, [V_rf, T_e, unit]);
}

/**
 * Full width of the energy distribution of ions that reach an RF-driven wall without collisions; never more than 2 Z V_rf.
 * @customfunction IONENERGYSPREAD
 * @helpurl https://localhost:3000/taskpane.html#IONENERGYSPREAD
 * @param V_dc Mean voltage across the sheath, V; its sign is ignored.
 * @param V_rf Zero-to-peak amplitude across the sheath, V; "300 Vpp" and "120 Vrms" are converted.
 * @param s Time-averaged width of the sheath, m.
 * @param f Frequency, Hz.
 * @param ion Ion as a formula or a mass in u.
 * @param [unit] Unit of the result, eV unless given.
 */
export function IONENERGYSPREAD(
  V_dc: any[][],
  V_rf: any[][],
  s: any[][],
  f: any[][],
  ion: any[][],
  unit?: any[][],
): any[][] {
  return evaluate(entries.IONENERGYSPREAD, [V_dc, V_rf, s, f, ion, unit]);
}

/**
 * Ion current density that an RF sheath of a given largest width carries: Child's law averaged over the cycle.
 * @customfunction RFCHILDCURRENT
 * @helpurl https://localhost:3000/taskpane.html#RFCHILDCURRENT
 * @param V_dc Mean voltage across the sheath, V; its sign is ignored.
 * @param s_m Largest width of the sheath in a cycle, m.
 * @param ion Ion as a formula or a mass in u.
 * @param [model] "collisionless" unless given, or "collisional", which needs lambda_i.
 * @param [lambda_i] Ion mean free path, m.
 * @param [unit] Unit of the result, A/m² unless given.
 */
export function RFCHILDCURRENT(
  V_dc: any[][],
  s_m: any[][],
  ion: any[][],
  model?: RfChildModel[][],
  lambda_i?: any[][],
  unit?: any[][],
): any[][] {
  return evaluate(entries.RFCHILDCURRENT, [V_dc, s_m, ion, model, lambda_i, unit]);
}

/**
 * Largest width that a collisionless RF sheath reaches in a cycle.
 * @customfunction RFSHEATHWIDTH
 * @helpurl https://localhost:3000/taskpane.html#RFSHEATHWIDTH
 * @param V_dc Mean voltage across the sheath, V; its sign is ignored.
 * @param n_edge Electron density at the sheath edge, m⁻³.
 * @param T_e Electron temperature, eV.
 * @param [unit] Unit of the result, m unless given.
 */
export function RFSHEATHWIDTH(V_dc: any[][], n_edge: any[][], T_e: any[][], unit?: any[][]): any[][] {
  return evaluate(entries.RFSHEATHWIDTH, [V_dc, n_edge, T_e, unit]);
}

/**
 * Slope resistance of a floating wall's sheath times its area: small change of voltage over change of current density.
 * @customfunction SHEATHRESISTANCE
 * @helpurl https://localhost:3000/taskpane.html#SHEATHRESISTANCE
 * @param n_bulk Electron density of the plasma body, m⁻³.
 * @param T_e Electron temperature, eV.
 * @param ion Ion as a formula or a mass in u.
 * @param [edge_ratio] Density at the sheath edge over that of the body, 0 to 1; exp(-1/2) unless given.
 * @param [unit] Unit of the result, Ω m² unless given.
 */
export function SHEATHRESISTANCE(
  n_bulk: any[][],
  T_e: any[][],
  ion: any[][],
  edge_ratio?: any[][],
  unit?: any[][],
): any[][] {
  return evaluate(entries.SHEATHRESISTANCE, [n_bulk, T_e, ion, edge_ratio, unit]);
}
