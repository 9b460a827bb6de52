import { lambda_i, n_edge, T_e, V_s } from "../cells/common-inputs";
import { entry, type Family, type Table, type Value } from "../cells/entry";
import { noSolution, type Fault } from "../cells/fault";
import { format, prettyUnit } from "../cells/format";
import { ionInput, optional, quantityInput, wordInput } from "../cells/inputs";
import { quantities } from "../cells/quantities";
import { manyInDebyeSphere } from "../edge/limits";
import { plasmaFrequency } from "../edge/model";
import { edgeDebyeLength } from "../edge/twins";
import { m_e } from "../matter/constants";
import type { Ion } from "../matter/ion";
import { DV63, L89J, LL, R91 } from "../sources";
import { impactBins, primaries } from "./impact-distribution";
import { header, missingPath, notWhole, points, u_ratio } from "./inputs";
import * as limits from "./limits";
import * as model from "./model";
import { bohmEnd, dropAtEnd } from "./nonlinear-sheath";
import { sheathProfile } from "./sheath-profile";
import { drop, fieldAtWall } from "./twins";

const first = { "1.0.0": "first version" };
const closedForm = "closed form, 4 ulp";
const s = quantityInput("s", quantities.width);
const motion = optional(wordInput("model", model.ionMotions), "collisionless");
const path = optional(lambda_i);
const inDebyeSphere = manyInDebyeSphere((_V_s, n_edge, T_e) => [n_edge, T_e]);

export const SHEATHWIDTH = entry("SHEATHWIDTH", {
  inputs: [V_s, n_edge, T_e, optional(wordInput("model", model.sheathModels), "child"), path],
  result: quantities.length,
  compute: width,
  equation: String.raw`s = \begin{cases} \dfrac{\sqrt 2}{3}\,\lambda_D \left(\dfrac{2 V_s}{T_e}\right)^{3/4} & \text{child} \\ \lambda_D \sqrt{\dfrac{2 V_s}{T_e}} & \text{matrix} \\ \lambda_D \displaystyle\int_{\eta_1}^{V_s/T_e} \frac{\mathrm{d}\eta}{\sqrt{2\left(\sqrt{1 + 2\eta} + e^{-\eta} - 2\right)}}, \quad \frac{1}{\sqrt{1 + 2\eta_1}} - e^{-\eta_1} = 0.01 & \text{full} \\ \left[\dfrac{2}{3}\left(\dfrac{5}{3}\right)^{3/2} \dfrac{\varepsilon_0}{e\, n_\mathrm{edge}} \sqrt{\dfrac{2\lambda_i}{\pi T_e}}\; V_s^{3/2}\right]^{2/5} & \text{collisional} \end{cases}`,
  twin: {
    steps: [edgeDebyeLength],
    formula:
      'IF(model="child",SQRT(2)/3*lambda_D*(2*ABS(V_s)/T_e)^(3/4),IF(model="matrix",lambda_D*SQRT(2*ABS(V_s)/T_e),' +
      'IF(model="full",NA(),IF(lambda_i="",NA(),' +
      "(2/3*(5/3)^(3/2)*eps0/(e*n_edge)*SQRT(2*lambda_i/(PI()*T_e))*ABS(V_s)^(3/2))^(2/5)))))",
    except: { model: ["full"] },
  },
  limits: [
    limits.electronFree(
      (V_s, _n_edge, T_e, word) => (word === "child" || word === "collisional" ? [V_s, T_e] : undefined),
      '; model "full" counts them, for ions that fall freely',
    ),
    limits.electronsSwept((V_s, _n_edge, T_e, word) => (word === "matrix" ? [V_s, T_e] : undefined)),
    ...limits.pathSuits((V_s, n_edge, T_e, word, lambda_i) => {
      if (word === "matrix") return undefined;
      const s = width(V_s, n_edge, T_e, word, lambda_i);
      return [word === "collisional" ? word : "collisionless", typeof s === "number" ? s : NaN, lambda_i];
    }),
    limits.pathAboveDebye((_V_s, n_edge, T_e, word, lambda_i) =>
      word === "collisional" ? [lambda_i, n_edge, T_e] : undefined,
    ),
    limits.longPresheath((_V_s, n_edge, T_e, word, lambda_i) =>
      word === "full" ? [lambda_i, n_edge, T_e] : undefined,
    ),
    limits.justFormed((_V_s, _n_edge, _T_e, word) => word === "matrix"),
    inDebyeSphere,
  ],
  sources: [LL, R91],
  changes: first,
  example: [300, 1e16, 3],
  accuracy: `${closedForm}; "full" 1e-12`,
});

