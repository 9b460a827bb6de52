import { CFB, utils, write, type CellObject, type WorkSheet } from "@e965/xlsx";
import { areaOf } from "../../taskpane/findings/area";
import { a1, cellOf } from "../../taskpane/workbook/address";
import type { CellContent, SheetContent, WorkbookContent } from "../../taskpane/workbook/workbook";

const errorCodes: Record<string, number> = {
  "#NULL!": 0x00,
  "#DIV/0!": 0x07,
  "#VALUE!": 0x0f,
  "#REF!": 0x17,
  "#NAME?": 0x1d,
  "#NUM!": 0x24,
  "#N/A": 0x2a,
};

/** The bytes of an .xlsx as a host saves it: our functions under their stored names, spills as dynamic arrays. */
export function saveWorkbook({ sheets, names }: WorkbookContent): Uint8Array {
  const book = utils.book_new();
  for (const sheet of sheets) utils.book_append_sheet(book, workSheet(sheet), sheet.name);
  book.Workbook = { Names: Object.entries(names).map(([Name, Ref]) => ({ Name, Ref })) };
  const file = new Uint8Array(write(book, { type: "array", bookType: "xlsx", compression: true }) as ArrayBuffer);
  const tables = tableParts(sheets);
  return Object.keys(tables).length === 0 ? file : withParts(file, tables);
}

function workSheet({ name, origin, values, formulas, spills }: SheetContent): WorkSheet {
  const from = cellOf(origin);
  const sheet: WorkSheet = {};
  const areas = spills.map(({ anchor, range }) => ({ anchor, range, area: areaOf(name, range) }));
  values.forEach((row, i) =>
    row.forEach((value, j) => {
      const place = { row: from.row + i, column: from.column + j };
      const address = a1(place);
      const formula = formulas[i]?.[j];
      if (value === null && formula === undefined) return;
      const cell = cellObject(value);
      if (formula !== undefined) cell.f = storedFormula(formula);
      const spill = areas.find(({ anchor }) => anchor === address);
      if (spill) Object.assign(cell, { F: spill.range, D: true });
      sheet[address] = cell;
    }),
  );
  const last = {
    row: from.row + values.length - 1,
    column: from.column + Math.max(...values.map((row) => row.length)) - 1,
  };
  sheet["!ref"] = `${origin}:${a1(last)}`;
  return sheet;
}

function cellObject(value: CellContent): CellObject {
  if (typeof value === "number") return { t: "n", v: value };
  if (typeof value === "boolean") return { t: "b", v: value };
  if (typeof value === "object" && value !== null) return { t: "e", v: errorCodes[value.error] ?? 0x0f };
  return { t: "s", v: value ?? "" };
}

function storedFormula(formula: string): string {
  return formula
    .slice(1)
    .replace(/\bSHEATH\.([A-Z]+)\(/g, "_xldudf_SHEATH_$1(")
    .replace(/\b([A-Z]+\d+)#/g, "_xlfn.ANCHORARRAY($1)")
    .replace(/\[@(\w+)\]/g, "[[#This Row],[$1]]")
    .replace(/\[@\[([^\]]+)\]\]/g, "[[#This Row],[$1]]");
}

/** A saved file with parts added to it, by path. */
export function withParts(file: Uint8Array, parts: Record<string, string | Uint8Array>): Uint8Array {
  const archive = CFB.read(file as unknown as string, { type: "array" as never });
  for (const [path, content] of Object.entries(parts)) {
    const bytes = typeof content === "string" ? new TextEncoder().encode(content) : content;
    CFB.utils.cfb_add(archive, `/${path}`, bytes as never);
  }
  return new Uint8Array(CFB.write(archive, { fileType: "zip" as never, type: "array" as never }) as never);
}

const relationship = "http://schemas.openxmlformats.org/officeDocument/2006/relationships";

/** The parts that the writer leaves out: tables, each beside its sheet. */
function tableParts(sheets: readonly SheetContent[]): Record<string, string> {
  const parts: Record<string, string> = {};
  let count = 0;
  sheets.forEach(({ tables }, i) => {
    const relations = tables.map(({ name, range, columns }) => {
      count++;
      const named = columns.map((column, k) => `<tableColumn id="${k + 1}" name="${column}"/>`).join("");
      parts[`xl/tables/table${count}.xml`] =
        `<table xmlns="http://schemas.openxmlformats.org/spreadsheetml/2006/main" id="${count}" displayName="${name}" ref="${range}">` +
        `<tableColumns count="${columns.length}">${named}</tableColumns></table>`;
      return `<Relationship Id="rId${count}" Type="${relationship}/table" Target="../tables/table${count}.xml"/>`;
    });
    if (relations.length > 0)
      parts[`xl/worksheets/_rels/sheet${i + 1}.xml.rels`] =
        `<Relationships xmlns="http://schemas.openxmlformats.org/package/2006/relationships">${relations.join("")}</Relationships>`;
  });
  return parts;
}
