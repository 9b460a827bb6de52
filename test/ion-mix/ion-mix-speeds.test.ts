import { describe, expect, test } from "vitest";
import { judgeAll } from "../../functions/cells/verdict";
import { bohmSpeed } from "../../functions/edge/model";
import { IONMIXSPEEDS as entry } from "../../functions/ion-mix/entries";
import { IONMIXSPEEDS } from "../../functions/ion-mix/functions";
import { parseIon, type Ion } from "../../functions/matter/ion";

const column = (...cells: unknown[]) => cells.map((cell) => [cell]);
const ion = (text: string) => parseIon(text) as Ion;
const speeds = (ions: unknown[], fractions: unknown[], rule: any = null) =>
  IONMIXSPEEDS([[3]], column(...ions), column(...fractions), [[rule]]) as any[][];
const problem = (ions: unknown[], fractions: unknown[]) => speeds(ions, fractions)[0][0].message as string;

describe("IONMIXSPEEDS", () => {
  test("one species leaves at its Bohm speed under either rule", () => {
    for (const rule of ["common", "own"]) {
      const [[label, speed, ratio]] = speeds(["Ar^2+"], [0.5], rule);
      expect(label).toBe("Ar^2+");
      expect(speed / bohmSpeed(3, ion("Ar^2+"))).toBeCloseTo(1, 14);
      expect(ratio).toBeCloseTo(1, 14);
    }
  });

  test("by the common rule all leave at the ion sound speed of the mixture", () => {
    // Source: c_s² = Σ (n_j/n_e) c_j², Lee, Hershkowitz & Severn, Appl. Phys. Lett. 91 (2007) 041505 (from memory).
    const [[, first], [, second]] = speeds(["Ar+", "He+"], [0.6, 0.4]);
    expect(first).toBe(second);
    expect(first ** 2 / (0.6 * bohmSpeed(3, ion("Ar+")) ** 2 + 0.4 * bohmSpeed(3, ion("He+")) ** 2)).toBeCloseTo(1, 13);
  });

  test("in an equal mixture of argon and helium argon leaves at 2.34 times its own Bohm speed, helium at 0.74 times", () => {
    // Source: √((1 + M_Ar/M_He)/2) and √((1 + M_He/M_Ar)/2) by hand, 39.948 and 4.0026 u.
    const [[, , argon], [, , helium]] = speeds(["Ar+", "He+"], [0.5, 0.5]);
    expect(argon).toBeCloseTo(Math.sqrt((1 + 39.948 / 4.0026) / 2), 3);
    expect(helium).toBeCloseTo(Math.sqrt((1 + 4.0026 / 39.948) / 2), 4);
  });

  test("by the own rule the rest of the mixture does not matter", () => {
    const [[, argon]] = speeds(["Ar+", "Xe+"], [0.95, 0.05], "own");
    expect(argon).toBe(bohmSpeed(3, ion("Ar+")));
  });

  test("charge enters squared over the mass: doubly charged ions count by Z f", () => {
    const [[, speed]] = speeds(["Xe+", "Xe++"], [0.6, 0.2]);
    const own = bohmSpeed(3, ion("Xe+"));
    // Σ f Z² = 0.6 + 0.8; the two masses differ by an electron.
    expect(speed / own).toBeCloseTo(Math.sqrt(1.4), 5);
  });

  test("blank rows are skipped, whichever way the host writes an empty cell", () => {
    const plain = speeds(["Ar+", "He+"], [0.6, 0.4]);
    expect(speeds(["Ar+", null, "", 0, "He+"], [0.6, null, "", 0, 0.4])).toEqual(plain);
  });

  test("ions may be masses in u, and fractions percentages as text", () => {
    const rows = speeds([39.95, 4], ["60 %", "40 %"]);
    expect(rows.map(([label]) => label)).toEqual(["39.95 u", "4 u"]);
  });

  test("ranges may lie across", () => {
    expect(IONMIXSPEEDS([[3]], [["Ar+", "He+"]], [[0.6, 0.4]])).toEqual(speeds(["Ar+", "He+"], [0.6, 0.4]));
  });

  test("fractions that do not carry the charge are refused with their sum", () => {
    expect(problem(["Ar+", "He+"], [0.6, 0.3])).toBe(
      "fractions: the charges Z f sum to 0.9, not 1; type densities over n_e: divide each by 0.9 if nothing is missing.",
    );
    expect(problem(["Xe+", "Xe++"], [0.8, 0.2])).toMatch(/sum to 1.2, not 1/);
    expect(problem(["Ar+", "He+"], [0, 0])).toMatch(/sum to 0, not 1/);
    expect(problem(["Ar+", "He+"], [0.6, 0.400002])).toMatch(/sum to 1.000002, not 1/);
    expect(speeds(["Ar+", "He+"], [0.6, 0.4000005])).toHaveLength(2);
  });

  test("a fraction or an ion that is missing beside the other is named", () => {
    expect(problem(["Ar+", "He+"], [1, null])).toMatch(/^fractions: the one beside He\+ is blank/);
    expect(problem(["Ar+", null], [0.6, 0.4])).toMatch(/^ions: the one beside 0.4 is blank/);
    expect(problem(["Ar+", "He+"], [1])).toMatch(/^fractions: 1 for 2 ions/);
    expect(problem([null, null], [null, null])).toMatch(/^ions is blank/);
    // Empty cells as some hosts send them.
    expect(problem([0, 0], [0, 0])).toMatch(/^ions: the range is empty/);
  });

  test("text that is no ion, and a fraction beyond 1, are refused as anywhere", () => {
    expect(problem(["argon", "He+"], [0.6, 0.4])).toMatch(/^ions: "argon".*"Ar"/);
    expect(problem(["Ar+", "He+"], [60, 40])).toMatch(/^fractions: 60 is above the highest value/);
    expect(problem(["Ar+", "He+"], [-0.6, 1])).toMatch(/^fractions: -0.6 is below/);
  });

  test("an error in either range passes through", () => {
    expect(speeds(["Ar+", { code: "#N/A", message: "no gas" }], [0.5, 0.5])[0][0]).toMatchObject({ code: "#N/A" });
  });

  test("each rule is judged by how small the minority is, and a lone species by neither", () => {
    const word = (share: number, rule: string) =>
      judgeAll(entry, [3, [ion("Ar+"), ion("He+")], [1 - share, share], rule]).map((each) => each.word);
    expect(word(0.4, "common")).toEqual(["holds"]);
    expect(word(0.05, "common")).toEqual(["marginal"]);
    expect(word(0.001, "common")).toEqual(["fails"]);
    expect(word(0.4, "own")).toEqual(["fails"]);
    expect(word(0.2, "own")).toEqual(["marginal"]);
    expect(word(0.05, "own")).toEqual(["holds"]);
    expect(judgeAll(entry, [3, [ion("Ar+")], [1], "common"])).toEqual([]);
  });
});
