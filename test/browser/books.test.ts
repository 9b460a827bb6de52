import { expect, test } from "vitest";
import type { CellContent, SheetContent } from "../../taskpane/workbook/workbook";
import { openTrial, readSheet } from "./trial-sheet";

const isError = (content: CellContent) => typeof content === "object" && content !== null;

/** A column by the heading above its unit, or the nth of them; only where it holds something. */
function column({ values }: SheetContent, heading: string, nth = 0): CellContent[] {
  const row = values.findIndex((cells) => cells.includes(heading));
  const at = values[row].flatMap((cell, i) => (cell === heading ? [i] : []))[nth];
  const cells = values.slice(row + 2).map((each) => each[at] ?? null);
  const filled = cells.flatMap((cell, i) => (cell === null || cell === "" ? [] : [i]));
  return cells.slice(0, (filled.at(-1) ?? -1) + 1);
}

const numbers = (cells: CellContent[]) => cells.map(Number);

test("the chuck and the oxygen–argon source compute without an error anywhere", async () => {
  const page = await openTrial();
  for (const name of ["Chuck", "Oxygen–argon"]) {
    const { values } = await readSheet(page, name);
    expect(values.length, name).toBeGreaterThan(40);
    expect(values.flat().filter(isError), name).toEqual([]);
  }
});

test("the chuck's readings become drops against the edge: plasma potential and half an electron temperature between", async () => {
  const sheet = await readSheet(await openTrial(), "Chuck");
  const [readings, walls] = [numbers(column(sheet, "Chuck to ground")), numbers(column(sheet, "Wall to edge"))];
  expect(readings).toHaveLength(41);
  expect([readings[0], readings.at(-1)]).toEqual([-20, -2000]);
  // WALLTOEDGE with the free edge ratio exp(−1/2), at 18 V and 3.2 eV.
  walls.forEach((V_w, i) => expect(V_w).toBeCloseTo(readings[i] - 18 + 1.6, 9));
});

test("beside the widths stand their limits: Child's law comes to hold where its width comes near the full one", async () => {
  const sheet = await readSheet(await openTrial(), "Chuck");
  const [full, child] = [numbers(column(sheet, "Full")), numbers(column(sheet, "Child law"))];
  const limits = column(sheet, "Limits", 1).map((text) => String(text).split(":")[0]);
  expect(limits[0]).toBe("fails");
  expect(limits.at(-1)).toBe("holds");
  // Child over full: 0.26 at 5 T_e, 0.52 at 30, 0.69 at 100, 0.90 at 1000 (limits of the layer, recomputed).
  limits.forEach((word, i) => {
    if (word === "fails") expect(child[i] / full[i]).toBeLessThan(0.53);
    if (word === "holds") expect(child[i] / full[i]).toBeGreaterThan(0.79);
  });
});

test("impact energy and heat flux grow with the bias as energy conservation says", async () => {
  const sheet = await readSheet(await openTrial(), "Chuck");
  const walls = numbers(column(sheet, "Wall to edge"));
  const energies = numbers(column(sheet, "Impact energy"));
  energies.forEach((E, i) => expect(E).toBeCloseTo(-walls[i] + 3.2 / 2, 9));
});

test("the profile stands under its own titles, from the wall at the chosen bias to the edge", async () => {
  const sheet = await readSheet(await openTrial(), "Chuck");
  const row = sheet.values.findIndex((cells) => cells.includes("x (m)"));
  const at = sheet.values[row].indexOf("x (m)");
  expect(sheet.values[row].slice(at, at + 6)).toEqual([
    "x (m)",
    "potential (V)",
    "field (V/m)",
    "Z n_i (m⁻³)",
    "n_e (m⁻³)",
    "speed/u_B",
  ]);
  const profile = sheet.values.slice(row + 1, row + 41).map((cells) => cells.slice(at, at + 6).map(Number));
  expect(profile[0][0]).toBe(0);
  expect(profile[0][1]).toBeCloseTo(-400 - 18 + 1.6, 9);
  // Every ion that enters arrives: density times speed stays.
  for (const [, , , n, , u] of profile) expect(n * u).toBeCloseTo(profile[0][3] * profile[0][5], -9);
});

test("without negative ions the first row is the plain sheath, and each row's charge balances", async () => {
  const sheet = await readSheet(await openTrial(), "Oxygen–argon");
  const [alpha, electrons, edge, speed] = [
    "n₋/n_e in the body",
    "Electrons in the body",
    "n_e edge over body",
    "Speed over u_B",
  ].map((heading) => numbers(column(sheet, heading)));
  expect([alpha[0], speed[0]]).toEqual([0, 1]);
  expect(edge[0]).toBeCloseTo(Math.exp(-0.5), 12);
  alpha.forEach((each, i) => expect(electrons[i] * (1 + each)).toBeCloseTo(6e16, -6));
});

test("in each gas mix both ions reach the wall at one speed, and their currents carry their fractions", async () => {
  const sheet = await readSheet(await openTrial(), "Oxygen–argon");
  const [fractions, speeds, fluxes] = ["Fraction of n_e", "Speed at the edge", "Flux to the wall"].map((heading) =>
    numbers(column(sheet, heading)),
  );
  expect(fractions).toHaveLength(22);
  for (let i = 0; i < fractions.length; i += 2) {
    expect(fractions[i] + fractions[i + 1]).toBeCloseTo(1, 12);
    expect(speeds[i]).toBe(speeds[i + 1]);
    expect(fluxes[i] / fluxes[i + 1]).toBeCloseTo(fractions[i] / fractions[i + 1], 9);
  }
});

/**
 * The function that the points were made from, 7.5e15 exp(−E/2.9 − (E/24)²): density ∫√E F dE and mean energy, by
 * scipy.integrate.quad of SciPy 1.10.
 */
const truth = { density: 3.12049e16, meanEnergy: 4.07733 };

test("two hundred noisy points give the density and mean energy they were made from, within the stated bound", async () => {
  const sheet = await readSheet(await openTrial(), "Oxygen–argon");
  expect(column(sheet, "Electron energy")).toHaveLength(200);
  const [names, values, bounds] = ["From the points", "Value", "95 % bound"].map((heading) => column(sheet, heading));
  const of = (name: string) => [values, bounds].map((cells) => Number(cells[names.indexOf(name)]));
  const [density, densityBound] = of("Density, m⁻³");
  const [energy, energyBound] = of("Mean energy, eV");
  expect(Math.abs(density - truth.density)).toBeLessThan(densityBound);
  expect(Math.abs(energy - truth.meanEnergy)).toBeLessThan(energyBound);
  expect(densityBound / density).toBeLessThan(0.05);
});

test("the invented measurement is the same at every opening", async () => {
  const [first, second] = [
    await readSheet(await openTrial(), "Oxygen–argon"),
    await readSheet(await openTrial(), "Oxygen–argon"),
  ];
  expect(column(first, "Probability function")).toEqual(column(second, "Probability function"));
});
