/** Work that waits for the next sync, as the host's batches do, and what was done wrong meanwhile. */
export interface Batch {
  waiting: (() => void)[];
  complaints: string[];
}

type Facts = (asked: ReadonlySet<string>) => Record<string, unknown>;

/**
 * An object of the host's interface: its facts can be read only after load() asked for them and sync() fetched them, which
 * is what goes wrong first in a real host. Whether there is such an object at all comes with any sync.
 */
export function hostObject(batch: Batch, facts: Facts, methods: Record<string, unknown> = {}): any {
  const asked = new Set<string>(["isNullObject"]);
  let fetched: Record<string, unknown> | undefined;
  const fetch = () => (fetched = { isNullObject: false, ...facts(asked) });
  batch.waiting.push(fetch);
  const load = (what: string | string[]) => {
    for (const path of String(what).split(",")) asked.add(path.split("/")[0]);
    batch.waiting.push(fetch);
  };
  return new Proxy({ load, ...methods } as Record<string, unknown>, {
    get(own, key) {
      if (typeof key === "symbol" || key === "then" || key in own) return own[key as string];
      if (!fetched || !asked.has(key)) batch.complaints.push(`${key} was read before it was loaded and fetched`);
      return fetched?.[key];
    },
    set(own, key, value) {
      (own[`set ${String(key)}`] as (value: unknown) => void)(value);
      return true;
    },
  });
}
