import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { entryNamed } from "../../functions/catalogue";
import { evaluate } from "../../functions/cells/evaluate";

type Direction = "rises" | "falls";

/**
 * What the physics demands as one input grows and the others stay: [function, input, direction]. Magnitudes rise;
 * potentials of a repelling wall are negative, so a larger drop falls.
 */
const demands: [name: string, input: string, direction: Direction][] = [
  ["DEBYELENGTH", "n_e", "falls"],
  ["DEBYELENGTH", "T_e", "rises"],
  ["PLASMAFREQUENCY", "n", "rises"],
  ["MEANFREEPATH", "p", "falls"],
  ["MEANFREEPATH", "T_g", "rises"],
  ["BOHMSPEED", "T_e", "rises"],
  ["BOHMSPEED", "T_i", "rises"],
  ["BOHMSPEED", "ion", "falls"],
  ["COLLISIONALBOHMSPEED", "lambda_i", "rises"],
  ["COLLISIONALBOHMSPEED", "n_edge", "rises"],
  ["EDGEDECAYLENGTH", "u_0", "falls"],
  ["PRESHEATHDROP", "edge_ratio", "falls"],
  ["FLOATINGPOTENTIAL", "T_e", "falls"],
  ["FLOATINGPOTENTIAL", "ion", "falls"],
  ["FLOATINGPOTENTIAL", "T_i", "rises"],
  ["FLOATINGPOTENTIAL", "delta_e", "rises"],
  ["WALLFLUX", "n_bulk", "rises"],
  ["WALLFLUX", "angle", "rises"],
  ["IONCURRENTDENSITY", "T_e", "rises"],
  ["WALLCURRENT", "V_w", "falls"],
  ["WALLVOLTAGE", "J", "falls"],
  ["WALLHEATFLUX", "n_bulk", "rises"],
  ["EMISSIONYIELD", "delta_max", "rises"],
  ["RICHARDSONCURRENT", "T_wall", "rises"],
  ["RICHARDSONCURRENT", "work_function", "falls"],
  ["SHEATHWIDTH", "V_s", "rises"],
  ["SHEATHWIDTH", "n_edge", "falls"],
  ["CHILDCURRENT", "V_s", "rises"],
  ["CHILDCURRENT", "s", "falls"],
  ["CHILDWIDTH", "J", "falls"],
  ["WALLFIELD", "V_s", "rises"],
  ["WALLFIELD", "n_edge", "rises"],
  ["SHEATHPOTENTIAL", "x", "rises"],
  ["IONTRANSITTIME", "s", "rises"],
  ["IONTRANSITTIME", "V_s", "falls"],
  ["PULSEDWIDTH", "t", "rises"],
  ["RFFLOATINGSHIFT", "V_rf", "falls"],
  ["IONENERGYSPREAD", "f", "falls"],
  ["RFSHEATHWIDTH", "V_dc", "rises"],
  ["SHEATHRESISTANCE", "n_bulk", "falls"],
  ["NEGATIVEIONBOHMSPEED", "alpha_s", "falls"],
  ["HOTELECTRONPOTENTIAL", "hot_fraction", "falls"],
  ["GYRORADIUS", "B", "falls"],
  ["GYRORADIUS", "T", "rises"],
  ["MAGNETICPRESHEATHDROP", "angle", "falls"],
  ["PROBEDENSITY", "I_sat", "rises"],
  ["ORBITALCURRENT", "V", "rises"],
];

/** Factors on the example's value that keep it a sensible one; the angle and the ratios stay below their tops. */
const factor = fc.double({ min: 0.5, max: 1.5, noNaN: true });

/** Where the example leaves an input out, it starts from here. */
const starts: Record<string, unknown> = {
  ion: 40,
  T_i: 0.3,
  delta_e: 0.3,
  angle: 40,
  edge_ratio: 0.5,
  T_g: 300,
  V_w: -10,
};

describe.each(demands)("%s as %s grows", (name, input, direction) => {
  test(direction, () => {
    const entry = entryNamed(name)!;
    const at = entry.inputs.findIndex((each) => each.name === input);
    expect(at, `${name} has an input ${input}`).toBeGreaterThanOrEqual(0);
    const example = [...entry.example];
    while (example.length <= at) example.push(null as never);
    const start = typeof example[at] === "number" ? (example[at] as number) : (starts[input] as number);
    const value = (x: number) =>
      evaluate(
        entry,
        example.map((cell, i) => (i === at ? x : cell)),
      )[0][0];
    fc.assert(
      fc.property(factor, factor, (a, b) => {
        const [low, high] = [Math.min(a, b), Math.max(a, b)].map((each) => each * Math.abs(start));
        if (high / low < 1.0001) return;
        // Negative starts are potentials: growing means less negative.
        const [x, y] = start < 0 ? [-high, -low] : [low, high];
        const [first, second] = [value(x), value(y)];
        if (typeof first !== "number" || typeof second !== "number") return; // beyond the model's reach
        const rise = second - first;
        expect(direction === "rises" ? rise : -rise).toBeGreaterThanOrEqual(0);
      }),
      { numRuns: 40 },
    );
    expect(typeof value(start), JSON.stringify(value(start))).toBe("number");
    expect(value(start * 0.8)).not.toBe(value(start));
  });
});
