/** What a longer column costs in time and memory, and what the first call waits for. */
import { execFileSync } from "node:child_process";
import { setFlagsFromString } from "node:v8";
import { runInNewContext } from "node:vm";
import { builtFunctions, distFile } from "./build";
import { handLoops } from "./hand-loops";
import { atMost, measureTogether, median, sweep, type Row } from "./measure";

export function growth(): Row[] {
  const doors = builtFunctions();
  const ours = (rows: number) => callOver(rows, doors.DEBYELENGTH);
  const byHand = (rows: number) => callOver(rows, handLoops.DEBYELENGTH);
  const lengths = [1e3, 1e4, 1e5, 1e6];
  const costs = lengths.map((rows) => measureTogether([ours(rows), byHand(rows)], { blocks: 7 }));
  const perRow = lengths.map((rows, i): Row => {
    const [time, hand] = costs[i].map((ms) => (1e6 * ms) / rows);
    return { what: `DEBYELENGTH, ${spell(rows)} rows`, value: time, unit: "ns a row", also: { "by hand": hand } };
  });
  const [held, heldByHand] = [ours, byHand].map((callOf) => bytesHeld(callOf(1e6)) / 1e6);
  const factor = costs[3][0] / costs[2][0];
  return [
    ...perRow,
    atMost(20, { what: "1,000,000 rows against 100,000", value: factor, unit: "× the time", also: byHandToo(costs) }),
    atMost(1.1, {
      what: "memory that a result holds",
      value: held / heldByHand,
      unit: "× hand loop",
      also: { "bytes a row": held },
    }),
    ...coldStart(),
  ];
}

function byHandToo(costs: number[][]): Record<string, number> {
  return { "by hand": costs[3][1] / costs[2][1] };
}

function callOver(rows: number, call: (n: number[][], T: number[][]) => unknown): () => unknown {
  const [n, T] = [sweep(1e14, 1e19, rows), sweep(1, 20, rows)];
  return () => call(n, T);
}

function spell(rows: number): string {
  return rows.toLocaleString("en");
}

/** Memory that stays in use as long as the result does, with what the call keeps for the next one. */
function bytesHeld(call: () => unknown): number {
  setFlagsFromString("--expose-gc");
  const collect = runInNewContext("gc") as () => void;
  const used = () => {
    collect();
    const { heapUsed, arrayBuffers } = process.memoryUsage();
    return heapUsed + arrayBuffers;
  };
  call();
  const before = used();
  const result = call();
  const after = used();
  if (!result) throw new Error("There must be a result to hold.");
  return after - before;
}

/** functions.js in fresh processes: parse it and register all functions, then make the first call. */
function coldStart(): Row[] {
  const script = `
    const code = require("node:fs").readFileSync(process.argv[1], "utf8");
    const doors = {};
    globalThis.CustomFunctions = { associate: (id, door) => (doors[id] = door) };
    const start = performance.now();
    require("node:vm").runInThisContext(code);
    const registered = performance.now();
    doors.DEBYELENGTH([["1e10 cm^-3"]], [[3]]);
    console.log(registered - start, performance.now() - registered);
  `;
  const runs = Array.from({ length: 15 }, () =>
    execFileSync(process.execPath, ["-e", script, distFile("functions.js")], { encoding: "utf8" })
      .split(" ")
      .map(Number),
  );
  const of = (i: number) => ({ value: median(runs.map((run) => run[i])), unit: "ms" });
  return [
    { what: "functions.js, parse and register", ...of(0) },
    { what: "the first call after that, text with a unit", ...of(1) },
  ];
}
