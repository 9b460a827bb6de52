import { beforeAll, describe, expect, inject, test } from "vitest";
import { catalogue } from "../../functions/catalogue";
import type { Entry } from "../../functions/cells/entry";
import { readInputs, type Reading } from "../../functions/cells/evaluate";
import { isCellError, type CellError } from "../../functions/cells/host";
import type { Twin } from "../../functions/cells/twin";
import { frontDoors } from "../../functions/front-doors";
import { plainForm } from "../../taskpane/twin/plain-cells";
import { recalculated, type Computed, type Written } from "./recalculated";
import { samplesOf, seeded } from "./samples";

/**
 * Each closed form is computed twice: here, and by LibreOffice Calc from the formulas of its plain form, which were
 * written from the equations. The two share no code but the constants and the ions' masses.
 */
const accuracy = 1e-12;
const samplesOfEach = 12;

const inPlainForm = catalogue.filter((entry): entry is Entry & { twin: Twin } => typeof entry.twin === "object");

test("every function that claims a closed form has a plain form, and every other says why it has none", () => {
  for (const { name, accuracy, twin } of catalogue) {
    if (/closed form/.test(accuracy)) expect(twin, name).toBeTypeOf("object");
    else if (typeof twin !== "object") expect(twin?.length, name).toBeGreaterThan(10);
  }
});

/** One set of inputs: the numbers the function returns or its error, and where its plain cells show theirs. */
interface Sample {
  args: unknown[][][];
  ours: number[] | CellError;
  theirs: () => Computed[];
}

let computed: Record<string, Computed[][]> = {};
const sheets: Record<string, Written[][]> = {};
const samples = new Map(inPlainForm.map((entry, i) => [entry.name, layOut(entry, seeded(1 + i))]));

beforeAll(async () => {
  computed = await recalculated(inject("libreOffice"), sheets);
});

describe.each(inPlainForm.map((entry) => [entry.name, entry] as const))("%s", (name, entry) => {
  const all = samples.get(name)!;
  const answered = all.filter(({ ours }) => Array.isArray(ours));

  test("LibreOffice finds the same value from the same inputs", () => {
    expect(answered.length).toBeGreaterThan(samplesOfEach / 2);
    for (const { args, ours, theirs } of answered) {
      const found = theirs();
      (ours as number[]).forEach((value, i) => {
        const off = typeof found[i] === "number" ? Math.abs(found[i] - value) : NaN;
        const said = `${JSON.stringify(args)}: ${value} here, ${JSON.stringify(found[i])} there`;
        expect(off <= accuracy * Math.abs(value), said).toBe(true);
      });
    }
  });

  test("each of its words was among them, and a number where that stands for a word", () => {
    entry.inputs.forEach((input, i) => {
      const taken = answered.map(({ args }) => args[i]?.[0]?.[0]);
      const missing = (input.words ?? []).filter((word) => !taken.some((cell) => isWord(cell, word)));
      expect(missing, input.name).toEqual(entry.twin.except?.[input.name] ?? []);
      if (input.words && input.quantity) expect(taken.some((cell) => typeof cell === "number")).toBe(true);
    });
  });

  test("where the function has no solution its plain cells show an error", () => {
    const refused = all.filter(({ ours }) => !Array.isArray(ours));
    for (const { args, ours, theirs } of refused) {
      const said = `${JSON.stringify(args)}: ${(ours as CellError).message}`;
      expect(theirs()[0], said).toEqual({ error: expect.stringMatching(/^#/) });
    }
  });
});

/** All samples of one function below each other on a sheet of its own. */
function layOut(entry: Entry & { twin: Twin }, random: () => number): Sample[] {
  const rows: Written[][] = (sheets[entry.name] = []);
  return samplesOf(entry, samplesOfEach, random).flatMap((args) => {
    const result = frontDoors[entry.name](...args);
    if (isOutside(entry.twin, args, entry, result[0][0])) return [];
    const values = (readInputs(entry.inputs, args) as Reading).columns.map(({ values }) => values[0]);
    const from = rows.length;
    const { cells, results } = plainForm(entry, entry.twin, values, "", { row: from, column: 0 });
    rows.push(...cells, []);
    const theirs = () => results.map((row) => computed[entry.name][from + row][1]);
    return [{ args, ours: isCellError(result[0][0]) ? result[0][0] : numbersOf(result), theirs }];
  });
}

/** A word that the plain form leaves out, or a refusal that it says it does not notice. */
function isOutside({ except = {}, untested }: Twin, args: unknown[][][], entry: Entry, first: any): boolean {
  const excepted = entry.inputs.some(({ name }, i) => except[name]?.some((word) => isWord(args[i]?.[0]?.[0], word)));
  return excepted || (untested !== undefined && isCellError(first) && /space-charge limit/.test(first.message));
}

function isWord(cell: unknown, word: string): boolean {
  return typeof cell === "string" && cell.toLowerCase() === word.toLowerCase();
}

/** The numbers of a result row by row, without the names of a mixture's ions. */
function numbersOf(result: unknown[][]): number[] {
  return result.flat().filter((cell) => typeof cell === "number");
}
