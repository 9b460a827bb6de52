import { edge_ratio, n_bulk, T_e, T_i } from "../cells/common-inputs";
import { entry, NotTested, type Family } from "../cells/entry";
import { Fault, noSolution } from "../cells/fault";
import { format } from "../cells/format";
import { ionInput, optional, quantityInput, quantityOrWord, wordInput } from "../cells/inputs";
import { quantities } from "../cells/quantities";
import { coldIons, manyInDebyeSphere } from "../edge/limits";
import { presheathDrop } from "../edge/model";
import { edgeDensity, electronSpeed, warmBohmSpeed } from "../edge/twins";
import { e, eps0, k_B } from "../matter/constants";
import { fallsFreely } from "../layer/limits";
import type { Ion } from "../matter/ion";
import { CP, D23, HW67, LL, S00, S54 } from "../sources";
import { emissionLimit } from "./emission-limit";
import { emissionYield } from "./emission-yield";
import { formulaInput } from "./formula-input";
import {
  besideTheInputs,
  maxwellianTail,
  sheathLimits,
  streamsAlongField,
  wallRepels,
  weakIonEmission,
  type AtWall,
} from "./limits";
import * as model from "./model";
import { floatingOrWhyNot, repellingOrWhyNot, voltageOrWhyNot } from "./potentials";
import { spaceChargeLimit, wallPotential } from "./twins";

const first = { "1.0.0": "first version" };
const closedForm = "closed form, 4 ulp";

/** Blank stays undefined, so that a limit can say that emission was left out; the models then take 0. */
const delta_e = optional(
  quantityInput("delta_e", quantities.notNegative, { band: { low: 0, high: 5, above: "percent meant?" } }),
);
/** Blank is normal incidence or no field at all: nothing to judge then. */
const angle = optional(quantityInput("angle", quantities.angle));
const V_w = quantityInput("V_w", quantities.voltage);
const V_wOrFloating = optional(quantityOrWord("V_w", quantities.voltage, ["floating"]), "floating" as const);
const J = quantityInput("J", quantities.currentDensity);
const work_function = quantityInput("work_function", quantities.workFunction);
const unknownIonEmission = weakIonEmission(
  "γ_i",
  () => new NotTested("the yield of the wall's material (IONEMISSION)"),
);

