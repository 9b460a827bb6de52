import { extent } from "./curve-axis";
import type { Curve, Trace } from "./curve-data";
import { quantity, span } from "./curve-unit";
import { numberText } from "./number-text";

/** What a curve shows, for those who don't see it: from where to where, whether it rises or falls, and its extremes. */
export function curveWords({ x, y, alone }: Curve): string {
  const range = `From ${x.name} = ${span(x.values[0], x.values.at(-1)!, x.unit)}`;
  const parts = y.map((trace) => traceWords(x, trace));
  if (alone) parts.push(`${alone.name} ${numberText(alone.share, 3)} at ${quantity(alone.x, x.unit)}`);
  return `${range}: ${parts.join("; ")}.`;
}

function traceWords(x: Trace, { name, unit, values }: Trace): string {
  const seen = values.filter((value) => !Number.isNaN(value));
  const [first, last] = [seen[0], seen.at(-1)!];
  const [low, high] = extent(seen);
  if (low === high) return `${name} stays at ${quantity(low, unit)}`;
  const steps = seen.slice(1).map((value, i) => value - seen[i]);
  const rises = steps.every((step) => step >= 0);
  if (rises || steps.every((step) => step <= 0))
    return `${name} ${rises ? "rises" : "falls"} from ${span(first, last, unit)}`;
  const at = (value: number) =>
    `${quantity(value, unit)} at ${x.name} = ${quantity(x.values[values.indexOf(value)], x.unit)}`;
  const extremes = [
    low < Math.min(first, last) && `least ${at(low)}`,
    high > Math.max(first, last) && `greatest ${at(high)}`,
  ].filter((part) => part !== false);
  return [`${name} goes from ${span(first, last, unit)}`, ...extremes].join(", ");
}
