import { describe, expect, test } from "vitest";
import { EEPFMOMENTS } from "../../functions/electrons/functions";
import { estimateNoise } from "../../functions/numerics/noise";
import { generator, syntheticEepf } from "./synthetic-eepf";

const column = (values: number[]) => values.map((value) => [value]);
const results = ["density", "meanEnergy", "effective", "screening", "flux"] as const;
const shapes = ["Maxwellian", "Druyvesteyn", "two groups"];

describe("1,000 noisy tables of three shapes, any spacing, first energy and end", () => {
  const tables = Array.from({ length: 1000 }, (_, i) => syntheticEepf(i + 1));
  const rows = tables.map(({ energy, eepf }) => EEPFMOMENTS(column(energy), column(eepf))[0]);

  test("every one gives a result", () => {
    expect(rows.filter((row) => typeof row[0] !== "number")).toEqual([]);
  });

  test.each(results.map((name, k) => [name, 2 * k] as const))(
    "the error of the %s lies within the stated one in 95 % of all, and of each shape in 93 %",
    (name, at) => {
      const inside = tables.map(({ truth }, i) => Math.abs(rows[i][at] - truth[name]) <= rows[i][at + 1]);
      expect(inside.filter(Boolean).length / inside.length).toBeGreaterThanOrEqual(0.95);
      for (const shape of shapes) {
        const own = inside.filter((_, i) => tables[i].shape === shape);
        expect(own.filter(Boolean).length / own.length, shape).toBeGreaterThanOrEqual(0.93);
      }
    },
  );

  test("the stated errors are worth having: half the tables know their density to 2 %", () => {
    const stated = rows.map((row) => row[1] / row[0]).sort((a, b) => a - b);
    expect(stated[500]).toBeLessThan(0.02);
  });
});

describe("noise from residuals", () => {
  test("a constant and a relative part are told apart, each to 20 %, over four decades of signal", () => {
    const random = generator(7);
    const signal = Array.from({ length: 2000 }, (_, i) => 10 ** (-4 * (i / 2000)));
    const squares = signal.map((y) => (0.02 * y * random.normal()) ** 2 + (1e-3 * random.normal()) ** 2);
    const noise = estimateNoise(signal, squares);
    expect(Math.abs(Math.sqrt(noise.relative) / 0.02 - 1)).toBeLessThan(0.2);
    expect(Math.abs(Math.sqrt(noise.constant) / 1e-3 - 1)).toBeLessThan(0.2);
  });

  test("without any residual there is no noise", () => {
    expect(estimateNoise([1, 2, 3], [0, 0, 0])).toEqual({ constant: 0, relative: 0 });
  });
});
