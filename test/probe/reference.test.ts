import { describe, expect, test } from "vitest";
import { u } from "../../functions/matter/constants";
import type { Ion } from "../../functions/matter/ion";
import { chiSquareBeyond, normalBeyond } from "../../functions/numerics/chi-square";
import { NormalEquations } from "../../functions/numerics/normal-equations";
import { PROBEFIT } from "../../functions/probe/functions";
import { probeParts, type ProbePart } from "../../functions/probe/parts";
import * as model from "../../functions/probe/model";
import reference from "../published/probe.json";
import { ulpsFrom } from "../ulp";

const ion = (mass: number, charge: number): Ion => ({ mass: mass * u, charge, label: "" });

/** Source: mpmath at 50 digits, test/published/probe.py. */
const closedForms = {
  density: (I, area, T_e, mass, charge, ratio, gamma) =>
    model.probeDensity(I, area, T_e, ion(mass, charge), ratio, gamma),
  depth: (mass, charge, ratio) => model.floatingDepth(ion(mass, charge), ratio),
  orbitalCurrent: (V, n, radius, length, mass, charge) => model.orbitalCurrent(V, n, radius, length, ion(mass, charge)),
  orbitalDensity: (I, V, radius, length, mass, charge) => model.orbitalDensity(I, V, radius, length, ion(mass, charge)),
} satisfies Record<string, (...inputs: number[]) => number>;

describe.each(Object.keys(closedForms) as (keyof typeof closedForms)[])("%s", (name) => {
  test("is within 4 ulp of 50-digit arithmetic", () => {
    const compute: (...inputs: number[]) => number = closedForms[name];
    const worst = Math.max(...reference[name].map(({ inputs, value }) => ulpsFrom(compute(...inputs), value)));
    expect(worst).toBeLessThanOrEqual(4);
  });
});

describe("a fit of the same readings by scipy.optimize.curve_fit, told the noise and the window", () => {
  test.each(reference.sweeps.map((sweep, i) => [i + 1, sweep] as const))(
    "sweep %i agrees in T_e, V_f and I_sat to a standard error or less, and in the errors themselves to 40 %%",
    (_, { start, step, I, fit, errors }) => {
      const V = I.map((_, i) => start + step * i);
      const [row] = PROBEFIT(
        V.map((each) => [each]),
        I.map((each) => [each]),
      );
      const at = (part: ProbePart) => row[probeParts.indexOf(part)] as number;
      (["V_f", "T_e", "I_sat"] as const).forEach((part, k) => {
        expect(Math.abs(at(part) - fit[k])).toBeLessThan(errors[k]);
        expect(Math.abs(Math.log(at(`${part}_error`) / errors[k]))).toBeLessThan(0.4);
      });
    },
  );
});

describe("the numerics underneath", () => {
  test("χ² tails agree with scipy.stats to 0.005, and to 13 % of themselves down to 1e-5; normal tails to 2e-7", () => {
    for (const [x, freedom, exact] of reference.chiSquare) {
      const found = chiSquareBeyond(x, freedom);
      expect(Math.abs(found - exact)).toBeLessThan(0.005);
      expect(Math.abs(found / exact - 1)).toBeLessThan(0.13);
    }
    for (const [z, exact] of reference.normal) {
      expect(Math.abs(normalBeyond(z) - exact)).toBeLessThan(2e-7);
    }
  });

  test("weighted least squares agree with mpmath's inverse to 1e-11", () => {
    for (const { rows, y, w, solution, covariance } of reference.leastSquares) {
      const equations = new NormalEquations(3);
      rows.forEach((row, i) => equations.add(row, y[i], w[i]));
      const found = equations.solve()!;
      solution.forEach((value, k) => expect(Math.abs(found.solution[k] / value - 1)).toBeLessThan(1e-11));
      covariance.forEach((value, k) => expect(Math.abs(found.covariance[k] / value - 1)).toBeLessThan(1e-11));
    }
  });

  test("columns that say the same have no solution", () => {
    const equations = new NormalEquations(2);
    for (let x = 1; x < 5; x++) equations.add([x, 2 * x], x, 1);
    expect(equations.solve()).toBeUndefined();
  });
});
