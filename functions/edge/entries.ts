import { edge_ratio, lambda_i, n_edge, T_e, T_i } from "../cells/common-inputs";
import { entry, NotTested, type Family } from "../cells/entry";
import { badInput, Fault, noSolution } from "../cells/fault";
import { format } from "../cells/format";
import { ionInput, optional, quantityInput, wordInput, type Input } from "../cells/inputs";
import { quantities } from "../cells/quantities";
import { e, k_B } from "../matter/constants";
import { electron } from "../matter/ion";
import { LL, NRL, R91 } from "../sources";
import { crossSections } from "./cross-sections";
import { coldIons, manyInDebyeSphere } from "./limits";
import * as model from "./model";
import { coldBohmSpeed, edgeDebyeLength } from "./twins";

const first = { "1.0.0": "first version" };
const closedForm = "closed form, 4 ulp";
const gamma_i = optional(quantityInput("gamma_i", quantities.ratio, { least: 1, most: 3, example: "1.5" }), 1);

export const WALLTOEDGE = entry("WALLTOEDGE", {
  inputs: [
    quantityInput("V_wall", quantities.voltage),
    quantityInput("V_plasma", quantities.voltage),
    optional(quantityInput("T_e", quantities.temperature, { least: 0, zeroIsValue: true }), 0),
    edge_ratio,
  ],
  result: quantities.voltage,
  compute: model.wallToEdge,
  equation: String.raw`V_w = V_\mathrm{wall} - V_\mathrm{plasma} - T_e \ln\frac{n_\mathrm{edge}}{n_\mathrm{bulk}}`,
  twin: { formula: "V_wall-V_plasma-T_e*LN(edge_ratio)" },
  limits: [
    {
      assumption: "the wall repels electrons",
      measure: "V_w/T_e",
      value: (V_wall, V_plasma, T_e, ratio) =>
        T_e > 0 ? model.wallToEdge(V_wall, V_plasma, T_e, ratio) / T_e : new NotTested("T_e"),
      holds: -1,
      fails: 0,
      reason: "the wall stands above the sheath edge and attracts electrons",
      source: LL,
    },
  ],
  sources: [LL],
  changes: first,
  example: [-120, 25, 3],
  accuracy: `${closedForm}; fewer digits where the readings nearly cancel`,
});

export const DEBYELENGTH = entry("DEBYELENGTH", {
  inputs: [quantityInput("n_e", quantities.density), T_e, T_i],
  result: quantities.length,
  compute: (n_e, T_e, T_i) => model.debyeLengthWithIons(n_e, T_e, T_i ?? 0),
  equation: String.raw`\lambda_D = \sqrt{\frac{\varepsilon_0 T_e}{e\, n_e}}, \qquad \frac{1}{\lambda^2} = \frac{1}{\lambda_{D}^2} + \frac{e\, n_e}{\varepsilon_0 T_i}`,
  twin: {
    blanks: { T_i: 0 },
    steps: [{ name: "lambda_e", unit: "m", formula: "SQRT(eps0*T_e/(e*n_e))" }],
    formula: "IF(T_i>0,1/SQRT(1/lambda_e^2+e*n_e/(eps0*T_i)),lambda_e)",
  },
  limits: [manyInDebyeSphere((n_e, T_e) => [n_e, T_e])],
  sources: [NRL],
  changes: first,
  example: [1e16, 3],
  accuracy: closedForm,
});

export const PLASMAFREQUENCY = entry("PLASMAFREQUENCY", {
  inputs: [quantityInput("n", quantities.density), optional(ionInput(), electron)],
  result: quantities.anyFrequency,
  compute: (n, ion) => model.plasmaFrequency(n, ion.mass, ion.charge),
  equation: String.raw`f_p = \frac{1}{2\pi}\sqrt{\frac{n q^2}{\varepsilon_0 m}}`,
  twin: { formula: "SQRT(n*(Z*e)^2/(eps0*M))/(2*PI())" },
  sources: [NRL],
  changes: first,
  example: [1e16],
  accuracy: closedForm,
});

export const MEANFREEPATH = entry("MEANFREEPATH", {
  inputs: [
    quantityInput("p", quantities.pressure),
    crossSectionInput("sigma"),
    optional(quantityInput("T_g", quantities.gasTemperature), 300),
  ],
  result: quantities.length,
  compute: model.meanFreePath,
  equation: String.raw`\lambda_i = \frac{k_B T_g}{p\, \sigma}`,
  twin: { formula: "k_B*T_g/(p*sigma)" },
  sources: [LL],
  changes: first,
  example: [0.7, "Ar"],
  accuracy: closedForm,
});

