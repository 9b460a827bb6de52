import type { Limit } from "../cells/entry";
import { BT59, CP } from "../sources";
import { negativeIonEdges } from "./edges";

type Of<T> = (...values: any[]) => T;

/** Above γ = 5+√24 a body between the folds has three edges, and what forms is a double layer or depends on the past. */
export function oneEdge(of: Of<[alpha_b: number, gamma: number]>): Limit {
  return {
    assumption: "only one sheath edge is possible",
    measure: "number of edges",
    value: (...values) => negativeIonEdges(...of(...values)).length,
    holds: 1,
    fails: 1.5,
    reason: "more than one edge solves the equation, and these inputs don't decide which one forms",
    source: BT59,
  };
}

/** exp(−10) of the negative ions' random flux is nothing beside the electrons'. */
export function negativeIonsTurnBack(of: Of<[V_f: number | undefined, T_e: number, gamma: number]>): Limit {
  return {
    assumption: "no negative ions reach the wall",
    measure: "|V_f|/T₋",
    value: (...values) => {
      const [V_f, T_e, gamma] = of(...values);
      return V_f === undefined ? undefined : (Math.abs(V_f) / T_e) * gamma;
    },
    holds: 10,
    fails: 3,
    reason: "negative ions cross the sheath too, and their current is left out",
    source: CP,
  };
}
