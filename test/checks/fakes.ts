import { entry, NotTested, type Entry } from "../../functions/cells/entry";
import { badInput, noSolution } from "../../functions/cells/fault";
import { ionInput, optional, quantityInput, quantityOrWord, wordInput } from "../../functions/cells/inputs";
import { quantities } from "../../functions/cells/quantities";
import type { Directory } from "../../functions/checks/directory";
import { CP } from "../../functions/sources";

const facts = { equation: "", sources: [CP], changes: { "1.0.0": "first" }, accuracy: "exact", example: [] };

/** A function with a limit of each kind, and no physics. */
export const OHMICDROP = entry("OHMICDROP", {
  ...facts,
  inputs: [
    quantityInput("n_e", quantities.density),
    quantityInput("T_e", quantities.temperature),
    optional(quantityInput("size", quantities.length)),
    optional(wordInput("shape", ["flat", "round"]), "flat"),
  ],
  result: quantities.voltage,
  compute: (n_e, T_e, size) => {
    if (size === 7) return badInput("size", "seven is taken", "type another");
    return T_e > 500 ? noSolution("Above 500 eV there is no solution") : n_e / T_e / (size ?? 1);
  },
  limits: [
    {
      assumption: "the plasma is warm",
      measure: "T_e/eV",
      value: (_n_e, T_e) => T_e,
      holds: 3,
      fails: 1,
      reason: "the plasma is cold",
      source: CP,
    },
    {
      assumption: "the body is small",
      measure: "size/m",
      value: (_n_e, _T_e, size) => (size === undefined ? new NotTested("size") : size),
      holds: 0.1,
      fails: 1,
      reason: "the body is too large",
      source: CP,
    },
    {
      assumption: "the body is round",
      measure: "roundness",
      value: (_n_e, _T_e, _size, shape) => (shape === "round" ? 1 : undefined),
      holds: 1,
      fails: 1,
      reason: "the body is square",
      source: CP,
    },
  ],
});

/** A function that stands on one limit, the path, and has another that is easily met. */
export const FREEFALL = entry("FREEFALL", {
  ...facts,
  inputs: [quantityInput("V", quantities.voltage), optional(quantityInput("path", quantities.length))],
  result: quantities.energy,
  compute: (V) => V,
  limits: [
    {
      assumption: "the voltage is high",
      measure: "V/V",
      value: (V) => V,
      holds: 30,
      fails: 3,
      reason: "the voltage is low",
      source: CP,
    },
    {
      assumption: "nothing is in the way",
      measure: "path/m",
      value: (_V, path) => path ?? new NotTested("path"),
      holds: 3,
      fails: 1,
      reason: "something is in the way",
      source: CP,
      decisive: true,
    },
  ],
});

export const NOLIMITS = entry("NOLIMITS", {
  ...facts,
  inputs: [quantityInput("x", quantities.number)],
  result: quantities.number,
  compute: (x) => 1 / x,
});

export const CUBEROOT = entry("CUBEROOT", {
  ...facts,
  inputs: [
    quantityInput("V", quantities.voltage),
    optional(ionInput("ion")),
    optional(quantityOrWord("W", quantities.voltage, ["floating"])),
  ],
  result: quantities.length,
  compute: (V) => (V < 0 ? noSolution("Below 0 V there is no root") : Math.cbrt(V)),
});

export const SQUARE = entry("SQUARE", {
  ...facts,
  inputs: [quantityInput("x", quantities.number)],
  result: quantities.number,
  compute: (x) => x * x,
});

export const SUM4 = entry("SUM4", {
  ...facts,
  inputs: ["x1", "x2", "x3", "x4"].map((name) => quantityInput(name, quantities.number)),
  result: quantities.number,
  compute: (...x: number[]) => x.reduce((sum, each) => sum + each, 0),
});

export const NARROW = entry("NARROW", {
  ...facts,
  inputs: [quantityInput("x", quantities.number)],
  result: quantities.number,
  compute: (x) => (x > 1 && x < 2 ? x : noSolution("There is a solution between 1 and 2 only")),
});

export const SHARP = entry("SHARP", {
  ...facts,
  inputs: [quantityInput("x", quantities.number)],
  result: quantities.number,
  compute: Math.abs,
});

export const CELSIUS = entry("CELSIUS", {
  ...facts,
  inputs: [quantityInput("T", quantities.wallTemperature)],
  result: quantities.wallTemperature,
  compute: (T) => 2 * T,
});

export function directoryOf(...entries: Entry<any>[]): Directory {
  return { named: (name) => entries.find((each) => each.name === name.toUpperCase()), all: () => entries };
}
