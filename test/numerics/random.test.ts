import { readFileSync } from "node:fs";
import { describe, expect, test } from "vitest";
import { normalNumbers, xoshiro128 } from "../../functions/numerics/random";

const { bits, normal } = JSON.parse(readFileSync("test/published/checks.json", "utf8"));

const take = (count: number, next: () => number) => Array.from({ length: count }, () => next());

describe("random bits", () => {
  test("the state 1, 2, 3, 4 begins with the values printed for the reference implementation (from memory)", () => {
    expect(take(4, xoshiro128([1, 2, 3, 4]))).toEqual([11520, 0, 5927040, 70819200]);
  });

  test("the same bits come out of the definition in integers modulo 2³²", () => {
    const all = take(1000, xoshiro128(bits.seed));
    expect(all.slice(0, 8)).toEqual(bits.first);
    expect(all[999]).toBe(bits.thousandth);
  });
});

describe("normal numbers", () => {
  const count = 400_000;
  const numbers = take(count, normalNumbers(xoshiro128([5, 6, 7, 8])));

  test("as many lie below each bound as scipy's normal distribution has there", () => {
    for (const [bound, share] of Object.entries(normal) as [string, number][]) {
      const below = numbers.filter((x) => x < Number(bound)).length;
      // Five standard deviations of a count.
      expect(Math.abs(below - share * count)).toBeLessThan(5 * Math.sqrt(count * share * (1 - share)));
    }
  });

  test("mean, variance, skewness and fourth moment are 0, 1, 0 and 3", () => {
    const moment = (k: number) => numbers.reduce((sum, x) => sum + x ** k, 0) / count;
    // Five standard errors: the variance of the k-th moment is E[x^2k] − E[x^k]².
    const error = (variance: number) => 5 * Math.sqrt(variance / count);
    expect(Math.abs(moment(1))).toBeLessThan(error(1));
    expect(Math.abs(moment(2) - 1)).toBeLessThan(error(2));
    expect(Math.abs(moment(3))).toBeLessThan(error(15));
    expect(Math.abs(moment(4) - 3)).toBeLessThan(error(96));
  });

  test("neighbours and pairs are not correlated", () => {
    for (const lag of [1, 2, 3]) {
      let sum = 0;
      for (let i = lag; i < count; i++) sum += numbers[i] * numbers[i - lag];
      expect(Math.abs(sum / count)).toBeLessThan(5 / Math.sqrt(count));
    }
  });
});
