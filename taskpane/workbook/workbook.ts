/** What the pane needs of a workbook, and no more. The host, the trial sheet and a saved file each implement it. */

/** A cell by sheet name and A1 address without "$": { sheet: "Pre-clean", address: "B5" }. */
export interface CellPlace {
  sheet: string;
  address: string;
}

/** What a cell holds: number, text, truth, nothing (null), or an error by its code with its message where known. */
export type CellContent = number | string | boolean | null | { error: string; message?: string };

/**
 * What is written to a cell: a formula where a string starts with "=", else the value; null leaves the cell as it is, and
 * an empty string clears it. Text that came from anywhere else is written as { text }: it stays text whatever it holds.
 */
export type Written = string | number | boolean | null | { text: string };

/** How a sheet that is made should look, as far as that helps to read it. */
export interface SheetLook {
  /** Pixels by column, from the first on. */
  widths: readonly number[];
  /** In so many rows from the top, text longer than its column goes on in the next line. */
  wrapped: number;
  /** Rows of headings, counted from 0. */
  headings: readonly number[];
}

/** The used part of one sheet, from its top left cell on. Formulas start with "="; where there is none, undefined. */
export interface SheetContent {
  name: string;
  /** A1 address of the top left cell of the arrays. */
  origin: string;
  values: CellContent[][];
  formulas: (string | undefined)[][];
  /** Formulas that fill a range from one cell: the anchor's address and the filled range. */
  spills: { anchor: string; range: string }[];
  /** Headings and data of each, without a row of totals. */
  tables: { name: string; range: string; columns: string[] }[];
}

export interface WorkbookContent {
  sheets: SheetContent[];
  /** Defined names and what they refer to, such as { T_e: "Inputs!$B$2" }. */
  names: Record<string, string>;
}

/** A curve to be drawn from cells: the first column across, the others up, each under its heading. */
export interface Chart {
  sheet: string;
  /** A1 address of all its cells with their headings: "B9:C34". */
  cells: string;
  title: string;
  titleX: string;
  titleY: string;
  logarithmicX: boolean;
  /** The cells over which it lies. */
  at: { from: string; to: string };
}

export interface Workbook {
  /** The selected cell, or undefined where there is no sheet (the pane as a plain page). */
  selection(): Promise<CellPlace | undefined>;
  /** Calls back whenever another cell is selected; returns how to stop that. */
  onSelection(listener: (place: CellPlace) => void): () => void;
  /** Whether a cell, or any cell of a range such as "B5:D9", holds what writing would destroy: a value, a formula, a part of a spill. */
  isFilled(place: CellPlace): Promise<boolean>;
  /** Writes formulas and values from the given cell on, to the right and down. */
  write(from: CellPlace, cells: readonly (readonly Written[])[]): Promise<void>;
  /** Selects a cell and brings it into view. */
  goTo(place: CellPlace): Promise<void>;
  /** The whole used content, sheet by sheet; progress from 0 to 1; stops early when the signal says so. */
  read(progress?: (done: number) => void, signal?: AbortSignal): Promise<WorkbookContent>;
  /** Makes or replaces a sheet of this name with these cells; other sheets are untouched. */
  replaceSheet(name: string, cells: readonly (readonly Written[])[], look?: SheetLook): Promise<void>;
  /** Makes a copy of a sheet, with its looks, behind all others; the sheet itself is untouched. */
  copySheet(name: string, copy: string): Promise<void>;
  /** Small settings kept inside the workbook, such as the reasons for accepted findings. */
  getSetting(key: string): Promise<string | undefined>;
  setSetting(key: string, value: string): Promise<void>;
  /** Draws cells as a chart, where "chart" is one of the capabilities. */
  addChart(chart: Chart): Promise<void>;
  /** What this workbook can't do, so that the pane hides it: "write", "read", "chart". */
  readonly capabilities: ReadonlySet<"write" | "read" | "settings" | "chart">;
}
