import { afterEach, beforeEach, expect, test, vi } from "vitest";
import { officeWorkbook } from "../../taskpane/workbook/office";
import { FakeHost } from "./fake-host";

let host: FakeHost;
const workbook = officeWorkbook();

beforeEach(() => {
  host = new FakeHost({
    "Pre clean": [
      ["n_e", "T_e"],
      [1e16, 3],
    ],
    Empty: [],
  });
  vi.stubGlobal("Excel", { run: host.run });
  vi.stubGlobal("Office", { context: { requirements: { isSetSupported: () => true } } });
});

afterEach(() => {
  // A property read before context.sync() or without load() is what goes wrong in a real host.
  expect(host.complaints).toEqual([]);
  vi.unstubAllGlobals();
});

test("the selection is a sheet and a plain address, whatever quoting the host puts around them", async () => {
  host.select("Pre clean", "B2");
  expect(await workbook.selection()).toEqual({ sheet: "Pre clean", address: "B2" });
});

test("a listener hears of selections until it stops", async () => {
  const heard: string[] = [];
  const stop = workbook.onSelection(({ address }) => heard.push(address));
  await new Promise((resolve) => setTimeout(resolve));
  await host.select("Pre clean", "B2");
  stop();
  await new Promise((resolve) => setTimeout(resolve));
  await host.select("Pre clean", "A1");
  expect(heard).toEqual(["B2"]);
});

test("a cell with a value, a formula or a part of a spill is filled, an empty one is not", async () => {
  host.spill("Pre clean", "D1", "=SHEATH.EMISSIONLIMIT(A1)", [["", 0.9, 1.01]]);
  const filled = (address: string) => workbook.isFilled({ sheet: "Pre clean", address });
  expect(await filled("A1")).toBe(true);
  expect(await filled("D1")).toBe(true);
  expect(await filled("F1")).toBe(true);
  expect(await filled("C1")).toBe(false);
});

test("one filled cell fills a range", async () => {
  const filled = (address: string) => workbook.isFilled({ sheet: "Pre clean", address });
  expect(await filled("B2:D4")).toBe(true);
  expect(await filled("C1:D9")).toBe(false);
  host.set("Pre clean", "D4", "=A1", "", "Empty");
  expect(await filled("C1:D9")).toBe(true);
});

test("a chart draws the given cells over a measured abscissa, with both axes named", async () => {
  const at = { from: "F1", to: "M18" };
  const chart = { sheet: "Pre clean", cells: "A1:B2", title: "WALLFLUX", titleX: "n_e", titleY: "T_e", at };
  await workbook.addChart({ ...chart, logarithmicX: true });
  expect(host.charts).toMatchObject([
    {
      kind: "XYScatterLinesNoMarkers",
      source: "Pre clean!A1:B2",
      seriesBy: "Columns",
      title: { text: "WALLFLUX" },
      legend: { visible: false },
      axes: {
        categoryAxis: { title: { text: "n_e" }, scaleType: "Logarithmic" },
        valueAxis: { title: { text: "T_e" }, scaleType: "Linear" },
      },
      position: "F1:M18",
    },
  ]);
});

test("a chart of several columns has a legend in place of an axis title", async () => {
  const at = { from: "F1", to: "M18" };
  const chart = { sheet: "Pre clean", cells: "A1:C2", title: "EMISSIONLIMIT", titleX: "ion (u)", titleY: "", at };
  await workbook.addChart({ ...chart, logarithmicX: false });
  expect(host.charts).toMatchObject([{ legend: { visible: true }, axes: { categoryAxis: { scaleType: "Linear" } } }]);
});

test("formulas, numbers and text are written as such, and null leaves a cell alone", async () => {
  await workbook.write({ sheet: "Pre clean", address: "A2" }, [["=1+1", null, "-50 V"], [4]]);
  expect(host.row("Pre clean", 2)).toEqual(["=1+1", 3, "'-50 V"]);
  expect(host.row("Pre clean", 3)).toEqual([4]);
});

test("reading gives values, errors, blanks, formulas and names", async () => {
  host.set("Pre clean", "C2", "=SHEATH.DEBYELENGTH(A2,B2)", 1.2876e-4);
  host.set("Pre clean", "C3", "=NA()", "#N/A", "Error");
  host.names = { T_e: "='Pre clean'!$B$2" };
  const { sheets, names } = await workbook.read();
  expect(names).toEqual({ T_e: "'Pre clean'!$B$2" });
  expect(sheets.map(({ name }) => name)).toEqual(["Pre clean", "Empty"]);
  expect(sheets[0].origin).toBe("A1");
  expect(sheets[0].values).toEqual([
    ["n_e", "T_e", null],
    [1e16, 3, 1.2876e-4],
    [null, null, { error: "#N/A" }],
  ]);
  expect(sheets[0].formulas[1]).toEqual([undefined, undefined, "=SHEATH.DEBYELENGTH(A2,B2)"]);
  expect(sheets[1].values).toEqual([]);
});

test("text that looks like an error code is text", async () => {
  host.set("Pre clean", "A2", "#N/A", "#N/A", "String");
  const { sheets } = await workbook.read();
  expect(sheets[0].values[1][0]).toBe("#N/A");
});

