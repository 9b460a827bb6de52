/** Inputs that many functions share, under the names the catalogue gives them. */
import { freeEdgeRatio } from "../edge/model";
import { optional, quantityInput } from "./inputs";
import { quantities } from "./quantities";

export const n_bulk = quantityInput("n_bulk", quantities.density);
export const n_edge = quantityInput("n_edge", quantities.density);
export const T_e = quantityInput("T_e", quantities.temperature);

/**
 * Blank stays undefined, so that a limit can say that the ion temperature was not given; the models then take 0. Room
 * temperature in kelvin, 293, is the usual slip; ions at a wall are rarely so hot in eV.
 */
export const T_i = optional(
  quantityInput("T_i", quantities.temperature, {
    least: 0,
    zeroIsValue: true,
    band: { low: 0, high: 290, above: "K meant?" },
  }),
);

export const edge_ratio = optional(quantityInput("edge_ratio", quantities.ratio, { most: 1 }), freeEdgeRatio);
export const lambda_i = quantityInput("lambda_i", quantities.length);

/** The drop across a sheath, a magnitude whose sign is ignored: no drop at all is a blank, not a sheath. */
export const V_s = quantityInput("V_s", quantities.drop, { zeroIsValue: false });
