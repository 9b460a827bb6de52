import type { FWorksheet, ISuperTableService } from "@univerjs/preset-sheets-core";
import { a1, cornersOf } from "../../workbook/address";
import type { SheetContent } from "../../workbook/workbook";
import type { FileTable } from "../../workbook/xlsx-book";

/** A table of the sheet with this id. */
export interface SheetTable extends FileTable {
  sheetId: string;
}

/** The tables of the workbook shown. The grid has no tables to see, but formulas may name their columns. */
export class Tables {
  private tables: readonly SheetTable[] = [];

  constructor(private readonly engine: ISuperTableService) {}

  /** The tables of a book that is about to be calculated. */
  set(bookId: string, tables: readonly SheetTable[]): void {
    this.tables = tables;
    for (const table of tables) {
      const { from, to } = cornersOf(table.range);
      this.engine.registerTable(bookId, table.name, {
        sheetId: table.sheetId,
        titleMap: new Map(table.columns.map(({ name }, i) => [name, i])),
        range: { startRow: from.row, endRow: to.row, startColumn: from.column, endColumn: to.column },
      });
    }
  }

  all(): readonly SheetTable[] {
    return this.tables;
  }

  on(sheetId: string): FileTable[] {
    return this.tables.filter((table) => table.sheetId === sheetId).map(({ sheetId: _, ...table }) => table);
  }

  /** As the pane sees them: headings and data, without a row of totals. */
  contents(sheet: FWorksheet): SheetContent["tables"] {
    return this.on(sheet.getSheetId()).map(({ name, range, columns, totalsRow }) => {
      const { from, to } = cornersOf(range);
      const last = { row: to.row - (totalsRow ? 1 : 0), column: to.column };
      return { name, range: `${a1(from)}:${a1(last)}`, columns: columns.map((column) => column.name) };
    });
  }
}
