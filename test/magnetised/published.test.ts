import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { judgeAll } from "../../functions/cells/verdict";
import { bohmSpeed, meanElectronSpeed } from "../../functions/edge/model";
import * as entries from "../../functions/magnetised/entries";
import {
  GRAZINGLIMIT,
  GYRORADIUS,
  MAGNETICPRESHEATHDROP,
  MAGNETICPRESHEATHWIDTH,
} from "../../functions/magnetised/functions";
import * as model from "../../functions/magnetised/model";
import { u } from "../../functions/matter/constants";
import { electron, parseIon, type Ion } from "../../functions/matter/ion";
import { floatingPotential } from "../../functions/wall/model";

const deuteron = parseIon("D+") as Ion;
const argon = parseIon("Ar+") as Ion;

describe("against the NRL Plasma Formulary (from memory)", () => {
  const proton = 1.67262192595e-27 / u;

  test("the electron gyroradius is 2.38 √T/B cm, B in gauss", () => {
    const radius = GYRORADIUS([[9]], [["50 G"]], undefined, [["cm"]])[0][0];
    expect((radius * 50) / Math.sqrt(9)).toBeCloseTo(2.38, 2);
  });

  test("the ion gyroradius is 1.02×10² √(μT_i)/(ZB) cm, μ the mass in proton masses", () => {
    const radius = GYRORADIUS([[4]], [["200 G"]], [[16 * proton]], [["cm"]])[0][0];
    expect((radius * 200) / Math.sqrt(16 * 4) / 100).toBeCloseTo(1.02, 2);
  });
});

describe("against Stangeby, Nucl. Fusion 52 (2012) 083012", () => {
  // The formula is the source's; the digits were recomputed from CODATA masses.
  test("deuterium at equal temperatures loses its Debye sheath at 3.354°, with cold ions at 2.371°", () => {
    expect(GRAZINGLIMIT([["D+"]], [[20]], [[20]])[0][0]).toBeCloseTo(3.354, 3);
    expect(GRAZINGLIMIT([["D+"]])[0][0]).toBeCloseTo(2.371, 3);
    expect(GRAZINGLIMIT([["D+"]], [[20]], [[0]])[0][0]).toBeCloseTo(2.371, 3);
  });

  test("doubly charged helium at equal temperatures loses it at 2.914°", () => {
    expect(GRAZINGLIMIT([["He++"]], [[20]], [[20]])[0][0]).toBeCloseTo(2.914, 3);
  });

  test("at the grazing limit the magnetic presheath carries the whole floating drop", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.1, max: 500, noNaN: true }),
        fc.double({ min: 0, max: 3, noNaN: true }),
        (T, r) => {
          const drop = model.magneticPresheathDrop(T, model.grazingLimit(deuteron, r));
          expect(drop / -floatingPotential(T, deuteron, r * T, 0)).toBeCloseTo(1, 12);
        },
      ),
    );
  });
});

describe("against Stangeby (2000) and Chodura (1982)", () => {
  test("the two drops add up to the floating drop of an unmagnetised wall, at any angle", () => {
    const [T_e, T_i] = [20, 20];
    const whole = -floatingPotential(T_e, deuteron, T_i, 0);
    for (const angle of [3.4, 5, 10, 45, 46, 80, 90]) {
      const sine = Math.sin((angle * Math.PI) / 180);
      // Ions leave the presheath at u_B along the normal, so n_edge sin θ is left; electrons follow the field to the wall
      // and strike it with ¼ n v̄ sin θ. Their balance is what the Debye layer has to hold.
      const debye = T_e * Math.log((sine * meanElectronSpeed(T_e)) / (4 * bohmSpeed(T_e, deuteron, T_i)));
      expect(debye).toBeGreaterThan(0);
      expect(model.magneticPresheathDrop(T_e, angle) + debye).toBeCloseTo(whole, 12);
    }
  });

  test("the presheath is √6 gyroradii at the Bohm speed wide where the field grazes the wall", () => {
    // With cold ions u_B/ω_ci is the gyroradius of an ion at T_e.
    const width = MAGNETICPRESHEATHWIDTH([[20]], [["D+"]], [[2]], [[1e-6]])[0][0];
    expect(width / GYRORADIUS([[20]], [[2]], [["D+"]])[0][0]).toBeCloseTo(Math.sqrt(6), 12);
  });

  test("a deuterium plasma of 20 eV in 2 T at 5° has a presheath 1.11 mm wide (by hand)", () => {
    // u_B = √(e·20 eV/M_D) = 3.0955e4 m/s, ω_ci = eB/M = 9.5816e7 /s, √6·3.2307e-4·cos 5° = 7.8836e-4; ×√2 for T_i = T_e.
    const width = MAGNETICPRESHEATHWIDTH([[20]], [["D+"]], [[2]], [[5]], [[20]], [["mm"]])[0][0];
    expect(width).toBeCloseTo(0.78836 * Math.SQRT2, 3);
  });
});

