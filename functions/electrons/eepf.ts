import { Fault, noSolution } from "../cells/fault";
import { format } from "../cells/format";
import type { Series } from "../cells/series";
import { variance } from "../numerics/noise";
import { cumulate, type Crossing } from "./crossing";
import { readEepfTable, type EepfTable } from "./eepf-table";
import { lastResolved, lowDoubt, lowEnd, peakOf, tailDoubt, tailFrom, tailPiece, type Tail } from "./ends";
import { piecesThrough, spacingDoubt, sumsOf, weightsOf } from "./pieces";
import type { Piece } from "./product-integration";
import { noiseOf } from "./table-noise";

/** A measured probability function made ready for integrals: pieces from zero energy up, then an exponential tail. */
export interface Eepf {
  /** From zero energy to the last resolved one, without gaps. */
  pieces: Piece[];
  tail: Tail;
  crossing: Crossing;
  /** ∫ F E^p dE for p = −1/2, 1/2, 1 and 3/2, tail included. */
  sums: Float64Array;
  /** Variance of each point and its weights in the sums, so that noise can be followed into any result. */
  variances: Float64Array;
  weights: Float64Array;
  /** How far the sums may be off for other reasons: the end at zero energy, the spacing, the tail. */
  doubts: Float64Array[];
  energy: Float64Array;
  /** Number of measured points that the integrals use: those up to the noise. */
  points: number;
  notes: string[];
}

/** The two columns of a measurement, read, mended and said what was done; or why nothing can be made of them. */
export function readEepf(energy: Series, eepf: Series): Eepf | Fault {
  let ofEnergy = known.get(energy);
  if (!ofEnergy) known.set(energy, (ofEnergy = new WeakMap()));
  let found = ofEnergy.get(eepf);
  if (!found) {
    const table = readEepfTable(energy, eepf);
    ofEnergy.set(eepf, (found = table instanceof Fault ? table : prepare(table)));
  }
  return found;
}

/** One measurement with a long column of ions is prepared once. */
const known = new WeakMap<Series, WeakMap<Series, Eepf | Fault>>();

function prepare({ energy, F, notes }: EepfTable): Eepf | Fault {
  const noise = noiseOf(energy, F);
  const varianceOf = (value: number) => variance(noise, value);
  const last = lastResolved(F, varianceOf);
  const tail = tailFrom(energy, F, varianceOf, last);
  if (tail === undefined) {
    return noSolution(
      `The function does not clearly fall towards its last energy ${format(energy[last])} eV; measure further, or with less noise.`,
    );
  }
  const low = energy[0] > 0 ? lowEnd(energy, F, varianceOf) : undefined;
  const all = Array.from({ length: last + 1 }, (_, i) => i);
  const pieces = piecesThrough(all, energy, F, varianceOf, low?.value);
  const beyond = tailPiece(tail);
  const inTail = sumsOf([beyond]);
  const sums = sumsOf([...pieces, beyond]);
  if (!sums.every((sum) => sum > 0)) {
    return noSolution(
      "The negative values outweigh the positive ones, so there is no density; check sign and offset of eepf.",
    );
  }
  const weights = weightsOf(pieces, last + 1, low !== undefined);
  const doubts = [tailDoubt(inTail, tail), spacingDoubt(all, energy, F, varianceOf, low?.value)];
  if (low) doubts.push(lowDoubt(pieces[0], low));
  const variances = Float64Array.from(F.subarray(0, last + 1), varianceOf);
  const crossing = cumulate(pieces, tail);
  const eepf: Eepf = { pieces, tail, crossing, sums, variances, weights, doubts, energy, points: last + 1, notes };
  notes.push(...notesOn(eepf, F, inTail[1] / sums[1], low !== undefined));
  return eepf;
}

function notesOn({ points, energy, tail }: Eepf, F: Float64Array, tailShare: number, continued: boolean): string[] {
  const notes: string[] = [];
  const negative = F.subarray(0, points).filter((value) => value < 0).length;
  if (negative > 0)
    notes.push(`${negative} negative ${negative === 1 ? "value" : "values"} kept: they balance the noise`);
  const peak = peakOf(F);
  if (peak > 2 && F[0] < 0.8 * F[peak])
    notes.push(`falls towards zero energy below ${format(energy[peak])} eV; kept as measured`);
  if (continued) notes.push(`no point at zero energy: continued along the slope from ${format(energy[0])} eV`);
  const ends =
    points < F.length ? `sinks into the noise above ${format(tail.from)} eV` : `ends at ${format(tail.from)} eV`;
  notes.push(
    `${ends}: continued exponentially with ${format(1 / tail.steepness)} eV, ${format(100 * tailShare, 2)} % of the density`,
  );
  return notes;
}
