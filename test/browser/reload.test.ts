import type { BrowserContext, Page } from "playwright-core";
import { describe, expect, test } from "vitest";
import { makeSamples } from "../../taskpane/trial/samples/make";
import { cell, enter, expectStatus, openTrial, ready } from "./trial-sheet";
import { keeping, kept, notice, offer, openFile, saveCopy } from "./workbook-files";

const heat = makeSamples()["wall-heat.xlsx"];

async function reload(page: Page): Promise<void> {
  await page.reload();
  await ready(page);
}

async function anotherTab(context: BrowserContext, address: string): Promise<Page> {
  const page = await context.newPage();
  await page.goto(address);
  await ready(page);
  return page;
}

const sheets = (page: Page) => page.locator("#tabs [role=tab]").allInnerTexts();

describe("work that is in no file", () => {
  test("survives a reload with its values, formulas and what they come to", async () => {
    const page = await openTrial();
    await expect.poll(() => keeping(page).innerText()).toBe("");
    await enter(page, "N8", "=SHEATH.DEBYELENGTH(1e16,3)*2");
    await enter(page, "N9", "1/2 a note");
    await kept(page);
    await reload(page);
    await expectStatus(page, "N8", /^N8 0\.00025751930/);
    expect(await cell(page, "N9")).toBe("1/2 a note");
  });

  test("of a file survives with its tables and the name of its copy", async () => {
    const page = await openTrial();
    await openFile(page, "tiles of may.xlsx", heat);
    await expect.poll(() => notice(page).innerText()).toContain("“tiles of may” is open");
    await enter(page, "C8", "15");
    await kept(page);
    await reload(page);
    expect(await sheets(page)).toEqual(["Budget"]);
    expect(await cell(page, "C8", "Budget")).toBe(15);
    expect((await saveCopy(page)).name).toBe("tiles of may.xlsx");
  });

  test("is kept a moment after the last key, and until then the browser asks before the page goes", async () => {
    const page = await openTrial();
    const asked: string[] = [];
    page.on("dialog", (dialog) => {
      asked.push(dialog.type());
      void dialog.accept();
    });
    await enter(page, "N8", "41");
    await kept(page);
    await enter(page, "N8", "42");
    await page.reload();
    await ready(page);
    if ((await cell(page, "N8")) !== 42) expect(asked).toEqual(["beforeunload"]);
    expect([41, 42]).toContain(await cell(page, "N8"));
  });

  test("is back in a new tab when its own tab was closed, and says so", async () => {
    const page = await openTrial();
    await enter(page, "N8", "7");
    await kept(page);
    const [context, address] = [page.context(), page.url()];
    await page.close();
    const next = await anotherTab(context, address);
    expect(await cell(next, "N8")).toBe(7);
    expect(await notice(next).innerText()).toMatch(/as you left it/);
  });
});

