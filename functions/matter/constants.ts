/**
 * CODATA 2022 recommended values, SI, with their standard uncertainties (0: exact by definition of the unit).
 * Everything that needs a constant takes it from here.
 */
export interface Constant {
  symbol: string;
  value: number;
  uncertainty: number;
  unit: string;
  name: string;
}

const constant = (symbol: string, value: number, uncertainty: number, unit: string, name: string): Constant => ({
  symbol,
  value,
  uncertainty,
  unit,
  name,
});

export const constants = [
  constant("e", 1.602176634e-19, 0, "C", "elementary charge"),
  constant("m_e", 9.1093837139e-31, 2.8e-40, "kg", "electron mass"),
  constant("k_B", 1.380649e-23, 0, "J/K", "Boltzmann constant"),
  constant("eps0", 8.8541878188e-12, 1.4e-21, "F/m", "vacuum electric permittivity"),
  constant("u", 1.66053906892e-27, 5.2e-37, "kg", "unified atomic mass unit"),
  constant("h", 6.62607015e-34, 0, "J s", "Planck constant"),
  constant("c", 299792458, 0, "m/s", "speed of light in vacuum"),
  constant("N_A", 6.02214076e23, 0, "1/mol", "Avogadro constant"),
] as const;

const [e, m_e, k_B, eps0, u, h, c, N_A] = constants.map((each) => each.value);

export { e, m_e, k_B, eps0, u, h, c, N_A };
