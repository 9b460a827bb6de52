import { describe, expect, test } from "vitest";
import { look } from "../../taskpane/findings/look";
import { Cancelled } from "../../taskpane/findings/pace";
import type { CellContent, WorkbookContent } from "../../taskpane/workbook/workbook";
import { one, SheetModel } from "./sheet-model";

/** A sheet of a density in B1 and a temperature in B2, and one formula in D1 with this saved value. */
function sheet(formula: string, saved: CellContent): SheetModel {
  return new SheetModel()
    .on("Data")
    .type("A1", "density")
    .type("B1", 1e16)
    .type("B2", 3)
    .formula("D1", formula, () => saved);
}

const causesIn = async (content: WorkbookContent) => (await look(content)).findings.map(({ cause }) => cause);
const debye = one("DEBYELENGTH", 1e16, 3) as number;

describe("arguments are followed through", () => {
  test.each([
    ["references", "=SHEATH.DEBYELENGTH(B1,$B$2)"],
    ["literals", "=SHEATH.DEBYELENGTH(1E16,3)"],
    ["text with units", '=SHEATH.DEBYELENGTH("1e10 cm^-3","3 eV")'],
    ["another sheet", "=SHEATH.DEBYELENGTH('T 2'!A1,B2)"],
    ["names of the workbook and of the sheet", "=SHEATH.DEBYELENGTH(density,own)"],
    ["arithmetic", "=SHEATH.DEBYELENGTH(B1*2/2+0,-(1-4)^1)"],
    ["text put together", '=SHEATH.DEBYELENGTH(B1/1E6&" cm^-3",B2&" eV")'],
    ["calls inside calls", '=SHEATH.DEBYELENGTH(SHEATH.UNIT(1E10,"cm^-3"),SHEATH.UNIT(3,"eV","eV"))'],
    ["a choice", "=IF(B1>1E15,SHEATH.DEBYELENGTH(B1,B2),0)"],
    ["a caught error", "=IFERROR(SHEATH.DEBYELENGTH(-1,3),SHEATH.DEBYELENGTH(B1,B2))"],
    ["an array", "=SHEATH.DEBYELENGTH({1E16},{3})"],
    ["LET", "=LET(n,B1,SHEATH.DEBYELENGTH(n,B2))"],
    ["an intersection", "=SHEATH.DEBYELENGTH(@B1:B1,B2)"],
    ["how a saved file spells it", "=_xldudf_SHEATH_DEBYELENGTH(_xlfn.SINGLE(B1),B2)"],
  ])("%s", async (_, formula) => {
    const model = sheet(formula, debye);
    Object.assign(model.names, { density: "Data!$B$1", "Data!own": "$B$2", own: "$A$1" });
    const content = model.on("T 2").type("A1", 1e16).build();
    const { notFollowed, findings } = await look(content);
    expect({ notFollowed, findings }).toEqual({ notFollowed: [], findings: [] });
    // The same formula with another saved value: had it not been followed, nothing would be noticed.
    content.sheets[0].values[0][3] = debye * (1 + 3e-9);
    expect(await causesIn(content)).toEqual(["stale"]);
  });

  test("a saved value within 1e-9 is the same", async () => {
    expect(await causesIn(sheet("=SHEATH.DEBYELENGTH(B1,B2)", debye * (1 + 5e-10)).build())).toEqual([]);
  });

  test("only the branch that is taken is judged", async () => {
    const formula = '=IF(B1>0,SHEATH.DEBYELENGTH(B1,B2),SHEATH.DEBYELENGTH(5,"5 mTorr"))';
    expect(await causesIn(sheet(formula, debye).build())).toEqual([]);
  });
});

