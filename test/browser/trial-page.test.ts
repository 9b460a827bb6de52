import axe from "axe-core";
import { describe, expect, test } from "vitest";
import { openTrial } from "./trial-sheet";

/** The grid finishes its own chrome three seconds after it is drawn. */
const settled = 3500;

describe.each(["light", "dark"] as const)("the trial page in %s", (colorScheme) => {
  test("has no accessibility violation, the grid's own parts included", async () => {
    const page = await openTrial("trial.html", { colorScheme });
    await page.waitForTimeout(settled);
    await page.evaluate(axe.source);
    const violations = await page.evaluate(async () => {
      const found = await (window as unknown as { axe: typeof axe }).axe.run();
      return found.violations.flatMap(({ id, nodes }) => nodes.map(({ target }) => `${id} ${target}`));
    });
    expect(violations).toEqual([]);
  });
});

describe("the sheet and the pane", () => {
  test.each([
    [1400, 900],
    [1000, 700],
  ])("stand side by side in %i by %i", async (width, height) => {
    const page = await openTrial("trial.html", { viewport: { width, height } });
    const [sheet, pane] = await Promise.all([
      page.locator("body > main").boundingBox(),
      page.locator("body > aside").boundingBox(),
    ]);
    expect([sheet!.height, pane!.height, pane!.y]).toEqual([height, height, 0]);
    expect(pane!.x).toBe(sheet!.width);
    expect(sheet!.width + pane!.width).toBe(width);
    expect(pane!.width).toBeGreaterThanOrEqual(320);
    expect(sheet!.width).toBeGreaterThan(1.5 * pane!.width);
  });

  test("stand one below the other where there is less room, and nothing runs out at the side", async () => {
    const page = await openTrial("trial.html", { viewport: { width: 700, height: 900 } });
    const [sheet, pane] = await Promise.all([
      page.locator("body > main").boundingBox(),
      page.locator("body > aside").boundingBox(),
    ]);
    expect(pane!.y).toBe(sheet!.height);
    expect([sheet!.width, pane!.width]).toEqual([700, 700]);
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBe(700);
  });
});
