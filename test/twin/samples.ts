/** Inputs as the trade has them, at random, for every function that has a plain form. */
import type { Entry } from "../../functions/cells/entry";
import type { Input } from "../../functions/cells/inputs";
import { xoshiro128 } from "../../functions/numerics/random";

type Cell = string | number | null;
type Range = readonly [low: number, high: number];

/** By the input's name where it has a range of its own, else by the unit a bare number is read in. Common practice. */
const byName: Record<string, Range> = {
  V_wall: [-500, -10],
  V_plasma: [5, 60],
  V_w: [-200, -1],
  V_s: [10, 3000],
  V_dc: [30, 3000],
  V_rf: [10, 2000],
  J: [0.05, 50],
  T_i: [0.02, 20],
  T_g: [250, 1500],
  T_wall: [1500, 3000],
  E_iz: [10, 25],
  work_function: [1.5, 4.9],
  surface_energy: [0.5, 20],
  size: [0.01, 1],
  radius: [1e-5, 1e-3],
  length: [2e-3, 5e-2],
  edge_ratio: [0.05, 1],
  gamma_i: [1, 3],
  gamma_ion: [0.01, 0.2],
  u_ratio: [1, 4],
  delta_e: [0.01, 0.95],
  sputter_yield: [0.01, 5],
  alpha_s: [0.01, 20],
  gamma: [1, 100],
  hot_fraction: [0.01, 0.3],
};
const byUnit: Record<string, Range> = {
  "m^-3": [1e14, 1e19],
  eV: [0.5, 50],
  Pa: [0.05, 20],
  T: [1e-3, 5],
  m: [1e-4, 1e-2],
  "m^2": [1e-20, 1e-18],
  V: [1, 100],
  "m/s": [500, 50_000],
  Hz: [1e5, 1e8],
  s: [1e-8, 1e-5],
  deg: [1, 80],
  A: [1e-6, 1e-2],
  "A/m^2": [0.1, 100],
  "m^-2 s^-1": [1e18, 1e24],
  "kg/m^3": [500, 20_000],
  "A m^-2 K^-2": [1e5, 2e6],
};
const ions = ["Ar+", "H+", "D+", "He++", "Xe^2+", "N2+", "SF5+", 40, "131.29"];
const surfaces = ["Si", "Al2O3", "W", "C", 60.08];

/** Between 0 and 1, the same numbers on every run. */
export function seeded(seed: number): () => number {
  const bits = xoshiro128([seed, 2, 3, 4]);
  for (let i = 0; i < 20; i++) bits();
  return () => bits() / 2 ** 32;
}

/** Arguments for a front door: the example, then so many at random for each way to choose the words. */
export function samplesOf(entry: Entry<any>, each: number, random: () => number): Cell[][][][] {
  const rows = choices(entry.inputs).flatMap((chosen) =>
    Array.from({ length: each }, () => sampleRow(entry.inputs, chosen, random)),
  );
  const example = entry.example as readonly (Cell | Cell[][])[];
  return [example, ...rows].map((cells) => cells.map((cell) => (Array.isArray(cell) ? cell : [[cell]])));
}

/** For each input with words: each word, and a number where that will do, too. */
function choices(inputs: readonly Input[]): (Cell | undefined)[][] {
  return inputs.reduce<(Cell | undefined)[][]>(
    (rows, { words, quantity }) => {
      const options = [...(words ?? []), ...(words && !quantity ? [] : [undefined])];
      return rows.flatMap((row) => options.map((option) => [...row, option]));
    },
    [[]],
  );
}

function sampleRow(inputs: readonly Input[], chosen: (Cell | undefined)[], random: () => number): (Cell | Cell[][])[] {
  const mixture: Record<string, Cell[][]> = sampleMixture(random);
  return inputs.map((input, i) => {
    if (input.kind === "block") return mixture[input.name];
    if (chosen[i] !== undefined) return random() < 0.5 ? chosen[i] : String(chosen[i]).toUpperCase();
    if (input.optional && random() < 0.4) return null;
    if (input.kind === "ion") return pick(ions, random);
    return input.kind === "text" ? pick(surfaces, random) : sampleNumber(input, random);
  });
}

/** Even in the logarithm. */
function sampleNumber({ name, quantity }: Input, random: () => number): number {
  const range = byName[name] ?? byUnit[quantity?.unit ?? ""];
  if (!range) throw new Error(`No range of ${name} to take samples from: add one.`);
  const [low, high] = range;
  return low * (high / low) ** random();
}

function pick<T>(from: readonly T[], random: () => number): T {
  return from[Math.floor(random() * from.length)];
}

/** Two to four ions whose charges add up, and sometimes a blank line between them. */
function sampleMixture(random: () => number): Record<string, Cell[][]> {
  const kinds = ["Ar+", "He+", "Xe^2+", "N2+"].slice(0, 2 + Math.floor(3 * random()));
  const charges = kinds.map((ion) => (ion.includes("2+") && ion.includes("^") ? 2 : 1));
  const parts = kinds.map(() => 0.1 + random());
  const sum = parts.reduce((total, part) => total + part, 0);
  const mixture: [Cell, Cell][] = kinds.map((ion, i) => [ion, parts[i] / sum / charges[i]]);
  if (random() < 0.3) mixture.splice(1, 0, [null, null]);
  return { ions: mixture.map(([ion]) => [ion]), fractions: mixture.map(([, fraction]) => [fraction]) };
}
