import { entry, type Family, type Value } from "../cells/entry";
import { Fault, noSolution } from "../cells/fault";
import { ionInput, quantityInput } from "../cells/inputs";
import { quantities } from "../cells/quantities";
import { seriesInput } from "../cells/series";
import type { Ion } from "../matter/ion";
import { bodyRatio } from "../negative-ions/edges";
import { oneEdge } from "../negative-ions/limits";
import { LL, R91 } from "../sources";
import { maxwellianTail } from "../wall/limits";
import { readEepf } from "./eepf";
import { eepfFloating } from "./floating";
import { finelySpaced, potentialCertain, quietEnough, reachesFar, startsLow, tailMeasured } from "./limits";
import { twoGroupFloatingPotential } from "./model";
import { bounded, results } from "./results";

const first = { "1.0.0": "first version" };
const energy = seriesInput("energy", quantities.energy);
const eepf = seriesInput("eepf", quantities.probability);

export const HOTELECTRONPOTENTIAL = entry("HOTELECTRONPOTENTIAL", {
  inputs: [
    quantityInput("T_c", quantities.temperature),
    quantityInput("T_h", quantities.temperature),
    quantityInput("hot_fraction", quantities.notNegative, { most: 1 }),
    ionInput(),
  ],
  result: quantities.voltage,
  compute: twoGroups,
  equation: String.raw`\sum_k f_k \frac{\bar v_k}{4}\, e^{V/T_k} = u_B = \sqrt{\frac{Z e T_s}{M}}, \qquad \frac{1}{T_s} = \sum_k \frac{f_k}{T_k}`,
  twin: "the potential solves an equation that takes iteration",
  limits: [
    // Cold electrons are to hot ones what negative ions are to electrons: the same two Boltzmann groups, the same folds.
    oneEdge((T_c, T_h, hot) => {
      const [low, high] = [Math.min(T_c, T_h), Math.max(T_c, T_h)];
      const ofHigh = T_h >= T_c ? hot : 1 - hot;
      return [ofHigh > 0 ? bodyRatio((1 - ofHigh) / ofHigh, high / low) : 0, high / low];
    }),
    // The electrons that cross so large a drop are those of the hotter group.
    maxwellianTail((T_c, T_h, hot, ion) => ({
      V_w: twoGroups(T_c, T_h, hot, ion),
      T_e: hot > 0 ? Math.max(T_c, T_h) : T_c,
      ion,
      T_i: undefined,
    })),
  ],
  sources: [R91, LL],
  changes: first,
  example: [3, 30, 0.05, "Ar+"],
  accuracy: "solved to 1e-14, as far as the sum itself is that well conditioned",
});

const withError = (name: string, unit: string) => [
  { name, unit },
  { name: `${name}: error`, unit },
];

export const EEPFMOMENTS = entry("EEPFMOMENTS", {
  inputs: [energy, eepf],
  result: {
    columns: [
      ...withError("density", "m^-3"),
      ...withError("mean energy", "eV"),
      ...withError("effective temperature", "eV"),
      ...withError("screening temperature", "eV"),
      ...withError("random flux", "m^-2 s^-1"),
      { name: "points used", unit: "" },
      { name: "last energy used", unit: "eV" },
      { name: "what was done", unit: "" },
    ],
  },
  compute: (energy, series) => {
    const eepf = readEepf(energy, series);
    if (eepf instanceof Fault) return eepf;
    const row: Value[] = results.flatMap((of) => {
      const { value, error } = bounded(of, eepf);
      return [value, error];
    });
    return [[...row, eepf.points, eepf.tail.from, eepf.notes.join("; ")]];
  },
  equation: String.raw`n = \int \! \sqrt{E}\, F \,\mathrm{d}E, \quad T_\mathrm{eff} = \tfrac{2}{3} \langle E \rangle, \quad T_s = \frac{2}{\langle 1/E \rangle}, \quad \Gamma = \tfrac{1}{4} \sqrt{\frac{2e}{m}} \int \! E\, F \,\mathrm{d}E`,
  twin: "it integrates a measured column piece by piece",
  limits: [startsLow, finelySpaced, reachesFar, quietEnough],
  sources: [LL, R91],
  changes: first,
  example: [
    [[0.5], [1.5], [2.5], [3.5], [5], [7], [9], [12], [15], [18]],
    [[1.84e15], [1.32e15], [9.45e14], [6.77e14], [4.11e14], [2.11e14], [1.08e14], [3.98e13], [1.47e13], [5.39e12]],
  ],
  accuracy:
    "1e-12 for the function between the points as drawn; the error columns say what the points themselves allow",
});

export const EEPFFLOATING = entry("EEPFFLOATING", {
  inputs: [energy, eepf, ionInput()],
  result: quantities.voltage,
  compute: (energy, series, ion) => {
    const eepf = readEepf(energy, series);
    return eepf instanceof Fault ? eepf : eepfFloating(eepf, ion);
  },
  equation: String.raw`\tfrac{1}{4} \sqrt{\frac{2e}{m}} \int_{|V|}^{\infty} (E - |V|)\, F \,\mathrm{d}E = n \sqrt{\frac{Z e T_s}{M}}`,
  twin: "it integrates a measured column, and the potential takes iteration",
  limits: [startsLow, finelySpaced, tailMeasured, potentialCertain],
  sources: [R91, LL],
  changes: first,
  example: [
    [[0.5], [1.5], [2.5], [3.5], [5], [7], [9], [12], [15], [18], [21], [24], [27], [30]],
    [
      [1.84e15],
      [1.32e15],
      [9.45e14],
      [6.77e14],
      [4.11e14],
      [2.11e14],
      [1.08e14],
      [3.98e13],
      [1.47e13],
      [5.39e12],
      [1.98e12],
      [7.3e11],
      [2.68e11],
      [9.87e10],
    ],
    "Ar+",
  ],
  accuracy: "solved to 1e-12 for the function between the points as drawn; the noise of the points weighs far more",
});

export const electrons: Family = {
  title: "Electrons that are not one Maxwellian",
  entries: [HOTELECTRONPOTENTIAL, EEPFMOMENTS, EEPFFLOATING],
};

function twoGroups(T_c: number, T_h: number, hot: number, ion: Ion): number | Fault {
  const V = twoGroupFloatingPotential(T_c, T_h, hot, ion);
  return V < 0
    ? V
    : noSolution(
        "The ions arrive as fast as the electrons at V = 0, so no wall floats below the sheath edge; check ion.",
      );
}
