import { T_e, T_i } from "../cells/common-inputs";
import { entry, type Family } from "../cells/entry";
import { badInput, noSolution } from "../cells/fault";
import { ionInput, optional, quantityInput } from "../cells/inputs";
import { quantities } from "../cells/quantities";
import { coldIons } from "../edge/limits";
import { warmBohmSpeed } from "../edge/twins";
import { electron } from "../matter/ion";
import { C82, NRL, S00, S12 } from "../sources";
import { aboveGrazing } from "../wall/limits";
import { slowParticles, withinFloatingDrop } from "./limits";
import * as model from "./model";

const first = { "1.0.0": "first version" };
const closedForm = "closed form, 4 ulp";
const B = quantityInput("B", quantities.magneticField);
const angle = quantityInput("angle", quantities.angle);

export const GYRORADIUS = entry("GYRORADIUS", {
  inputs: [quantityInput("T", quantities.temperature), B, optional(ionInput(), electron)],
  result: quantities.length,
  compute: model.gyroradius,
  equation: String.raw`\rho = \frac{\sqrt{e\,T M}}{Z e B}`,
  twin: { formula: "SQRT(e*T*M)/(Z*e*B)" },
  limits: [slowParticles((T, _B, ion) => [T, ion])],
  sources: [NRL],
  changes: first,
  example: [3, 0.02, "Ar+"],
  accuracy: closedForm,
});

export const MAGNETICPRESHEATHWIDTH = entry("MAGNETICPRESHEATHWIDTH", {
  inputs: [T_e, ionInput(), B, angle, T_i],
  result: quantities.length,
  compute: (T_e, ion, B, angle, T_i) => model.magneticPresheathWidth(T_e, ion, B, angle, T_i ?? 0),
  equation: String.raw`L = \sqrt{6}\, \frac{u_B}{\omega_{ci}} \cos\theta, \qquad \omega_{ci} = \frac{Z e B}{M}`,
  twin: {
    blanks: { T_i: 0 },
    steps: [warmBohmSpeed, { name: "omega_ci", unit: "rad/s", formula: "Z*e*B/M" }],
    // cos(angle), which stays exactly 0 at the normal.
    formula: "SQRT(6)*u_B/omega_ci*SIN(RADIANS(90-angle))",
  },
  limits: [
    aboveGrazing((T_e, ion, _B, angle, T_i) => ({ angle, T_e, ion, T_i })),
    coldIons((_T_e, _ion, _B, _angle, T_i) => T_i),
  ],
  sources: [C82, S00],
  changes: first,
  example: [20, "D+", 2, 5, 20],
  accuracy: closedForm,
});

export const MAGNETICPRESHEATHDROP = entry("MAGNETICPRESHEATHDROP", {
  inputs: [T_e, angle],
  result: quantities.voltage,
  compute: model.magneticPresheathDrop,
  equation: String.raw`\Delta V = -T_e \ln \sin\theta`,
  twin: { formula: "-T_e*LN(SIN(RADIANS(angle)))" },
  limits: [withinFloatingDrop((T_e, angle) => model.magneticPresheathDrop(T_e, angle) / T_e)],
  sources: [S00],
  changes: first,
  example: [20, 5],
  accuracy: closedForm,
});

export const GRAZINGLIMIT = entry("GRAZINGLIMIT", {
  inputs: [ionInput(), optional(T_e), T_i],
  result: quantities.angle,
  compute: (ion, T_e, T_i) => {
    if (T_e === undefined && T_i !== undefined && T_i > 0) {
      return badInput(
        "T_e",
        "it is blank while T_i is given, and only their ratio counts",
        "type T_e too, or leave both",
      );
    }
    const angle = model.grazingLimit(ion, T_e === undefined ? 0 : (T_i ?? 0) / T_e);
    return Number.isNaN(angle)
      ? noSolution(
          `${ion.label} at these temperatures is as fast as the electrons: it floats nowhere, at any angle; check ion and T_i/T_e.`,
        )
      : angle;
  },
  equation: String.raw`\theta_g = \arcsin\sqrt{2\pi \frac{m}{M}\left(Z + \frac{T_i}{T_e}\right)}`,
  twin: {
    blanks: { T_i: 0 },
    formula: 'DEGREES(ASIN(SQRT(2*PI()*m_e/M*(Z+IF(T_e="",IF(T_i>0,NA(),0),T_i/T_e)))))',
  },
  limits: [coldIons((_ion, _T_e, T_i) => T_i)],
  sources: [S12],
  changes: first,
  example: ["D+", 20, 20],
  accuracy: closedForm,
});

export const magnetised: Family = {
  title: "Magnetised walls",
  entries: [GYRORADIUS, MAGNETICPRESHEATHWIDTH, MAGNETICPRESHEATHDROP, GRAZINGLIMIT],
};
