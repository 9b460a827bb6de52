/** A saved workbook behind the pane's interface: it is read, and never changed. */
import { DOMParser, type Element } from "@xmldom/xmldom";
import { CFB, read as readWorkbook, type CellObject, type WorkBook, type WorkSheet } from "@e965/xlsx";
import { a1, cellOf, type Cell } from "./address";
import { noWorkbook } from "./none";
import type { CellContent, SheetContent, Workbook, WorkbookContent } from "./workbook";
import { zipDirectory } from "./zip-directory";

/** A file that cannot be looked through; the message says why and what would help. */
export class Unreadable extends Error {}

const mebibyte = 2 ** 20;
export const limits = {
  /** The file itself. */
  file: 100 * mebibyte,
  /** All its parts, unpacked: sheets of some 500,000 formulas. */
  unpacked: 500 * mebibyte,
};

/** The workbook in a file's bytes. Throws Unreadable for everything else. */
export function fileWorkbook(bytes: Uint8Array, most = limits): Workbook {
  refuseOthers(bytes, most);
  const book = open(bytes);
  return {
    ...noWorkbook,
    capabilities: new Set(["read"]),
    read: async (progress) => {
      const content = contentOf(book);
      progress?.(1);
      return content;
    },
    getSetting: async (key) => settings(book).get(`wallfall.${key}`),
  };
}

function refuseOthers(bytes: Uint8Array, most: typeof limits): void {
  if (bytes.length > most.file)
    throw new Unreadable(`it has ${inMebibytes(bytes.length)}, more than the ${inMebibytes(most.file)} that are read`);
  if (startsWith(bytes, [0xd0, 0xcf, 0x11, 0xe0])) throw new Unreadable(inOldContainer(bytes));
  const entries = startsWith(bytes, [0x50, 0x4b]) ? zipDirectory(bytes) : undefined;
  if (!entries) throw new Unreadable("it is not a whole .xlsx file; save the workbook anew");
  const has = (part: RegExp) => entries.some(({ name }) => part.test(name));
  if (has(/^xl\/(vbaProject\.bin|macrosheets\/)/i))
    throw new Unreadable("it carries macros, and what they change can't be told; save a copy without macros as .xlsx");
  if (has(/^xl\/workbook\.bin$/i)) throw new Unreadable("it is a binary workbook; save a copy as .xlsx");
  if (!has(/^xl\/workbook\.xml$/i)) throw new Unreadable("it is not a workbook; save one as .xlsx");
  const unpacked = entries.reduce((sum, { size }) => sum + size, 0);
  if (unpacked > most.unpacked)
    throw new Unreadable(
      `it has ${inMebibytes(unpacked)} unpacked, more than the ${inMebibytes(most.unpacked)} that are read; split it`,
    );
}

function startsWith(bytes: Uint8Array, start: readonly number[]): boolean {
  return start.every((byte, i) => bytes[i] === byte);
}

function inMebibytes(size: number): string {
  return `${Math.ceil(size / mebibyte)} MiB`;
}

/** The container of older workbooks, which is also that of password-protected ones. */
function inOldContainer(bytes: Uint8Array): string {
  try {
    const container = CFB.read(bytes as unknown as string, { type: "array" as never });
    if (CFB.find(container, "EncryptedPackage")) return "it is protected by a password; save a copy without one";
  } catch {
    return "it is not a whole workbook; save it anew as .xlsx";
  }
  return "it is in an older format; save a copy as .xlsx";
}

interface Opened extends WorkBook {
  files: Record<string, { content: Uint8Array }>;
}

function open(bytes: Uint8Array): Opened {
  try {
    const options = {
      type: "array",
      cellFormula: true,
      cellHTML: false,
      cellText: false,
      bookFiles: true,
      dense: true,
      xlfn: true,
    } as const;
    return readWorkbook(bytes, options) as Opened;
  } catch (error) {
    throw new Unreadable(
      `it is damaged (${error instanceof Error ? error.message : String(error)}); save the workbook anew`,
    );
  }
}

function contentOf(book: Opened): WorkbookContent {
  const tables = tablesBySheet(book);
  const sheets = book.SheetNames.filter((name) => book.Sheets[name]["!type"] !== "chart");
  return {
    sheets: sheets.map((name) => ({ ...sheetContent(name, book.Sheets[name]), tables: tables.get(name) ?? [] })),
    names: definedNames(book),
  };
}

function definedNames({ Workbook: { Names = [] } = {}, SheetNames }: WorkBook): Record<string, string> {
  const named = Names.filter(({ Name }) => !/^_xlnm\./i.test(Name));
  return Object.fromEntries(
    named.map(({ Name, Ref, Sheet }) => [
      Sheet === undefined || Sheet === null ? Name : `${SheetNames[Sheet]}!${Name}`,
      plainFormula(Ref),
    ]),
  );
}

type Rows = (CellObject | undefined)[][];
const none: never[] = [];

