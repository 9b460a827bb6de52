/**
 * How many units in the last place `value` lies from a reference given to more digits than a double holds. The
 * reference is rounded to a double first, which costs half a unit at most.
 */
export function ulpsFrom(value: number, reference: string | number): number {
  const exact = Number(reference);
  if (value === exact) return 0;
  return Math.abs(value - exact) / ulp(exact);
}

/** The spacing of doubles at x. */
export function ulp(x: number): number {
  const size = Math.max(Math.abs(x), 2 ** -1022);
  return 2 ** (Math.floor(Math.log2(size)) - 52);
}