export const FLOATINGPOTENTIAL = entry("FLOATINGPOTENTIAL", {
  inputs: [T_e, ionInput(), T_i, delta_e, optional(wordInput("from", model.referencePoints), "edge"), edge_ratio],
  result: quantities.voltage,
  compute: (T_e, ion, T_i, delta_e, from, edge_ratio) => {
    const V_f = floatingOrWhyNot(T_e, ion, T_i, delta_e);
    return from === "edge" || V_f instanceof Fault ? V_f : V_f - presheathDrop(T_e, edge_ratio);
  },
  equation: String.raw`V_f = -T_e \ln\frac{(1-\delta_e)\,\bar v_e}{4 u_B} \;\left[\, + T_e \ln\frac{n_\mathrm{edge}}{n_\mathrm{bulk}} \text{ from the plasma}\right]`,
  twin: {
    blanks: { T_i: 0, delta_e: 0 },
    steps: [warmBohmSpeed, electronSpeed, { name: "V_f", unit: "V", formula: "-T_e*LN((1-delta_e)*v_e/(4*u_B))" }],
    formula: 'IF(V_f<0,IF(from="plasma",V_f+T_e*LN(edge_ratio),V_f),NA())',
    untested: spaceChargeLimit,
  },
  limits: sheathLimits((T_e, ion, T_i, delta_e) => ({
    V_w: floatingOrWhyNot(T_e, ion, T_i, delta_e),
    T_e,
    ion,
    T_i,
    delta_e,
  })),
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
  twin: {
    blanks: { T_i: 0, angle: 90 },
    steps: [warmBohmSpeed],
    formula: "edge_ratio*n_bulk*u_B/Z*SIN(RADIANS(angle))",
  },
  limits: [
    streamsAlongField((_n, T_e, ion, T_i, _ratio, angle) => ({ angle, T_e, ion, T_i })),
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
  twin: {
    blanks: { T_i: 0, angle: 90 },
    steps: [warmBohmSpeed],
    formula: "e*edge_ratio*n_bulk*u_B*SIN(RADIANS(angle))",
  },
  limits: WALLFLUX.limits,
  sources: [LL, S00],
  changes: first,
  example: [1e17, 3, "Ar+"],
  accuracy: closedForm,
});

export const ELECTRONFLUX = entry("ELECTRONFLUX", {
  inputs: [n_bulk, T_e, V_w, edge_ratio],
  result: quantities.flux,
  compute: (n_bulk, T_e, V_w, edge_ratio) => model.electronFlux(edge_ratio * n_bulk, T_e, V_w),
  equation: String.raw`\Gamma_e = \tfrac14\, n_\mathrm{edge}\, \bar v_e\, e^{V_w/T_e}, \qquad \bar v_e = \sqrt{\frac{8 e T_e}{\pi m}}`,
  twin: { steps: [electronSpeed], formula: "edge_ratio*n_bulk*v_e/4*EXP(MIN(V_w,0)/T_e)" },
  limits: [
    wallRepels((_n, T_e, V_w) => ({ V_w, T_e })),
    manyInDebyeSphere((n_bulk, T_e, _V_w, edge_ratio) => [edge_ratio * n_bulk, T_e]),
  ],
  sources: [LL],
  changes: first,
  example: [1e17, 3, -15],
  accuracy: `${closedForm}, and one more for each unit of |V_w|/T_e`,
});

export const WALLCURRENT = entry("WALLCURRENT", {
  inputs: [V_w, n_bulk, T_e, ionInput(), T_i, edge_ratio, delta_e],
  result: quantities.currentDensity,
  compute: (V_w, n_bulk, T_e, ion, T_i, edge_ratio, delta_e) =>
    model.wallCurrent(V_w, edge_ratio * n_bulk, T_e, ion, T_i ?? 0, delta_e ?? 0),
  equation: String.raw`J = e\, n_\mathrm{edge} \left[ u_B - (1-\delta_e)\, \tfrac14 \bar v_e\, e^{V_w/T_e} \right]`,
  twin: {
    blanks: { T_i: 0, delta_e: 0 },
    steps: [warmBohmSpeed, electronSpeed, { name: "kept", unit: "", formula: "IF(V_w<0,1-delta_e,1)" }],
    formula: "e*edge_ratio*n_bulk*(u_B-kept*v_e/4*EXP(MIN(V_w,0)/T_e))",
  },
  limits: [
    ...sheathLimits((V_w, _n, T_e, ion, T_i, _ratio, delta_e) => ({ V_w, T_e, ion, T_i, delta_e })),
    unknownIonEmission,
    manyInDebyeSphere((_V_w, n_bulk, T_e, _ion, _T_i, edge_ratio) => [edge_ratio * n_bulk, T_e]),
  ],
  sources: [LL, HW67],
  changes: first,
  example: [-10, 1e17, 3, "Ar+"],
  accuracy: "closed form, 1e-14 of the larger of the two currents, which cancel where the wall floats",
});

export const WALLVOLTAGE = entry("WALLVOLTAGE", {
  inputs: [J, n_bulk, T_e, ionInput(), T_i, edge_ratio, delta_e],
  result: quantities.voltage,
  compute: (J, n_bulk, T_e, ion, T_i, edge_ratio, delta_e) =>
    voltageOrWhyNot(J, edge_ratio * n_bulk, T_e, ion, T_i, delta_e),
  equation: String.raw`V_w = T_e \ln\frac{e\, n_\mathrm{edge}\, u_B - J}{(1-\delta_e)\, \tfrac14 e\, n_\mathrm{edge}\, \bar v_e} \le 0`,
  twin: {
    blanks: { T_i: 0, delta_e: 0 },
    steps: [
      edgeDensity,
      warmBohmSpeed,
      electronSpeed,
      { name: "J_e", unit: "A/m^2", formula: "e*n_edge*u_B-J" },
      { name: "J_e0", unit: "A/m^2", formula: "(1-delta_e)*e*n_edge*v_e/4" },
    ],
    formula: "IF(J_e>0,IF(J_e<=J_e0,T_e*LN(J_e/J_e0),NA()),NA())",
    untested: spaceChargeLimit,
  },
  limits: [
    ...sheathLimits((J, n_bulk, T_e, ion, T_i, edge_ratio, delta_e) => ({
      V_w: voltageOrWhyNot(J, edge_ratio * n_bulk, T_e, ion, T_i, delta_e),
      T_e,
      ion,
      T_i,
      delta_e,
    })),
    unknownIonEmission,
    manyInDebyeSphere((_J, n_bulk, T_e, _ion, _T_i, edge_ratio) => [edge_ratio * n_bulk, T_e]),
  ],
  sources: [LL, HW67],
  changes: first,
  example: [20, 1e17, 3, "Ar+"],
  accuracy: `${closedForm}, except close to the ion saturation current, where J leaves few digits of the electrons'`,
});

export const IONIMPACTENERGY = entry("IONIMPACTENERGY", {
  inputs: [T_e, ionInput(), T_i, V_wOrFloating],
  result: quantities.energy,
  compute: (T_e, ion, T_i, V_w) => {
    const voltage = repellingOrWhyNot(V_w, T_e, ion, T_i);
    return voltage instanceof Fault ? voltage : model.impactEnergy(T_e, ion, T_i ?? 0, voltage);
  },
  equation: String.raw`E_i = -Z V_w + \frac{M u_B^2}{2e} = -Z V_w + \tfrac12 (Z T_e + T_i)`,
  twin: {
    blanks: { T_i: 0 },
    steps: [
      warmBohmSpeed,
      electronSpeed,
      { name: "V", unit: "V", formula: 'IF(V_w="floating",-T_e*LN(v_e/(4*u_B)),V_w)' },
    ],
    formula: "IF(V>0,NA(),-Z*V+M*u_B^2/(2*e))",
  },
  limits: [
    wallRepels((T_e, ion, T_i, V_w) => ({ V_w: repellingOrWhyNot(V_w, T_e, ion, T_i), T_e })),
    // Only where it floats do electrons have a say in what the ions gain.
    maxwellianTail((T_e, ion, T_i, V_w) => ({
      V_w: V_w === "floating" ? floatingOrWhyNot(T_e, ion, T_i) : -Infinity,
      T_e,
      ion,
      T_i,
    })),
    fallsFreely(() => undefined),
    coldIons((_T_e, _ion, T_i) => T_i),
  ],
  sources: [LL],
  changes: first,
  example: [3, "Ar+"],
  accuracy: closedForm,
});

export const WALLHEATFLUX = entry("WALLHEATFLUX", {
  inputs: [
    n_bulk,
    T_e,
    ionInput(),
    T_i,
    V_wOrFloating,
    edge_ratio,
    delta_e,
    optional(quantityInput("surface_energy", quantities.energy), 0),
    angle,
  ],
  result: quantities.heatFlux,
  compute: (n_bulk, T_e, ion, T_i, V_w, edge_ratio, delta_e, surface_energy, angle) => {
    const perIon = heatPerIon(V_w, T_e, ion, T_i, delta_e);
    if (perIon instanceof Fault) return perIon;
    return e * model.ionFlux(edge_ratio * n_bulk, T_e, ion, T_i ?? 0, angle ?? 90) * (perIon + surface_energy);
  },
  equation: String.raw`q = e\,\Gamma_i \left[ -Z V_w + \frac{M u_B^2}{2e} + \tfrac52 T_i + E_\mathrm{surface} \right] + 2 e T_e\, \Gamma_e, \qquad \Gamma_e = \frac{Z\,\Gamma_i}{1-\delta_e} \text{ floating}`,
  twin: {
    blanks: { T_i: 0, delta_e: 0, angle: 90 },
    steps: [
      edgeDensity,
      warmBohmSpeed,
      electronSpeed,
      wallPotential,
      { name: "Gamma_i", unit: "m^-2 s^-1", formula: "n_edge*u_B/Z*SIN(RADIANS(angle))" },
      {
        name: "Gamma_e",
        unit: "m^-2 s^-1",
        formula: 'IF(V_w="floating",Z*Gamma_i/(1-delta_e),n_edge*v_e/4*EXP(V/T_e)*SIN(RADIANS(angle)))',
      },
    ],
    formula: "IF(V>0,NA(),e*Gamma_i*(-Z*V+M*u_B^2/(2*e)+5/2*T_i+surface_energy)+2*e*T_e*Gamma_e)",
    untested: spaceChargeLimit,
  },
  limits: [
    ...sheathLimits((_n, T_e, ion, T_i, V_w, _ratio, delta_e) => atWall(V_w, T_e, ion, T_i, delta_e)),
    streamsAlongField((_n, T_e, ion, T_i, _V_w, _ratio, _delta, _surface, angle) => ({ angle, T_e, ion, T_i })),
    manyInDebyeSphere((n_bulk, T_e, _ion, _T_i, _V_w, edge_ratio) => [edge_ratio * n_bulk, T_e]),
  ],
  sources: [S00],
  changes: first,
  example: [1e17, 3, "Ar+"],
  accuracy: `${closedForm}; for a given V_w one more for each unit of |V_w|/T_e in the electrons' share`,
});

export const HEATFACTOR = entry("HEATFACTOR", {
  inputs: [T_e, ionInput(), T_i, V_wOrFloating, delta_e],
  result: quantities.number,
  compute: (T_e, ion, T_i, V_w, delta_e) => {
    const perIon = heatPerIon(V_w, T_e, ion, T_i, delta_e);
    return perIon instanceof Fault ? perIon : perIon / T_e;
  },
  equation: String.raw`\gamma = \frac{q}{e T_e \Gamma_i} = \frac{-Z V_w + M u_B^2/2e + \tfrac52 T_i}{T_e} + 2\,\frac{\Gamma_e}{\Gamma_i}`,
  twin: {
    blanks: { T_i: 0, delta_e: 0 },
    steps: [
      warmBohmSpeed,
      electronSpeed,
      wallPotential,
      {
        name: "electrons_per_ion",
        unit: "",
        formula: 'IF(V_w="floating",Z/(1-delta_e),Z*v_e/(4*u_B)*EXP(V/T_e))',
      },
    ],
    formula: "IF(V>0,NA(),(-Z*V+M*u_B^2/(2*e)+5/2*T_i)/T_e+2*electrons_per_ion)",
    untested: spaceChargeLimit,
  },
  limits: sheathLimits((T_e, ion, T_i, V_w, delta_e) => atWall(V_w, T_e, ion, T_i, delta_e)),
  sources: [S00],
  changes: first,
  example: [3, "D+", 3],
  accuracy: `${closedForm}; for a given V_w one more for each unit of |V_w|/T_e in the electrons' share`,
});

export const EMISSIONLIMIT = entry("EMISSIONLIMIT", {
  inputs: [ionInput()],
  result: {
    columns: [
      { name: "delta_c", unit: "" },
      { name: "-V_w/T_e", unit: "" },
      { name: "E_edge/(Z T_e)", unit: "" },
    ],
  },
  compute: (ion) => {
    const limit = emissionLimit(ion);
    if (!limit) return noSolution("So light an ion has no emission limit: M/Z must exceed 2π electron masses");
    return [[limit.delta, limit.drop, limit.edgeEnergy]];
  },
  equation: String.raw`a + s = 1, \quad a - \frac{s}{2\eta} = \frac{1}{2\varepsilon}, \quad 2\varepsilon\left(\sqrt{1 + \eta/\varepsilon} - 1\right) = a\left(1 - e^{-\eta}\right) + 2 s \eta, \quad (1-\delta_c)\, a\, e^{-\eta} = \sqrt{4\pi\varepsilon\, Z m/M}, \quad s = \frac{\delta_c}{1-\delta_c} \sqrt{\frac{\varepsilon}{\eta} \frac{Z m}{M}}`,
  twin: "the limit solves four equations together, by iteration",
  sources: [HW67],
  changes: first,
  example: ["Ar+"],
  accuracy: "solved to 1e-12",
});

export const RICHARDSONCURRENT = entry("RICHARDSONCURRENT", {
  inputs: [
    quantityInput("T_wall", quantities.wallTemperature),
    work_function,
    optional(quantityInput("A_R", quantities.richardson), model.richardsonConstant),
  ],
  result: quantities.currentDensity,
  compute: model.richardsonCurrent,
  equation: String.raw`J = A_R T^2 e^{-eW/(k_B T)}, \qquad A_R = \frac{4\pi m e k_B^2}{h^3}`,
  twin: { formula: "A_R*T_wall^2*EXP(-e*work_function/(k_B*T_wall))" },
  limits: [
    {
      assumption: "few electrons of the metal are fast enough to leave",
      measure: "W/(k_B T)",
      value: (T_wall, work_function) => (e * work_function) / (k_B * T_wall),
      holds: 5,
      fails: 2,
      reason: "the wall is too hot, or the work function too low, for the emitted electrons to be a dilute tail",
      source: CP,
    },
    {
      assumption: "the field at the wall hardly lowers the work function",
      measure: "√(eE/(4πε₀))/(k_B T)",
      value: (T_wall) => {
        const lowering = (0.1 * k_B * T_wall) / e;
        const field = (lowering * lowering * 4 * Math.PI * eps0) / e;
        return new NotTested(`the field at the wall (WALLFIELD), which should stay below ${format(field)} V/m`);
      },
      holds: 0.1,
      fails: 1,
      reason: "the field pulls out more electrons than this law has (Schottky)",
      source: D23,
    },
  ],
  sources: [D23],
  changes: first,
  example: [2500, 4.5],
  accuracy: `${closedForm}, and two more for each unit of W/(k_B T)`,
});

export const EROSIONRATE = entry("EROSIONRATE", {
  inputs: [
    quantityInput("flux", quantities.flux),
    quantityInput("sputter_yield", quantities.notNegative, { band: { low: 0, high: 20, above: "percent meant?" } }),
    formulaInput("formula"),
    quantityInput("density", quantities.massDensity),
  ],
  result: quantities.erosionRate,
  compute: model.erosionRate,
  equation: String.raw`v = \frac{\Gamma\, Y\, M_\mathrm{formula}}{N_A\, \rho}`,
  twin: { formula: "flux*sputter_yield*M/density" },
  limits: [
    besideTheInputs("the impact energy (IONIMPACTENERGY) and the threshold of the target", {
      assumption: "the ions strike above the sputtering threshold",
      measure: "threshold/E_i",
      holds: 0.5,
      fails: 1,
      reason: "the ions are too slow to sputter",
    }),
    besideTheInputs("the share that comes back to the wall", {
      assumption: "what is sputtered stays away",
      measure: "share redeposited",
      holds: 0.1,
      fails: 0.5,
      reason: "redeposition makes up for the erosion",
    }),
  ],
  sources: [CP],
  changes: first,
  example: [1.6e20, 0.5, "Si", 2330],
  accuracy: closedForm,
});

export const EMISSIONYIELD = entry("EMISSIONYIELD", {
  inputs: [
    T_e,
    quantityInput("delta_max", quantities.ratio, { band: { low: 0.1, high: 30, above: "percent meant?" } }),
    quantityInput("E_max", quantities.energy, {
      least: Number.MIN_VALUE,
      zeroIsValue: false,
      example: "300 eV",
      band: { low: 20, high: 5000, below: "keV meant?" },
    }),
  ],
  result: quantities.notNegative,
  compute: emissionYield,
  equation: String.raw`\bar\delta = \int_0^\infty \frac{E}{T_e^2}\, \delta(E)\, e^{-E/T_e}\, dE, \qquad \delta(E) = \delta_\mathrm{max}\, e^2\, \frac{E}{E_\mathrm{max}}\, e^{-2\sqrt{E/E_\mathrm{max}}}`,
  twin: "the average over the electrons is an integral",
  limits: [
    {
      assumption: "the striking electrons are fast enough for the universal yield curve",
      measure: "T_e/E_max",
      value: (T_e, _delta_max, E_max) => T_e / E_max,
      holds: 0.1,
      fails: 0.01,
      reason: "most electrons are so slow that reflection, which the curve leaves out, outweighs emission",
      source: CP,
    },
  ],
  sources: [S54],
  changes: first,
  example: [20, 2.4, 300],
  accuracy: "1e-13",
});

export const IONEMISSION = entry("IONEMISSION", {
  inputs: [quantityInput("E_iz", quantities.energy, { least: Number.MIN_VALUE, zeroIsValue: false }), work_function],
  result: quantities.notNegative,
  compute: model.ionEmission,
  equation: String.raw`\gamma_i \approx 0.016\,(E_\mathrm{iz} - 2W) \ge 0, \qquad \text{energies in eV}`,
  twin: { formula: "MAX(0,0.016*(E_iz-2*work_function))" },
  limits: [
    besideTheInputs("the impact energy of the ions (IONIMPACTENERGY), which should be 500 eV or less", {
      assumption: "the ions set electrons free by their neutralisation alone",
      measure: "E_i/eV",
      holds: 500,
      fails: 2000,
      reason: "ions as fast as that set electrons free by their impact as well",
    }),
  ],
  sources: [LL],
  changes: first,
  example: [15.76, 4.5],
  accuracy: `${closedForm}, except near E_iz = 2W, of a fit that itself is good to tens of per cent`,
});

export const wall: Family = {
  title: "Wall: what the wall draws",
  entries: [
    FLOATINGPOTENTIAL,
    WALLFLUX,
    IONCURRENTDENSITY,
    ELECTRONFLUX,
    WALLCURRENT,
    WALLVOLTAGE,
    IONIMPACTENERGY,
    WALLHEATFLUX,
    HEATFACTOR,
    EMISSIONLIMIT,
    RICHARDSONCURRENT,
    EROSIONRATE,
    EMISSIONYIELD,
    IONEMISSION,
  ],
};

function atWall(V_w: number | "floating", T_e: number, ion: Ion, T_i?: number, delta_e?: number): AtWall {
  return { V_w: repellingOrWhyNot(V_w, T_e, ion, T_i, delta_e), T_e, ion, T_i, delta_e };
}

/** Energy brought to the wall per ion, in eV, without what the surface itself sets free. */
function heatPerIon(V_w: number | "floating", T_e: number, ion: Ion, T_i = 0, delta_e = 0): number | Fault {
  const voltage = repellingOrWhyNot(V_w, T_e, ion, T_i, delta_e);
  if (voltage instanceof Fault) return voltage;
  const electrons =
    V_w === "floating" ? model.electronsPerIonFloating(ion, delta_e) : model.electronsPerIon(T_e, ion, T_i, voltage);
  return model.energyPerIon(T_e, ion, T_i, voltage, electrons);
}
