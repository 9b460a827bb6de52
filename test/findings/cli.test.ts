import { execFile } from "node:child_process";
import { mkdtempSync, readFileSync, rmSync, statSync, truncateSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, expect, test } from "vitest";
import { lookThrough } from "../../taskpane/findings/look-through";
import { reportCells, reportSheet } from "../../taskpane/findings/report";
import { cleanBooks } from "./clean-books";
import { memoryWorkbook } from "./memory-workbook";
import { saveWorkbook, withParts } from "./save-workbook";

const folder = mkdtempSync(join(tmpdir(), "wallfall-"));
afterAll(() => rmSync(folder, { recursive: true }));

/** What the command does with a file of this content: what it says, how it ends, and whether the file stayed as it was. */
async function findings(content: Uint8Array, name = "book.xlsx") {
  const file = join(folder, name);
  writeFileSync(file, content);
  const before = statSync(file).mtimeMs;
  const { said, code } = await run(file);
  const untouched = statSync(file).mtimeMs === before && Buffer.compare(readFileSync(file), content) === 0;
  return { said, code, untouched };
}

function run(...files: string[]): Promise<{ said: string; code: number }> {
  const args = ["--import", "tsx", "taskpane/findings/cli.ts", ...files];
  return new Promise((resolve) =>
    execFile(process.execPath, args, (error, stdout, stderr) =>
      resolve({ said: stdout + stderr, code: error ? Number(error.code) : 0 }),
    ),
  );
}

const slow = { timeout: 60_000 };
const saved = (make: () => { build(): Parameters<typeof saveWorkbook>[0] }) => saveWorkbook(make().build());
const cathode = cleanBooks["hot cathode"];

test("a book with nothing the matter ends with 0 and says how much was looked at", slow, async () => {
  expect(await findings(saved(cathode))).toEqual({
    said: "book.xlsx: 100 calls of 4 functions in 100 formulas (4 different) on 1 sheet.\nNo findings.\n",
    code: 0,
    untouched: true,
  });
});

test("a book with findings ends with 1 and prints them by cause, each with its place", slow, async () => {
  const book = cathode().on("Cathode").type("F9", 0.97).type("B20", null).save("H12", 1);
  const { said, code, untouched } = await findings(saved(() => book));
  expect(said).toMatch(
    /^Errors: \d\n {2}Cathode!I9 +1 of 25 +FLOATINGPOTENTIAL +#N\/A delta_e 0\.97 reaches the space-charge limit/m,
  );
  expect(said).toMatch(
    /^Saved values that differ from a new calculation: 1\n {2}Cathode!H12 +1 of 25 +RICHARDSONCURRENT/m,
  );
  expect(said).toMatch(/^Blank cells where zero is a value: 1\n {2}Cathode!B20 /m);
  expect({ code, untouched }).toEqual({ code: 1, untouched: true });
});

test("what changed since the report in the book is said with its reason", slow, async () => {
  const book = cathode();
  const { workbook, content } = memoryWorkbook(book.build());
  const found = await lookThrough(workbook, "1.0.0", () => undefined);
  const facts = { ...found, before: undefined, version: "1.0.0", date: "2026-05-04" };
  await workbook.replaceSheet(reportSheet, reportCells(facts));
  content.sheets[0] = book.on("Cathode").type("E12", 2500).build().sheets[0];
  const { said, code } = await findings(saveWorkbook(content));
  expect(said).toMatch(
    /Changed since the report in the workbook\n {2}Cathode!H12 +H12 was \S+, is \S+ +input T_wall: E12 was 2270, is 2500\n$/,
  );
  expect(code).toBe(0);
});

test(
  "a file with macros, a file too large, no file and no name end with 2 and a reason, and nothing is changed",
  slow,
  async () => {
    const macros = await findings(withParts(saved(cathode), { "xl/vbaProject.bin": new Uint8Array(9) }));
    expect(macros).toMatchObject({ code: 2, untouched: true });
    expect(macros.said).toMatch(/book\.xlsx cannot be looked through\. The file carries macros/);
    const huge = join(folder, "huge.xlsx");
    writeFileSync(huge, "PK");
    truncateSync(huge, 2 ** 27);
    const missing = join(folder, "missing.xlsx");
    const { said, code } = await run(huge, missing);
    expect(said).toMatch(/huge\.xlsx cannot be looked through\. The file is too large to be read here: 134 MB/);
    expect(said).toMatch(/missing\.xlsx cannot be looked through\. There is no such file/);
    expect(code).toBe(2);
    expect(await run()).toEqual({ said: "Which workbook? npm run findings -- book.xlsx\n", code: 2 });
  },
);

test("text of a workbook cannot steer the terminal", slow, async () => {
  const book = cathode().on("Cathode").type("D9", "\u001b[2J3 eV\u0007");
  const { said, code } = await findings(saved(() => book));
  // eslint-disable-next-line no-control-regex
  expect(said).not.toMatch(/[\u0000-\u0009\u000b-\u001f]/);
  expect(code).toBe(1);
});
