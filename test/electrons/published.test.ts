import { describe, expect, test } from "vitest";
import { judgeAll } from "../../functions/cells/verdict";
import * as entries from "../../functions/electrons/entries";
import { EEPFFLOATING, EEPFMOMENTS, HOTELECTRONPOTENTIAL } from "../../functions/electrons/functions";
import { twoGroupFloatingPotential } from "../../functions/electrons/model";
import { e, m_e } from "../../functions/matter/constants";
import { parseIon, type Ion } from "../../functions/matter/ion";
import { bodyRatio } from "../../functions/negative-ions/edges";
import { floatingPotential } from "../../functions/wall/model";

const argon = parseIon("Ar+") as Ion;
const hydrogen = parseIon("H+") as Ion;

const column = (values: unknown[]) => values.map((value) => [value]);
const grid = (first: number, step: number, count: number) => Array.from({ length: count }, (_, i) => first + i * step);

/** Maxwellian probability function, n (2/√π) T^(−3/2) exp(−E/T): LL. */
const maxwellian = (n: number, T: number) => (E: number) =>
  ((2 * n) / Math.sqrt(Math.PI) / T ** 1.5) * Math.exp(-E / T);

describe("two groups of electrons", () => {
  test("5 % of 30 eV electrons drag an argon wall from 3 eV to −84.34 V", () => {
    // By hand: ½ ln(M/(2πm)) = 4.6789, T_s = 3.14136 eV, so −30 ln(0.05 √(30/3.14136) · e^4.6789) = −84.344 V, and the cold
    // group adds e^−28 of the current. An atomic weight of 39.95 in place of 39.948 would give −84.345 V.
    const V = HOTELECTRONPOTENTIAL([[3]], [[30]], [["5 %"]], [["Ar+"]])[0][0];
    expect(V).toBeCloseTo(-84.344, 3);
    const hotAlone = -30 * Math.log(0.05 * Math.sqrt((30 / 3.1413613) * (argon.mass / (2 * Math.PI * m_e))));
    expect(V).toBeCloseTo(hotAlone, 5);
  });

  test("one group alone floats where the plain sheath does, at either end and with equal temperatures", () => {
    const plain = floatingPotential(3, argon, 0, 0);
    expect(twoGroupFloatingPotential(3, 30, 0, argon)).toBeCloseTo(plain, 13);
    expect(twoGroupFloatingPotential(0.5, 3, 1, argon)).toBeCloseTo(plain, 13);
    expect(twoGroupFloatingPotential(3, 3, 0.37, argon)).toBeCloseTo(plain, 13);
  });

  test("the order of the groups doesn't matter", () => {
    expect(twoGroupFloatingPotential(30, 3, 0.95, argon)).toBeCloseTo(
      twoGroupFloatingPotential(3, 30, 0.05, argon),
      11,
    );
  });

  test("a share of 1e-12 still moves the wall once the group is hot enough to outrun the cold one", () => {
    expect(twoGroupFloatingPotential(3, 1e4, 1e-12, argon)).toBeLessThan(floatingPotential(3, argon, 0, 0));
    expect(twoGroupFloatingPotential(3, 1e6, 1e-12, argon)).toBeGreaterThan(-3 * Math.log(1e12) * 10);
  });

  test("5 % in the body is 7.87 % at the edge, which is what the function wants", () => {
    // Cold and hot electrons as two Boltzmann groups: n_cold/n_hot falls from 19 in the body to (1 − 0.0787)/0.0787.
    expect(bodyRatio((1 - 0.0787) / 0.0787, 10)).toBeCloseTo(0.95 / 0.05, 1);
  });

  test("ions too light for a floating wall are refused", () => {
    expect(HOTELECTRONPOTENTIAL([[3]], [[30]], [[0.05]], [[0.002]])[0][0]).toMatchObject({ code: "#N/A" });
  });

  test("a share above 1 is refused, and a share of 0 is a value", () => {
    expect(HOTELECTRONPOTENTIAL([[3]], [[30]], [[5]], [["Ar+"]])[0][0].message).toMatch(/^hot_fraction: 5 is above/);
    expect(HOTELECTRONPOTENTIAL([[3]], [[30]], [[0]], [["Ar+"]])[0][0]).toBeCloseTo(-14.037, 3);
  });

  test("the edge is one of several only above a ratio of 5+√24 and between the folds", () => {
    const word = (T_c: number, T_h: number, hot: number) =>
      judgeAll(entries.HOTELECTRONPOTENTIAL, [T_c, T_h, hot, hydrogen])[0].word;
    expect(word(3, 30, 0.05)).toBe("holds");
    // α_s = n_cold/n_hot = 0.1 lies between the folds 0.08 and 0.125 of γ = 10.
    expect(word(3, 30, 1 / 1.1)).toBe("fails");
    expect(word(30, 3, 0.1 / 1.1)).toBe("fails");
    expect(word(3, 29, 1 / 1.1)).toBe("holds");
  });
});

