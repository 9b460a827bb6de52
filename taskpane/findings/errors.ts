import { a1 } from "../workbook/address";
import type { Packed } from "./area";
import type { Fill } from "./fill";
import type { Traces } from "./judge";
import type { Tally } from "./tally";

/** Notes an error that a cell shows: its own with its message, or one that came from another cell. */
export function noteError(cell: Packed, error: unknown, fill: Fill, tally: Tally, traces: Traces): void {
  const { sheet } = fill;
  const { code, message } = error as { code: string; message?: string };
  const from = traces.origin(error);
  if (from) {
    const origin = from.sheet === sheet ? a1(from) : `${from.sheet}!${a1(from)}`;
    tally
      .draft(`passed|${sheet}|${origin}`, () => ({
        cause: "passed",
        sheet,
        what: `the error of ${origin} is passed along`,
        subject: "",
      }))
      .in(fill, fill.calls, () => fill.cells.length)
      .add(cell, () => `mend ${origin} first, which shows ${from.code}`);
    return;
  }
  const kind = kindOf(message ?? "");
  const what = message ? `${code} ${message}` : code;
  tally
    .draft(`error|${sheet}|${code}|${kind}`, () => ({ cause: "error", sheet, what, subject: code + kind }))
    .in(fill, fill.calls, () => fill.cells.length)
    .add(cell);
}

/** Messages that differ only in what was typed are of one kind. */
function kindOf(message: string): string {
  return message.replace(/"[^"]*"/g, '""').replace(/[+-−]?\d[\d.,]*(e[+-]?\d+)?/gi, "0");
}
