import { strToU8, zipSync } from "fflate";
import { a1, columnLetters } from "./address";
import { toStored } from "./stored-formula";
import type { FileBook, FileCell, FileName, FileSheet, FileTable } from "./xlsx-book";
import { stylesXml } from "./xlsx-styles";
import { escapeXml, tag } from "./xml";

/** Office Open XML (ECMA-376, ISO/IEC 29500), transitional. */
const main = "http://schemas.openxmlformats.org/spreadsheetml/2006/main";
const relations = "http://schemas.openxmlformats.org/officeDocument/2006/relationships";
const packaged = "http://schemas.openxmlformats.org/package/2006";
const contentType = "application/vnd.openxmlformats-officedocument.spreadsheetml";

/** The bytes of an .xlsx file. */
export function writeBook(book: FileBook): Uint8Array {
  const strings = new Strings();
  const parts: Record<string, string> = {};
  const overrides: [part: string, type: string][] = [];
  const put = (part: string, type: string, xml: string) => {
    parts[part] = head + xml;
    overrides.push([part, type]);
  };
  let tables = 0;
  book.sheets.forEach((sheet, i) => {
    const ids = sheet.tables.map(() => ++tables);
    sheet.tables.forEach((table, k) =>
      put(`xl/tables/table${ids[k]}.xml`, `${contentType}.table+xml`, tableXml(table, ids[k])),
    );
    put(`xl/worksheets/sheet${i + 1}.xml`, `${contentType}.worksheet+xml`, sheetXml(sheet, i === 0, strings));
    if (ids.length > 0)
      parts[`xl/worksheets/_rels/sheet${i + 1}.xml.rels`] = relationsXml(
        ids.map((id) => ["table", `../tables/table${id}.xml`]),
      );
  });
  put("xl/styles.xml", `${contentType}.styles+xml`, stylesXml(book.styles));
  put("xl/sharedStrings.xml", `${contentType}.sharedStrings+xml`, strings.xml());
  put("xl/metadata.xml", `${contentType}.sheetMetadata+xml`, dynamicArrayMark);
  put("xl/workbook.xml", `${contentType}.sheet.main+xml`, workbookXml(book));
  parts["xl/_rels/workbook.xml.rels"] = relationsXml([
    ...book.sheets.map((_, i): [string, string] => ["worksheet", `worksheets/sheet${i + 1}.xml`]),
    ["styles", "styles.xml"],
    ["sharedStrings", "sharedStrings.xml"],
    ["sheetMetadata", "metadata.xml"],
  ]);
  parts["_rels/.rels"] = relationsXml([["officeDocument", "xl/workbook.xml"]]);
  parts["[Content_Types].xml"] = typesXml(overrides);
  // Readers look for the list of types first. The date is that of the format's oldest, so that equal books are equal files.
  const order = ["[Content_Types].xml", "_rels/.rels", ...Object.keys(parts)];
  const files = Object.fromEntries([...new Set(order)].map((part) => [part, strToU8(parts[part])]));
  return zipSync(files, { level: 6, mtime: new Date(1980, 0, 1, 12) });
}

const head = `<?xml version="1.0" encoding="UTF-8" standalone="yes"?>\n`;

function typesXml(overrides: readonly [string, string][]): string {
  const defaults = [
    tag("Default", { Extension: "rels", ContentType: "application/vnd.openxmlformats-package.relationships+xml" }),
    tag("Default", { Extension: "xml", ContentType: "application/xml" }),
  ];
  const listed = overrides.map(([part, type]) => tag("Override", { PartName: `/${part}`, ContentType: type }));
  return head + tag("Types", { xmlns: `${packaged}/content-types` }, [...defaults, ...listed].join(""));
}

function relationsXml(targets: readonly [type: string, target: string][]): string {
  const listed = targets.map(([type, target], i) =>
    tag("Relationship", { Id: `rId${i + 1}`, Type: `${relations}/${type}`, Target: target }),
  );
  return head + tag("Relationships", { xmlns: `${packaged}/relationships` }, listed.join(""));
}

