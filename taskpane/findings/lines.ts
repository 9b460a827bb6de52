import { rectanglesOf, pack, type Area } from "./area";

/** A column of cells, or a row where the data lie across: what was typed under, or beside, one heading. */
export interface Line {
  sheet: string;
  row: number;
  column: number;
  length: number;
  across: boolean;
}

/** The columns that the areas make up together; an area that is wider than high is taken by rows. */
export function linesOf(areas: readonly Area[]): Line[] {
  return joined(areas).flatMap(({ sheet, row, column, rows, columns }) => {
    const across = columns > rows;
    return Array.from({ length: across ? rows : columns }, (_, i) => ({
      sheet,
      row: across ? row + i : row,
      column: across ? column : column + i,
      length: across ? columns : rows,
      across,
    }));
  });
}

/** Single cells side by side are one line too. */
function joined(areas: readonly Area[]): Area[] {
  const isSmall = ({ rows, columns }: Area) => rows * columns <= 3;
  const small = areas.filter(isSmall);
  const sheets = [...new Set(small.map(({ sheet }) => sheet))];
  const cellsOn = (sheet: string) =>
    small
      .filter((area) => area.sheet === sheet)
      .flatMap(({ row, column, rows, columns }) =>
        Array.from({ length: rows * columns }, (_, i) => pack(row + Math.floor(i / columns), column + (i % columns))),
      );
  return [...areas.filter((area) => !isSmall(area)), ...sheets.flatMap((sheet) => rectanglesOf(sheet, cellsOn(sheet)))];
}

export function cellOf({ row, column, across }: Line, i: number): { row: number; column: number } {
  return across ? { row, column: column + i } : { row: row + i, column };
}
