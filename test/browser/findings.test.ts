import type { Page } from "playwright-core";
import { describe, expect, test } from "vitest";
import type { WorkbookContent } from "../../taskpane/workbook/workbook";
import { cleanBooks } from "../findings/clean-books";
import { saveWorkbook } from "../findings/save-workbook";
import { violations } from "./accessibility";
import { openPage } from "./chromium";
import { openTrial, readSheet, selected } from "./trial-sheet";

/** The findings of the trial's opening workbook with two slips in it: a density in cm⁻³ and a value typed over a formula. */
async function lookedThrough(): Promise<Page> {
  const page = await openTrial();
  await page.evaluate(async () => {
    await window.wallfallWorkbook.write({ sheet: "Pre-clean", address: "D20" }, [[3e10]]);
    await window.wallfallWorkbook.write({ sheet: "Pre-clean", address: "K30" }, [[0.5]]);
  });
  await page.getByRole("link", { name: "Findings" }).click();
  await look(page);
  return page;
}

async function look(page: Page): Promise<void> {
  await page.getByRole("button", { name: "Look through the workbook" }).click();
  await page.locator(".sum").waitFor();
}

function group(page: Page, cause: string) {
  return page.locator(`.group[data-cause="${cause}"]`);
}

const fileOf = (content: WorkbookContent, name = "book.xlsx") => ({
  name,
  mimeType: "application/octet-stream",
  buffer: Buffer.from(saveWorkbook(content)),
});

const badBook = () => cleanBooks["hot cathode"]().on("Cathode").type("F9", 0.97).type("B20", null).save("H12", 1);

describe("in the trial sheet", () => {
  test("the slips are found under their causes, and a press on a place goes there", async () => {
    const page = await lookedThrough();
    expect(await group(page, "overwritten").locator(".where").innerText()).toMatch(/^K30 on Pre-clean/);
    const doubt = group(page, "doubtful").locator(".finding");
    expect(await doubt.innerText()).toMatch(/D20 on Pre-clean[\s\S]*n_e: cm⁻³ meant\?\s+n_e 3e10 m⁻³/);
    await doubt.getByRole("button", { name: "D20 on Pre-clean" }).click();
    await expect.poll(() => selected(page)).toBe("D20");
  });

  test("a finding is accepted with a reason, stays so, and is open again once it changes", async () => {
    const page = await lookedThrough();
    const open = parseInt(await page.locator(".sum").innerText());
    await group(page, "doubtful")
      .getByRole("button", { name: /^Accept/ })
      .click();
    await page.keyboard.press("Enter");
    expect(await page.locator(".accept .said:not(:empty)").innerText()).toMatch(/Say why it may stand/);
    await page.keyboard.type("afterglow, checked");
    await page.keyboard.press("Enter");
    await page.getByText("afterglow, checked").waitFor();
    expect(parseInt(await page.locator(".sum").innerText())).toBe(open - 1);
    await look(page);
    expect(parseInt(await page.locator(".sum").innerText())).toBe(open - 1);
    await page.evaluate(() => window.wallfallWorkbook.write({ sheet: "Pre-clean", address: "D21" }, [[3e10]]));
    await look(page);
    expect(await group(page, "doubtful").innerText()).toMatch(
      /D20:D21[\s\S]*as: afterglow, checked\. It has changed since/,
    );
  });

  test("the report goes to a sheet of its own, and its notes outlive it", async () => {
    const page = await lookedThrough();
    const before = await readSheet(page);
    await page.getByRole("button", { name: "Write the report sheet" }).click();
    await page.getByText("Written to the sheet “Sheath findings”.").waitFor();
    const report = await readSheet(page, "Sheath findings");
    expect(report.formulas.flat().filter(Boolean)).toEqual([]);
    const row = report.values.findIndex(([cause]) => cause === "Values typed over a formula");
    const column = report.values.find(([cause]) => cause === "Cause")!.indexOf("Your notes");
    const address = `${String.fromCharCode(65 + column)}${row + 1}`;
    await page.evaluate(
      (at) => window.wallfallWorkbook.write({ sheet: "Sheath findings", address: at }, [["ask Kim"]]),
      address,
    );
    await look(page);
    expect(await page.getByText("No value and no formula has changed.").isVisible()).toBe(true);
    await page.getByRole("button", { name: "Write the report sheet" }).click();
    await page.getByText("Your 1 note stayed").waitFor();
    const again = await readSheet(page, "Sheath findings");
    expect(again.values.find(([cause]) => cause === "Values typed over a formula")![column]).toBe("ask Kim");
    expect(await readSheet(page)).toEqual(before);
  });

  test("results become values, and come back as formulas", async () => {
    const page = await lookedThrough();
    const before = await readSheet(page);
    await page.locator(".keep summary").click();
    await page.getByLabel(/^F8:F47 on Pre-clean: DEBYELENGTH/).check();
    await page.getByRole("button", { name: "Keep as values", exact: true }).click();
    const back = page.getByRole("button", { name: "Bring formulas back: F8:F47 on Pre-clean" });
    await back.waitFor();
    const kept = await readSheet(page);
    expect(kept.formulas[7][5]).toBeUndefined();
    expect(kept.values[8][5]).toBe(before.values[8][5]);
    await back.click();
    await back.waitFor({ state: "detached" });
    await page.locator(".sum").waitFor();
    const after = await readSheet(page);
    expect(after.formulas).toEqual(before.formulas);
    expect(after.values).toEqual(before.values);
  });

  test("a copy for readers is made beside the sheets, which stay as they are", async () => {
    const page = await lookedThrough();
    const before = await readSheet(page);
    await page.getByRole("button", { name: "Copy for readers without the add-in" }).click();
    await page.getByText(/Made “Pre-clean values”/).waitFor();
    const copy = await readSheet(page, "Pre-clean values");
    expect(copy.formulas.flat().filter(Boolean)).toEqual([]);
    expect(copy.values[8][5]).toBe(before.values[8][5]);
    expect(await readSheet(page)).toEqual(before);
  });

  test("a workbook dropped on the pane is looked through instead, without opening it", async () => {
    const page = await openTrial();
    const before = await readSheet(page);
    const bytes = [...saveWorkbook(badBook().build())];
    const data = await page.evaluateHandle((content) => {
      const transfer = new DataTransfer();
      transfer.items.add(new File([new Uint8Array(content)], "dropped.xlsx"));
      return transfer;
    }, bytes);
    await page.dispatchEvent("#pane", "drop", { dataTransfer: data });
    await page.locator(".sum").waitFor();
    expect(await page.locator(".sum").innerText()).toMatch(/in dropped\.xlsx/);
    expect(await group(page, "stale").innerText()).toMatch(/H12 on Cathode, 1 of 25/);
    expect(await readSheet(page)).toEqual(before);
  });

  test("is accessible with everything open", async () => {
    const page = await lookedThrough();
    await group(page, "doubtful")
      .getByRole("button", { name: /^Accept/ })
      .click();
    for (const summary of await page.locator(".findings summary").all()) await summary.click();
    expect(await violations(page)).toEqual([]);
  });
});

