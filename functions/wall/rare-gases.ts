import type { Ion } from "../matter/ion";

/** First excitation energy of the rare gases, to the lowest metastable level, in eV. NIST Atomic Spectra Database, from memory. */
const firstExcitations: Readonly<Record<string, number>> = { He: 19.82, Ne: 16.62, Ar: 11.55, Kr: 9.92, Xe: 8.32 };

/** Energy in eV below which electrons lose none to the atoms of the ion's gas; undefined where it is no rare gas. */
export function firstExcitation(ion: Ion): number | undefined {
  return firstExcitations[/^[A-Z][a-z](?=[+^])/.exec(ion.label)?.[0] ?? ""];
}
