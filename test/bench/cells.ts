/** What it costs to come through cells: range calls against hand-written loops, text with units against numbers. */
import { gzipSync } from "node:zlib";
import { readFileSync } from "node:fs";
import { builtFunctions, distFile } from "./build";
import { handLoops } from "./hand-loops";
import { measureTogether, sweep, type Row } from "./measure";

export function cells(): Row[] {
  const doors = builtFunctions();
  const rows = 100_000;
  const n = sweep(1e14, 1e19, rows);
  const T = sweep(1, 20, rows);
  const text = n.map(([value]) => [`${(value / 1e6).toPrecision(6)} cm^-3`]);
  const [debyeHand, debye, debyeText, fluxHand, flux] = measureTogether([
    () => handLoops.DEBYELENGTH(n, T),
    () => doors.DEBYELENGTH(n, T),
    () => doors.DEBYELENGTH(text, T),
    () => handLoops.WALLFLUX(n, T),
    () => doors.WALLFLUX(n, T, [["Ar+"]]),
  ]);
  const against = (what: string, value: number, most: number): Row => ({
    what,
    value,
    unit: "× hand loop",
    claim: `≤ ${most}`,
    holds: value <= most,
  });
  const size = gzipSync(readFileSync(distFile("functions.js")), { level: 9 }).length / 1024;
  return [
    against("DEBYELENGTH, 100,000 rows in one call", debye / debyeHand, 1.5),
    against("WALLFLUX, 100,000 rows in one call", flux / fluxHand, 1.5),
    against("DEBYELENGTH, 100,000 rows of text with units", debyeText / debyeHand, 10),
    { what: "functions.js, gzipped", value: size, unit: "KiB", claim: "≤ 60", holds: size <= 60 },
  ];
}
