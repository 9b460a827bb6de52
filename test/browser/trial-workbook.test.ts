import { describe, expect, test } from "vitest";
import { cell, enter, expectStatus, openTrial, readSheet, select, selected } from "./trial-sheet";

describe("the pane's way to the cells", () => {
  test("writes text as text, formulas as formulas, clears for an empty text, and leaves a cell alone where nothing is given", async () => {
    const page = await openTrial();
    await enter(page, "O9", "stays");
    await enter(page, "O10", "goes");
    await page.evaluate(() =>
      window.wallfallWorkbook.write({ sheet: "Pre-clean", address: "N8" }, [
        ["1/2", 1.5],
        [true, null],
        ["=SHEATH.EDGERATIO()", ""],
        [{ text: "=1+1" }, { text: "+2" }],
      ]),
    );
    const { values, formulas } = await readSheet(page);
    expect(values.slice(7, 11).map((row) => row.slice(13, 15))).toEqual([
      ["1/2", 1.5],
      [true, "stays"],
      [Math.exp(-0.5), null],
      ["=1+1", "+2"],
    ]);
    expect(formulas[9][13]).toBe("=SHEATH.EDGERATIO()");
    expect(formulas[10][13]).toBeUndefined();
  });

  test("writes over a formula, and over one that fills cells below", async () => {
    const page = await openTrial();
    await page.evaluate(() => window.wallfallWorkbook.write({ sheet: "Pre-clean", address: "F8" }, [[1]]));
    const { values, formulas, spills } = await readSheet(page);
    expect([values[7][5], values[8][5], formulas[7][5]]).toEqual([1, null, undefined]);
    expect(spills.map(({ anchor }) => anchor)).not.toContain("F8");
  });

  test("tells a filled cell, a spilled one too, from an empty one", async () => {
    const page = await openTrial();
    const filled = await page.evaluate(() =>
      Promise.all(
        ["A1", "F20", "K8", "N8", "B2"].map((address) =>
          window.wallfallWorkbook.isFilled({ sheet: "Pre-clean", address }),
        ),
      ),
    );
    expect(filled).toEqual([true, true, true, false, false]);
  });

  test("goes to a cell, calls back for it, and stops calling back when asked", async () => {
    const page = await openTrial();
    const places = await page.evaluate(async () => {
      const heard: string[] = [];
      const stop = window.wallfallWorkbook.onSelection(({ sheet, address }) => heard.push(`${sheet}!${address}`));
      await window.wallfallWorkbook.goTo({ sheet: "Pre-clean", address: "L47" });
      stop();
      await window.wallfallWorkbook.goTo({ sheet: "Pre-clean", address: "A8" });
      return heard;
    });
    expect(places).toEqual(["Pre-clean!L47"]);
    expect(await selected(page)).toBe("A8");
  });

  test("makes a sheet, replaces all that stood in it, and leaves the others and the view alone", async () => {
    const page = await openTrial();
    const tabs = await page.getByRole("tab").allInnerTexts();
    const before = await readSheet(page);
    await page.evaluate(async () => {
      await window.wallfallWorkbook.replaceSheet("Findings", [["a", 1, "b"], ["c"], ["=1+1"]]);
      await window.wallfallWorkbook.replaceSheet("Findings", [["d", 2]]);
    });
    const made = await readSheet(page, "Findings");
    expect([made.values, made.formulas]).toEqual([[["d", 2]], [[undefined, undefined]]]);
    expect(await readSheet(page)).toEqual(before);
    expect(await page.getByRole("tab").allInnerTexts()).toEqual([...tabs, "Findings"]);
    expect(await page.getByRole("tab", { selected: true }).innerText()).toBe("Pre-clean");
  });

  test("refuses a sheet that is not there by its name", async () => {
    const page = await openTrial();
    const refused = page.evaluate(() => window.wallfallWorkbook.goTo({ sheet: "Nowhere", address: "A1" }));
    await expect(refused).rejects.toThrow('there is no sheet named "Nowhere"');
  });

  test("keeps settings, also where the browser stores nothing", async () => {
    const page = await openTrial();
    const got = await page.evaluate(async () => {
      const workbook = window.wallfallWorkbook;
      await workbook.setSetting("stored", "1");
      Object.defineProperty(window, "localStorage", {
        get() {
          throw new DOMException("no storage here", "SecurityError");
        },
      });
      await workbook.setSetting("kept", "2");
      return Promise.all(["stored", "kept", "never"].map((key) => workbook.getSetting(key)));
    });
    expect(got).toEqual(["1", "2", undefined]);
  });

  test("an error carries its message when the workbook is read", async () => {
    const page = await openTrial();
    expect(await cell(page, "F18")).toEqual({ error: "#VALUE!", message: expect.stringMatching(/^n_e: "OL"/) });
    // Cell arithmetic passes the code on; there is no message of ours behind it.
    expect(await cell(page, "K18")).toEqual({ error: "#VALUE!" });
  });
});

describe("by keyboard", () => {
  test("arrow keys change the sheet from its tabs", async () => {
    const page = await openTrial();
    await page.evaluate(() => window.wallfallWorkbook.replaceSheet("Second", [["here"]]));
    await page.getByRole("tab", { name: "Pre-clean" }).focus();
    // From the first tab leftward is the last one.
    await page.keyboard.press("ArrowLeft");
    await expect.poll(() => page.getByRole("tab", { selected: true }).innerText()).toBe("Second");
    await page.keyboard.press("ArrowRight");
    await expect.poll(() => page.getByRole("tab", { selected: true }).innerText()).toBe("Pre-clean");
    await page.keyboard.press("End");
    await expect.poll(() => page.getByRole("tab", { selected: true }).innerText()).toBe("Second");
    await expectStatus(page, "A1", "here");
  });

  test("F6 leads from the cells to the pane and back, and keys go where the focus is", async () => {
    const page = await openTrial();
    await select(page, "D20");
    await page.keyboard.press("F6");
    await page.keyboard.type("edge");
    expect(await page.getByRole("searchbox").inputValue()).toBe("edge");
    await page.keyboard.press("F6");
    await page.keyboard.type("7e16");
    await page.keyboard.press("Enter");
    await expect.poll(() => cell(page, "D20")).toBe(7e16);
    await page.keyboard.press("F6");
    await page.keyboard.type("ratio");
    expect(await page.getByRole("searchbox").inputValue()).toBe("edgeratio");
  });

  test("the first key typed after the page says it is open starts the selected cell", async () => {
    const page = await openTrial();
    await page.keyboard.press("ArrowDown");
    await expect.poll(() => selected(page)).toBe("A2");
  });
});

test("the pane writes its formula to the selected cell", async () => {
  const page = await openTrial("trial.html#DEBYELENGTH");
  await select(page, "N8");
  await page.getByRole("button", { name: "Write to cell" }).click();
  await expectStatus(page, "N8", /^N8 0\.000128759652/);
});
