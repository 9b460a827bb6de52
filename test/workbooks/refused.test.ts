import { strToU8, zipSync } from "fflate";
import * as XLSX from "@e965/xlsx";
import { describe, expect, test } from "vitest";
import { makeSamples } from "../../taskpane/trial/samples/make";
import { FileProblem } from "../../taskpane/workbook/xlsx-book";
import { readBook } from "../../taskpane/workbook/xlsx-read";

const sample = makeSamples()["wall-heat.xlsx"];

function refusal(bytes: Uint8Array): string {
  try {
    readBook(bytes);
  } catch (error) {
    if (error instanceof FileProblem) return error.message;
    throw error;
  }
  return "read";
}

describe("a file that can't be opened is told apart, with what to do", () => {
  test("an empty one, and one that is no workbook at all", () => {
    expect(refusal(new Uint8Array())).toMatch(/empty/);
    expect(refusal(strToU8("V,I\n1,2\n"))).toMatch(/isn't an \.xlsx workbook.*save it as \.xlsx/);
    expect(refusal(zipSync({ "word/document.xml": strToU8("<document/>") }))).toMatch(/isn't an \.xlsx workbook/);
  });

  test("one of the old kind, as another library writes it", () => {
    const book = XLSX.utils.book_new();
    XLSX.utils.book_append_sheet(book, XLSX.utils.aoa_to_sheet([[1]]), "S");
    expect(refusal(XLSX.write(book, { type: "buffer", bookType: "biff8" }))).toMatch(
      /old kind \(\.xls\).*Save it as \.xlsx/,
    );
    expect(refusal(XLSX.write(book, { type: "buffer", bookType: "xlsb" }))).toMatch(/\.xlsb.*Save it as \.xlsx/);
  });

  // A locked workbook is a compound file with a stream of this name, [MS-OFFCRYPTO] 2.3.4.4.
  test("one with a password", () => {
    const container = XLSX.CFB.utils.cfb_new();
    XLSX.CFB.utils.cfb_add(container, "/EncryptionInfo", strToU8("x".repeat(248)));
    XLSX.CFB.utils.cfb_add(container, "/EncryptedPackage", strToU8("x".repeat(5000)));
    expect(refusal(new Uint8Array(XLSX.CFB.write(container, { type: "buffer" }) as Uint8Array))).toMatch(
      /password.*without one/,
    );
  });

  test("one that was cut off, and one whose parts are broken", () => {
    expect(refusal(sample.slice(0, sample.length / 2))).toMatch(/damaged/);
    const parts = { "[Content_Types].xml": strToU8("<Types/>"), "xl/workbook.xml": strToU8("<workbook") };
    expect(refusal(zipSync(parts))).toMatch(/damaged/);
  });

  test("one that is too large, before it is unpacked", () => {
    expect(refusal(new Uint8Array(61e6))).toMatch(/too large.*61 MB/);
    // What the zip's directory claims of its second file is enough.
    const bomb = zipSync({ "[Content_Types].xml": strToU8("<Types/>"), "xl/a.xml": strToU8("<a/>") });
    new DataView(bomb.buffer).setUint32(bomb.lastIndexOf(0x50, bomb.length - 23 - 46) + 24, 601e6, true);
    expect(refusal(bomb)).toMatch(/too large.*601 MB/);
  });
});

test("macros and pictures are told as left out, and the cells are read", () => {
  const parts = { "xl/vbaProject.bin": strToU8("x"), "xl/media/image1.png": strToU8("x") };
  const [types, ...rest] = ["[Content_Types].xml", "xl/workbook.xml", "xl/worksheets/sheet1.xml"];
  const book = zipSync({
    [types]: strToU8("<Types/>"),
    [rest[0]]: strToU8('<workbook xmlns:r="r"><sheets><sheet name="S" sheetId="1" r:id="rId1"/></sheets></workbook>'),
    "xl/_rels/workbook.xml.rels": strToU8(
      '<Relationships><Relationship Id="rId1" Type="x/worksheet" Target="worksheets/sheet1.xml"/></Relationships>',
    ),
    [rest[1]]: strToU8(
      '<x:worksheet xmlns:x="m"><x:sheetData><x:row><x:c><x:v>7</x:v></x:c></x:row></x:sheetData><x:dataValidations/></x:worksheet>',
    ),
    ...parts,
  });
  const { leftOut, sheets } = readBook(book);
  expect(leftOut.sort()).toEqual(["macros", "pictures", "rules for what may be typed"]);
  expect(sheets[0].cells[0]![0]!.value).toBe(7);
});
