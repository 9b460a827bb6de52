import { expect, test } from "vitest";
import { most, sweepValues } from "../../taskpane/sweep/values";

/** numpy.geomspace(20, 2000, 9) of NumPy 1.24, to the digits shown. */
const geometric = [20, 35.5656, 63.2456, 112.468, 200, 355.656, 632.456, 1124.68, 2000];

test("logarithmic values are those of numpy.geomspace, in as many digits as a step needs", () => {
  const values = sweepValues(20, 2000, 9, "logarithmic") as number[];
  expect(values).toHaveLength(9);
  values.forEach((value, i) => expect(value / geometric[i]).toBeCloseTo(1, 4));
  expect(Math.max(...values.map((value) => String(value).length))).toBeLessThanOrEqual(7);
});

test("linear values are those of numpy.linspace", () => {
  expect(sweepValues(0, 1, 5, "linear")).toEqual([0, 0.25, 0.5, 0.75, 1]);
  expect(sweepValues(0.1, 0.4, 4, "linear")).toEqual([0.1, 0.2, 0.3, 0.4]);
  expect(sweepValues(-50, 50, 3, "linear")).toEqual([-50, 0, 50]);
});

test("a sweep runs downwards and over negative values, too", () => {
  expect(sweepValues(-1, -100, 3, "logarithmic")).toEqual([-1, -10, -100]);
  expect(sweepValues(3, 1, 3, "linear")).toEqual([3, 2, 1]);
});

test("rounding never moves a value by more than a thousandth of its step, however small the steps", () => {
  for (const [to, count] of [
    [1.001, most],
    [2, most],
    [1e6, 3],
    [10, 200],
  ]) {
    const values = sweepValues(1, to, count, "logarithmic") as number[];
    const step = Math.log(to) / (count - 1);
    values.forEach((value, i) => expect(Math.abs(Math.log(value) - i * step)).toBeLessThan(1e-3 * step));
  }
});

test("both ends are kept as typed", () => {
  const values = sweepValues(1 / 3, 2 / 3, 4, "logarithmic") as number[];
  expect([values[0], values.at(-1)]).toEqual([1 / 3, 2 / 3]);
});

test.each([
  [1, 10, 1, "linear", /from 2 to 2000 values/],
  [1, 10, 2.5, "linear", /whole number/],
  [1, 10, NaN, "linear", /whole number/],
  [1, 10, 2001, "linear", /from 2 to 2000 values/],
  [5, 5, 10, "linear", /two different values/],
  [0, 10, 5, "logarithmic", /same side of 0/],
  [-1, 10, 5, "logarithmic", /linear steps/],
] as const)("from %d to %d in %d %s values is refused with what to type", (from, to, count, spacing, said) => {
  expect(sweepValues(from, to, count, spacing)).toMatch(said);
});