export const BOHMSPEED = entry("BOHMSPEED", {
  inputs: [T_e, ionInput(), T_i, gamma_i],
  result: quantities.speed,
  compute: (T_e, ion, T_i, gamma_i) => model.bohmSpeed(T_e, ion, T_i ?? 0, gamma_i),
  equation: String.raw`u_B = \sqrt{\frac{e\,(Z T_e + \gamma_i T_i)}{M}}`,
  twin: { blanks: { T_i: 0 }, formula: "SQRT(e*(Z*T_e+gamma_i*T_i)/M)" },
  limits: [coldIons((_T_e, _ion, T_i) => T_i)],
  sources: [R91],
  changes: first,
  example: [3, "Ar+"],
  accuracy: closedForm,
});

export const COLLISIONALBOHMSPEED = entry("COLLISIONALBOHMSPEED", {
  inputs: [T_e, ionInput(), n_edge, lambda_i],
  result: quantities.speed,
  compute: model.collisionalBohmSpeed,
  equation: String.raw`u_s = u_B \left(1 + \frac{\pi \lambda_D}{2 \lambda_i}\right)^{-1/2}`,
  twin: { steps: [coldBohmSpeed, edgeDebyeLength], formula: "u_B/SQRT(1+PI()*lambda_D/(2*lambda_i))" },
  limits: [
    {
      assumption: "ions drift much faster than the gas moves (gas at 300 K)",
      measure: "T_e λ_i/(T_g λ_D)",
      value: (T_e, _ion, n_edge, lambda_i) => (T_e * lambda_i) / (gasAt300K * model.debyeLength(n_edge, T_e)),
      holds: 10,
      fails: 1,
      reason: "collisions hold the ions to the thermal motion of the gas",
      source: LL,
    },
    manyInDebyeSphere((T_e, _ion, n_edge) => [n_edge, T_e]),
  ],
  sources: [LL],
  changes: first,
  example: [3, "Ar+", 1e16, 1e-3],
  accuracy: closedForm,
});

export const BOHMRATIO = entry("BOHMRATIO", {
  inputs: [quantityInput("u_0", quantities.speed), T_e, ionInput(), T_i, gamma_i],
  result: quantities.number,
  compute: (u_0, T_e, ion, T_i, gamma_i) => u_0 / model.bohmSpeed(T_e, ion, T_i ?? 0, gamma_i),
  equation: String.raw`\frac{u_0}{u_B} \ge 1`,
  twin: { blanks: { T_i: 0 }, formula: "u_0/SQRT(e*(Z*T_e+gamma_i*T_i)/M)" },
  limits: [
    {
      assumption: "ions enter at the Bohm speed or faster",
      measure: "u_0/u_B",
      value: (u_0, T_e, ion, T_i, gamma_i) => u_0 / model.bohmSpeed(T_e, ion, T_i ?? 0, gamma_i),
      holds: 1,
      fails: 1,
      reason: "the ions are slower than the Bohm speed, so no monotonic sheath can form",
      source: R91,
    },
    coldIons((_u_0, _T_e, _ion, T_i) => T_i),
  ],
  sources: [R91],
  changes: first,
  example: [3000, 3, "Ar+"],
  accuracy: closedForm,
});

export const EDGEDECAYLENGTH = entry("EDGEDECAYLENGTH", {
  inputs: [n_edge, T_e, ionInput(), quantityInput("u_0", quantities.speed)],
  result: quantities.length,
  compute: (n_edge, T_e, ion, u_0) => {
    const u_B = model.bohmSpeed(T_e, ion);
    if (u_0 === u_B) {
      return noSolution(
        "At the Bohm speed the potential decays algebraically: it has no decay length; give a faster u_0",
      );
    }
    if (u_0 < u_B) {
      return noSolution(
        `Below the Bohm speed ${format(u_B, 4)} m/s the potential oscillates instead of decaying; give a faster u_0 (BOHMRATIO tells)`,
      );
    }
    return model.edgeDecayLength(n_edge, T_e, ion, u_0);
  },
  equation: String.raw`\ell = \frac{\lambda_D}{\sqrt{1 - (u_B/u_0)^2}}`,
  twin: {
    steps: [coldBohmSpeed, edgeDebyeLength],
    formula: "IF(u_0>u_B,lambda_D/SQRT(1-(u_B/u_0)^2),NA())",
  },
  limits: [manyInDebyeSphere((n_edge, T_e) => [n_edge, T_e])],
  sources: [R91],
  changes: first,
  example: [1e16, 3, "Ar+", 4000],
  accuracy: `${closedForm}, given u_0/u_B − 1: close to the Bohm speed it amplifies the rounding of u_B`,
});

