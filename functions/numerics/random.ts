/**
 * A source of 32 random bits at a time: xoshiro128** 1.1 (Blackman & Vigna, ACM Trans. Math. Softw. 47 (2021) 36), which
 * passes the usual test batteries and needs 32-bit arithmetic only. The same seed gives the same numbers everywhere.
 */
export function xoshiro128(seed: readonly [number, number, number, number]): () => number {
  let [a, b, c, d] = seed;
  return () => {
    const result = Math.imul(rotateLeft(Math.imul(b, 5), 7), 9) >>> 0;
    const shifted = b << 9;
    c ^= a;
    d ^= b;
    b ^= c;
    a ^= d;
    c ^= shifted;
    d = rotateLeft(d, 11);
    return result;
  };
}

function rotateLeft(bits: number, by: number): number {
  return (bits << by) | (bits >>> (32 - by));
}

/** A number of 53 random bits between −1 and 1. */
function symmetric(bits: () => number): number {
  const high = bits() >>> 5;
  const low = bits() >>> 6;
  return (high * 2 ** 26 + low) * 2 ** -52 - 1;
}

/**
 * Standard normal numbers from random bits by the polar method (Marsaglia & Bray, SIAM Rev. 6 (1964) 260): they come in
 * pairs, and the second waits for the next call.
 */
export function normalNumbers(bits: () => number): () => number {
  let waiting: number | undefined;
  return () => {
    if (waiting !== undefined) {
      const number = waiting;
      waiting = undefined;
      return number;
    }
    for (;;) {
      const x = symmetric(bits);
      const y = symmetric(bits);
      const square = x * x + y * y;
      if (square >= 1 || square === 0) continue;
      const factor = Math.sqrt((-2 * Math.log(square)) / square);
      waiting = y * factor;
      return x * factor;
    }
  };
}
