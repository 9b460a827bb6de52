import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { judgeAll } from "../../functions/cells/verdict";
import { debyeLength } from "../../functions/edge/model";
import { e, m_e } from "../../functions/matter/constants";
import { parseIon, type Ion } from "../../functions/matter/ion";
import * as entries from "../../functions/probe/entries";
import { ORBITALCURRENT, ORBITALDENSITY, PROBEDENSITY, PROBETEMPERATURE } from "../../functions/probe/functions";
import { FLOATINGPOTENTIAL, IONCURRENTDENSITY } from "../../functions/wall/functions";

const argon = parseIon("Ar+") as Ion;

describe("against Lieberman & Lichtenberg (from memory)", () => {
  test("an argon plasma stands 5.2 electron temperatures above a floating probe", () => {
    const T_e = PROBETEMPERATURE([[5.2 * 3]], [[0]], [["Ar+"]])[0][0];
    expect(T_e).toBeCloseTo(3, 1);
    // 5.18 recomputed: ½ + ½ ln(M/(2πm)).
    const depth = 0.5 + 0.5 * Math.log(argon.mass / (2 * Math.PI * m_e));
    expect(depth).toBeCloseTo(5.18, 2);
    expect(PROBETEMPERATURE([[3 * depth]], [[0]], [["Ar+"]])[0][0]).toBeCloseTo(3, 13);
  });

  test("hydrogen: 3.3 electron temperatures, 2.8 of them below the sheath edge", () => {
    expect(1 / PROBETEMPERATURE([[1]], [[0]], [["H+"]])[0][0]).toBeCloseTo(3.3, 1);
    expect(1 / PROBETEMPERATURE([[1]], [[0]], [["H+"]], [["edge"]] as never)[0][0]).toBeCloseTo(2.8, 1);
  });

  test("2.6158 mA from 1 cm² of a probe in argon at 3 eV means 10¹⁷ m⁻³", () => {
    // IONCURRENTDENSITY's worked value, 26.158 A/m² at 10¹⁷ m⁻³, turned round.
    const n = PROBEDENSITY([["2.6158 mA"]], [["1 cm^2"]], [[3]], [["Ar+"]])[0][0];
    expect(n / 1e17).toBeCloseTo(1, 4);
  });
});

describe("against Chen's probe notes (from memory)", () => {
  test("½ ln(2M/(πm)) is 5.37 in argon: half of ln 4 above the form without a presheath", () => {
    const chen = 0.5 * Math.log((2 * argon.mass) / (Math.PI * m_e));
    expect(chen).toBeCloseTo(5.37, 2);
    expect(PROBETEMPERATURE([[chen * 3]], [[0]], [["Ar+"]], undefined, [[0.5]])[0][0]).toBeCloseTo(3, 13);
  });

  test("with an edge ratio of one half the density is I/(0.5 e A √(eT/M))", () => {
    const n = PROBEDENSITY([[1e-4]], [[1e-6]], [[3]], [["Ar+"]], [[0.5]])[0][0];
    expect(n / (1e-4 / (0.5 * e * 1e-6 * Math.sqrt((e * 3) / argon.mass)))).toBeCloseTo(1, 14);
  });

  test("a thin wire collects A n e (√2/π) √(eV/M)", () => {
    const I = ORBITALCURRENT([[50]], [[1e15]], [[5e-5]], [[5e-3]], [["Ar+"]])[0][0];
    const area = 2 * Math.PI * 5e-5 * 5e-3;
    expect(I / (((area * 1e15 * e * Math.SQRT2) / Math.PI) * Math.sqrt((e * 50) / argon.mass))).toBeCloseTo(1, 14);
  });

  test("I² against V is a straight line through the origin, by which such wires are read", () => {
    const squared = [20, 40, 80].map((V) => ORBITALCURRENT([[V]], [[1e15]], [[5e-5]], [[5e-3]], [["Ar+"]])[0][0] ** 2);
    expect(squared[1] / squared[0]).toBeCloseTo(2, 13);
    expect(squared[2] / squared[0]).toBeCloseTo(4, 13);
  });
});

describe("against Mott-Smith & Langmuir (1926), recomputed", () => {
  test("the wire's current is 2/√π √η times the random current of ions at any temperature, for η = ZeV/kT ≫ 1", () => {
    // Random current A n e ¼√(8kT/(πM)); the factor 2/√π √η is their limit for attracted particles on open orbits.
    const T_i = 0.1;
    const random = 2 * Math.PI * 5e-5 * 5e-3 * 1e15 * e * 0.25 * Math.sqrt((8 * e * T_i) / (Math.PI * argon.mass));
    const I = ORBITALCURRENT([[50]], [[1e15]], [[5e-5]], [[5e-3]], [["Ar+"]])[0][0];
    expect(I / (random * (2 / Math.sqrt(Math.PI)) * Math.sqrt(50 / T_i))).toBeCloseTo(1, 13);
  });
});