export const EDGERATIO = entry("EDGERATIO", {
  inputs: [
    optional(wordInput("shape", model.edgeShapes), "free"),
    optional(quantityInput("size", quantities.length)),
    optional(lambda_i, Infinity),
  ],
  result: quantities.number,
  compute: (shape, size, lambda_i) => {
    if (shape === "free") return model.freeEdgeRatio;
    if (size === undefined && lambda_i !== Infinity) {
      const what = shape === "slab" ? "the full gap between the walls" : "the radius of the cylinder";
      return badInput("size", "it is blank while lambda_i is given", `type ${what}, such as 0.1 m`);
    }
    return model.edgeRatio(shape, size ?? 1, lambda_i);
  },
  equation: String.raw`\frac{n_\mathrm{edge}}{n_\mathrm{bulk}} = \begin{cases} e^{-1/2} & \text{free} \\ 0.86\,\left(3 + \dfrac{l}{2\lambda_i}\right)^{-1/2} & \text{slab} \\ 0.80\,\left(4 + \dfrac{R}{\lambda_i}\right)^{-1/2} & \text{cylinder} \end{cases}`,
  twin: {
    // No mean free path is no collision; a size is only wanted where ions collide.
    steps: [
      {
        name: "paths",
        unit: "",
        formula: 'IF(lambda_i="",0,IF(shape="free",0,IF(size="",NA(),size/lambda_i)))',
      },
    ],
    formula: 'IF(shape="free",EXP(-1/2),IF(shape="slab",0.86/SQRT(3+paths/2),0.8/SQRT(4+paths)))',
  },
  limits: [
    {
      // LL ask λ_i/size ≥ T_i/T_e; without temperatures the usual 0.01 to 0.03 of low-pressure discharges stands in.
      assumption: "ion motion is set by the ambipolar field, not by diffusion",
      measure: "λ_i/size",
      value: (shape, size, lambda_i) =>
        shape === "free" ? undefined : lambda_i === Infinity ? new NotTested("lambda_i") : lambda_i / (size ?? NaN),
      holds: 0.03,
      fails: 0.01,
      reason: "so many collisions that ions diffuse, and the edge density falls below this formula",
      source: LL,
    },
  ],
  sources: [LL],
  changes: first,
  example: ["slab", 0.1, 0.01],
  accuracy: `${closedForm} of a fit that itself is good to a few per cent`,
});

export const PRESHEATHDROP = entry("PRESHEATHDROP", {
  inputs: [T_e, edge_ratio],
  result: quantities.voltage,
  compute: model.presheathDrop,
  equation: String.raw`\Delta V = -T_e \ln\frac{n_\mathrm{edge}}{n_\mathrm{bulk}}`,
  twin: { formula: "-T_e*LN(edge_ratio)" },
  sources: [LL],
  changes: first,
  example: [3],
  accuracy: closedForm,
});

export const edge: Family = {
  title: "Edge: where the sheath begins",
  entries: [
    WALLTOEDGE,
    DEBYELENGTH,
    PLASMAFREQUENCY,
    MEANFREEPATH,
    BOHMSPEED,
    COLLISIONALBOHMSPEED,
    BOHMRATIO,
    EDGEDECAYLENGTH,
    EDGERATIO,
    PRESHEATHDROP,
  ],
};

/** A gas temperature of 300 K in eV. */
const gasAt300K = (300 * k_B) / e;

/** An area, or a gas that has a sourced value for its own ions. */
function crossSectionInput(name: string): Input<number> {
  const area = quantityInput(name, quantities.crossSection);
  const gases = Object.keys(crossSections) as (keyof typeof crossSections)[];
  return {
    ...area,
    words: gases,
    read: (cell) => {
      const typed = typeof cell === "string" ? cell.trim().replace(/\+$/, "").toLowerCase() : undefined;
      const gas = gases.find((each) => each.toLowerCase() === typed);
      if (gas) return crossSections[gas];
      const value = area.read(cell);
      if (!(value instanceof Fault) || typeof cell !== "string" || /^[\d.+-]/.test(cell.trim())) return value;
      return badInput(
        name,
        `there is no cross-section here for "${cell.trim()}"`,
        `type an area such as 1e-18 m^2, or ${gases.join(" or ")}`,
      );
    },
  };
}
