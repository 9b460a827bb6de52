import { describe, expect, test } from "vitest";
import { catalogue } from "../../functions/catalogue";
import { isTable, NotTested } from "../../functions/cells/entry";
import { readInputs } from "../../functions/cells/evaluate";
import { Fault } from "../../functions/cells/fault";
import { LIMITCHECK, LIMITS, UNCERTAINTY } from "../../functions/checks/functions";

/** All that can be checked: the checks that take another function's inputs cannot. */
const checkable = catalogue.filter(({ repeats }) => !repeats).map((entry) => [entry.name, entry] as const);
const cellsOf = (example: readonly unknown[]) => example.map((cell) => (Array.isArray(cell) ? cell : [[cell]]));
const beginning = /^(holds$|marginal: |fails: |doubtful input: |not tested: )/;

describe.each(checkable)("%s at its example", (name, entry) => {
  const args = cellsOf(entry.example);

  test("has limits with a finite measure, unless an input is missing or they do not apply", () => {
    const reading = readInputs(entry.inputs, args);
    if (reading instanceof Fault || reading.odd?.[0]) throw new Error("the example cannot be read");
    const values = reading.columns.map((column) => column.values[0]);
    for (const limit of entry.limits) {
      const value = limit.value(...values);
      if (value === undefined || value instanceof NotTested) continue;
      expect(Number.isFinite(value), `${limit.assumption}: ${value}`).toBe(true);
    }
  });

  test("is judged in one of the words", () => {
    for (const [cell] of LIMITCHECK([[name]], ...args)) expect(cell).toMatch(beginning);
  });

  test("is not doubtful", () => {
    for (const [cell] of LIMITCHECK([[name]], ...args)) expect(cell).not.toMatch(/doubtful/);
  });

  test("has a row for each limit, the worst of which is the verdict", () => {
    const rows = LIMITS([[name]], ...args);
    const words = rows.map((row) => String(row[4]).split(":")[0]);
    expect(rows.length).toBeGreaterThanOrEqual(Math.max(1, entry.limits.length));
    const stands = rows.some(
      ([assumption], i) =>
        words[i] === "not tested" &&
        !/does not apply/.test(String(rows[i][4])) &&
        entry.limits.some((limit) => limit.decisive && limit.assumption === assumption),
    );
    const order = ["fails", "marginal", ...(stands ? [] : ["holds"]), "not tested"];
    const worst = order.find((word) => words.includes(word));
    expect(String(LIMITCHECK([[name]], ...args)[0][0]).split(":")[0]).toBe(worst);
  });

  const isText = typeof entry.compute(...valuesAt(entry, args)) === "string";
  const single = !isTable(entry.result) && !isText && entry.inputs.every(({ kind }) => kind !== "block");
  test.runIf(single)("has an uncertainty where each number has 1 %, with shares that add up", () => {
    const [row] = UNCERTAINTY([[name]], [[...entry.example]], [["1 %"]]);
    const [value, u, ...shares] = row;
    expect(typeof value, JSON.stringify(value)).toBe("number");
    expect(Number.isFinite(u)).toBe(true);
    expect(shares.reduce((sum: number, share: number) => sum + share, 0)).toBeCloseTo(u > 0 ? 1 : 0, 9);
  });
});

function valuesAt(entry: (typeof catalogue)[number], args: unknown[]): unknown[] {
  const reading = readInputs(entry.inputs, args);
  return reading instanceof Fault ? [] : reading.columns.map((column) => column.values[0]);
}
