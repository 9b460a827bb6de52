/** Prints one table a person can read, ratios measured in this one run, and keeps it as reports/bench.json. */
import { mkdirSync, writeFileSync } from "node:fs";
import os from "node:os";
import { cells } from "./cells";
import { checks } from "./checks";
import { findings } from "./findings";
import { fillDown } from "./fill-down";
import type { Row } from "./measure";
import { trial } from "./trial";

const sections: Record<string, () => Row[] | Promise<Row[]>> = {
  "Coming through cells": cells,
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
  for (const { what, value, unit, claim, holds } of report[title]) {
    const number = value.toPrecision(3).padStart(9);
    const verdict = claim ? `${holds ? "holds" : "FAILS"} (${claim})` : "";
    console.log(`  ${what.padEnd(58)}${number} ${unit.padEnd(14)}${verdict}`);
  }
}
const machine = `${os.cpus()[0].model}, ${os.cpus().length} cores, Node.js ${process.version}`;
mkdirSync("reports", { recursive: true });
writeFileSync("reports/bench.json", JSON.stringify({ machine, date: new Date().toISOString(), report }, null, 1));
console.log(`\n${machine}, ${new Date().toISOString().slice(0, 10)}; also in reports/bench.json`);