export const CHILDCURRENT = entry("CHILDCURRENT", {
  inputs: [V_s, s, ionInput(), motion, path],
  result: quantities.currentDensity,
  compute: (V_s, s, ion, word, lambda_i) => {
    if (word === "collisionless") return model.childCurrent(Math.abs(V_s), s, ion);
    return lambda_i === undefined ? missingPath() : model.collisionalCurrent(Math.abs(V_s), s, ion, lambda_i);
  },
  equation: String.raw`J = \begin{cases} \dfrac{4}{9}\,\varepsilon_0 \sqrt{\dfrac{2Ze}{M}}\, \dfrac{V_s^{3/2}}{s^2} & \text{collisionless} \\ \dfrac{2}{3}\left(\dfrac{5}{3}\right)^{3/2} \varepsilon_0 \sqrt{\dfrac{2Ze\lambda_i}{\pi M}}\, \dfrac{V_s^{3/2}}{s^{5/2}} & \text{collisional} \end{cases}`,
  twin: {
    formula:
      'IF(model="collisionless",4/9*eps0*SQRT(2*Z*e/M)*ABS(V_s)^(3/2)/s^2,IF(lambda_i="",NA(),' +
      "2/3*(5/3)^(3/2)*eps0*SQRT(2*Z*e*lambda_i/(PI()*M))*ABS(V_s)^(3/2)/s^(5/2)))",
  },
  limits: [
    ...limits.pathSuits((_V_s, s, _ion, word, lambda_i) => [word, s, lambda_i]),
    limits.noFieldEmission((V_s, s, _ion, word) => lawField(V_s, s, word)),
  ],
  sources: [LL],
  changes: first,
  example: [300, 1e-3, "Ar+"],
  accuracy: closedForm,
});

export const CHILDWIDTH = entry("CHILDWIDTH", {
  inputs: [
    V_s,
    quantityInput("J", quantities.currentDensity, { least: Number.MIN_VALUE, zeroIsValue: false }),
    ionInput(),
    motion,
    path,
  ],
  result: quantities.length,
  compute: widthFor,
  equation: String.raw`s = \begin{cases} \left[\dfrac{4}{9}\,\varepsilon_0 \sqrt{\dfrac{2Ze}{M}}\, \dfrac{V_s^{3/2}}{J}\right]^{1/2} & \text{collisionless} \\ \left[\dfrac{2}{3}\left(\dfrac{5}{3}\right)^{3/2} \varepsilon_0 \sqrt{\dfrac{2Ze\lambda_i}{\pi M}}\, \dfrac{V_s^{3/2}}{J}\right]^{2/5} & \text{collisional} \end{cases}`,
  twin: {
    formula:
      'IF(model="collisionless",SQRT(4/9*eps0*SQRT(2*Z*e/M)*ABS(V_s)^(3/2)/J),IF(lambda_i="",NA(),' +
      "(2/3*(5/3)^(3/2)*eps0*SQRT(2*Z*e*lambda_i/(PI()*M))*ABS(V_s)^(3/2)/J)^(2/5)))",
  },
  limits: [
    ...limits.pathSuits((V_s, J, ion, word, lambda_i) => [
      word,
      found(widthFor(V_s, J, ion, word, lambda_i)),
      lambda_i,
    ]),
    limits.noFieldEmission((V_s, J, ion, word, lambda_i) =>
      lawField(V_s, found(widthFor(V_s, J, ion, word, lambda_i)), word),
    ),
  ],
  sources: [LL],
  changes: first,
  example: [300, 50, "Ar+"],
  accuracy: closedForm,
});

