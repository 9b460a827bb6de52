import { describe, expect, test } from "vitest";
import {
  EDGERATIO,
  MEANFREEPATH,
  PLASMAFREQUENCY,
  DEBYELENGTH,
  BOHMSPEED,
  WALLTOEDGE,
  PRESHEATHDROP,
} from "../../functions/edge/functions";
import * as model from "../../functions/edge/model";
import { parseIon, type Ion } from "../../functions/matter/ion";

const argon = parseIon("Ar+") as Ion;

describe("against the NRL Plasma Formulary (from memory)", () => {
  test("the Debye length at 1 eV and 1 cm⁻³ is 743 cm", () => {
    expect(DEBYELENGTH([["1 cm^-3"]], [[1]], undefined, [["cm"]])[0][0]).toBeCloseTo(743, 0);
  });

  test("the electron plasma frequency at 1 cm⁻³ is 8.98 kHz and 5.64×10⁴ rad/s", () => {
    expect(PLASMAFREQUENCY([["1 cm^-3"]], undefined, [["kHz"]])[0][0]).toBeCloseTo(8.98, 2);
    expect(PLASMAFREQUENCY([["1 cm^-3"]], undefined, [["rad/s"]])[0][0] / 1e4).toBeCloseTo(5.64, 2);
  });

  test("the ion plasma frequency is 1.32×10³ Z √(n/μ) rad/s, μ the mass in proton masses", () => {
    const proton = 1.67262192595e-27;
    const omega = 2 * Math.PI * model.plasmaFrequency(1e6, 40 * proton, 2);
    expect(omega / (2 * Math.sqrt(1 / 40))).toBeCloseTo(1.32e3, -1);
  });

  test("the ion sound speed is 9.79×10⁵ √(γZT_e/μ) cm/s", () => {
    const ion = { mass: 40 * 1.67262192595e-27, charge: 2, label: "" };
    expect((model.bohmSpeed(3, ion) * 100) / Math.sqrt((2 * 3) / 40) / 1e5).toBeCloseTo(9.79, 2);
  });
});

describe("against Lieberman & Lichtenberg (from memory)", () => {
  test("an argon ion's mean free path is 1/(330 p) cm with p in Torr, within 3 %", () => {
    const path = MEANFREEPATH([["10 mTorr"]], [["Ar"]], undefined, [["cm"]])[0][0];
    expect(path * 330 * 0.01).toBeGreaterThan(0.97);
    expect(path * 330 * 0.01).toBeLessThan(1.03);
  });

  test("a collisionless slab keeps half its density at the edge, a cylinder four tenths", () => {
    expect(EDGERATIO([["slab"]] as never)[0][0]).toBeCloseTo(0.4965, 4);
    expect(EDGERATIO([["cylinder"]] as never)[0][0]).toBeCloseTo(0.4, 12);
  });
});

describe("against kinetic theory", () => {
  // Harrison & Thompson, Proc. Phys. Soc. 74 (1959) 145; Tonks & Langmuir, Phys. Rev. 34 (1929) 876: flux
  // (2√2/π)·max D(x) = 0.48711 n u_B with D Dawson's integral, whose maximum 0.5410442246 is in every table of it.
  test("the slab ratio is within 2 % of the exact collisionless slab with cold ions", () => {
    const exact = ((2 * Math.SQRT2) / Math.PI) * 0.5410442246;
    expect(exact).toBeCloseTo(0.48711, 5);
    expect(Math.abs(model.edgeRatio("slab", 1, Infinity) / exact - 1)).toBeLessThan(0.02);
  });
});

describe("against the catalogue's worked values", () => {
  test("10¹⁶ m⁻³ and 3 eV give a Debye length of 128.760 µm", () => {
    expect(DEBYELENGTH([[1e16]], [[3]])[0][0]).toBeCloseTo(1.2876e-4, 9);
  });

  test("argon at 3 eV enters at 2691.8 m/s", () => {
    expect(BOHMSPEED([[3]], [["Ar+"]])[0][0]).toBeCloseTo(2691.8, 1);
  });

  test("readings of −120 V and 25 V with 3 eV put the wall at −143.5 V from the edge (by hand)", () => {
    expect(WALLTOEDGE([[-120]], [[25]], [[3]])[0][0]).toBeCloseTo(-143.5, 12);
    expect(WALLTOEDGE([[-120]], [[25]])[0][0]).toBe(-145);
  });
});

describe("limits and scalings", () => {
  test("electrons of 1 eV move at 669 km/s on average (NRL: thermal speed 4.19×10⁷ √T cm/s times √(8/π), from memory)", () => {
    expect(model.meanElectronSpeed(1) / 1e3).toBeCloseTo(669.24, 1);
    expect(model.meanElectronSpeed(4) / model.meanElectronSpeed(1)).toBeCloseTo(2, 14);
    expect((model.meanElectronSpeed(1) * 100) / (4.19e7 * Math.sqrt(8 / Math.PI))).toBeCloseTo(1, 2);
  });

  test("without a geometry the edge keeps exp(−1/2) of the body's density", () => {
    expect(model.edgeRatio("free", 1, 1)).toBeCloseTo(0.60653066, 8);
    expect(EDGERATIO()[0][0]).toBeCloseTo(0.60653066, 8);
  });

  test("quadrupling the density halves the Debye length", () => {
    expect(model.debyeLength(4e16, 3)).toBeCloseTo(model.debyeLength(1e16, 3) / 2, 15);
  });

  test("equal temperatures make the Debye length with ions √2 shorter", () => {
    expect(model.debyeLengthWithIons(1e16, 3, 3) * Math.SQRT2).toBeCloseTo(model.debyeLength(1e16, 3), 15);
  });

  test("without collisions the collisional Bohm speed is the Bohm speed", () => {
    expect(model.collisionalBohmSpeed(3, argon, 1e16, 1e9)).toBeCloseTo(model.bohmSpeed(3, argon), 8);
  });

  test("with a mean free path far below λ_D it falls as √(2λ_i/(πλ_D))", () => {
    const path = 1e-6 * model.debyeLength(1e16, 3);
    const expected = model.bohmSpeed(3, argon) * Math.sqrt((2 * 1e-6) / Math.PI);
    expect(model.collisionalBohmSpeed(3, argon, 1e16, path) / expected).toBeCloseTo(1, 5);
  });

  test("far above the Bohm speed a disturbance decays over the Debye length", () => {
    expect(model.edgeDecayLength(1e16, 3, argon, 1e9) / model.debyeLength(1e16, 3)).toBeCloseTo(1, 9);
  });

  test("half an electron temperature falls across the presheath unless a ratio says otherwise", () => {
    expect(PRESHEATHDROP([[3]])[0][0]).toBe(1.5);
    expect(PRESHEATHDROP([[3]], [[1]])[0][0]).toBeCloseTo(0, 15);
  });
});
