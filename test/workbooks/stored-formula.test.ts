import { expect, test } from "vitest";
import { fromStored, toStored } from "../../taskpane/workbook/stored-formula";

test("a call is stored without its dot, as the host stores it, and comes back as typed", () => {
  const typed = '=2*SHEATH.DEBYELENGTH(D8:D47,E8:E47,,"mm")';
  expect(toStored(typed)).toBe('2*_xldudf_SHEATH_DEBYELENGTH(D8:D47,E8:E47,,"mm")');
  expect(fromStored(toStored(typed))).toBe(typed);
});

test("names are matched in any case: LibreOffice stores them in small letters", () => {
  expect(fromStored("_xldudf_sheath_unit(1)")).toBe("=SHEATH.UNIT(1)");
  expect(toStored("=sheath.unit(1)")).toBe("_xldudf_SHEATH_UNIT(1)");
});

test("text and sheet names that look like calls stay as they are", () => {
  const typed = `='SHEATH.UNIT(1)'!A1&"SHEATH.UNIT(""x"")"&SHEATH.ABOUT()`;
  expect(toStored(typed)).toBe(`'SHEATH.UNIT(1)'!A1&"SHEATH.UNIT(""x"")"&_xldudf_SHEATH_ABOUT()`);
  expect(fromStored(toStored(typed))).toBe(typed);
});

// [MS-XLSX] 2.2.2 gives the marks of functions that came after the file format.
test("functions younger than the file format carry its marks in a file, and none in a cell", () => {
  expect(toStored("=concat(SORT(A1:A3),SUM(A1:A3),STDEV.S(A1:A3))")).toBe(
    "_xlfn.CONCAT(_xlfn._xlws.SORT(A1:A3),SUM(A1:A3),_xlfn.STDEV.S(A1:A3))",
  );
  expect(fromStored("_xlfn.CONCAT(_xlfn._xlws.SORT(A1:A3))")).toBe("=CONCAT(SORT(A1:A3))");
});
