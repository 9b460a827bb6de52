import { describe, expect, test } from "vitest";
import { accept, readAccepted } from "../../taskpane/findings/accepted";
import { changesSince, isLater } from "../../taskpane/findings/changes";
import { look } from "../../taskpane/findings/look";
import { readReport, reportCells, reportSheet } from "../../taskpane/findings/report";
import { DEBYELENGTH } from "../../functions/edge/entries";
import type { WorkbookContent } from "../../taskpane/workbook/workbook";
import { cleanBooks } from "./clean-books";
import { memoryWorkbook } from "./memory-workbook";
import { one, type SheetModel } from "./sheet-model";

const chamber = () => cleanBooks["argon pre-clean"]().on("Chamber");

/** Writes a report as the pane does, into a workbook that already may hold one. */
async function report(workbook: ReturnType<typeof memoryWorkbook>["workbook"], version = "1.0.0"): Promise<void> {
  const content = await workbook.read();
  const found = await look(content);
  const before = readReport(content);
  const changes = before ? changesSince(before.snapshot, found, version) : [];
  const accepted = await readAccepted(workbook);
  await workbook.replaceSheet(
    reportSheet,
    reportCells({ look: found, accepted, changes, version, date: "2026-05-04", before }),
  );
}

const sheetOf = (content: WorkbookContent) => content.sheets.find(({ name }) => name === reportSheet)!;
const rowWith = (content: WorkbookContent, text: string) => sheetOf(content).values.find((row) => row.includes(text))!;

describe("the report sheet", () => {
  test("tells findings, reasons, version, constants, date, sources, and what was computed from what", async () => {
    const { workbook, content } = memoryWorkbook(chamber().type("C10", 3e10).build());
    const { findings } = await look(await workbook.read());
    await accept(
      workbook,
      findings.find(({ cause }) => cause === "doubtful")!,
      "probe checked",
      "2026-05-03",
    );
    await report(workbook);
    const said = sheetOf(content).values.map((row) => row.join(" | "));
    expect(said[0]).toBe("Sheath findings");
    expect(said.find((row) => row.startsWith("Written by"))).toBe("Written by Wallfall |  |  | 1.0.0");
    expect(said).toContain("Date |  |  | 2026-05-04");
    expect(said.find((row) => row.startsWith("Constants"))).toMatch(/CODATA 2022/);
    expect(said.find((row) => row.startsWith("Doubtful inputs"))).toMatch(
      /Chamber \| C10 .*accepted on 2026-05-03 \| probe checked/,
    );
    expect(said.find((row) => row.startsWith("DEBYELENGTH"))).toMatch(/40 \| Chamber!E6:E45 \| NRL Plasma Formulary/);
    expect(said.find((row) => row.startsWith("Chamber | F6:F45 | =SHEATH.BOHMSPEED"))).toMatch(
      /T_e in Chamber!D6:D45: 1\.7; 1\.712; /,
    );
  });

  test("written again it is replaced, and the reader's notes stay with their findings, also where those are gone", async () => {
    const { workbook, content } = memoryWorkbook(chamber().type("C10", 3e10).type("K20", -3).build());
    await report(workbook);
    const note = (cause: string, text: string) => {
      const head = rowWith(content, "Cause");
      const row = sheetOf(content).values.find((each) => each[0] === cause)!;
      row[head.indexOf("Your notes")] = text;
    };
    note("Doubtful inputs", "ask Kim");
    note("Failing checks", "probe was dirty");
    // A reader put a column of their own in front.
    for (const row of sheetOf(content).values) row.unshift(null);
    content.sheets[0].values[10 - 1][2] = 2.5e16;
    content.sheets[0].values[10 - 1][4] = one("DEBYELENGTH", 2.5e16, 1.748, null, "mm") as number;
    await report(workbook);
    expect(rowWith(content, "Failing checks")).toContain("probe was dirty");
    expect(sheetOf(content).values.filter((row) => row[0] === "Cause")).toHaveLength(1);
    const gone = sheetOf(content).values.findIndex((row) => row[0] === "Notes on findings that are gone");
    expect(sheetOf(content).values[gone + 1]).toContain("ask Kim");
    await report(workbook);
    expect(
      sheetOf(content)
        .values.flat()
        .filter((cell) => cell === "ask Kim"),
    ).toHaveLength(1);
  });

  test("writes text of the workbook as text, never as a formula", async () => {
    const sheet = '=HYPERLINK("x")';
    const book = chamber()
      .on(sheet)
      .type("A1", '=cmd|"/c calc"!A0')
      .formula("B1", "=SHEATH.DEBYELENGTH(A1,3)", () => ({
        code: "#VALUE!",
      }));
    const found = await look(book.build());
    const cells = reportCells({
      look: found,
      accepted: {},
      changes: [],
      version: "1.0.0",
      date: "2026-05-04",
      before: undefined,
    });
    expect(
      cells.flat().some((cell) => typeof cell === "object" && cell !== null && cell.text.startsWith("=HYPERLINK")),
    ).toBe(true);
    expect(cells.flat().filter((cell) => typeof cell === "string")).toEqual([]);
  });
});

