import type { Input } from "../../functions/cells/inputs";
import type { Word } from "../../functions/cells/verdict";
import { Areas, pack, rangesText, rectanglesOf, type Area, type Packed } from "./area";

/** What the calls of a fill read at one place of their arguments. */
export interface ReadInput {
  name: string;
  /** Undefined for [unit] and where an input repeats. */
  input: Input | undefined;
  call: number;
  areas: Areas;
}

/** The cells of one sheet that hold the same relative formula, and all that they fill. */
export class Fill {
  /** Cells that show a result: those with the formula and those it spills into. */
  readonly cells: Packed[] = [];
  /** By call in the formula: how many rows of inputs it had. */
  readonly rows: number[] = [];
  /** By call and argument: what was read there. */
  readonly inputs = new Map<string, ReadInput>();
  /** The cells that hold the formula themselves. */
  readonly anchors: Packed[] = [];
  /** Rows of inputs by what their limits say at worst. */
  readonly verdicts: Record<Word, number> = { holds: 0, marginal: 0, fails: 0, "not tested": 0 };
  constructor(
    readonly id: number,
    readonly sheet: string,
    readonly form: string,
    /** The formula as it stands in the first cell. */
    readonly text: string,
    readonly calls: readonly string[],
  ) {}

  add(area: Area): void {
    this.anchors.push(pack(area.row, area.column));
    for (let i = 0; i < area.rows; i++)
      for (let j = 0; j < area.columns; j++) this.cells.push(pack(area.row + i, area.column + j));
  }

  read(call: number, place: number, name: string, input: Input | undefined, area: Area): void {
    const key = `${call}:${place}`;
    let read = this.inputs.get(key);
    if (!read) this.inputs.set(key, (read = { name, input, call, areas: new Areas() }));
    read.areas.add(area);
  }

  get formulas(): number {
    return this.anchors.length;
  }

  get areas(): Area[] {
    return rectanglesOf(this.sheet, this.cells);
  }

  /** The cells as ranges, the first few. */
  get range(): string {
    return rangesText(this.areas);
  }
}
