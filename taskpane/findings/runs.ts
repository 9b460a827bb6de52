import type { CellContent } from "../workbook/workbook";

/** What stands in one cell of a column or row: the relative form of a formula, a typed value, or nothing of interest. */
export type Item = { form: string } | { typed: CellContent } | undefined;

/** A cell among others that all hold one relative formula. */
export interface Break {
  at: number;
  /** The formula of its neighbours on both sides. */
  form: string;
  kind: "typed" | "formula";
}

/** So many cells in a row may differ from those around them and still be taken for slips. */
const longestBreak = 3;

/**
 * Cells inside a run of matching formulas that hold something else. Something that comes again and again, such as a
 * subtotal after every fifth row, is meant to be there.
 */
export function breaksIn(items: readonly Item[]): Break[] {
  const found: Break[] = [];
  const runs = runsIn(items);
  for (let i = 0; i + 1 < runs.length; i++) {
    const above = runs[i];
    const below = runs.slice(i + 1, i + 1 + longestBreak).find((run) => run.form === above.form);
    if (!below) continue;
    const between = below.from - above.to;
    if (between > longestBreak) continue;
    for (let at = above.to; at < below.from; at++) {
      const item = items[at];
      if (!item) continue;
      const kind = "form" in item ? "formula" : "typed";
      const matching = above.to - above.from + below.to - below.from;
      if (matching >= (kind === "typed" ? 3 : 4)) found.push({ at, form: above.form, kind });
    }
  }
  return found.filter((each) => !isPattern(each, found, items));
}

interface Run {
  form: string;
  from: number;
  /** One past its last. */
  to: number;
}

function runsIn(items: readonly Item[]): Run[] {
  const runs: Run[] = [];
  items.forEach((item, at) => {
    if (!item || !("form" in item)) return;
    const last = runs.at(-1);
    if (last && last.to === at && last.form === item.form) last.to++;
    else runs.push({ form: item.form, from: at, to: at + 1 });
  });
  return runs;
}

function isPattern({ form, kind, at }: Break, all: readonly Break[], items: readonly Item[]): boolean {
  const own = items[at]!;
  const alike = all.filter((each) => {
    const item = items[each.at]!;
    return each.form === form && each.kind === kind && (!("form" in own) || ("form" in item && item.form === own.form));
  });
  if (kind === "formula") return alike.length >= 3;
  const matching = items.filter((item) => item && "form" in item && item.form === form).length;
  return alike.length >= 3 && alike.length * 3 > matching;
}
