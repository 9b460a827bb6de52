import { describe, expect, test, vi } from "vitest";
import { judgeAll } from "../../functions/cells/verdict";
import { readInputs, type Reading } from "../../functions/cells/evaluate";
import * as entries from "../../functions/probe/entries";
import { PROBEFIT } from "../../functions/probe/functions";
import { probeParts, type ProbePart } from "../../functions/probe/parts";
import { WALLCURRENT } from "../../functions/wall/functions";
import { randomSweep, sweep, truthOf, voltages, type Plasma, type Spoilers } from "./synthetic-sweep";

const column = (values: readonly unknown[]) => values.map((value) => [value]);
type Row = Record<ProbePart, any>;

function fit(
  V: readonly unknown[],
  I: readonly unknown[],
  ion: unknown = undefined,
  sweeps?: readonly unknown[],
): Row[] {
  const rows = PROBEFIT(column(V), column(I), sweeps && column(sweeps), [[1e-5]], [[ion]]);
  return rows.map((row) => Object.fromEntries(probeParts.map((part, k) => [part, row[k]])) as Row);
}

/** So many random sweeps with their fits; the ion's mass is given, as a number. */
function fits(count: number, spoilersOf?: (T_e: number) => Spoilers) {
  return Array.from({ length: count }, (_, i) => {
    const made = randomSweep(i + 1, spoilersOf);
    return { ...made, row: fit(made.V, made.I, made.plasma.mass)[0] };
  });
}

type Sample = ReturnType<typeof fits>[number];

const argonPlasma: Plasma = { T_e: 3, V_p: 25, n: 1e16, mass: 39.948, area: 1e-5 };
const quiet = { floor: 3e-4, relative: 3e-3 };
const plan = voltages(-40, 50, 0.5);

// Long series of sweeps share the machine with other tests.
vi.setConfig({ testTimeout: 60_000 });

describe("1,000 noisy sweeps of helium, argon and xenon plasmas", () => {
  const all = fits(1000);
  const fitted = all.filter(({ row }) => row.T_e !== "");

  test("all but a few in a thousand are fitted, and those say why not", () => {
    expect(fitted.length).toBeGreaterThanOrEqual(995);
    for (const { row } of all) if (row.T_e === "") expect(row.remarks).toMatch(/temperature/);
  });

  test.each([
    { part: "T_e", of: ({ truth }: Sample) => truth.T_e },
    { part: "V_f", of: ({ truth }: Sample) => truth.V_f },
    { part: "V_p", of: ({ truth }: Sample) => truth.V_p },
    { part: "I_sat", of: ({ truth }: Sample) => truth.I_sat },
    { part: "n_bulk", of: ({ truth }: Sample) => truth.n },
  ] as const)(
    "$part is unbiased within its standard error, and its 95 % interval covers 92 to 98 %",
    ({ part, of }) => {
      const scores = fitted.map((each) => (each.row[part] - of(each)) / each.row[`${part}_error`]);
      const mean = scores.reduce((sum, each) => sum + each / scores.length, 0);
      // The mean of a thousand has a standard error of its own, 0.032.
      expect(Math.abs(mean)).toBeLessThan(0.1);
      const covered = scores.filter((each) => Math.abs(each) < 1.96).length / scores.length;
      expect(covered).toBeGreaterThan(0.92);
      expect(covered).toBeLessThan(0.98);
    },
  );

  test("a clean sweep draws no doubt more often than once in fifty", () => {
    expect(fitted.filter(({ row }) => row.remarks !== "").length).toBeLessThanOrEqual(20);
  });

  test("the window ends below the knee and begins where ions arrive", () => {
    for (const { row, truth } of fitted) {
      expect(row.window_to).toBeLessThan(truth.V_p + 0.1 * truth.T_e);
      expect(row.window_from).toBeLessThan(truth.V_f - 3 * truth.T_e);
      expect(row.points).toBeGreaterThan(20);
    }
  });
});

