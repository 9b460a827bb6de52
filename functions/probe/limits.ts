import { NotTested, type Limit } from "../cells/entry";
import { Fault } from "../cells/fault";
import type { Series } from "../cells/series";
import { debyeLength } from "../edge/model";
import { e, eps0 } from "../matter/constants";
import { C03, CP, LL } from "../sources";
import type { ProbeResult } from "./fit";
import { fitSweeps } from "./fitted-sweeps";
import { swingOf } from "./report";
import type { Labels } from "./sweeps";

type Of<T> = (...values: any[]) => T;

/** A sheath thin beside the probe collects on the probe's own area. */
export function thinSheath(of: Of<[n: number, T_e: number, radius: number | undefined]>): Limit {
  return {
    assumption: "the sheath is thin beside the probe",
    measure: "r/λ_D",
    value: (...values) => {
      const [n, T_e, radius] = of(...values);
      return radius === undefined ? new NotTested("radius") : radius / debyeLength(n, T_e);
    },
    holds: 30,
    fails: 10,
    reason: "the sheath collects on a larger area than the probe's, and the density comes out too high",
    source: C03,
  };
}

/**
 * Orbital motion asks for r ≤ λ_D, which takes T_e to know. √(ε₀V/(en)) is λ_D √(V/T_e): below a fifth of it the radius is
 * below λ_D as long as V ≤ 25 T_e, and beyond three of it no V above T_e helps.
 */
export function thinWire(of: Of<[V: number, n: number, radius: number]>): Limit {
  return {
    assumption: "the wire is thinner than the Debye length",
    measure: "r/√(ε₀V/(en))",
    value: (...values) => {
      const [V, n, radius] = of(...values);
      return radius / Math.sqrt((eps0 * Math.abs(V)) / (e * n));
    },
    holds: 0.2,
    fails: 3,
    reason: "the sheath is too thin for every orbit to be open, and less current arrives",
    source: C03,
  };
}

export function longWire(of: Of<[radius: number, length: number]>): Limit {
  return {
    assumption: "the wire is long beside its radius",
    measure: "length/r",
    value: (...values) => {
      const [radius, length] = of(...values);
      return length / radius;
    },
    holds: 30,
    fails: 10,
    reason: "ions arrive at the wire's end as well",
    source: CP,
  };
}

type Sweeps = [V: Series, I: Series, labels: Labels | undefined, ...rest: any[]];

/** The worst of a measure over all sweeps that could be fitted. */
function worst(measure: (result: ProbeResult) => number | undefined, missing: string, pick: "most" | "least") {
  return (...[V, I, labels]: Sweeps): number | NotTested | undefined => {
    const sweeps = fitSweeps(V, I, labels);
    if (sweeps instanceof Fault) return undefined;
    const found = sweeps.flatMap(({ result }) => (typeof result === "string" ? [] : [measure(result)]));
    const numbers = found.filter((each) => each !== undefined);
    if (numbers.length === 0) return found.length > 0 ? new NotTested(missing) : undefined;
    return numbers.reduce((a, b) => (pick === "most" ? Math.max(a, b) : Math.min(a, b)));
  };
}

const sweepDown = "a sweep down to where ions alone arrive";

export const noRfPickup: Limit<Sweeps> = {
  assumption: "the probe follows the plasma's RF potential",
  measure: "RF swing/T_e",
  value: worst(
    (result) => result.knee && (swingOf(result)?.amplitude ?? 0) / result.T_e.value,
    "a sweep that reaches electron saturation",
    "most",
  ),
  holds: 0.3,
  fails: 1,
  reason: "RF across the sheath rounds the knee and pulls V_f down",
  source: CP,
};

export const ionsSaturate: Limit<Sweeps> = {
  assumption: "the ion current saturates",
  measure: "growth of the ion current per T_e",
  value: worst(({ floating }) => floating?.growth.value, sweepDown, "most"),
  holds: 0.01,
  fails: 0.1,
  reason: "the collecting area grows with voltage, or hot electrons hide in the ion current",
  source: LL,
};

export const longRetarding: Limit<Sweeps> = {
  assumption: "the electron current is seen over several e-folds",
  measure: "(window top − V_f)/T_e",
  value: worst(
    ({ floating, window, T_e }) => floating && (window[1] - floating.V_f.value) / T_e.value,
    sweepDown,
    "least",
  ),
  holds: 2,
  fails: 1,
  reason: "so short a stretch cannot tell one temperature from two",
  source: CP,
};

export const temperatureCertain: Limit<Sweeps> = {
  assumption: "noise leaves the temperature certain",
  measure: "error of T_e over T_e",
  value: worst(({ T_e }) => T_e.error / T_e.value, "a sweep that can be fitted", "most"),
  holds: 0.05,
  fails: 0.2,
  reason: "the noise is too large for this many points",
  source: CP,
};
