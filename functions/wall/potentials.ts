import { Fault, noSolution } from "../cells/fault";
import { format } from "../cells/format";
import type { Ion } from "../matter/ion";
import { emissionLimit } from "./emission-limit";
import * as model from "./model";

/** The wall potentials of the model, each with the reason where it has none. T_i and δ left blank are 0. */

export function floatingOrWhyNot(T_e: number, ion: Ion, T_i = 0, delta_e = 0): number | Fault {
  if (delta_e > 0) {
    const limit = emissionLimit(ion);
    // An ion too light for an emission limit floats at or above the edge with no emission at all: caught below.
    if (limit && delta_e >= limit.delta) {
      return noSolution(
        `${beyondLimit(delta_e, limit.delta, ion)}; a floating wall then stays near ${format(-limit.drop * T_e)} V, whatever more it emits.`,
      );
    }
  }
  const V_f = model.floatingPotential(T_e, ion, T_i, delta_e);
  return V_f < 0
    ? V_f
    : noSolution(
        "As many ions as electrons reach a wall at V_w = 0, so none floats below the sheath edge; check T_e, T_i and delta_e.",
      );
}

/** The potential at which a wall draws the current density J, on the branch V_w ≤ 0. */
export function voltageOrWhyNot(
  J: number,
  n_edge: number,
  T_e: number,
  ion: Ion,
  T_i = 0,
  delta_e = 0,
): number | Fault {
  const limit = delta_e > 0 ? emissionLimit(ion) : undefined;
  if (delta_e >= (limit?.delta ?? 1)) {
    return noSolution(`${beyondLimit(delta_e, limit?.delta ?? 1, ion)}; give a smaller delta_e.`);
  }
  const V_w = model.wallVoltage(J, n_edge, T_e, ion, T_i, delta_e);
  // The end itself belongs to the branch, wherever rounding puts it.
  if (V_w <= 1e-14 * T_e && V_w > -Infinity) return Math.min(V_w, 0);
  if (V_w > 0) {
    const most = model.wallCurrent(-Number.MIN_VALUE, n_edge, T_e, ion, T_i, delta_e);
    return noSolution(
      `J ${format(J, 4)} A/m² is more negative than the ${format(most, 4)} A/m² that a wall draws at V_w = 0, where this inverse ends; give a larger J.`,
    );
  }
  const saturation = model.ionCurrentDensity(n_edge, T_e, ion, T_i, 90);
  return noSolution(
    `J ${format(J, 4)} A/m² is not below the ion saturation current ${format(saturation, 4)} A/m², which no voltage reaches; ` +
      "give a smaller J, or check n_bulk and T_e.",
  );
}

/** The wall potential that V_w stands for in a function whose ions must be attracted. */
export function repellingOrWhyNot(
  V_w: number | "floating",
  T_e: number,
  ion: Ion,
  T_i?: number,
  delta_e?: number,
): number | Fault {
  if (V_w === "floating") return floatingOrWhyNot(T_e, ion, T_i, delta_e);
  return V_w <= 0
    ? V_w
    : noSolution(
        `V_w ${format(V_w)} V would repel the ions, and the model ends at V_w = 0; type a bias magnitude as negative, ${format(-V_w)}.`,
      );
}

function beyondLimit(delta_e: number, limit: number, ion: Ion): string {
  return `delta_e ${format(delta_e)} reaches the space-charge limit ${format(limit, 4)} of ${ion.label} (EMISSIONLIMIT)`;
}
