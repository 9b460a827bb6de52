// @vitest-environment jsdom
import { existsSync, readdirSync } from "node:fs";
import { afterEach, beforeEach, expect, test, vi } from "vitest";
import { catalogue } from "../../functions/catalogue";
import { DEBYELENGTH } from "../../functions/edge/entries";
import { functionsJson } from "../../manifest/build/functions-json.js";
import { functionPage } from "../../taskpane/pane/function-page";
import { labels } from "../../taskpane/pane/labels";
import { mountPane } from "../../taskpane/pane/mount";
import { wordsIn } from "../../taskpane/pane/words";
import { noWorkbook } from "../../taskpane/workbook/none";
import type { Workbook } from "../../taskpane/workbook/workbook";
import { fakeWorkbook } from "./fake-workbook";

const files = readdirSync("functions")
  .map((family) => `functions/${family}/functions.ts`)
  .filter((file) => existsSync(file));
const declared = await functionsJson(files, "https://localhost:3000");
const words = wordsIn(declared);

let root: HTMLElement;

beforeEach(() => {
  vi.stubGlobal("fetch", () => Promise.resolve(new Response(JSON.stringify(declared))));
  document.body.replaceChildren();
});

afterEach(() => {
  vi.unstubAllGlobals();
  vi.restoreAllMocks();
});

async function open(address: string, workbook: Workbook = noWorkbook): Promise<void> {
  location.hash = address;
  root = document.body.appendChild(document.createElement("main"));
  mountPane(root, workbook);
  await vi.waitFor(() => expect(root.querySelector(".view > *")).not.toBeNull());
}

function all(selector: string): string[] {
  return [...root.querySelectorAll(selector)].map((element) => element.textContent ?? "");
}

async function type(name: string, text: string): Promise<void> {
  const control = root.querySelector<HTMLInputElement>(`#wallfall-input-${name}`)!;
  const before = root.querySelector(".formula")!.textContent;
  control.value = text;
  control.dispatchEvent(new Event("input", { bubbles: true }));
  await vi.waitFor(() => expect(root.querySelector(".formula")!.textContent).not.toBe(before));
}

test("the list shows every function of the catalogue with its meaning", async () => {
  await open("");
  expect(all(".functions b")).toEqual(catalogue.map(({ name }) => name));
  for (const meaning of all(".functions span")) expect(meaning).not.toBe("");
});

test("two tabs lead to the two views, and the one shown is marked", async () => {
  await open("findings");
  const tabs = [...root.querySelectorAll(".tabs a")];
  expect(tabs.map((tab) => [tab.textContent, tab.getAttribute("href"), tab.getAttribute("aria-current")])).toEqual([
    ["Functions", "#", null],
    ["Findings", "#findings", "page"],
  ]);
});

test("an address opens that function's page, in any case; an unknown one says so above the list", async () => {
  await open("debyelength");
  expect(all("h2")).toContain("DEBYELENGTH");
  location.hash = "BLASTFURNACE";
  await vi.waitFor(() => expect(all(".problem")).toEqual(["There is no function named BLASTFURNACE here."]));
  expect(all(".functions b")).toContain("DEBYELENGTH");
});

test("an address of the host's own, or a broken one, opens the list without complaint", async () => {
  await open("_host_Info=Excel$Web$16.01");
  expect(all(".problem")).toEqual([]);
  location.hash = "%E0%A4%A";
  expect(all(".functions b")).toContain("DEBYELENGTH");
});

test.each(catalogue.map((entry) => [entry.name, entry] as const))(
  "the page of %s has no label outside the list",
  (name, entry) => {
    root = functionPage(entry, words.get(name), new Map(), noWorkbook);
    const known = new Set<string>([...Object.values(labels), name]);
    for (const label of all("h2, h3, button, a, .optional, label.unseen")) expect(known).toContain(label.trim());
    const inputs = [...entry.inputs, ...(entry.repeats ? [entry.repeats] : [])].map(
      (input: { name: string }) => input.name,
    );
    expect(all("label .symbol")).toEqual(inputs);
  },
);

