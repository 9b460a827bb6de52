import { expect, test } from "vitest";
import { writer } from "../../taskpane/pane/write-view";
import { fakeWorkbook } from "./fake-workbook";

const formula = "=SHEATH.DEBYELENGTH(1E16,3)";

test("a formula goes to the selected cell, and the answer says which that is", async () => {
  const { workbook, cells } = fakeWorkbook();
  expect(await writer(workbook)(formula)).toBe("Written to B5 on “Chamber”.");
  expect(cells).toEqual({ B5: formula });
});

test("a filled cell is overwritten at the second press only", async () => {
  const { workbook, cells } = fakeWorkbook({ B5: 7 });
  const press = writer(workbook);
  expect(await press(formula)).toBe("B5 on “Chamber” is filled. Press again to overwrite it.");
  expect(cells.B5).toBe(7);
  expect(await press(formula)).toMatch(/^Written/);
  expect(cells.B5).toBe(formula);
  expect(await press(formula)).toMatch(/is filled/);
});

test("the second press counts for that cell and that formula alone", async () => {
  const { workbook, cells, state } = fakeWorkbook({ B5: 7, C5: 8 });
  const press = writer(workbook);
  await press(formula);
  state.selected = { sheet: "Chamber", address: "C5" };
  expect(await press(formula)).toMatch(/^C5 .* is filled/);
  expect(await press("=SHEATH.DEBYELENGTH(1E17,3)")).toMatch(/is filled/);
  expect(cells).toEqual({ B5: 7, C5: 8 });
});

test("without a selected cell nothing is written", async () => {
  const { workbook, cells, state } = fakeWorkbook();
  state.selected = undefined;
  expect(await writer(workbook)(formula)).toMatch(/select one in the sheet/);
  expect(cells).toEqual({});
});
