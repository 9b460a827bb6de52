import { expect, test } from "vitest";
import { entryNamed } from "../../functions/catalogue";
import { writeSweep } from "../../taskpane/pane/sweep-write";
import { readTyped } from "../../taskpane/pane/typed";
import type { Sweep } from "../../taskpane/sweep/table";
import type { Chart, Workbook } from "../../taskpane/workbook/workbook";
import { fakeWorkbook } from "../taskpane/fake-workbook";

const sweep: Sweep = {
  entry: entryNamed("SHEATHWIDTH")!,
  swept: 0,
  values: [20, 200, 2000],
  typed: ["300", "1e16", "3", "", ""].map(readTyped),
  unit: readTyped("mm"),
};

test("a sweep is written from the selected cell on, and the answer says where", async () => {
  const { workbook, cells } = fakeWorkbook();
  expect(await writeSweep(workbook, sweep, "logarithmic")).toBe("Written to B5:D11 on “Chamber”.");
  expect(cells.B5).toBe("n_edge (m⁻³)");
  expect(cells.C9).toBe('=SHEATH.SHEATHWIDTH(B9:B11,C5,C6,,,"mm")');
  expect(cells.D9).toBe('=SHEATH.LIMITCHECK("SHEATHWIDTH",B9:B11,C5,C6)');
});

test("one filled cell anywhere in its way keeps the sweep from being written, and is named", async () => {
  for (const inTheWay of ["B5", "D11", "C7"]) {
    const { workbook, cells } = fakeWorkbook({ [inTheWay]: 7 });
    const said = await writeSweep(workbook, sweep, "logarithmic");
    expect(said).toBe(
      `${inTheWay} on “Chamber” is filled, and nothing was written. Select a cell with 7 rows and 3 columns free.`,
    );
    expect(cells).toEqual({ [inTheWay]: 7 });
  }
});

test("without a selected cell nothing is written", async () => {
  const { workbook, cells, state } = fakeWorkbook();
  state.selected = undefined;
  expect(await writeSweep(workbook, sweep, "linear")).toMatch(/select one in the sheet/);
  expect(cells).toEqual({});
});

function withCharts(addChart: Workbook["addChart"]) {
  const fake = fakeWorkbook();
  return { ...fake, workbook: { ...fake.workbook, capabilities: new Set(["write", "chart"] as const), addChart } };
}

test("where the workbook has charts, one of the headed columns stands beside the table", async () => {
  const drawn: Chart[] = [];
  const { workbook } = withCharts(async (chart) => void drawn.push(chart));
  expect(await writeSweep(workbook, sweep, "logarithmic")).toMatch(/The chart stands beside it\.$/);
  expect(drawn).toEqual([
    {
      sheet: "Chamber",
      cells: "B8:C11",
      title: "SHEATHWIDTH",
      titleX: "V_s (V)",
      titleY: "SHEATHWIDTH (mm)",
      logarithmicX: true,
      at: { from: "F8", to: "M25" },
    },
  ]);
});

test("a chart that can't be made leaves the table standing, and is told", async () => {
  const { workbook, cells } = withCharts(() => Promise.reject(new Error("no room")));
  expect(await writeSweep(workbook, sweep, "linear")).toBe(
    "Written to B5:D11 on “Chamber”. The chart could not be added: no room",
  );
  expect(cells.B5).toBe("n_edge (m⁻³)");
});
