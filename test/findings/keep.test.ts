import { describe, expect, test } from "vitest";
import { bringBack, isUntouched, keepAsValues, keptAreas, readKept } from "../../taskpane/findings/keep";
import { look } from "../../taskpane/findings/look";
import { contentOf } from "../../taskpane/workbook/file";
import { readersCopy, readersFile, writeReadersCopy } from "../../taskpane/findings/readers-copy";
import { readBook } from "../../taskpane/workbook/xlsx-read";
import { writeBook } from "../../taskpane/workbook/xlsx-write";
import { cleanBooks } from "./clean-books";
import { memoryWorkbook } from "./memory-workbook";
import { saveWorkbook } from "./save-workbook";

describe.each(Object.entries(cleanBooks))("results kept as values, of the %s", (_, make) => {
  const before = () => make().build();

  /** Calculates nothing: a formula that is put back shows what it showed before. */
  function opened() {
    const was = before();
    return memoryWorkbook(before(), (formula, name, address) => {
      const sheet = was.sheets.find((each) => each.name === name)!;
      const { values, formulas, spills, origin } = sheet;
      const at = (cell: string) => {
        const [from, to] = [origin, cell].map((each) => /([A-Z]+)(\d+)/.exec(each)!);
        const column = (letters: string) =>
          [...letters].reduce((sum, letter) => sum * 26 + letter.charCodeAt(0) - 64, 0);
        return [Number(to[2]) - Number(from[2]), column(to[1]) - column(from[1])];
      };
      const [row, column] = at(address);
      expect(formulas[row][column]).toBe(formula);
      const [endRow, endColumn] = at(spills.find(({ anchor }) => anchor === address)?.range.split(":")[1] ?? address);
      return values.slice(row, endRow + 1).map((cells) => cells.slice(column, endColumn + 1));
    });
  }

  test("show the same, hold no formula, and come back letter for letter", async () => {
    const { workbook, content } = opened();
    const found = await look(await workbook.read());
    await keepAsValues(workbook, found.book, found.fills);
    const kept = await readKept(workbook);
    expect(content.sheets.map(({ values }) => values)).toEqual(before().sheets.map(({ values }) => values));
    const after = await look(await workbook.read(), { kept: keptAreas(kept) });
    expect({ calls: after.calls, findings: after.findings }).toEqual({ calls: 0, findings: [] });
    for (const each of kept) {
      expect(isUntouched(await workbook.read(), each)).toBe(true);
      await bringBack(workbook, each);
    }
    expect(content.sheets.map(({ values, formulas }) => ({ values, formulas }))).toEqual(
      before().sheets.map(({ values, formulas }) => ({ values, formulas })),
    );
    expect(await readKept(workbook)).toEqual([]);
  });
});

describe("keeping", () => {
  const chamber = () => cleanBooks["argon pre-clean"]().on("Chamber");

  test("some columns leaves the others alone, and the kept are not taken for typed over", async () => {
    const { workbook } = memoryWorkbook(chamber().build());
    const found = await look(await workbook.read());
    await keepAsValues(
      workbook,
      found.book,
      found.fills.filter(({ calls }) => calls[0] === "DEBYELENGTH"),
    );
    const [kept, ...others] = await readKept(workbook);
    expect(others).toEqual([]);
    expect(kept).toMatchObject({ sheet: "Chamber", cells: "E6:E45", functions: "DEBYELENGTH", others: {} });
    expect((await look(await workbook.read())).uses.map((use) => use.function)).not.toContain("DEBYELENGTH");
  });

  test("keeps an error as the text of its code", async () => {
    const { workbook, content } = memoryWorkbook(chamber().type("C9", "OL").build());
    const found = await look(await workbook.read());
    await keepAsValues(workbook, found.book, found.fills);
    expect(content.sheets[0].values[9 - 1][4]).toBe("#VALUE!");
  });

  test("tells when somebody changed a kept value", async () => {
    const { workbook, content } = memoryWorkbook(chamber().build());
    const found = await look(await workbook.read());
    await keepAsValues(
      workbook,
      found.book,
      found.fills.filter(({ calls }) => calls[0] === "DEBYELENGTH"),
    );
    const [kept] = await readKept(workbook);
    content.sheets[0].values[9 - 1][4] = 7;
    expect(isUntouched(content, kept)).toBe(false);
  });

  test("remembers a formula that its relative form does not give back letter for letter", async () => {
    const odd = '=sheath.debyelength( C20 , D20 , , "mm" )';
    const book = chamber();
    const now = book.valueAt("E20");
    book.retext(
      "E20",
      () => odd,
      () => now,
    );
    const { workbook, content } = memoryWorkbook(book.build(), () => [[now]]);
    const found = await look(await workbook.read());
    await keepAsValues(workbook, found.book, found.fills);
    for (const each of await readKept(workbook)) if (each.cells.includes("E20")) await bringBack(workbook, each);
    expect(content.sheets[0].formulas[20 - 1][4]).toBe(odd);
  });
});

describe("a copy for readers without the add-in", () => {
  test("as sheets has every value in its place, the verdicts and the formulas as text", async () => {
    const before = () => cleanBooks["argon pre-clean"]().on("Chamber").type("D9", 5.5).type("C12", "OL").build();
    const { workbook, content } = memoryWorkbook(before());
    expect(await writeReadersCopy(workbook, readersCopy(await look(before())))).toEqual([
      "Chamber values",
      "Formulas and verdicts",
    ]);
    const [original, values, list] = content.sheets;
    expect(original).toEqual(before().sheets[0]);
    expect(values.formulas.flat().filter(Boolean)).toEqual([]);
    const shown = (row: number, column: number) => values.values[row - 1][column];
    expect([shown(6, 2), shown(7, 5)]).toEqual([2e16, original.values[7 - 1][5]]);
    expect(shown(12, 4)).toBe("#VALUE!");
    expect(list.values.find((row) => row[1] === "E6:E45")![4]).toMatch(
      /^39 hold; #VALUE! n_e: "OL" is an instrument's word/,
    );
    expect(list.values.find((row) => row[1] === "G6:G45")).toEqual([
      "Chamber",
      "G6:G45",
      "=SHEATH.FLOATINGPOTENTIAL(D6:D45,B2)",
      "FLOATINGPOTENTIAL",
      expect.stringMatching(/^39 hold, 1 (marginal|fails); .*inelastic|^39 hold, 1 marginal; marginal: /),
      expect.stringMatching(/Lieberman/),
    ]);
    expect(list.formulas.flat().filter(Boolean)).toEqual([]);
  });

  test("never takes the name of a sheet that is there", async () => {
    const book = cleanBooks["hot cathode"]().on("Cathode values").type("A1", 1);
    const { copies, list } = readersCopy(await look(book.build()));
    expect([copies[0].name, list.name]).toEqual(["Cathode values 2", "Formulas and verdicts"]);
  });

  test("as a file holds no formula at all and opens as any workbook", async () => {
    const book = readBook(saveWorkbook(cleanBooks["ion extraction"]().build()));
    const original = structuredClone(book);
    const copy = contentOf(readBook(writeBook(readersFile(book, await look(contentOf(book))))));
    expect(book).toEqual(original);
    expect(copy.sheets.flatMap(({ formulas }) => formulas.flat()).filter((each) => each !== undefined)).toEqual([]);
    expect(copy.sheets.map(({ name }) => name)).toEqual(["Inputs", "Runs", "Formulas and verdicts"]);
    expect(copy.sheets[1].values[4 - 1][6]).toBe(contentOf(book).sheets[1].values[4 - 1][6]);
  });
});
