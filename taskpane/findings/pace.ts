/** Stops a long look when asked to: the reader's own wish, no failure. */
export class Cancelled extends Error {
  constructor() {
    super("stopped before the end");
  }
}

/** So long a page may be busy before it answers the reader again, in ms. */
const turn = 12;

/**
 * Called between small pieces of work: lets the page breathe from time to time, tells how far the work is, and throws
 * Cancelled when the signal says so.
 */
export function pacer(progress: (done: number) => void = () => undefined, signal?: AbortSignal) {
  let since = performance.now();
  return async (done: number): Promise<void> => {
    if (signal?.aborted) throw new Cancelled();
    if (performance.now() - since < turn) return;
    progress(done);
    await new Promise((resolve) => setTimeout(resolve));
    if (signal?.aborted) throw new Cancelled();
    since = performance.now();
  };
}
