/** What it costs to come through cells: range calls against hand-written loops, text with units against numbers. */
import { gzipSync } from "node:zlib";
import { readFileSync } from "node:fs";
import { builtFunctions, distFile } from "./build";
import { handLoops } from "./hand-loops";
import { atMost, ratioOf, sweep, type Row } from "./measure";

export function cells(): Row[] {
  const doors = builtFunctions();
  const rows = 100_000;
  const n = sweep(1e14, 1e19, rows);
  const T = sweep(1, 20, rows);
  const text = n.map(([value]) => [`${(value / 1e6).toPrecision(6)} cm^-3`]);
  const against = (what: string, call: () => unknown, hand: () => unknown, most: number): Row =>
    atMost(most, { what, value: ratioOf(call, hand, most), unit: "× hand loop" });
  const byHand = () => handLoops.DEBYELENGTH(n, T);
  const size = gzipSync(readFileSync(distFile("functions.js")), { level: 9 }).length / 1024;
  return [
    against("DEBYELENGTH, 100,000 rows in one call", () => doors.DEBYELENGTH(n, T), byHand, 1.5),
    against("DEBYELENGTH, 100,000 rows of text with units", () => doors.DEBYELENGTH(text, T), byHand, 10),
    atMost(60, { what: "functions.js, gzipped", value: size, unit: "KiB" }),
  ];
}
