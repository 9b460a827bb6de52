import { a1, cellOf } from "../workbook/address";
import { firstFilled } from "../workbook/filled";
import type { CellPlace, Workbook, Written } from "../workbook/workbook";
import { sweepTable, type Sweep, type SweepTable } from "../sweep/table";
import { spell } from "./write-view";
import type { Spacing } from "../sweep/values";

/** Writes a sweep from the selected cell on where all is empty, and draws it where the workbook has charts. */
export async function writeSweep(workbook: Workbook, sweep: Sweep, spacing: Spacing): Promise<string> {
  const from = await workbook.selection();
  if (!from) return "No cell is selected: select one in the sheet first.";
  const corner = cellOf(from.address);
  const table = sweepTable(sweep, corner);
  const { rows, columns } = table.size;
  const filled = await firstFilled(workbook, from, rows, columns);
  if (filled)
    return `${spell(filled)} is filled, and nothing was written. Select a cell with ${rows} rows and ${columns} columns free.`;
  await workbook.write(from, table.cells);
  const last = a1({ row: corner.row + rows - 1, column: corner.column + columns - 1 });
  const written = `Written to ${from.address}:${last} on “${from.sheet}”.`;
  return workbook.capabilities.has("chart")
    ? `${written} ${await chart(workbook, from, table, sweep, spacing)}`
    : written;
}

/** The table stands whatever becomes of its chart. */
async function chart(
  workbook: Workbook,
  { sheet }: CellPlace,
  { plotted, headings, size }: SweepTable,
  { entry, values }: Sweep,
  spacing: Spacing,
): Promise<string> {
  const right = plotted.from.column + size.columns + 1;
  try {
    await workbook.addChart({
      sheet,
      cells: `${a1(plotted.from)}:${a1(plotted.to)}`,
      title: entry.name,
      titleX: headings[0],
      titleY: headings.length === 2 ? headings[1] : "",
      logarithmicX: spacing === "logarithmic" && values[0] > 0,
      at: {
        from: a1({ row: plotted.from.row, column: right }),
        to: a1({ row: plotted.from.row + 17, column: right + 7 }),
      },
    });
    return "The chart stands beside it.";
  } catch (error) {
    return `The chart could not be added: ${error instanceof Error ? error.message : String(error)}`;
  }
}

/** The table as text that a sheet takes when it is pasted into its cell A1. */
export async function copySweep(sweep: Sweep): Promise<string> {
  const { cells } = sweepTable(sweep, { row: 0, column: 0 });
  try {
    await navigator.clipboard.writeText(cells.map((row) => row.map(pasted).join("\t")).join("\n"));
  } catch {
    return "This page may not use the clipboard.";
  }
  return "Copied: paste it into cell A1 of an empty sheet that has these functions.";
}

function pasted(cell: Written): string {
  return String(typeof cell === "object" ? (cell?.text ?? "") : cell);
}
