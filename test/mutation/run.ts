/**
 * Mutation testing, one room of functions/ at a time, each against the tests of that room alone: a room that leans on
 * another's tests would not know when they change. `npm run mutation -- edge rf` runs those rooms; without names, all.
 * Texts are left alone (a reworded message is no fault), and so is what runs once when a file is loaded.
 */
import { execFileSync } from "node:child_process";
import { mkdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";

interface Room {
  mutate: string[];
  tests: string[];
}

const family = (name: string, ...more: string[]): Room => ({
  mutate: [`functions/${name}/*.ts`, `!functions/${name}/{entries,functions,limits}.ts`],
  tests: [`test/${name}/**/*.test.ts`, ...more],
});

const rooms: Record<string, Room> = {
  edge: family("edge"),
  wall: family("wall"),
  layer: family("layer"),
  rf: family("rf"),
  "negative-ions": family("negative-ions"),
  "ion-mix": family("ion-mix"),
  electrons: family("electrons"),
  magnetised: family("magnetised"),
  probe: family("probe"),
  checks: family("checks"),
  helpers: family("helpers"),
  matter: family("matter", "test/bad-calls.test.ts"),
  numerics: family("numerics", "test/rf/**/*.test.ts", "test/checks/**/*.test.ts", "test/probe/**/*.test.ts"),
  cells: {
    mutate: ["functions/cells/*.ts", "!functions/cells/{quantities,common-inputs,unitmath.d}.ts"],
    tests: ["test/cells/**/*.test.ts", "test/bad-calls.test.ts", "test/hardening/every-function.test.ts"],
  },
};

interface Report {
  files: Record<string, { mutants: { status: string }[] }>;
}

const detected = new Set(["Killed", "Timeout"]);
const counted = new Set([...detected, "Survived", "NoCoverage"]);
const scratch = "reports/mutation";

function scoreOf(room: string, { mutate, tests }: Room): [killed: number, all: number] {
  const config = `${scratch}/${room}.config.json`;
  const report = `${scratch}/${room}.json`;
  const vitest = `${scratch}/${room}.vitest.config.mjs`;
  writeFileSync(
    vitest,
    `export default { test: { testTimeout: 60000, include: ${JSON.stringify(tests)}, server: { deps: { inline: ["unitmath"] } } } };`,
  );
  const stryker = {
    testRunner: "vitest",
    vitest: { configFile: vitest, related: false },
    coverageAnalysis: "perTest",
    mutate,
    mutator: { excludedMutations: ["StringLiteral"] },
    ignoreStatic: true,
    ignorePatterns: ["dist", ".stryker-tmp"],
    reporters: ["clear-text", "json"],
    clearTextReporter: { allowColor: false, logTests: false, reportTests: false },
    jsonReporter: { fileName: report },
    timeoutMS: 15_000,
  };
  writeFileSync(config, JSON.stringify(stryker));
  execFileSync("npx", ["stryker", "run", config], { stdio: "inherit" });
  const { files } = JSON.parse(readFileSync(report, "utf8")) as Report;
  const statuses = Object.values(files).flatMap(({ mutants }) => mutants.map(({ status }) => status));
  return [statuses.filter((each) => detected.has(each)).length, statuses.filter((each) => counted.has(each)).length];
}

const wanted = process.argv.slice(2);
const unknown = wanted.filter((name) => !(name in rooms));
if (unknown.length > 0) {
  console.error(`No room named ${unknown.join(", ")}; there are ${Object.keys(rooms).join(", ")}.`);
  process.exit(2);
}
mkdirSync(scratch, { recursive: true });
const rows = (wanted.length > 0 ? wanted : Object.keys(rooms)).map(
  (name) => [name, ...scoreOf(name, rooms[name])] as const,
);
rmSync(".stryker-tmp", { recursive: true, force: true });
console.log("\nroom            killed     of   score");
for (const [name, killed, all] of rows) {
  console.log(
    `${name.padEnd(14)}${String(killed).padStart(8)}${String(all).padStart(7)}${((100 * killed) / all).toFixed(1).padStart(7)} %`,
  );
}
const total = rows.reduce((sum, [, killed, all]) => [sum[0] + killed, sum[1] + all], [0, 0]);
console.log(
  `${"all".padEnd(14)}${String(total[0]).padStart(8)}${String(total[1]).padStart(7)}${((100 * total[0]) / total[1]).toFixed(1).padStart(7)} %`,
);
