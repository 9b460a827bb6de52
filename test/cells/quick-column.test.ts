import ts from "typescript";
import { expect, test } from "vitest";
import { T_e, n_bulk, T_i } from "../../functions/cells/common-inputs";
import { entry, type Entry } from "../../functions/cells/entry";
import { evaluate } from "../../functions/cells/evaluate";
import { noSolution } from "../../functions/cells/fault";
import { ionInput } from "../../functions/cells/inputs";
import { quantities } from "../../functions/cells/quantities";
import type { Loop } from "../../functions/cells/quick-column";
import type { Ion } from "../../functions/matter/ion";
import giveLoops from "../../manifest/build/loop-loader.js";

/** What the build puts into an entry of so many inputs. */
function loopFor(count: number): Loop {
  const inputs = Array.from({ length: count }, (_, k) => `i${k}`).join();
  const code = giveLoops.call(
    { resourcePath: "entries.ts" },
    `entry("X", { inputs: [${inputs}], result: q, compute: f, twin: {} })`,
  );
  const { outputText } = ts.transpileModule(code, { compilerOptions: { target: ts.ScriptTarget.ES2022 } });
  return new Function("q", "f", "entry", inputs, `return ${outputText}`)(0, 0, (_: string, facts: any) => facts.loop);
}

let calls = 0;
const inputs = [n_bulk, T_e, ionInput(), T_i] as const;
const compute = (n: number, T: number, ion: Ion, T_i?: number) => {
  calls++;
  if (n === 13e16) throw new Error("a bug");
  return T > 100 ? noSolution("too hot") : n * T * ion.charge + (T_i ?? 0.5);
};
const facts = {
  inputs,
  result: quantities.flux,
  compute,
  equation: "",
  sources: [],
  changes: {},
  example: [],
  accuracy: "",
};
const slow = entry("SAMPLE", facts);
const quick = { ...slow, loop: loopFor(4) } as Entry<any>;

const column = (...cells: unknown[]) => cells.map((cell) => [cell]);
const argon = [["Ar+"]];
test("the loop of an entry goes down clean columns once, and a row it stops at is left to the careful way", () => {
  calls = 0;
  expect(evaluate(quick, [column(1e16, 2e16), column(3, 4), argon])).toEqual([[3e16 + 0.5], [8e16 + 0.5]]);
  expect(calls).toBe(2);
  evaluate(quick, [column(1e16, "OL"), column(3, 4), argon]);
  expect(calls).toBe(4);
});

const cases: [string, unknown[]][] = [
  ["clean columns", [column(1e16, 2e16, 3e16), column(3, 4, 5), argon]],
  ["a lone temperature", [column(1e16, 2e16), [[3]], argon]],
  ["text with a unit", [column(1e16, "1e10 cm^-3"), [[3]], argon]],
  ["a number as text", [column(1e16, "2e16"), [[3]], argon]],
  ["a blank row", [column(1e16, null, 0, ""), column(3, null, 0, ""), argon]],
  ["a half blank row", [column(1e16, 2e16), column(3, null), argon]],
  ["truth in place of a number", [column(1e16, true), [[3]], argon]],
  ["infinity and no number", [column(1e16, Infinity, NaN), [[3]], argon]],
  ["a number out of range", [column(1e16, -1), [[3]], argon]],
  ["an error cell", [column(1e16, { code: "#DIV/0!" }), [[3]], argon]],
  ["a row without a solution", [column(1e16, 2e16), column(3, 300), argon]],
  ["a row that throws", [column(1e16, 13e16), [[3]], argon]],
  ["a result too large for a cell", [column(1e308, 1e16), column(99, 99), argon]],
  ["a column of ions", [column(1e16, 2e16), [[3]], column("Ar+", "He++")]],
  ["an ion that is none", [column(1e16, 2e16), [[3]], [["Xx+"]]]],
  ["a column of optional numbers", [column(1e16, 2e16), [[3]], argon, column(1, 2)]],
  ["a column of optional numbers with a blank", [column(1e16, 2e16), [[3]], argon, column(1, null)]],
  ["another unit", [column(1e16, 2e16), [[3]], argon, null, [["cm^-2 s^-1"]]]],
  ["a column of units", [column(1e16, 2e16), [[3]], argon, null, column("cm^-2 s^-1", "m^-2 s^-1")]],
  ["no unit at all", [column(1e16, 2e16), [[3]], argon, null, [["furlong"]]]],
  ["a table", [column(1e16, 2e16), [[3, 4]], argon]],
  ["columns of different lengths", [column(1e16, 2e16), column(3, 4, 5), argon]],
  ["a ragged range", [[[1e16], [2e16, 3e16]], [[3]], argon]],
  ["a range whose rows grow empty", [[[1e16], []], [[3]], argon]],
  ["a plain list", [[1e16, 2e16], 3, "Ar+"]],
  ["nothing", []],
];

test.each(cases)("%s: the quick way and the careful one agree", (_what, args) => {
  expect(evaluate(quick, args)).toEqual(evaluate(slow, args));
});

const argument = (...parts: Parameters<Loop>[6][number]) => parts;

test("loops for any number of inputs pass all of them on", () => {
  for (let count = 1; count <= 9; count++) {
    const list = Array.from({ length: count }, (_, k) =>
      k === 1 ? argument([["word"]], 0, 1, 0) : argument(column(k, 10 * k), 1, 0, 1e9),
    );
    const seen: unknown[][] = [];
    const out: number[][] = new Array(2);
    const note = (...values: unknown[]) => seen.push(values);
    expect(loopFor(count)(note, out, 2, 0, undefined, undefined, list)).toBe(2);
    expect(seen[1]).toEqual(list.map((_, k) => (k === 1 ? "word" : 10 * k)));
    expect(out).toEqual([[0.5], [1]]);
  }
});