describe("nothing is written over", () => {
  test("what was open before another workbook is still offered, as it was", async () => {
    const page = await openTrial();
    await enter(page, "N8", "13");
    await kept(page);
    await openFile(page, "tiles.xlsx", heat);
    await expect.poll(() => notice(page).innerText()).toMatch(/is open.*earlier work is under/);
    await enter(page, "C8", "15");
    await kept(page);
    await offer(page, /^Opening example,/);
    await expect.poll(() => notice(page).innerText()).toContain("is open again");
    await expect.poll(() => cell(page, "N8")).toBe(13);
    await offer(page, /^tiles,/);
    await expect.poll(() => cell(page, "C8", "Budget")).toBe(15);
  });

  test("the opening example comes back untouched, and stays over a reload", async () => {
    const page = await openTrial();
    const first = await cell(page, "E20");
    await enter(page, "E20", "9");
    await kept(page);
    await offer(page, "Opening example");
    await expect.poll(() => notice(page).innerText()).toContain("The opening example is back");
    await expect.poll(() => cell(page, "E20")).toBe(first);
    await reload(page);
    expect(await cell(page, "E20")).toBe(first);
  });

  test("two tabs at once keep a work each", async () => {
    const page = await openTrial();
    await enter(page, "N8", "1");
    await kept(page);
    const other = await anotherTab(page.context(), page.url());
    expect(await cell(other, "N8")).toBe(null);
    await enter(other, "N8", "2");
    await kept(other);
    await enter(page, "N9", "3");
    await kept(page);
    await Promise.all([reload(page), reload(other)]);
    expect([await cell(page, "N8"), await cell(page, "N9"), await cell(other, "N8")]).toEqual([1, 3, 2]);
    await other.getByRole("button", { name: "Other workbooks" }).click();
    await expect.poll(() => other.locator("#more").innerText()).toMatch(/open in another tab/);
  });

  test("a copied tab says that it is one, and goes on apart", async () => {
    const page = await openTrial();
    await enter(page, "N8", "1");
    await kept(page);
    const memory = await page.evaluate(() => sessionStorage.getItem("wallfall.trial.work"));
    const copy = await page.context().newPage();
    await copy.addInitScript((id) => {
      if (!sessionStorage.length) sessionStorage.setItem("wallfall.trial.work", id!);
    }, memory);
    await copy.goto(page.url());
    await ready(copy);
    await expect.poll(() => notice(copy).innerText()).toMatch(/open in another tab too.*a copy/);
    await enter(copy, "N8", "2");
    await kept(copy);
    await reload(page);
    expect(await cell(page, "N8")).toBe(1);
  });

  test("where tabs can't be told apart, a version stored by another one stays, and both are kept", async () => {
    const page = await openTrial();
    await enter(page, "N8", "1");
    await kept(page);
    await page.evaluate(async () => {
      const open = indexedDB.open("wallfall-trial");
      await new Promise((resolve) => (open.onsuccess = resolve));
      const titles = open.result.transaction("titles", "readwrite").objectStore("titles");
      const all = titles.getAll();
      await new Promise((resolve) => (all.onsuccess = resolve));
      titles.put({ ...all.result[0], title: "Written elsewhere", version: "another" });
    });
    await enter(page, "N8", "2");
    await expect.poll(() => keeping(page).innerText()).toMatch(/Another tab stored its own version; both are kept/);
    await page.getByRole("button", { name: "Other workbooks" }).click();
    await expect.poll(() => page.locator("#more").innerText()).toContain("Written elsewhere");
  });
});

describe("a browser that stores nothing", () => {
  test.each([
    ["forbids it", "SecurityError", /Not kept: the browser does not let this page store anything/],
    ["is full", "QuotaExceededError", /Not kept: the browser has no room left/],
  ])("and %s is told plainly; the sheet works on", async (_, name, said) => {
    const page = await openTrial();
    await page.addInitScript((name) => {
      if (name === "SecurityError") {
        IDBFactory.prototype.open = () => {
          throw new DOMException("no", name);
        };
      } else {
        IDBObjectStore.prototype.put = () => {
          throw new DOMException("no", name);
        };
      }
    }, name);
    await reload(page);
    await enter(page, "N8", "=1+1");
    await expect.poll(() => cell(page, "N8")).toBe(2);
    await expect.poll(() => keeping(page).innerText()).toMatch(said);
    const asked: string[] = [];
    page.on("dialog", (dialog) => {
      asked.push(dialog.message());
      void (dialog.type() === "beforeunload" ? dialog.accept() : dialog.dismiss());
    });
    await openFile(page, "tiles.xlsx", heat);
    await expect.poll(() => asked.join()).toMatch(/Save a copy first, or it is lost/);
    expect(await cell(page, "N8")).toBe(2);
    const { book } = await saveCopy(page);
    expect(book.sheets[0].cells[7]![13]).toMatchObject({ value: 2, formula: "=1+1" });
  });
});

test("a file that can't be opened changes nothing and says why", async () => {
  const page = await openTrial();
  await enter(page, "N8", "5");
  await openFile(page, "broken.xlsx", heat.slice(0, 3000));
  await expect.poll(() => notice(page).innerText()).toMatch(/^Not done: The file is damaged/);
  expect(await cell(page, "N8")).toBe(5);
});

test("a file dropped on the cells is opened", async () => {
  const page = await openTrial();
  const data = await page.evaluateHandle(
    (bytes) => {
      const transfer = new DataTransfer();
      transfer.items.add(new File([new Uint8Array(bytes)], "dropped.xlsx"));
      return transfer;
    },
    [...heat],
  );
  await page.dispatchEvent("#grid canvas", "dragover", { dataTransfer: data });
  await page.dispatchEvent("#grid canvas", "drop", { dataTransfer: data });
  await expect.poll(() => notice(page).innerText()).toContain("“dropped” is open");
  expect(await sheets(page)).toEqual(["Budget"]);
});
