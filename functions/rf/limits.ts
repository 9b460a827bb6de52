import { NotTested, type Limit } from "../cells/entry";
import { format } from "../cells/format";
import { pathSuits, type Motion } from "../layer/limits";
import { ionOfMass } from "../matter/ion";
import { GE62, L88, L89, BB68 } from "../sources";
import { floatingPotential } from "../wall/model";
import * as model from "./model";

type Of<T> = (...values: any[]) => T;

/** λ_i/s_m at which both RF Child laws give the same current: 0.24. */
const equalLaws = (model.collisionlessCoefficient / model.collisionalCoefficient) ** 2;

/** The drop below which a wall floats, in T_e, of singly charged cold ions of this mass in u. */
const floatingDrop = (mass: number) => -floatingPotential(1, ionOfMass(mass), 0, 0);

/** The average over a period is taken of a Boltzmann factor, which no longer counts electrons above V_w = 0. */
export function repelsAtTheTop(of: Of<[V_rf: number, T_e: number]>): Limit {
  return {
    assumption: "the wall repels electrons even at the top of the RF cycle",
    measure: "(V_rf − |ΔV|)/T_e",
    value: (...values) => {
      const [V_rf, T_e] = of(...values);
      return (V_rf + model.rfFloatingShift(V_rf, T_e)) / T_e;
    },
    // Without an ion among the inputs: what even hydrogen allows, and what xenon no longer does.
    holds: floatingDrop(1.008),
    fails: floatingDrop(131.3),
    reason: "the floating wall rises above the sheath edge in each cycle, where the electron current saturates",
    source: GE62,
  };
}

/** From 4/ω on the spread is below the voltage's whole swing; the formula wants many periods in a transit. */
export function manyPeriodsInTransit(of: Of<number>): Limit {
  return {
    assumption: "ions take several RF periods to cross the sheath",
    measure: "f τ_i",
    value: of,
    holds: 3,
    fails: 2 / Math.PI,
    reason: "ions cross within a period, and the spread is the whole swing 2 Z V_rf of slow RF",
    source: BB68,
  };
}

/** L88's own sheath voltage has its fundamental at 1.208 V_dc; a voltage that never reverses can't have more than 2 V_dc. */
export function neverReverses(of: Of<[V_rf: number, V_dc: number]>): Limit {
  return {
    assumption: "the sheath voltage never reverses",
    measure: "V_rf/V_dc",
    value: (...values) => {
      const [V_rf, V_dc] = of(...values);
      return V_rf / Math.abs(V_dc);
    },
    holds: 1.21,
    fails: 2,
    reason: "no sheath voltage of this mean that keeps its sign has so large an RF amplitude",
    source: L88,
  };
}

/** The RF Child laws leave electrons and the entrance speed out of the mean sheath. */
export function highVoltage(of: Of<[V_dc: number, T_e: number]>): Limit {
  return {
    assumption: "the sheath voltage is large against the electron temperature",
    measure: "V_dc/T_e",
    value: (...values) => {
      const [V_dc, T_e] = of(...values);
      return Math.abs(V_dc) / T_e;
    },
    holds: 30,
    fails: 10,
    reason: "electrons fill a good part of the mean sheath, which the law leaves out",
    source: L88,
  };
}

/** The RF Child laws let ions fall through the mean potential. */
export function ionsFeelTheMean(): Limit {
  return {
    assumption: "ions are too slow to follow the RF",
    measure: "f/f_pi",
    value: () =>
      new NotTested("the frequency, which should be 3 times the ions' plasma frequency (PLASMAFREQUENCY) or more"),
    holds: 3,
    fails: 1,
    reason: "ions follow the RF in part, and the sheath is that of the moment's voltage rather than of the mean",
    source: L88,
  };
}

/** Either law against the mean free path, as for a steady sheath. */
export function pathSuitsRf(of: Of<Motion>): readonly [Limit, Limit] {
  const [free, colliding] = pathSuits(of);
  return [
    { ...free, measure: "λ_i/s_m", source: L88 },
    {
      ...colliding,
      measure: "λ_i/s_m",
      fails: equalLaws,
      reason: `beyond λ_i/s_m = ${format(equalLaws)} the collisional law gives more current than free fall; take the collisionless one`,
      source: L89,
    },
  ];
}
