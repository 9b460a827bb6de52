import { pack, type Packed } from "./area";
import type { Fill } from "./fill";
import type { Origin, Traces } from "./judge";
import type { Facts, Tally } from "./tally";

/** Notes an error that a cell shows: its own with its message, or one that came from another cell. */
export function noteError(cell: Packed, error: unknown, fill: Fill, tally: Tally, traces: Traces): void {
  const { sheet } = fill;
  const { code, message } = error as { code: string; message?: string };
  const from = traces.origin(error);
  if (from) return noteOrigin(cell, from, fill, tally);
  const kind = kindOf(message ?? "");
  const what = message ? `${code} ${message}` : code;
  // What one column of inputs causes is one finding, whatever formulas read it.
  const place = traces.input(error);
  const key = place ? `${place.sheet}|${place.column}` : String(fill.id);
  const facts = (): Facts => ({ cause: "error", sheet, what, subject: `${code}|${kind}`, fromSheet: place?.sheet });
  const draft = tally
    .draft(`error|${sheet}|${key}|${code}|${kind}`, facts)
    .in(fill, fill.calls, () => fill.cells.length);
  if (place) draft.from(pack(place.row, place.column));
  draft.add(cell);
}

/** Errors that come from one column are one finding, whatever cells show them. */
function noteOrigin(cell: Packed, from: Origin, fill: Fill, tally: Tally): void {
  const { sheet } = fill;
  const subject = `${from.sheet}|${from.column}|${from.code}`;
  const what = `${from.code} of another cell is passed on; mend that cell first`;
  tally
    .draft(`passed|${sheet}|${subject}`, () => ({ cause: "passed", sheet, what, subject, fromSheet: from.sheet }))
    .in(fill, fill.calls, () => fill.cells.length)
    .from(pack(from.row, from.column))
    .add(cell);
}

/** Messages that differ only in what was typed are of one kind. */
function kindOf(message: string): string {
  const bare = message.replace(/^\w+(?=:| is blank)/, "");
  return bare.replace(/"[^"]*"/g, '""').replace(/[+-−]?\d[\d.,]*(e[+-]?\d+)?/gi, "0");
}
