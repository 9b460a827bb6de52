import type { Limit } from "../cells/entry";
import { Fault } from "../cells/fault";
import type { Series } from "../cells/series";
import type { Ion } from "../matter/ion";
import { CP, R91 } from "../sources";
import { readEepf, type Eepf } from "./eepf";
import { eepfFloating, energyLeft, noiseOfFloating } from "./floating";
import { eepfDensity, eepfTemperature } from "./model";
import { bounded } from "./results";

type Measured = [energy: Series, eepf: Series, ...rest: any[]];

/** A number that a measurement gives; none where nothing can be made of the measurement. */
function of(measure: (eepf: Eepf, T: number) => number): Limit<Measured>["value"] {
  return (energy, series) => {
    const eepf = readEepf(energy, series);
    return eepf instanceof Fault ? undefined : measure(eepf, eepfTemperature(eepf.sums));
  };
}

/** ⟨1/E⟩ leans on the lowest energies: half of it comes from below 0.23 T. */
export const startsLow: Limit<Measured> = {
  assumption: "the measurement starts close to zero energy",
  measure: "first energy/T_eff",
  value: of(({ energy }, T) => energy[0] / T),
  holds: 0.5,
  fails: 1,
  reason: "too much of the function is continued to zero energy by guess",
  source: CP,
};

export const finelySpaced: Limit<Measured> = {
  assumption: "the energies are close together where the function is large",
  measure: "widest step below 2 T_eff over T_eff",
  value: of(({ energy, points }, T) => {
    let widest = 0;
    for (let i = 1; i < points && energy[i - 1] < 2 * T; i++) widest = Math.max(widest, energy[i] - energy[i - 1]);
    return widest / T;
  }),
  holds: 0.3,
  fails: 1,
  reason: "the function bends too much between two energies",
  source: CP,
};

/** Beyond 5 T a Maxwellian has 1.9 % of its density and 7.5 % of its energy; beyond 2 T 26 % and 55 %. */
export const reachesFar: Limit<Measured> = {
  assumption: "the measurement reaches most of the electrons",
  measure: "last energy clear of noise/T_eff",
  value: of(({ tail }, T) => tail.from / T),
  holds: 5,
  fails: 2,
  reason: "much of the energy lies beyond the last energy measured, where the tail is a guess",
  source: CP,
};

export const quietEnough: Limit<Measured> = {
  assumption: "noise leaves the density certain",
  measure: "error of the density over it",
  value: of((eepf) => bounded(eepfDensity, eepf).error / eepfDensity(eepf.sums)),
  holds: 0.1,
  fails: 0.3,
  reason: "noise and the unmeasured ends leave the density uncertain",
  source: CP,
};

/** Beyond 5 e-folds 4 % of the crossing electrons are a guess, beyond 7 less than 1 %. */
export const tailMeasured: Limit<[energy: Series, eepf: Series, ion: Ion]> = {
  assumption: "the tail is measured beyond the energy that crosses",
  measure: "(last energy − |V|)/tail temperature",
  value: (energy, series, ion) => {
    const eepf = readEepf(energy, series);
    if (eepf instanceof Fault) return undefined;
    const floating = eepfFloating(eepf, ion);
    return floating instanceof Fault ? undefined : (eepf.tail.from + floating) / energyLeft(eepf, -floating);
  },
  holds: 7,
  fails: 5,
  reason: "too few of the electrons that cross were measured",
  source: R91,
};

export const potentialCertain: Limit<[energy: Series, eepf: Series, ion: Ion]> = {
  assumption: "noise leaves the potential certain",
  measure: "error of V over T_eff",
  value: (energy, series, ion) => {
    const eepf = readEepf(energy, series);
    if (eepf instanceof Fault) return undefined;
    const floating = eepfFloating(eepf, ion);
    return floating instanceof Fault ? undefined : noiseOfFloating(eepf, ion, -floating) / eepfTemperature(eepf.sums);
  },
  holds: 0.1,
  fails: 0.5,
  reason: "the few electrons that cross drown in the noise",
  source: CP,
};