export const WALLFIELD = entry("WALLFIELD", {
  inputs: [V_s, n_edge, T_e, u_ratio],
  result: quantities.field,
  compute: (V_s, n_edge, T_e, u_ratio) => model.wallField(Math.abs(V_s), n_edge, T_e, u_ratio),
  equation: String.raw`E = \frac{T_e}{\lambda_D} \sqrt{2\left[\mu^2\left(\sqrt{1 + \frac{2\eta}{\mu^2}} - 1\right) + e^{-\eta} - 1\right]}, \qquad \eta = \frac{V_s}{T_e}, \quad \mu = \frac{u_0}{u_B}`,
  twin: { steps: [edgeDebyeLength, drop, fieldAtWall], formula: "E" },
  limits: [
    limits.noFieldEmission((V_s, n_edge, T_e, u_ratio) => model.wallField(Math.abs(V_s), n_edge, T_e, u_ratio)),
    limits.fallsFreely(fullWidth),
    inDebyeSphere,
  ],
  sources: [R91, LL],
  changes: first,
  example: [300, 1e16, 3],
  accuracy: `${closedForm}, down to the edge`,
});

export const SHEATHPOTENTIAL = entry("SHEATHPOTENTIAL", {
  inputs: [quantityInput("x", quantities.distance), V_s, n_edge, T_e, u_ratio],
  result: quantities.voltage,
  compute: (x, V_s, n_edge, T_e, u_ratio) => model.sheathPotential(x, Math.abs(V_s), n_edge, T_e, u_ratio),
  equation: String.raw`x = \lambda_D \int_{-\varphi/T_e}^{V_s/T_e} \frac{\mathrm{d}\eta}{\sqrt{2\left[\mu^2\left(\sqrt{1 + 2\eta/\mu^2} - 1\right) + e^{-\eta} - 1\right]}}`,
  twin: "the distance is an integral over the potential, and its inverse takes iteration",
  limits: [
    limits.insideSheath((x, V_s, n_edge, T_e, u_ratio) => [x, V_s, n_edge, T_e, u_ratio]),
    limits.fallsFreely((_x, V_s, n_edge, T_e) => fullWidth(V_s, n_edge, T_e)),
    manyInDebyeSphere((_x, _V_s, n_edge, T_e) => [n_edge, T_e]),
  ],
  sources: [R91],
  changes: first,
  example: [1e-3, 300, 1e16, 3],
  accuracy: "1e-11, from the wall to far out in the tail",
});

const profileColumns = [
  { name: "x", unit: "m" },
  { name: "potential", unit: "V" },
  { name: "field", unit: "V/m" },
  { name: "Z n_i", unit: "m^-3" },
  { name: "n_e", unit: "m^-3" },
  { name: "speed/u_B", unit: "" },
];

export const SHEATHPROFILE = entry("SHEATHPROFILE", {
  inputs: [V_s, n_edge, T_e, u_ratio, points, header],
  result: { columns: profileColumns, curve: { x: "x", y: ["potential", "Z n_i", "n_e"] } },
  compute: (V_s, n_edge, T_e, u_ratio, points, header) => {
    const V = Math.abs(V_s);
    if (!Number.isInteger(points)) return notWhole(points);
    if (V / T_e < dropAtEnd(u_ratio)) return tooLow(V / T_e, dropAtEnd(u_ratio));
    const rows = sheathProfile(V, n_edge, T_e, u_ratio, points).map((at) => [
      at.x,
      at.potential,
      at.field,
      at.ionDensity,
      at.electronDensity,
      at.speed,
    ]);
    return titled(header, profileColumns, rows);
  },
  equation: String.raw`\lambda_D^2\,\frac{\mathrm{d}^2\eta}{\mathrm{d}x^2} = \left(1 + \frac{2\eta}{\mu^2}\right)^{-1/2} - e^{-\eta}, \qquad \eta = -\frac{\varphi}{T_e}, \quad \mu = \frac{u_0}{u_B}`,
  twin: "the distance is an integral over the potential",
  limits: [
    limits.noFieldEmission((V_s, n_edge, T_e, u_ratio) => model.wallField(Math.abs(V_s), n_edge, T_e, u_ratio)),
    limits.fallsFreely(fullWidth),
    inDebyeSphere,
  ],
  sources: [R91, LL],
  changes: first,
  example: [300, 1e16, 3],
  accuracy: "1e-12",
});

