import { readFileSync } from "node:fs";
import { describe, expect, test } from "vitest";
import {
  draws,
  NoSlope,
  propagate,
  propagateByDraws,
  type FirstOrder,
  type Measured,
  type MeasurementModel,
} from "../../functions/checks/propagation";

/** Recomputed with mpmath (slopes) and numpy (four million draws). */
const reference = JSON.parse(readFileSync("test/published/checks.json", "utf8"));

const measured = (...pairs: [value: number, u: number][]): Measured[] =>
  pairs.map(([value, u]) => ({ value, u, least: -Number.MAX_VALUE, most: Number.MAX_VALUE }));
const firstOrder = (f: MeasurementModel, at: Measured[]) => propagate(f, at) as FirstOrder;

/** Length in nm of an end gauge against a standard of 50 mm. JCGM 100:2008, H.1 (values from memory). */
const endGauge: MeasurementModel = ([l_S, d, alpha_S, theta, d_alpha, d_theta]) =>
  l_S + d - l_S * (d_alpha * theta + alpha_S * d_theta);
const gauge = measured([50000623, 25], [215, 9.7], [11.5e-6, 1.2e-6], [-0.1, 0.41], [0, 0.58e-6], [0, 0.029]);

/**
 * Deviation in mg of a weight from 100 g, weighed in air. JCGM 101:2008, 9.3 (values from memory), with normal arguments
 * of the same standard uncertainties where it has rectangular ones.
 */
const weighing: MeasurementModel = ([m_R, dm, a, rho_W, rho_R]) =>
  (m_R + dm) * (1 + (a - 1.2) * (1 / rho_W - 1 / rho_R)) - 100000;
const third = 1 / Math.sqrt(3);
const weight = measured([100000, 0.05], [1.234, 0.02], [1.2, 0.1 * third], [8000, 1000 * third], [8000, 50 * third]);

describe("first order (JCGM 100)", () => {
  test("the GUM's end gauge has 32 nm", () => {
    const { u, shares } = firstOrder(endGauge, gauge);
    expect(Math.round(u)).toBe(32);
    expect(u / reference.endGauge.firstOrder.u).toBeCloseTo(1, 6);
    shares.forEach((share, i) => expect(share).toBeCloseTo(reference.endGauge.firstOrder.shares[i], 6));
  });

  test("the weight of JCGM 101 has 0.0539 mg, since first order sees nothing of the air", () => {
    const { u, shares } = firstOrder(weighing, weight);
    expect(u).toBeCloseTo(0.0539, 4);
    expect(u).toBeCloseTo(reference.mass.firstOrder.u, 6);
    expect(shares[0]).toBeCloseTo(25 / 29, 6);
  });

  test("relative uncertainties of a power law add in quadrature, each times its exponent", () => {
    const exponents = [0.75, -0.5, 3, -2.5];
    const relative = [0.02, 0.1, 0.01, 0.03];
    const f: MeasurementModel = (x) => x.reduce((product, each, i) => product * each ** exponents[i], 1);
    const at = measured(...[300, 1e16, 3e-3, 40].map((x, i): [number, number] => [x, relative[i] * x]));
    const { u, shares } = firstOrder(f, at);
    const parts = exponents.map((exponent, i) => (exponent * relative[i]) ** 2);
    const total = parts.reduce((sum, part) => sum + part);
    expect(u / f(at.map(({ value }) => value))).toBeCloseTo(Math.sqrt(total), 10);
    shares.forEach((share, i) => expect(share).toBeCloseTo(parts[i] / total, 9));
    expect(shares.reduce((sum, share) => sum + share)).toBeCloseTo(1, 14);
  });

  test("an argument at the end of its interval is looked at from the inside", () => {
    const { u } = firstOrder(([x]) => Math.sqrt(4 + x), [{ value: 0, u: 0.1, least: 0, most: 10 }]);
    expect(u).toBeCloseTo(0.1 / 4, 8);
  });

  test("an argument without uncertainty has no share, and is not varied", () => {
    const { u, shares } = firstOrder(([x, y]) => (y === 2 ? x : NaN), measured([3, 0.1], [2, 0]));
    expect(u).toBeCloseTo(0.1, 12);
    expect(shares).toEqual([1, 0]);
  });

  test("without any uncertainty there is none in the result", () => {
    expect(propagate(([x]) => x, measured([3, 0]))).toEqual({ u: 0, shares: [0] });
  });

  test("a kink has no slope, and the argument that has it is named", () => {
    expect(propagate(([x, y]) => x + Math.abs(y), measured([3, 0.1], [0, 0.1]))).toEqual(new NoSlope(1));
  });

  test("a kink that matters little beside another argument is let pass", () => {
    expect(firstOrder(([x, y]) => x + Math.abs(y), measured([3, 1], [0, 1e-4])).u).toBeCloseTo(1, 6);
  });
});

