import { describe, expect, test } from "vitest";
import { LIMITCHECK, REGIME } from "../../functions/checks/functions";

const regime = (...cells: unknown[]) =>
  (REGIME as (...args: any[]) => any[][])(...cells.map((cell) => (cell === undefined ? null : [[cell]])));
const verdicts = (...cells: unknown[]) => regime(...cells).map((row) => row[4]);
const assumptions = [
  "collisionless sheath",
  "cold ions",
  "thin sheath",
  "unmagnetised sheath",
  "steady or RF-averaged",
  "quasi-neutral body",
];
/** So that the edge has 10¹⁶ m⁻³, where the sheath's width at 300 V and 3 eV is 4.64888 mm. */
const n_e = 1e16 * Math.exp(0.5);
const s = 4.64888e-3;

describe("the regime of a plasma and its wall", () => {
  test("always has the same rows, whatever is given", () => {
    for (const cells of [
      [1e16, 3, "Ar+"],
      [1e16, 3, "Ar+", 0.7],
      [1e16, 3, "Ar+", 0.7, 0.1, 300, 0.1, 0.01, 1e3],
    ]) {
      expect(regime(...cells).map((row) => row[0])).toEqual(assumptions);
      expect(regime(...cells).every((row) => row.length === 5)).toBe(true);
    }
  });

  test("says what each row still needs", () => {
    expect(verdicts(1e16, 3, "Ar+")).toEqual([
      "not tested: give p and V_s",
      "not tested: give T_i",
      "not tested: give size and V_s",
      "not tested: give B and V_s",
      "not tested: give f",
      "not tested: give size",
    ]);
  });

  test("an empty cell that arrives as 0 is not taken for cold ions, no field or a wall without a sheath", () => {
    expect(verdicts(1e16, 3, "Ar+", 0, 0, 0, 0, 0, 0, 0)).toEqual(verdicts(1e16, 3, "Ar+"));
  });

  test("needs the mean free path where the ion's own gas has no cross-section here", () => {
    expect(verdicts(1e16, 3, "N2+", 0.7, undefined, 300)[0]).toBe("not tested: give lambda_i");
    expect(verdicts(1e16, 3, "N2+", undefined, undefined, 300)[0]).toBe("not tested: give lambda_i");
    expect(verdicts(1e16, 3, "N2+", 0.7, undefined, 300, undefined, undefined, undefined, 0.1)[0]).toBe("holds");
  });

  test("measures lengths against the sheath with its electrons, at the edge's density", () => {
    const rows = regime(n_e, 3, "Ar+", 0.7, 0.3, 300, 0.1, 0.01);
    // k_B 300 K/(0.7 Pa · 10⁻¹⁸ m²)
    expect(rows[0][2]).toBeCloseTo((1.380649e-23 * 300) / 0.7e-18 / s, 5);
    expect(rows[1][2]).toBeCloseTo(0.1, 12);
    expect(rows[2][2]).toBeCloseTo(0.1 / s, 3);
    // u_B over ω_ci = eB/M, argon ions of 39.9477 u
    expect(rows[3][2]).toBeCloseTo(2691.83 / ((1.602176634e-19 * 0.01) / (39.9477 * 1.66053907e-27)) / s, 2);
    // 7.43×10² √(T/n) cm, NRL (from memory)
    expect(rows[5][2]).toBeCloseTo(0.1 / (7.43 * Math.sqrt(3 / (n_e / 1e6))), -1);
  });

  test("a floating wall has 4.68 electron temperatures in argon, and needs no voltage", () => {
    expect(regime(1e16, 3, "Ar+", 0.7, undefined, "floating")[0][2]).toBeCloseTo(
      regime(1e16, 3, "Ar+", 0.7, undefined, 4.6789 * 3)[0][2],
      3,
    );
  });

  test("doubly charged ions turn √2 tighter in the field, and answer √2 faster", () => {
    const [once, twice] = ["Ar+", "Ar^2+"].map((ion) => regime(n_e, 3, ion, null, null, 300, null, 0.01, 1e8));
    // √(Z T_e M)/(ZB), and ω_pi = √(Z e² n_e/(ε₀M))
    expect(once[3][2] / twice[3][2]).toBeCloseTo(Math.SQRT2, 4);
    expect(once[4][2] / twice[4][2]).toBeCloseTo(Math.SQRT2, 4);
  });

  test("ions that collide within the sheath make it fail", () => {
    expect(verdicts(n_e, 3, "Ar+", 5, undefined, 300)[0]).toBe("fails: ions collide inside the sheath");
  });
});

describe("a driven sheath", () => {
  // f_pi of argon at 10¹⁶ m⁻³: 1.32×10³ √(n/μ) rad/s, n in cm⁻³ (NRL, from memory)
  const f_pi = (1.32e3 * Math.sqrt(1e10 / 39.66)) / (2 * Math.PI);
  const row = (f: number) => regime(n_e, 3, "Ar+", undefined, undefined, undefined, undefined, undefined, f)[4];

  test("is steady well below the ion plasma frequency and averaged well above it", () => {
    expect(row(0.05 * f_pi).slice(3)).toEqual(["holds up to 0.1, fails above 0.3", "holds"]);
    expect(row(5 * f_pi).slice(3)).toEqual(["holds from 3 up, fails below 1", "holds"]);
    expect(row(5 * f_pi)[2]).toBeCloseTo(5, 1);
  });

  test("is neither in between", () => {
    const words = [0.2, 0.4, 0.54, 0.56, 0.9, 2].map((ratio) => row(ratio * f_pi)[4].split(":")[0]);
    expect(words).toEqual(["marginal", "fails", "fails", "fails", "fails", "marginal"]);
  });
});

test("the same assumptions are checked down a column", () => {
  const column = LIMITCHECK([["REGIME"]], [[n_e], [n_e]], [[3]], [["Ar+"]], [[0.1], [5]], [[0.1]], [[300]]);
  expect(column[0][0]).toBe("holds");
  expect(column[1][0]).toMatch(/^fails: ions collide inside the sheath: λ_i\/s 0\.178 \(3…1\)$/);
});
