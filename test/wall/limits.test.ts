import { describe, expect, test } from "vitest";
import { entryNamed } from "../../functions/catalogue";
import { readInputs } from "../../functions/cells/evaluate";
import { Fault } from "../../functions/cells/fault";
import { judgeAll, verdictText } from "../../functions/cells/verdict";
import { LIMITCHECK } from "../../functions/checks/functions";

/** The verdict on one assumption of a function at typed inputs; undefined where it does not apply. */
function verdict(name: string, assumption: RegExp, ...cells: unknown[]): string | undefined {
  const entry = entryNamed(name)!;
  const reading = readInputs(entry.inputs, cells);
  if (reading instanceof Fault) throw new Error(reading.message);
  const values = reading.columns.map((column) => column.values[0]);
  const found = judgeAll(entry, values).find(({ limit }) => assumption.test(limit.assumption));
  return found && verdictText(found);
}

describe("a wall repels electrons", () => {
  test("from one T_e on; less is marginal, and a wall above the edge fails", () => {
    expect(verdict("WALLCURRENT", /repels/, -3, 1e17, 3, "Ar+")).toBe("holds");
    expect(verdict("WALLCURRENT", /repels/, -1, 1e17, 3, "Ar+")).toMatch(/^marginal: V_w\/T_e -0\.333/);
    expect(verdict("ELECTRONFLUX", /repels/, 1e17, 3, 5)).toMatch(/^fails: the wall hardly repels/);
  });

  test("the floating potential is judged where the function finds it", () => {
    expect(verdict("IONIMPACTENERGY", /repels/, 3, "Ar+")).toBe("holds");
    expect(verdict("FLOATINGPOTENTIAL", /repels/, 1, "H+", 200)).toMatch(/^marginal/);
  });
});

describe("emission", () => {
  // Hobbs & Wesson: the structure changes as (1−δ)√(M/m) comes down to 8.3.
  test("is weak, marginal and strong by (1−δ)√(M/m)", () => {
    expect(verdict("FLOATINGPOTENTIAL", /emitted/, 3, "Ar+", 0, 0.5)).toBe("holds");
    expect(verdict("FLOATINGPOTENTIAL", /emitted/, 3, "Ar+", 0, 0.95)).toMatch(
      /^marginal: \(1−δ\)√\(M\/\(Zm\)\) 13\.5/,
    );
    expect(verdict("WALLCURRENT", /emitted/, -10, 1e17, 3, "Ar+", 0, null, 0.98)).toMatch(/^fails/);
  });

  test("left out is not tested, and beside the point where no electron arrives", () => {
    expect(verdict("FLOATINGPOTENTIAL", /emitted/, 3, "Ar+")).toBe("not tested: give delta_e");
    expect(verdict("WALLCURRENT", /emitted/, -300, 1e17, 3, "Ar+", 0, null, 0.98)).toBeUndefined();
  });

  test("by ions is not judged on a wall material that nobody gave, for no ion", () => {
    for (const ion of ["Ar+", "Xe+", "N2+", "Ar++"]) {
      const told = "not tested: give the yield of the wall's material (IONEMISSION)";
      expect(verdict("WALLCURRENT", /ion impact/, -300, 1e17, 3, ion)).toBe(told);
      expect(verdict("WALLVOLTAGE", /ion impact/, 10, 1e17, 3, ion)).toBe(told);
    }
  });

  test("by ions left untested leaves a biased argon wall holding", () => {
    expect(LIMITCHECK([["WALLCURRENT"]], [[-300]], [[1e17]], [[3]], [["Ar+"]])).toEqual([["holds"]]);
  });

  // Phelps & Petrović, Plasma Sources Sci. Technol. 8 (1999) R21, from memory: 0.07 in argon on metals up to some 500 eV.
  test("by neutralisation is judged by the ions' speed, not by how much it is", () => {
    expect(verdict("IONEMISSION", /neutralisation/, 15.76, 4.5)).toMatch(
      /^not tested: give the impact energy .* 500 eV/,
    );
    expect(LIMITCHECK([["IONEMISSION"]], [[24.59]], [[2.5]])[0][0]).toMatch(/^not tested/);
  });

  test("of more than one electron for each is a yield, not a slip with percent", () => {
    expect(LIMITCHECK([["WALLCURRENT"]], [[-9]], [[1e17]], [[3]], [["Ar+"]], null!, null!, [[1.5]])[0][0]).toMatch(
      /^fails: emission comes close to its space-charge limit[^;]*$/,
    );
    expect(LIMITCHECK([["WALLCURRENT"]], [[-9]], [[1e17]], [[3]], [["Ar+"]], null!, null!, [[30]])[0][0]).toMatch(
      /doubtful input: delta_e 30; percent meant/,
    );
  });
});

