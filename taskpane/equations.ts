/**
 * MathML of every function's equation by its name. The build runs this file once and ships its result (see
 * manifest/build/freeze-loader.js), so that no TeX compiler reaches the pane.
 */
import temml from "temml";
import { catalogue } from "../functions/catalogue";

export const equations: Record<string, string> = Object.fromEntries(
  catalogue.map(({ name, equation }) => [name, typeset(equation)]),
);

/** One <math> for each equation of the line, so that a narrow pane can put them below each other. */
function typeset(tex: string): string {
  return tex
    .split(/,?\s*\\qquad\s*/)
    .map((part) => temml.renderToString(part, { displayMode: true, throwOnError: true }))
    .map((mathml) => mathml.replace(/ style="[^"]*"/g, ""))
    .join("");
}
