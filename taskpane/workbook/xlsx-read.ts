import { translateFormulaToA1, translateFormulaToR1C1 } from "@borgar/fx";
import { strFromU8 } from "fflate";
import { a1, cellOf, cornersOf } from "./address";
import { fromStored } from "./stored-formula";
import { FileProblem, type FileBook, type FileCell, type FileName, type FileSheet, type FileTable } from "./xlsx-book";
import { readStyles } from "./xlsx-styles";
import { unpack } from "./xlsx-unpack";
import { attributesOf, child, childrenOf, parseXml, unescapeXml, type Element } from "./xml";

/** Reads an .xlsx file; throws a FileProblem that says what to do where it can't. */
export function readBook(bytes: Uint8Array): FileBook {
  const files = unpack(bytes);
  try {
    return new Reader(files).book();
  } catch (error) {
    if (error instanceof FileProblem) throw error;
    throw new FileProblem(
      "The file is damaged, or isn't a workbook. Open it in the spreadsheet it came from and save it anew.",
      {
        cause: error,
      },
    );
  }
}

/** The most cells that the trial sheet holds without becoming slow to type in. */
const mostCells = 2_000_000;

class Reader {
  private readonly leftOut = new Set<string>();
  private cells = 0;

  constructor(private readonly files: Readonly<Record<string, Uint8Array>>) {}

  book(): FileBook {
    const start = this.targets("").find(({ type }) => type === "officeDocument")?.part ?? "xl/workbook.xml";
    const workbook = parseXml(this.text(start));
    if (workbook.name !== "workbook") throw new Error(`${start} holds no workbook`);
    const targets = this.targets(start);
    const part = (kind: string) => targets.find(({ type }) => type === kind)?.part;
    const strings = readStrings(this.maybe(part("sharedStrings")));
    const listed = childrenOf(child(workbook, "sheets"), "sheet");
    const sheets = listed.flatMap(({ attributes }) => {
      const target = targets.find(({ id }) => id === attributes["r:id"]);
      // Sheets that are a chart or a dialog hold no cells.
      return target?.type === "worksheet" ? [this.sheet(attributes, target.part, strings)] : [];
    });
    if (sheets.length === 0) throw new Error("no sheet of cells");
    this.noteParts(child(workbook, "workbookPr"));
    return {
      sheets,
      names: readNames(workbook, listed),
      styles: readStyles(this.maybe(part("styles")), this.maybe(part("theme"))),
      leftOut: [...this.leftOut],
    };
  }

  private sheet(about: Readonly<Record<string, string>>, part: string, strings: readonly string[]): FileSheet {
    const xml = withoutPrefix(this.text(part));
    const from = xml.search(/<sheetData\b/);
    const to = Math.max(from, xml.indexOf("</sheetData>"));
    const rest = parseXml(xml.slice(0, from) + xml.slice(to).replace(/^<\/sheetData>|^<sheetData\s*\/>/, ""));
    const heights: FileSheet["heights"] = {};
    const cells = this.readCells(xml.slice(from, to), strings, heights);
    for (const [element, words] of Object.entries(unreadElements)) if (child(rest, element)) this.leftOut.add(words);
    const pane = child(child(child(rest, "sheetViews"), "sheetView"), "pane")?.attributes;
    const isFrozen = pane?.state === "frozen" || pane?.state === "frozenSplit";
    return {
      name: about.name,
      ...(about.state && about.state !== "visible" ? { hidden: true } : {}),
      cells,
      tables: this.targets(part).flatMap(({ type, part: table }) =>
        type === "table" ? [readTable(parseXml(this.text(table)))] : [],
      ),
      widths: readWidths(child(rest, "cols")),
      heights,
      ...(isFrozen ? { frozen: { rows: Number(pane.ySplit ?? 0), columns: Number(pane.xSplit ?? 0) } } : {}),
      merged: childrenOf(child(rest, "mergeCells"), "mergeCell").map(({ attributes }) => attributes.ref),
    };
  }

  private readCells(xml: string, strings: readonly string[], heights: FileSheet["heights"]): FileSheet["cells"] {
    const cells: FileSheet["cells"] = [];
    const shared = new Map<string, { at: string; formula: string }>();
    let row = -1;
    let column = -1;
    for (const [, isRow, rowText, cellText, inside] of xml.matchAll(rowsAndCells)) {
      if (isRow) {
        const { r, ht, customHeight } = attributesOf(rowText);
        row = r === undefined ? row + 1 : Number(r) - 1;
        column = -1;
        if (ht && customHeight && customHeight !== "0") heights[row] = Math.round(Number(ht) / 0.75);
        continue;
      }
      const about = attributesOf(cellText);
      const place = about.r === undefined ? { row, column: column + 1 } : cellOf(about.r);
      column = place.column;
      const cell = readCell(about, inside ?? "", a1(place), strings, shared);
      if (!cell) continue;
      if (++this.cells > mostCells)
        throw new FileProblem(
          `The file has more than ${mostCells.toLocaleString("en")} cells, too many to be read here.`,
        );
      (cells[place.row] ??= [])[place.column] = cell;
    }
    return cells;
  }