describe("propagation of distributions (JCGM 101)", () => {
  test("four standard normal arguments add to u = 2 and an interval of ±3.92 (JCGM 101, 9.2.2)", () => {
    const sum: MeasurementModel = (x) => x[0] + x[1] + x[2] + x[3];
    const { mean, u, low, high, outside } = propagateByDraws(sum, measured([0, 1], [0, 1], [0, 1], [0, 1]));
    // Statistical errors at 10⁵ draws: 2/√N, 2/√(2N), and 0.0107·2 for a 2.5 % quantile.
    expect(Math.abs(mean)).toBeLessThan(0.02);
    expect(Math.abs(u - 2)).toBeLessThan(0.015);
    expect(Math.abs(low + 3.92)).toBeLessThan(0.06);
    expect(Math.abs(high - 3.92)).toBeLessThan(0.06);
    expect(outside).toBe(0);
  });

  test("the GUM's end gauge has 34 nm once products of two uncertainties count (JCGM 100, H.1.7)", () => {
    const drawn = propagateByDraws(endGauge, gauge);
    expect(Math.round(drawn.u)).toBe(34);
    close(drawn, reference.endGauge.drawn);
  });

  test("the weight of JCGM 101 has 0.076 mg where first order said 0.054 (0.0754 with rectangular arguments)", () => {
    const drawn = propagateByDraws(weighing, weight);
    expect(Math.abs(drawn.u - 0.0754)).toBeLessThan(0.001);
    close(drawn, reference.mass.drawn);
  });

  test("agrees with first order where the function is nearly straight", () => {
    const f: MeasurementModel = ([T, n]) => Math.sqrt(T / n);
    const at = measured([3, 0.03], [1e16, 1e14]);
    expect(propagateByDraws(f, at).u / firstOrder(f, at).u).toBeCloseTo(1, 2);
  });

  test("differs from it where the function is curved: √(T/n) at 5 % and 10 %, by quadrature", () => {
    const { mean, u } = propagateByDraws(([T, n]) => Math.sqrt(T / n), measured([1, 0.05], [1, 0.1]));
    expect(mean).toBeCloseTo(reference.debye.mean, 3);
    expect(u / reference.debye.u).toBeCloseTo(1, 2);
    const linear = firstOrder(([T, n]) => Math.sqrt(T / n), measured([1, 0.05], [1, 0.1])).u;
    expect(linear).toBeCloseTo(Math.hypot(0.025, 0.05), 8);
    expect(reference.debye.u / linear).toBeGreaterThan(1.02);
  });

  test("the square of a normal argument at 0 has √2 u², of which first order sees nothing", () => {
    const square: MeasurementModel = ([x]) => x * x;
    expect(firstOrder(square, measured([0, 1])).u).toBeLessThan(1e-9);
    const { mean, u, low } = propagateByDraws(square, measured([0, 1]));
    expect(mean).toBeCloseTo(1, 1);
    expect(u / Math.SQRT2).toBeCloseTo(1, 1);
    expect(low).toBeGreaterThan(0);
  });

  test("an exponential has the interval of a lognormal distribution", () => {
    const { low, high, u, mean } = propagateByDraws(([x]) => Math.exp(x), measured([0, 0.5]));
    expect(Math.log(low)).toBeCloseTo(-1.96 * 0.5, 1);
    expect(Math.log(high)).toBeCloseTo(1.96 * 0.5, 1);
    expect(mean / Math.exp(0.125)).toBeCloseTo(1, 2);
    expect(u / (Math.exp(0.125) * Math.sqrt(Math.expm1(0.25)))).toBeCloseTo(1, 1);
  });

  test("the same call gives the same numbers every time", () => {
    const f: MeasurementModel = ([x, y]) => x * y;
    const at = measured([3, 0.1], [2, 0.2]);
    expect(propagateByDraws(f, at)).toEqual(propagateByDraws(f, at));
  });

  test("draws beyond an argument's interval or the function's domain are counted and left out", () => {
    // Half of them lie below 0, and 16 % below −1.
    const half = propagateByDraws(([x]) => x, [{ value: 0, u: 1, least: 0, most: Infinity }]);
    expect(Math.abs(half.outside / draws - 0.5)).toBeLessThan(0.01);
    expect(half.low).toBeGreaterThan(0);
    expect(half.mean).toBeCloseTo(Math.sqrt(2 / Math.PI), 2);
    const sixth = propagateByDraws(([x]) => (x < -1 ? NaN : x), measured([0, 1]));
    expect(Math.abs(sixth.outside / draws - 0.158655)).toBeLessThan(0.006);
  });
});

/** Some three times the statistical error of 10⁵ draws each: u/√N, u/√(2N), 0.0085 u for a 2.5 % quantile. */
function close(
  drawn: ReturnType<typeof propagateByDraws>,
  wanted: Record<"mean" | "u" | "low" | "high", number>,
): void {
  expect(Math.abs(drawn.mean - wanted.mean)).toBeLessThan(0.01 * wanted.u);
  expect(Math.abs(drawn.u / wanted.u - 1)).toBeLessThan(0.01);
  expect(Math.abs(drawn.low - wanted.low)).toBeLessThan(0.03 * wanted.u);
  expect(Math.abs(drawn.high - wanted.high)).toBeLessThan(0.03 * wanted.u);
}
