import { expect, test } from "vitest";
import { Fault } from "../../functions/cells/fault";
import { applyRows, type Loop } from "../../functions/cells/rows";

const halves = Float64Array.of(1, 2, 3, 4);
const compute = (x: number, y: number) => {
  if (x === 3) throw new Error("three");
  return x * y;
};

test("a row that throws has a fault of its own, and the others their numbers", () => {
  const { numbers, others } = applyRows({ compute }, [halves, [0.5]], 4);
  expect([...numbers].filter((_, i) => i !== 2)).toEqual([0.5, 1, 2]);
  expect([...others!.keys()]).toEqual([2]);
  expect((others!.get(2) as Fault).message).toContain("three");
});

test("where an entry's own loop throws, the rows are gone through one by one", () => {
  const loop: Loop = (compute, [x, y], [, step], out) => {
    for (let i = 0; i < out.length; i++) out[i] = compute(x[i], y[i * step]) as number;
    return undefined;
  };
  const { numbers, others } = applyRows({ compute, loop }, [halves, [0.5]], 4);
  expect([...numbers].filter((_, i) => i !== 2)).toEqual([0.5, 1, 2]);
  expect([...others!.keys()]).toEqual([2]);
});

test("an entry's own loop does the work where there is one", () => {
  const loop: Loop = (_compute, _columns, _steps, out) => {
    out.fill(7);
    return new Map([[1, "word"]]);
  };
  const { numbers, others } = applyRows({ compute, loop }, [halves, [0.5]], 4);
  expect([...numbers]).toEqual([7, 7, 7, 7]);
  expect(others!.get(1)).toBe("word");
});

test("any number of columns goes to compute by position", () => {
  for (let count = 1; count <= 12; count++) {
    const columns = Array.from({ length: count }, (_, k) => (k % 2 ? [k] : Float64Array.of(k, 10 * k)));
    const { others } = applyRows({ compute: (...values) => values.join() }, columns, 2);
    expect(others!.get(1)).toBe(columns.map((values, k) => (values.length === 1 ? k : 10 * k)).join());
  }
});
