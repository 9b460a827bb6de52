import * as XLSX from "@e965/xlsx";
import { describe, expect, test } from "vitest";
import { makeSamples } from "../../taskpane/trial/samples/make";
import { toStored } from "../../taskpane/workbook/stored-formula";
import { a1, cornersOf } from "../../taskpane/workbook/address";
import type { FileBook, FileSheet } from "../../taskpane/workbook/xlsx-book";
import { readBook } from "../../taskpane/workbook/xlsx-read";
import { writeBook } from "../../taskpane/workbook/xlsx-write";

const samples = Object.entries(makeSamples());

function cellsOf(sheet: FileSheet) {
  return sheet.cells.flatMap((cells, row) =>
    (cells ?? []).flatMap((cell, column) => (cell ? [{ ...cell, address: a1({ row, column }) }] : [])),
  );
}

describe.each(samples)("%s", (_, bytes) => {
  test("is the same book after reading, writing and reading again", () => {
    const book = readBook(bytes);
    expect(readBook(writeBook(book))).toEqual(book);
  });

  // An outside reader: SheetJS's community edition.
  test("holds for another reader what it holds for us: values, formulas, spills and formats", () => {
    const book = readBook(bytes);
    const other = XLSX.read(bytes, { cellNF: true });
    expect(other.SheetNames).toEqual(book.sheets.map(({ name }) => name));
    let compared = 0;
    for (const sheet of book.sheets) {
      for (const { address, value, formula, fills, style } of cellsOf(sheet)) {
        const cell: XLSX.CellObject & { F?: string; D?: boolean } = other.Sheets[sheet.name][address];
        if (value === null && formula === undefined) continue;
        expect(cell.v, address).toBe(value);
        expect(cell.z ?? "General", address).toBe(book.styles[style ?? 0].format ?? "General");
        // It takes off the file format's marks, as a reader would.
        if (formula) expect(cell.f, address).toBe(toStored(formula).replace(/_xlfn\./g, ""));
        if (fills) expect([cell.F, cell.D], address).toEqual([fills, true]);
        compared++;
      }
    }
    expect(compared).toBeGreaterThan(60);
  });

  test("shows a value for every formula, and no error", () => {
    const formulas = readBook(bytes).sheets.flatMap((sheet) => cellsOf(sheet).filter(({ formula }) => formula));
    expect(formulas.length).toBeGreaterThan(5);
    for (const { value, address } of formulas) expect(["number", "string"], address).toContain(typeof value);
  });
});

test("a formula that fills a range is stored once, with its range and the mark of a dynamic array", () => {
  const book = readBook(Object.fromEntries(samples)["chuck-bias.xlsx"]);
  const filling = cellsOf(book.sheets[0]).filter(({ fills }) => fills);
  expect(filling.map(({ fills }) => fills)).toEqual(["B10:B33", "C10:C33", "F10:F33", "G10:G33"]);
  const { from, to } = cornersOf(filling[0].fills!);
  const others = cellsOf(book.sheets[0]).filter(({ address }) => /^B(1[1-9]|2\d|3[0-3])$/.test(address));
  expect(others).toHaveLength(to.row - from.row);
  expect(others.every(({ formula, value }) => formula === undefined && typeof value === "number")).toBe(true);
});

describe("what another writer made", () => {
  function written(change: (sheet: XLSX.WorkSheet, book: XLSX.WorkBook) => void): FileBook {
    const sheet = XLSX.utils.aoa_to_sheet([
      [1, "two"],
      [true, null, 0.25],
    ]);
    const book = XLSX.utils.book_new();
    XLSX.utils.book_append_sheet(book, sheet, "A & 'B' c");
    change(sheet, book);
    return readBook(XLSX.write(book, { type: "buffer", bookType: "xlsx", bookSST: true }));
  }

  test("is read with its values, formats, errors and cached results", () => {
    const { sheets, styles } = written((sheet) => {
      sheet.C2.z = "0.00%";
      sheet.A3 = { t: "e", v: 0x2a };
      sheet.B3 = { t: "n", v: 3, f: 'SUM(A1,"<&>")' };
      sheet["!ref"] = "A1:C3";
    });
    expect(sheets[0].name).toBe("A & 'B' c");
    const [[one, two], [truth, , quarter], [error, sum]] = sheets[0].cells as any;
    expect([one.value, two.value, truth.value, quarter.value]).toEqual([1, "two", true, 0.25]);
    expect(styles[quarter.style].format).toBe("0.00%");
    expect(error.value).toEqual({ error: "#N/A" });
    expect(sum).toMatchObject({ value: 3, formula: '=SUM(A1,"<&>")' });
  });

  test("is read with its names, those of one sheet included", () => {
    const { names } = written((_, book) => {
      book.Workbook = {
        Names: [
          { Name: "T_e", Ref: "'A & ''B'' c'!$A$1" },
          { Name: "own", Ref: "'A & ''B'' c'!$B$1", Sheet: 0 },
        ],
      };
    });
    expect(names).toEqual([
      { name: "T_e", refers: "'A & ''B'' c'!$A$1" },
      { name: "own", refers: "'A & ''B'' c'!$B$1", sheet: "A & 'B' c" },
    ]);
  });
});

test("a formula that one value comes out of, worked out cell by cell over ranges, keeps to whole ranges", () => {
  const cells: FileSheet["cells"] = [
    [{ value: 1 }, { value: 2 }],
    [
      { value: 2, formula: "=SUM(A1:A1*B1:B1)" },
      { value: 3, formula: "=SUM(A1:B1)" },
      { value: 2, formula: '="A1:B2*"&2' },
    ],
  ];
  const sheet = { name: "S", cells, tables: [], widths: {}, heights: {}, merged: [] };
  const other = XLSX.read(writeBook({ sheets: [sheet], names: [], styles: [{}], leftOut: [] })).Sheets.S;
  expect([other.A2.F, other.B2.F, other.C2.F]).toEqual(["A2", undefined, undefined]);
});
