import { describe, expect, test } from "vitest";
import { u } from "../../functions/matter/constants";
import type { Ion } from "../../functions/matter/ion";
import { NEGATIVEIONPOTENTIAL } from "../../functions/negative-ions/entries";
import { negativeIonEdges } from "../../functions/negative-ions/edges";
import * as model from "../../functions/negative-ions/model";
import reference from "../published/negative-ions.json";
import { ulpsFrom } from "../ulp";

const ion = (mass: number, charge: number): Ion => ({ mass: mass * u, charge, label: "" });

/** Source: mpmath at 50 digits, test/published/negative-ions.py. */
const functions: Record<keyof typeof reference.tables, (...inputs: number[]) => number> = {
  bohm: (T_e, mass, charge, alpha_s, gamma) => model.negativeIonBohmSpeed(T_e, ion(mass, charge), alpha_s, gamma),
  flux: (n, T_e, mass, charge, alpha_s, gamma) => model.negativeIonFlux(n, T_e, ion(mass, charge), alpha_s, gamma),
  potential: (T_e, mass, charge, alpha_s, gamma) =>
    NEGATIVEIONPOTENTIAL.compute(T_e, ion(mass, charge), alpha_s, gamma) as number,
  drop: model.edgeDrop,
};

describe.each(Object.keys(functions) as (keyof typeof functions)[])("%s", (name) => {
  test("is within 4 ulp of 50-digit arithmetic where it has a value", () => {
    // Negative ions in excess bring more charge than electrons can balance: those rows have no floating wall.
    const rows = reference.tables[name].filter(({ value }) => name !== "potential" || Number(value) < 0);
    expect(rows.length).toBeGreaterThan(40);
    const worst = Math.max(...rows.map(({ inputs, value }) => ulpsFrom(functions[name](...inputs), value)));
    expect(worst).toBeLessThanOrEqual(4);
  });
});

describe("the edges of 258 bodies", () => {
  const solved = reference.edges.map(({ alpha_b, gamma, edges }) => ({
    gamma,
    found: negativeIonEdges(alpha_b, gamma),
    // The table counts upward in α_s; the edges come in the order met from the body.
    known: gamma < 1 ? edges : [...edges].reverse(),
  }));

  test("are as many as a scan of the whole map finds, however close two of them lie", () => {
    expect(solved.map(({ found }) => found.length)).toEqual(solved.map(({ known }) => known.length));
    expect(solved.filter(({ known }) => known.length === 3).length).toBeGreaterThan(90);
  });

  test("are known to 1e-10, and to the rounding of the inputs where two nearly meet", () => {
    for (const { gamma, found, known } of solved) {
      known.forEach(({ alpha_s, slope }, k) => {
        const error = Math.abs(found[k] / Number(alpha_s) - 1);
        // An ulp of α_b moves a root by an ulp over the slope of the map, an ulp of γ by (γ−1) drops as much.
        const condition = (1 + Math.abs(gamma - 1) * model.edgeDrop(Number(alpha_s), gamma)) / Math.abs(Number(slope));
        expect(error).toBeLessThan(condition < 1e4 ? 1e-10 : 4 * Number.EPSILON * condition);
      });
    }
  });
});
