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
  value: CellValue;
  format?: string;
}

export interface Column {
  key: string;
  heading: string;
  unit?: string;
  /** Pixels; 74 unless given. */
  width?: number;
  /** Number format; "words" for a column of text. */
  format?: string;
  /** Values typed in, one a row; undefined leaves a cell empty. */
  typed?: readonly (CellValue | undefined)[];
  /** One formula in the first row that fills the column, and columns to its right that declare no content. */
  fills?: (range: Addresses) => string;
  /** Ordinary cell arithmetic: a formula in every row. */
  each?: (cell: Addresses) => string;
}
