import { createRequire } from "node:module";
import { describe, expect, test } from "vitest";
import { debyeLength } from "../../functions/edge/model";
import { SHEATHPROFILE } from "../../functions/layer/functions";
import { fullWidth } from "../../functions/layer/model";
import { sheathProfile, type ProfilePoint } from "../../functions/layer/sheath-profile";

/** Taken untyped: the package ships its TypeScript source, which does not pass the checks of this project. */
const { Solver } = createRequire(import.meta.url)("odex");

const cases: [V_s: number, n_edge: number, T_e: number, u_ratio: number, points: number][] = [
  [300, 1e16, 3, 1, 50],
  [1, 1e14, 5, 1, 7],
  [2e5, 1e18, 2, 1, 200],
  [40, 3e15, 4, 1.001, 33],
  [1000, 1e17, 10, 1.7, 50],
  [90, 1e16, 3, 3, 2000],
];

describe.each(cases)(
  "the profile at %f V, %f m⁻³, %f eV, u_ratio %f in %i points",
  (V_s, n_edge, T_e, u_ratio, points) => {
    const rows = sheathProfile(V_s, n_edge, T_e, u_ratio, points);
    const worst = (error: (row: ProfilePoint) => number) => Math.max(...rows.map((row) => Math.abs(error(row))));

    test("every row conserves the flux and the energy of the ions", () => {
      expect(worst(({ ionDensity, speed }) => (ionDensity * speed) / (n_edge * u_ratio) - 1)).toBeLessThan(1e-9);
      expect(worst(({ speed, potential }) => (speed ** 2 + (2 * potential) / T_e) / u_ratio ** 2 - 1)).toBeLessThan(
        1e-9,
      );
    });

    test("every row balances ion momentum, electron pressure and the field's tension: the first integral", () => {
      const tension = (field: number) => 0.5 * ((field * debyeLength(n_edge, T_e)) / T_e) ** 2;
      const balance = ({ speed, electronDensity, field }: ProfilePoint) =>
        (u_ratio * speed + electronDensity / n_edge - tension(field)) / (u_ratio ** 2 + 1) - 1;
      expect(worst(balance)).toBeLessThan(1e-9);
    });

    test("it begins at the wall and ends where the net charge is 1 % of that of the electrons at the edge", () => {
      expect(rows[0].x).toBe(0);
      expect(rows[0].potential).toBeCloseTo(-V_s, 9);
      expect((rows.at(-1)!.ionDensity - rows.at(-1)!.electronDensity) / n_edge).toBeCloseTo(0.01, 12);
      expect(rows.every(({ x }, i) => i === 0 || x > rows[i - 1].x)).toBe(true);
    });

    test("integrating Poisson's equation from its last row to the wall meets the rows, closer with a finer tolerance", () => {
      const [coarse, fine, finest] = [1e-5, 1e-8, 1e-11].map((tolerance) =>
        worstAgainstSolver(rows, n_edge, T_e, u_ratio, tolerance),
      );
      expect(fine).toBeLessThan(0.1 * coarse);
      expect(fine).toBeLessThan(1e-7);
      expect(finest).toBeLessThan(1e-10);
    });
  },
);

/**
 * Worst relative error in potential and field against the second-order equation as it stands on paper, solved by the
 * Gragg–Bulirsch–Stoer method of Hairer & Wanner's ODEX (npm: odex) from the last row towards the wall, with ten stops or
 * so on the way: more of them would hold its steps short whatever the tolerance.
 */
