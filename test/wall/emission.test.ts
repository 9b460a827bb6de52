import { describe, expect, test } from "vitest";
import { emissionYield } from "../../functions/wall/emission-yield";
import { EMISSIONYIELD, EROSIONRATE, IONEMISSION, RICHARDSONCURRENT } from "../../functions/wall/functions";
import { richardsonConstant } from "../../functions/wall/model";

const one = (value: unknown) => [[value]];
const call = (f: (...cells: any[]) => any[][], ...cells: unknown[]) => f(...cells.map(one))[0][0];

describe("thermionic emission", () => {
  test("Richardson's constant is 120.17 A cm⁻² K⁻² (Dushman's 120, in every textbook)", () => {
    expect(richardsonConstant / 1e4).toBeCloseTo(120.17, 2);
  });

  test("4.5 eV at 2500 K gives 6.369×10³ A/m² (recomputed)", () => {
    expect(call(RICHARDSONCURRENT, 2500, 4.5) / 1e3).toBeCloseTo(6.369, 3);
  });

  test("tungsten practice, 60.2 A cm⁻² K⁻² and 4.52 eV, gives 2.91×10³ A/m² at 2500 K (from memory)", () => {
    expect(call(RICHARDSONCURRENT, 2500, 4.52, "60.2 A cm^-2 K^-2") / 1e3).toBeCloseTo(2.91, 2);
  });

  test("ln(J/T²) falls on a straight line against 1/T, with slope −eW/k_B", () => {
    const height = (T: number) => Math.log(call(RICHARDSONCURRENT, T, 4.5) / T ** 2);
    const slope = (height(2500) - height(1500)) / (1 / 2500 - 1 / 1500);
    expect(-slope / (4.5 * 11604.518)).toBeCloseTo(1, 7); // e/k_B in K/V, CODATA
  });

  test("a wall temperature in °C is converted", () => {
    expect(call(RICHARDSONCURRENT, "2226.85 °C", 4.5)).toBeCloseTo(6369.23, 1);
  });
});

describe("emission by electrons", () => {
  test("slow electrons see the straight start of the curve: 2 e² δ_max T_e/E_max", () => {
    expect(emissionYield(1e-8, 2.4, 300) / (2 * Math.E ** 2 * 2.4 * (1e-8 / 300))).toBeCloseTo(1, 4);
  });

  test("fast electrons see its integral only: 3.75 e² δ_max (E_max/T_e)²", () => {
    expect(emissionYield(1e8, 2.4, 300) / (3.75 * Math.E ** 2 * 2.4 * (300 / 1e8) ** 2)).toBeCloseTo(1, 4);
  });

  test("the mean stays below the peak, wherever the temperature is", () => {
    for (let T = 1e-3; T < 1e6; T *= 1.3) expect(emissionYield(T, 1, 300)).toBeLessThan(1);
  });

  test("its two methods meet without a step where one takes over from the other", () => {
    const T = 0.36 * 300;
    const [below, above] = [emissionYield(T * (1 - 1e-9), 1, 300), emissionYield(T * (1 + 1e-9), 1, 300)];
    expect(Math.abs(above / below - 1)).toBeLessThan(1e-8);
  });

  test("it is in proportion to the largest yield and depends on T_e/E_max alone", () => {
    expect(call(EMISSIONYIELD, 20, 4.8, 300)).toBeCloseTo(2 * call(EMISSIONYIELD, 20, 2.4, 300), 14);
    expect(call(EMISSIONYIELD, 40, 2.4, 600)).toBeCloseTo(call(EMISSIONYIELD, 20, 2.4, 300), 14);
  });
});

describe("emission by ions", () => {
  test("Ar+ on tungsten is within a fifth of the 0.095 measured (Hagstrum 1954, from memory)", () => {
    expect(Math.abs(call(IONEMISSION, 15.76, 4.55) / 0.095 - 1)).toBeLessThan(0.2);
  });

  test("He+ on tungsten is within a fifth of the 0.29 measured (Hagstrum 1954, from memory)", () => {
    expect(Math.abs(call(IONEMISSION, 24.59, 4.55) / 0.29 - 1)).toBeLessThan(0.2);
  });

  test("there is none where neutralisation cannot free a second electron", () => {
    expect(call(IONEMISSION, 5.14, 4.5)).toBe(0);
  });
});

describe("erosion", () => {
  test("1 mA/cm² at one atom per ion takes 1.25 nm/s off silicon, which has 5.0×10²² atoms per cm³ (handbooks, from memory)", () => {
    const flux = 10 / 1.602176634e-19;
    expect(call(EROSIONRATE, flux, 1, "Si", 2330, "nm/s")).toBeCloseTo(6.2415e15 / 5e22 / 1e-7, 2);
  });

  test("10²⁰ ions at 0.5 on silicon of 2330 kg/m³ take 60.05 nm/min (by hand)", () => {
    expect(call(EROSIONRATE, 1e20, 0.5, "Si", 2330, "nm/min")).toBeCloseTo(60.05, 2);
  });

  test("a mixture goes by the mean mass of its formula unit in u", () => {
    expect(call(EROSIONRATE, 1e20, 0.5, 28.085, 2330) / call(EROSIONRATE, 1e20, 0.5, "Si", 2330)).toBeCloseTo(1, 4);
  });

  test.each([
    ["silicon", /"silicon" is a name; type the symbol "Si"/],
    ["Sx", /no element "Sx"/],
    [true, /formula: .*type a formula such as "Si"/],
    [-3, /no mass of a formula unit; type a formula/],
  ])("%s as the surface is refused with what to type", (formula, message) => {
    expect(call(EROSIONRATE, 1e20, 0.5, formula, 2330).message).toMatch(message);
  });
});
