import { checks as entries } from "../catalogue";
import { evaluate } from "../cells/evaluate";
import { repeated } from "./repeated";

/**
 * How uncertainties are propagated.
 * @customenum {string}
 */
export enum UncertaintyMethod {
  /** First order in each argument; one evaluation costs little. */
  linear = "linear",
  /** 100,000 draws from normal distributions for each row, 20 rows at most. */
  montecarlo = "montecarlo",
}

/**
 * Whether a function may be believed at these inputs, row by row: the worst of "fails", "doubtful input", "marginal", "holds" and "not tested", in that order, with the reason. "not tested" comes before "holds" where it concerns what the model stands on.
 * @customfunction LIMITCHECK
 * @helpurl https://localhost:3000/taskpane.html#LIMITCHECK
 * @param function_name Name of the function to check, as text.
 * @param inputs The inputs of that function, in its own order, as cells or ranges; the unit of its result changes nothing.
 */
export function LIMITCHECK(function_name: any[][], ...inputs: any[][][]): any[][] {
  return evaluate(entries.LIMITCHECK, [function_name, ...repeated(inputs)]);
}

/**
 * Every limit of a function at one set of inputs, a row for each: assumption, measure, value, bounds, verdict. There is no title row.
 * @customfunction LIMITS
 * @helpurl https://localhost:3000/taskpane.html#LIMITS
 * @param function_name Name of the function to check, as text.
 * @param inputs The inputs of that function, in its own order, a single cell each.
 */
export function LIMITS(function_name: any[][], ...inputs: any[][][]): any[][] {
  return evaluate(entries.LIMITS, [function_name, ...repeated(inputs)]);
}

/**
 * Which simplifications a plasma and its wall allow, always the same six rows: assumption, measure, value, bounds, verdict. A row whose inputs are missing says what to give.
 * @customfunction REGIME
 * @helpurl https://localhost:3000/taskpane.html#REGIME
 * @param n_e Electron density of the body, m⁻³; the edge is taken to have exp(-1/2) of it.
 * @param T_e Electron temperature, eV.
 * @param ion Ion as a formula or a mass in u.
 * @param [p] Pressure of the ion's own gas at 300 K, Pa; for argon and xenon, otherwise give lambda_i.
 * @param [T_i] Ion temperature, eV.
 * @param [V_s] Sheath voltage, V, its sign ignored; or "floating".
 * @param [size] Smallest dimension of the plasma or of the object in it, m.
 * @param [B] Magnetic field, T.
 * @param [f] Driving frequency, Hz.
 * @param [lambda_i] Ion mean free path, m; takes the place of p.
 */
export function REGIME(
  n_e: any[][],
  T_e: any[][],
  ion: any[][],
  p?: any[][],
  T_i?: any[][],
  V_s?: any[][],
  size?: any[][],
  B?: any[][],
  f?: any[][],
  lambda_i?: any[][],
): any[][] {
  return evaluate(entries.REGIME, [n_e, T_e, ion, p, T_i, V_s, size, B, f, lambda_i]);
}

/**
 * Whether a value lies within a tolerance of a reference: "holds", or "fails" with both numbers. The larger of the two tolerances counts.
 * @customfunction WITHIN
 * @helpurl https://localhost:3000/taskpane.html#WITHIN
 * @param value Number, or text with a unit.
 * @param reference Number it should be near, with a unit where value has one.
 * @param [rel_tol] Tolerance relative to the reference: 0.05 or a typed 5 %.
 * @param [abs_tol] Tolerance as a difference, with a unit where value has one; 5 °C is 5 K.
 * @param [label] What is compared, for the message.
 */
export function WITHIN(
  value: any[][],
  reference: any[][],
  rel_tol?: any[][],
  abs_tol?: any[][],
  label?: any[][],
): any[][] {
  return evaluate(entries.WITHIN, [value, reference, rel_tol, abs_tol, label]);
}

/**
 * What any number of checks come to, in one cell: how many hold, are marginal, doubtful or not tested, or how many fail and the first reason. An error counts as failing.
 * @customfunction VERDICT
 * @helpurl https://localhost:3000/taskpane.html#VERDICT
 * @param checks Ranges with results of LIMITCHECK, LIMITS, REGIME or WITHIN; other cells in them are passed over.
 */
export function VERDICT(...checks: any[][][]): any[][] {
  return evaluate(entries.VERDICT, repeated(checks));
}

/**
 * Uncertainty of a function's result from those of its arguments, a row for each case: value, standard uncertainty, and the share of each argument in its square. With "montecarlo": value, standard uncertainty, both ends of the 95 % interval, draws without a value, shares.
 * @customfunction UNCERTAINTY
 * @helpurl https://localhost:3000/taskpane.html#UNCERTAINTY
 * @param function_name Name of a function that returns one number, as text.
 * @param values Its arguments in order, a column for each and a row for each case; text is allowed.
 * @param [rel_unc] Relative standard uncertainties: one row for all or one for each case, one cell for all columns or one for each.
 * @param [abs_unc] Absolute standard uncertainties in the argument's own unit, laid out alike; both given add in quadrature.
 * @param [method] "linear" or "montecarlo", normal and independent arguments; linear unless given.
 * @param [part] One column by name: value, u, low, high, outside, or an argument for its share.
 */
export function UNCERTAINTY(
  function_name: any[][],
  values: any[][],
  rel_unc?: any[][],
  abs_unc?: any[][],
  method?: UncertaintyMethod[][],
  part?: any[][],
): any[][] {
  return evaluate(entries.UNCERTAINTY, [function_name, values, rel_unc, abs_unc, method, part]);
}
