import { describe, expect, test } from "vitest";
import { catalogue, entryNamed } from "../../functions/catalogue";
import { plainCells, type PlainCells } from "../../taskpane/twin/plain-cells";
import { namesIn, withReferences } from "../../taskpane/twin/references";
import { writePlainCells } from "../../taskpane/pane/plain-cells-view";
import { fakeWorkbook } from "./fake-workbook";

const corner = { row: 0, column: 0 };
const block = (name: string, ...args: unknown[]) => plainCells(entryNamed(name)!, args, corner);
const written = (name: string, ...args: unknown[]) => block(name, ...args) as PlainCells;

test("a block names what it computes, its inputs with units, the constants, the steps and the result", () => {
  expect(written("COLLISIONALBOHMSPEED", "35000 K", "Ar+", "1e10 cm^-3", "1 mm").cells).toEqual([
    ["COLLISIONALBOHMSPEED as plain cells", "value", "unit"],
    ["T_e", expect.closeTo(3.01606, 4), "eV"],
    ["ion", "Ar+", null],
    ["M, mass of Ar+", expect.closeTo(6.6334e-26, 29), "kg"],
    ["Z, charge of Ar+", 1, null],
    ["n_edge", 1e16, "m⁻³"],
    ["lambda_i", 1e-3, "m"],
    ["e, elementary charge (CODATA 2022)", 1.602176634e-19, "C"],
    ["eps0, vacuum electric permittivity (CODATA 2022)", 8.8541878188e-12, "F/m"],
    ["u_B", "=SQRT(B5*B8*B2/B4)", "m/s"],
    ["lambda_D", "=SQRT(B9*B2/(B8*B6))", "m"],
    ["COLLISIONALBOHMSPEED", "=B10/SQRT(1+PI()*B11/(2*B7))", "m/s"],
  ]);
});

test("a block refers to its own cells wherever it starts", () => {
  const there = plainCells(entryNamed("PRESHEATHDROP")!, [3, 0.5], { row: 9, column: 26 }) as PlainCells;
  expect(there.cells[3]).toEqual(["PRESHEATHDROP", "=-AB11*LN(AB12)", "V"]);
});

test("a default is written out, and so is what a blank stands for", () => {
  const rows = written("WALLFLUX", 1e17, 3, "Ar+").cells;
  expect(rows).toContainEqual(["T_i", 0, "eV"]);
  expect(rows).toContainEqual(["edge_ratio", Math.exp(-0.5), null]);
  expect(rows).toContainEqual(["angle", 90, "°"]);
});

test("a gas in place of a cross-section is written as the area it stands for", () => {
  expect(written("MEANFREEPATH", 0.7, "Ar").cells).toContainEqual(["sigma", 1e-18, "m²"]);
});

test("a result in another unit stands below the result in the function's own", () => {
  const { cells, results } = written("DEBYELENGTH", 1e16, 3, null, "mm");
  expect(cells.slice(-2).map(([what, , unit]) => [what, unit])).toEqual([
    ["DEBYELENGTH", "m"],
    ["DEBYELENGTH", "mm"],
  ]);
  expect(cells.at(-1)![1]).toBe(`=B${cells.length - 1}/0.001`);
  expect(results).toEqual([cells.length - 1]);
});

test("a mixture stands ion by ion, blank lines left out, and its sums run over their range", () => {
  const ions = [["Ar+"], [null], ["He+"]];
  const { cells } = written("IONMIXSPEEDS", 3, ions, [[0.6], [0], [0.4]]);
  const labels = cells.map(([what]) => what);
  expect(labels.filter((what) => /^M,|^fractions/.test(String(what)))).toEqual([
    "M, mass of Ar+",
    "M, mass of He+",
    "fractions 1",
    "fractions 2",
  ]);
  expect(cells.find(([what]) => what === "u_common")![1]).toBe("=SQRT(B10*B2*SUMPRODUCT(B7:B8*B5:B6*B5:B6/B3:B4))");
});

