import { badInput, type Fault } from "../cells/fault";
import { format } from "../cells/format";
import { flagInput, optional, quantityInput } from "../cells/inputs";
import { quantities } from "../cells/quantities";

/** Ion speed at the edge over the Bohm speed: below 1 no monotonic sheath can form. */
export const u_ratio = optional(
  quantityInput("u_ratio", quantities.ratio, {
    least: 1,
    most: 1e6,
    example: "1.5",
    band: { low: 1, high: 10, above: "speed over u_B, not m/s" },
  }),
  1,
);

const pointCount = { ...quantities.ratio, name: "number of points", example: "50" };

/** Rows of a spilled curve. */
export const points = optional(quantityInput("points", pointCount, { least: 2, most: 2000 }), 50);

/** Whether a row of titles stands above the numbers. */
export const header = optional(flagInput("header"), false);

/** Half a row is none. */
export function notWhole(points: number): Fault {
  return badInput("points", `${format(points, 6)} is not a whole number`, "type a number of points such as 50");
}

/** A law for ions that collide needs to know how often. */
export function missingPath(): Fault {
  return badInput(
    "lambda_i",
    'it is blank while model is "collisional"',
    "type the ions' mean free path such as 0.5 mm, or MEANFREEPATH",
  );
}
