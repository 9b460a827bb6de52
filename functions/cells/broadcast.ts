import { Fault } from "./fault";

export interface Shape {
  rows: number;
  columns: number;
}

export type Cells = unknown[][];

/** An argument as the host hands it over, as a matrix: left out is one blank cell, a lone value one cell. */
export function toCells(argument: unknown): Cells {
  if (!Array.isArray(argument)) return [[argument ?? null]];
  if (argument.length === 0) return [[null]];
  return Array.isArray(argument[0]) ? (argument as Cells) : (argument as unknown[]).map((cell) => [cell]);
}

export function shapeOf(cells: Cells): Shape {
  return { rows: cells.length, columns: cells[0].length };
}

/** The shape that all shapes stretch to: a lone row or column repeats, equal sizes go element by element. */
export function commonShape(shapes: readonly Shape[], names: readonly string[]): Shape | Fault {
  let common: Shape = { rows: 1, columns: 1 };
  let largest = 0;
  for (let i = 0; i < shapes.length; i++) {
    const rows = stretch(common.rows, shapes[i].rows);
    const columns = stretch(common.columns, shapes[i].columns);
    if (rows === undefined || columns === undefined) {
      return new Fault(
        "#VALUE!",
        `${names[i]}: a range of ${spell(shapes[i])} does not match ${names[largest]} of ${spell(shapes[largest])}; ` +
          "select ranges of the same size, or one cell.",
      );
    }
    if (rows * columns > common.rows * common.columns) largest = i;
    common = { rows, columns };
  }
  return common;
}

function stretch(a: number, b: number): number | undefined {
  return a === b || b === 1 ? a : a === 1 ? b : undefined;
}

export function spell({ rows, columns }: Shape): string {
  return `${rows} row${rows === 1 ? "" : "s"} by ${columns} column${columns === 1 ? "" : "s"}`;
}

/** Where the cell of a stretched argument stands for cell (row, column) of the common shape. */
export function indexIn(shape: Shape, row: number, column: number): number {
  return (shape.rows === 1 ? 0 : row) * shape.columns + (shape.columns === 1 ? 0 : column);
}
