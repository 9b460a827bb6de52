import { describe, expect, test } from "vitest";
import { IONTRANSITTIME, PULSEDWIDTH } from "../../functions/layer/functions";
import * as model from "../../functions/layer/model";
import { e } from "../../functions/matter/constants";
import { parseIon, type Ion } from "../../functions/matter/ion";

const nitrogen = parseIon("N2+") as Ion;
const xenon2 = parseIon("Xe^2+") as Ion;
const cell = (value: unknown) => [[value]];

describe("PULSEDWIDTH", () => {
  test("it begins as the matrix sheath: 4.70 cm at 20 kV in 10⁹ cm⁻³", () => {
    // √(2ε₀V/(en)), by hand.
    const [[s]] = PULSEDWIDTH(cell("20 kV"), cell("1e9 cm^-3"), cell(3), cell("N2+"), cell(0), cell("cm"));
    expect(s).toBeCloseTo(4.7, 2);
  });

  test.each([
    ["N2+", nitrogen],
    ["Xe²⁺", xenon2],
  ])("a growing sheath of %s uncovers just the ions that Child's law carries off", (_name, ion) => {
    // e n ds/dt = J: what the law is made from (Lieberman 1989); n_edge counts charges for any Z.
    const [V, n, T, t] = [2e4, 1e15, 3, 1e-6];
    const width = (time: number) => model.pulsedWidth(V, n, T, ion, time);
    const speed = (width(1.0001 * t) - width(0.9999 * t)) / (2e-4 * t);
    expect((e * n * speed) / model.childCurrent(V, width(t), ion)).toBeCloseTo(1, 6);
  });

  test("it stops at the Child width, and where that is the narrower one it never grows", () => {
    expect(model.pulsedWidth(2000, 1e15, 3, nitrogen, 1)).toBe(model.childWidth(2000, 1e15, 3));
    expect(model.pulsedWidth(20, 1e15, 3, nitrogen, 1e-5)).toBe(model.matrixWidth(20, 1e15, 3));
  });

  test("the inflow that is left out costs 6 % at half the Child width and 22 % at all of it", () => {
    // With it, artanh y − y = u_B t/s_C; without, y³ = 3 u_B t/s_C.
    const withInflow = (y: number) => Math.atanh(y) - y;
    expect(Math.cbrt(3 * withInflow(0.5)) / 0.5).toBeCloseTo(1.06, 2);
    expect(withInflow(1 / 1.224)).toBeCloseTo(1 / 3, 2);
    expect(withInflow(0.995)).toBeCloseTo(2, 2);
  });
});

describe("IONTRANSITTIME", () => {
  test("an ion that follows Child's law takes three times as long as one at full speed all the way", () => {
    // LL; space-charge-limited diodes: 3d/v, against 2d/v under a uniform field.
    const full = 1e-3 / Math.sqrt((2 * e * 300) / nitrogen.mass);
    expect(IONTRANSITTIME(cell(300), cell("1 mm"), cell("N2+"))[0][0] / full).toBeCloseTo(3, 13);
  });

  test("summed over the potential V (d/s)^(4/3), the time comes out the same", () => {
    const [V, s, steps] = [300, 1e-3, 200_000];
    let time = 0;
    for (let i = 0; i < steps; i++) {
      const d = (s * (i + 0.5)) / steps;
      time += s / steps / Math.sqrt((2 * e * V * (d / s) ** (4 / 3)) / nitrogen.mass);
    }
    expect(time / model.ionTransitTime(V, s, nitrogen)).toBeCloseTo(1, 1);
  });
});