  private noteParts(settings: Element | undefined): void {
    const parts = Object.keys(this.files);
    for (const [name, words] of Object.entries(unreadParts))
      if (parts.some((part) => part.toLowerCase().includes(name))) this.leftOut.add(words);
    if (/^(1|true)$/.test(settings?.attributes.date1904 ?? "")) this.leftOut.add("the count of dates from 1904");
  }

  private maybe(part: string | undefined): string | undefined {
    return part && this.files[part] && strFromU8(this.files[part]);
  }

  private text(part: string): string {
    if (!this.files[part]) throw new Error(`no part ${part}`);
    return strFromU8(this.files[part]).replace(/^\uFEFF/, "");
  }

  /** What a part refers to; the package as a whole is "". */
  private targets(part: string): { id: string; type: string; part: string }[] {
    const [, folder, file] = /^(.*?)([^/]*)$/.exec(part)!;
    const xml = this.maybe(`${folder}_rels/${file}.rels`);
    if (!xml) return [];
    return childrenOf(parseXml(xml), "Relationship").map(({ attributes: { Id, Type, Target } }) => ({
      id: Id,
      type: Type.slice(Type.lastIndexOf("/") + 1),
      part: resolve(folder, Target),
    }));
  }
}

const rowsAndCells = /<(?:(row)\b([^>]*)|c\b((?:[^>"']|"[^"]*"|'[^']*')*?)(?:\/>|>([\s\S]*?)<\/c>))/g;

const unreadElements: Record<string, string> = {
  conditionalFormatting: "conditional formats",
  dataValidations: "rules for what may be typed",
  hyperlinks: "links",
  sheetProtection: "the protection of sheets",
  autoFilter: "filters",
  legacyDrawing: "notes",
};

const unreadParts: Record<string, string> = {
  "/charts/": "charts",
  "/media/": "pictures",
  "/pivottables/": "pivot tables",
  "/comments": "notes",
  "/threadedcomments": "notes",
  "vbaproject.bin": "macros",
  "/macrosheets/": "macros",
  "/externallinks/": "links to other workbooks",
  "/slicers/": "slicers",
};

function resolve(folder: string, target: string): string {
  if (target.startsWith("/")) return target.slice(1);
  const steps: string[] = [];
  for (const step of (folder + target).split("/")) {
    if (step === "..") steps.pop();
    else if (step !== ".") steps.push(step);
  }
  return steps.join("/");
}

/** Some writers put every element of a sheet under a prefix. */
function withoutPrefix(xml: string): string {
  const [, prefix] = /<([\w.-]+):worksheet\b/.exec(xml.slice(0, 2000)) ?? [];
  return prefix ? xml.replace(new RegExp(`<(/?)${prefix}:`, "g"), "<$1") : xml;
}

function readStrings(xml: string | undefined): string[] {
  return xml ? childrenOf(parseXml(xml), "si").map(textOf) : [];
}

/** Plain text, or that of all runs of a rich one; readings aids are none. */
function textOf(element: Element): string {
  return element.children
    .filter(({ name }) => name === "t" || name === "r")
    .map((part) => unescapeCharacters(part.name === "t" ? part.text : textOf(part)))
    .join("");
}

/** ECMA-376 part 1, 22.9.2.19. */
function unescapeCharacters(text: string): string {
  return text.replace(/_x([\dA-Fa-f]{4})_/g, (_, code) => String.fromCharCode(parseInt(code, 16)));
}

function readCell(
  { t: type = "n", s }: Record<string, string>,
  inside: string,
  address: string,
  strings: readonly string[],
  shared: Map<string, { at: string; formula: string }>,
): FileCell | undefined {
  const value = readValue(type, inside, strings);
  const formula = readFormula(inside, address, shared);
  const style = s && s !== "0" ? { style: Number(s) } : {};
  if (value === null && !formula && !style.style) return undefined;
  return { value, ...formula, ...style };
}

function readValue(type: string, inside: string, strings: readonly string[]): FileCell["value"] {
  if (type === "inlineStr") return textOf(child(parseXml(`<c>${inside}</c>`), "is") ?? parseXml("<is/>"));
  const [, text] = /<v\b[^>]*>([\s\S]*?)<\/v>/.exec(inside) ?? [];
  if (text === undefined) return type === "str" && inside.includes("<f") ? "" : null;
  if (type === "s") return strings[Number(text)] ?? null;
  if (type === "str") return unescapeCharacters(unescapeXml(text));
  if (type === "b") return text === "1" || text === "true";
  if (type === "e") return { error: unescapeXml(text) };
  // Days since the end of 1899, as every other date.
  if (type === "d") return Date.parse(text) / 86_400_000 + 25_569;
  const number = Number(text);
  return text.trim() === "" || Number.isNaN(number) ? null : number;
}

function readFormula(
  inside: string,
  address: string,
  shared: Map<string, { at: string; formula: string }>,
): Pick<FileCell, "formula" | "fills"> | undefined {
  const found = /<f\b((?:[^>"']|"[^"]*"|'[^']*')*?)(?:\/>|>([\s\S]*?)<\/f>)/.exec(inside);
  if (!found) return undefined;
  const { t, ref, si } = attributesOf(found[1]);
  const stored = unescapeXml(found[2] ?? "");
  if (t === "shared" && si !== undefined) {
    const first = shared.get(si);
    if (stored) shared.set(si, { at: address, formula: fromStored(stored) });
    else return first && { formula: moved(first, address) };
  }
  // What a data table computes has no formula of its own.
  if (!stored || t === "dataTable") return undefined;
  return { formula: fromStored(stored), ...(t === "array" && ref && ref !== address ? { fills: ref } : {}) };
}

function moved({ at, formula }: { at: string; formula: string }, to: string): string {
  return translateFormulaToA1(translateFormulaToR1C1(formula, at), to);
}

function readTable(table: Element): FileTable {
  const { displayName, name, ref, totalsRowCount } = table.attributes;
  const look = child(table, "tableStyleInfo")?.attributes;
  return {
    name: displayName ?? name,
    range: ref,
    columns: childrenOf(child(table, "tableColumns"), "tableColumn").map((column): FileTable["columns"][number] => {
      const { name, totalsRowFunction, totalsRowLabel } = column.attributes;
      const formula = child(column, "calculatedColumnFormula")?.text;
      const totalsFormula = child(column, "totalsRowFormula")?.text;
      return {
        name: unescapeCharacters(name),
        ...(formula ? { formula: fromStored(formula) } : {}),
        ...(totalsRowFunction
          ? { totals: { totalsRowFunction } }
          : totalsRowLabel
            ? { totals: { totalsRowLabel } }
            : {}),
        ...(totalsFormula ? { totalsFormula: fromStored(totalsFormula) } : {}),
      };
    }),
    ...(Number(totalsRowCount ?? 0) > 0 ? { totalsRow: true } : {}),
    ...(look ? { look } : {}),
  };
}

function readWidths(columns: Element | undefined): FileSheet["widths"] {
  const widths: FileSheet["widths"] = {};
  for (const { attributes } of childrenOf(columns, "col")) {
    const { min, max, width, customWidth, hidden } = attributes;
    if (!width || !customWidth || customWidth === "0" || hidden === "1") continue;
    // A width for all columns to the end of the sheet is one of the sheet's defaults.
    for (let at = Number(min); at <= Math.min(Number(max), 500); at++)
      widths[at - 1] = Math.round(Number(width) * 7 + 5);
  }
  return widths;
}

function readNames(workbook: Element, sheets: readonly Element[]): FileName[] {
  return childrenOf(child(workbook, "definedNames"), "definedName").flatMap(({ attributes, text }) => {
    const { name, localSheetId, hidden } = attributes;
    // Names of the program's own: print areas and the like.
    if (name.startsWith("_xlnm.") || hidden === "1") return [];
    const sheet = localSheetId === undefined ? {} : { sheet: sheets[Number(localSheetId)]?.attributes.name };
    return [{ name, refers: fromStored(text).slice(1), ...sheet }];
  });
}

/** The cells that formulas of a sheet fill besides their own. */
export function filledBy(sheet: FileSheet): Set<string> {
  const filled = new Set<string>();
  sheet.cells.forEach((cells, row) =>
    cells?.forEach((cell, column) => {
      if (!cell?.fills) return;
      const { from, to } = cornersOf(cell.fills);
      for (let i = from.row; i <= to.row; i++)
        for (let j = from.column; j <= to.column; j++) if (i !== row || j !== column) filled.add(`${i},${j}`);
    }),
  );
  return filled;
}
