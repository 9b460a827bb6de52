import { a1 } from "../workbook/address";
import { rangesText, rectanglesOf, unpack, type Packed } from "./area";
import { causes, type Cause } from "./causes";
import type { Fill } from "./fill";
import type { Finding } from "./finding";
import { fingerprint } from "./fingerprint";

export interface Facts {
  cause: Cause;
  sheet: string;
  what: string;
  /** What tells it from others of its cause in the same column; `what` itself where that never changes. */
  subject?: string;
  /** Where the cells that are to blame stand. */
  fromSheet?: string;
}

/** What is being found of one kind in one place; cells are added as they are met. */
export class Draft {
  readonly cells: Packed[] = [];
  private readonly origins: Packed[] = [];
  private readonly met = new Set<Packed>();
  private readonly functions = new Set<string>();
  private readonly looked = new Map<number, () => number>();
  private worst?: { cell: Packed; badness: number; detail?: () => string };

  constructor(readonly facts: Facts) {}

  /** Names functions concerned, and how many cells or rows of a fill were looked at for this; asked at the end. */
  in(fill: Pick<Fill, "id">, functions: Iterable<string>, of: () => number): this {
    this.looked.set(fill.id, of);
    return this.by(functions);
  }

  by(functions: Iterable<string>): this {
    for (const name of functions) this.functions.add(name);
    return this;
  }

  /** Names a cell that is to blame, on the sheet that the facts name for that. */
  from(cell: Packed): this {
    this.origins.push(cell);
    return this;
  }

  /** Adds a cell, each one once; the detail kept is that of the worst, of the first among equals. */
  add(cell: Packed, detail?: () => string, badness = 0): void {
    if (this.met.has(cell)) return;
    this.met.add(cell);
    this.cells.push(cell);
    if (this.worst && badness <= this.worst.badness) return;
    this.worst = { cell, badness, detail };
  }

  has(cell: Packed): boolean {
    return this.met.has(cell);
  }

  finding(key: string): Finding {
    const { cause, sheet, what } = this.facts;
    const { cell } = this.worst!;
    const detail = this.worst!.detail?.();
    const cells = rangesText(rectanglesOf(sheet, this.cells), Infinity);
    const from = this.blamed;
    return {
      key,
      cause,
      sheet,
      cells,
      first: a1(unpack(cell)),
      count: this.cells.length,
      of: this.outOf,
      functions: [...this.functions],
      what,
      ...(detail === undefined ? {} : { detail }),
      ...(from === undefined ? {} : { from }),
      print: fingerprint([cells, what, detail ?? "", from?.cells ?? ""]),
    };
  }

  private get blamed(): Finding["from"] {
    if (this.origins.length === 0) return undefined;
    const sheet = this.facts.fromSheet ?? this.facts.sheet;
    return { sheet, cells: rangesText(rectanglesOf(sheet, this.origins), Infinity) };
  }

  /** Cells of several fills have no number in common to be counted against. */
  private get outOf(): number {
    const [first] = this.looked.values();
    return this.looked.size === 1 ? Math.max(first(), this.cells.length) : this.cells.length;
  }

  /** What stays the same when rows are added or numbers change. */
  get identity(): string {
    const { cause, sheet, what, subject = what } = this.facts;
    return [cause, sheet, unpack(this.cells[0]).column, subject].join("|");
  }
}

/** All findings of one look. */
export class Tally {
  private readonly drafts = new Map<string, Draft>();

  draft(key: string, facts: () => Facts): Draft {
    let draft = this.drafts.get(key);
    if (!draft) this.drafts.set(key, (draft = new Draft(facts())));
    return draft;
  }

  /** Whether a cell was already found for this cause. */
  has(cause: Cause, sheet: string, cell: Packed): boolean {
    for (const draft of this.drafts.values())
      if (draft.facts.cause === cause && draft.facts.sheet === sheet && draft.has(cell)) return true;
    return false;
  }

  findings(sheets: readonly string[]): Finding[] {
    const order = Object.keys(causes);
    const rank = ({ facts: { cause, sheet } }: Draft) =>
      order.indexOf(cause) * (sheets.length + 1) + sheets.indexOf(sheet);
    const drafts = [...this.drafts.values()].filter(({ cells }) => cells.length > 0);
    const taken = new Map<string, number>();
    return drafts
      .sort((a, b) => rank(a) - rank(b))
      .map((draft) => {
        const nth = (taken.get(draft.identity) ?? 0) + 1;
        taken.set(draft.identity, nth);
        return draft.finding(fingerprint([draft.identity, String(nth)]));
      });
  }
}
