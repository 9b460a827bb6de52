import type { Step } from "../cells/twin";

/** What all ions of the mixture share under the rule "common". */
export const speedTogether: Step = {
  name: "u_common",
  unit: "m/s",
  formula: "SQRT(e*T_e*SUMPRODUCT(fractions*Z*Z/M))",
};

export const speedOfOne = 'IF(rule="common",u_common,SQRT(Z*e*T_e/M))';
