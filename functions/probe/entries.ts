import { edge_ratio, n_bulk, T_e } from "../cells/common-inputs";
import { entry, NotTested, type Family } from "../cells/entry";
import { Fault, noSolution } from "../cells/fault";
import { format } from "../cells/format";
import { ionInput, optional, quantityInput, wordInput } from "../cells/inputs";
import { quantities } from "../cells/quantities";
import { seriesInput } from "../cells/series";
import { coldBohmSpeed } from "../edge/twins";
import { C03, LL, MSL26 } from "../sources";
import { maxwellianTail, weakIonEmission } from "../wall/limits";
import { fitSweeps } from "./fitted-sweeps";
import { ionsSaturate, longRetarding, longWire, noRfPickup, temperatureCertain, thinSheath, thinWire } from "./limits";
import * as model from "./model";
import { probeParts, unitOfPart, type ProbePart } from "./parts";
import { rowOf, type Row } from "./report";
import { labelsInput } from "./sweeps";

const first = { "1.0.0": "first version" };
const closedForm = "closed form, 4 ulp";
const radius = quantityInput("radius", quantities.length);
const length = quantityInput("length", quantities.length);
/** A magnitude against the plasma: 0 collects nothing, so it counts as blank. */
const V = quantityInput("V", quantities.drop, { zeroIsValue: false });

export const PROBEDENSITY = entry("PROBEDENSITY", {
  inputs: [
    quantityInput("I_sat", quantities.current, { zeroIsValue: false }),
    // A probe larger than a hand is a slip: 1 typed for 1 mm².
    quantityInput("area", quantities.area, { band: { low: 1e-10, high: 0.05, above: "mm² meant?" } }),
    T_e,
    ionInput(),
    edge_ratio,
    optional(quantityInput("gamma_ion", quantities.notNegative, { band: { low: 0, high: 1 } })),
    optional(radius),
  ],
  result: quantities.density,
  compute: (I_sat, area, T_e, ion, edge_ratio, gamma_ion) =>
    model.probeDensity(I_sat, area, T_e, ion, edge_ratio, gamma_ion ?? 0),
  equation: String.raw`n = \frac{|I_\mathrm{sat}|}{\dfrac{n_\mathrm{edge}}{n_\mathrm{bulk}}\, e A\, u_B (1 + \gamma)}`,
  twin: {
    blanks: { gamma_ion: 0 },
    steps: [coldBohmSpeed],
    formula: "ABS(I_sat)/(edge_ratio*e*area*u_B*(1+gamma_ion))",
  },
  limits: [
    thinSheath((I_sat, area, T_e, ion, edge_ratio, gamma_ion, radius) => [
      model.probeDensity(I_sat, area, T_e, ion, edge_ratio, gamma_ion ?? 0),
      T_e,
      radius,
    ]),
    weakIonEmission("γ_ion left out", (_I, _A, _T, _ion, _ratio, gamma_ion) =>
      gamma_ion === undefined ? new NotTested("gamma_ion") : 0,
    ),
  ],
  sources: [LL, C03],
  changes: first,
  example: [25e-6, 1e-6, 3, "Ar+"],
  accuracy: closedForm,
});

export const PROBETEMPERATURE = entry("PROBETEMPERATURE", {
  inputs: [
    quantityInput("V_p", quantities.voltage),
    quantityInput("V_f", quantities.voltage),
    ionInput(),
    optional(wordInput("from", model.probeReferences), "plasma"),
    edge_ratio,
  ],
  result: quantities.temperature,
  compute: (V_p, V_f, ion, from, edge_ratio) => {
    const depth = model.floatingDepth(ion, from === "edge" ? 1 : edge_ratio);
    if (!(V_p > V_f)) {
      return noSolution(
        `V_p ${format(V_p, 4)} V is not above V_f ${format(V_f, 4)} V, as it is where electrons are the faster ones.`,
      );
    }
    return depth > 0
      ? (V_p - V_f) / depth
      : noSolution(
          `${ion.label} is as fast as the electrons, so no probe floats below the plasma; check ion and edge_ratio.`,
        );
  },
  limits: [
    maxwellianTail((V_p, V_f, ion, from, edge_ratio) => {
      const depth = model.floatingDepth(ion, from === "edge" ? 1 : edge_ratio);
      return { V_w: V_f - V_p, T_e: (V_p - V_f) / depth, ion, T_i: undefined };
    }),
  ],
  equation: String.raw`T_e = \frac{V_p - V_f}{\ln\sqrt{\dfrac{M}{2\pi m Z}} - \ln\dfrac{n_\mathrm{edge}}{n_\mathrm{bulk}}}`,
  twin: {
    steps: [{ name: "depth", unit: "", formula: 'LN(SQRT(M/(2*PI()*m_e*Z)))-IF(from="edge",0,LN(edge_ratio))' }],
    formula: "IF(V_p>V_f,IF(depth>0,(V_p-V_f)/depth,NA()),NA())",
  },
  sources: [LL, C03],
  changes: first,
  example: [25, 9.5, "Ar+"],
  accuracy: `${closedForm}, given V_p − V_f`,
});

