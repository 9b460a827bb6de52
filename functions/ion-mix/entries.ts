import { edge_ratio, n_bulk, T_e } from "../cells/common-inputs";
import { entry, type Family } from "../cells/entry";
import { Fault } from "../cells/fault";
import { optional, wordInput } from "../cells/inputs";
import { quantities } from "../cells/quantities";
import { manyInDebyeSphere } from "../edge/limits";
import { bohmSpeed } from "../edge/model";
import { e } from "../matter/constants";
import { BHC09, R95 } from "../sources";
import { fractions, ions, readMix } from "./inputs";
import { ruleSuitsMixture } from "./limits";
import * as model from "./model";
import { speedOfOne, speedTogether } from "./twins";

const first = { "1.0.0": "first version" };
const closedForm = "closed form, 4 ulp";
const rule = optional(wordInput("rule", model.mixRules), "common");

export const IONMIXSPEEDS = entry("IONMIXSPEEDS", {
  inputs: [T_e, ions, fractions, rule],
  result: {
    columns: [
      { name: "ion", unit: "" },
      { name: "speed", unit: quantities.speed.unit },
      { name: "speed/u_B", unit: "" },
    ],
  },
  compute: (T_e, ions, fractions, rule) => {
    const mix = readMix(ions, fractions);
    if (mix instanceof Fault) return mix;
    return mix.map(({ ion }) => {
      const speed = model.edgeSpeed(T_e, ion, mix, rule);
      return [ion.label, speed, speed / bohmSpeed(T_e, ion)];
    });
  },
  equation: String.raw`u_j = \begin{cases} \sqrt{\sum_k f_k Z_k^2\, \dfrac{e T_e}{M_k}} & \text{common} \\ \sqrt{\dfrac{Z_j e T_e}{M_j}} & \text{own} \end{cases} \qquad \sum_j \frac{f_j Z_j^2\, e T_e}{M_j u_j^2} = 1, \quad \sum_j Z_j f_j = 1`,
  twin: {
    steps: [speedTogether],
    formula: { speed: speedOfOne, "speed/u_B": `${speedOfOne}/SQRT(Z*e*T_e/M)` },
  },
  limits: ruleSuitsMixture((_T_e, ions, fractions, rule) => [readMix(ions, fractions), rule]),
  sources: [R95, BHC09],
  changes: first,
  example: [3, [["Ar+"], ["He+"]], [[0.6], [0.4]]],
  accuracy: closedForm,
});

export const IONMIXFLUXES = entry("IONMIXFLUXES", {
  inputs: [n_bulk, T_e, ions, fractions, rule, edge_ratio],
  result: {
    columns: [
      { name: "ion", unit: "" },
      { name: "flux", unit: quantities.flux.unit },
      { name: "current_density", unit: quantities.currentDensity.unit },
    ],
  },
  compute: (n_bulk, T_e, ions, fractions, rule, edge_ratio) => {
    const mix = readMix(ions, fractions);
    if (mix instanceof Fault) return mix;
    return mix.map(({ ion, fraction }) => {
      const flux = fraction * edge_ratio * n_bulk * model.edgeSpeed(T_e, ion, mix, rule);
      return [ion.label, flux, ion.charge * e * flux];
    });
  },
  equation: String.raw`\Gamma_j = f_j\, n_\mathrm{edge}\, u_j, \qquad J_j = Z_j e\, \Gamma_j`,
  twin: {
    steps: [speedTogether],
    formula: {
      flux: `fractions*edge_ratio*n_bulk*${speedOfOne}`,
      current_density: `Z*e*fractions*edge_ratio*n_bulk*${speedOfOne}`,
    },
  },
  limits: [
    ...ruleSuitsMixture((_n, _T_e, ions, fractions, rule) => [readMix(ions, fractions), rule]),
    manyInDebyeSphere((n_bulk, T_e, _ions, _fractions, _rule, edge_ratio) => [edge_ratio * n_bulk, T_e]),
  ],
  sources: [R95, BHC09],
  changes: first,
  example: [1e17, 3, [["Ar+"], ["He+"]], [[0.6], [0.4]]],
  accuracy: closedForm,
});

export const ionMix: Family = {
  title: "Several ion species",
  entries: [IONMIXSPEEDS, IONMIXFLUXES],
};
