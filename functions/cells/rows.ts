import { Fault } from "./fault";

type Compute = (...values: any[]) => unknown;
type Values = ArrayLike<any>;

/**
 * Calls `compute` once per row over columns that hold one value per row, or one value for all. Arguments are passed by
 * position, without an array in between: over long columns that spread costs more than the physics. Rows marked odd
 * are left undefined; a row that throws gets a Fault of its own.
 */
export function applyRows(compute: Compute, columns: readonly Values[], size: number, odd?: Uint8Array): unknown[] {
  const out: unknown[] = new Array(size);
  const rows = loops[columns.length] ?? anyNumber;
  for (let from = 0; from < size;) {
    const stopped = attempt(rows, compute, columns, size, odd, out, from);
    if (stopped === undefined) break;
    out[stopped.row] = stopped.fault;
    from = stopped.row + 1;
  }
  return out;
}

/** Runs until a row throws, and tells which: the try stands outside the loop, where it costs nothing. */
function attempt(
  rows: Loop,
  compute: Compute,
  columns: readonly Values[],
  size: number,
  odd: Uint8Array | undefined,
  out: unknown[],
  from: number,
): { row: number; fault: Fault } | undefined {
  const progress = { row: from };
  try {
    rows(compute, columns, size, odd, out, progress);
    return undefined;
  } catch (error) {
    return { row: progress.row, fault: unexpected(error) };
  }
}

/** A bug stays in its own cell, and says so. */
export function unexpected(error: unknown): Fault {
  const what = error instanceof Error ? error.message : String(error);
  return new Fault("#N/A", `No result (${what}); please report this call.`);
}

type Loop = (
  compute: Compute,
  columns: readonly Values[],
  size: number,
  odd: Uint8Array | undefined,
  out: unknown[],
  progress: { row: number },
) => void;

const step = (values: Values) => (values.length === 1 ? 0 : 1);

const loops: Record<number, Loop> = {
  1: (compute, [a], size, odd, out, progress) => {
    const p = step(a);
    for (let i = progress.row; i < size; i++) {
      progress.row = i;
      if (odd === undefined || odd[i] === 0) out[i] = compute(a[i * p]);
    }
  },
  2: (compute, [a, b], size, odd, out, progress) => {
    const [p, q] = [step(a), step(b)];
    for (let i = progress.row; i < size; i++) {
      progress.row = i;
      if (odd === undefined || odd[i] === 0) out[i] = compute(a[i * p], b[i * q]);
    }
  },
  3: (compute, [a, b, c], size, odd, out, progress) => {
    const [p, q, r] = [step(a), step(b), step(c)];
    for (let i = progress.row; i < size; i++) {
      progress.row = i;
      if (odd === undefined || odd[i] === 0) out[i] = compute(a[i * p], b[i * q], c[i * r]);
    }
  },
  4: (compute, [a, b, c, d], size, odd, out, progress) => {
    const [p, q, r, s] = [step(a), step(b), step(c), step(d)];
    for (let i = progress.row; i < size; i++) {
      progress.row = i;
      if (odd === undefined || odd[i] === 0) out[i] = compute(a[i * p], b[i * q], c[i * r], d[i * s]);
    }
  },
};

const anyNumber: Loop = (compute, columns, size, odd, out, progress) => {
  const steps = columns.map(step);
  const values = new Array(columns.length);
  for (let i = progress.row; i < size; i++) {
    progress.row = i;
    if (odd !== undefined && odd[i] !== 0) continue;
    for (let k = 0; k < columns.length; k++) values[k] = columns[k][i * steps[k]];
    out[i] = compute(...values);
  }
};
