/**
 * Calls any custom function with any cells whatsoever, from a seed, and says what was wrong with the answer: an
 * exception, a NaN, an infinity, an error without words, a null, or a call that took too long.
 * `npx tsx test/hardening/fuzz.ts 1000000` makes that many calls.
 */
import { isCellError } from "../../functions/cells/host";
import { catalogue } from "../../functions/catalogue";
import type { Entry } from "../../functions/cells/entry";
import { frontDoors } from "../../functions/front-doors";
import type { Input } from "../../functions/cells/inputs";

/** Mulberry32: 32 bits of state are enough to repeat a failure. */
export function generator(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = state;
    t = Math.imul(t ^ (t >>> 15), t | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}

const nasty: unknown[] = [
  ...[0, -0, 1, -1, 1e-320, 1e308, -1e308, 5e-324, NaN, Infinity, -Infinity, 1e16, 46357, 0.05, 2 ** 53, 1e-300],
  ...[
    "",
    " ",
    "OL",
    "n/a",
    "1e16 m^-3",
    "3 eV",
    "5 mTorr",
    "-3 eV",
    "1,5",
    "1,500",
    "=1+1",
    "TRUE",
    "Ar+",
    "Xe2+",
    "ar",
  ],
  ...[
    "constructor",
    "__proto__",
    "floating",
    "1e999",
    "1e999 eV",
    "0x10",
    "٣",
    "🙂",
    "1 / 0",
    "'",
    '"',
    "300 Vpp",
    "5 %",
  ],
  ...[
    "slab",
    "full",
    "(((((",
    "Ar^9+",
    "H^^+",
    "1e16 m^-3 ^",
    "x".repeat(3000),
    "9".repeat(400),
    "\u0000",
    "-",
    "1e",
    "e",
  ],
  ...[true, false, null, undefined, { code: "#DIV/0!" }, { code: "#N/A", message: "why" }, { code: "#REF!" }],
  ...[{}, [], { basicValue: 5 }, { basicValue: "#NUM!", basicType: "Error" }, () => 1, Symbol.iterator, 10n],
];

/** A hundred thousand draws of another function: its time has a bound of its own, and its tests are in test/checks. */
const montecarlo = "montecarlo";

function pick<T>(random: () => number, list: readonly T[]): T {
  return list[Math.floor(random() * list.length)];
}

function cellFor(random: () => number, input: Input | undefined, example: unknown): unknown {
  const dice = random();
  if (dice < 0.25) return pick(random, nasty);
  if (dice < 0.4) return (random() < 0.3 ? -1 : 1) * 10 ** (random() * 60 - 30);
  if (dice < 0.5 && input?.words)
    return pick(
      random,
      input.words.filter((word) => word !== montecarlo),
    );
  if (dice < 0.7 && typeof example === "number") return example * 10 ** (random() * 8 - 4);
  if (dice < 0.75 && input?.quantity) return `${random() * 10} ${input.quantity.unit}`;
  return example ?? null;
}

function argumentFor(random: () => number, input: Input | undefined, example: unknown): unknown {
  if (random() < 0.05) return pick(random, [null, undefined, [], [[]], [[], []], [[1, 2], [3]]]);
  if (Array.isArray(example)) {
    const cells = example as unknown[][];
    if (random() < 0.5) return cells;
    return cells.map((row) => row.map((cell) => (random() < 0.2 ? cellFor(random, input, cell) : cell)));
  }
  const [rows, columns] = random() < 0.7 ? [1, 1] : [1 + Math.floor(random() * 3), random() < 0.8 ? 1 : 2];
  return Array.from({ length: rows }, () => Array.from({ length: columns }, () => cellFor(random, input, example)));
}

export interface Call {
  name: string;
  args: unknown[];
}

export function randomCall(random: () => number, entries: readonly Entry[] = catalogue): Call {
  const entry = pick(random, entries);
  const count = entry.inputs.length + (entry.takesUnit ? 1 : 0);
  const args = Array.from({ length: Math.max(count, entry.example.length) }, (_, i) =>
    argumentFor(random, entry.inputs[i], i === entry.inputs.length && entry.takesUnit ? null : entry.example[i]),
  );
  return { name: entry.name, args };
}

/** What is wrong with the answer to a call; undefined where nothing is. */
export function fault({ name, args }: Call, patience = 100): string | undefined {
  // Time of the processor, not of the clock: other work on the machine is not the call's.
  const start = process.cpuUsage();
  let result: unknown[][];
  try {
    result = frontDoors[name](...args);
  } catch (error) {
    return `threw ${String(error)}`;
  }
  const { user, system } = process.cpuUsage(start);
  const took = (user + system) / 1000;
  if (took > patience) return `took ${took.toFixed(0)} ms`;
  if (!Array.isArray(result) || result.length === 0 || result.some((row) => !Array.isArray(row)))
    return "gave no matrix";
  const width = result[0].length;
  if (result.some((row) => row.length !== width)) return "gave rows of different lengths";
  return result.flat().map(wrongWith).find(Boolean);
}

function wrongWith(cell: unknown): string | undefined {
  if (typeof cell === "number") return Number.isFinite(cell) ? undefined : `gave ${cell}`;
  if (typeof cell === "string" || typeof cell === "boolean") return undefined;
  if (!isCellError(cell)) return `gave ${String(cell)}`;
  const { code, message } = cell as { code: string; message?: string };
  if (!["#VALUE!", "#N/A"].includes(code)) return undefined;
  if (message === undefined && code === "#VALUE!") return "gave an unworded #VALUE!";
  if (message?.includes("please report")) return `has a bug: ${message}`;
  return message === "" ? "gave an unworded error" : undefined;
}

export function describeCall({ name, args }: Call): string {
  const text = JSON.stringify(args, (_, value) =>
    typeof value === "bigint" || typeof value === "function" || typeof value === "symbol" || Number.isNaN(value)
      ? String(value)
      : value === undefined
        ? null
        : value,
  );
  return `${name} ${text.slice(0, 600)}`;
}

/** Failures among `count` calls from a seed, at most a few of each function. */
export function fuzz(count: number, seed: number, patience?: number): string[] {
  const failures: string[] = [];
  const random = generator(seed);
  for (let i = 0; i < count && failures.length < 40; i++) {
    const call = randomCall(random);
    const wrong = fault(call, patience);
    if (wrong) failures.push(`${wrong}: ${describeCall(call)}`);
  }
  return failures;
}

if (process.argv[1]?.endsWith("fuzz.ts")) {
  const count = Number(process.argv[2] ?? 100_000);
  const failures = fuzz(count, Number(process.argv[3] ?? 1));
  console.log(failures.length ? failures.join("\n") : `${count} calls, nothing wrong`);
  process.exitCode = failures.length ? 1 : 0;
}
