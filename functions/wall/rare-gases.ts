import type { Ion } from "../matter/ion";

/**
 * First excitation energy (to the lowest metastable level) and ionisation energy of the rare gases in eV. NIST Atomic
 * Spectra Database, from memory.
 */
const rareGases: Readonly<Record<string, { excitation: number; ionisation: number }>> = {
  He: { excitation: 19.82, ionisation: 24.587 },
  Ne: { excitation: 16.62, ionisation: 21.565 },
  Ar: { excitation: 11.55, ionisation: 15.76 },
  Kr: { excitation: 9.92, ionisation: 14 },
  Xe: { excitation: 8.32, ionisation: 12.13 },
};

/** Energy in eV below which electrons lose none to the atoms of the ion's gas; undefined where it is no rare gas. */
export function firstExcitation(ion: Ion): number | undefined {
  return rareGases[gasOf(ion)]?.excitation;
}

/** Energy in eV that the neutralisation of a singly charged rare-gas ion sets free. */
export function ionisationEnergy(ion: Ion): number | undefined {
  return ion.charge === 1 ? rareGases[gasOf(ion)]?.ionisation : undefined;
}

function gasOf(ion: Ion): string {
  return /^[A-Z][a-z](?=[+^])/.exec(ion.label)?.[0] ?? "";
}
