import { a1, cellOf } from "../../taskpane/workbook/address";
import { noWorkbook } from "../../taskpane/workbook/none";
import type { CellContent, SheetContent, Workbook, WorkbookContent, Written } from "../../taskpane/workbook/workbook";

/**
 * A workbook in memory that is written to as a host's is. A formula gets the value that `calculate` gives for its text
 * and place, which may be more than one cell.
 */
export function memoryWorkbook(
  content: WorkbookContent,
  calculate: (formula: string, sheet: string, address: string) => CellContent[][] = () => [[null]],
) {
  const settings = new Map<string, string>();
  const sheetNamed = (name: string) => {
    const sheet = content.sheets.find((each) => each.name === name);
    if (!sheet) throw new Error(`there is no sheet named "${name}"`);
    return sheet;
  };
  const put = (sheet: SheetContent, row: number, column: number, value: CellContent, formula?: string) => {
    while (sheet.values.length <= row) {
      sheet.values.push([]);
      sheet.formulas.push([]);
    }
    while (sheet.values[row].length <= column) {
      sheet.values[row].push(null);
      sheet.formulas[row].push(undefined);
    }
    sheet.values[row][column] = value;
    sheet.formulas[row][column] = formula;
  };
  const write = (sheet: SheetContent, from: string, cells: readonly (readonly Written[])[]) => {
    const start = cellOf(from);
    const origin = cellOf(sheet.origin);
    const formulas: [number, number, string][] = [];
    cells.forEach((line, i) =>
      line.forEach((cell, j) => {
        const [row, column] = [start.row - origin.row + i, start.column - origin.column + j];
        if (cell === null) return;
        const address = a1({ row: row + origin.row, column: column + origin.column });
        sheet.spills = sheet.spills.filter(({ anchor }) => anchor !== address);
        if (typeof cell === "object") put(sheet, row, column, cell.text);
        else if (typeof cell === "string" && cell.startsWith("=")) {
          put(sheet, row, column, null, cell);
          formulas.push([row, column, cell]);
        } else put(sheet, row, column, cell === "" ? null : cell);
      }),
    );
    for (const [row, column, formula] of formulas) {
      const address = a1({ row: row + origin.row, column: column + origin.column });
      const result = calculate(formula, sheet.name, address);
      result.forEach((values, i) =>
        values.forEach((value, j) => put(sheet, row + i, column + j, value, i + j === 0 ? formula : undefined)),
      );
      const end = a1({
        row: row + origin.row + result.length - 1,
        column: column + origin.column + result[0].length - 1,
      });
      if (end !== address) sheet.spills.push({ anchor: address, range: `${address}:${end}` });
    }
  };
  const workbook: Workbook = {
    ...noWorkbook,
    capabilities: new Set(["read", "write", "settings"]),
    read: () => Promise.resolve(structuredClone(content)),
    write: async ({ sheet, address }, cells) => write(sheetNamed(sheet), address, cells),
    replaceSheet: async (name, cells) => {
      const made: SheetContent = { name, origin: "A1", values: [], formulas: [], spills: [], tables: [] };
      const at = content.sheets.findIndex((each) => each.name === name);
      if (at < 0) content.sheets.push(made);
      else content.sheets[at] = made;
      write(made, "A1", cells);
    },
    copySheet: async (name, copy) => void content.sheets.push({ ...structuredClone(sheetNamed(name)), name: copy }),
    goTo: () => Promise.resolve(),
    getSetting: (key) => Promise.resolve(settings.get(key)),
    setSetting: async (key, value) => void settings.set(key, value),
  };
  return { workbook, content, settings };
}
