import { evaluate } from "../cells/evaluate";
import * as entries from "./entries";

/**
 * Presheath geometry.
 * @customenum {string}
 */
export enum EdgeShape {
  /** A cold, collisionless presheath of no particular geometry: exp(-1/2). */
  free = "free",
  /** Plasma between two plane walls; size is the full gap. */
  slab = "slab",
  /** A long cylinder; size is its radius. */
  cylinder = "cylinder",
}

/**
 * Wall potential relative to the sheath edge, from tool readings of wall and plasma against ground.
 * @customfunction WALLTOEDGE
 * @helpurl https://localhost:3000/taskpane.html#WALLTOEDGE
 * @param V_wall Potential of the wall against ground, V.
 * @param V_plasma Potential of the plasma body against ground, V.
 * @param [T_e] Electron temperature, eV; 0 or blank leaves the presheath out.
 * @param [edge_ratio] Density at the sheath edge over that of the body, 0 to 1; exp(-1/2) unless given.
 * @param [unit] Unit of the result, V unless given.
 */
export function WALLTOEDGE(
  V_wall: any[][],
  V_plasma: any[][],
  T_e?: any[][],
  edge_ratio?: any[][],
  unit?: any[][],
): any[][] {
  return evaluate(entries.WALLTOEDGE, [V_wall, V_plasma, T_e, edge_ratio, unit]);
}

/**
 * Debye length: the distance over which a plasma screens a charge. With T_i the ions screen too.
 * @customfunction DEBYELENGTH
 * @helpurl https://localhost:3000/taskpane.html#DEBYELENGTH
 * @param n_e Electron density, m⁻³.
 * @param T_e Electron temperature, eV.
 * @param [T_i] Ion temperature, eV; blank leaves the ions' screening out.
 * @param [unit] Unit of the result, m unless given.
 */
export function DEBYELENGTH(n_e: any[][], T_e: any[][], T_i?: any[][], unit?: any[][]): any[][] {
  return evaluate(entries.DEBYELENGTH, [n_e, T_e, T_i, unit]);
}

/**
 * Plasma frequency of one species, in cycles per second; ask for rad/s by name.
 * @customfunction PLASMAFREQUENCY
 * @helpurl https://localhost:3000/taskpane.html#PLASMAFREQUENCY
 * @param n Density of that species, m⁻³.
 * @param [ion] Ion as a formula or a mass in u; electrons unless given.
 * @param [unit] Unit of the result, Hz unless given.
 */
export function PLASMAFREQUENCY(n: any[][], ion?: any[][], unit?: any[][]): any[][] {
  return evaluate(entries.PLASMAFREQUENCY, [n, ion, unit]);
}

/**
 * Mean free path of ions in a gas from pressure and cross-section.
 * @customfunction MEANFREEPATH
 * @helpurl https://localhost:3000/taskpane.html#MEANFREEPATH
 * @param p Gas pressure, Pa.
 * @param sigma Cross-section, m², or the gas (Ar, Xe) for ions of a few eV; a biased sheath has longer paths.
 * @param [T_g] Gas temperature, K; 300 K unless given.
 * @param [unit] Unit of the result, m unless given.
 */
export function MEANFREEPATH(p: any[][], sigma: any[][], T_g?: any[][], unit?: any[][]): any[][] {
  return evaluate(entries.MEANFREEPATH, [p, sigma, T_g, unit]);
}

/**
 * Bohm speed: the least speed at which ions enter a sheath.
 * @customfunction BOHMSPEED
 * @helpurl https://localhost:3000/taskpane.html#BOHMSPEED
 * @param T_e Electron temperature, eV.
 * @param ion Ion as a formula or a mass in u.
 * @param [T_i] Ion temperature, eV; 0 unless given.
 * @param [gamma_i] Adiabatic index of the ions, 1 to 3; 1 (isothermal) unless given, 3 for one-dimensional adiabatic ions.
 * @param [unit] Unit of the result, m/s unless given.
 */