describe.each(["light", "dark"] as const)("as a plain page, in %s", (colorScheme) => {
  test.each([320, 800])("a chosen file's findings are accessible and fit into %i px", async (width) => {
    const page = await openPage("taskpane.html#findings", { colorScheme, viewport: { width, height: 900 } });
    await page.locator(".findings").waitFor();
    expect(await violations(page)).toEqual([]);
    await page.setInputFiles(".findings input[type=file]", fileOf(badBook().build()));
    await page.locator(".sum").waitFor();
    for (const summary of await page.locator(".findings summary").all()) await summary.click();
    expect(await violations(page)).toEqual([]);
    expect(await page.evaluate(() => document.documentElement.scrollWidth - innerWidth)).toBeLessThanOrEqual(0);
  });
});

test("the keyboard alone looks through a file, reaches its findings and comes back from a function's page", async () => {
  const page = await openPage("taskpane.html#findings");
  await page.locator(".findings").waitFor();
  const chosen = page.waitForEvent("filechooser");
  await page.getByRole("button", { name: "Choose a saved workbook" }).focus();
  await page.keyboard.press("Enter");
  await (await chosen).setFiles(fileOf(badBook().build()));
  await page.locator(".sum").waitFor();
  expect(await page.evaluate(() => document.activeElement!.textContent)).toBe("Findings");
  await page.keyboard.press("Tab");
  await page.keyboard.press("Enter");
  expect(await page.evaluate(() => document.activeElement!.textContent)).toMatch(/^Errors/);
  await page.keyboard.press("Tab");
  await page.keyboard.press("Enter");
  await page.locator('.page[data-function="FLOATINGPOTENTIAL"]').waitFor();
  await page.goBack();
  await page.locator(".sum").waitFor();
});

test("a large file shows progress and stops when told to", async () => {
  const rows = 60_000;
  const values = Array.from({ length: rows }, (_, i) => [1e16 + i * 1e12, 3, 1e-4]);
  const formulas = values.map((_, i) => [undefined, undefined, `=SHEATH.DEBYELENGTH(A${i + 1},B${i + 1})`]);
  const content = { names: {}, sheets: [{ name: "Long", origin: "A1", values, formulas, spills: [], tables: [] }] };
  const page = await openPage("taskpane.html#findings");
  await page.locator(".findings").waitFor();
  await page.setInputFiles(".findings input[type=file]", fileOf(content, "long.xlsx"));
  await page.waitForFunction(() => (document.querySelector("progress")?.value ?? 0) > 0.35);
  await page.getByRole("button", { name: "Stop" }).click();
  await page.getByText("Stopped. Nothing was changed.").waitFor();
  expect(await page.locator(".sum").count()).toBe(0);
});

test("a file that can't be read says why, and text in a workbook is never taken for markup", async () => {
  const page = await openPage("taskpane.html#findings");
  await page.locator(".findings").waitFor();
  const text = { name: "notes.xlsx", mimeType: "text/plain", buffer: Buffer.from("n_e;T_e") };
  await page.setInputFiles(".findings input[type=file]", text);
  expect(await page.locator(".findings .problem").innerText()).toMatch(/isn't an \.xlsx workbook/);
  const mark = "<img src=x onerror=alert(1)>";
  const book = cleanBooks["hot cathode"]()
    .on("Cathode")
    .type("D9", mark)
    .on(mark)
    .formula("A1", `=SHEATH.DEBYELENGTH("${mark}",1)`, () => ({ code: "#VALUE!" }));
  await page.setInputFiles(".findings input[type=file]", fileOf(book.build(), `${mark}.xlsx`));
  await page.locator(".sum").waitFor();
  expect(await page.locator(".findings").innerText()).toContain(mark.slice(0, 20));
  expect(await page.locator(".findings img").count()).toBe(0);
});
