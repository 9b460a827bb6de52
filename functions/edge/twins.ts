/** Steps that the twins of several families share, in the names their formulas use. */
import type { Step } from "../cells/twin";

/** With the ions' own temperature. */
export const warmBohmSpeed: Step = { name: "u_B", unit: "m/s", formula: "SQRT(e*(Z*T_e+T_i)/M)" };
export const coldBohmSpeed: Step = { name: "u_B", unit: "m/s", formula: "SQRT(Z*e*T_e/M)" };

/** Mean speed of the electrons. */
export const electronSpeed: Step = { name: "v_e", unit: "m/s", formula: "SQRT(8*e*T_e/(PI()*m_e))" };

export const edgeDebyeLength: Step = { name: "lambda_D", unit: "m", formula: "SQRT(eps0*T_e/(e*n_edge))" };
export const edgeDensity: Step = { name: "n_edge", unit: "m^-3", formula: "edge_ratio*n_bulk" };