export const ORBITALCURRENT = entry("ORBITALCURRENT", {
  inputs: [V, n_bulk, radius, length, ionInput()],
  result: quantities.current,
  compute: model.orbitalCurrent,
  equation: String.raw`I = 2\pi r l\, n e\, \frac{\sqrt{2}}{\pi} \sqrt{\frac{Z e V}{M}}`,
  twin: { formula: "2*PI()*radius*length*n_bulk*e*SQRT(2)/PI()*SQRT(Z*e*ABS(V)/M)" },
  limits: [
    thinWire((V, n_bulk, radius) => [V, n_bulk, radius]),
    longWire((_V, _n, radius, length) => [radius, length]),
  ],
  sources: [C03, MSL26],
  changes: first,
  example: [50, 1e15, 5e-5, 5e-3, "Ar+"],
  accuracy: closedForm,
});

export const ORBITALDENSITY = entry("ORBITALDENSITY", {
  inputs: [quantityInput("I", quantities.current, { zeroIsValue: false }), V, radius, length, ionInput()],
  result: quantities.density,
  compute: model.orbitalDensity,
  equation: String.raw`n = \frac{|I|}{2\pi r l\, e}\, \frac{\pi}{\sqrt{2}} \sqrt{\frac{M}{Z e V}}`,
  twin: { formula: "ABS(I)/(2*PI()*radius*length*e*SQRT(2)/PI()*SQRT(Z*e*ABS(V)/M))" },
  limits: [
    thinWire((I, V, radius, length, ion) => [V, model.orbitalDensity(I, V, radius, length, ion), radius]),
    longWire((_I, _V, radius, length) => [radius, length]),
  ],
  sources: [C03, MSL26],
  changes: first,
  example: [1.2e-6, 50, 5e-5, 5e-3, "Ar+"],
  accuracy: closedForm,
});

export const PROBEFIT = entry("PROBEFIT", {
  inputs: [
    seriesInput("V", quantities.voltage),
    seriesInput("I", quantities.current),
    optional(labelsInput("sweep")),
    optional(quantityInput("area", quantities.area)),
    optional(ionInput()),
    optional(wordInput("part", probeParts)),
  ],
  result: { columns: probeParts.map((name) => ({ name, unit: unitOfPart[name] })) },
  compute: (V, I, sweep, area, ion, part) => {
    const sweeps = fitSweeps(V, I, sweep);
    if (sweeps instanceof Fault) return sweeps;
    if (sweeps.length === 0)
      return noSolution("The columns hold no readings; select a column of voltages and one of currents.");
    const rows = sweeps.map(({ label, result, notes }) => rowOf(label, result, notes, area, ion));
    return rows.map((row) => (part === undefined ? probeParts.map((name) => row[name]) : [pick(row, part, area, ion)]));
  },
  equation: String.raw`I(V) = I_\mathrm{sat} \left( e^{(V - V_f)/T_e} - 1 \right) + g\,(V - V_f)`,
  twin: "it fits a whole swept characteristic",
  limits: [noRfPickup, ionsSaturate, longRetarding, temperatureCertain],
  sources: [LL, C03],
  changes: first,
  example: exampleSweep(),
  accuracy: "least squares to 1e-7; the errors beside the values say what the readings allow",
});

export const probe: Family = {
  title: "Probe: from a reading back to the plasma",
  entries: [PROBEDENSITY, PROBETEMPERATURE, ORBITALCURRENT, ORBITALDENSITY, PROBEFIT],
};

/** One value of a row; where it is missing, why. */
function pick(row: Row, part: ProbePart, area: number | undefined, ion: unknown): Row[ProbePart] | Fault {
  if (row[part] !== "" || part === "remarks") return row[part];
  const needs =
    part.startsWith("n_bulk") &&
    row.T_e !== "" &&
    row.V_f !== "" &&
    (!ion ? "the ion" : area === undefined && "the area");
  return noSolution(`Sweep ${row.sweep}: ${needs ? `the density needs ${needs}` : row.remarks}.`);
}

/** A coarse sweep of an argon plasma of 3 eV, as an instrument may round it. */
function exampleSweep(): [[number][], [number][]] {
  const voltages = Array.from({ length: 51 }, (_, i) => -30 + 1.5 * i);
  const current = (V: number) => 25e-6 * (Math.exp((Math.min(V, 25) - 9.5) / 3) - 1);
  return [voltages.map((V) => [V]), voltages.map((V) => [Number(current(V).toPrecision(4))])];
}
