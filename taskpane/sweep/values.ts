export const spacings = ["linear", "logarithmic"] as const;
export type Spacing = (typeof spacings)[number];

/** The fewest and most values of one sweep. */
export const fewest = 2;
export const most = 2000;

/** So many values from one to the other, both included, or why there are none. */
export function sweepValues(from: number, to: number, count: number, spacing: Spacing): number[] | string {
  if (!Number.isInteger(count) || count < fewest || count > most)
    return `A sweep has from ${fewest} to ${most} values: type a whole number between them.`;
  if (from === to) return "The sweep ends where it begins: type two different values.";
  if (spacing === "logarithmic" && from * to <= 0)
    return "Logarithmic steps need both ends on the same side of 0: change one, or take linear steps.";
  const inner = Array.from({ length: count - 2 }, (_, i) => (i + 1) / (count - 1));
  const digits = spacing === "linear" ? 12 : digitsFor(Math.log(to / from) / (count - 1));
  return [
    from,
    ...inner.map((part) =>
      rounded(spacing === "linear" ? from + (to - from) * part : from * (to / from) ** part, digits),
    ),
    to,
  ];
}

/** Nobody needs twelve digits of a geometric step: so many that rounding moves no value by a thousandth of its step. */
function digitsFor(relativeStep: number): number {
  return Math.min(15, 4 + Math.max(0, Math.ceil(-Math.log10(Math.abs(relativeStep)))));
}

function rounded(value: number, digits: number): number {
  return Number(value.toPrecision(digits));
}