function worstAgainstSolver(
  rows: ProfilePoint[],
  n_edge: number,
  T_e: number,
  u_ratio: number,
  tolerance: number,
): number {
  const debye = debyeLength(n_edge, T_e);
  const solver = new Solver(2);
  solver.absoluteTolerance = solver.relativeTolerance = tolerance;
  const poisson = (_x: number, [eta, slope]: number[]) => [
    slope,
    1 / Math.sqrt(1 + (2 * eta) / u_ratio ** 2) - Math.exp(-eta),
  ];
  const end = rows.at(-1)!;
  let state: number[] = [-end.potential / T_e, (end.field * debye) / T_e];
  let worst = 0;
  const stride = Math.ceil(rows.length / 10);
  for (let last = rows.length - 1; last > 0; last -= stride) {
    const i = Math.max(0, last - stride);
    state = solver.solve(poisson, 0, state, (rows[last].x - rows[i].x) / debye).y;
    const [eta, slope] = state;
    worst = Math.max(
      worst,
      Math.abs(-rows[i].potential / T_e / eta - 1),
      Math.abs((rows[i].field * debye) / T_e / slope - 1),
    );
  }
  return worst;
}

test("at the Bohm speed its last row stands at the full width, in steps large or small", () => {
  for (const points of [2, 15, 2000]) {
    const { x } = sheathProfile(300, 1e16, 3, 1, points).at(-1)!;
    expect(x / fullWidth(300, 1e16, 3)).toBeCloseTo(1, 12);
  }
});

test("a finer profile passes through the points of a coarser one", () => {
  const coarse = sheathProfile(300, 1e16, 3, 1, 11);
  for (const factor of [2, 5, 100]) {
    const fine = sheathProfile(300, 1e16, 3, 1, 10 * factor + 1);
    coarse.forEach((row, i) => {
      expect(fine[i * factor].x / (row.x || 1)).toBeCloseTo(row.x ? 1 : 0, 12);
      expect(fine[i * factor].potential / row.potential).toBeCloseTo(1, 12);
    });
  }
});

test("the charge between the points, summed by the trapezium rule, converges to the change of the field", () => {
  // Gauss's law, without the first integral: the error falls with the square of the spacing.
  const missing = (points: number) => {
    const rows = sheathProfile(300, 1e16, 3, 1, points);
    const charge = rows.slice(1).reduce((sum, row, i) => {
      const before = rows[i];
      const mean = (row.ionDensity - row.electronDensity + before.ionDensity - before.electronDensity) / 2;
      return sum + mean * (row.x - before.x);
    }, 0);
    const fromField = (rows[0].field - rows.at(-1)!.field) * (8.8541878188e-12 / 1.602176634e-19);
    return Math.abs(charge / fromField - 1);
  };
  expect(missing(101) / missing(201)).toBeCloseTo(4, 0);
  expect(missing(2000)).toBeLessThan(1e-5);
});

describe("as a spill", () => {
  const cells = (...values: unknown[]) => (SHEATHPROFILE as any)(...values.map((value) => [[value]]));

  test("it has fifty rows of six numbers unless told otherwise", () => {
    const spill = cells(300, 1e16, 3);
    expect(spill).toHaveLength(50);
    expect(spill.flat().every((value: unknown) => typeof value === "number")).toBe(true);
    expect(spill[0]).toHaveLength(6);
  });

  test("a title row names the columns with their units", () => {
    const spill = cells(300, 1e16, 3, null, 5, true);
    expect(spill).toHaveLength(6);
    expect(spill[0]).toEqual(["x (m)", "potential (V)", "field (V/m)", "Z n_i (m⁻³)", "n_e (m⁻³)", "speed/u_B"]);
  });

  test("numbers of points that cannot be used are refused", () => {
    expect(cells(300, 1e16, 3, null, 10.5)[0][0].message).toMatch(/^points: 10.5 is not a whole number; type/);
    expect(cells(300, 1e16, 3, null, 1)[0][0].message).toMatch(/^points: 1 is below the lowest value/);
    expect(cells(300, 1e16, 3, null, 3000)[0][0].message).toMatch(/at most 2000/);
  });

  test("a drop that ends before the sheath does has no profile", () => {
    const [[cell]] = cells(0.3, 1e16, 3);
    expect(cell).toMatchObject({ code: "#N/A", message: expect.stringMatching(/^V_s is 0.1 T_e.*0.1131 T_e/) });
  });

  test("ions slower than the Bohm speed are refused", () => {
    expect(cells(300, 1e16, 3, 0.9)[0][0].message).toMatch(/^u_ratio: 0.9 is below the lowest value/);
  });
});
