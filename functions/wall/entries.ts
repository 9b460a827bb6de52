import { edge_ratio, n_bulk, T_e, T_i } from "../cells/common-inputs";
import { entry, type Family } from "../cells/entry";
import { Fault, noSolution } from "../cells/fault";
import { format } from "../cells/format";
import { ionInput, optional, quantityInput, wordInput } from "../cells/inputs";
import { quantities } from "../cells/quantities";
import { coldIons, manyInDebyeSphere } from "../edge/limits";
import { presheathDrop } from "../edge/model";
import type { Ion } from "../matter/ion";
import { HW67, LL, S00 } from "../sources";
import { emissionLimit } from "./emission-limit";
import { aboveGrazing, maxwellianTail, wallRepels, weakEmission } from "./limits";
import * as model from "./model";

const first = { "1.0.0": "first version" };
const closedForm = "closed form, 4 ulp";

/** Blank stays undefined, so that a limit can say that emission was left out; the models then take 0. */
const delta_e = optional(
  quantityInput("delta_e", quantities.notNegative, { band: { low: 0, high: 1, above: "percent meant?" } }),
);
/** Blank is normal incidence or no field at all: nothing to judge then. */
const angle = optional(quantityInput("angle", quantities.angle));

export const FLOATINGPOTENTIAL = entry("FLOATINGPOTENTIAL", {
  inputs: [T_e, ionInput(), T_i, delta_e, optional(wordInput("from", model.referencePoints), "edge"), edge_ratio],
  result: quantities.voltage,
  compute: (T_e, ion, T_i, delta_e, from, edge_ratio) => {
    const V_f = floating(T_e, ion, T_i, delta_e);
    return from === "edge" || V_f instanceof Fault ? V_f : V_f - presheathDrop(T_e, edge_ratio);
  },
  equation: String.raw`V_f = -T_e \ln\frac{(1-\delta_e)\,\bar v_e}{4 u_B} \;\left[\, + T_e \ln\frac{n_\mathrm{edge}}{n_\mathrm{bulk}} \text{ from the plasma}\right]`,
  limits: [
    wallRepels(
      (T_e, ion, T_i, delta_e) => numberOnly(floating(T_e, ion, T_i, delta_e)),
      (T_e) => T_e,
    ),
    weakEmission((_T_e, ion, _T_i, delta_e) => [ion, delta_e]),
    maxwellianTail((T_e, ion, T_i, delta_e) => [ion, numberOnly(floating(T_e, ion, T_i, delta_e))]),
    coldIons((_T_e, _ion, T_i) => T_i),
  ],
  sources: [LL, S00, HW67],
  changes: first,
  example: [3, "Ar+"],
  accuracy: `${closedForm}, except where V_f nearly vanishes`,
});

export const WALLFLUX = entry("WALLFLUX", {
  inputs: [n_bulk, T_e, ionInput(), T_i, edge_ratio, angle],
  result: quantities.flux,
  compute: (n_bulk, T_e, ion, T_i, edge_ratio, angle) =>
    model.ionFlux(edge_ratio * n_bulk, T_e, ion, T_i ?? 0, angle ?? 90),
  equation: String.raw`\Gamma_i = \frac{n_\mathrm{edge}}{n_\mathrm{bulk}}\, n_\mathrm{bulk}\, \frac{u_B}{Z} \sin\theta`,
  limits: [
    aboveGrazing((_n, T_e, ion, T_i, _ratio, angle) => [angle, T_e, ion, T_i]),
    coldIons((_n, _T_e, _ion, T_i) => T_i),
    manyInDebyeSphere((n_bulk, T_e, _ion, _T_i, edge_ratio) => [edge_ratio * n_bulk, T_e]),
  ],
  sources: [LL, S00],
  changes: first,
  example: [1e17, 3, "Ar+"],
  accuracy: closedForm,
});

export const IONCURRENTDENSITY = entry("IONCURRENTDENSITY", {
  inputs: [n_bulk, T_e, ionInput(), T_i, edge_ratio, angle],
  result: quantities.currentDensity,
  compute: (n_bulk, T_e, ion, T_i, edge_ratio, angle) =>
    model.ionCurrentDensity(edge_ratio * n_bulk, T_e, ion, T_i ?? 0, angle ?? 90),
  equation: String.raw`J_i = Z e\, \Gamma_i = e\, n_\mathrm{edge}\, u_B \sin\theta`,
  limits: WALLFLUX.limits,
  sources: [LL, S00],
  changes: first,
  example: [1e17, 3, "Ar+"],
  accuracy: closedForm,
});

export const wall: Family = {
  title: "Wall: what the wall draws",
  entries: [FLOATINGPOTENTIAL, WALLFLUX, IONCURRENTDENSITY],
};

/** The floating potential against the edge, or why there is none. */
function floating(T_e: number, ion: Ion, T_i = 0, delta_e = 0): number | Fault {
  if (delta_e > 0) {
    const limit = emissionLimit(ion);
    // Ions too light for an emission limit float at or above the edge with no emission at all: caught below.
    if (limit && delta_e >= limit.delta) {
      return noSolution(
        `delta_e ${format(delta_e)} reaches the space-charge limit ${format(limit.delta, 4)} of ${ion.label} (EMISSIONLIMIT); ` +
          `the wall then stays near ${format(-limit.drop * T_e)} V, whatever more it emits.`,
      );
    }
  }
  const V_f = model.floatingPotential(T_e, ion, T_i, delta_e);
  return V_f < 0
    ? V_f
    : noSolution(
        "The ions arrive as fast as the electrons at V_w = 0, so no wall floats below the sheath edge; check T_e, T_i and delta_e.",
      );
}

function numberOnly(value: number | Fault): number | undefined {
  return value instanceof Fault ? undefined : value;
}
