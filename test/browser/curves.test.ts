import { describe, expect, test } from "vitest";
import type { Page } from "playwright-core";
import { violations } from "./accessibility";
import { openPage } from "./chromium";

/** The points of a trace as fractions of its panel: from the left, and from the bottom. */
async function points(page: Page, trace: string): Promise<[number, number][]> {
  return page
    .locator(`.curve .${trace}:not(.key)`)
    .last()
    .evaluate((path) => {
      const d = path.getAttribute("d")!;
      const axis = path.parentElement!.querySelectorAll(".axis");
      const [, left, top, bottom, right] = /M([\d.]+) ([\d.]+)V([\d.]+)H([\d.]+)/
        .exec(axis[axis.length - 2].getAttribute("d")!)!
        .map(Number);
      return [...d.matchAll(/[ML]([-\d.]+),([-\d.]+)/g)].map(([, x, y]): [number, number] => [
        (Number(x) - left) / (right - left),
        (bottom - Number(y)) / (bottom - top),
      ]);
    });
}

test("a profile draws both densities from the form's values: the electrons leave the ions behind towards the wall", async () => {
  const page = await openPage("taskpane.html#SHEATHPROFILE");
  await page.locator(".curve .trace").first().waitFor();
  const [ions, electrons] = [await points(page, "trace-0"), await points(page, "trace-1")];
  expect(ions).toHaveLength(50);
  expect(ions[0][0]).toBeCloseTo(0, 3);
  expect(electrons[0][1]).toBeCloseTo(0, 3);
  // Flux and energy are conserved: at 100 T_e the ions have thinned to (1 + 2 · 100)^(−1/2) of n_edge; the axis ends at 10¹⁶.
  expect(ions[0][1]).toBeCloseTo(1 / Math.sqrt(201), 2);
  expect(ions.at(-1)![1]).toBeCloseTo(electrons.at(-1)![1], 1);
});

test("the curve follows the form, and so do its words", async () => {
  const page = await openPage("taskpane.html#SHEATHPROFILE");
  const words = page.locator(".curve figcaption p");
  await expect.poll(() => words.innerText()).toMatch(/^From x = 0 to 4\.649 mm: potential rises from −300 to /);
  await page.locator("#wallfall-input-V_s").fill("2000");
  await expect.poll(() => words.innerText()).toMatch(/potential rises from −2000 to /);
});

test("a call without a result draws nothing", async () => {
  const page = await openPage("taskpane.html#SHEATHPROFILE");
  await page.locator(".curve .trace").first().waitFor();
  await page.locator("#wallfall-input-T_e").fill("OL");
  await page.locator(".outcome .problem").waitFor();
  expect(await page.locator(".result .curve").isVisible()).toBe(false);
});

test("the picture has a name, and its words and its table say what it shows", async () => {
  const page = await openPage("taskpane.html#SHEATHPROFILE");
  const picture = page.getByRole("img", { name: "Curve of SHEATHPROFILE" });
  await picture.waitFor();
  const described = await picture.getAttribute("aria-describedby");
  expect(await page.locator(`#${described}`).innerText()).toMatch(/Z n_i rises from .*; n_e rises from /);
  expect(await page.locator(".outcome table tbody tr").count()).toBeGreaterThan(10);
});

test("it is as wide as the room it has, with letters of the same size", async () => {
  const page = await openPage("taskpane.html#SHEATHPROFILE", { viewport: { width: 700, height: 900 } });
  const plot = page.locator(".curve svg");
  await plot.waitFor();
  for (const width of [320, 500, 700]) {
    await page.setViewportSize({ width, height: 900 });
    await expect.poll(async () => (await plot.boundingBox())!.width).toBe(width - 32);
    const text = await page
      .locator(".curve text")
      .first()
      .evaluate((element) => element.getBoundingClientRect().height);
    expect(text).toBeGreaterThan(10);
    expect(text).toBeLessThan(20);
  }
});

test("no label of a plot runs out of it", async () => {
  for (const name of ["SHEATHPROFILE", "IMPACTDISTRIBUTION"]) {
    const page = await openPage(`taskpane.html#${name}`, { viewport: { width: 320, height: 900 } });
    await page.locator(".curve svg").waitFor();
    const outside = await page.locator(".curve svg").evaluate((svg) => {
      const { left, right } = svg.getBoundingClientRect();
      return [...svg.querySelectorAll("text")]
        .map((text) => ({ text: text.textContent, box: text.getBoundingClientRect() }))
        .filter(({ box }) => box.left < left - 0.5 || box.right > right + 0.5)
        .map(({ text }) => text);
    });
    expect(outside, name).toEqual([]);
  }
});

describe.each(["light", "dark"] as const)("in %s", (colorScheme) => {
  test("the field line of a magnetised wall is a picture named by its angle, which follows the form", async () => {
    const page = await openPage("taskpane.html#MAGNETICPRESHEATHDROP", { colorScheme });
    await page.getByRole("img", { name: /meets the wall at 5° from its face, which is 85° from its normal/ }).waitFor();
    await page.locator("#wallfall-input-angle").fill("30");
    await page.getByRole("img", { name: /at 30° from its face/ }).waitFor();
    expect(await violations(page)).toEqual([]);
    await page.locator("#wallfall-input-angle").fill("120");
    await expect.poll(() => page.getByRole("img").count()).toBe(0);
  });
});
