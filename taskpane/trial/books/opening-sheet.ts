/**
 * A sheet that the trial opens with, told in parts: title, settings, columns. Where each part stands is worked out in
 * lay-out.ts, so formulas name the parts they use and a column is declared in one place.
 */
export interface OpeningSheet {
  name: string;
  title: string;
  /** What the sheet is, in two lines. */
  about: readonly [string, string];
  /** Single cells that formulas use, side by side above the table. */
  settings: readonly Setting[];
  columns: readonly Column[];
  rows: number;
}

export type CellValue = number | string | boolean;

/** Addresses by key. A setting is one cell; a column its whole range, or its cell in a row where one row asks. */
export type Addresses = Readonly<Record<string, string>>;

export interface Setting {
  key: string;
  /** With its unit: "Wafer area, cm²". */
  label: string;
  /** What is typed in, or the formula that works it out. */
  value: CellValue | ((range: Addresses) => string);
  /** Number format; "words" for text, which may reach over empty cells to its right. */
  format?: string;
}

export interface Column {
  key: string;
  heading: string;
  /** The title over this column and those to its right, up to the next title or gap. */
  group?: string;
  /** An empty column that keeps two tables apart. */
  gap?: true;
  /** As many rows as the sheet has, unless given. */
  rows?: number;
  unit?: string;
  /** Pixels; 74 unless given. */
  width?: number;
  /** Number format, of all rows or of each; "words" for text. */
  format?: string | ((i: number) => string);
  /** Values typed in, one a row; undefined leaves a cell empty. */
  typed?: readonly (CellValue | undefined)[];
  /** One formula in the first row that fills the column, and columns to its right that declare no content. */
  fills?: (range: Addresses) => string;
  /** Such a formula again after so many rows, over those rows only. */
  every?: number;
  /** Whether the first row that is filled is a row of titles. */
  titled?: true;
  /** Ordinary cell arithmetic or text in every row, or in some; with the cells of another row, and with whole columns. */
  each?: (cell: Addresses, i: number, row: (i: number) => Addresses, range: Addresses) => string | undefined;
}
