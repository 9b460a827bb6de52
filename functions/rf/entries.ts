import { edge_ratio, lambda_i, n_bulk, n_edge, T_e } from "../cells/common-inputs";
import { entry, type Family } from "../cells/entry";
import { ionInput, optional, quantityInput, wordInput } from "../cells/inputs";
import { quantities } from "../cells/quantities";
import { manyInDebyeSphere } from "../edge/limits";
import { coldBohmSpeed, edgeDebyeLength } from "../edge/twins";
import { missingPath } from "../layer/inputs";
import { fallsFreely } from "../layer/limits";
import { ionMotions, ionTransitTime } from "../layer/model";
import { maxwellianTail } from "../wall/limits";
import { floatingOrWhyNot } from "../wall/potentials";
import { BB68, GE62, L88, L89, LL } from "../sources";
import {
  highVoltage,
  ionsFeelTheMean,
  manyPeriodsInTransit,
  neverReverses,
  pathSuitsRf,
  repelsAtTheTop,
} from "./limits";
import * as model from "./model";
import { logBesselI0, ratioOfAmplitude } from "./twins";

const first = { "1.0.0": "first version" };
const closedForm = "closed form, 4 ulp";

/** The mean drop across the sheath, a magnitude: no drop at all is a blank, not a sheath. */
const V_dc = quantityInput("V_dc", quantities.drop, { zeroIsValue: false });
const V_rf = quantityInput("V_rf", quantities.amplitude);
const s_m = quantityInput("s_m", quantities.width);

export const RFFLOATINGSHIFT = entry("RFFLOATINGSHIFT", {
  inputs: [V_rf, T_e],
  result: quantities.voltage,
  compute: model.rfFloatingShift,
  equation: String.raw`\Delta V_f = -T_e \ln I_0\!\left(\frac{V_\mathrm{rf}}{T_e}\right)`,
  twin: { steps: [ratioOfAmplitude, logBesselI0], formula: "-T_e*ln_I0" },
  limits: [repelsAtTheTop((V_rf, T_e) => [V_rf, T_e])],
  sources: [GE62],
  changes: first,
  example: [30, 3],
  accuracy: `${closedForm}, at any amplitude`,
});

export const IONENERGYSPREAD = entry("IONENERGYSPREAD", {
  inputs: [V_dc, V_rf, quantityInput("s", quantities.width), quantityInput("f", quantities.frequency), ionInput()],
  result: quantities.energy,
  compute: (V_dc, V_rf, s, f, ion) => model.ionEnergySpread(Math.abs(V_dc), V_rf, s, f, ion),
  equation: String.raw`\Delta E = \frac{8 Z V_\mathrm{rf}}{3\,\omega s} \sqrt{\frac{2 Z e V_\mathrm{dc}}{M}} \;\le\; 2 Z V_\mathrm{rf}, \qquad \omega = 2\pi f`,
  twin: {
    steps: [{ name: "omega", unit: "rad/s", formula: "2*PI()*f" }],
    formula: "MIN(8*Z*V_rf/(3*omega*s)*SQRT(2*Z*e*ABS(V_dc)/M),2*Z*V_rf)",
  },
  limits: [
    manyPeriodsInTransit((V_dc, _V_rf, s, f, ion) => f * ionTransitTime(Math.abs(V_dc), s, ion)),
    neverReverses((V_dc, V_rf) => [V_rf, V_dc]),
    fallsFreely((_V_dc, _V_rf, s) => s),
  ],
  sources: [BB68],
  changes: first,
  example: [300, 100, 0.005, 13.56e6, "Ar+"],
  accuracy: closedForm,
});

