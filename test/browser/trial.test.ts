import { describe, expect, test } from "vitest";
import { cell, column, enter, expectStatus, openTrial, readSheet, select } from "./trial-sheet";

/** NRL Plasma Formulary: 7.43×10² √(T/n) cm, T in eV and n in cm⁻³; here in mm, with n in m⁻³. */
const nrlDebyeLength = (n: number, T: number) => 7430 * Math.sqrt(T / (n * 1e-6));

const isError = (content: unknown): content is { error: string; message?: string } =>
  typeof content === "object" && content !== null;

describe("the sheet it opens with", () => {
  test("fills forty rows from one formula a column, and the Debye lengths are those of the NRL formula", async () => {
    const page = await openTrial();
    const { spills, formulas } = await readSheet(page);
    expect(spills).toContainEqual({ anchor: "F8", range: "F8:F47" });
    expect(formulas.slice(7, 47).filter((row) => row[5])).toHaveLength(1);
    const [densities, temperatures, lengths] = [
      await column(page, "D"),
      await column(page, "E"),
      await column(page, "F"),
    ];
    const plain = densities.flatMap((n, i) => (typeof n === "number" ? [i] : []));
    expect(plain).toHaveLength(38);
    for (const i of plain) {
      const expected = nrlDebyeLength(densities[i] as number, temperatures[i] as number);
      // Printed to three digits; its coefficient is 743.4 with the constants of CODATA 2022.
      expect(Math.abs((lengths[i] as number) / expected - 1)).toBeLessThan(1e-3);
    }
  });

  test("has one bad reading, whose row alone shows errors that say what to type instead", async () => {
    const page = await openTrial();
    const { values } = await readSheet(page);
    const rowsWithErrors = values.flatMap((row, i) => (row.some(isError) ? [i + 1] : []));
    expect(rowsWithErrors).toEqual([18]);
    await expectStatus(page, "F18", /^F18 #VALUE! n_e: "OL" is .*type a density such as /);
    await expectStatus(page, "F17", /^F17 0\.0771/);
  });

  test("multiplies a filled column cell by cell with the wafer's area, and follows when that changes", async () => {
    const page = await openTrial();
    const [before, density] = [await column(page, "K"), await column(page, "J")];
    expect(before[0]).toBeCloseTo(((density[0] as number) * 707) / 1000, 12);
    await enter(page, "G4", "1414");
    await expect.poll(async () => (await column(page, "K"))[0]).toBeCloseTo(2 * (before[0] as number), 12);
  });
});

describe("typing into cells", () => {
  test("a formula in any case shows its value with all its digits", async () => {
    const page = await openTrial();
    await enter(page, "N8", "=sheath.DebyeLength(1e16,3)");
    // ε₀ and e of CODATA 2022: √(8.8541878188e-12 × 3/(1e16 × 1.602176634e-19)).
    const expected = Math.sqrt((8.8541878188e-12 * 3) / (1e16 * 1.602176634e-19));
    await expectStatus(page, "N8", /^N8 0\.000128759652/);
    expect((await cell(page, "N8")) as number).toBeCloseTo(expected, 18);
  });

  test("a broken reading breaks its own row, and its value comes back when it is put right", async () => {
    const page = await openTrial();
    const before = await column(page, "F");
    await enter(page, "D20", "OL");
    await expectStatus(page, "F20", /^F20 #VALUE! n_e: "OL"/);
    const broken = await column(page, "F");
    expect(broken.filter((_, i) => i !== 12)).toEqual(before.filter((_, i) => i !== 12));
    await enter(page, "D20", "6.34e16");
    await expectStatus(page, "F20", String(before[12]) + " (filled by the formula in F8)");
  });

  test("the bad reading it opens with can be put right", async () => {
    const page = await openTrial();
    await enter(page, "D18", "4.2e10 cm^-3");
    await expectStatus(page, "F18", /^F18 0\.0671/);
    expect((await column(page, "F")).filter(isError)).toEqual([]);
  });

  test("a temperature typed in pascal is refused by its dimension, in its own row", async () => {
    const page = await openTrial();
    await enter(page, "E20", "3 Pa");
    await expectStatus(page, "F20", /^F20 #VALUE! T_e: "Pa" is a unit of pressure/);
    await expectStatus(page, "F21", /^F21 0\.0512/);
  });

  test("a typed unit is read: the same row in cm⁻³ keeps its Debye length", async () => {
    const page = await openTrial();
    const before = await cell(page, "F20");
    await enter(page, "D20", "6.34e10 cm^-3");
    await expect.poll(() => cell(page, "D20")).toBe("6.34e10 cm^-3");
    await expectStatus(page, "F20", /^F20 0\.05507/);
    expect((await cell(page, "F20")) as number).toBeCloseTo(before as number, 14);
  });

  test("an emptied row shows nothing, and its neighbours stay", async () => {
    const page = await openTrial();
    const before = await column(page, "F");
    await select(page, "D20");
    await page.keyboard.press("Delete");
    await expectStatus(page, "F20", /^F20 #VALUE! n_e is blank/);
    await select(page, "E20");
    await page.keyboard.press("Delete");
    await expect.poll(() => cell(page, "F20")).toBe("");
    const after = await column(page, "F");
    expect(after.filter((_, i) => i !== 12)).toEqual(before.filter((_, i) => i !== 12));
  });

  test("an incoming #DIV/0! passes through its own row only", async () => {
    const page = await openTrial();
    await enter(page, "E22", "=1/0");
    await expectStatus(page, "F22", /^F22 #DIV\/0! /);
    const errors = (await column(page, "F")).flatMap((content, i) =>
      isError(content) ? [[8 + i, content.error]] : [],
    );
    expect(errors).toEqual([
      [18, "#VALUE!"],
      [22, "#DIV/0!"],
    ]);
  });

  test("ranges of different lengths are refused with both sizes", async () => {
    const page = await openTrial();
    await enter(page, "N8", "=SHEATH.DEBYELENGTH(D8:D12,E8:E11)");
    await expectStatus(
      page,
      "N8",
      /#VALUE! T_e: a range of 4 rows by 1 column does not match n_e of 5 rows by 1 column/,
    );
  });

  test("functions call one another in one formula", async () => {
    const page = await openTrial();
    await enter(page, "N8", '=SHEATH.BOHMSPEED(SHEATH.UNIT(34813.55,"K","eV"),"Ar+")*2');
    // 34813.55 K are 3 eV (k_B/e of CODATA 2022); argon at 3 eV: 2691.8 m/s, the catalogue's check value.
    await expect.poll(async () => Math.round(Number(await cell(page, "N8")))).toBe(5384);
  });

  test("text results stay text, and count as text where they are read", async () => {
    const page = await openTrial();
    await expectStatus(page, "L9", "holds (filled by the formula in L8)");
    await enter(page, "N8", '=L9&"!"');
    await expectStatus(page, "N8", "holds!");
    await enter(page, "N9", "=SHEATH.VERDICT(L8:L17,L19:L47)");
    await expectStatus(page, "N9", "39 hold");
  });

  test("numbers in a formula leave the quoted text behind them alone", async () => {
    const page = await openTrial();
    await enter(page, "N8", '=SHEATH.UNIT(5e-3,"m","mm")');
    await expectStatus(page, "N8", "5");
    await enter(page, "N9", '=SHEATH.UNIT(1.50,"m","mm")+5E+3');
    await expectStatus(page, "N9", "6500");
    await enter(page, "N10", "=5e-3");
    await expectStatus(page, "N10", "0.005");
  });

  test("a value in the way of a filling formula is told, and the formula fills again when it is gone", async () => {
    const page = await openTrial();
    await enter(page, "N8", "=SHEATH.DEBYELENGTH(D8:D12,E8:E12)");
    await expect.poll(() => cell(page, "N12")).toBeTypeOf("number");
    await enter(page, "N10", "in the way");
    await expectStatus(page, "N8", /^N8 #SPILL! /);
    await select(page, "N10");
    await page.keyboard.press("Delete");
    await expect.poll(() => cell(page, "N12")).toBeTypeOf("number");
  });

  test("an unknown function is told as one", async () => {
    const page = await openTrial();
    await enter(page, "N8", "=SHEATH.NOSUCHTHING(1)");
    await expectStatus(page, "N8", /^N8 #NAME\? There is no function/);
  });
});

test("a hundred thousand rows fill from one call, and an edit among them is calculated", async () => {
  const page = await openTrial();
  await page.evaluate(async () => {
    const rows = Array.from({ length: 100_000 }, (_, i) => [1e15 * (1 + (i % 100)), 2 + (i % 7)]);
    const call = "=SHEATH.DEBYELENGTH(A1:A100000,B1:B100000)";
    await window.wallfallWorkbook.replaceSheet("Long", rows);
    await window.wallfallWorkbook.write({ sheet: "Long", address: "D1" }, [[call]]);
  });
  const soon = { timeout: 30_000, interval: 500 };
  await expect.poll(() => cell(page, "D100000", "Long"), soon).toBeTypeOf("number");
  await page.evaluate(() => window.wallfallWorkbook.write({ sheet: "Long", address: "A50000" }, [["OL"]]));
  await expect.poll(() => cell(page, "D50000", "Long"), soon).toHaveProperty("error", "#VALUE!");
  expect(await cell(page, "D50001", "Long")).toBeTypeOf("number");
});
