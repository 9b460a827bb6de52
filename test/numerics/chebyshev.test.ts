import { describe, expect, test } from "vitest";
import { chebyshev } from "../../functions/numerics/chebyshev";

const worst = (made: (x: number) => number, exact: (x: number) => number, a: number, b: number) =>
  Math.max(...Array.from({ length: 501 }, (_, i) => a + ((b - a) * i) / 500).map((x) => Math.abs(made(x) - exact(x))));

describe("Chebyshev series", () => {
  test("a polynomial of lower degree comes back exactly", () => {
    const cubic = (x: number) => 4 * x ** 3 - 3 * x + 1;
    expect(worst(chebyshev(cubic, -2, 3, 4), cubic, -2, 3)).toBeLessThan(1e-13);
  });

  test("ten terms give the exponential on (−1, 1) as well as its Chebyshev coefficients 2 I_n(1) say", () => {
    // The first term left out is 2 I₁₀(1) T₁₀ = 5.5e-10. Source: Abramowitz & Stegun 9.6.34 and table 9.11.
    const error = worst(chebyshev(Math.exp, -1, 1, 10), Math.exp, -1, 1);
    expect(error).toBeGreaterThan(3e-10);
    expect(error).toBeLessThan(1.2e-9);
  });

  test("with twenty terms nothing but rounding is left", () => {
    expect(worst(chebyshev(Math.exp, -1, 1, 20), Math.exp, -1, 1)).toBeLessThan(3e-15);
  });

  test("the error falls by the sum of the ellipse's half axes with each term", () => {
    // 1/(1 + x²) has its poles at ±i: the ellipse through them has 1 + √2 (Trefethen, Approximation Theory, 2013, ch. 8).
    const f = (x: number) => 1 / (1 + x * x);
    const error = (terms: number) => worst(chebyshev(f, -1, 1, terms), f, -1, 1);
    const factor = (error(12) / error(32)) ** (1 / 20);
    expect(factor).toBeCloseTo(1 + Math.SQRT2, 1);
  });
});
