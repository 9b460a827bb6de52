import { describe, expect, test } from "vitest";
import { debyeLength } from "../../functions/edge/model";
import { CHILDCURRENT, SHEATHWIDTH, WALLFIELD } from "../../functions/layer/functions";
import * as model from "../../functions/layer/model";
import { bohmEnd, bohmWidth, dropAt, field } from "../../functions/layer/nonlinear-sheath";
import { eps0 } from "../../functions/matter/constants";
import { electron, parseIon, type Ion } from "../../functions/matter/ion";

const cell = (value: unknown) => [[value]] as never;
const argon = parseIon("Ar+") as Ion;
const proton = parseIon("H+") as Ion;

describe("a wall 300 V below the edge of a plasma of 10¹⁶ m⁻³ and 3 eV (recomputed by hand from the equations of LL)", () => {
  test.each([
    ["child", null, 3.22809],
    ["matrix", null, 1.82094],
    ["full", null, 4.64888],
    ["collisional", "0.5 mm", 2.82531],
    ["collisional", "1 mm", 3.24543],
  ])("its sheath by model %s, λ_i %s, is %f mm wide", (word, lambda_i, width) => {
    const [[s]] = SHEATHWIDTH(cell(300), cell(1e16), cell(3), cell(word), cell(lambda_i), cell("mm"));
    expect(s).toBeCloseTo(width, 5);
  });

  test("the field at the wall is 1.149832×10⁵ V/m, whatever sign the drop is typed with", () => {
    expect(WALLFIELD(cell(300), cell(1e16), cell(3))[0][0] / 1e5).toBeCloseTo(1.149832, 6);
    expect(WALLFIELD(cell(-300), cell(1e16), cell(3))[0][0] / 1e5).toBeCloseTo(1.149832, 6);
  });

  test("a millimetre of sheath lets 44.94 A/m² of argon through", () => {
    expect(CHILDCURRENT(cell(300), cell("1 mm"), cell("Ar+"))[0][0]).toBeCloseTo(44.94, 2);
  });
});

describe("Child's law in the numbers of its trade", () => {
  test("the perveance of electrons is 2.33395×10⁻⁶ A V^(−3/2)", () => {
    // Langmuir, Phys. Rev. 2 (1913) 450, and every text on electron guns; digits recomputed.
    expect(model.childCurrent(1, 1, electron) * 1e6).toBeCloseTo(2.33395, 5);
  });

  test("that of protons is 5.45×10⁻⁸ A V^(−3/2)", () => {
    expect(model.childCurrent(1, 1, proton) * 1e8).toBeCloseTo(5.45, 2);
  });

  test("collisions change the current by 1.821 √(λ_i/s)", () => {
    const ratio = model.collisionalCurrent(300, 2e-3, argon, 1e-5) / model.childCurrent(300, 2e-3, argon);
    expect(ratio / Math.sqrt(1e-5 / 2e-3)).toBeCloseTo(1.821, 3);
  });

  test("a matrix sheath is 1.05×10³ √(V/n) cm wide with n in cm⁻³, whatever the temperature", () => {
    // From 743 √(T/n) cm of the NRL Plasma Formulary (from memory): 743 √2 = 1051.
    const n = 1e9;
    expect(((model.matrixWidth(2e4, n * 1e6, 3) * 100) / Math.sqrt(2e4 / n) / 1e3).toFixed(2)).toBe("1.05");
    expect(model.matrixWidth(2e4, 1e15, 30)).toBeCloseTo(model.matrixWidth(2e4, 1e15, 0.3), 12);
  });
});

