import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { judgeAll } from "../../functions/cells/verdict";
import { bodyRatio, edgeFolds, negativeIonEdges } from "../../functions/negative-ions/edges";
import { NEGATIVEIONEDGE as entry } from "../../functions/negative-ions/entries";
import { NEGATIVEIONEDGE } from "../../functions/negative-ions/functions";
import { edgeDrop } from "../../functions/negative-ions/model";
import reference from "../published/negative-ions.json";

const threshold = 5 + Math.sqrt(24);
const edges = (alpha_b: unknown, gamma: unknown) => NEGATIVEIONEDGE([[alpha_b]], [[gamma]]);

describe("NEGATIVEIONEDGE", () => {
  test("several edges need γ above 5+√24 = 9.899", () => {
    // Source: Boyd & Thompson 1959; Lieberman & Lichtenberg. Recomputed: test/published/negative-ions.py.
    expect(threshold).toBeCloseTo(Number(reference.cusp.gamma), 12);
    expect(edgeFolds(threshold - 1e-9)).toBeUndefined();
    expect(edgeFolds(threshold + 1e-9)).toHaveLength(2);
  });

  test("the cusp where three edges meet lies at α_s 0.101021, α_b 1.170064", () => {
    // Source: test/published/negative-ions.py, by root finding on the slope of the map and its derivative.
    const { alpha_s, alpha_b } = reference.cusp;
    expect(1 / threshold).toBeCloseTo(Number(alpha_s), 14);
    expect(bodyRatio(1 / threshold, threshold)).toBeCloseTo(Number(alpha_b), 14);
    expect(negativeIonEdges(Number(alpha_b), threshold).every((root) => Math.abs(root - Number(alpha_s)) < 1e-5)).toBe(
      true,
    );
  });

  test("at γ = 10 the folds are 0.08 and 0.125 exactly", () => {
    // Source: the quadratic of the map's derivative, (γ−1)² − 4γ ± (γ−1)√(γ²−10γ+1) over 4γ² = (41 ± 9)/400.
    const [low, high] = edgeFolds(10)!;
    expect(low).toBeCloseTo(0.08, 15);
    expect(high).toBeCloseTo(0.125, 15);
  });

  test.each(reference.folds)(
    "at γ = $gamma the folds are where the slope of the map vanishes",
    ({ gamma, ...known }) => {
      // Source: test/published/negative-ions.py, by a scan of the slope, without the quadratic.
      edgeFolds(gamma)!.forEach((alpha_s, k) => {
        expect(alpha_s / Number(known.alpha_s[k])).toBeCloseTo(1, 11);
        expect(bodyRatio(alpha_s, gamma) / Number(known.alpha_b[k])).toBeCloseTo(1, 12);
      });
    },
  );

  test("between the folds there are three edges, at a fold two, outside one", () => {
    expect(edges(1.188, 10)).toHaveLength(3);
    expect(edges(1.2, 10)).toHaveLength(1);
    expect(edges(1.18, 10)).toHaveLength(1);
    // Two roots that meet within the rounding of α_b stand as one.
    const [upper, double] = negativeIonEdges(bodyRatio(0.08, 10), 10);
    expect(double).toBeCloseTo(0.08, 12);
    expect(upper).toBeGreaterThan(0.125);
    const [merged, lower] = negativeIonEdges(bodyRatio(0.125, 10), 10);
    expect(merged).toBeCloseTo(0.125, 12);
    expect(lower).toBeLessThan(0.08);
  });

  test("every edge found solves the equation, and every edge is found from its own body", () => {
    const decades = (from: number, to: number) => fc.double({ min: from, max: to, noNaN: true }).map((x) => 10 ** x);
    fc.assert(
      fc.property(decades(-4, 3), decades(-1, 2.5), (alpha_s, gamma) => {
        const alpha_b = bodyRatio(alpha_s, gamma);
        const found = negativeIonEdges(alpha_b, gamma);
        for (const root of found) expect(bodyRatio(root, gamma) / alpha_b).toBeCloseTo(1, 10);
        const nearest = Math.min(...found.map((root) => Math.abs(root / alpha_s - 1)));
        // Near a fold the rounding of α_b moves the root by far more than its own.
        const slope = Math.abs(1 - (alpha_s * (gamma - 1) ** 2) / (2 * (1 + alpha_s * gamma) ** 2));
        expect(nearest).toBeLessThan(Math.min(1e-6, 1e-12 / slope) + 1e-10);
      }),
      { numRuns: 2000, seed: 5 },
    );
  });

  test("the edges come in the order met from the body: drops grow, and α_s falls where negative ions are the colder", () => {
    const rows = edges(2, 15) as number[][];
    expect(rows).toHaveLength(3);
    expect(rows.map(([alpha_s]) => alpha_s)).toEqual([...rows.map(([alpha_s]) => alpha_s)].sort((a, b) => b - a));
    const hot = edges(0.3, 0.05) as number[][];
    expect(hot).toHaveLength(3);
    expect(hot.map(([, drop]) => drop)).toEqual([...hot.map(([, drop]) => drop)].sort((a, b) => a - b));
  });

  test("the drop carries α_b to α_s through the Boltzmann factors of both species", () => {
    for (const [alpha_s, drop, edge_ratio, speed] of edges(1.188, 10) as number[][]) {
      expect((alpha_s * Math.exp(-drop)) / Math.exp(-10 * drop)).toBeCloseTo(1.188, 9);
      expect(edge_ratio).toBeCloseTo(Math.exp(-drop), 15);
      expect(speed ** 2 / 2).toBeCloseTo(drop, 14);
    }
  });

  test("without negative ions the edge is the plain one: half an electron temperature, exp(−½), the Bohm speed", () => {
    expect(edges(0, 20)).toEqual([[0, 0.5, Math.exp(-0.5), 1]]);
    const [[alpha_s, drop]] = edges(1e-12, 5) as number[][];
    expect(alpha_s).toBeLessThan(1e-12);
    expect(drop).toBeCloseTo(0.5, 10);
  });

  test("negative ions as hot as the electrons change nothing but the count of negative charges", () => {
    const [[alpha_s, drop]] = edges(3, 1) as number[][];
    expect(alpha_s).toBeCloseTo(3, 14);
    expect(drop).toBeCloseTo(0.5, 15);
  });

  test("with negative ions in excess the edge drop is half their temperature", () => {
    // Source: Boyd & Thompson 1959, the limit of a plasma without electrons.
    expect(edgeDrop(1e9, 20)).toBeCloseTo(0.5 / 20, 10);
  });

  test("cold negative ions vanish from the edge without a failure", () => {
    const [[alpha_s, drop]] = edges(1, 1e6) as number[][];
    expect(alpha_s).toBe(0);
    expect(drop).toBe(0.5);
  });

  test("a column of bodies with one edge each gives a column of rows", () => {
    expect(NEGATIVEIONEDGE([[0.1], [1], [10]], [[5]])).toHaveLength(3);
  });

  test("one edge holds, three fail", () => {
    const word = (alpha_b: number) => judgeAll(entry, [alpha_b, 10])[0].word;
    expect([1.18, 1.188, 1.2].map(word)).toEqual(["holds", "fails", "holds"]);
  });

  test("a temperature ratio out of reach is refused with its bound", () => {
    expect((edges(1, 1e7)[0][0] as { message: string }).message).toMatch(/gamma.*at most 1e6/);
    expect((edges(1, 0)[0][0] as { message: string }).message).toMatch(/gamma is blank/);
  });
});
