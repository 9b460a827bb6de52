import type { Finding } from "./finding";
import type { Look } from "./look";

/** "12 of 80" where that says more than the cells do. */
export function countText({ count, of }: Finding): string {
  if (of > count) return `${count} of ${of}`;
  return count > 1 ? `all ${count}` : "";
}

/** What is the matter, how far, and which cells are to blame, in one line. */
export function findingText(finding: Finding): string {
  const { what, detail, from } = finding;
  const more = [detail, from && fromText(finding)].filter(Boolean).join("; ");
  if (more === "") return what;
  return what.endsWith("?") ? `${what} ${more}` : `${what.replace(/\.$/, "")}: ${more}`;
}

/** "from D18", or "from Inputs!B2" where that is another sheet. */
export function fromText({ sheet, from }: Finding): string {
  if (!from) return "";
  return `from ${from.sheet === sheet ? "" : `${from.sheet}!`}${placeText(from)}`;
}

/** Cells of several ranges can be many: the first few, and how many more. */
export function placeText({ cells }: Pick<Finding, "cells">, most = 4): string {
  const ranges = cells.split(", ");
  return ranges.length > most ? `${ranges.slice(0, most).join(", ")} and ${ranges.length - most} more` : cells;
}

/** What was looked at. */
export function lookText({ formulas, distinct, calls, uses }: Look): string {
  if (calls === 0) return "No cell calls a function of this add-in.";
  const sheets = new Set(uses.flatMap(({ where }) => where.map(({ sheet }) => sheet))).size;
  const parts = [counted(calls, "call"), counted(formulas, "formula"), counted(sheets, "sheet")];
  const different = distinct < formulas ? ` (${distinct} different)` : "";
  return `${parts[0]} of ${counted(uses.length, "function")} in ${parts[1]}${different} on ${parts[2]}.`;
}

export function counted(count: number, noun: string): string {
  return `${count.toLocaleString("en-US")} ${noun}${count === 1 ? "" : "s"}`;
}
