import { n_edge, T_e } from "../cells/common-inputs";
import { entry, type Family } from "../cells/entry";
import { noSolution, type Fault } from "../cells/fault";
import { format } from "../cells/format";
import { ionInput, quantityInput } from "../cells/inputs";
import { quantities } from "../cells/quantities";
import { manyInDebyeSphere } from "../edge/limits";
import { electronSpeed } from "../edge/twins";
import type { Ion } from "../matter/ion";
import { BT59, LL } from "../sources";
import { bodyRatio, negativeIonEdges } from "./edges";
import { negativeIonsTurnBack, oneEdge } from "./limits";
import * as model from "./model";
import { electronegativeBohmSpeed } from "./twins";

const first = { "1.0.0": "first version" };
const closedForm = "closed form, 4 ulp";

/** Zero is a value: the plain sheath, without negative ions. */
const electronegativity = (name: string) =>
  quantityInput(name, quantities.notNegative, { band: { low: 0, high: 1e4, above: "n₋/n_e meant?" } });
const alpha_s = electronegativity("alpha_s");

/** Far beyond what discharges have, near enough that no power of it overflows. */
const gamma = quantityInput("gamma", quantities.ratio, {
  least: 1e-3,
  most: 1e6,
  example: "15",
  band: { low: 1, high: 1000, below: "T_e/T₋ meant, not its inverse?" },
});

export const NEGATIVEIONBOHMSPEED = entry("NEGATIVEIONBOHMSPEED", {
  inputs: [T_e, ionInput(), alpha_s, gamma],
  result: quantities.speed,
  compute: model.negativeIonBohmSpeed,
  equation: String.raw`u = \sqrt{\frac{Z e T_e}{M}\, \frac{1 + \alpha_s}{1 + \alpha_s \gamma}}, \qquad \gamma = \frac{T_e}{T_-}`,
  twin: { steps: [electronegativeBohmSpeed], formula: "u" },
  limits: [oneEdge((_T_e, _ion, alpha_s, gamma) => [bodyRatio(alpha_s, gamma), gamma])],
  sources: [BT59],
  changes: first,
  example: [3, "Ar+", 1, 15],
  accuracy: closedForm,
});

export const NEGATIVEIONEDGE = entry("NEGATIVEIONEDGE", {
  inputs: [electronegativity("alpha_b"), gamma],
  result: {
    columns: [
      { name: "alpha_s", unit: "" },
      { name: "drop/T_e", unit: "" },
      { name: "edge_ratio", unit: "" },
      { name: "u/u_B", unit: "" },
    ],
  },
  compute: (alpha_b, gamma) =>
    negativeIonEdges(alpha_b, gamma).map((alpha_s) => {
      const drop = model.edgeDrop(alpha_s, gamma);
      return [alpha_s, drop, Math.exp(-drop), Math.sqrt(2 * drop)];
    }),
  equation: String.raw`\alpha_b = \alpha_s \exp\!\left[\frac{(1 + \alpha_s)(\gamma - 1)}{2 (1 + \alpha_s \gamma)}\right], \qquad \frac{\Delta V}{T_e} = \frac{1 + \alpha_s}{2 (1 + \alpha_s \gamma)}`,
  twin: "alpha_s is a root that takes iteration, and there may be three",
  limits: [oneEdge((alpha_b, gamma) => [alpha_b, gamma])],
  sources: [BT59, LL],
  changes: first,
  example: [2, 15],
  accuracy: "1e-10, and fewer digits close to a fold, where the rounding of alpha_b itself moves two roots that meet",
});

export const NEGATIVEIONFLUX = entry("NEGATIVEIONFLUX", {
  inputs: [n_edge, T_e, ionInput(), alpha_s, gamma],
  result: quantities.flux,
  compute: model.negativeIonFlux,
  equation: String.raw`\Gamma_+ = n_\mathrm{edge} (1 + \alpha_s) \frac{u}{Z}`,
  twin: { steps: [electronegativeBohmSpeed], formula: "n_edge*(1+alpha_s)*u/Z" },
  limits: [
    oneEdge((_n, _T_e, _ion, alpha_s, gamma) => [bodyRatio(alpha_s, gamma), gamma]),
    manyInDebyeSphere((n_edge, T_e) => [n_edge, T_e]),
  ],
  sources: [LL],
  changes: first,
  example: [1e16, 3, "Ar+", 1, 15],
  accuracy: closedForm,
});

export const NEGATIVEIONPOTENTIAL = entry("NEGATIVEIONPOTENTIAL", {
  inputs: [T_e, ionInput(), alpha_s, gamma],
  result: quantities.voltage,
  compute: floating,
  equation: String.raw`V_f = -T_e \ln\frac{\bar v_e}{4 (1 + \alpha_s) u}`,
  twin: {
    steps: [electronegativeBohmSpeed, electronSpeed, { name: "excess", unit: "", formula: "v_e/(4*(1+alpha_s)*u)" }],
    formula: "IF(excess>1,-T_e*LN(excess),NA())",
  },
  limits: [
    negativeIonsTurnBack((T_e, ion, alpha_s, gamma) => {
      const V_f = floating(T_e, ion, alpha_s, gamma);
      return [typeof V_f === "number" ? V_f : undefined, T_e, gamma];
    }),
    oneEdge((_T_e, _ion, alpha_s, gamma) => [bodyRatio(alpha_s, gamma), gamma]),
  ],
  sources: [LL, BT59],
  changes: first,
  example: [3, "Ar+", 1, 15],
  accuracy: `${closedForm}, except where V_f nearly vanishes`,
});

export const negativeIons: Family = {
  title: "Negative ions",
  entries: [NEGATIVEIONBOHMSPEED, NEGATIVEIONEDGE, NEGATIVEIONFLUX, NEGATIVEIONPOTENTIAL],
};

/** The floating potential against the edge, or why there is none. */
function floating(T_e: number, ion: Ion, alpha_s: number, gamma: number): number | Fault {
  const excess = model.electronExcess(T_e, ion, alpha_s, gamma);
  return excess > 1
    ? -T_e * Math.log(excess)
    : noSolution(
        `The positive ions bring ${format(1 / excess)} times the charge that all electrons could balance, so no wall floats ` +
          "below the sheath edge; give a smaller alpha_s.",
      );
}
