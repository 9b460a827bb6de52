import { chiSquareBeyond } from "../numerics/chi-square";
import { NormalEquations } from "../numerics/normal-equations";
import { neighbourSquares, type Characteristic } from "./characteristic";

/** Readings are added up in runs of so many; filters that reach further are not foreseen. */
const run = 10;
const fewestRuns = 6;

/** So few runs tell the ratio to a third. */
const caution = 1.5;

/** Scatter that independent readings show by chance this rarely counts. */
const significance = 1e-4;

/**
 * How much more the sums of neighbouring readings scatter than independent readings with the same scatter between
 * neighbours would: 1 for independent ones, and many where the instrument filtered or averaged along the sweep. Told on
 * the ions' side, up to index `to`, where a parabola and the first electrons take out all that is not noise. A scatter
 * below the tolerance, in parts of the current, doesn't matter.
 */
export function likeness(curve: Characteristic, to: number, T: number, tolerance: number): number {
  const runs = Math.floor(to / run);
  if (runs < fewestRuns) return 1;
  const residual = offSmooth(curve, runs * run, T);
  if (!residual) return 1;
  const scatter = neighbourSquares(curve, 0, runs * run, (i) => residual[i]);
  const size = curve.I.subarray(0, runs * run).reduce((sum, each) => sum + (each * each) / (runs * run), 0);
  const single = Math.max(
    scatter.reduce((sum, each) => sum + each / scatter.length, 0),
    tolerance * tolerance * size,
  );
  let squares = 0;
  for (let k = 0; k < runs; k++) {
    const sum = residual.subarray(k * run, (k + 1) * run).reduce((total, each) => total + each, 0);
    squares += (sum * sum) / run;
  }
  const freedom = runs - 4;
  const ratio = squares / freedom / single;
  return chiSquareBeyond(ratio * freedom, freedom) < significance ? caution * ratio : 1;
}

function offSmooth({ V, I, count }: Characteristic, to: number, T: number): Float64Array | undefined {
  const smooth = new NormalEquations(4);
  const row = (i: number) => {
    const x = (2 * (V[i] - V[0])) / (V[to - 1] - V[0]) - 1;
    return [1, x, x * x, Math.exp((V[i] - V[to - 1]) / T)];
  };
  for (let i = 0; i < to; i++) smooth.add(row(i), I[i], count[i]);
  const solved = smooth.solve();
  if (!solved) return undefined;
  const { solution } = solved;
  return Float64Array.from(
    { length: to },
    (_, i) => I[i] - row(i).reduce((sum, each, j) => sum + each * solution[j], 0),
  );
}
