import { describe, expect, test } from "vitest";
import { currentAbove, numberAbove } from "../../functions/electrons/crossing";
import { EEPFFLOATING, EEPFMOMENTS } from "../../functions/electrons/functions";
import { twoGroupFloatingPotential } from "../../functions/electrons/model";
import { addPiece } from "../../functions/electrons/product-integration";
import { u } from "../../functions/matter/constants";
import reference from "../published/electrons.json";

// Source of all: mpmath at 50 digits, test/published/electrons.py.

const off = (value: number, exact: string) => Math.abs(value / Number(exact) - 1);
const column = (values: number[]) => values.map((value) => [value]);

describe("with two groups of electrons", () => {
  test("the floating potential is solved to 1e-13 for any ratio of temperatures and any share", () => {
    for (const { inputs, value } of reference.hot) {
      const [T_c, T_h, hot, mass, charge] = inputs;
      const V = twoGroupFloatingPotential(T_c, T_h, hot, { mass: mass * u, charge, label: "" });
      expect(off(V, value), JSON.stringify(inputs)).toBeLessThan(1e-13);
    }
  });
});

describe("with a probability function that is exponential between its points", () => {
  test("the five moments are those of incomplete gamma functions to 1e-11", () => {
    for (const { energy, F, values } of reference.eepf) {
      const [row] = EEPFMOMENTS(column(energy), column(F));
      [0, 2, 4, 6, 8].forEach((at, k) => expect(off(row[at], values[k])).toBeLessThan(1e-11));
    }
  });

  test("a wall floats where the exact currents balance, to 1e-11", () => {
    for (const { energy, F, mass, values } of reference.eepf) {
      const [[V]] = EEPFFLOATING(column(energy), column(F), [[mass]]);
      expect(off(V, values[5])).toBeLessThan(1e-11);
    }
  });
});

describe("with a straight piece", () => {
  test("the integrals with all four weights, the singular one included, are exact to 1e-14 of their scale", () => {
    for (const { piece, V, values, scales } of reference.straight) {
      const [a, b, F_a, F_b] = piece;
      const straight = { a, b, F_a, F_b, exponential: false };
      const sums = new Float64Array(4);
      addPiece(straight, sums);
      const found = [...sums, numberAbove(straight, V), currentAbove(straight, V)];
      found.forEach((value, k) => expect(Math.abs(value - Number(values[k])) / scales[k]).toBeLessThan(1e-14));
    }
  });
});