export const IONTRANSITTIME = entry("IONTRANSITTIME", {
  inputs: [V_s, s, ionInput()],
  result: quantities.time,
  compute: (V_s, s, ion) => model.ionTransitTime(Math.abs(V_s), s, ion),
  equation: String.raw`\tau_i = 3 s \sqrt{\frac{M}{2 Z e V_s}}`,
  twin: { formula: "3*s*SQRT(M/(2*Z*e*ABS(V_s)))" },
  limits: [limits.fallsFreely((_V_s, s) => s)],
  sources: [LL],
  changes: first,
  example: [300, 1e-3, "Ar+"],
  accuracy: closedForm,
});

export const SHEATHCAPACITANCE = entry("SHEATHCAPACITANCE", {
  inputs: [V_s, n_edge, T_e, u_ratio],
  result: quantities.capacitance,
  compute: (V_s, n_edge, T_e, u_ratio) => model.sheathCapacitance(Math.abs(V_s), n_edge, T_e, u_ratio),
  equation: String.raw`C = \frac{\mathrm{d}(\varepsilon_0 E)}{\mathrm{d}V_s} = \frac{e\, n_\mathrm{edge}}{E} \left[\left(1 + \frac{2\eta}{\mu^2}\right)^{-1/2} - e^{-\eta}\right]`,
  twin: {
    steps: [edgeDebyeLength, drop, fieldAtWall],
    formula: "e*n_edge/E*(1/SQRT(1+2*eta/u_ratio^2)-EXP(-eta))",
  },
  limits: [limits.ionsKeepUp(), inDebyeSphere],
  sources: [R91],
  changes: first,
  example: [300, 1e16, 3],
  accuracy: "closed form, 8 ulp, down to the edge",
});

export const PULSEDWIDTH = entry("PULSEDWIDTH", {
  inputs: [V_s, n_edge, T_e, ionInput(), quantityInput("t", quantities.time)],
  result: quantities.length,
  compute: (V_s, n_edge, T_e, ion, t) => model.pulsedWidth(Math.abs(V_s), n_edge, T_e, ion, t),
  equation: String.raw`s = s_0 \left(1 + \tfrac{2}{3}\,\omega_{pi} t\right)^{1/3} \le s_\mathrm{Child}, \qquad s_0 = \lambda_D \sqrt{\frac{2 V_s}{T_e}}`,
  twin: {
    steps: [
      edgeDebyeLength,
      { name: "s_0", unit: "m", formula: "lambda_D*SQRT(2*ABS(V_s)/T_e)" },
      { name: "s_Child", unit: "m", formula: "SQRT(2)/3*lambda_D*(2*ABS(V_s)/T_e)^(3/4)" },
      { name: "omega_pi", unit: "rad/s", formula: "SQRT(Z*e^2*n_edge/(eps0*M))" },
    ],
    formula: "MAX(s_0,MIN(s_0*(1+2/3*omega_pi*t)^(1/3),s_Child))",
  },
  limits: [
    limits.electronFree((V_s, _n_edge, T_e) => [V_s, T_e]),
    limits.electronsHaveLeft((_V_s, n_edge, _T_e, _ion, t) => 2 * Math.PI * plasmaFrequency(n_edge, m_e, 1) * t),
    limits.uncoveredIonsCount((V_s, n_edge, T_e, ion, t) => [V_s, n_edge, T_e, ion, t]),
    limits.fallsFreely((V_s, n_edge, T_e, ion, t) => model.pulsedWidth(Math.abs(V_s), n_edge, T_e, ion, t)),
    inDebyeSphere,
  ],
  sources: [L89J],
  changes: first,
  example: [2000, 1e15, 3, "N2+", 1e-6],
  accuracy: closedForm,
});

const impactColumns = [
  { name: "energy", unit: "eV" },
  { name: "density", unit: "eV^-1" },
  { name: "primaries", unit: "" },
];