describe("the next look says what changed since the report, and why", () => {
  async function changes(before: SheetModel, after: SheetModel, then = "1.0.0", now = "1.0.0") {
    const { workbook, content } = memoryWorkbook(before.build());
    await report(workbook, then);
    const { snapshot } = readReport(content)!;
    return changesSince(snapshot, await look(after.build()), now);
  }

  test("nothing, when nothing did", async () => {
    for (const make of Object.values(cleanBooks)) expect(await changes(make(), make())).toEqual([]);
  });

  test("an input", async () => {
    const found = await changes(chamber(), chamber().type("C10", 5e16));
    expect(found.map(({ cells }) => cells)).toEqual(["E10", "H10"]);
    expect(found[0]).toMatchObject({
      sheet: "Chamber",
      why: ["input n_e: Chamber!C10 was 25200000000000000, is 50000000000000000"].map((each) =>
        each.replace("Chamber!", ""),
      ),
    });
    expect(found[0].what).toMatch(/^E10 was 0\.0\d+, is 0\.0\d+$/);
  });

  test("a formula", async () => {
    const after = chamber();
    for (let row = 6; row <= 45; row++)
      after.retext(
        `E${row}`,
        (text) => text.replace('"mm"', '"um"'),
        (at) => one("DEBYELENGTH", at(`C${row}`), at(`D${row}`), null, "um"),
      );
    const [found, ...others] = await changes(chamber(), after);
    expect(others).toEqual([]);
    expect(found).toMatchObject({ cells: "E6:E45", why: ['the formula was =SHEATH.DEBYELENGTH(C6,D6,,"mm")'] });
    expect(found.what).toMatch(/39 more values changed/);
  });

  test("a version of the function, in the words of its own history", async () => {
    const history = DEBYELENGTH.changes as Record<string, string>;
    history["1.2.0"] = "ions screen too";
    try {
      const after = chamber().save("E7", 1);
      const [found] = await changes(chamber(), after, "1.1.0", "1.2.0");
      expect(found).toMatchObject({ cells: "E7", why: ["DEBYELENGTH changed in version 1.2.0: ions screen too"] });
      const [unexplained] = await changes(chamber(), after, "1.2.0", "1.2.0");
      expect(unexplained.why).toEqual(["nothing that it reads has changed"]);
    } finally {
      delete history["1.2.0"];
    }
  });

  test("a formula that is gone, and one that is new", async () => {
    const after = chamber()
      .overwrite("L2", "checked")
      .on("Chamber")
      .formula("A1", '=SHEATH.CONSTANT("e")', () => 1.602176634e-19);
    const found = await changes(chamber(), after);
    expect(found).toEqual([
      {
        sheet: "Chamber",
        cells: "L2",
        what: "no longer calls a function",
        why: ["it was =SHEATH.VERDICT(J6:J45,L6:L45)"],
      },
      { sheet: "Chamber", cells: "A1", what: "is new", why: ['it is =SHEATH.CONSTANT("e")'] },
    ]);
  });

  test("versions are ordered by their numbers", () => {
    expect(isLater("1.10.0", "1.9.3")).toBe(true);
    expect(isLater("1.9.3", "1.10.0")).toBe(false);
    expect(isLater("2.0.0", "2.0.0")).toBe(false);
    expect(isLater("from source", "1.0.0")).toBe(false);
  });
});
