import { NotTested, type Limit } from "../cells/entry";
import type { Fault } from "../cells/fault";
import { coldIons } from "../edge/limits";
import { grazingLimit } from "../magnetised/model";
import { m_e } from "../matter/constants";
import type { Ion } from "../matter/ion";
import { CP, HW67, LL, S12 } from "../sources";
import { electronExcess } from "./model";
import { firstExcitation } from "./rare-gases";

/** What the limits look at: a wall at a potential, or at none where the model has no solution. */
export interface AtWall {
  V_w: number | Fault;
  T_e: number;
  ion: Ion;
  T_i: number | undefined;
  /** Undefined where emission was left out. */
  delta_e: number | undefined;
}

type Look = (...values: any[]) => AtWall;

/** Limits of every model in which electrons fall on a wall that repels them. */
export function sheathLimits(at: Look): Limit[] {
  return [wallRepels(at), weakEmission(at), maxwellianTail(at), coldIons((...values) => at(...values).T_i)];
}

/** The picture of a sheath that repels electrons and lets ions in. */
export function wallRepels(at: (...values: any[]) => Pick<AtWall, "V_w" | "T_e">): Limit {
  return {
    assumption: "the wall repels electrons",
    measure: "V_w/T_e",
    value: (...values) => {
      const { V_w, T_e } = at(...values);
      return typeof V_w === "number" ? V_w / T_e : undefined;
    },
    holds: -1,
    fails: 0,
    reason: "the wall hardly repels electrons, and the sheath may vanish or turn round",
    source: LL,
  };
}

/** Far from the space-charge limit of emission; the simple formula is off by 1 % at 25, by 4 % at 13. */
function weakEmission(at: Look): Limit {
  return {
    assumption: "emitted electrons leave the sheath's structure alone",
    measure: "(1−δ)√(M/(Zm))",
    value: (...values) => {
      const { ion, delta_e, ...wall } = at(...values);
      if (!electronsMatter({ ion, ...wall })) return undefined;
      return delta_e === undefined
        ? new NotTested("delta_e")
        : (1 - delta_e) * Math.sqrt(ion.mass / (ion.charge * m_e));
    },
    holds: 25,
    fails: 8.3,
    reason: "emission comes close to its space-charge limit, and the potential no longer follows this formula",
    source: HW67,
  };
}

/**
 * Electrons that reach the wall come from the tail above e|V_w|: where the gas takes their energy faster than they are
 * replaced, fewer arrive than a Maxwellian has. By how much hangs on the density of gas and electrons, which no input
 * tells: from the first threshold on it is open. That the tail is gone beyond ten, as in thrusters, is common practice.
 */
export function maxwellianTail(at: (...values: any[]) => Omit<AtWall, "delta_e">): Limit {
  return {
    assumption: "the electrons that cross the sheath are Maxwellian",
    measure: "|V_w|/first excitation energy",
    value: (...values) => {
      const wall = at(...values);
      const threshold = firstExcitation(wall.ion);
      return threshold !== undefined && electronsMatter(wall) && typeof wall.V_w === "number"
        ? Math.max(0, -wall.V_w) / threshold
        : undefined;
    },
    holds: 1,
    fails: 10,
    reason: "collisions and the wall itself deplete the electrons fast enough to reach it",
    source: LL,
  };
}

/** At a strong bias hardly an electron arrives, and nothing that concerns them matters. */
function electronsMatter({ V_w, T_e, ion, T_i }: Omit<AtWall, "delta_e">): boolean {
  return typeof V_w === "number" && electronExcess(T_e, ion, T_i ?? 0) * Math.exp(Math.min(0, V_w / T_e)) > 0.01;
}

interface AtAngle {
  /** Undefined where no angle was given. */
  angle: number | undefined;
  T_e: number;
  ion: Ion;
  T_i: number | undefined;
}

/** In a strong field at an angle, the Debye sheath lives only above the grazing limit. */
export function aboveGrazing(of: (...values: any[]) => AtAngle): Limit {
  return {
    assumption: "the field meets the wall steeply enough for a Debye sheath",
    measure: "angle/grazing limit",
    value: (...values) => {
      const { angle, T_e, ion, T_i } = of(...values);
      if (angle === undefined) return undefined;
      return angle / grazingLimit(ion, (T_i ?? 0) / T_e);
    },
    holds: 2,
    fails: 1,
    reason: "at such a grazing angle the magnetic presheath carries the whole drop",
    source: S12,
  };
}

/**
 * Below the grazing limit the Debye sheath is gone, but not the stream along the field, S12: it fails where sin θ comes
 * down to √(m/M), a third of that limit, common practice.
 */
export function streamsAlongField(of: (...values: any[]) => AtAngle): Limit {
  return {
    ...aboveGrazing(of),
    assumption: "particles reach the wall by streaming along the field",
    holds: 1,
    fails: 0.3,
    reason: "at such a grazing angle drifts, gyration and the wall's roughness decide what reaches it",
  };
}

/** Emission by the ions themselves adds to the current they carry; `gamma` is their yield, or what is missing to know it. */
export function weakIonEmission(measure: string, gamma: Limit["value"]): Limit {
  return {
    assumption: "emission by ion impact is small beside the ion current",
    measure,
    value: gamma,
    holds: 0.05,
    fails: 0.3,
    reason: "the electrons that ions set free carry a large share of the current",
    source: LL,
  };
}

/** An assumption that no input of the function can test: the user is told what to look at. */
export function besideTheInputs(needs: string, limit: Omit<Limit, "value" | "source">): Limit {
  return { ...limit, value: () => new NotTested(needs), source: CP };
}
