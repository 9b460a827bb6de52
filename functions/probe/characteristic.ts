/** One sweep in order: rising voltages, each once, in V, and the current in A, electrons counted positive. */
export interface Characteristic {
  V: Float64Array;
  I: Float64Array;
  /** How many readings each point is the mean of. */
  count: Float64Array;
  /** Variance of the mean of many neighbours over that of as many independent readings; 1 unless said. */
  likeness?: number;
}

/** A sweep put in order, and what that took. */
export interface Ordered {
  curve: Characteristic;
  notes: string[];
}

/** Readings in any order and with either sign, as a characteristic. */
export function characteristicOf(readings: readonly (readonly [V: number, I: number])[]): Ordered {
  const notes: string[] = [];
  const sorted = withoutEmpties(
    [...readings].sort(([a], [b]) => a - b),
    notes,
  );
  const [V, I, count] = [[] as number[], [] as number[], [] as number[]];
  for (const [voltage, current] of sorted) {
    const last = V.length - 1;
    if (V[last] === voltage) {
      count[last]++;
      I[last] += (current - I[last]) / count[last];
    } else {
      V.push(voltage);
      I.push(current);
      count.push(1);
    }
  }
  const repeated = count.filter((each) => each > 1).length;
  if (repeated > 0) notes.push(`readings at ${repeated} repeated ${repeated === 1 ? "voltage" : "voltages"} averaged`);
  const sign = risesWithVoltage(I) ? 1 : -1;
  if (sign < 0) notes.push("current counted with the opposite sign: it falls with voltage as written");
  return {
    curve: { V: Float64Array.from(V), I: Float64Array.from(I, (each) => sign * each), count: Float64Array.from(count) },
    notes,
  };
}

/** Electrons are many more than ions: on the whole the current rises, unless it was counted into the probe. */
function risesWithVoltage(I: readonly number[]): boolean {
  const fifth = Math.max(1, Math.floor(I.length / 5));
  const sum = (some: readonly number[]) => some.reduce((total, each) => total + each, 0);
  return sum(I.slice(-fifth)) >= sum(I.slice(0, fifth));
}

/**
 * Leaves out runs of exact zeros where the current beside them is nowhere near zero: empty cells, which the host sends as 0.
 * A current that passes through 0 has neighbours of either sign, and one below the instrument's step has zeros all along.
 */
function withoutEmpties(sorted: (readonly [number, number])[], notes: string[]): (readonly [number, number])[] {
  const largest = sorted.reduce((most, [, I]) => Math.max(most, Math.abs(I)), 0);
  const kept: (readonly [number, number])[] = [];
  for (let i = 0; i < sorted.length;) {
    let end = i + 1;
    if (sorted[i][1] === 0) while (end < sorted.length && sorted[end][1] === 0) end++;
    const [before, after] = [sorted[i - 1]?.[1] ?? 0, sorted[end]?.[1] ?? 0];
    const [least, most] = [Math.min(Math.abs(before), Math.abs(after)), Math.max(Math.abs(before), Math.abs(after))];
    const between = before * after > 0 && least > 1.5e-3 * largest;
    const empty = sorted[i][1] === 0 && (between || most > 0.05 * largest);
    if (!empty) kept.push(...sorted.slice(i, end));
    i = end;
  }
  const left = sorted.length - kept.length;
  if (left > 0) notes.push(`${left} ${left === 1 ? "current" : "currents"} of exactly 0 taken for empty cells`);
  return kept;
}

/**
 * Squares of how far each inner point lies off the line through its neighbours, divided so that each estimates the variance
 * of a single reading there.
 */
export function neighbourSquares(
  { V, count }: Characteristic,
  from: number,
  to: number,
  value: (i: number) => number,
): Float64Array {
  const squares = new Float64Array(Math.max(0, to - from - 2));
  for (let i = from + 1; i < to - 1; i++) {
    const share = (V[i + 1] - V[i]) / (V[i + 1] - V[i - 1]);
    const off = value(i) - share * value(i - 1) - (1 - share) * value(i + 1);
    squares[i - from - 1] = off ** 2 / (1 / count[i] + share ** 2 / count[i - 1] + (1 - share) ** 2 / count[i + 1]);
  }
  return squares;
}
