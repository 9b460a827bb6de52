import { pack, rangesText, rectanglesOf, type Packed } from "./area";
import type { Fill } from "./fill";
import type { Origin, Traces } from "./judge";
import type { Draft, Tally } from "./tally";

/** Notes an error that a cell shows: its own with its message, or one that came from another cell. */
export function noteError(cell: Packed, error: unknown, fill: Fill, tally: Tally, traces: Traces): void {
  const { sheet } = fill;
  const { code, message } = error as { code: string; message?: string };
  const from = traces.origin(error);
  if (from) return noteOrigin(cell, from, fill, tally);
  const kind = kindOf(message ?? "");
  const what = message ? `${code} ${message}` : code;
  tally
    .draft(`error|${sheet}|${code}|${kind}`, () => ({ cause: "error", sheet, what, subject: code + kind }))
    .in(fill, fill.calls, () => fill.cells.length)
    .add(cell);
}

/** Errors that come from one column are one finding, whatever cells show them. */
function noteOrigin(cell: Packed, from: Origin, fill: Fill, tally: Tally): void {
  const { sheet } = fill;
  const key = `passed|${sheet}|${from.sheet}|${from.column}|${from.code}`;
  const place = ({ origins }: Draft) =>
    (from.sheet === sheet ? "" : `${from.sheet}!`) + rangesText(rectanglesOf(from.sheet, origins), 4);
  const what = (draft: Draft) => `${from.code} comes from ${place(draft)}; mend that first`;
  tally
    .draft(key, () => ({ cause: "passed", sheet, what, subject: `${from.sheet}|${from.column}|${from.code}` }))
    .in(fill, fill.calls, () => fill.cells.length)
    .from(pack(from.row, from.column))
    .add(cell);
}

/** Messages that differ only in what was typed are of one kind. */
function kindOf(message: string): string {
  return message.replace(/"[^"]*"/g, '""').replace(/[+-−]?\d[\d.,]*(e[+-]?\d+)?/gi, "0");
}
