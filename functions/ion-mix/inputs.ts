import { isBlank } from "../cells/column";
import { badInput, Fault } from "../cells/fault";
import { format } from "../cells/format";
import { blockInput, ionInput, quantityInput, type Input } from "../cells/inputs";
import { quantities } from "../cells/quantities";
import type { Ion } from "../matter/ion";
import { chargeSum, type Share } from "./model";

/** A block's cells in reading order, undefined where blank. */
function readEach<T>(one: Input<T>) {
  return (cells: unknown[][]): (T | undefined)[] | Fault => {
    const values: (T | undefined)[] = [];
    for (const cell of cells.flat()) {
      const value = isBlank(one, cell) ? undefined : one.read(cell);
      if (value instanceof Fault) return value;
      values.push(value);
    }
    return values;
  };
}

/** Formulas or masses in u, one a cell. */
export const ions = { ...blockInput("ions", readEach(ionInput("ions"))), example: '"Ar+"' };

/** Densities over the electron density, one beside each ion. */
export const fractions = blockInput(
  "fractions",
  readEach(quantityInput("fractions", quantities.notNegative, { most: 1 })),
  quantities.ratio,
);

/** The sum of Z f may be off by this much: fractions typed with six decimals pass, a forgotten species does not. */
const tolerance = 1e-6;

/** The mixture that the two ranges describe, row by row without the blank ones, or what is wrong with it. */
export function readMix(
  ions: readonly (Ion | undefined)[],
  fractions: readonly (number | undefined)[],
): Share[] | Fault {
  if (ions.length !== fractions.length) {
    return badInput(
      "fractions",
      `${fractions.length} for ${ions.length} ions`,
      "select ranges of the same size, one fraction for each ion",
    );
  }
  const mix: Share[] = [];
  for (let i = 0; i < ions.length; i++) {
    const ion = ions[i];
    const fraction = fractions[i];
    if (ion && fraction !== undefined) mix.push({ ion, fraction });
    else if (ion)
      return badInput("fractions", `the one beside ${ion.label} is blank`, "type its density over n_e, such as 0.2");
    // An empty cell arrives as 0 on some platforms: only a fraction above 0 misses its ion.
    else if (fraction)
      return badInput("ions", `the one beside ${format(fraction)} is blank`, 'type a formula such as "Ar+"');
  }
  if (mix.length === 0)
    return badInput("ions", "the range is empty", 'select formulas such as "Ar+" with a fraction beside each');
  return carriesCharge(mix) ?? mix;
}

function carriesCharge(mix: readonly Share[]): Fault | undefined {
  const sum = chargeSum(mix);
  if (Math.abs(sum - 1) <= tolerance) return undefined;
  return badInput(
    "fractions",
    `the charges Z f sum to ${format(sum, 7)}, not 1`,
    sum > 0
      ? `type densities over n_e: divide each by ${format(sum, 7)} if nothing is missing`
      : "type densities over n_e, such as 0.2 and 0.8",
  );
}
