import fc from "fast-check";
import { describe, expect, test } from "vitest";
import * as model from "../../functions/layer/model";
import { distance, dropAt } from "../../functions/layer/nonlinear-sheath";
import { u } from "../../functions/matter/constants";

/** Spread evenly in the logarithm. */
const between = (low: number, high: number) =>
  fc.double({ min: Math.log(low), max: Math.log(high), noNaN: true }).map(Math.exp);

const ion = fc
  .tuple(between(1, 300), fc.integer({ min: 1, max: 6 }))
  .map(([mass, charge]) => ({ mass: mass * u, charge, label: "" }));

const runs = { numRuns: 2000 };

describe("CHILDWIDTH takes back what CHILDCURRENT gave", () => {
  test("without collisions", () => {
    fc.assert(
      fc.property(between(1e-2, 1e7), between(1e-8, 10), ion, (V_s, s, ion) => {
        expect(Math.abs(model.widthFromCurrent(V_s, model.childCurrent(V_s, s, ion), ion) / s - 1)).toBeLessThan(1e-14);
      }),
      runs,
    );
  });

  test("with them", () => {
    fc.assert(
      fc.property(between(1e-2, 1e7), between(1e-8, 10), between(1e-9, 10), ion, (V_s, s, lambda_i, ion) => {
        const J = model.collisionalCurrent(V_s, s, ion, lambda_i);
        expect(Math.abs(model.collisionalWidthFromCurrent(V_s, J, ion, lambda_i) / s - 1)).toBeLessThan(1e-14);
      }),
      runs,
    );
  });
});

describe("the potential takes back the distance", () => {
  const speeds = fc.oneof(
    fc.constantFrom(1, 1 + Number.EPSILON, 1 + 1e-9, 1.3160740129524924),
    fc.double({ min: 1, max: 3, noNaN: true }),
    between(1, 1e4),
  );

  test("between any two drops, at any speed of the ions", () => {
    fc.assert(
      fc.property(between(1e-6, 1e6), between(1e-12, 1), speeds, (wall, share, mu) => {
        const eta = wall * share;
        expect(Math.abs(dropAt(distance(eta, wall, mu), wall, mu) / eta - 1)).toBeLessThan(1e-10);
      }),
      runs,
    );
  });

  test("and the distance the potential, from a millionth of a Debye length to a million", () => {
    fc.assert(
      fc.property(between(1e-3, 1e6), between(1e-6, 1e6), (wall, x) => {
        const eta = dropAt(x, wall, 1);
        expect(eta).toBeGreaterThan(0);
        expect(Math.abs(distance(eta, wall, 1) / x - 1)).toBeLessThan(1e-10 * Math.max(1, wall ** 0.75 / x));
      }),
      runs,
    );
  });

  test("the potential rises all the way from the wall", () => {
    fc.assert(
      fc.property(between(1e-3, 1e6), between(1e-3, 1e4), speeds, (wall, x, mu) => {
        const [nearer, farther] = [dropAt(x, wall, mu), dropAt(1.01 * x, wall, mu)];
        expect(farther <= nearer && nearer <= wall && (farther < nearer || nearer === 0)).toBe(true);
      }),
      runs,
    );
  });

  test("distances add up", () => {
    fc.assert(
      fc.property(between(1e-20, 1e6), between(1e-20, 1e6), between(1e-20, 1e6), speeds, (a, b, c, mu) => {
        const [low, middle, high] = [a, b, c].sort((p, q) => p - q);
        const sum = distance(low, middle, mu) + distance(middle, high, mu);
        expect(Math.abs(sum - distance(low, high, mu))).toBeLessThanOrEqual(1e-12 * sum);
      }),
      runs,
    );
  });
});
