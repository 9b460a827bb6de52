/** The columns of a fit, in order, and the names under which one can be picked. */
export const probeParts = [
  "sweep",
  "T_e",
  "T_e_error",
  "V_f",
  "V_f_error",
  "V_p",
  "V_p_error",
  "V_p_from",
  "I_sat",
  "I_sat_error",
  "n_bulk",
  "n_bulk_error",
  "window_from",
  "window_to",
  "points",
  "remarks",
] as const;
export type ProbePart = (typeof probeParts)[number];

export const unitOfPart: Record<ProbePart, string> = {
  sweep: "",
  T_e: "eV",
  T_e_error: "eV",
  V_f: "V",
  V_f_error: "V",
  V_p: "V",
  V_p_error: "V",
  V_p_from: "",
  I_sat: "A",
  I_sat_error: "A",
  n_bulk: "m^-3",
  n_bulk_error: "m^-3",
  window_from: "V",
  window_to: "V",
  points: "",
  remarks: "",
};
