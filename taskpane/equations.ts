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
  return lines(tex).flatMap(cases).map(mathml).join("");
}

interface Line {
  tex: string;
  /** Where the line stands: a line of its own, one that goes on from the one before, or the name of a case. */
  role?: "continued" | "case";
}

function mathml({ tex, role }: Line): string {
  const made = temml.renderToString(tex, { displayMode: role !== "case", throwOnError: true });
  return made.replace(/ style="[^"]*"/g, "").replace("<math", role ? `<math data-line="${role}"` : "<math");
}

/** Breaks where print would: at wide spaces, and before the second and each further "=" of a chain. */
function lines(tex: string): Line[] {
  const found: Line[] = [{ tex: "" }];
  let depth = 0;
  let equals = 0;
  for (const [token] of tex.matchAll(/\\(?:[A-Za-z]+|.)|[^\\]/gs)) {
    if (/^(\{|\\left|\\begin)$/.test(token)) depth++;
    if (/^(\}|\\right|\\end)$/.test(token)) depth--;
    const space = depth === 0 && /^\\q?quad$/.test(token);
    if (space) equals = 0;
    if (space) found.push({ tex: "" });
    else if (depth === 0 && token === "=" && ++equals > 1) found.push({ tex: "", role: "continued" });
    if (!space) found.at(-1)!.tex += token;
  }
  return found.map((line) => ({ ...line, tex: line.tex.trim().replace(/,$/, "") })).filter((line) => line.tex !== "");
}

/** Cases below each other, each under its name: side by side in a brace they would be twice as wide. */
function cases(line: Line): Line[] {
  const parts = /^(.*)\\begin\{cases\}(.*)\\end\{cases\}$/s.exec(line.tex);
  if (!parts) return [line];
  const [, before, rows] = parts;
  return rows.split("\\\\").flatMap((row) => {
    const [value, name] = row.split("&");
    const [first, ...more] = lines(before + value);
    const rest = more.map(({ tex }) => ({ tex, role: "continued" as const }));
    return [{ tex: name, role: "case" as const }, first, ...rest];
  });
}
