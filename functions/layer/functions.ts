import { evaluate } from "../cells/evaluate";
import * as entries from "./entries";

/**
 * Ways to reckon the width of a sheath.
 * @customenum {string}
 */
export enum SheathModel {
  /** Child's law at the Bohm flux, without electrons. */
  child = "child",
  /** The ions still where they were when the electrons left. */
  matrix = "matrix",
  /** The nonlinear solution with electrons, up to where the net charge falls to 1 %. */
  full = "full",
  /** Ions with a constant mean free path; needs lambda_i. */
  collisional = "collisional",
}

/**
 * How ions cross the sheath.
 * @customenum {string}
 */
export enum IonMotion {
  /** Falling freely. */
  collisionless = "collisionless",
  /** With a constant mean free path; needs lambda_i. */
  collisional = "collisional",
}

/**
 * Width of the sheath in front of a wall, by Child's law, as a matrix sheath, from the full nonlinear solution or with ion collisions.
 * @customfunction SHEATHWIDTH
 * @helpurl https://localhost:3000/taskpane.html#SHEATHWIDTH
 * @param V_s Potential drop across the sheath, V; its sign is ignored.
 * @param n_edge Electron density at the sheath edge, m⁻³.
 * @param T_e Electron temperature, eV.
 * @param [model] "child" unless given, "matrix", "full" (to where the net charge falls to 1 % of that of the electrons at the edge) or "collisional".
 * @param [lambda_i] Ion mean free path, m; needed by "collisional", elsewhere only checked against the width.
 * @param [unit] Unit of the result, m unless given.
 */
export function SHEATHWIDTH(
  V_s: any[][],
  n_edge: any[][],
  T_e: any[][],
  model?: SheathModel[][],
  lambda_i?: any[][],
  unit?: any[][],
): any[][] {
  return evaluate(entries.SHEATHWIDTH, [V_s, n_edge, T_e, model, lambda_i, unit]);
}

/**
 * Ion current density that space charge lets through a sheath of given voltage and width: Child's law.
 * @customfunction CHILDCURRENT
 * @helpurl https://localhost:3000/taskpane.html#CHILDCURRENT
 * @param V_s Potential drop across the sheath, V; its sign is ignored.
 * @param s Width of the sheath, m.
 * @param ion Ion as a formula or a mass in u.
 * @param [model] "collisionless" unless given, or "collisional".
 * @param [lambda_i] Ion mean free path, m; needed by "collisional".
 * @param [unit] Unit of the result, A/m² unless given.
 */
export function CHILDCURRENT(
  V_s: any[][],
  s: any[][],
  ion: any[][],
  model?: IonMotion[][],
  lambda_i?: any[][],
  unit?: any[][],
): any[][] {
  return evaluate(entries.CHILDCURRENT, [V_s, s, ion, model, lambda_i, unit]);
}

/**
 * Width of the sheath through which space charge lets a given ion current: the inverse of CHILDCURRENT.
 * @customfunction CHILDWIDTH
 * @helpurl https://localhost:3000/taskpane.html#CHILDWIDTH
 * @param V_s Potential drop across the sheath, V; its sign is ignored.
 * @param J Ion current density into the wall, A/m², above 0.
 * @param ion Ion as a formula or a mass in u.
 * @param [model] "collisionless" unless given, or "collisional".
 * @param [lambda_i] Ion mean free path, m; needed by "collisional".
 * @param [unit] Unit of the result, m unless given.
 */
export function CHILDWIDTH(
  V_s: any[][],
  J: any[][],
  ion: any[][],
  model?: IonMotion[][],
  lambda_i?: any[][],
  unit?: any[][],
): any[][] {
  return evaluate(entries.CHILDWIDTH, [V_s, J, ion, model, lambda_i, unit]);
}

/**
 * Electric field at the wall, directed into it, from the nonlinear sheath with electrons.
 * @customfunction WALLFIELD
 * @helpurl https://localhost:3000/taskpane.html#WALLFIELD
 * @param V_s Potential drop across the sheath, V; its sign is ignored.
 * @param n_edge Electron density at the sheath edge, m⁻³.
 * @param T_e Electron temperature, eV.
 * @param [u_ratio] Ion speed at the sheath edge over the Bohm speed, 1 or more; 1 unless given.
 * @param [unit] Unit of the result, V/m unless given.
 */
export function WALLFIELD(V_s: any[][], n_edge: any[][], T_e: any[][], u_ratio?: any[][], unit?: any[][]): any[][] {
  return evaluate(entries.WALLFIELD, [V_s, n_edge, T_e, u_ratio, unit]);
}

/**
 * Potential inside the nonlinear sheath at a distance from the wall, relative to the sheath edge: negative, and rising to 0 far from the wall.
 * @customfunction SHEATHPOTENTIAL
 * @helpurl https://localhost:3000/taskpane.html#SHEATHPOTENTIAL
 * @param x Distance from the wall, m.
 * @param V_s Potential drop across the sheath, V; its sign is ignored.
 * @param n_edge Electron density at the sheath edge, m⁻³.
 * @param T_e Electron temperature, eV.
 * @param [u_ratio] Ion speed at the sheath edge over the Bohm speed, 1 or more; 1 unless given.
 * @param [unit] Unit of the result, V unless given.
 */
