import type { WorkbookContent } from "../workbook/workbook";
import { rangesText, rectanglesOf, type Area } from "./area";
import { Book, type Sheet } from "./book";
import { noteBreaks } from "./breaks";
import type { Fill } from "./fill";
import type { Finding } from "./finding";
import { noteHeadings, noteResultHeadings } from "./headings";
import { noteOutliers } from "./outliers";
import { pacer } from "./pace";
import { Recalculation } from "./recalculation";

export interface Options {
  /** Hears how far the look is, from 0 to 1. */
  progress?: (done: number) => void;
  signal?: AbortSignal;
  /** By sheet: cells that hold values on purpose, in place of a formula that is remembered elsewhere. */
  kept?: ReadonlyMap<string, readonly Area[]>;
}

/** Where a function is called. */
export interface Use {
  function: string;
  calls: number;
  where: { sheet: string; cells: string }[];
}

/** Formulas that could not be computed again, and why. */
export interface Unseen {
  sheet: string;
  cells: string;
  count: number;
  why: string;
}

export interface Look {
  /** Formulas that call one of our functions, and how many of them differ in relative form. */
  formulas: number;
  distinct: number;
  calls: number;
  uses: Use[];
  findings: Finding[];
  notFollowed: Unseen[];
  book: Book;
  fills: readonly Fill[];
}

/** What every formula with a call of our functions contains, in a sheet and in a saved file. */
const ours = /SHEATH[._]/i;

/** Looks through a workbook: computes every call of our functions again from the cells it reads, and says what is the matter. */
export async function look(content: WorkbookContent, { progress, signal, kept }: Options = {}): Promise<Look> {
  const book = new Book(content);
  const looking = new Recalculation(book);
  const pace = pacer(progress, signal);
  const rows = book.sheets.reduce((sum, sheet) => sum + sheet.rows, 1);
  let before = 0;
  for (const sheet of book.sheets) {
    for (const { row, column, formula } of sheet.formulas()) {
      if (!ours.test(formula)) continue;
      looking.look(sheet, row, column, formula);
      await pace((0.9 * (before + row)) / rows);
    }
    before += sheet.rows;
  }
  for (const fill of looking.fills.values()) {
    noteHeadings(book, fill, looking.tally);
    noteResultHeadings(book, fill, looking.parser.known(fill.form).expression, looking.tally);
    noteOutliers(book, fill, looking.tally);
    await pace(0.9);
  }
  for (const sheet of sheetsOfInterest(book, looking)) {
    await noteBreaks(looking, sheet, kept?.get(sheet.name) ?? [], () => pace(0.95));
  }
  progress?.(1);
  return outcome(book, looking);
}

/** Those with calls of our functions, and those that feed them. */
function sheetsOfInterest(book: Book, { fills }: Recalculation): Sheet[] {
  const names = new Set<string>();
  for (const { sheet, inputs } of fills.values()) {
    names.add(sheet);
    for (const { areas } of inputs.values()) for (const area of areas.list) names.add(area.sheet);
  }
  return book.sheets.filter(({ name }) => names.has(name));
}

function outcome(book: Book, { fills: byForm, tally, notFollowed }: Recalculation): Look {
  const fills = [...byForm.values()];
  return {
    formulas: fills.reduce((sum, { formulas }) => sum + formulas, 0),
    distinct: new Set(fills.map(({ form }) => form)).size,
    calls: fills.reduce((sum, { formulas, calls }) => sum + formulas * calls.length, 0),
    uses: usesIn(fills),
    findings: tally.findings(book.sheets.map(({ name }) => name)),
    notFollowed: [...notFollowed.values()].map(({ fill: { sheet }, cells, why }) => ({
      sheet,
      cells: rangesText(rectanglesOf(sheet, cells), Infinity),
      count: cells.length,
      why,
    })),
    book,
    fills,
  };
}

function usesIn(fills: readonly Fill[]): Use[] {
  const uses = new Map<string, Use>();
  for (const fill of fills) {
    for (const name of new Set(fill.calls)) {
      const use = uses.get(name) ?? { function: name, calls: 0, where: [] };
      uses.set(name, use);
      use.calls += fill.formulas * fill.calls.filter((each) => each === name).length;
      use.where.push({ sheet: fill.sheet, cells: rangesText(fill.areas, Infinity) });
    }
  }
  return [...uses.values()].sort((a, b) => b.calls - a.calls);
}
