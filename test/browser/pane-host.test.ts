import { expect, inject, onTestFinished, test } from "vitest";
import type { Page } from "playwright-core";
import { browser } from "./chromium";

/** The pane's page with another script in the host library's place. */
async function openWith(library: string): Promise<Page> {
  const context = await (await browser()).newContext();
  onTestFinished(() => context.close());
  await context.route("**/office.js", (route) => route.fulfill({ contentType: "text/javascript", body: library }));
  const page = await context.newPage();
  await page.goto(`${inject("origin")}/taskpane.html#DEBYELENGTH`);
  return page;
}

const library = (onReady: string) => `var Office = { HostType: { Excel: "Excel" }, onReady: () => ${onReady} };`;
const later = (milliseconds: number) =>
  `new Promise((resolve) => setTimeout(resolve, ${milliseconds}, { host: "Excel" }))`;

test("where the host library never becomes ready, the page is a plain one after a moment", async () => {
  const page = await openWith(library("new Promise(() => undefined)"));
  await page.getByRole("button", { name: "Copy formula" }).waitFor({ timeout: 5000 });
  expect(await page.locator(".value").innerText()).toMatch(/^1\.28/);
});

test("where the host library is missing, the page is a plain one at once", async () => {
  const page = await openWith("");
  await page.getByRole("button", { name: "Copy formula" }).waitFor({ timeout: 1500 });
});

test("beside a workbook the formula can be written to it", async () => {
  const page = await openWith(library(later(0)));
  await page.getByRole("button", { name: "Write to cell" }).waitFor({ timeout: 1500 });
});

test("a host that answers late still gets its pane, one pane only", async () => {
  const page = await openWith(library(later(3000)));
  await page.getByRole("button", { name: "Copy formula" }).waitFor();
  await page.getByRole("button", { name: "Write to cell" }).waitFor({ timeout: 5000 });
  expect(await page.locator("h1").count()).toBe(1);
});
