import { NotTested, type Limit } from "../cells/entry";
import type { Ion } from "../matter/ion";
import { m_e } from "../matter/constants";
import { HW67, LL, S12 } from "../sources";
import { electronExcess } from "./model";

/** The picture of a sheath that repels electrons and lets ions in. */
export function wallRepels(
  voltage: (...values: any[]) => number | undefined,
  T_e: (...values: any[]) => number,
): Limit {
  return {
    assumption: "the wall repels electrons",
    measure: "V_w/T_e",
    value: (...values) => {
      const V_w = voltage(...values);
      return V_w === undefined ? undefined : V_w / T_e(...values);
    },
    holds: -1,
    fails: 0,
    reason: "the wall hardly repels electrons, and the sheath may vanish or turn round",
    source: LL,
  };
}

/** Far from the space-charge limit of emission; the simple formula is off by 1 % at 25, by 4 % at 13. */
export function weakEmission(of: (...values: any[]) => [ion: Ion, delta_e: number | undefined]): Limit {
  return {
    assumption: "emitted electrons leave the sheath's structure alone",
    measure: "(1−δ)√(M/(Zm))",
    value: (...values) => {
      const [ion, delta_e] = of(...values);
      return delta_e === undefined
        ? new NotTested("delta_e")
        : (1 - delta_e) * Math.sqrt(ion.mass / (ion.charge * m_e));
    },
    holds: 25,
    fails: 8.3,
    reason: "emission is space-charge limited, and part of it returns to the wall",
    source: HW67,
  };
}

/** First excitation energies of the rare gases in eV, all to metastable levels: NIST Atomic Spectra Database (from memory). */
const firstExcitation: Readonly<Record<string, number>> = { He: 19.82, Ne: 16.62, Ar: 11.55, Kr: 9.92, Xe: 8.32 };

/** The rare gas an ion is of, where it is one. */
export function rareGas(ion: Ion): string | undefined {
  return /^(He|Ne|Ar|Kr|Xe)(?=[+^])/.exec(ion.label)?.[0];
}

/**
 * Electrons that reach the wall come from the tail above e|V_w|: where the gas takes their energy faster than they are
 * replaced, fewer arrive than a Maxwellian has. That twice the threshold is far too much is common practice.
 */
export function maxwellianTail(of: (...values: any[]) => [ion: Ion, V_w: number | undefined]): Limit {
  return {
    assumption: "the electrons that cross the sheath are Maxwellian",
    measure: "|V_w|/first excitation energy",
    value: (...values) => {
      const [ion, V_w] = of(...values);
      const threshold = firstExcitation[rareGas(ion) ?? ""];
      return threshold === undefined || V_w === undefined ? undefined : Math.max(0, -V_w) / threshold;
    },
    holds: 1,
    fails: 2,
    reason: "inelastic collisions deplete the electrons fast enough to reach the wall",
    source: LL,
  };
}

/** In a strong field at an angle, the Debye sheath lives only above the grazing limit asin(4u_B/v̄_e). */
export function aboveGrazing(
  of: (...values: any[]) => [angle: number | undefined, T_e: number, ion: Ion, T_i: number | undefined],
): Limit {
  return {
    assumption: "the field meets the wall steeply enough for a Debye sheath",
    measure: "angle/grazing limit",
    value: (...values) => {
      const [angle, T_e, ion, T_i] = of(...values);
      if (angle === undefined) return undefined;
      return (angle * Math.PI) / 180 / Math.asin(Math.min(1, 1 / electronExcess(T_e, ion, T_i ?? 0)));
    },
    holds: 2,
    fails: 1,
    reason: "at such a grazing angle the magnetic presheath carries the whole drop",
    source: S12,
  };
}