describe("the wall's own functions, turned round", () => {
  const positive = (min: number, max: number) => fc.double({ min, max, noNaN: true });

  test("ORBITALDENSITY gives back the density of ORBITALCURRENT", () => {
    fc.assert(
      fc.property(positive(1, 1e3), positive(1e13, 1e17), positive(1e-6, 1e-3), positive(1, 4), (V, n, r, Z) => {
        const ion = ["Ar+", "Ar^2+", "Ar^3+", "Ar^4+"][Math.floor(Z) - 1];
        const I = ORBITALCURRENT([[V]], [[n]], [[r]], [[0.01]], [[ion]])[0][0];
        expect(ORBITALDENSITY([[-I]], [[-V]], [[r]], [[0.01]], [[ion]])[0][0] / n).toBeCloseTo(1, 12);
      }),
    );
  });

  test("PROBEDENSITY gives back the density of IONCURRENTDENSITY", () => {
    fc.assert(
      fc.property(positive(1e13, 1e19), positive(0.3, 50), positive(0.3, 1), (n, T, ratio) => {
        const J = IONCURRENTDENSITY([[n]], [[T]], [["Xe++"]], undefined, [[ratio]])[0][0];
        expect(PROBEDENSITY([[J * 1e-5]], [[1e-5]], [[T]], [["Xe++"]], [[ratio]])[0][0] / n).toBeCloseTo(1, 12);
      }),
    );
  });

  test("PROBETEMPERATURE gives back the temperature of FLOATINGPOTENTIAL, from the edge and from the plasma", () => {
    for (const from of ["edge", "plasma"]) {
      const V_f = FLOATINGPOTENTIAL([[7]], [["He++"]], undefined, undefined, [[from]] as never, [[0.5]])[0][0];
      expect(PROBETEMPERATURE([[20]], [[20 + V_f]], [["He++"]], [[from]] as never, [[0.5]])[0][0]).toBeCloseTo(7, 12);
    }
  });

  test("emission adds to the current, so less density explains it", () => {
    const [plain, emitting] = [undefined, [[0.25]]].map(
      (gamma) => PROBEDENSITY([[1e-4]], [[1e-6]], [[3]], [["Ar+"]], undefined, gamma)[0][0],
    );
    expect(plain / emitting).toBeCloseTo(1.25, 14);
  });
});

describe("what is refused, and what is doubted", () => {
  test("a plasma potential at or below floating gives no temperature", () => {
    expect(PROBETEMPERATURE([[10]], [[12]], [["Ar+"]])[0][0]).toMatchObject({ code: "#N/A" });
    expect(PROBETEMPERATURE([[10]], [[2]], [[0.002]], [["edge"]] as never)[0][0]).toMatchObject({ code: "#N/A" });
  });

  test("no current, no voltage: an empty cell, not a density of zero", () => {
    expect(ORBITALDENSITY([[0]], [[50]], [[5e-5]], [[5e-3]], [["Ar+"]])[0][0].message).toMatch(/^I is blank/);
    expect(ORBITALCURRENT([[0]], [[1e15]], [[5e-5]], [[5e-3]], [["Ar+"]])[0][0].message).toMatch(/^V is blank/);
  });

  const words = (entry: { limits: readonly any[] }, values: unknown[]) =>
    judgeAll(entry as never, values).map(({ word }) => word);

  test("a probe must be wide beside its Debye length, and its radius known to tell", () => {
    const density = PROBEDENSITY([[1e-4]], [[1e-6]], [[3]], [["Ar+"]])[0][0];
    const radius = debyeLength(density, 3);
    const at = (r: number | undefined) =>
      words(entries.PROBEDENSITY, [1e-4, 1e-6, 3, argon, Math.exp(-0.5), 0.01, r])[0];
    expect([40, 20, 5].map((ratio) => at(ratio * radius))).toEqual(["holds", "marginal", "fails"]);
    expect(at(undefined)).toBe("not tested");
  });

  test("a wire must be thin beside the sheath and long beside its radius", () => {
    expect(words(entries.ORBITALCURRENT, [50, 1e14, 2e-5, 5e-3, argon])).toEqual(["holds", "holds"]);
    expect(words(entries.ORBITALCURRENT, [5, 1e18, 1e-3, 5e-3, argon])).toEqual(["fails", "fails"]);
  });
});
