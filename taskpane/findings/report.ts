import { entryNamed } from "../../functions/catalogue";
import { CODATA } from "../../functions/sources";
import type { CellContent, SheetContent, SheetLook, WorkbookContent, Written } from "../workbook/workbook";
import { standingOf, type Accepted } from "./accepted";
import { causes } from "./causes";
import type { Change } from "./changes";
import type { Finding } from "./finding";
import type { Look, Use } from "./look";
import { snapshotOf, type Snapshot } from "./snapshot";
import { counted, fromText, lookText, placeText } from "./words";

/** The sheet that the report is written to. */
export const reportSheet = "Sheath findings";

/** Columns of sentences come fourth and fifth in every part, so that one width of each column suits all. */
const headings = {
  findings: [
    "Cause",
    "Sheet",
    "Cells",
    "Finding",
    "How far, worst first",
    "Functions",
    "Found",
    "Of",
    "Standing",
    "Reason",
    "Your notes",
    "Key",
  ],
  gone: ["Notes on findings that are gone", "Key", "Your notes", "Finding"],
  functions: ["Functions used", "Calls", "Where", "Sources"],
  notFollowed: ["Not followed", "Formulas", "Cells", "Why"],
  changes: ["Changes since the last report", "Cells", "What", "Why"],
  snapshot: ["Snapshot", "Cells", "Formula", "Inputs", "Values", "Functions", "Version"],
} as const;

const widths = [180, 110, 170, 330, 300, 190, 60, 50, 130, 180, 220, 120];

export interface ReportFacts {
  look: Look;
  accepted: Accepted;
  changes: readonly Change[];
  version: string;
  /** Of the day, "2026-05-04". */
  date: string;
  /** What stood in the report before: its notes are the reader's own. */
  before: Report | undefined;
}

/** Every title stands in the first column; the snapshot is for the next look, and its long lists stay on one line. */
export function reportLook(cells: readonly (readonly Written[])[]): SheetLook {
  const titles = new Set<string>([reportSheet, ...Object.values(headings).map(([first]) => first)]);
  const first = cells.map(([cell]) => (typeof cell === "object" && cell ? cell.text : ""));
  return {
    widths,
    headings: first.flatMap((text, row) => (titles.has(text) ? [row] : [])),
    wrapped: first.indexOf(headings.snapshot[0]),
  };
}

/** What a report holds that outlives it. */
export interface Report {
  notes: readonly Note[];
  snapshot: readonly Snapshot[];
}

/** A reader's own words beside a finding. */
export interface Note {
  key: string;
  finding: string;
  text: string;
}

/** The cells of the report. All text is written as text, wherever it came from. */
export function reportCells({ look, accepted, changes, version, date, before }: ReportFacts): Written[][] {
  const { findings } = look;
  const notes = before?.notes ?? [];
  const gone = notes.filter(({ key }) => !findings.some((finding) => finding.key === key));
  const open = findings.filter((finding) => standingOf(finding, accepted) !== "accepted").length;
  const facts: [string, string][] = [
    ["Written by Wallfall", version],
    ["Date", date],
    ["Constants", CODATA.text],
    ["Looked at", lookText(look)],
    ["Found", `${counted(open, "open finding")}, ${findings.length - open} accepted`],
    ["Cautions", "Estimates within stated models, never a clearance to touch, open or energise anything."],
    ["Your notes", "The column of notes is yours: it stays when the report is written again."],
  ];
  const rows: (string | number | null)[][] = [
    [reportSheet],
    ...facts.map(([name, fact]) => [name, null, null, fact]),
    [],
    [...headings.findings],
    ...findings.map((finding) => findingRow(finding, accepted, notes)),
    ...(gone.length === 0
      ? []
      : [[], [...headings.gone], ...gone.map(({ finding, text, key }) => ["", key, text, finding])]),
    [],
    [...headings.functions],
    ...look.uses.map(functionRow),
    ...table(
      headings.notFollowed,
      look.notFollowed.map(({ sheet, cells, count, why }) => [sheet, count, cells, why]),
    ),
    ...table(
      headings.changes,
      changes.map(({ sheet, cells, what, why }) => [sheet, cells, what, why.join("; ")]),
    ),
    [],
    [...headings.snapshot],
    ...snapshotOf(look.book, look.fills, version).map((row) => [
      row.sheet,
      row.cells,
      row.formula,
      row.inputs,
      row.values,
      row.functions,
      row.version,
    ]),
  ];
  return rows.map((row) => row.map((cell) => (typeof cell === "string" ? { text: cell } : cell)));
}

function table(heading: readonly string[], rows: (string | number)[][]): (string | number)[][] {
  return rows.length === 0 ? [] : [[], [...heading], ...rows];
}

function findingRow(finding: Finding, accepted: Accepted, notes: readonly Note[]): (string | number)[] {
  const standing = standingOf(finding, accepted);
  const { reason = "", date = "" } = standing === "open" ? {} : accepted[finding.key];
  const said = {
    open: "open",
    accepted: `accepted on ${date}`,
    changed: `open; accepted on ${date}, and changed since`,
  };
  return [
    causes[finding.cause],
    finding.sheet,
    finding.cells,
    finding.what,
    [finding.detail, fromText(finding)].filter(Boolean).join("; "),
    finding.functions.join(", "),
    finding.count,
    finding.of,
    said[standing],
    reason,
    notes.find(({ key }) => key === finding.key)?.text ?? "",
    finding.key,
  ];
}

function functionRow({ function: name, calls, where }: Use): (string | number)[] {
  const sources = entryNamed(name)?.sources.map(({ text }) => text) ?? [];
  return [
    name,
    calls,
    where.map(({ sheet, cells }) => `${sheet}!${placeText({ cells })}`).join(", "),
    sources.join("; "),
  ];
}

/** The notes and the snapshot of the report in a workbook; undefined where there is none. */
export function readReport({ sheets }: WorkbookContent): Report | undefined {
  const sheet = sheets.find(({ name }) => name === reportSheet);
  return sheet && { notes: notesIn(sheet), snapshot: snapshotIn(sheet) };
}

function notesIn(sheet: SheetContent): Note[] {
  const open = section(sheet, headings.findings).map((row) => ({ key: row[11], finding: row[3], text: row[10] }));
  const gone = section(sheet, headings.gone).map((row) => ({ key: row[1], finding: row[3], text: row[2] }));
  return [...open, ...gone].filter(({ key, text }) => key !== "" && text !== "");
}

function snapshotIn(sheet: SheetContent): Snapshot[] {
  return section(sheet, headings.snapshot)
    .map(([sheet, cells, formula, inputs, values, functions, version]) => ({
      sheet,
      cells,
      formula,
      functions,
      inputs,
      values,
      version,
    }))
    .filter(({ cells, formula }) => /^[A-Z]+\d+/.test(cells) && formula.startsWith("="));
}

/** The rows below a line of headings, up to the next empty one, as text; readers may have moved columns or put some in. */
function section({ values }: SheetContent, heading: readonly string[]): string[][] {
  const at = values.findIndex((row) => heading.every((word) => row.includes(word)));
  if (at < 0) return [];
  const columns = heading.map((word) => values[at].indexOf(word));
  const rest = values.slice(at + 1).map((row) => columns.map((column) => asText(row[column])));
  const end = rest.findIndex((row) => row.every((cell) => cell === ""));
  return end < 0 ? rest : rest.slice(0, end);
}

function asText(cell: CellContent | undefined): string {
  if (cell === null || cell === undefined) return "";
  return typeof cell === "object" ? cell.error : String(cell);
}
