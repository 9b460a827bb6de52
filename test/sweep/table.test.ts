import { expect, test } from "vitest";
import { catalogue, entryNamed } from "../../functions/catalogue";
import { frontDoors } from "../../functions/front-doors";
import { readTyped, typedText } from "../../taskpane/pane/typed";
import { sweptInputs, usualEnds, valuesTyped } from "../../taskpane/sweep/offered";
import { runSweep } from "../../taskpane/sweep/run";
import { sweepTable, type Sweep } from "../../taskpane/sweep/table";
import { cellsIn } from "../../taskpane/workbook/address";
import { parse, tokenize, type ReferenceIdentifier } from "@borgar/fx";

function sweepOf(name: string, swept: number, values: number[], texts: string[], unit = ""): Sweep {
  return { entry: entryNamed(name)!, swept, values, typed: texts.map(readTyped), unit: readTyped(unit) };
}

const width = sweepOf("SHEATHWIDTH", 0, [20, 200, 2000], ["300", "1e12 cm^-3", "3", "full", ""], "mm");

test("the inputs that stand still come first, each in a cell of its own with its unit", () => {
  const { cells } = sweepTable(width, { row: 4, column: 1 });
  expect(cells.slice(0, 4)).toEqual([
    ["n_edge", { text: "1e12 cm^-3" }],
    ["T_e (eV)", 3],
    ["model", { text: "full" }],
    [],
  ]);
});

test("below them stand headings, the values, one formula for all results and one for the limits", () => {
  const { cells, size } = sweepTable(width, { row: 4, column: 1 });
  expect(cells.slice(4)).toEqual([
    ["V_s (V)", "SHEATHWIDTH (mm)", "Validity limits"],
    [20, '=SHEATH.SHEATHWIDTH(B10:B12,C5,C6,C7,,"mm")', '=SHEATH.LIMITCHECK("SHEATHWIDTH",B10:B12,C5,C6,C7)'],
    [200],
    [2000],
  ]);
  expect(size).toEqual({ rows: 8, columns: 3 });
});

test("a function of one input has no cells above its headings, and one without limits no column for them", () => {
  const { cells } = sweepTable(sweepOf("EMISSIONLIMIT", 0, [1, 4, 40], ["Ar+"]), { row: 0, column: 0 });
  expect(cells[0]).toEqual(["ion (u)", "delta_c", "-V_w/T_e", "E_edge/(Z T_e)"]);
  expect(cells[1]).toEqual([1, "=SHEATH.EMISSIONLIMIT(A2:A4)", null, null]);
});

test("what is typed stays text, even where it looks like a formula", () => {
  const { cells } = sweepTable(sweepOf("BOHMSPEED", 0, [1, 2], ["3", "=1+1"]), { row: 0, column: 0 });
  expect(cells[0]).toEqual(["ion", { text: "=1+1" }]);
});

test("the charted cells are the headed columns of the swept input and of the result", () => {
  const { plotted, headings } = sweepTable(width, { row: 4, column: 1 });
  expect(plotted).toEqual({ from: { row: 8, column: 1 }, to: { row: 11, column: 2 } });
  expect(headings).toEqual(["V_s (V)", "SHEATHWIDTH (mm)"]);
});

/** What a sheet would compute: the formula as @borgar/fx parses it, on the cells that its references name. */
function computed(formula: string, cells: unknown[][]): unknown[][] {
  const at = (address: string) => cellsIn(address).map(({ row, column }) => [plain(cells[row]?.[column] ?? null)]);
  const plain = (cell: unknown) => (cell as { text?: string })?.text ?? cell;
  const call = parse(tokenize(formula)) as any;
  const args = call.arguments.map((node: any) => {
    if (node === null || node === undefined) return null;
    if (node.type === "ReferenceIdentifier") return at((node as ReferenceIdentifier).value);
    return [[node.value]];
  });
  return frontDoors[call.callee.name.replace("SHEATH.", "")](...args);
}

test("the formula of every function's table, parsed by another library, gives the values of the preview", () => {
  for (const entry of catalogue) {
    for (const swept of sweptInputs(entry)) {
      const typed = entry.inputs.map((_, i) => readTyped(typedText(entry.example[i])));
      const values = valuesTyped(entry.inputs[swept], {
        ...usualEnds(entry.inputs[swept], typed[swept].cell),
        count: 4,
      });
      const sweep: Sweep = { entry, swept, values: values as number[], typed, unit: readTyped("") };
      const { cells } = sweepTable(sweep, { row: 0, column: 0 });
      const formula = cells
        .flat()
        .find((cell) => typeof cell === "string" && cell.startsWith(`=SHEATH.${entry.name}(`));
      const preview = runSweep(sweep, "linear");
      if (typeof preview === "string") throw new Error(`${entry.name}: ${preview}`);
      const column = computed(formula as string, cells).map(([cell]) => (typeof cell === "number" ? cell : NaN));
      expect(column, `${entry.name} over ${entry.inputs[swept].name}`).toEqual(preview.y[0].values);
    }
  }
});