/** Rows are as long as their own last cell: a cell far out must not make a million rows wide. */
function sheetContent(name: string, sheet: WorkSheet): Omit<SheetContent, "tables"> {
  const rows: Rows = (sheet as { "!data"?: Rows })["!data"] ?? [];
  const spills = new Map<string, string>();
  const values: CellContent[][] = [];
  const formulas: (string | undefined)[][] = [];
  for (let row = 0; row < rows.length; row++) {
    const cells = rows[row];
    values.push(cells ? Array.from(cells, valueOf) : none);
    formulas.push(
      cells ? Array.from(cells, (cell) => (cell?.f === undefined ? undefined : `=${plainFormula(cell.f)}`)) : none,
    );
    cells?.forEach((cell, column) => noteSpill(spills, cell, { row, column }));
  }
  return { name, origin: "A1", values, formulas, spills: Array.from(spills, ([anchor, range]) => ({ anchor, range })) };
}

function noteSpill(spills: Map<string, string>, cell: CellObject | undefined, place: Cell): void {
  if (cell?.F?.includes(":") && cell.f !== undefined) spills.set(a1(place), cell.F);
}

/** How cells of a saved file number their errors: ECMA-376, 18.17.3, as the reader's library hands them on. */
const errorCodes: Record<number, string> = {
  0x00: "#NULL!",
  0x07: "#DIV/0!",
  0x0f: "#VALUE!",
  0x17: "#REF!",
  0x1d: "#NAME?",
  0x24: "#NUM!",
  0x2a: "#N/A",
};

function valueOf(cell: CellObject | undefined): CellContent {
  if (cell?.v === undefined) return null;
  if (cell.t === "e") return { error: errorCodes[cell.v as number] ?? "#VALUE!" };
  return cell.v instanceof Date ? cell.v.toISOString() : cell.v;
}

/** Saved files call our functions _xldudf_SHEATH_NAME, some programs in small letters; text in quotes is left alone. */
function plainFormula(formula: string): string {
  return formula.replace(/"(?:[^"]|"")*"|_xldudf_SHEATH_([A-Z0-9_.]+)(?=\s*\()/gi, (all: string, name?: string) =>
    name === undefined ? all : `SHEATH.${name.toUpperCase()}`,
  );
}

function part(book: Opened, path: string): Element | undefined {
  const content = book.files[path]?.content;
  if (!content) return undefined;
  const text = new TextDecoder().decode(content);
  return new DOMParser().parseFromString(text, "text/xml").documentElement ?? undefined;
}

function elements(root: Element | undefined, name: string): Element[] {
  return root ? Array.from(root.getElementsByTagNameNS("*", name)) : [];
}

/** What a part refers to, by id: path and kind. */
function relations(book: Opened, path: string): Map<string, { path: string; kind: string }> {
  const [, folder, file] = /^(.*\/)?([^/]+)$/.exec(path)!;
  const found = elements(part(book, `${folder ?? ""}_rels/${file}.rels`), "Relationship");
  return new Map(
    found.map((each) => [
      each.getAttribute("Id") ?? "",
      { path: resolve(folder ?? "", each.getAttribute("Target") ?? ""), kind: each.getAttribute("Type") ?? "" },
    ]),
  );
}

function resolve(folder: string, target: string): string {
  return new URL(target, `file:///${folder}`).pathname.slice(1);
}

function tablesBySheet(book: Opened): Map<string, SheetContent["tables"]> {
  const workbook = "xl/workbook.xml";
  const parts = relations(book, workbook);
  return new Map(
    elements(part(book, workbook), "sheet").map((sheet) => {
      const path = parts.get(sheet.getAttribute("r:id") ?? "")?.path ?? "";
      const tables =
        path === "" ? [] : [...relations(book, path).values()].filter(({ kind }) => kind.endsWith("/table"));
      return [sheet.getAttribute("name") ?? "", tables.flatMap((table) => tableIn(part(book, table.path)))];
    }),
  );
}

/** The range without a row of totals. */
function tableIn(table: Element | undefined): SheetContent["tables"] {
  const range = table?.getAttribute("ref");
  // A table without headings can't be told from data by its first row.
  if (!table || !range || table.getAttribute("headerRowCount") === "0") return [];
  const totals = Number(table.getAttribute("totalsRowCount") ?? 0);
  const [from, to = from] = range.split(":");
  const end = cellOf(to);
  return [
    {
      name: table.getAttribute("displayName") ?? table.getAttribute("name") ?? "",
      range: `${from}:${a1({ ...end, row: end.row - totals })}`,
      columns: elements(table, "tableColumn").map((column) => column.getAttribute("name") ?? ""),
    },
  ];
}

/** Settings that the add-in kept in the workbook: properties of its web extension part, each a JSON text ([MS-OWEXML], from memory). */
function settings(book: Opened): Map<string, string> {
  const paths = Object.keys(book.files).filter((path) => /^xl\/webextensions\/webextension\d*\.xml$/i.test(path));
  const properties = paths.flatMap((path) => elements(part(book, path), "property"));
  return new Map(
    properties.map((each) => [each.getAttribute("name") ?? "", unquoted(each.getAttribute("value") ?? "")]),
  );
}

function unquoted(value: string): string {
  try {
    const text: unknown = JSON.parse(value);
    return typeof text === "string" ? text : value;
  } catch {
    return value;
  }
}
