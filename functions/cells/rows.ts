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
 * Calls `compute` once per row over columns that hold one value per row, or one value for all. Rows marked odd are
 * skipped; a row that throws gets a Fault of its own.
 */
export function applyRows(compute: Compute, columns: readonly Values[], size: number, odd?: Uint8Array): Computed {
  const numbers = take(size);
  let others: Computed["others"];
  const at = caller(compute, columns);
  let row = 0;
  while (row < size) {
    try {
      for (; row < size; row++) {
        if (odd !== undefined && odd[row] !== 0) continue;
        const result = at(row);
        if (typeof result === "number") numbers[row] = result;
        else (others ??= new Map()).set(row, result);
      }
    } catch (error) {
      (others ??= new Map()).set(row++, unexpected(error));
    }
  }
  return { numbers, others };
}

/** A bug stays in its own cell, and says so. */
export function unexpected(error: unknown): Fault {
  const what = error instanceof Error ? error.message : String(error);
  return new Fault("#N/A", `No result (${what}); please report this call.`);
}

/**
 * The call for one row. Arguments go by position, without an array in between: over long columns that spread costs more
 * than the physics. A column of one value has step 0 and stays where it is.
 */
function caller(compute: Compute, columns: readonly Values[]): (row: number) => unknown {
  const [a, b, c, d, e, f, g, h, k] = columns;
  const steps = columns.map((values) => (values.length === 1 ? 0 : 1));
  const [p, q, r, s, t, u, v, w, x] = steps;
  switch (columns.length) {
    case 1:
      return (i) => compute(a[i * p]);
    case 2:
      return (i) => compute(a[i * p], b[i * q]);
    case 3:
      return (i) => compute(a[i * p], b[i * q], c[i * r]);
    case 4:
      return (i) => compute(a[i * p], b[i * q], c[i * r], d[i * s]);
    case 5:
      return (i) => compute(a[i * p], b[i * q], c[i * r], d[i * s], e[i * t]);
    case 6:
      return (i) => compute(a[i * p], b[i * q], c[i * r], d[i * s], e[i * t], f[i * u]);
    case 7:
      return (i) => compute(a[i * p], b[i * q], c[i * r], d[i * s], e[i * t], f[i * u], g[i * v]);
    case 8:
      return (i) => compute(a[i * p], b[i * q], c[i * r], d[i * s], e[i * t], f[i * u], g[i * v], h[i * w]);
    case 9:
      return (i) => compute(a[i * p], b[i * q], c[i * r], d[i * s], e[i * t], f[i * u], g[i * v], h[i * w], k[i * x]);
    default:
      return (i) => compute(...columns.map((values, k) => values[i * steps[k]]));
  }
}
