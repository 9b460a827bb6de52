/** Prints one table a person can read, ratios measured in this one run, and keeps it as reports/bench.json. */
import { mkdirSync, writeFileSync } from "node:fs";
import os from "node:os";
import { cells } from "./cells";
import { checks } from "./checks";
import { findings } from "./findings";
import { fillDown } from "./fill-down";
import { functions } from "./functions";
import { growth } from "./growth";
import type { Row } from "./measure";
import { trial } from "./trial";

const sections: Record<string, () => Row[] | Promise<Row[]>> = {
  "Coming through cells": cells,
  "Every function": functions,
  "Growth, memory and start": growth,
  Checks: checks,
  "Looking through workbooks": findings,
  "Calls filled down": fillDown,
  "Trial sheet": trial,
};

const wanted = process.argv[2]?.toLowerCase();
const report: Record<string, Row[]> = {};
for (const [title, run] of Object.entries(sections)) {
  if (wanted && !title.toLowerCase().includes(wanted)) continue;
  report[title] = await run();
  console.log(`\n${title}`);
  for (const { what, value, unit, claim, holds, also = {} } of report[title]) {
    const verdict = claim ? `${holds ? "holds" : "FAILS"} (${claim})` : "";
    const more = Object.entries(also).map(([unit, value]) => `${short(value)} ${unit}`);
    console.log(
      `  ${what.padEnd(58)}${short(value)} ${unit.padEnd(14)}${verdict.padEnd(16)}${more.join("")}`.trimEnd(),
    );
  }
}
function short(value: number): string {
  return value.toPrecision(3).padStart(9);
}

const machine = `${os.cpus()[0].model}, ${os.cpus().length} cores, Node.js ${process.version}`;
mkdirSync("reports", { recursive: true });
writeFileSync("reports/bench.json", JSON.stringify({ machine, date: new Date().toISOString(), report }, null, 1));
console.log(`\n${machine}, ${new Date().toISOString().slice(0, 10)}; also in reports/bench.json`);
