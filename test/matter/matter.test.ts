import { describe, expect, test } from "vitest";
import { constants } from "../../functions/matter/constants";
import { FormulaError, formulaWeight } from "../../functions/matter/formula";
import { electron, ionOfMass, parseIon, type Ion } from "../../functions/matter/ion";

const u = constants.find(({ symbol }) => symbol === "u")!.value;
const massInU = (text: string) => (parseIon(text) as Ion).mass / u;
const message = (text: string) => {
  const problem = parseIon(text) as FormulaError;
  return `${problem.problem}; ${problem.advice ?? ""}`;
};

describe("ions", () => {
  test("digits belong to the formula: N2+ is the molecular ion", () => {
    expect(massInU("N2+") / massInU("N+")).toBeCloseTo(2, 4);
    expect((parseIon("N2+") as Ion).charge).toBe(1);
  });

  test("no sign means singly charged", () => {
    expect(parseIon("Ar")).toEqual(parseIon("Ar+"));
  });

  test.each(["Xe++", "Xe^2+", "Xe+2", "Xe²⁺", "Xe^+2"])("%s is doubly charged xenon", (text) => {
    expect(parseIon(text)).toEqual(parseIon("Xe++"));
    expect((parseIon(text) as Ion).charge).toBe(2);
  });

  test.each(["Xe2+", "Ar2+", "He2+", "Ar2"])("%s is refused with both spellings offered", (text) => {
    const gas = text.slice(0, 2);
    expect(message(text)).toContain(`"${gas}^2+"`);
    expect(message(text)).toContain(`"(${gas}2)+"`);
  });

  test("each electron removed takes its mass along", () => {
    expect((parseIon("Xe+") as Ion).mass - (parseIon("Xe++") as Ion).mass).toBeCloseTo(electron.mass, 34);
  });

  test("parentheses group: (Ar2)+ weighs what two argon atoms weigh", () => {
    expect(massInU("(Ar2)+")).toBeCloseTo(2 * (massInU("Ar+") + electron.mass / u) - electron.mass / u, 8);
    expect(formulaWeight("Si(CH3)4")).toBeCloseTo(formulaWeight("SiC4H12") as number, 10);
  });

  test("a number is the mass of the ion itself", () => {
    expect(ionOfMass(40).mass).toBeCloseTo(40 * u, 35);
  });

  test.each([
    ["argon", "Ar"],
    ["Argon+", "Ar"],
    ["ar+", "Ar"],
    ["HE+", "He"],
    ["Xn+", "Xe"],
  ])("%s suggests %s", (typed, symbol) => {
    expect(message(typed)).toContain(symbol);
  });

  test.each(["", "+", "Ar)", "(Ar", "Ar0+", "2Ar", "O-", "e-", "constructor", "H^3+", "Ar+-"])(
    "%s is refused",
    (text) => {
      expect(parseIon(text)).toBeInstanceOf(FormulaError);
    },
  );
});

describe("masses against IUPAC/CIAAW abridged standard atomic weights (from memory)", () => {
  test.each([
    ["H", 1.008, 2e-4],
    ["He", 4.0026, 1e-5],
    ["N", 14.007, 1e-4],
    ["O", 15.999, 1e-4],
    ["F", 18.998, 1e-4],
    ["Si", 28.085, 2e-4],
    ["Ar", 39.948, 3e-4],
    ["Kr", 83.798, 1e-4],
    ["Xe", 131.293, 1e-4],
    ["W", 183.84, 1e-4],
    ["D", 2.01410178, 1e-8],
  ])("%s weighs %f u", (symbol, weight, tolerance) => {
    expect(Math.abs((formulaWeight(symbol) as number) / weight - 1)).toBeLessThan(tolerance);
  });
});