describe("no block, but the reason,", () => {
  test("where the function has no solution", () => {
    expect(block("IONIMPACTENERGY", 3, "Ar+", 0, 20)).toMatch(/type a bias magnitude as negative/);
  });
  test("where an input cannot be read", () => {
    expect(block("DEBYELENGTH", "1e16 kg", 3)).toMatch(/^n_e: /);
  });
  test("where everything is blank", () => {
    expect(block("DEBYELENGTH", null, null)).toMatch(/blank/);
  });
  test("for a whole column", () => {
    expect(block("DEBYELENGTH", [[1e16], [1e17]], 3)).toMatch(/single values/);
  });
  test("for a word whose value takes an integral", () => {
    expect(block("SHEATHWIDTH", 300, 1e16, 3, "full")).toBe(
      'There is no plain form of this function: model "full" takes more than cell arithmetic.',
    );
  });
  test("for a function without a plain form", () => {
    expect(block("EMISSIONLIMIT", "Ar+")).toMatch(/no plain form of this function: .*iteration\.$/);
  });
});

test("text that a sheet would take for a formula is refused at every place, whatever the function", () => {
  const hostile = ["=1+1", "+A1", "@SUM(1)", "-2+3", '=HYPERLINK("x")', "=Ar+", "=mm", "\t=A1", "Ar+=1"];
  for (const entry of catalogue) {
    for (let i = 0; i <= entry.inputs.length; i++) {
      for (const text of hostile) {
        const args: unknown[] = [...entry.example];
        while (args.length <= i) args.push(null);
        args[i] = text;
        if (i < entry.inputs.length || entry.takesUnit) {
          expect(plainCells(entry, args, corner), `${entry.name} ${i} ${text}`).toBeTypeOf("string");
        }
      }
    }
  }
});

test("no label and no unit begins with a sign that a sheet would take for a formula", () => {
  for (const entry of catalogue) {
    const made = plainCells(entry, [...entry.example], corner);
    const rows = typeof made === "string" ? [] : made.cells;
    for (const [what, , unit] of rows) expect(`${what} ${unit}`).toMatch(/^[A-Za-z(].* [A-Za-zΩ°]/);
  }
});

test("every name in a plain form is an input, a constant or a step above it", () => {
  for (const entry of catalogue) {
    if (typeof entry.twin === "object" && !entry.twin.except) {
      expect(plainCells(entry, [...entry.example], corner), entry.name).toBeTypeOf("object");
    }
  }
});

test("names are told from functions, numbers and text", () => {
  expect(namesIn('IF(V_w="floating e",LN(1E5*e),2e-3*PI()+T_e/T_e)')).toEqual(["V_w", "e", "T_e"]);
  expect(withReferences('IF(e="e",e*EXP(e),1e5)', () => "B1")).toBe('IF(B1="e",B1*EXP(B1),1e5)');
});

describe("the button", () => {
  const DEBYELENGTH = entryNamed("DEBYELENGTH")!;

  test("writes from the selected cell on, and says how far", async () => {
    const { workbook, cells } = fakeWorkbook();
    expect(await writePlainCells(DEBYELENGTH, workbook, [1e16, 3])).toBe(
      "Written from B5 on “Chamber” on, 8 rows by 3 columns.",
    );
    expect(cells.B5).toBe("DEBYELENGTH as plain cells");
    expect(cells.C12).toBe("=IF(C8>0,1/SQRT(1/C11^2+C9*C6/(C10*C8)),C11)");
  });

  test("never overwrites: a filled cell anywhere in the block stops it", async () => {
    const { workbook, cells } = fakeWorkbook({ D9: "my note" });
    const said = await writePlainCells(DEBYELENGTH, workbook, [1e16, 3]);
    expect(said).toBe("D9 on “Chamber” is filled. Select a cell with 8 rows and 3 columns free below and beside it.");
    expect(await writePlainCells(DEBYELENGTH, workbook, [1e16, 3])).toBe(said);
    expect(cells).toEqual({ D9: "my note" });
  });

  test("writes nothing where there is no result or no selected cell", async () => {
    const { workbook, cells, state } = fakeWorkbook();
    expect(await writePlainCells(DEBYELENGTH, workbook, ["dense", 3])).toMatch(/^n_e: /);
    state.selected = undefined;
    expect(await writePlainCells(DEBYELENGTH, workbook, [1e16, 3])).toMatch(/select one/);
    expect(cells).toEqual({});
  });
});
