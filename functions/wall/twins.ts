/** Steps that several of the wall's twins share. */
import type { Step } from "../cells/twin";

/** Where the wall stands against the edge, with emission. */
export const wallPotential: Step = {
  name: "V",
  unit: "V",
  formula: 'IF(V_w="floating",-T_e*LN((1-delta_e)*v_e/(4*u_B)),V_w)',
};

/** No formula, but the outcome of an iteration. */
export const spaceChargeLimit = "a floating wall with delta_e at or above its space-charge limit (EMISSIONLIMIT)";