export const IMPACTDISTRIBUTION = entry("IMPACTDISTRIBUTION", {
  inputs: [V_s, s, lambda_i, points, header],
  result: { columns: impactColumns, curve: { x: "energy", y: ["density"], alone: "primaries" } },
  compute: (V_s, s, lambda_i, points, header) => {
    const V = Math.abs(V_s);
    if (!Number.isInteger(points)) return notWhole(points);
    const rows = impactBins(V, s, lambda_i, points).map(({ energy, density }) => [energy, density, 0]);
    return titled(header, impactColumns, [...rows, [V, 0, primaries(s, lambda_i)]]);
  },
  equation: String.raw`f(E) = \frac{s}{2 V_s \lambda_i} \left(1 - \frac{E}{V_s}\right)^{-1/2} \exp\!\left[-\frac{s}{\lambda_i}\left(1 - \sqrt{1 - \frac{E}{V_s}}\right)\right] + e^{-s/\lambda_i}\, \delta(E - V_s)`,
  twin: "it is a curve of as many points as are asked for",
  limits: [limits.fieldOutrunsGas((V_s, s, lambda_i) => [V_s, s, lambda_i])],
  sources: [DV63],
  changes: first,
  example: [300, 5e-3, 2e-3],
  accuracy: "1e-14 of each mean",
});

export const layer: Family = {
  title: "Layer: inside the sheath",
  entries: [
    SHEATHWIDTH,
    CHILDCURRENT,
    CHILDWIDTH,
    WALLFIELD,
    SHEATHPOTENTIAL,
    SHEATHPROFILE,
    IONTRANSITTIME,
    SHEATHCAPACITANCE,
    PULSEDWIDTH,
    IMPACTDISTRIBUTION,
  ],
};

function width(
  V_s: number,
  n_edge: number,
  T_e: number,
  word: model.SheathModel,
  lambda_i: number | undefined,
): number | Fault {
  const V = Math.abs(V_s);
  switch (word) {
    case "child":
      return model.childWidth(V, n_edge, T_e);
    case "matrix":
      return model.matrixWidth(V, n_edge, T_e);
    case "full":
      return V / T_e < bohmEnd ? tooLow(V / T_e, bohmEnd) : model.fullWidth(V, n_edge, T_e);
    case "collisional":
      return lambda_i === undefined ? missingPath() : model.collisionalWidth(V, n_edge, T_e, lambda_i);
  }
}

function widthFor(
  V_s: number,
  J: number,
  ion: Ion,
  word: model.IonMotion,
  lambda_i: number | undefined,
): number | Fault {
  if (word === "collisionless") return model.widthFromCurrent(Math.abs(V_s), J, ion);
  return lambda_i === undefined ? missingPath() : model.collisionalWidthFromCurrent(Math.abs(V_s), J, ion, lambda_i);
}

/** The width of the nonlinear solution entered at u_B, close enough for a mean free path; undefined where it has none. */
function fullWidth(V_s: number, n_edge: number, T_e: number): number | undefined {
  const V = Math.abs(V_s);
  return V / T_e < bohmEnd ? undefined : model.fullWidth(V, n_edge, T_e);
}

/** A limit looks at a width only where there is one. */
function found(width: number | Fault): number {
  return typeof width === "number" ? width : NaN;
}

/** Field at the wall under either law: V ∝ x^(4/3) or x^(5/3) from the edge. */
function lawField(V_s: number, s: number, word: model.IonMotion): number {
  return ((word === "collisionless" ? 4 / 3 : 5 / 3) * Math.abs(V_s)) / s;
}

function tooLow(eta: number, end: number): Fault {
  return noSolution(
    `V_s is ${format(eta)} T_e, but the net charge only reaches 1 % of e n_edge where the potential has dropped by ` +
      `${format(end, 4)} T_e; give a larger V_s (SHEATHPOTENTIAL and WALLFIELD take any)`,
  );
}

function titled(header: boolean, columns: Table["columns"], rows: Value[][]): Value[][] {
  if (!header) return rows;
  return [columns.map(({ name, unit }) => (unit ? `${name} (${prettyUnit(unit)})` : name)), ...rows];
}