describe("Child's law as the limit of the nonlinear sheath", () => {
  test.each([
    [5, 0.26],
    [30, 0.52],
    [100, 0.69],
    [1000, 0.9],
  ])("at %f electron temperatures the Child width is the share %f of the full one", (ratio, share) => {
    expect(model.childWidth(3 * ratio, 1e16, 3) / model.fullWidth(3 * ratio, 1e16, 3)).toBeCloseTo(share, 2);
  });

  test("the wall field tends to 4V/(3s) and the capacitance to ε₀/(3s), s the Child width", () => {
    // Child, Phys. Rev. 32 (1911) 492: V ∝ x^(4/3) from the edge; s ∝ V^(3/4) makes the charge go as V^(1/4).
    const off = (V: number) => {
      const s = model.childWidth(V, 1e16, 3);
      return [
        model.wallField(V, 1e16, 3, 1) / ((4 * V) / (3 * s)) - 1,
        model.sheathCapacitance(V, 1e16, 3, 1) / (eps0 / (3 * s)) - 1,
      ].map(Math.abs);
    };
    const [near, far] = [off(3e6), off(3e10)];
    near.forEach((each) => expect(each).toBeLessThan(3e-3));
    far.forEach((each, i) => expect(each).toBeLessThan(0.02 * near[i]));
  });

  test("the width tends to 1.02 (√η − 1/√2)^(1/2) (√η + √2) Debye lengths of the plasma's body", () => {
    // Hutchinson, Principles of Plasma Diagnostics, 2nd ed. 2002, §3.2 (from memory): electrons left out, η counted from
    // the body, half an electron temperature above the edge, where the density is √e of that at the edge.
    const offAt = (eta: number) => {
      const root = Math.sqrt(eta + 0.5);
      const body = 1.02 * Math.sqrt(root - Math.SQRT1_2) * (root + Math.SQRT2) * Math.exp(-0.25);
      return bohmWidth(eta) / body - 1;
    };
    expect(offAt(1e3)).toBeGreaterThan(0.01);
    expect(Math.abs(offAt(1e5))).toBeLessThan(5e-3);
    expect(Math.abs(offAt(1e8))).toBeLessThan(3e-3);
  });
});

describe("the edge of the nonlinear sheath", () => {
  test("at the Bohm speed the potential dies out as 6 T_e (λ_D/x)²", () => {
    // Riemann, J. Phys. D 24 (1991) 493, §2: from Poisson's equation η″ = η² near the edge.
    const off = (x: number) => Math.abs((dropAt(x, 100, 1) * x * x) / 6 - 1);
    expect(off(1e4)).toBeLessThan(1e-2);
    expect(off(1e8)).toBeLessThan(1e-6);
    expect(off(1e14)).toBeLessThan(1e-11);
  });

  test("above it, as an exponential with the decay length λ_D/√(1 − (u_B/u_0)²)", () => {
    // Riemann 1991, the linearised equation; EDGEDECAYLENGTH.
    const decay = 1 / Math.sqrt(1 - 1 / 1.5 ** 2);
    expect(Math.log(dropAt(80, 100, 1.5) / dropAt(90, 100, 1.5)) * decay).toBeCloseTo(10, 9);
  });

  test("the field goes as √(2/3) η^(3/2) at the Bohm speed and linearly above it", () => {
    expect(field(1e-8, 1) / 1e-12).toBeCloseTo(Math.sqrt(2 / 3), 7);
    expect(field(1e-8, 2) / 1e-8).toBeCloseTo(Math.sqrt(3 / 4), 7);
  });

  test("distances count from the wall: SHEATHPOTENTIAL is −V_s there and −0.113 T_e at the full width", () => {
    expect(model.sheathPotential(0, 300, 1e16, 3, 1)).toBe(-300);
    const end = model.sheathPotential(model.fullWidth(300, 1e16, 3), 300, 1e16, 3, 1);
    expect(end / 3).toBeCloseTo(-bohmEnd, 12);
  });

  test("the width scales with the Debye length and the drop with T_e", () => {
    expect(model.fullWidth(20, 1e14, 0.2) / debyeLength(1e14, 0.2)).toBeCloseTo(bohmWidth(100), 12);
  });
});
