/**
 * Arrays that a call needs only while it runs. Recalculations come in rounds of the same size, and fresh buffers for
 * each call keep the garbage collector busier than the physics keeps the processor.
 */
const free: Float64Array[] = [];
const most = 12;
const longest = 1 << 18;

/** An array of this length with any content. */
export function take(length: number): Float64Array {
  const at = free.findIndex((array) => array.length === length);
  return at < 0 ? new Float64Array(length) : free.splice(at, 1)[0];
}

/** Gives arrays back that nothing refers to any more. */
export function giveBack(arrays: Iterable<unknown>): void {
  for (const array of arrays) {
    if (!(array instanceof Float64Array) || array.length < 1000 || array.length > longest) continue;
    free.push(array);
    if (free.length > most) free.shift();
  }
}