describe("the Maxwellian tail", () => {
  // Lieberman & Lichtenberg: electrons above the first excitation energy, 11.5 eV in argon, are depleted.
  test("holds in argon up to a drop of 11.5 V, and is open beyond, as in any discharge of 3 to 6 eV", () => {
    const tail = (T_e: number) => verdict("FLOATINGPOTENTIAL", /Maxwellian/, T_e, "Ar+");
    expect(tail(2)).toBe("holds");
    expect(tail(3)).toMatch(/^marginal: \|V_w\|\/first excitation energy 1\.22/);
    expect(tail(6)).toMatch(/^marginal/);
  });

  test("is gone in a thruster's channel without emission, xenon of 20 eV", () => {
    expect(verdict("FLOATINGPOTENTIAL", /Maxwellian/, 20, "Xe+")).toMatch(/^fails: collisions and the wall/);
    expect(verdict("FLOATINGPOTENTIAL", /Maxwellian/, 20, "Xe+", 0, 0.9)).toMatch(/^marginal/);
  });

  test("is not judged for a gas without a value, nor at a bias that no electron climbs", () => {
    expect(verdict("FLOATINGPOTENTIAL", /Maxwellian/, 6, "N2+")).toBeUndefined();
    expect(verdict("WALLCURRENT", /Maxwellian/, -300, 1e17, 3, "Ar+")).toBeUndefined();
    expect(verdict("IONIMPACTENERGY", /Maxwellian/, 3, "Ar+", 0, -12)).toBeUndefined();
  });
});

describe("a strong oblique field", () => {
  // Stangeby, Nucl. Fusion 52 (2012) 083012: 2.371° in deuterium with cold ions.
  test("is judged against the grazing limit where an angle is given", () => {
    expect(verdict("WALLFLUX", /streaming/, 1e17, 3, "D+", 0, null, 3)).toBe("holds");
    expect(verdict("WALLFLUX", /streaming/, 1e17, 3, "D+", 0, null, 2)).toMatch(
      /^marginal: angle\/grazing limit 0\.843/,
    );
    expect(verdict("WALLFLUX", /streaming/, 1e17, 3, "D+")).toBeUndefined();
  });

  // The sine is then √(m/M), 0.95° in deuterium: 0.399 of the grazing limit with cold ions, 0.282 of it with T_i = T_e.
  test("feeds the wall below the grazing limit too, where a divertor tile stands, down to about √(m/M)", () => {
    const tile = (angle: number) => verdict("WALLHEATFLUX", /streaming/, 1e20, 20, "D+", 20, null, null, 0, 0, angle);
    expect(tile(3)).toMatch(/^marginal: angle\/grazing limit 0\.894/);
    expect(tile(1.05)).toMatch(/^marginal/);
    expect(tile(0.95)).toMatch(/^fails: at such a grazing angle drifts/);
  });
});

test("the energy of ions at a biased wall stands on a sheath without collisions, which no input tells", () => {
  const at = (...cells: unknown[]) => LIMITCHECK([["IONIMPACTENERGY"]], ...cells.map((cell) => [[cell]]))[0][0];
  expect(at(3, "Ar+", 0.05, -300)).toMatch(/^not tested: give the ions' mean free path .* 3 widths of the sheath/);
  expect(at(3, "Ar+", 0.05, 0)).toMatch(/^marginal: V_w/);
});

describe("what a hot or sputtered wall assumes", () => {
  test("a dilute tail of electrons leaves while the wall is cold against its work function", () => {
    expect(verdict("RICHARDSONCURRENT", /leave/, 2500, 4.5)).toBe("holds");
    expect(verdict("RICHARDSONCURRENT", /leave/, 4500, 1)).toMatch(/^marginal/);
  });

  test("the field that would lower the work function by a tenth of k_B T is told", () => {
    // √(eE/4πε₀) = 0.0215 eV at 2500 K, with e/4πε₀ = 1.44 V nm.
    const told = verdict("RICHARDSONCURRENT", /lowers/, 2500, 4.5)!;
    expect(Number(/below ([\d.e]+) V\/m/.exec(told)![1]) / (0.02154 ** 2 / 1.44e-9)).toBeCloseTo(1, 2);
  });

  test("what an erosion rate cannot test is named", () => {
    expect(verdict("EROSIONRATE", /threshold/, 1e20, 0.5, "Si", 2330)).toMatch(/^not tested: give the impact energy/);
    expect(verdict("EROSIONRATE", /stays away/, 1e20, 0.5, "Si", 2330)).toMatch(/^not tested/);
  });

  test("the universal yield curve is not for electrons of a few volts", () => {
    expect(verdict("EMISSIONYIELD", /universal/, 50, 2.4, 300)).toBe("holds");
    expect(verdict("EMISSIONYIELD", /universal/, 2, 2.4, 300)).toMatch(/^fails/);
  });
});
