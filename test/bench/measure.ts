/**
 * Cost of one call in ms: the median over blocks, each long enough that the garbage its calls make is collected inside
 * it and charged to it. Several things measured together take turns, so that a slow moment of the machine hits them all.
 */
export function measureTogether(calls: (() => unknown)[], { blocks = 9, perBlock = 0 } = {}): number[] {
  const repeats = calls.map((call) => perBlock || repeatsFor(call));
  const times: number[][] = calls.map(() => []);
  for (let block = 0; block < blocks; block++) {
    calls.forEach((call, i) => {
      const start = performance.now();
      for (let k = 0; k < repeats[i]; k++) call();
      times[i].push((performance.now() - start) / repeats[i]);
    });
  }
  return times.map(median);
}

/** Enough repeats for some 60 ms, after the compiler has had its time. */
function repeatsFor(call: () => unknown): number {
  for (let k = 0; k < 3; k++) call();
  const start = performance.now();
  let done = 0;
  while (performance.now() - start < 100 || done < 2) {
    call();
    done++;
  }
  return Math.max(1, Math.round((60 * done) / (performance.now() - start)));
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
}
