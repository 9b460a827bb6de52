/** Steps that several of the layer's twins share. */
import type { Step } from "../cells/twin";

export const drop: Step = { name: "eta", unit: "", formula: "ABS(V_s)/T_e" };

/** μ²(√(1 + 2η/μ²) − 1) as 2η/(1 + √…), which keeps its digits for fast ions. */
export const fieldAtWall: Step = {
  name: "E",
  unit: "V/m",
  formula: "T_e/lambda_D*SQRT(2*(2*eta/(1+SQRT(1+2*eta/u_ratio^2))+EXP(-eta)-1))",
};
