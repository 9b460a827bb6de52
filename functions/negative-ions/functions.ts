import { evaluate } from "../cells/evaluate";
import * as entries from "./entries";

/**
 * Bohm speed of positive ions where negative ions reach the sheath edge: they slow it down.
 * @customfunction NEGATIVEIONBOHMSPEED
 * @helpurl https://localhost:3000/taskpane.html#NEGATIVEIONBOHMSPEED
 * @param T_e Electron temperature, eV.
 * @param ion Positive ion as a formula or a mass in u.
 * @param alpha_s Negative ions per electron at the sheath edge (NEGATIVEIONEDGE); 0 is a plasma without them.
 * @param gamma Electron temperature over that of the negative ions, 0.001 to 1e6; usually 10 to 100.
 * @param [unit] Unit of the result, m/s unless given.
 */
export function NEGATIVEIONBOHMSPEED(
  T_e: any[][],
  ion: any[][],
  alpha_s: any[][],
  gamma: any[][],
  unit?: any[][],
): any[][] {
  return evaluate(entries.NEGATIVEIONBOHMSPEED, [T_e, ion, alpha_s, gamma, unit]);
}

/**
 * Sheath edges of a plasma with negative ions: one row each with alpha_s, drop from the body over T_e, electron density
 * over the body's, and speed over the plain Bohm speed. Three for some bodies where gamma is above 9.9; the first is the one
 * met first coming from the body.
 * @customfunction NEGATIVEIONEDGE
 * @helpurl https://localhost:3000/taskpane.html#NEGATIVEIONEDGE
 * @param alpha_b Negative ions per electron in the plasma's body; 0 is a plasma without them.
 * @param gamma Electron temperature over that of the negative ions, 0.001 to 1e6; usually 10 to 100.
 */
export function NEGATIVEIONEDGE(alpha_b: any[][], gamma: any[][]): any[][] {
  return evaluate(entries.NEGATIVEIONEDGE, [alpha_b, gamma]);
}

/**
 * Flux of positive ions to a wall in a plasma with negative ions.
 * @customfunction NEGATIVEIONFLUX
 * @helpurl https://localhost:3000/taskpane.html#NEGATIVEIONFLUX
 * @param n_edge Electron density at the sheath edge, m⁻³: that of the body times the edge_ratio of NEGATIVEIONEDGE.
 * @param T_e Electron temperature, eV.
 * @param ion Positive ion as a formula or a mass in u.
 * @param alpha_s Negative ions per electron at the sheath edge (NEGATIVEIONEDGE); 0 is a plasma without them.
 * @param gamma Electron temperature over that of the negative ions, 0.001 to 1e6; usually 10 to 100.
 * @param [unit] Unit of the result, m⁻² s⁻¹ unless given.
 */
export function NEGATIVEIONFLUX(
  n_edge: any[][],
  T_e: any[][],
  ion: any[][],
  alpha_s: any[][],
  gamma: any[][],
  unit?: any[][],
): any[][] {
  return evaluate(entries.NEGATIVEIONFLUX, [n_edge, T_e, ion, alpha_s, gamma, unit]);
}

/**
 * Potential of a floating wall relative to the sheath edge in a plasma with negative ions, none of which reach the wall.
 * @customfunction NEGATIVEIONPOTENTIAL
 * @helpurl https://localhost:3000/taskpane.html#NEGATIVEIONPOTENTIAL
 * @param T_e Electron temperature, eV.
 * @param ion Positive ion as a formula or a mass in u.
 * @param alpha_s Negative ions per electron at the sheath edge (NEGATIVEIONEDGE); 0 is a plasma without them.
 * @param gamma Electron temperature over that of the negative ions, 0.001 to 1e6; usually 10 to 100.
 * @param [unit] Unit of the result, V unless given.
 */
export function NEGATIVEIONPOTENTIAL(
  T_e: any[][],
  ion: any[][],
  alpha_s: any[][],
  gamma: any[][],
  unit?: any[][],
): any[][] {
  return evaluate(entries.NEGATIVEIONPOTENTIAL, [T_e, ion, alpha_s, gamma, unit]);
}
