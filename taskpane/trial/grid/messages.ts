import { isHostError } from "../host";

/** Results of one calculation of one cell: a formula may call several functions. */
interface Calculated {
  run: number;
  row: number;
  column: number;
  results: unknown[][][];
}

/** The messages of error cells, which the grid's cells can't hold: kept with the cell whose formula spilled them. */
export class Messages {
  private run = 0;
  private readonly sheets = new Map<string, Map<string, Calculated>>();

  /** What the next run finds replaces what earlier runs found in the same cells. */
  startRun(): void {
    this.run++;
  }

  /** For another book, whose sheets may go by the same ids. */
  forgetAll(): void {
    this.sheets.clear();
  }

  keep(sheet: string, row: number, column: number, result: unknown[][]): void {
    const cells = this.sheets.get(sheet) ?? new Map<string, Calculated>();
    this.sheets.set(sheet, cells);
    const key = `${row},${column}`;
    const known = cells.get(key);
    if (known?.run === this.run) known.results.push(result);
    else cells.set(key, { run: this.run, row, column, results: [result] });
  }

  /** The message behind an error code shown at a place; `calls` tells whether a cell still holds a formula of ours. */
  at(
    sheet: string,
    row: number,
    column: number,
    code: string,
    calls: (row: number, column: number) => boolean,
  ): string | undefined {
    for (const calculated of this.sheets.get(sheet)?.values() ?? []) {
      const message = messageIn(calculated, row, column, code);
      if (message && calls(calculated.row, calculated.column)) return message;
    }
    return undefined;
  }
}

function messageIn(calculated: Calculated, row: number, column: number, code: string): string | undefined {
  for (const result of calculated.results) {
    const cell = result[row - calculated.row]?.[column - calculated.column];
    if (isHostError(cell) && cell.code === code && cell.message) return cell.message;
  }
  return undefined;
}
