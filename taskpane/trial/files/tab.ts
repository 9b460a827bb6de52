/** Which work this tab of the browser has: remembered over a reload, and never that of two tabs at once. */
const key = "wallfall.trial.work";

export function rememberedWork(): string | undefined {
  try {
    return sessionStorage.getItem(key) ?? undefined;
  } catch {
    return undefined;
  }
}

export function rememberWork(id: string | undefined): void {
  try {
    if (id === undefined) sessionStorage.removeItem(key);
    else sessionStorage.setItem(key, id);
  } catch {
    // Forbidden by the browser: the next load begins as a new tab does.
  }
}

const lockName = (id: string) => `wallfall-work-${id}`;

/** Whether other tabs can be told from here; not on plain http away from this machine. */
export const knowsOtherTabs = "locks" in navigator;

/**
 * Takes a work for this tab until the release is called, or the tab closed; undefined where another tab has it. After a
 * reload the page before may take a moment to let go.
 */
export async function claim(id: string, patience = 0): Promise<(() => void) | undefined> {
  if (!knowsOtherTabs) return () => undefined;
  const until = performance.now() + patience;
  for (;;) {
    const release = await claimNow(id);
    if (release || performance.now() > until) return release;
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
}

function claimNow(id: string): Promise<(() => void) | undefined> {
  return new Promise((resolve, reject) => {
    navigator.locks
      .request(lockName(id), { ifAvailable: true }, (lock) => {
        if (!lock) return resolve(undefined);
        return new Promise<void>((release) => resolve(() => release()));
      })
      .catch(reject);
  });
}

/** The ids of works that some tab has. */
export async function claimed(): Promise<Set<string>> {
  if (!knowsOtherTabs) return new Set();
  const { held = [] } = await navigator.locks.query();
  return new Set(held.flatMap(({ name }) => (name?.startsWith(lockName("")) ? [name.slice(lockName("").length)] : [])));
}
