import { badInput, type Fault } from "../cells/fault";
import type { Series } from "../cells/series";

/** A measured probability function in order: rising energies, each once, in eV, with F in eV^(−3/2) m⁻³. */
export interface EepfTable {
  energy: Float64Array;
  F: Float64Array;
  /** What was done to get there. */
  notes: string[];
}

/** Fewer energies than this leave no noise to see and no slope to continue. */
const fewest = 6;

/** Two columns put in order, and what that took. */
export function readEepfTable(energy: Series, eepf: Series): EepfTable | Fault {
  const size = energy.values.length;
  if (eepf.values.length !== size) {
    const given = `${eepf.values.length} cells do not match the ${size} of energy`;
    return badInput("eepf", given, "select two columns of the same length");
  }
  for (const series of [energy, eepf]) {
    const [row] = series.errors;
    if (row !== undefined) {
      return badInput(series.name, `row ${row + 1} holds an error`, "mend that cell first; #N/A counts as no reading");
    }
  }
  const notes = [energy, eepf].flatMap(({ name, unit }) =>
    unit ? [`${name} read in ${unit}, as its heading says`] : [],
  );
  const points = usablePoints(energy, eepf, notes);
  const table = inOrder(points, notes);
  const found = table.energy.length;
  if (found < fewest) {
    return badInput("energy", `only ${found} different energies have a value`, `give at least ${fewest}`);
  }
  if (!table.F.some((F) => F > 0))
    return badInput("eepf", "no value is above 0", "give the function itself, not its logarithm");
  return table;
}

type Point = readonly [energy: number, F: number];

function usablePoints(energy: Series, eepf: Series, notes: string[]): Point[] {
  const points: Point[] = [];
  let [unread, below] = [0, 0];
  for (let i = 0; i < energy.values.length; i++) {
    const [E, F] = [energy.values[i], eepf.values[i]];
    // An empty cell may arrive as 0: a pair of them is an empty row, and F = 0 exactly is no reading.
    if (energy.blank[i] && eepf.blank[i]) continue;
    if (!(E - E === 0) || !(F - F === 0) || eepf.blank[i]) {
      if (!isHeading(energy, eepf, i)) unread++;
    } else if (E < 0) below++;
    else points.push([E, F]);
  }
  const word = eepf.word ?? energy.word;
  if (unread > 0) notes.push(`${rows(unread)} without a reading left out${word ? ` ("${word}")` : ""}`);
  if (below > 0) notes.push(`${rows(below)} below zero energy left out`);
  return points;
}

/** Text in both cells above the first number. */
function isHeading(energy: Series, eepf: Series, i: number): boolean {
  return energy.heading[i] === 1 || eepf.heading[i] === 1;
}

/** Sorted, with the values of a repeated energy averaged. */
function inOrder(points: Point[], notes: string[]): EepfTable {
  const sorted = points.every(([E], i) => i === 0 || E >= points[i - 1][0]);
  if (!sorted) {
    points.sort(([a], [b]) => a - b);
    notes.push("rows sorted by energy");
  }
  const energy: number[] = [];
  const F: number[] = [];
  const counts: number[] = [];
  for (const [E, value] of points) {
    const last = energy.length - 1;
    if (energy[last] === E) {
      counts[last]++;
      F[last] += (value - F[last]) / counts[last];
    } else {
      energy.push(E);
      F.push(value);
      counts.push(1);
    }
  }
  const repeated = counts.filter((count) => count > 1).length;
  if (repeated > 0) notes.push(`${repeated} repeated ${repeated === 1 ? "energy" : "energies"} averaged`);
  return { energy: Float64Array.from(energy), F: Float64Array.from(F), notes };
}

function rows(count: number): string {
  return `${count} row${count === 1 ? "" : "s"}`;
}