describe("what cannot be followed is listed as such, and nothing is guessed", () => {
  test.each([
    ["=SHEATH.DEBYELENGTH(OFFSET(A1,0,1),B2)", "OFFSET is not followed"],
    ["=SHEATH.DEBYELENGTH(density,B2)", 'there is no name "density" in this workbook'],
    ["=SHEATH.DEBYELENGTH([Other.xlsx]Data!A1,B2)", "it refers to another workbook"],
    ["=SHEATH.DEBYELENGTH(Gone!A1,B2)", 'there is no sheet named "Gone"'],
    ["=SHEATH.DEBYELENGTH(Runs[n],B2)", 'there is no table "Runs"'],
    ["=SHEATH.DEBYELENGTH(Data:Other!B1,B2)", "it refers to several sheets at once"],
    ["=SHEATH.DEBYELENGTH(B1,B2", "the formula could not be read"],
    ["=ROUNDUP(SHEATH.DEBYELENGTH(B1,B2),6)", "ROUNDUP is not followed"],
    ["=SHEATH.DEBYELENGTH(loop,B2)", 'the name "loop" refers to itself'],
  ])("%s", async (formula, why) => {
    const model = sheet(formula, 7);
    Object.assign(model.names, { loop: "loop" });
    const { notFollowed, findings } = await look(model.build());
    expect(notFollowed).toEqual(formula.endsWith("B2") ? [] : [{ sheet: "Data", cells: "D1", count: 1, why }]);
    expect(findings).toEqual([]);
  });

  test("a call inside something that is not followed is judged all the same", async () => {
    expect(await causesIn(sheet("=ROUNDUP(SHEATH.DEBYELENGTH(B2,B2),6)", 1).build())).toContain("doubtful");
  });
});

describe("a long workbook", () => {
  /** So many rows with a formula each, all of one relative form. */
  function long(rows: number): WorkbookContent {
    const values = Array.from({ length: rows }, (_, i) => [1e16 + i * 1e11, 3, debye]);
    const formulas = values.map((_, i) => [undefined, undefined, `=SHEATH.DEBYELENGTH(A${i + 1},B${i + 1})`]);
    return { names: {}, sheets: [{ name: "Long", origin: "A1", values, formulas, spills: [], tables: [] }] };
  }

  test(
    "of 100,000 formulas is looked through with progress up to the end, each distinct formula parsed once",
    { timeout: 120_000 },
    async () => {
      const heard: number[] = [];
      const found = await look(long(100_000), { progress: (done) => heard.push(done) });
      expect(found).toMatchObject({ formulas: 100_000, distinct: 1, calls: 100_000 });
      expect(found.findings).toHaveLength(1);
      expect(found.findings[0]).toMatchObject({ cause: "stale", cells: "C2:C100000", count: 99_999, of: 100_000 });
      expect(heard.length).toBeGreaterThan(20);
      expect(heard).toEqual([...heard].sort((a, b) => a - b));
      expect(heard.at(-1)).toBe(1);
    },
  );

  test("stops soon after it is told to, and other work goes on meanwhile", async () => {
    const content = long(100_000);
    const stop = new AbortController();
    let turns = 0;
    const clock = setInterval(() => turns++, 1);
    const started = performance.now();
    setTimeout(() => stop.abort(), 100);
    await expect(look(content, { signal: stop.signal })).rejects.toBeInstanceOf(Cancelled);
    clearInterval(clock);
    expect(turns).toBeGreaterThan(1);
    expect(performance.now() - started).toBeLessThan(1500);
  });
});

test("a sweep over many decades, up and down or step by step, is not doubted; one slip in it is", async () => {
  const sweep = (densities: number[]) => {
    const model = new SheetModel().on("Data");
    densities.forEach((n, i) =>
      model
        .type(`A${i + 1}`, n)
        .formula(`B${i + 1}`, `=SHEATH.DEBYELENGTH(A${i + 1},3)`, (at) => one("DEBYELENGTH", at(`A${i + 1}`), 3)),
    );
    return causesIn(model.build());
  };
  const steps = Array.from({ length: 12 }, (_, i) => 1e14 * 10 ** (i / 2));
  expect(await sweep(steps)).toEqual([]);
  expect(await sweep([...steps, ...steps])).toEqual([]);
  expect(await sweep(steps.flatMap((n) => [n, 1e19 / (n / 1e14)]))).toEqual([]);
  const level = Array.from({ length: 12 }, (_, i) => 2e19 + i * 1e18);
  expect(await sweep(level)).toEqual([]);
  expect(await sweep(level.map((n, i) => (i === 5 ? n / 1e6 : n)))).toEqual(["doubtful"]);
  expect(await sweep(level.map((n, i) => (i === 0 ? n / 1e6 : n)))).toEqual(["doubtful"]);
});

test("text that a workbook holds stays text: a formula in a string is not a call", async () => {
  const model = new SheetModel()
    .on("Data")
    .type("A1", "=SHEATH.DEBYELENGTH(1,1)")
    .formula("A2", '="SHEATH.X(1)"', () => "SHEATH.X(1)");
  expect(await look(model.build())).toMatchObject({ calls: 0, findings: [] });
});