export function BOHMSPEED(T_e: any[][], ion: any[][], T_i?: any[][], gamma_i?: any[][], unit?: any[][]): any[][] {
  return evaluate(entries.BOHMSPEED, [T_e, ion, T_i, gamma_i, unit]);
}

/**
 * Speed of ions at the sheath edge where they collide with the gas: below the Bohm speed.
 * @customfunction COLLISIONALBOHMSPEED
 * @helpurl https://localhost:3000/taskpane.html#COLLISIONALBOHMSPEED
 * @param T_e Electron temperature, eV.
 * @param ion Ion as a formula or a mass in u.
 * @param n_edge Electron density at the sheath edge, m⁻³.
 * @param lambda_i Ion mean free path, m.
 * @param [unit] Unit of the result, m/s unless given.
 */
export function COLLISIONALBOHMSPEED(
  T_e: any[][],
  ion: any[][],
  n_edge: any[][],
  lambda_i: any[][],
  unit?: any[][],
): any[][] {
  return evaluate(entries.COLLISIONALBOHMSPEED, [T_e, ion, n_edge, lambda_i, unit]);
}

/**
 * Ion speed at the sheath edge over the Bohm speed: at least 1 where a monotonic sheath can form.
 * @customfunction BOHMRATIO
 * @helpurl https://localhost:3000/taskpane.html#BOHMRATIO
 * @param u_0 Ion speed at the sheath edge, m/s.
 * @param T_e Electron temperature, eV.
 * @param ion Ion as a formula or a mass in u.
 * @param [T_i] Ion temperature, eV; 0 unless given.
 * @param [gamma_i] Adiabatic index of the ions, 1 to 3; 1 unless given.
 */
export function BOHMRATIO(u_0: any[][], T_e: any[][], ion: any[][], T_i?: any[][], gamma_i?: any[][]): any[][] {
  return evaluate(entries.BOHMRATIO, [u_0, T_e, ion, T_i, gamma_i]);
}

/**
 * Decay length of a small disturbance of the potential at the sheath edge, for ions faster than the Bohm speed.
 * @customfunction EDGEDECAYLENGTH
 * @helpurl https://localhost:3000/taskpane.html#EDGEDECAYLENGTH
 * @param n_edge Electron density at the sheath edge, m⁻³.
 * @param T_e Electron temperature, eV.
 * @param ion Ion as a formula or a mass in u.
 * @param u_0 Ion speed at the sheath edge, m/s; above the Bohm speed.
 * @param [unit] Unit of the result, m unless given.
 */
export function EDGEDECAYLENGTH(n_edge: any[][], T_e: any[][], ion: any[][], u_0: any[][], unit?: any[][]): any[][] {
  return evaluate(entries.EDGEDECAYLENGTH, [n_edge, T_e, ion, u_0, unit]);
}

/**
 * Density at the sheath edge over the density of the plasma body.
 * @customfunction EDGERATIO
 * @helpurl https://localhost:3000/taskpane.html#EDGERATIO
 * @param [shape] Geometry: "free" unless given, "slab" or "cylinder".
 * @param [size] Full gap of a slab or radius of a cylinder, m; needed where lambda_i is given.
 * @param [lambda_i] Ion mean free path, m; blank is the collisionless limit.
 */
export function EDGERATIO(shape?: EdgeShape[][], size?: any[][], lambda_i?: any[][]): any[][] {
  return evaluate(entries.EDGERATIO, [shape, size, lambda_i]);
}

/**
 * Potential drop across the presheath, a magnitude: half an electron temperature unless the density ratio is given.
 * @customfunction PRESHEATHDROP
 * @helpurl https://localhost:3000/taskpane.html#PRESHEATHDROP
 * @param T_e Electron temperature, eV.
 * @param [edge_ratio] Density at the sheath edge over that of the body, 0 to 1; exp(-1/2) unless given.
 * @param [unit] Unit of the result, V unless given.
 */
export function PRESHEATHDROP(T_e: any[][], edge_ratio?: any[][], unit?: any[][]): any[][] {
  return evaluate(entries.PRESHEATHDROP, [T_e, edge_ratio, unit]);
}
