export const e = 1.602176634e-19;
export const m_e = 9.1093837139e-31;
export const k_B = 1.380649e-23;
export const eps0 = 8.8541878188e-12;
export const h = 6.62607015e-34;
const u = 1.66053906892e-27;

/** Masses of the ions that the examples name, in kg, and of one formula unit of silicon. */
export const argon = 39.948 * u - m_e;
export const deuterium = 2.01410177784 * u - m_e;
export const nitrogen = 28.014 * u - m_e;
export const silicon = 28.085 * u;

export type Column = number[][];