describe("sweeps that would mislead", () => {
  test("two electron temperatures are refused, 100 of 100", () => {
    for (const { row } of fits(100, (T) => ({ hot: [0.05, 5 * T] }))) {
      expect(row.T_e, row.remarks).toBe("");
      expect(row.remarks).toMatch(/temperature|hot electrons|sweep down|sweep further down/);
    }
  });

  test("2 % of electrons three times as hot are refused or held to have biased the result", () => {
    for (const { row, truth } of fits(100, (T) => ({ hot: [0.02, 3 * T] }))) {
      if (row.T_e === "") continue;
      expect(row.remarks).toMatch(/hot electrons|V_p − V_f is/);
      expect(row.T_e / truth.T_e).toBeLessThan(1.15);
    }
  });

  test("an RF swing is read off the rounded knee, with what it does to V_f, and leaves T_e alone", () => {
    // A sinusoid of amplitude T pulls V_f down by T ln I₀(1) = 0.2359 T, one of 3 T by 1.585 T (Garscadden & Emeleus 1962).
    for (const [size, shift] of [
      [1, 0.2359],
      [3, 1.5851],
    ]) {
      const row = single({ rf: size * 3 });
      const [, swing, low] = /RF swing of ([\d.]+) V .* then stand ([\d.]+) V too low/.exec(row.remarks)!;
      expect(Number(swing) / (size * 3)).toBeCloseTo(1, 1);
      expect(Number(low) / (shift * 3)).toBeCloseTo(1, 1);
      expect(row.V_f).toBeCloseTo(truthOf(argonPlasma).V_f - shift * 3, 0);
      expect(Math.abs(row.T_e / 3 - 1)).toBeLessThan(0.02);
    }
  });

  test("RF in 100 random sweeps is refused or named, with T_e within a few per cent", () => {
    for (const { row, truth } of fits(100, (T) => ({ rf: 1.5 * T }))) {
      if (row.T_e === "") continue;
      expect(row.remarks).toMatch(/RF swing of|RF pick-up can't be seen/);
      expect(Math.abs(row.T_e / truth.T_e - 1)).toBeLessThan(Math.max(0.06, (4 * row.T_e_error) / truth.T_e));
    }
  });

  test("a widening sheath leaves T_e within 5 % and says by how much the density is too high, right to a third for 90 of 100", () => {
    const right = fits(100, () => ({ expansion: 0.1 })).filter(({ row, truth }) => {
      expect(Math.abs(row.T_e / truth.T_e - 1)).toBeLessThan(Math.max(0.05, (4 * row.T_e_error) / truth.T_e));
      const stated = /density about (\d+) % too high/.exec(row.remarks);
      expect(stated, row.remarks).not.toBeNull();
      const actual = 100 * (row.n_bulk / truth.n - 1);
      return Math.abs(Number(stated![1]) - actual) < actual / 3 + (200 * row.n_bulk_error) / truth.n;
    });
    expect(right.length).toBeGreaterThanOrEqual(90);
  });

  test("a constant offset moves V_f and I_sat but not T_e, and a large one shows in V_p − V_f", () => {
    const row = single({ offset: -1e-4 });
    expect(Math.abs(row.T_e - 3)).toBeLessThan(3 * row.T_e_error);
    expect(row.remarks).toMatch(/V_p − V_f is 3\.\d+ T_e where .* asks for 5\.18: an offset/);
  });

  test("an offset that hides the ion current leaves T_e alone in the row", () => {
    const row = single({ offset: 1e-3 });
    expect(Math.abs(row.T_e - 3)).toBeLessThan(3 * row.T_e_error);
    expect([row.V_f, row.I_sat, row.n_bulk]).toEqual(["", "", ""]);
    expect(row.remarks).toMatch(/never crosses zero/);
  });

  test("a filter along the sweep is noticed by neighbours that are alike, and widens the errors", () => {
    const filtered = fits(200).map(({ V, I, plasma, truth }) => {
      const three = I.map((each, i) => (i === 0 || i === I.length - 1 ? each : (I[i - 1] + each + I[i + 1]) / 3));
      return { row: fit(V, three, plasma.mass)[0], truth };
    });
    const fitted = filtered.filter(({ row }) => row.T_e !== "");
    expect(fitted.length).toBeGreaterThan(150);
    const inside = fitted.filter(({ row, truth }) => Math.abs(row.T_e - truth.T_e) < 1.96 * row.T_e_error);
    expect(inside.length / fitted.length).toBeGreaterThan(0.9);
    expect(fitted.filter(({ row }) => /errors widened/.test(row.remarks)).length).toBeGreaterThan(140);
  });

  test("a current that is an exponential to one per cent only is fitted with wider errors, and said so", () => {
    const { I } = sweep(13, argonPlasma, plan, { floor: 1e-6, relative: 1e-5 });
    const [row] = fit(
      plan,
      plan.map((V, i) => (V < 5 ? I[i] : I[i] * (1 + 0.01 * Math.sin(V / 3)))),
      "Ar+",
    );
    expect(row.remarks).toMatch(/an exponential to 1 % only: errors widened/);
    expect(Math.abs(row.T_e - 3)).toBeLessThan(3 * row.T_e_error);
    expect(row.T_e_error).toBeGreaterThan(0.003);
  });

  test("too few points, and steps wider than the electrons' rise, are refused by name", () => {
    expect(fit(plan.slice(0, 8), plan.slice(0, 8))[0].remarks).toMatch(/only 8 usable points/);
    const coarse = voltages(-40, 45, 5);
    expect(fit(coarse, sweep(3, argonPlasma, coarse, quiet).I)[0].remarks).toMatch(/step the voltage more finely/);
  });

  test("pure noise and a straight line are no characteristics", () => {
    const noise = sweep(5, { ...argonPlasma, n: 1 }, plan, { floor: 1e4, relative: 0 }).I;
    expect(fit(plan, noise)[0].T_e).toBe("");
    expect(
      fit(
        plan,
        plan.map((V) => 1e-4 * V),
      )[0].T_e,
    ).toBe("");
  });

  function single(spoilers: Spoilers) {
    const { V, I } = sweep(11, argonPlasma, plan, quiet, spoilers);
    return fit(V, I, 39.948)[0];
  }
});

describe("columns as an instrument writes them", () => {
  const { V, I } = sweep(21, argonPlasma, plan, quiet);
  const [clean] = fit(V, I, "Ar+");
  const numbers = (row: Row) =>
    probeParts.filter((part) => typeof row[part] === "number" && part !== "sweep").map((part) => row[part]);
  const expectSame = (row: Row) =>
    numbers(row).forEach((value, k) => expect(value / numbers(clean)[k]).toBeCloseTo(1, 9));

  test("a downward sweep and a shuffled one give the same row", () => {
    expectSame(fit([...V].reverse(), [...I].reverse(), "Ar+")[0]);
    const order = V.map((_, i) => (i * 77) % V.length);
    expectSame(
      fit(
        order.map((i) => V[i]),
        order.map((i) => I[i]),
        "Ar+",
      )[0],
    );
  });

  test("electrons counted negative are turned round, and said so", () => {
    const [row] = fit(
      V,
      I.map((each) => -each),
      "Ar+",
    );
    expectSame(row);
    expect(row.remarks).toMatch(/opposite sign/);
  });

  test("currents in milliamperes by heading or by cell are read as such", () => {
    const headed = fit(["V_probe (V)", ...V], ["I (mA)", ...I.map((each) => 1e3 * each)], "Ar+")[0];
    expectSame(headed);
    expect(headed.remarks).toMatch(/I read in mA, as its heading says/);
    expectSame(
      fit(
        V,
        I.map((each) => `${1e3 * each} mA`),
        "Ar+",
      )[0],
    );
  });

  test("a voltage column headed in amperes is refused", () => {
    const [[refused]] = PROBEFIT(column(["U/A", ...V]), column(["I/A", ...I]));
    expect(refused).toMatchObject({ code: "#VALUE!", message: expect.stringMatching(/^V: "U\/A" heads a column/) });
  });

  test("OL, #N/A, blanks and empty rows cost their rows and nothing else", () => {
    const rows: unknown[][] = V.map((each, i) => [each, I[i]]);
    rows[170] = [V[170], "OL"];
    rows[171] = [V[171], { code: "#N/A" }];
    rows.splice(50, 0, [null, null], [0, 0], ["", ""]);
    const [row] = fit(
      rows.map(([v]) => v),
      rows.map(([, i]) => i),
      "Ar+",
    );
    const without = V.map((_, i) => i).filter((i) => i !== 170 && i !== 171);
    const [same] = fit(
      without.map((i) => V[i]),
      without.map((i) => I[i]),
      "Ar+",
    );
    expect(row.T_e).toBeCloseTo(same.T_e, 12);
    expect(row.remarks).toMatch(/2 rows without a reading left out \("OL"\)/);
  });

  test("empty cells that arrive as zeros beside large currents are not taken for currents", () => {
    const [row] = fit(
      V,
      I.map((each, i) => (i === 155 || i > 170 ? 0 : each)),
      "Ar+",
    );
    expect(Math.abs(row.T_e - clean.T_e)).toBeLessThan(clean.T_e_error);
    expect(row.remarks).toMatch(/currents of exactly 0 taken for empty cells/);
  });

  test("a sweep up and down again averages the readings at each voltage and knows better for it", () => {
    const again = sweep(22, argonPlasma, plan, quiet);
    const [row] = fit([...V, ...again.V.reverse()], [...I, ...again.I.reverse()], "Ar+");
    expect(row.remarks).toMatch(/readings at 181 repeated voltages averaged/);
    expect(row.T_e_error / clean.T_e_error).toBeGreaterThan(0.55);
    expect(row.T_e_error / clean.T_e_error).toBeLessThan(0.9);
  });

  test("each sweep number has its row, in the order of the column, and a bad sweep spoils no other", () => {
    const other = sweep(23, { ...argonPlasma, T_e: 5 }, plan, quiet);
    const labels = [...V.map(() => 7), ...V.map(() => 3), "x", "x"];
    const rows = fit([...V, ...other.V, 1, { code: "#DIV/0!" }], [...I, ...other.I, 1, 2], "Ar+", labels);
    expect(rows.map(({ sweep }) => sweep)).toEqual([7, 3, "x"]);
    expectSame(rows[0]);
    expect(rows[1].T_e).toBeCloseTo(5, 1);
    expect(rows[2].remarks).toMatch(/row 364 of the columns holds an error/);
  });

  test("part gives one column, and where a sweep has none of it the reason", () => {
    const part = (name: string, area: unknown = undefined) =>
      PROBEFIT(column([...V, 1, 2]), column([...I, 1, 2]), column([...V.map(() => 1), 2, 2]), [[area]], [["Ar+"]], [
        [name],
      ] as never);
    expect(part("T_e")[0][0]).toBeCloseTo(clean.T_e, 12);
    expect(part("T_e")[1][0]).toMatchObject({
      code: "#N/A",
      message: expect.stringMatching(/^Sweep 2: only 2 usable points/),
    });
    expect(part("n_bulk")[0][0]).toMatchObject({ code: "#N/A", message: "Sweep 1: the density needs the area." });
    expect(part("V_p_from")[0][0]).toBe("knee");
    expect(part("temperature")[0][0].message).toMatch(/^part: "temperature" is not one of its words/);
  });

  test("columns of different length and a reading without its sweep number are refused", () => {
    expect(PROBEFIT(column(V), column(I.slice(1)))[0][0].message).toMatch(/^I: 180 cells do not match the 181 of V/);
    const labels = column(V.map((_, i) => (i === 4 ? "" : 1)));
    expect(PROBEFIT(column(V), column(I), labels)[0][0].message).toMatch(/^sweep: row 5 is blank/);
  });

  test("a column of one sweep laid across a row reads the same", () => {
    const across = PROBEFIT([V], [I], undefined, [[1e-5]], [["Ar+"]])[0];
    expect(across[1]).toBe(clean.T_e);
  });
});

describe("against the wall's own current", () => {
  test("a noiseless characteristic from WALLCURRENT gives back T_e, V_f and density to a few parts in 10⁴", () => {
    const [T, n, area] = [4, 2e16, 1e-5];
    const V = voltages(-60, -0.2, 0.2);
    const J = WALLCURRENT(column(V), [[n]], [[T]], [["Ar+"]]);
    const [row] = fit(
      V,
      J.map(([j]) => -j * area),
      "Ar+",
    );
    expect(row.T_e / T).toBeCloseTo(1, 3);
    expect(row.V_f / (T * -4.6789)).toBeCloseTo(1, 3);
    expect(row.n_bulk / n).toBeCloseTo(1, 3);
    expect(row.V_p_from).toBe("floating");
    // WALLCURRENT counts from the sheath edge, half a temperature below the plasma.
    expect(row.V_p / T).toBeCloseTo(0.5, 2);
  });

  test("a fit without a knee reckons V_p from V_f, with the errors of both", () => {
    const short = voltages(-40, 21, 0.5);
    const [row] = fit(short, sweep(31, argonPlasma, short, quiet).I, "Ar+");
    expect(row.V_p_from).toBe("floating");
    expect(Math.abs(row.V_p - 25)).toBeLessThan(3 * row.V_p_error);
    expect(row.V_p_error).toBeLessThan(1);
  });
});

describe("limits of a fit", () => {
  const words = (spoilers: Spoilers, upTo = 50) => {
    const { V, I } = sweep(41, argonPlasma, voltages(-40, upTo, 0.5), quiet, spoilers);
    const { columns } = readInputs(entries.PROBEFIT.inputs, [column(V), column(I)]) as Reading;
    return judgeAll(
      entries.PROBEFIT,
      columns.map(({ values }) => values[0]),
    ).map(({ word }) => word);
  };

  test("a clean sweep holds in all four", () => {
    expect(words({})).toEqual(["holds", "holds", "holds", "holds"]);
  });

  test("RF pick-up fails above one T_e, and can't be tested without a knee", () => {
    expect(words({ rf: 6 })[0]).toBe("fails");
    expect(words({}, 20)[0]).toBe("not tested");
  });

  test("a widening sheath is marginal", () => {
    expect(words({ expansion: 0.1 })[1]).toBe("marginal");
  });
});
