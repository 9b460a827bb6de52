import { isTable } from "../../functions/cells/entry";
import type { Result } from "../../functions/cells/evaluate";
import { frontDoors } from "../../functions/front-doors";
import type { Curve, Trace } from "../pane/curve-data";
import { stretchesOf } from "./stretches";
import type { Sweep } from "./table";
import type { Spacing } from "./values";

/** The swept values with what the function gives at each, as a curve; or why there is none. */
export function runSweep(sweep: Sweep, spacing: Spacing): Curve | string {
  const { entry, swept, values, typed, unit } = sweep;
  const args = typed.map(({ cell }, i) => (i === swept ? values.map((value) => [value]) : [[cell]]));
  const result: Result = frontDoors[entry.name](...args, ...(entry.takesUnit ? [[[unit.cell]]] : []));
  const problem = problemWith(result, values.length);
  if (problem !== undefined) return problem;
  const { name, quantity, kind } = entry.inputs[swept];
  return {
    x: { name, unit: kind === "ion" ? "u" : (quantity?.unit ?? ""), values },
    y: tracesOf(sweep, result),
    logarithmicX: spacing === "logarithmic",
    fromWall: false,
    stretches: stretchesOf(entry, args, swept, result),
  };
}

/** A curve needs a number in one row at least. */
function problemWith(result: Result, count: number): string | undefined {
  const error = result.flat().find((cell) => typeof cell === "object");
  if (result.length === count && result.flat().some((cell) => typeof cell === "number")) return undefined;
  return error ? `${error.code} ${error.message ?? ""}`.trim() : "No row of this sweep gives a number.";
}

function tracesOf({ entry, unit }: Sweep, result: Result): Trace[] {
  const column = (at: number) => result.map((row) => (typeof row[at] === "number" ? row[at] : NaN));
  if (!isTable(entry.result))
    return [
      { name: entry.name, unit: typeof unit.cell === "string" ? unit.cell : entry.result.unit, values: column(0) },
    ];
  return entry.result.columns
    .map((each, at) => ({ ...each, values: column(at) }))
    .filter(({ values }) => values.some((value) => !Number.isNaN(value)));
}
