import { readFileSync } from "node:fs";
import { describe, expect, test } from "vitest";
import { slope } from "../../functions/numerics/derivative";

const { slopes } = JSON.parse(readFileSync("test/published/checks.json", "utf8"));

const functions: Record<string, (x: number) => number> = {
  sqrt: Math.sqrt,
  exp: Math.exp,
  log: Math.log,
  tan: Math.tan,
  "inverse cube": (x) => x ** -3,
  oscillating: (x) => Math.sin(20 * x),
};
const anywhere = { least: -Number.MAX_VALUE, most: Number.MAX_VALUE, scale: 0.01 };
const positive = { ...anywhere, least: Number.MIN_VALUE };

describe("slopes against mpmath at 50 digits", () => {
  test.each(slopes as { f: string; x: number; slope: string }[])("$f at $x", ({ f, x, slope: reference }) => {
    const reach = { ...(f === "sqrt" || f === "log" ? positive : anywhere), scale: 0.01 * Math.abs(x) || 0.01 };
    const found = slope(functions[f], x, reach)!;
    expect(Math.abs(found.value / Number(reference) - 1)).toBeLessThan(1e-8);
    expect(found.error).toBeLessThan(1e-6 * Math.abs(found.value));
  });
});

describe("slopes near the end of a domain", () => {
  test("at the least value an input takes, differences go to the other side", () => {
    const reach = { least: 0, most: 10, scale: 0.1 };
    const found = slope((x) => (x < 0 ? NaN : (3 + x) ** 0.5), 0, reach)!;
    expect(found.value).toBeCloseTo(0.5 / Math.sqrt(3), 9);
  });

  test("close to a place where the function stops having values, steps shrink", () => {
    const found = slope((x) => (x <= 1 ? NaN : Math.sqrt(x - 1)), 1.001, { ...anywhere, scale: 1 })!;
    expect(found.value).toBeCloseTo(0.5 / Math.sqrt(0.001), 6);
  });

  test("a vertical slope is told by its error", () => {
    const found = slope((x) => (x < 0 ? NaN : Math.sqrt(x)), 0, { least: 0, most: 10, scale: 0.1 });
    expect(found === undefined || found.error > 0.1 * Math.abs(found.value)).toBe(true);
  });

  test("a place without values around has no slope", () => {
    expect(slope((x) => (x === 2 ? 1 : NaN), 2, anywhere)).toBeUndefined();
    expect(slope(() => NaN, 2, anywhere)).toBeUndefined();
  });
});

describe("slopes that first order cannot use", () => {
  test("at a kink the error is half the jump of the slope", () => {
    const found = slope((x) => Math.abs(x - 2), 2, anywhere)!;
    expect(found.error).toBeCloseTo(1, 6);
    const bent = slope((x) => (x < 2 ? 3 * x : 4 * x - 2), 2, anywhere)!;
    expect(bent.error).toBeCloseTo(0.5, 2);
  });

  test("an extremum is no kink", () => {
    const found = slope((x) => (x - 2) ** 2, 2, anywhere)!;
    expect(Math.abs(found.value)).toBeLessThan(1e-12);
    expect(found.error).toBeLessThan(1e-6);
  });

  test("a resonance far narrower than the first step is no kink", () => {
    const found = slope((x) => 1 / (1 + 1e4 * (x - 1) ** 2), 1.01, anywhere)!;
    expect(found.value).toBeCloseTo(-50, 6);
    expect(found.error).toBeLessThan(1e-3);
  });

  test("noise of a function known to ten digits costs digits of the slope, not its size", () => {
    const noisy = (x: number) => Math.exp(x) * (1 + 1e-10 * Math.sin(1e9 * x));
    const found = slope(noisy, 1, anywhere)!;
    expect(Math.abs(found.value / Math.E - 1)).toBeLessThan(1e-6);
    expect(found.error).toBeLessThan(1e-6);
  });
});
