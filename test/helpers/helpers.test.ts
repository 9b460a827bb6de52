import { describe, expect, test } from "vitest";
import { frontDoors } from "../../functions/front-doors";

const one = (name: string, ...cells: unknown[]) => frontDoors[name](...cells.map((cell) => [[cell]]))[0][0];

describe("UNIT", () => {
  test("without a target gives the unit these functions read", () => {
    expect(one("UNIT", 1e11, "cm^-3")).toBe(1e17);
    expect(one("UNIT", 200, "gauss")).toBeCloseTo(0.02, 15);
    expect(one("UNIT", 2.33, "g/cm3")).toBeCloseTo(2330, 10);
    expect(one("UNIT", 300, "Vpp")).toBe(150);
  });

  test("1 Torr is 133.322 Pa (NIST SP 811, from memory)", () =>
    expect(one("UNIT", 1, "Torr", "Pa")).toBeCloseTo(133.322, 3));

  test("1 eV is 11604.518 K (CODATA 2022)", () => expect(one("UNIT", 1, "eV", "K")).toBeCloseTo(11604.518, 3));

  test("25 °C is 298.15 K, and back", () => {
    expect(one("UNIT", 25, "°C", "K")).toBe(298.15);
    expect(one("UNIT", 298.15, "K", "degC")).toBe(25);
  });

  test("there and back is the same number", () => {
    for (const [a, b] of [
      ["mTorr", "Pa"],
      ["cm^-3", "m^-3"],
      ["Å/min", "nm/s"],
      ["eV", "K"],
      ["°C", "K"],
      ["mA/cm2", "A/m^2"],
    ]) {
      expect(one("UNIT", one("UNIT", 12.5, a, b), b, a)).toBeCloseTo(12.5, 10);
    }
  });

  test("a number that carries its own percent sign is not converted twice", () => {
    expect(one("UNIT", "5 %", "%").message).toMatch(/type the number alone/);
    expect(one("UNIT", 5, "%")).toBe(0.05);
  });

  test("cycles and radians are not interchanged silently", () => {
    expect(one("UNIT", 1, "Hz", "rad/s").message).toMatch(/write the factor 2π into the formula/);
  });
});

describe("IONMASS", () => {
  test("a proton weighs its CODATA mass to the digits that atomic weights of natural hydrogen allow", () => {
    expect(one("IONMASS", "H+") / 1.67262192595e-27).toBeCloseTo(1, 3);
  });

  // The binding energy of the electron, 1.5e-8 u, is left out.
  test("deuterons weigh 2.013553 u (CODATA 2022)", () =>
    expect(one("IONMASS", "D+", "u")).toBeCloseTo(2.013553212544, 7));

  test("argon weighs 39.947 u without its electron", () => expect(one("IONMASS", "Ar+", "u")).toBeCloseTo(39.9475, 3));
});

test("CONSTANT gives SI values by symbol, in any case", () => {
  expect(one("CONSTANT", "k_b")).toBe(1.380649e-23);
  expect(one("CONSTANT", "N_A")).toBe(6.02214076e23);
});

test("ABOUT counts the functions there are", () => {
  const rows = Object.fromEntries(frontDoors.ABOUT());
  expect(rows.functions).toBe(Object.keys(frontDoors).length);
  expect(rows.constants).toBe("CODATA 2022");
});
