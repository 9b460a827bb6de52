import type { CellContent } from "./workbook";

/** A workbook as its file holds it, as far as we read and write it. */
export interface FileBook {
  sheets: FileSheet[];
  names: FileName[];
  /** Cells name their style by its place here; 0 is that of a cell without one. */
  styles: FileStyle[];
  /** What the file holds that is not in here, in words for a reader: "charts", "macros". */
  leftOut: string[];
}

export interface FileSheet {
  name: string;
  hidden?: boolean;
  /** By row and column from 0; places may be empty. */
  cells: (FileCell | undefined)[][];
  tables: FileTable[];
  /** Pixels, by column and by row. */
  widths: Record<number, number>;
  heights: Record<number, number>;
  /** Rows and columns that stay in view. */
  frozen?: { rows: number; columns: number };
  merged: string[];
}

export interface FileCell {
  /** The value that was computed last, where there is a formula. */
  value: CellContent;
  /** As typed, with "=". */
  formula?: string;
  /** What a formula fills, itself included: "F8:F47". Those cells hold values and no formula. */
  fills?: string;
  style?: number;
}

/** A table: headings in the first row of its range. */
export interface FileTable {
  name: string;
  range: string;
  columns: { name: string; formula?: string; totals?: Readonly<Record<string, string>>; totalsFormula?: string }[];
  totalsRow?: boolean;
  look?: Readonly<Record<string, string>>;
}

/** A defined name; with `sheet`, one that only this sheet knows. */
export interface FileName {
  name: string;
  refers: string;
  sheet?: string;
}

/** What a cell looks like; colours as "#74174c". */
export interface FileStyle {
  format?: string;
  bold?: boolean;
  italic?: boolean;
  underlined?: boolean;
  /** Points. */
  size?: number;
  font?: string;
  colour?: string;
  ground?: string;
  borders?: Partial<Record<Side, { line: Line; colour?: string }>>;
  across?: "left" | "center" | "right";
  down?: "top" | "center" | "bottom";
  wrapped?: boolean;
}

export type Side = "left" | "right" | "top" | "bottom";

/** ECMA-376 part 1, 18.18.3. */
export const lines = [
  "none",
  "thin",
  "hair",
  "dotted",
  "dashed",
  "dashDot",
  "dashDotDot",
  "double",
  "medium",
  "mediumDashed",
  "mediumDashDot",
  "mediumDashDotDot",
  "slantDashDot",
  "thick",
] as const;
export type Line = (typeof lines)[number];

/** Why a file can't be opened, and what to do about it. */
export class FileProblem extends Error {}