describe("moments in closed form", () => {
  test("a Maxwellian of 3 eV gives back its density and 3 eV twice, in any spacing", () => {
    for (const energy of [grid(0.3, 0.75, 60), grid(0, 0.4, 100), grid(1, 1, 60).map((x) => 0.01 * x ** 2)]) {
      const [row] = EEPFMOMENTS(column(energy), column(energy.map(maxwellian(1e16, 3))));
      expect(row[0] / 1e16).toBeCloseTo(1, 12);
      expect(row[2]).toBeCloseTo(4.5, 12);
      expect(row[4]).toBeCloseTo(3, 12);
      expect(row[6]).toBeCloseTo(3, 12);
      // ¼ n √(8eT/(πm)), kinetic theory.
      expect(row[8] / (0.25e16 * Math.sqrt((24 * e) / (Math.PI * m_e)))).toBeCloseTo(1, 12);
    }
  });

  test("a Druyvesteyn function of E₀ has T_eff = 0.493113 E₀ and a screening temperature of 0.675978 E₀", () => {
    const energy = grid(0, 0.02, 1200);
    const [row] = EEPFMOMENTS(column(energy), column(energy.map((E) => 1e15 * Math.exp(-((E / 6) ** 2)))));
    expect(row[4] / 6).toBeCloseTo(0.493113, 5);
    expect(row[6] / 6).toBeCloseTo(0.675978, 5);
    // Its Bohm speed is 1.17083 times that of T_eff.
    expect(Math.sqrt(row[6] / row[4])).toBeCloseTo(1.17083, 5);
  });

  test("the error of a coarse Druyvesteyn table is covered by the stated one, and quarters when the spacing halves", () => {
    const errors = [0.6, 0.3].map((step) => {
      const energy = grid(0, step, 20 / step);
      const [row] = EEPFMOMENTS(column(energy), column(energy.map((E) => 1e15 * Math.exp(-((E / 6) ** 2)))));
      const error = Math.abs(row[4] - 0.4931133 * 6);
      expect(error).toBeLessThan(row[5]);
      return error;
    });
    expect(errors[0] / errors[1]).toBeGreaterThan(3);
    expect(errors[0] / errors[1]).toBeLessThan(5);
  });

  test("a Maxwellian floats where the plain sheath does", () => {
    const energy = grid(0.2, 0.5, 120);
    const eepf = energy.map(maxwellian(1e16, 3));
    for (const ion of ["H+", "Ar+", "Xe++"]) {
      const V = EEPFFLOATING(column(energy), column(eepf), [[ion]])[0][0];
      expect(V).toBeCloseTo(floatingPotential(3, parseIon(ion) as Ion, 0, 0), 10);
    }
  });

  test("two Maxwellian groups float where HOTELECTRONPOTENTIAL says", () => {
    const energy = grid(0, 0.05, 6000);
    const [cold, hot] = [maxwellian(0.95e16, 3), maxwellian(0.05e16, 30)];
    const V = EEPFFLOATING(column(energy), column(energy.map((E) => cold(E) + hot(E))), [["Ar+"]])[0][0];
    expect(V / twoGroupFloatingPotential(3, 30, 0.05, argon)).toBeCloseTo(1, 5);
  });
});

