/** Variance of a reading as its size has it: that of a constant noise, and that of one in proportion to the signal. */
export interface Noise {
  constant: number;
  relative: number;
}

export function variance({ constant, relative }: Noise, signal: number): number {
  return constant + relative * signal * signal;
}

/**
 * The two variances from squared residuals, each an unbiased but wild estimate of the variance at its own signal. Maximum
 * likelihood for two normal components in every residual, by expectation and maximisation, which keeps both above zero
 * (Dempster, Laird & Rubin, J. R. Stat. Soc. B 39 (1977) 1).
 */
export function estimateNoise(signal: ArrayLike<number>, squares: ArrayLike<number>): Noise {
  let noise = firstGuess(signal, squares);
  for (let round = 0; round < 300; round++) {
    const next = improved(noise, signal, squares);
    const settled = isClose(next.constant, noise.constant) && isClose(next.relative, noise.relative);
    noise = next;
    if (settled) break;
  }
  return noise;
}

/** The mean share of each component in the squares, given the components so far. */
function improved({ constant, relative }: Noise, signal: ArrayLike<number>, squares: ArrayLike<number>): Noise {
  const n = signal.length;
  const next = { constant: 0, relative: 0 };
  for (let i = 0; i < n; i++) {
    const size = signal[i] * signal[i];
    const v = constant + relative * size;
    if (!(v > 0)) continue;
    const both = (constant * relative) / v;
    next.constant += ((constant / v) ** 2 * squares[i] + both * size) / n;
    next.relative += ((relative / v) ** 2 * size * squares[i] + both) / n;
  }
  return next;
}

/** The constant from the fifth of the points with the least signal, the relative one from the fifth with the most. */
function firstGuess(signal: ArrayLike<number>, squares: ArrayLike<number>): Noise {
  const order = Array.from(signal, (_, i) => i).sort((i, j) => Math.abs(signal[i]) - Math.abs(signal[j]));
  const fifth = Math.max(1, Math.ceil(order.length / 5));
  const mean = (some: number[], of: (i: number) => number) => some.reduce((sum, i) => sum + of(i), 0) / some.length;
  return {
    constant: mean(order.slice(0, fifth), (i) => squares[i]),
    relative: mean(order.slice(-fifth), (i) => (signal[i] === 0 ? 0 : squares[i] / (signal[i] * signal[i]))),
  };
}

function isClose(a: number, b: number): boolean {
  return Math.abs(a - b) <= 1e-3 * b;
}
