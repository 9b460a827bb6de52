/**
 * MathML of every function's equation by its name. The build runs this file once and ships its result (see
 * manifest/build/freeze-loader.js), so that no TeX compiler reaches the pane.
 */
import temml from "temml";
import { catalogue } from "../functions/catalogue";

export const equations: Record<string, string> = Object.fromEntries(
  catalogue.map(({ name, equation }) => [name, typeset(equation)]),
);

/** One <math> a line, each narrow enough for the pane. */
function typeset(tex: string): string {
  return lines(tex)
    .map((line) => [line, temml.renderToString(line, { displayMode: true, throwOnError: true })])
    .map(([line, mathml]) => (line.startsWith("=") ? mathml.replace('class="', 'class="continued ') : mathml))
    .map((mathml) => mathml.replace(/ style="[^"]*"/g, ""))
    .join("");
}

/** Breaks where print would: at wide spaces, and before the second and each further "=" of a chain. */
function lines(tex: string): string[] {
  const found = [""];
  let depth = 0;
  let equals = 0;
  for (const [token] of tex.matchAll(/\\(?:[A-Za-z]+|.)|[^\\]/gs)) {
    if (/^(\{|\\left|\\begin)$/.test(token)) depth++;
    if (/^(\}|\\right|\\end)$/.test(token)) depth--;
    const space = depth === 0 && /^\\q?quad$/.test(token);
    if (space) equals = 0;
    if (space || (depth === 0 && token === "=" && ++equals > 1)) found.push("");
    if (!space) found[found.length - 1] += token;
  }
  return found.map((line) => line.trim().replace(/,$/, "")).filter((line) => line !== "");
}