test.each([true, false])(
  "a spill is its anchor's formula and range, also where spilled cells repeat the formula: %s",
  async (repeated) => {
    host.spill("Pre clean", "D1", "=SHEATH.WALLFLUX(A1:A2,B1:B2)", [[1], [2]], repeated);
    const { sheets } = await workbook.read();
    expect(sheets[0].spills).toEqual([{ anchor: "D1", range: "D1:D2" }]);
    expect(sheets[0].formulas.map((row) => row[3])).toEqual(["=SHEATH.WALLFLUX(A1:A2,B1:B2)", undefined]);
    expect(sheets[0].values.map((row) => row[3])).toEqual([1, 2]);
  },
);

test("a host too old to tell spills is read without them", async () => {
  vi.stubGlobal("Office", { context: { requirements: { isSetSupported: () => false } } });
  host.spill("Pre clean", "D1", "=SHEATH.WALLFLUX(A1:A2,B1:B2)", [[1], [2]]);
  expect((await workbook.read()).sheets[0].spills).toEqual([]);
});

test("tables are read with their range and columns", async () => {
  host.tables["Pre clean"] = [{ name: "Sweep", range: "A1:B2", columns: ["n_e", "T_e"] }];
  const { sheets } = await workbook.read();
  expect(sheets[0].tables).toEqual([{ name: "Sweep", range: "A1:B2", columns: ["n_e", "T_e"] }]);
});

test("a long sheet comes in several answers, with progress, and stops when told", async () => {
  host = new FakeHost({ Long: Array.from({ length: 50_000 }, (_, i) => [i, i, i]) });
  vi.stubGlobal("Excel", { run: host.run });
  const seen: number[] = [];
  const whole = await workbook.read((done) => seen.push(done));
  expect(whole.sheets[0].values.length).toBe(50_000);
  expect(whole.sheets[0].values[49_999]).toEqual([49_999, 49_999, 49_999]);
  expect(seen.length).toBeGreaterThan(5);
  expect(seen).toEqual([...seen].sort((a, b) => a - b));
  expect(seen.at(-1)).toBe(1);
  expect(host.mostCellsAtOnce).toBeLessThanOrEqual(20_000);

  const stop = new AbortController();
  const part = await workbook.read(() => stop.abort(), stop.signal);
  expect(part.sheets[0].values.length).toBeLessThan(50_000);
});

test("a sheet is made where there is none, and replaced whole where there is one", async () => {
  await workbook.replaceSheet("Sheath findings", [
    ["finding", "where"],
    ["one", "B5"],
  ]);
  expect(host.row("Sheath findings", 2)).toEqual(["'one", "'B5"]);
  await workbook.replaceSheet("Sheath findings", [["finding"]]);
  expect(host.row("Sheath findings", 1)).toEqual(["'finding"]);
  expect(host.row("Sheath findings", 2)).toEqual([]);
  expect(host.row("Pre clean", 2)).toEqual([1e16, 3]);
});

test("a sheet is copied under a name of its own", async () => {
  await workbook.copySheet("Pre clean", "Pre clean values");
  expect(host.row("Pre clean values", 2)).toEqual([1e16, 3]);
  expect(host.row("Pre clean", 2)).toEqual([1e16, 3]);
});

test("a sheet is made with the looks asked for: widths in points, wrapped rows, bold headings", async () => {
  await workbook.replaceSheet("Report", [["title"], ["a", "b"]], { widths: [96, 48], wrapped: 1, headings: [0] });
  const look = (range: string) => host.formats.get(`Report!${range}`);
  expect([look("A1:A1"), look("B1:B1")]).toMatchObject([{ columnWidth: 72 }, { columnWidth: 36 }]);
  expect(look("A1:B1")).toMatchObject({ wrapText: true, verticalAlignment: "Top", font: { bold: true } });
});

test("text from anywhere else stays text, whatever it begins with, and an empty text clears a cell", async () => {
  const texts = ["=1+1", "+1", "-50 V", "@SUM(A1)", "'quoted", "1/2"];
  await workbook.write({ sheet: "Pre clean", address: "A1" }, [texts.map((text) => ({ text }))]);
  expect(host.row("Pre clean", 1)).toEqual(texts.map((text) => `'${text}`));
  await workbook.write({ sheet: "Pre clean", address: "A1" }, [["", { text: "" }, null]]);
  expect(host.row("Pre clean", 1).slice(0, 3)).toEqual(["", "", "'-50 V"]);
});

test("settings are kept in the workbook under a name of their own", async () => {
  expect(await workbook.getSetting("accepted")).toBeUndefined();
  await workbook.setSetting("accepted", "B5: known");
  expect(await workbook.getSetting("accepted")).toBe("B5: known");
  expect([...host.settings.keys()]).toEqual(["wallfall.accepted"]);
});

test("going to a cell shows its sheet and selects it", async () => {
  await workbook.goTo({ sheet: "Empty", address: "C7" });
  expect(host.shown).toEqual({ sheet: "Empty", address: "C7" });
});

test("what the host refuses reaches the caller", async () => {
  await expect(workbook.write({ sheet: "No such", address: "A1" }, [[1]])).rejects.toThrow(/ItemNotFound/);
});
