import type { Page } from "playwright-core";
import { describe, expect, test } from "vitest";
import { catalogue } from "../../functions/catalogue";
import { sweptInputs } from "../../taskpane/sweep/offered";
import { violations } from "./accessibility";
import { openPage } from "./chromium";
import { cell, openTrial, readSheet, select } from "./trial-sheet";

const names = catalogue.filter((entry) => sweptInputs(entry).length > 0).map(({ name }) => name);

async function openSweep(page: Page): Promise<void> {
  await page.locator(".sweep summary").click();
  await page.locator(".sweep .trace").first().waitFor();
}

async function sweep(page: Page, typed: Partial<Record<"from" | "to" | "count", string>>): Promise<void> {
  for (const [name, text] of Object.entries(typed)) await page.locator(`#wallfall-sweep-${name}`).fill(text);
}

const said = (page: Page) => page.locator(".sweep > div > .said");

describe("the preview", () => {
  test("hatches the stretches where Child's law fails or is marginal, with the word on each", async () => {
    const page = await openPage("taskpane.html#SHEATHWIDTH");
    await page.locator("#wallfall-input-lambda_i").fill("0.1");
    await openSweep(page);
    await expect.poll(() => page.locator(".sweep .word").allTextContents()).toEqual(["fails", "marginal", "holds"]);
    expect(await page.locator(".sweep .band").count()).toBe(2);
    const told = await page.locator(".stretches li").allInnerTexts();
    expect(told.map((text) => text.replace(/\s+/g, " ").trim())).toEqual([
      expect.stringMatching(/^fails 30 V to 78\.31 V: electrons fill/),
      expect.stringMatching(/^marginal 94\.87 V to 783 V: V_s\/T_e between 30 and 300$/),
      "holds 948.7 V to 3000 V",
    ]);
  });

  test("follows what is typed for the sweep, and what is typed in the form above", async () => {
    const page = await openPage("taskpane.html#DEBYELENGTH");
    await openSweep(page);
    const words = page.locator(".sweep figcaption p");
    await sweep(page, { from: "1e15", to: "1e19" });
    // NRL: 743 cm √(T/n) with n in cm⁻³: 0.407 mm at 10¹⁵ m⁻³ and 3 eV, a hundredth of it at 10¹⁹.
    await expect
      .poll(() => words.innerText())
      .toMatch(/From n_e = 10¹⁵ to 10¹⁹ m⁻³: DEBYELENGTH falls from 40[67]\.\d to 4\.07\d µm/);
    await page.locator("#wallfall-input-T_e").fill("300");
    await expect.poll(() => words.innerText()).toMatch(/falls from 4\.07\d to 0\.0407\d mm/);
  });

  test("another input begins with ends of its own", async () => {
    const page = await openPage("taskpane.html#SHEATHWIDTH");
    await openSweep(page);
    await page.locator("#wallfall-sweep-input").selectOption({ label: "T_e" });
    await expect.poll(() => page.locator("#wallfall-sweep-from").inputValue()).toBe("0.3");
    expect(await page.locator("#wallfall-sweep-to").inputValue()).toBe("30");
    expect(await page.locator("label[for=wallfall-sweep-from]").innerText()).toBe("From, eV");
  });

  test("what can't be swept is told, and then there is nothing to write", async () => {
    const page = await openPage("taskpane.html#SHEATHWIDTH");
    await openSweep(page);
    const problem = page.locator(".sweep .problem");
    await sweep(page, { from: "0" });
    await expect.poll(() => problem.innerText()).toMatch(/same side of 0/);
    expect(await page.getByRole("button", { name: "Copy the table" }).isDisabled()).toBe(true);
    await sweep(page, { from: "20 kg" });
    await expect.poll(() => problem.innerText()).toMatch(/V_s: "kg" is a unit of mass/);
    await sweep(page, { from: "20", count: "5000" });
    await expect.poll(() => problem.innerText()).toMatch(/2 to 2000/);
    await sweep(page, { count: "5" });
    await expect.poll(() => problem.isVisible()).toBe(false);
  });

  test("what was typed for a sweep is still there after a look at another page", async () => {
    const page = await openPage("taskpane.html#DEBYELENGTH");
    await openSweep(page);
    await sweep(page, { from: "2e15" });
    await page.evaluate(() => (location.hash = "WALLFLUX"));
    await page.locator('.page[data-function="WALLFLUX"]').waitFor();
    await page.evaluate(() => (location.hash = "DEBYELENGTH"));
    await page.locator('.page[data-function="DEBYELENGTH"]').waitFor();
    expect(await page.locator("#wallfall-sweep-from").inputValue()).toBe("2e15");
  });
});

