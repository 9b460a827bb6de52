import { describe, expect, test } from "vitest";
import { gaussLegendre, integrate } from "../../functions/numerics/gauss-legendre";

describe("Gauss–Legendre rules", () => {
  test("the rule of three points has √0.6 and 5/9, the rule of one the middle", () => {
    // Source: Abramowitz & Stegun, table 25.4.
    const { nodes, weights } = gaussLegendre(3);
    expect(nodes[2]).toBeCloseTo(Math.sqrt(0.6), 15);
    expect(nodes[1]).toBeCloseTo(0, 15);
    expect(weights[0]).toBeCloseTo(5 / 9, 15);
    expect(weights[1]).toBeCloseTo(8 / 9, 15);
    expect([...gaussLegendre(1).weights]).toEqual([2]);
  });

  test("the rule of twenty points has the tabulated innermost node and weight", () => {
    // Source: Abramowitz & Stegun, table 25.4; recomputed with numpy.polynomial.legendre.leggauss.
    const { nodes, weights } = gaussLegendre(20);
    expect(nodes[10]).toBeCloseTo(0.0765265211334973, 15);
    expect(weights[10]).toBeCloseTo(0.1527533871307259, 15);
    expect(nodes[0]).toBeCloseTo(-0.9931285991850949, 15);
    expect(weights[0]).toBeCloseTo(0.0176140071391521, 15);
  });

  test.each([2, 5, 8, 20, 64])("the rule of %i points is exact up to degree 2n − 1 and no further", (points) => {
    const rule = gaussLegendre(points);
    const even = 2 * points - 2;
    const power = (degree: number) => integrate((x) => x ** degree, 0, 1, rule) * (degree + 1);
    expect(Math.abs(power(even) - 1)).toBeLessThan(3e-14);
    expect(Math.abs(power(even + 1) - 1)).toBeLessThan(3e-14);
    if (points <= 8) expect(Math.abs(power(2 * points) - 1)).toBeGreaterThan(1e-14);
  });
});

describe("integration over panels", () => {
  test("the error of a smooth integrand falls geometrically with the panels", () => {
    // ∫dx/(1 + 25x²) over (−1, 1) is (2/5) arctan 5: poles at ±0.2i.
    const exact = 0.4 * Math.atan(5);
    const error = (longest: number) =>
      Math.abs(integrate((x) => 1 / (1 + 25 * x * x), -1, 1, gaussLegendre(10), longest) / exact - 1);
    expect(error(2)).toBeGreaterThan(1e-3);
    expect(error(1)).toBeLessThan(1e-2 * error(2));
    expect(error(0.1)).toBeLessThan(3e-15);
  });

  test("turned round, an integral changes its sign", () => {
    const rule = gaussLegendre(8);
    expect(integrate(Math.exp, 1, 0, rule)).toBeCloseTo(1 - Math.E, 14);
  });
});
