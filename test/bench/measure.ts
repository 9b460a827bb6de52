/**
 * Cost of one call in ms of processor time, which other programs on the machine disturb less than the clock: the median
 * over blocks, each long enough that the garbage its calls make is collected inside it and charged to it. Several things
 * measured together take turns, so that a slow moment of the machine hits them all.
 */
export function measureTogether(calls: (() => unknown)[], { blocks = 9, perBlock = 0 } = {}): number[] {
  const repeats = calls.map((call) => perBlock || repeatsFor(call));
  const times: number[][] = calls.map(() => []);
  for (let block = 0; block < blocks; block++) {
    calls.forEach((call, i) => {
      const start = processorTime();
      for (let k = 0; k < repeats[i]; k++) call();
      times[i].push((processorTime() - start) / repeats[i]);
    });
  }
  return times.map(median);
}

/**
 * How many times as long a call takes as another. One round in which the machine had other things to do must not decide:
 * a ratio above what is claimed is measured twice more, and the middle one counts.
 */
export function ratioOf(call: () => unknown, base: () => unknown, most = Infinity): number {
  const measure = () => {
    const [one, other] = measureTogether([call, base]);
    return one / other;
  };
  const first = measure();
  return first <= most ? first : median([first, measure(), measure()]);
}

/** Of all threads of this process, in ms. */
function processorTime(): number {
  const { user, system } = process.cpuUsage();
  return (user + system) / 1000;
}

/** Enough repeats for some 60 ms, after the compiler has had its time. */
function repeatsFor(call: () => unknown): number {
  for (let k = 0; k < 3; k++) call();
  const start = processorTime();
  let done = 0;
  while (processorTime() - start < 150 || done < 2) {
    call();
    done++;
  }
  return Math.max(1, Math.round((60 * done) / (processorTime() - start)));
}

export function median(values: number[]): number {
  return [...values].sort((a, b) => a - b)[values.length >> 1];
}

/** Numbers spread evenly in the logarithm, as a column of cells. */
export function sweep(from: number, to: number, rows: number): number[][] {
  return Array.from({ length: rows }, (_, i) => [from * (to / from) ** (i / (rows - 1))]);
}

export interface Row {
  what: string;
  value: number;
  unit: string;
  /** The bound the product claims, where there is one. */
  claim?: string;
  holds?: boolean;
  /** Further numbers of the same thing, each by its unit. */
  also?: Record<string, number>;
}

/** A row with the claim that its value is at most so much. */
export function atMost(most: number, row: Row): Row {
  return { ...row, claim: `≤ ${most}`, holds: row.value <= most };
}
