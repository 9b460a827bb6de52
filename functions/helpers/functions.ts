import { catalogue } from "../catalogue";
import { evaluate } from "../cells/evaluate";
import * as entries from "./entries";

/**
 * Mass of an ion from its chemical formula: atomic weights less the electrons removed.
 * @customfunction IONMASS
 * @helpurl https://localhost:3000/taskpane.html#IONMASS
 * @param ion Ion as a formula ("Ar+", "N2+", "Xe^2+") or a mass in u.
 * @param [unit] Unit of the result, kg unless given; "u" for atomic mass units.
 */
export function IONMASS(ion: any[][], unit?: any[][]): any[][] {
  return evaluate(entries.IONMASS, [ion, unit]);
}

/**
 * Constant symbols.
 * @customenum {string}
 */
export enum ConstantName {
  /** Elementary charge, C. */
  e = "e",
  /** Electron mass, kg. */
  m_e = "m_e",
  /** Boltzmann constant, J/K. */
  k_B = "k_B",
  /** Vacuum electric permittivity, F/m. */
  eps0 = "eps0",
  /** Atomic mass unit, kg. */
  u = "u",
  /** Planck constant, J s. */
  h = "h",
  /** Speed of light in vacuum, m/s. */
  c = "c",
  /** Avogadro constant, 1/mol. */
  N_A = "N_A",
}

/**
 * A physical constant in SI units, CODATA 2022.
 * @customfunction CONSTANT
 * @helpurl https://localhost:3000/taskpane.html#CONSTANT
 * @param name Symbol: "e", "m_e", "k_B", "eps0", "u", "h", "c" or "N_A".
 */
export function CONSTANT(name: ConstantName[][]): any[][] {
  return evaluate(entries.CONSTANT, [name]);
}

/**
 * A number converted from one unit to another; temperatures and energies stand for each other through the Boltzmann constant.
 * @customfunction UNIT
 * @helpurl https://localhost:3000/taskpane.html#UNIT
 * @param value Number to convert.
 * @param from Unit it is in, as text.
 * @param [to] Unit wanted, as text; the unit these functions read that quantity in unless given.
 */
export function UNIT(value: any[][], from: any[][], to?: any[][]): any[][] {
  return evaluate(entries.UNIT, [value, from, to]);
}

/**
 * Version, set of constants, number of functions and date of build.
 * @customfunction ABOUT
 * @helpurl https://localhost:3000/taskpane.html#ABOUT
 */
export function ABOUT(): any[][] {
  return evaluate({ ...entries.ABOUT, compute: () => entries.aboutRows(catalogue.length) }, []);
}
