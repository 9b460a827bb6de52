/**
 * Atomic weights by symbol, in u: the abundance-weighted isotopic masses of IUPAC/CIAAW as the package
 * chemical-elements carries them. The build runs this file once and ships its result (see manifest/build/freeze-loader.js),
 * so that the isotope tables stay out of functions.js.
 */
import { elements } from "chemical-elements";

/** Isotopes that plasma people write with a letter of their own; AME2020 atomic masses. */
const isotopes = { D: 2.01410177784, T: 3.01604928132 };

export const atomicWeights: Record<string, number> = {
  ...Object.fromEntries(elements.filter(({ mass }) => mass).map(({ symbol, mass }) => [symbol, mass as number])),
  ...isotopes,
};

/** English element names, lower case, to suggest the symbol to someone who types the name. */
export const symbolsByName: Record<string, string> = {
  ...Object.fromEntries(elements.map(({ symbol, name }) => [name.toLowerCase(), symbol])),
  deuterium: "D",
  tritium: "T",
};
