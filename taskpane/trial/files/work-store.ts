import type { GridBook } from "./book-data";

/** One workbook as it was left, kept in the browser. */
export interface Work extends GridBook {
  id: string;
  title: string;
  /** Milliseconds since 1970. */
  changed: number;
  /** Another with every change, so that nobody writes over what they have not seen. */
  version: string;
}

export type WorkTitle = Pick<Work, "id" | "title" | "changed" | "version">;

const works = "works";
const titles = "titles";

/** The browser's own store for the works of the trial sheet; every call may be refused by the browser. */
export class WorkStore {
  private constructor(private readonly database: IDBDatabase) {}

  static open(): Promise<WorkStore> {
    return new Promise((resolve, reject) => {
      const opening = indexedDB.open("wallfall-trial", 1);
      opening.onupgradeneeded = () => {
        opening.result.createObjectStore(works, { keyPath: "id" });
        opening.result.createObjectStore(titles, { keyPath: "id" });
      };
      opening.onsuccess = () => resolve(new WorkStore(opening.result));
      opening.onerror = () => reject(opening.error ?? new Error("the store can't be opened"));
    });
  }

  /** Whether the work was stored; not if what is there is another version than the one expected. */
  async put(work: Work, expected: string | undefined): Promise<boolean> {
    const change = this.database.transaction([works, titles], "readwrite");
    const done = finished(change);
    const known = await answer<WorkTitle | undefined>(change.objectStore(titles).get(work.id));
    if (known?.version !== expected) {
      change.abort();
      await done.catch(() => undefined);
      return false;
    }
    const { id, title, changed, version } = work;
    change.objectStore(works).put(work);
    change.objectStore(titles).put({ id, title, changed, version } satisfies WorkTitle);
    await done;
    return true;
  }

  get(id: string): Promise<Work | undefined> {
    return answer(this.database.transaction(works).objectStore(works).get(id));
  }

  /** The latest first. */
  async list(): Promise<WorkTitle[]> {
    const found = await answer<WorkTitle[]>(this.database.transaction(titles).objectStore(titles).getAll());
    return found.sort((a, b) => b.changed - a.changed);
  }

  async forget(id: string): Promise<void> {
    const change = this.database.transaction([works, titles], "readwrite");
    const done = finished(change);
    change.objectStore(works).delete(id);
    change.objectStore(titles).delete(id);
    await done;
  }
}

function answer<T>(request: IDBRequest): Promise<T> {
  return new Promise((resolve, reject) => {
    request.onsuccess = () => resolve(request.result as T);
    request.onerror = () => reject(request.error ?? new Error("the store gives no answer"));
  });
}

/** A store that is full ends the transaction, not the request. */
function finished(change: IDBTransaction): Promise<void> {
  return new Promise((resolve, reject) => {
    change.oncomplete = () => resolve();
    change.onabort = change.onerror = () => reject(change.error ?? new Error("the store refused"));
  });
}
