import { Fault } from "./fault";
import { take } from "./scratch";

type Compute = (...values: any[]) => unknown;
type Values = ArrayLike<any>;

/** Results of a column of calls: finite and other numbers in `numbers`, everything else by row in `others`. */
export interface Computed {
  numbers: Float64Array;
  others: Map<number, unknown> | undefined;
}

/**
 * Calls `compute` once per row over columns that hold one value per row, or one value for all. Arguments are passed by
 * position, without an array in between: over long columns that spread costs more than the physics. Rows marked odd
 * are skipped; a row that throws gets a Fault of its own.
 */
export function applyRows(compute: Compute, columns: readonly Values[], size: number, odd?: Uint8Array): Computed {
  const out: Out = { numbers: take(size), others: undefined };
  const rows = loops[columns.length] ?? anyNumber;
  for (let from = 0; from < size;) {
    const stopped = attempt(rows, compute, columns, size, odd, out, from);
    if (stopped === undefined) break;
    keep(out, stopped.row, stopped.fault);
    from = stopped.row + 1;
  }
  return out;
}

type Out = Computed;

function keep(out: Out, row: number, result: unknown): void {
  (out.others ??= new Map()).set(row, result);
}

/** Runs until a row throws, and tells which: the try stands outside the loop, where it costs nothing. */
function attempt(
  rows: Loop,
  compute: Compute,
  columns: readonly Values[],
  size: number,
  odd: Uint8Array | undefined,
  out: Out,
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
  out: Out,
  progress: { row: number },
) => void;

const step = (values: Values) => (values.length === 1 ? 0 : 1);

const loops: Record<number, Loop> = {
  1: (compute, [a], size, odd, out, progress) => {
    const p = step(a);
    const { numbers } = out;
    for (let i = progress.row; i < size; i++) {
      progress.row = i;
      if (odd !== undefined && odd[i] !== 0) continue;
      const result = compute(a[i * p]);
      if (typeof result === "number") numbers[i] = result;
      else keep(out, i, result);
    }
  },
  2: (compute, [a, b], size, odd, out, progress) => {
    const [p, q] = [step(a), step(b)];
    const { numbers } = out;
    for (let i = progress.row; i < size; i++) {
      progress.row = i;
      if (odd !== undefined && odd[i] !== 0) continue;
      const result = compute(a[i * p], b[i * q]);
      if (typeof result === "number") numbers[i] = result;
      else keep(out, i, result);
    }
  },
  3: (compute, [a, b, c], size, odd, out, progress) => {
    const [p, q, r] = [step(a), step(b), step(c)];
    const { numbers } = out;
    for (let i = progress.row; i < size; i++) {
      progress.row = i;
      if (odd !== undefined && odd[i] !== 0) continue;
      const result = compute(a[i * p], b[i * q], c[i * r]);
      if (typeof result === "number") numbers[i] = result;
      else keep(out, i, result);
    }
  },
  4: (compute, [a, b, c, d], size, odd, out, progress) => {
    const [p, q, r, s] = [step(a), step(b), step(c), step(d)];
    const { numbers } = out;
    for (let i = progress.row; i < size; i++) {
      progress.row = i;
      if (odd !== undefined && odd[i] !== 0) continue;
      const result = compute(a[i * p], b[i * q], c[i * r], d[i * s]);
      if (typeof result === "number") numbers[i] = result;
      else keep(out, i, result);
    }
  },
};

const anyNumber: Loop = (compute, columns, size, odd, out, progress) => {
  const steps = columns.map(step);
  const { numbers } = out;
  const values = new Array(columns.length);
  for (let i = progress.row; i < size; i++) {
    progress.row = i;
    if (odd !== undefined && odd[i] !== 0) continue;
    for (let k = 0; k < columns.length; k++) values[k] = columns[k][i * steps[k]];
    const result = compute(...values);
    if (typeof result === "number") numbers[i] = result;
    else keep(out, i, result);
  }
};