function workbookXml({ sheets, names }: FileBook): string {
  const listed = sheets.map(({ name, hidden }, i) =>
    tag("sheet", { name, sheetId: i + 1, state: hidden ? "hidden" : undefined, "r:id": `rId${i + 1}` }),
  );
  const defined = names.map((each) => nameXml(each, sheets)).join("");
  return tag(
    "workbook",
    { xmlns: main, "xmlns:r": relations },
    tag("sheets", {}, listed.join("")) +
      (defined && tag("definedNames", {}, defined)) +
      tag("calcPr", { calcId: 191029 }),
  );
}

function nameXml({ name, refers, sheet }: FileName, sheets: readonly FileSheet[]): string {
  const at = sheet === undefined ? -1 : sheets.findIndex((each) => each.name === sheet);
  return tag("definedName", { name, localSheetId: at < 0 ? undefined : at }, escapeXml(toStored(refers)));
}

function sheetXml(sheet: FileSheet, isFirst: boolean, strings: Strings): string {
  const widths = Object.entries(sheet.widths).map(([at, pixels]) =>
    tag("col", { min: Number(at) + 1, max: Number(at) + 1, width: charactersIn(pixels), customWidth: 1 }),
  );
  const merged = sheet.merged.map((ref) => tag("mergeCell", { ref }));
  const tables = sheet.tables.map((_, i) => tag("tablePart", { "r:id": `rId${i + 1}` }));
  return tag(
    "worksheet",
    { xmlns: main, "xmlns:r": relations },
    tag("sheetViews", {}, viewXml(sheet, isFirst)) +
      tag("sheetFormatPr", { defaultRowHeight: 15 }) +
      (widths.length > 0 ? tag("cols", {}, widths.join("")) : "") +
      `<sheetData>${rowsXml(sheet, strings)}</sheetData>` +
      (merged.length > 0 ? tag("mergeCells", { count: merged.length }, merged.join("")) : "") +
      (tables.length > 0 ? tag("tableParts", { count: tables.length }, tables.join("")) : ""),
  );
}

/** A character of the default font is 7 pixels wide, and a column has 5 to spare. */
function charactersIn(pixels: number): string {
  return Math.max(0, (pixels - 5) / 7).toFixed(2);
}

function viewXml({ frozen }: FileSheet, isFirst: boolean): string {
  const { rows = 0, columns = 0 } = frozen ?? {};
  const pane = tag("pane", {
    xSplit: columns || undefined,
    ySplit: rows || undefined,
    topLeftCell: a1({ row: rows, column: columns }),
    activePane: rows && columns ? "bottomRight" : rows ? "bottomLeft" : "topRight",
    state: "frozen",
  });
  const view = { workbookViewId: 0, tabSelected: isFirst ? 1 : undefined };
  return tag("sheetView", view, rows || columns ? pane : "");
}

function rowsXml({ cells, heights }: FileSheet, strings: Strings): string {
  const rows: string[] = [];
  const last = Math.max(cells.length - 1, ...Object.keys(heights).map(Number));
  for (let row = 0; row <= last; row++) {
    const written: string[] = [];
    cells[row]?.forEach((cell, column) => cell && written.push(cellXml(cell, row, column, strings)));
    const height = heights[row] === undefined ? "" : ` ht="${heights[row] * 0.75}" customHeight="1"`;
    if (written.length > 0 || height) rows.push(`<row r="${row + 1}"${height}>${written.join("")}</row>`);
  }
  return rows.join("");
}

function cellXml({ value, formula, fills, style }: FileCell, row: number, column: number, strings: Strings): string {
  const address = columnLetters(column) + (row + 1);
  const looks = style ? ` s="${style}"` : "";
  const [type, inside] = valueXml(value, formula !== undefined, strings);
  if (formula === undefined) return `<c r="${address}"${looks}${type}>${inside}</c>`;
  const text = escapeXml(toStored(formula));
  // The mark of a dynamic array: the one entry of metadata.xml.
  return fills || needsArray(formula)
    ? `<c r="${address}"${looks}${type} cm="1"><f t="array" ref="${fills ?? address}">${text}</f>${inside}</c>`
    : `<c r="${address}"${looks}${type}><f>${text}</f>${inside}</c>`;
}

/**
 * A formula that works on a whole range cell by cell, though one value comes out. Stored as an ordinary formula, such a
 * range would shrink to the one cell in the formula's own row.
 */