test("a refused input tells its message beside the form and marks its field", async () => {
  await open("DEBYELENGTH");
  await type("T_e", "3 Tesla");
  expect(all(".outcome .problem").join()).toMatch(/#VALUE! T_e: /);
  const field = root.querySelector("#wallfall-input-T_e")!;
  expect(field.getAttribute("aria-invalid")).toBe("true");
  expect(field.getAttribute("aria-describedby")).toContain("wallfall-outcome");
  await type("T_e", "3");
  expect(field.hasAttribute("aria-invalid")).toBe(false);
});

test("a blank input is asked for, and its limits are not tested meanwhile", async () => {
  await open("DEBYELENGTH");
  await type("T_e", "");
  expect(all(".outcome .problem").join()).toMatch(/T_e is blank/);
  expect(all(".limits .verdict").join()).toMatch(/not tested: give the inputs/);
});

test("a doubtful input is told at its field", async () => {
  await open("DEBYELENGTH");
  expect(root.querySelector<HTMLElement>("#wallfall-input-n_e-doubt")!.hidden).toBe(true);
  await type("n_e", "1e11");
  expect(root.querySelector("#wallfall-input-n_e-doubt")!.textContent).toMatch(/^doubtful input: .*cm⁻³ meant\?/);
  expect(all(".result .verdict").join()).toMatch(/doubtful input: n_e$/);
  await type("n_e", "1e11 m^-3");
  expect(root.querySelector<HTMLElement>("#wallfall-input-n_e-doubt")!.hidden).toBe(true);
});

test("limits give their verdict in words at the values of the moment, the worst beside the result", async () => {
  await open("DEBYELENGTH");
  expect(all(".limits .verdict").map((text) => text.trim())).toEqual(["holds"]);
  await type("n_e", "1e30 m^-3");
  expect(all(".limits .verdict").map((text) => text.trim())).toEqual(["fails"]);
  expect(all(".result .verdict").join()).toMatch(/fails: a Debye sphere holds hardly an electron/);
});

// NRL Plasma Formulary: 743 cm √(T/n), T in eV and n in cm⁻³; at 3 eV and 10¹⁶ m⁻³ = 10¹⁰ cm⁻³ 0.1287 mm.
test("the result follows the unit that is chosen, and so does the formula", async () => {
  await open("DEBYELENGTH");
  const unit = root.querySelector<HTMLSelectElement>("#wallfall-unit")!;
  unit.value = "mm";
  unit.dispatchEvent(new Event("input"));
  await vi.waitFor(() => expect(all(".formula")).toEqual(['=SHEATH.DEBYELENGTH(1E16,3,,"mm")']));
  expect(parseFloat(all(".value")[0])).toBeCloseTo(7.43 * Math.sqrt(3 / 1e10) * 1e3, 3);
  expect(all(".value")[0]).toMatch(/ mm$/);
});

test("what was typed is still there on coming back", async () => {
  await open("DEBYELENGTH");
  await type("n_e", "4e17");
  location.hash = "";
  await vi.waitFor(() => expect(root.querySelector(".functions")).not.toBeNull());
  location.hash = "DEBYELENGTH";
  await vi.waitFor(() => expect(root.querySelector<HTMLInputElement>("#wallfall-input-n_e")?.value).toBe("4e17"));
});

test("the button writes the formula of the form to the selected cell", async () => {
  const { workbook, cells } = fakeWorkbook();
  await open("DEBYELENGTH", workbook);
  root.querySelector("button")!.click();
  await vi.waitFor(() => expect(all(".said:not(:empty)")).toEqual(["Written to B5 on “Chamber”."]));
  expect(cells).toEqual({ B5: "=SHEATH.DEBYELENGTH(1E16,3)" });
});

test("a workbook that refuses is told, not thrown", async () => {
  const { workbook } = fakeWorkbook();
  await open("DEBYELENGTH", { ...workbook, write: () => Promise.reject(new Error("The sheet is protected.")) });
  root.querySelector("button")!.click();
  await vi.waitFor(() => expect(all(".said:not(:empty)")).toEqual(["That did not work: The sheet is protected."]));
});

test("without a sheet the formula can be copied instead", async () => {
  const copied: string[] = [];
  vi.stubGlobal("navigator", { clipboard: { writeText: async (text: string) => void copied.push(text) } });
  await open("DEBYELENGTH");
  expect(all("button")).toEqual(["Copy formula"]);
  root.querySelector("button")!.click();
  await vi.waitFor(() => expect(all(".said:not(:empty)").join()).toMatch(/^Copied/));
  expect(copied).toEqual(["=SHEATH.DEBYELENGTH(1E16,3)"]);
});

test("a bug in a limit stays on its page and is told there", async () => {
  const limit = DEBYELENGTH.limits[0];
  vi.spyOn(limit, "value").mockImplementation(() => {
    throw new Error("limit out of order");
  });
  await open("DEBYELENGTH");
  expect(all(".problem").join()).toMatch(/broken here \(limit out of order\)/);
  expect(root.querySelector("#wallfall-input-n_e")).not.toBeNull();
  location.hash = "BOHMSPEED";
  await vi.waitFor(() => expect(all(".value")).toHaveLength(1));
});

test("a page that can't be built at all leaves the way to the others", async () => {
  const accuracy = DEBYELENGTH.accuracy;
  Object.assign(DEBYELENGTH, { accuracy: undefined });
  try {
    await open("DEBYELENGTH");
    expect(all(".problem").join()).toMatch(/This page is broken here/);
    expect(all("a.back")).toEqual(["All functions"]);
  } finally {
    Object.assign(DEBYELENGTH, { accuracy });
  }
});

test("without its descriptions the pane says so and still calculates", async () => {
  vi.stubGlobal("fetch", () => Promise.resolve(new Response("", { status: 404, statusText: "Not Found" })));
  await open("DEBYELENGTH");
  expect(all(".problem").join()).toMatch(/descriptions could not be loaded/);
  expect(all(".value")).toHaveLength(1);
});

test("the search narrows the list, and Enter opens the first match", async () => {
  await open("");
  const search = root.querySelector<HTMLInputElement>("#wallfall-search")!;
  search.value = "debyelen";
  search.dispatchEvent(new Event("input"));
  expect(all(".functions b")).toEqual(["DEBYELENGTH"]);
  search.focus();
  search.dispatchEvent(new KeyboardEvent("keydown", { key: "Enter", bubbles: true }));
  await vi.waitFor(() => expect(all("h2")).toContain("DEBYELENGTH"));
});

test("a search without a match says what was looked through", async () => {
  await open("");
  const search = root.querySelector<HTMLInputElement>("#wallfall-search")!;
  search.value = "tokamakish";
  search.dispatchEvent(new Event("input"));
  expect(all(".count")).toEqual(["No function has “tokamakish” in its name, meaning or inputs."]);
  search.dispatchEvent(new KeyboardEvent("keydown", { key: "Escape", bubbles: true }));
});