export const RFCHILDCURRENT = entry("RFCHILDCURRENT", {
  inputs: [V_dc, s_m, ionInput(), optional(wordInput("model", ionMotions), "collisionless"), optional(lambda_i)],
  result: quantities.currentDensity,
  compute: (V_dc, s_m, ion, word, lambda_i) => {
    const V = Math.abs(V_dc);
    if (word === "collisionless") return model.rfChildCurrent(V, s_m, ion);
    return lambda_i === undefined ? missingPath() : model.rfChildCurrentCollisional(V, s_m, ion, lambda_i);
  },
  equation: String.raw`J = \begin{cases} \dfrac{200}{243}\,\varepsilon_0 \sqrt{\dfrac{2Ze}{M}}\, \dfrac{V_\mathrm{dc}^{3/2}}{s_m^2} & \text{collisionless} \\ 1.678148\,\varepsilon_0 \sqrt{\dfrac{2Ze}{M}}\, \dfrac{V_\mathrm{dc}^{3/2} \lambda_i^{1/2}}{s_m^{5/2}} & \text{collisional} \end{cases}`,
  twin: {
    formula:
      'IF(model="collisionless",200/243*eps0*SQRT(2*Z*e/M)*ABS(V_dc)^(3/2)/s_m^2,IF(lambda_i="",NA(),' +
      `${model.collisionalCoefficient}*eps0*SQRT(2*Z*e/M)*ABS(V_dc)^(3/2)*SQRT(lambda_i)/s_m^(5/2)))`,
  },
  limits: [...pathSuitsRf((_V_dc, s_m, _ion, word, lambda_i) => [word, s_m, lambda_i]), ionsFeelTheMean()],
  sources: [L88, L89],
  changes: first,
  example: [300, 0.005, "Ar+"],
  accuracy: closedForm,
});

export const RFSHEATHWIDTH = entry("RFSHEATHWIDTH", {
  inputs: [V_dc, n_edge, T_e],
  result: quantities.length,
  compute: (V_dc, n_edge, T_e) => model.rfSheathWidth(Math.abs(V_dc), n_edge, T_e),
  equation: String.raw`s_m = \sqrt{\frac{50}{27}}\, \frac{\sqrt 2}{3}\, \lambda_D \left(\frac{2 V_\mathrm{dc}}{T_e}\right)^{3/4}`,
  twin: {
    steps: [edgeDebyeLength],
    formula: "SQRT(50/27)*SQRT(2)/3*lambda_D*(2*ABS(V_dc)/T_e)^(3/4)",
  },
  limits: [
    highVoltage((V_dc, _n_edge, T_e) => [V_dc, T_e]),
    fallsFreely((V_dc, n_edge, T_e) => model.rfSheathWidth(Math.abs(V_dc), n_edge, T_e)),
    ionsFeelTheMean(),
    manyInDebyeSphere((_V_dc, n_edge, T_e) => [n_edge, T_e]),
  ],
  sources: [L88],
  changes: first,
  example: [300, 1e16, 3],
  accuracy: closedForm,
});

export const SHEATHRESISTANCE = entry("SHEATHRESISTANCE", {
  inputs: [n_bulk, T_e, ionInput(), edge_ratio],
  result: quantities.resistance,
  compute: (n_bulk, T_e, ion, edge_ratio) => model.sheathResistance(edge_ratio * n_bulk, T_e, ion),
  equation: String.raw`R = \left|\frac{\mathrm{d}J}{\mathrm{d}V_w}\right|^{-1}_{V_f} = \frac{T_e}{e\, n_\mathrm{edge}\, u_B}`,
  twin: { steps: [coldBohmSpeed], formula: "T_e/(e*edge_ratio*n_bulk*u_B)" },
  limits: [
    // The slope is that of the electrons which cross: their own temperature counts.
    maxwellianTail((_n_bulk, T_e, ion) => ({ V_w: floatingOrWhyNot(T_e, ion), T_e, ion, T_i: undefined })),
    manyInDebyeSphere((n_bulk, T_e, _ion, edge_ratio) => [edge_ratio * n_bulk, T_e]),
  ],
  sources: [LL],
  changes: first,
  example: [1e17, 3, "Ar+"],
  accuracy: closedForm,
});

export const rf: Family = {
  title: "RF: a driven wall",
  entries: [RFFLOATINGSHIFT, IONENERGYSPREAD, RFCHILDCURRENT, RFSHEATHWIDTH, SHEATHRESISTANCE],
};
