import type { Page } from "playwright-core";
import { describe, expect, test } from "vitest";
import { openPage } from "./chromium";
import { cell, enter, expectStatus, ready } from "./trial-sheet";

/**
 * Two functions bound behind the built ones: ECHO returns what it was given, HEARD spells it. So the crossing between
 * the grid and a function can be seen from the sheet alone.
 */
const probes = `
  CustomFunctions.associate("ECHO", (cells) => cells);
  CustomFunctions.associate("HEARD", (first, second, rest, invocation) => [[JSON.stringify(
    [first, second, rest, Object.keys(invocation ?? {})],
    function (key, value) { return this[key] instanceof CustomFunctions.Error ? "error " + this[key].code : value; },
  )]]);
  CustomFunctions.associate("THROW", () => { throw new Error("a bug of its own"); });
  CustomFunctions.associate("ODD", () => [[NaN], [null], [Infinity], [{}]]);
`;
const any = { dimensionality: "matrix", type: "any" };
const declared = [
  { id: "ECHO", name: "ECHO", description: "", parameters: [{ ...any, name: "cells" }] },
  {
    id: "HEARD",
    name: "HEARD",
    description: "",
    parameters: [
      { ...any, name: "first" },
      { ...any, name: "second", optional: true },
      { ...any, name: "rest", optional: true, repeating: true },
    ],
  },
  { id: "THROW", name: "THROW", description: "", parameters: [] },
  { id: "ODD", name: "ODD", description: "", parameters: [] },
];

async function openWithProbes(): Promise<Page> {
  // A small page first: the routes must stand before the trial sheet asks for its functions.
  const page = await openPage("functions.html");
  await page.route("**/functions.js", async (route) => {
    const response = await route.fetch();
    await route.fulfill({ response, body: (await response.text()) + probes });
  });
  await page.route("**/functions.json", async (route) => {
    const response = await route.fetch();
    const json = await response.json();
    await route.fulfill({ response, json: { ...json, functions: [...json.functions, ...declared] } });
  });
  await page.goto(new URL("trial.html", page.url()).href);
  await ready(page);
  return page;
}

async function heard(page: Page, call: string): Promise<unknown> {
  await enter(page, "N8", call);
  await expect.poll(() => cell(page, "N8")).toMatch(/^\[/);
  return JSON.parse((await cell(page, "N8")) as string);
}

describe("a function hears", () => {
  test("empty cells as null, text as text, truth as truth, errors as error objects", async () => {
    const page = await openWithProbes();
    await enter(page, "P8", "'1/2");
    await enter(page, "Q8", "TRUE");
    await enter(page, "P9", "=1/0");
    await enter(page, "Q9", "2.5");
    const [first] = (await heard(page, "=SHEATH.HEARD(P8:R9)")) as [unknown[][]];
    expect(first).toEqual([
      ["1/2", true, null],
      ["error #DIV/0!", 2.5, null],
    ]);
  });

  test("a single cell as a matrix, and what is left out as null", async () => {
    const page = await openWithProbes();
    expect(await heard(page, "=SHEATH.HEARD(A8,,)")).toEqual([[[1]], null, [[[null]]], ["functionName"]]);
    await enter(page, "N8", "=0");
    expect(await heard(page, "=SHEATH.HEARD(A8)")).toEqual([[[1]], null, null, ["functionName"]]);
  });

  test("repeated ranges as one array of matrices, with the invocation behind it", async () => {
    const page = await openWithProbes();
    const expected = [[["a"]], [["5 %"]], [[[1], [2]], [[3, 4]]], ["functionName"]];
    expect(await heard(page, '=SHEATH.HEARD("a","5 %",A8:A9,{3,4})')).toEqual(expected);
  });
});

describe("a cell shows", () => {
  test("returned text as text, never a date or a number", async () => {
    const page = await openWithProbes();
    for (const text of ["1/2", "007", "5 %", "TRUE", "2026-01-01"]) {
      await enter(page, "N8", `=SHEATH.ECHO("${text}")`);
      await expect.poll(() => cell(page, "N8")).toBe(text);
      await enter(page, "N9", '=IF(ISTEXT(N8),"text","other")');
      await expect.poll(() => cell(page, "N9")).toBe("text");
    }
  });

  test("a returned null as 0, as the host does, and no number that is none", async () => {
    const page = await openWithProbes();
    await enter(page, "N8", "=SHEATH.ODD()");
    await expect.poll(() => cell(page, "N11")).toEqual({ error: "#VALUE!" });
    expect(await cell(page, "N8")).toEqual({ error: "#NUM!" });
    expect(await cell(page, "N9")).toBe(0);
    expect(await cell(page, "N10")).toEqual({ error: "#NUM!" });
  });

  test("what an exception says, and the rest of the sheet goes on calculating", async () => {
    const page = await openWithProbes();
    await enter(page, "N8", "=SHEATH.THROW()");
    await expectStatus(page, "N8", "#VALUE! a bug of its own");
    await enter(page, "N9", "=1+1");
    await expectStatus(page, "N9", "2");
  });

  test("that there are too many arguments", async () => {
    const page = await openWithProbes();
    await enter(page, "N8", "=SHEATH.ECHO(1,2)");
    await expectStatus(page, "N8", "#VALUE! ECHO takes at most 1 argument; here are 2.");
  });
});

test("the host's runtime takes neither history nor dialogs from the page", async () => {
  const page = await openWithProbes();
  const kept = await page.evaluate(() =>
    [history.pushState, history.replaceState, window.alert, window.confirm, window.prompt].map((each) =>
      /native code/.test(String(each)),
    ),
  );
  expect(kept).toEqual([true, true, true, true, true]);
});
