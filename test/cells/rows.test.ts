import { expect, test } from "vitest";
import type { Fault } from "../../functions/cells/fault";
import { applyRows } from "../../functions/cells/rows";

test("a row that throws has a fault of its own, and the others their numbers", () => {
  const compute = (x: number, y: number) => {
    if (x === 3) throw new Error("three");
    return x * y;
  };
  const { numbers, others } = applyRows(compute, [Float64Array.of(1, 2, 3, 4), [0.5]], 4);
  expect([...numbers].filter((_, i) => i !== 2)).toEqual([0.5, 1, 2]);
  expect([...others!.keys()]).toEqual([2]);
  expect((others!.get(2) as Fault).message).toContain("three");
});

test("any number of columns goes to compute by position", () => {
  for (let count = 1; count <= 12; count++) {
    const columns = Array.from({ length: count }, (_, k) => (k % 2 ? [k] : Float64Array.of(k, 10 * k)));
    const { others } = applyRows((...values) => values.join(), columns, 2);
    expect(others!.get(1)).toBe(columns.map((values, k) => (values.length === 1 ? k : 10 * k)).join());
  }
});
