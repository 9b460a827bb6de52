import { CommandType } from "@univerjs/core";
import type { Grid } from "../grid/grid";
import { newBookId } from "./book-data";
import { claim, claimed, knowsOtherTabs, rememberedWork, rememberWork } from "./tab";
import { WorkStore, type Work, type WorkTitle } from "./work-store";

/** What is known of the safety of the work in this tab. */
export type Keeping =
  | { is: "untouched" }
  | { is: "pending" }
  | { is: "kept"; at: number }
  /** The work went on under a name of its own, because another tab had stored its own under the old one. */
  | { is: "parted" }
  | { is: "refused"; why: string };

/** A pause in typing; a book that takes long to copy is copied less often. */
const shortPause = 50;

/**
 * Keeps the work of this tab in the browser's store, change by change. Every book opened is a work of its own, so what
 * was there before is never written over.
 */
export class Keeper {
  private grid: Grid | undefined;
  private id = newBookId();
  title = "Opening example";
  private version: string | undefined;
  private release: (() => void) | undefined;
  private timer: ReturnType<typeof setTimeout> | undefined;
  private storing: Promise<void> = Promise.resolve();
  private changes = 0;
  private stored = 0;
  private pause = shortPause;
  private listeners: ((keeping: Keeping) => void)[] = [];
  keeping: Keeping = { is: "untouched" };

  private constructor(
    private readonly store: WorkStore | undefined,
    private readonly refusal: string,
  ) {}

  static async start(): Promise<Keeper> {
    try {
      return new Keeper(await WorkStore.open(), "");
    } catch (error) {
      return new Keeper(undefined, whyRefused(error));
    }
  }

  /** The work this tab had before a reload, or one that no tab has any more; undefined where there is none. */
  async resume(): Promise<{ work: Work; how: "reload" | "left" | "copy" } | undefined> {
    const found = await this.find();
    if (!found) await this.begin("Opening example", false);
    return found;
  }

  private async find(): Promise<{ work: Work; how: "reload" | "left" | "copy" } | undefined> {
    if (!this.store) return undefined;
    try {
      const own = rememberedWork();
      const known = own === undefined ? undefined : await this.take(own, 1500);
      if (known) return { work: known, how: "reload" };
      const copied = own === undefined ? undefined : await this.store.get(own);
      if (copied) {
        // Another tab has this work: the browser copied the tab, memory and all.
        await this.begin(copied.title, true);
        return { work: copied, how: "copy" };
      }
      if (own !== undefined || !knowsOtherTabs) return undefined;
      for (const { id } of await this.store.list()) {
        const left = await this.take(id);
        if (left) return { work: left, how: "left" };
      }
    } catch (error) {
      this.tell({ is: "refused", why: whyRefused(error) });
    }
    return undefined;
  }

  /** Works kept besides this one, the latest first. */
  async earlier(): Promise<(WorkTitle & { isOpen: boolean })[]> {
    if (!this.store) return [];
    const [listed, open] = await Promise.all([this.store.list(), claimed()]);
    return listed.filter(({ id }) => id !== this.id).map((each) => ({ ...each, isOpen: open.has(each.id) }));
  }

  /** A kept work, from now on that of this tab; undefined where another tab has it. */
  async take(id: string, patience = 0): Promise<Work | undefined> {
    const release = await claim(id, patience);
    if (!release) return undefined;
    const work = await this.store?.get(id);
    if (!work) {
      release();
      return undefined;
    }
    this.adopt(work, release);
    return work;
  }

  async forget(id: string): Promise<void> {
    await this.store?.forget(id);
  }

  /** A book newly opened is a new work. It is stored at once if it came from outside, else with its first change. */
  async begin(title: string, isOutside: boolean): Promise<void> {
    const id = newBookId();
    this.adopt({ id, title, version: undefined, changed: 0 }, await claim(id));
    if (this.keeping.is !== "refused") this.tell({ is: "untouched" });
    if (isOutside) this.note();
  }

  /** Watches the grid for changes of the workbook; what formulas come to is none. */
  watch(grid: Grid): void {
    this.grid = grid;
    if (this.changes !== this.stored) this.note();
    grid.api.onCommandExecuted(({ id, type }, options) => {
      if (type !== CommandType.MUTATION || !/^sheet\.mutation\./.test(id)) return;
      if (options?.fromFormula || options?.applyFormulaCalculationResult || unimportant.test(id)) return;
      this.note();
    });
    addEventListener("pagehide", () => void this.flush());
    addEventListener("visibilitychange", () => document.hidden && void this.flush());
    addEventListener("beforeunload", (event) => {
      if (!this.isAtRisk) return;
      void this.flush();
      event.preventDefault();
    });
  }

  onKeeping(listener: (keeping: Keeping) => void): void {
    this.listeners.push(listener);
    listener(this.keeping);
  }

  /** Stores what is not stored yet. */
  async flush(): Promise<void> {
    clearTimeout(this.timer);
    this.timer = undefined;
    if (this.changes === this.stored) return this.storing;
    this.storing = this.storing.then(() => this.putNow());
    return this.storing;
  }

  /** Whether something would be lost with this page. */
  get isAtRisk(): boolean {
    return this.changes !== this.stored;
  }

  private note(): void {
    this.changes++;
    if (this.keeping.is !== "refused") this.tell({ is: "pending" });
    this.timer ??= setTimeout(() => void this.flush(), this.pause);
  }

  private async putNow(): Promise<void> {
    if (!this.grid) return;
    if (!this.store) return this.tell({ is: "refused", why: this.refusal });
    const upTo = this.changes;
    const started = performance.now();
    const data = this.grid.workbook.save();
    this.pause = Math.max(shortPause, 4 * (performance.now() - started));
    const work: Work = {
      id: this.id,
      title: this.title,
      changed: Date.now(),
      version: newBookId(),
      data,
      tables: [...this.grid.tables.all()],
    };
    try {
      const isStored = await this.store.put(work, this.version);
      if (!isStored) return await this.part(work, upTo);
      this.done(work, upTo, { is: "kept", at: work.changed });
    } catch (error) {
      this.tell({ is: "refused", why: whyRefused(error) });
    }
  }

  /** Somebody else stored another version: both are kept. */
  private async part(work: Work, upTo: number): Promise<void> {
    const own = { ...work, id: newBookId() };
    this.release?.();
    this.id = own.id;
    this.release = await claim(own.id);
    await this.store!.put(own, undefined);
    this.done(own, upTo, { is: "parted" });
  }

  private done({ id, version }: Work, upTo: number, keeping: Keeping): void {
    if (id !== this.id) return;
    this.version = version;
    this.stored = upTo;
    rememberWork(id);
    this.tell(this.changes === upTo ? keeping : { is: "pending" });
  }

  private adopt(
    { id, title, version, changed }: Pick<Work, "id" | "title" | "changed"> & { version: string | undefined },
    release: (() => void) | undefined,
  ): void {
    this.release?.();
    this.release = release;
    this.id = id;
    this.title = title;
    this.version = version;
    this.stored = this.changes;
    clearTimeout(this.timer);
    this.timer = undefined;
    rememberWork(id);
    this.tell({ is: "kept", at: changed });
  }

  private tell(keeping: Keeping): void {
    this.keeping = keeping;
    this.listeners.forEach((listener) => listener(keeping));
  }
}

/** What the grid works out for itself while it draws. */
const unimportant = /auto-height|selection|scroll|zoom|active/;

function whyRefused(error: unknown): string {
  const name = error instanceof Error ? error.name : "";
  if (name === "QuotaExceededError") return "the browser has no room left for it";
  return "the browser does not let this page store anything";
}
