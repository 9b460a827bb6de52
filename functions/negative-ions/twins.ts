import type { Step } from "../cells/twin";

export const electronegativeBohmSpeed: Step = {
  name: "u",
  unit: "m/s",
  formula: "SQRT(Z*e*T_e/M*(1+alpha_s)/(1+alpha_s*gamma))",
};
