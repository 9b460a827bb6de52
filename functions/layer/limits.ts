import { NotTested, type Limit } from "../cells/entry";
import { format } from "../cells/format";
import { debyeLength } from "../edge/model";
import { e, k_B } from "../matter/constants";
import type { Ion } from "../matter/ion";
import { CP, DV63, L89J, LL, R91 } from "../sources";
import * as model from "./model";
import { dropAt, dropAtEnd } from "./nonlinear-sheath";

type Of<T> = (...values: any[]) => T;

type Drop = [V_s: number, T_e: number];

/** Child over full width is 0.26 at V_s/T_e = 5, 0.52 at 30, 0.69 at 100, 0.90 at 1000: recomputed. */
export function electronFree(of: Of<Drop | undefined>, advice = ""): Limit {
  return {
    assumption: "the sheath holds no electrons to speak of",
    measure: "V_s/T_e",
    value: dropInTemperatures(of),
    holds: 300,
    fails: 30,
    reason: `electrons fill half of the sheath, which is far wider than this law says${advice}`,
    source: LL,
  };
}

/**
 * Where the ions are still as dense as at the edge, Boltzmann electrons leave the wall the charge of a width
 * λ_D √(2(η − 1 + e^(−η))), η = V_s/T_e: 2 % below the matrix width at 30, 17 % at 3.
 */
export function electronsSwept(of: Of<Drop | undefined>): Limit {
  return {
    assumption: "the voltage has swept the electrons out",
    measure: "V_s/T_e",
    value: dropInTemperatures(of),
    holds: 30,
    fails: 3,
    reason: "so low a voltage leaves electrons in the matrix sheath",
    source: LL,
  };
}

function dropInTemperatures(of: Of<Drop | undefined>): Limit["value"] {
  return (...values) => {
    const given = of(...values);
    return given && Math.abs(given[0]) / given[1];
  };
}

/** At this λ_i/s both laws give the same current: 0.30. */
const equalLaws = (model.childCoefficient / model.collisionalCoefficient) ** 2;

/** What a law says of collisions, the width it gives or takes, and the path, where it is known. */
export type Motion = [motion: model.IonMotion, s: number, lambda_i: number | undefined];

/** Either law against the mean free path. */
export function pathSuits(of: Of<Motion | undefined>): [Limit, Limit] {
  const ratio = (wanted: model.IonMotion) =>
    ((...values: any[]) => {
      const given = of(...values);
      if (!given || given[0] !== wanted) return undefined;
      const [, s, lambda_i] = given;
      return lambda_i === undefined ? new NotTested("lambda_i") : lambda_i / s;
    }) satisfies Limit["value"];
  return [
    {
      ...freeFall,
      value: ratio("collisionless"),
      reason: `${freeFall.reason}; take model "collisional"`,
    },
    {
      assumption: "ions collide many times in the sheath",
      measure: "λ_i/s",
      value: ratio("collisional"),
      holds: 0.1,
      fails: equalLaws,
      reason: `beyond λ_i/s = ${format(equalLaws)} the collisional law gives more current than free fall; take the collisionless one`,
      source: LL,
      decisive: true,
    },
  ];
}

const freeFall = {
  assumption: "ions cross the sheath without a collision",
  measure: "λ_i/s",
  holds: 3,
  fails: 1,
  reason: "ions collide inside the sheath",
  source: LL,
  decisive: true,
} as const;

/** Functions of free fall that take no mean free path say which one it takes, at their own width where they know one. */
export function fallsFreely(of: Of<number | undefined>): Limit {
  return {
    ...freeFall,
    value: (...values) => {
      const s = of(...values);
      const least = s === undefined ? "3 widths of the sheath" : `${format(freeFall.holds * s)} m`;
      return new NotTested(`the ions' mean free path (MEANFREEPATH), which should be ${least} or more`);
    },
  };
}

/** A mean free path below λ_D takes the ions' energy before they are through the edge of the sheath. */
export function pathAboveDebye(of: Of<[lambda_i: number | undefined, n_edge: number, T_e: number] | undefined>): Limit {
  return {
    assumption: "ions enter the collisional sheath at the Bohm speed",
    measure: "λ_i/λ_D",
    value: pathOverDebye(of),
    holds: 1,
    fails: 1,
    reason: "ions collide within a Debye length, so they enter more slowly (COLLISIONALBOHMSPEED)",
    source: LL,
  };
}

/**
 * The transition between presheath and sheath drops T_e (λ_D/L)^(2/5), L the shorter of mean free path and plasma size.
 * At L/λ_D = 233 that is the 0.113 T_e at which the sheath is said to end. Ten is where u_B itself is in doubt.
 */
export function longPresheath(of: Of<[lambda_i: number | undefined, n_edge: number, T_e: number] | undefined>): Limit {
  return {
    assumption: "the presheath is much longer than the Debye length",
    measure: "λ_i/λ_D",
    value: pathOverDebye(of),
    holds: 233,
    fails: 10,
    reason: "ions collide on the scale of the sheath's edge, and there is no edge at which they have the Bohm speed",
    source: R91,
  };
}