describe("the plain sheath", () => {
  test("a field along the normal leaves no magnetic presheath: no width, no drop", () => {
    expect(MAGNETICPRESHEATHWIDTH([[20]], [["D+"]], [[2]], [[90]])[0][0]).toBe(0);
    expect(MAGNETICPRESHEATHDROP([[20]], [[90]])[0][0] + 0).toBe(0);
  });

  test("a ten times heavier electron would turn in a √10 times wider circle", () => {
    const heavy = { ...electron, mass: 10 * electron.mass };
    expect(model.gyroradius(3, 0.02, heavy) / model.gyroradius(3, 0.02, electron)).toBeCloseTo(Math.sqrt(10), 14);
  });
});

describe("what is refused, and what is doubted", () => {
  test("an ion temperature without an electron temperature is refused: only their ratio counts", () => {
    const [[refused]] = GRAZINGLIMIT([["D+"]], undefined, [[20]]);
    expect(refused).toMatchObject({ code: "#VALUE!", message: expect.stringMatching(/^T_e: it is blank while T_i/) });
  });

  test("an ion as light as a few electrons grazes nowhere", () => {
    expect(GRAZINGLIMIT([[0.003]])[0][0]).toMatchObject({ code: "#N/A" });
  });

  test("an angle of 0 counts as blank, and one above 90° is refused", () => {
    expect(MAGNETICPRESHEATHDROP([[20]], [[0]])[0][0].message).toMatch(/angle is blank/);
    expect(MAGNETICPRESHEATHDROP([[20]], [[95]])[0][0]).toMatchObject({ code: "#VALUE!" });
  });

  test("angles and fields are read in the units people type", () => {
    const typed = MAGNETICPRESHEATHWIDTH([["20 eV"]], [["D+"]], [["20 kG"]], [["0.0872664625997165 rad"]])[0][0];
    expect(typed).toBeCloseTo(MAGNETICPRESHEATHWIDTH([[20]], [["D+"]], [[2]], [[5]])[0][0], 12);
  });

  const words = (entry: { limits: readonly any[] }, values: unknown[]) =>
    judgeAll(entry as never, values).map(({ word }) => word);

  test("electrons of 200 keV are too fast for this gyroradius, ions of 200 keV are not", () => {
    expect(words(entries.GYRORADIUS, [2e5, 1, electron])).toEqual(["fails"]);
    expect(words(entries.GYRORADIUS, [2e5, 1, argon])).toEqual(["holds"]);
  });

  test("a presheath width is doubted within twice the grazing limit and fails below it", () => {
    expect(words(entries.MAGNETICPRESHEATHWIDTH, [20, deuteron, 2, 8, 20])[0]).toBe("holds");
    expect(words(entries.MAGNETICPRESHEATHWIDTH, [20, deuteron, 2, 5, 20])[0]).toBe("marginal");
    expect(words(entries.MAGNETICPRESHEATHWIDTH, [20, deuteron, 2, 3, 20])[0]).toBe("fails");
  });

  test("a drop beyond what any ion floats at fails", () => {
    expect(words(entries.MAGNETICPRESHEATHDROP, [20, 30])).toEqual(["holds"]);
    expect(words(entries.MAGNETICPRESHEATHDROP, [20, 2.4])).toEqual(["marginal"]);
    expect(words(entries.MAGNETICPRESHEATHDROP, [20, 0.2])).toEqual(["fails"]);
  });
});