describe("a table as an instrument writes it", () => {
  const energy = grid(0.5, 0.5, 80);
  const eepf = energy.map(maxwellian(1e16, 3));
  const clean = EEPFMOMENTS(column(energy), column(eepf))[0];
  const notes = (row: any[]) => row.at(-1) as string;

  test("the unit may stand in the cells or in the heading", () => {
    const typed = eepf.map((F) => `${F / 1e6} eV^-3/2 cm^-3`);
    expect(EEPFMOMENTS(column(energy), column(typed))[0][0] / 1e16).toBeCloseTo(1, 10);
    const headed = ["F (eV^-1.5 cm^-3)", ...eepf.map((F) => F / 1e6)];
    const row = EEPFMOMENTS(column(["E (eV)", ...energy]), column(headed))[0];
    expect(row[0] / 1e16).toBeCloseTo(1, 10);
    expect(notes(row)).toMatch(/eepf read in eV\^-1.5 cm\^-3, as its heading says/);
  });

  test("a column that is no probability function is refused by its unit", () => {
    const [[refused]] = EEPFMOMENTS(column(energy), column(eepf.map((F) => `${F} eV^-1 m^-3`)));
    expect(refused).toMatchObject({ code: "#VALUE!", message: expect.stringMatching(/^Row 1, eepf: /) });
  });

  test("order, repeated energies, blank rows, and words for no reading change nothing but the remarks", () => {
    const rows: unknown[][] = energy.map((E, i) => [E, eepf[i]]).reverse();
    rows.splice(20, 0, [null, null], ["", ""], [0, 0], [7.25, "OL"], [8.25, null]);
    rows.push(rows[3], rows[4]);
    const row = EEPFMOMENTS(
      rows.map(([E]) => [E]),
      rows.map(([, F]) => [F]),
    )[0];
    clean.slice(0, 12).forEach((value, k) => {
      if (k % 2 === 0) expect(row[k] / value).toBeCloseTo(1, 12);
    });
    expect(notes(row)).toMatch(/2 rows without a reading left out \("OL"\)/);
    expect(notes(row)).toMatch(/rows sorted by energy/);
    expect(notes(row)).toMatch(/2 repeated energies averaged/);
  });

  test("an #N/A in one row is no reading; any other error names its row", () => {
    const missing = column(eepf.map((F, i) => (i === 30 ? { code: "#N/A" } : F)));
    expect(EEPFMOMENTS(column(energy), missing)[0][0] / 1e16).toBeCloseTo(1, 6);
    const broken = column(eepf.map((F, i) => (i === 30 ? { code: "#DIV/0!" } : F)));
    expect(EEPFMOMENTS(column(energy), broken)[0][0].message).toMatch(/^eepf: row 31 holds an error/);
  });

  test("points below zero energy are left out, negative values kept, and both said", () => {
    const row = EEPFMOMENTS(
      column([-1, -0.5, ...energy]),
      column([1e14, 3e14, ...eepf.map((F, i) => (i === 40 ? -F : F))]),
    )[0];
    expect(notes(row)).toMatch(/2 rows below zero energy left out/);
    expect(notes(row)).toMatch(/1 negative value kept/);
    expect(row[0] / 1e16).toBeCloseTo(1, 2);
  });

  test("what continues the function at both ends is said, with its share", () => {
    expect(notes(clean)).toMatch(/no point at zero energy: continued along the slope from 0.5 eV/);
    expect(notes(clean)).toMatch(/ends at 40 eV: continued exponentially with 3 eV/);
  });

  test("columns of different length, too few energies, and a function without a positive value are refused", () => {
    expect(EEPFMOMENTS(column(energy), column(eepf.slice(1)))[0][0].message).toMatch(
      /^eepf: 79 cells do not match the 80/,
    );
    expect(EEPFMOMENTS(column([1, 2, 3]), column([3, 2, 1]))[0][0].message).toMatch(/only 3 different energies/);
    expect(EEPFMOMENTS(column(energy), column(eepf.map((F) => -F)))[0][0].message).toMatch(/no value is above 0/);
  });

  test("a function that does not fall at its end has no tail to continue", () => {
    const [[refused]] = EEPFMOMENTS(column(energy), column(energy.map((E) => 1e14 * (1 + E))));
    expect(refused).toMatchObject({ code: "#N/A", message: expect.stringMatching(/does not clearly fall/) });
  });

  test("negative values that outweigh the positive ones leave no density", () => {
    const [[refused]] = EEPFMOMENTS(
      column(grid(0, 0.5, 80)),
      column(grid(0, 0.5, 80).map((E) => (E - 8) * Math.exp(-E / 3))),
    );
    expect(refused).toMatchObject({ code: "#N/A", message: expect.stringMatching(/negative values outweigh/) });
  });

  test("an empty pair of columns gives an empty cell", () => {
    expect(EEPFMOMENTS([[null], [""]], [[null], [""]])).toEqual([[""]]);
  });

  test("a tail measured too short gives the bound instead of a potential", () => {
    const short = energy.filter((E) => E <= 20);
    const [[refused]] = EEPFFLOATING(column(short), column(short.map(maxwellian(1e16, 3))), [["Ar+"]]);
    expect(refused.code).toBe("#N/A");
    // |V| = 14.04 V and five times 3 eV beyond.
    expect(refused.message).toMatch(/near -14 V, but the function is known only to 20 eV; measure it to 29 eV/);
  });

  test("a column of ions is one column of potentials", () => {
    const V = EEPFFLOATING(column(energy), column(eepf), [["H+"], ["nonsense"], ["D+"]]);
    expect(V[0][0]).toBeCloseTo(floatingPotential(3, hydrogen, 0, 0), 10);
    expect(V[1][0]).toMatchObject({ code: "#VALUE!" });
    expect(V[2][0]).toBeCloseTo(floatingPotential(3, parseIon("D+") as Ion, 0, 0), 10);
  });
});