function pathOverDebye(of: Of<[lambda_i: number | undefined, n_edge: number, T_e: number] | undefined>) {
  return (...values: any[]): number | NotTested | undefined => {
    const given = of(...values);
    if (!given) return undefined;
    const [lambda_i, n_edge, T_e] = given;
    return lambda_i === undefined ? new NotTested("lambda_i") : lambda_i / debyeLength(n_edge, T_e);
  };
}

/** A matrix sheath is gone within an ion plasma period, and only PULSEDWIDTH is told the time. */
export function justFormed(isMatrix: Of<boolean>): Limit {
  return {
    assumption: "the ions have not moved yet",
    measure: "ω_pi t",
    value: (...values) => (isMatrix(...values) ? new NotTested("t to PULSEDWIDTH") : undefined),
    holds: 1,
    fails: 3,
    reason: "the ions have begun to leave, and the sheath has grown",
    source: L89J,
    decisive: true,
  };
}

/** With the ions at rest the electrons' edge alone moves, dV = s dE: ε₀/s, against the ε₀/(3s) of a Child sheath. */
export function ionsKeepUp(): Limit {
  return {
    assumption: "the voltage changes so slowly that the ions keep up",
    measure: "f/f_pi",
    value: () =>
      new NotTested("the frequency, which should be a tenth of the ions' plasma frequency (PLASMAFREQUENCY) or less"),
    holds: 0.1,
    fails: 0.3,
    reason: "the ions stay where they are, and the capacitance is up to three times as large",
    source: LL,
    decisive: true,
  };
}

/** Rough walls emit from points where the field is a hundred times the mean. */
export function noFieldEmission(of: Of<number>): Limit {
  return {
    assumption: "the field draws no electrons out of the wall",
    measure: "wall field/(V/m)",
    value: of,
    holds: 1e7,
    fails: 1e8,
    reason: "so strong a field pulls electrons out of the wall and starts arcs",
    source: CP,
  };
}

/** Farther out the presheath's own field, which this solution has at zero, takes over. */
export function insideSheath(of: Of<[x: number, V_s: number, n_edge: number, T_e: number, u_ratio: number]>): Limit {
  return {
    assumption: "the point lies inside the sheath",
    measure: "drop there over drop at the sheath's end",
    value: (...values) => {
      const [x, V_s, n_edge, T_e, u_ratio] = of(...values);
      return dropAt(x / debyeLength(n_edge, T_e), Math.abs(V_s) / T_e, u_ratio) / dropAtEnd(u_ratio);
    },
    holds: 1,
    fails: 0.3,
    reason: "the point lies in the presheath, whose potential this solution leaves out",
    source: R91,
  };
}

/** The matrix sheath forms as the electrons leave. */
export function electronsHaveLeft(of: Of<number>): Limit {
  return {
    assumption: "the electrons have left the growing sheath",
    measure: "ω_pe t",
    value: of,
    holds: 10,
    fails: 1,
    reason: "the electrons have had no time to leave, so there is no matrix sheath yet",
    source: L89J,
  };
}

/**
 * With the inflow at u_B kept, the growth obeys artanh y − y = u_B t/s_C for y = s/s_C: leaving it out makes the sheath
 * 6 % too wide at half the Child width, 22 % where growth is cut off, and nothing any more at twice that time.
 */
export function uncoveredIonsCount(of: Of<[V_s: number, n_edge: number, T_e: number, ion: Ion, t: number]>): Limit {
  return {
    assumption: "the growing sheath uncovers far more ions than flow in",
    measure: "s/Child width",
    value: (...values) => {
      const [V_s, n_edge, T_e, ion, t] = of(...values);
      const V = Math.abs(V_s);
      if (model.inflow(V, n_edge, T_e, ion, t) > 2) return undefined;
      return model.pulsedWidth(V, n_edge, T_e, ion, t) / model.childWidth(V, n_edge, T_e);
    },
    holds: 0.5,
    fails: 1,
    reason: "the matrix sheath is wider than the steady one: the voltage is too low for this law",
    source: L89J,
  };
}

/** Gas at 300 K; measure as for COLLISIONALBOHMSPEED. */
const gasAt300K = (300 * k_B) / e;

/** Each start after a charge exchange is taken to be from rest. */
export function fieldOutrunsGas(of: Of<[V_s: number, s: number, lambda_i: number]>): Limit {
  return {
    assumption: "ions gain far more from the field between collisions than the gas gave them (gas at 300 K)",
    measure: "2 V_s λ_i/(s T_g)",
    value: (...values) => {
      const [V_s, s, lambda_i] = of(...values);
      return (2 * Math.abs(V_s) * lambda_i) / s / gasAt300K;
    },
    holds: 10,
    fails: 1,
    reason: "collisions hold the ions to the thermal motion of the gas",
    source: DV63,
  };
}