export function SHEATHPOTENTIAL(
  x: any[][],
  V_s: any[][],
  n_edge: any[][],
  T_e: any[][],
  u_ratio?: any[][],
  unit?: any[][],
): any[][] {
  return evaluate(entries.SHEATHPOTENTIAL, [x, V_s, n_edge, T_e, u_ratio, unit]);
}

/**
 * Spills the nonlinear sheath from the wall to where its net charge falls to 1 %: distance, potential relative to the edge, field, charge density of the ions over e, electron density, and ion speed over the Bohm speed. The potential changes by the same factor from row to row.
 * @customfunction SHEATHPROFILE
 * @helpurl https://localhost:3000/taskpane.html#SHEATHPROFILE
 * @param V_s Potential drop across the sheath, V; its sign is ignored.
 * @param n_edge Electron density at the sheath edge, m⁻³.
 * @param T_e Electron temperature, eV.
 * @param [u_ratio] Ion speed at the sheath edge over the Bohm speed, 1 or more; 1 unless given.
 * @param [points] Number of rows, 2 to 2000; 50 unless given.
 * @param [header] TRUE adds a row of titles on top; FALSE unless given.
 */
export function SHEATHPROFILE(
  V_s: any[][],
  n_edge: any[][],
  T_e: any[][],
  u_ratio?: any[][],
  points?: any[][],
  header?: any[][],
): any[][] {
  return evaluate(entries.SHEATHPROFILE, [V_s, n_edge, T_e, u_ratio, points, header]);
}

/**
 * Time an ion takes to cross a collisionless sheath that follows Child's law.
 * @customfunction IONTRANSITTIME
 * @helpurl https://localhost:3000/taskpane.html#IONTRANSITTIME
 * @param V_s Potential drop across the sheath, V; its sign is ignored.
 * @param s Width of the sheath, m.
 * @param ion Ion as a formula or a mass in u.
 * @param [unit] Unit of the result, s unless given.
 */
export function IONTRANSITTIME(V_s: any[][], s: any[][], ion: any[][], unit?: any[][]): any[][] {
  return evaluate(entries.IONTRANSITTIME, [V_s, s, ion, unit]);
}

/**
 * Capacitance of the sheath per wall area: how the charge in the nonlinear sheath answers a slow change of voltage.
 * @customfunction SHEATHCAPACITANCE
 * @helpurl https://localhost:3000/taskpane.html#SHEATHCAPACITANCE
 * @param V_s Potential drop across the sheath, V; its sign is ignored.
 * @param n_edge Electron density at the sheath edge, m⁻³.
 * @param T_e Electron temperature, eV.
 * @param [u_ratio] Ion speed at the sheath edge over the Bohm speed, 1 or more; 1 unless given.
 * @param [unit] Unit of the result, F/m² unless given.
 */
export function SHEATHCAPACITANCE(
  V_s: any[][],
  n_edge: any[][],
  T_e: any[][],
  u_ratio?: any[][],
  unit?: any[][],
): any[][] {
  return evaluate(entries.SHEATHCAPACITANCE, [V_s, n_edge, T_e, u_ratio, unit]);
}

/**
 * Width of the sheath some time after a voltage step, from the matrix sheath growing to the Child width.
 * @customfunction PULSEDWIDTH
 * @helpurl https://localhost:3000/taskpane.html#PULSEDWIDTH
 * @param V_s Potential drop across the sheath, V; its sign is ignored.
 * @param n_edge Electron density at the sheath edge, m⁻³.
 * @param T_e Electron temperature, eV.
 * @param ion Ion as a formula or a mass in u.
 * @param t Time since the voltage was switched on, s.
 * @param [unit] Unit of the result, m unless given.
 */
export function PULSEDWIDTH(
  V_s: any[][],
  n_edge: any[][],
  T_e: any[][],
  ion: any[][],
  t: any[][],
  unit?: any[][],
): any[][] {
  return evaluate(entries.PULSEDWIDTH, [V_s, n_edge, T_e, ion, t, unit]);
}

/**
 * Spills the energies with which singly charged ions strike the wall after charge exchange with their gas: bins of equal width with their middle and the mean density in each, then one row for the primaries, which cross without a collision and strike with all of V_s. Densities times the width of a bin, plus the primaries, add up to 1.
 * @customfunction IMPACTDISTRIBUTION
 * @helpurl https://localhost:3000/taskpane.html#IMPACTDISTRIBUTION
 * @param V_s Potential drop across the sheath, V; its sign is ignored.
 * @param s Width of the sheath, m.
 * @param lambda_i Mean free path for charge exchange, m.
 * @param [points] Number of bins, 2 to 2000; 50 unless given.
 * @param [header] TRUE adds a row of titles on top; FALSE unless given.
 */
export function IMPACTDISTRIBUTION(
  V_s: any[][],
  s: any[][],
  lambda_i: any[][],
  points?: any[][],
  header?: any[][],
): any[][] {
  return evaluate(entries.IMPACTDISTRIBUTION, [V_s, s, lambda_i, points, header]);
}