function needsArray(formula: string): boolean {
  const bare = formula.replace(/"(?:[^"]|"")*"/g, '""').replace(/^=/, " ");
  const range = String.raw`\$?[A-Z]{1,3}\$?\d+:\$?[A-Z]{1,3}\$?\d+|\w+\[[^#@\]]+\]`;
  const operator = String.raw`[-+*/^&=<>]`;
  return new RegExp(`${operator}\\s*(?:${range})|(?:${range})\\s*${operator}`, "i").test(bare);
}

function valueXml(value: FileCell["value"], isComputed: boolean, strings: Strings): [type: string, inside: string] {
  if (value === null) return ["", ""];
  if (typeof value === "number") return ["", `<v>${value}</v>`];
  if (typeof value === "boolean") return [' t="b"', `<v>${value ? 1 : 0}</v>`];
  if (typeof value === "object") return [' t="e"', `<v>${escapeXml(errorToStore(value.error))}</v>`];
  if (isComputed) return [' t="str"', `<v>${escapeXml(value)}</v>`];
  return [' t="s"', `<v>${strings.at(value)}</v>`];
}

/** The errors that the file format knows, ECMA-376 part 1, 18.17.3; younger ones are stored as #VALUE!. */
function errorToStore(code: string): string {
  return ["#NULL!", "#DIV/0!", "#VALUE!", "#REF!", "#NAME?", "#NUM!", "#N/A"].includes(code) ? code : "#VALUE!";
}

function tableXml({ name, range, columns, totalsRow, look }: FileTable, id: number): string {
  const listed = columns.map((column, i) =>
    tag(
      "tableColumn",
      { id: i + 1, name: column.name, ...column.totals },
      (column.formula ? tag("calculatedColumnFormula", {}, escapeXml(toStored(column.formula))) : "") +
        (column.totalsFormula ? tag("totalsRowFormula", {}, escapeXml(toStored(column.totalsFormula))) : ""),
    ),
  );
  const totals = totalsRow ? { totalsRowCount: 1 } : { totalsRowShown: 0 };
  return tag(
    "table",
    { xmlns: main, id, name, displayName: name, ref: range, ...totals },
    tag("autoFilter", { ref: totalsRow ? withoutLastRow(range) : range }) +
      tag("tableColumns", { count: columns.length }, listed.join("")) +
      tag("tableStyleInfo", look ?? { name: "TableStyleLight1", showRowStripes: 1 }),
  );
}

function withoutLastRow(range: string): string {
  return range.replace(/\d+$/, (row) => String(Number(row) - 1));
}

/** Texts of all sheets, each kept once. */
class Strings {
  private readonly places = new Map<string, number>();
  private uses = 0;

  at(text: string): number {
    this.uses++;
    const known = this.places.get(text);
    if (known !== undefined) return known;
    this.places.set(text, this.places.size);
    return this.places.size - 1;
  }

  xml(): string {
    const listed = [...this.places.keys()].map((text) => `<si><t xml:space="preserve">${escapeXml(text)}</t></si>`);
    return tag("sst", { xmlns: main, count: this.uses, uniqueCount: listed.length }, listed.join(""));
  }
}

/** What cm="1" in a cell points to, [MS-XLSX] 2.4.39 and 3.3.6: a formula that fills as many cells as it needs. */
const dynamicArrayMark = tag(
  "metadata",
  { xmlns: main, "xmlns:xda": "http://schemas.microsoft.com/office/spreadsheetml/2017/dynamicarray" },
  `<metadataTypes count="1"><metadataType name="XLDAPR" minSupportedVersion="120000" copy="1" pasteAll="1" pasteValues="1" merge="1" splitFirst="1" rowColShift="1" clearFormats="1" clearComments="1" assign="1" coerce="1" cellMeta="1"/></metadataTypes><futureMetadata name="XLDAPR" count="1"><bk><extLst><ext uri="{bdbb8cdc-fa1e-496e-a857-3c3f30c029c3}"><xda:dynamicArrayProperties fDynamic="1" fCollapsed="0"/></ext></extLst></bk></futureMetadata><cellMetadata count="1"><bk><rc t="1" v="0"/></bk></cellMetadata>`,
);
