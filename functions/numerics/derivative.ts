/** A slope and how far it may be off. */
export interface Slope {
  value: number;
  error: number;
}

/** Where a function of one variable may be asked, and over what distance it is likely to change. */
export interface Reach {
  least: number;
  most: number;
  scale: number;
}

/**
 * The slope of f at x by differences over shrinking steps, extrapolated to step zero (Ridders, Adv. Eng. Software 4 (1982)
 * 75). Differences are central where there is room on both sides, else to the side that f has values on. At a kink the
 * error is half the difference of the two slopes. f gives NaN where it has no value; undefined where no slope is found.
 */
export function slope(f: (x: number) => number, x: number, reach: Reach): Slope | undefined {
  const middle = f(x);
  if (!Number.isFinite(middle)) return undefined;
  const wide = 0.1 * Math.max(Math.abs(x), reach.scale);
  const right = usableStep(f, x, Math.min(wide, (reach.most - x) / 2), 1);
  const left = usableStep(f, x, Math.min(wide, (x - reach.least) / 2), -1);
  if (right > 0 && left > 0) {
    const central = extrapolate((h) => (f(x + h) - f(x - h)) / (2 * h), Math.min(left, right), 2);
    return central && withKink(central, f, x, middle, Math.min(left, right));
  }
  const step = right > 0 ? right : -left;
  return step === 0 ? undefined : extrapolate((h) => (f(x + h) - middle) / h, step, 1);
}

/** The step to one side, halved until f has a value there; 0 where it never has. */
function usableStep(f: (x: number) => number, x: number, step: number, side: 1 | -1): number {
  const least = 1e-6 * step;
  for (let h = step; h > 0 && h >= least; h /= 2) {
    if (!Number.isFinite(f(x + side * h))) continue;
    return Math.abs(x + side * h - x);
  }
  return 0;
}

const levels = 9;

/** Neville's tableau over steps h, h/2, h/4, …; `order` is the power of h that the error begins with and goes up by. */
function extrapolate(difference: (h: number) => number, step: number, order: 1 | 2): Slope | undefined {
  let row: number[] = [];
  let best: Slope | undefined;
  for (let i = 0; i < levels; i++) {
    const next = [difference(step / 2 ** i)];
    if (!Number.isFinite(next[0])) break;
    for (let j = 1; j <= i; j++) {
      const factor = 2 ** (order * j);
      next[j] = (factor * next[j - 1] - row[j - 1]) / (factor - 1);
      const error = Math.max(Math.abs(next[j] - next[j - 1]), Math.abs(next[j] - row[j - 1]));
      if (!best || error <= best.error) best = { value: next[j], error };
    }
    row = next;
  }
  return best;
}

/** Two slopes that differ nearly as much over a short step as over one eight times as long belong to a kink. */
function withKink(found: Slope, f: (x: number) => number, x: number, middle: number, step: number): Slope {
  const gap = (h: number) => Math.abs(f(x + h) - 2 * middle + f(x - h)) / h;
  const near = gap(step / 512);
  const size = Math.abs(found.value) + near;
  const isKink = near > 1e-3 * size && near > 0.5 * gap(step / 64);
  return isKink ? { value: found.value, error: Math.max(found.error, near / 2) } : found;
}