describe("in the trial sheet", () => {
  test("the table is written, and computes what the preview shows, verdicts included", async () => {
    const page = await openTrial("trial.html#SHEATHWIDTH");
    await select(page, "P10");
    await page.locator("#wallfall-unit").selectOption("mm");
    await openSweep(page);
    await sweep(page, { from: "30", to: "3000", count: "3" });
    await page.getByRole("button", { name: "Write the table" }).click();
    await expect.poll(() => said(page).innerText()).toBe("Written to P10:R16 on “Pre-clean”.");
    await expect.poll(async () => typeof (await cell(page, "Q16"))).toBe("number");
    const { values, spills } = await readSheet(page);
    const block = values.slice(9, 16).map((row) => row.slice(15, 18));
    expect(block[0]).toEqual(["n_edge (m⁻³)", 1e16, null]);
    expect(block[3]).toEqual(["V_s (V)", "SHEATHWIDTH (mm)", "Validity limits"]);
    expect(block.slice(4).map(([V]) => V)).toEqual([30, 300, 3000]);
    // The catalogue's check value: 3.22809 mm at 300 V, 10¹⁶ m⁻³ and 3 eV; V^(3/4) from there.
    expect(block.slice(4).map(([, s]) => s)).toEqual(
      [30, 300, 3000].map((V) => expect.closeTo(3.22809 * (V / 300) ** 0.75, 4)),
    );
    expect(block.slice(4).map(([, , limit]) => String(limit).split(":")[0])).toEqual([
      "fails",
      "marginal",
      "not tested",
    ]);
    expect(spills).toContainEqual({ anchor: "Q14", range: "Q14:Q16" });
  });

  test("one cell changes the whole sweep", async () => {
    const page = await openTrial("trial.html#DEBYELENGTH");
    await select(page, "P10");
    await openSweep(page);
    await sweep(page, { from: "1e16", to: "1e18", count: "2" });
    await page.getByRole("button", { name: "Write the table" }).click();
    await expect.poll(() => said(page).innerText()).toMatch(/^Written/);
    await expect.poll(async () => typeof (await cell(page, "Q14"))).toBe("number");
    const before = (await cell(page, "Q14")) as number;
    await select(page, "Q10");
    await page.keyboard.type("12");
    await page.keyboard.press("Enter");
    await expect.poll(async () => (await cell(page, "Q14")) as number).toBeCloseTo(2 * before, 12);
  });

  test("filled cells are never written over, spilled ones neither", async () => {
    const page = await openTrial("trial.html#SHEATHWIDTH");
    const before = await readSheet(page);
    await openSweep(page);
    for (const address of ["F20", "A50"]) {
      await select(page, address);
      await page.getByRole("button", { name: "Write the table" }).click();
      if (address === "F20")
        await expect
          .poll(() => said(page).innerText())
          .toMatch(
            /^F20 on “Pre-clean” is filled, and nothing was written\. Select a cell with 29 rows and 3 columns free\.$/,
          );
      else await expect.poll(() => said(page).innerText()).toMatch(/^Written to A50:C78/);
    }
    const after = await readSheet(page);
    expect(after.values.slice(0, 47)).toEqual(before.values.slice(0, 47));
  });
});

test("a plain page copies the table, to be pasted into A1", async () => {
  const page = await openPage("taskpane.html#BOHMSPEED", { permissions: ["clipboard-read", "clipboard-write"] });
  await openSweep(page);
  await sweep(page, { from: "1", to: "4", count: "3" });
  await page.locator("#wallfall-sweep-spacing").selectOption("linear");
  await page.getByRole("button", { name: "Copy the table" }).click();
  await page.getByText("paste it into cell A1").waitFor();
  const lines = (await page.evaluate(() => navigator.clipboard.readText())).split("\n").map((line) => line.split("\t"));
  expect(lines).toEqual([
    ["ion", "Ar+"],
    [""],
    ["T_e (eV)", "BOHMSPEED (m/s)", "Validity limits"],
    ["1", "=SHEATH.BOHMSPEED(A4:A6,B1)", '=SHEATH.LIMITCHECK("BOHMSPEED",A4:A6,B1)'],
    ["2.5"],
    ["4"],
  ]);
});

test("the keyboard alone opens a sweep, changes it and writes it", async () => {
  const page = await openTrial("trial.html#DEBYELENGTH");
  await select(page, "P10");
  await page.locator(".sweep summary").focus();
  await page.keyboard.press("Enter");
  await page.locator(".sweep .trace").waitFor();
  await page.keyboard.press("Tab");
  expect(await page.evaluate(() => document.activeElement!.id)).toBe("wallfall-sweep-input");
  await page.keyboard.press("Tab");
  await page.keyboard.type("2e15");
  for (let i = 0; i < 4; i++) await page.keyboard.press("Tab");
  expect(await page.evaluate(() => document.activeElement!.textContent)).toBe("Write the table");
  await page.keyboard.press("Enter");
  await expect.poll(() => said(page).innerText()).toMatch(/^Written to P10:/);
});

describe.each(["light", "dark"] as const)("in %s", (colorScheme) => {
  test.each([320, 600])("every sweep is accessible and fits into %i px", { timeout: 300_000 }, async (width) => {
    const page = await openPage("taskpane.html", { colorScheme, viewport: { width, height: 900 } });
    for (const name of names) {
      await page.evaluate((hash) => (location.hash = hash), name);
      await page.locator(`.page[data-function="${name}"]`).waitFor();
      await openSweep(page);
      expect(await violations(page), name).toEqual([]);
      const overhang = await page.evaluate(() => document.documentElement.scrollWidth - innerWidth);
      expect(overhang, `#${name} is wider than the window`).toBeLessThanOrEqual(0);
    }
  });
});
