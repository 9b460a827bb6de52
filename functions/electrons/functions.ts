import { evaluate } from "../cells/evaluate";
import * as entries from "./entries";

/**
 * Floating potential against the sheath edge where a cold and a hot group of electrons are present. A few per cent of hot
 * electrons move it far. Of 5 % in the plasma's body more arrive at the edge: the share at the edge is wanted here.
 * @customfunction HOTELECTRONPOTENTIAL
 * @helpurl https://localhost:3000/taskpane.html#HOTELECTRONPOTENTIAL
 * @param T_c Temperature of the cold electrons, eV.
 * @param T_h Temperature of the hot electrons, eV.
 * @param hot_fraction Share of the hot group in the electron density at the sheath edge, 0 to 1.
 * @param ion Ion as a formula or a mass in u.
 * @param [unit] Unit of the result, V unless given.
 */
export function HOTELECTRONPOTENTIAL(
  T_c: any[][],
  T_h: any[][],
  hot_fraction: any[][],
  ion: any[][],
  unit?: any[][],
): any[][] {
  return evaluate(entries.HOTELECTRONPOTENTIAL, [T_c, T_h, hot_fraction, ion, unit]);
}

/**
 * Density, mean energy, effective and screening temperature and random flux from a measured electron energy probability
 * function, each followed by its error: the bound that holds in 95 of 100 cases. Spills one row; its last cell says what
 * was done to the points. Any spacing and order will do; noisy and negative values may stay.
 * @customfunction EEPFMOMENTS
 * @helpurl https://localhost:3000/taskpane.html#EEPFMOMENTS
 * @param energy Column of electron energies, eV.
 * @param eepf Column of the probability function F at these energies, eV^-1.5 m⁻³; that is the distribution over √E.
 */
export function EEPFMOMENTS(energy: any[][], eepf: any[][]): any[][] {
  return evaluate(entries.EEPFMOMENTS, [energy, eepf]);
}

/**
 * Potential against the sheath edge at which a wall floats when the electrons have a measured energy probability function.
 * The function must be measured well beyond that potential.
 * @customfunction EEPFFLOATING
 * @helpurl https://localhost:3000/taskpane.html#EEPFFLOATING
 * @param energy Column of electron energies, eV.
 * @param eepf Column of the probability function F at these energies, at the sheath edge, eV^-1.5 m⁻³.
 * @param ion Ion as a formula or a mass in u.
 * @param [unit] Unit of the result, V unless given.
 */
export function EEPFFLOATING(energy: any[][], eepf: any[][], ion: any[][], unit?: any[][]): any[][] {
  return evaluate(entries.EEPFFLOATING, [energy, eepf, ion, unit]);
}
