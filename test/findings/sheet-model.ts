import { isCellError } from "../../functions/cells/host";
import { frontDoors } from "../../functions/front-doors";
import { a1, cellOf } from "../../taskpane/workbook/address";
import type { CellContent, WorkbookContent } from "../../taskpane/workbook/workbook";

/** How a formula's saved value is worked out here: from other cells, and by none of the code under test. */
type Worked = (get: (address: string) => unknown) => unknown;

interface Formula {
  sheet: string;
  address: string;
  text: string;
  worked: Worked;
}

/**
 * A workbook told cell by cell. Values of formulas are worked out in the order in which they are told, by functions
 * that stand beside them, as the host would have done before it saved the file.
 */
export class SheetModel {
  private readonly typed = new Map<string, CellContent>();
  private readonly formulas: Formula[] = [];
  private readonly saved = new Map<string, CellContent>();
  private readonly tables = new Map<string, { name: string; range: string; columns: string[] }[]>();
  readonly names: Record<string, string> = {};
  private sheet = "Sheet1";
  readonly sheets: string[] = [];

  on(sheet: string): this {
    this.sheet = sheet;
    if (!this.sheets.includes(sheet)) this.sheets.push(sheet);
    return this;
  }

  type(address: string, value: CellContent): this {
    this.typed.set(`${this.sheet}!${address}`, value);
    return this;
  }

  /** A formula, or what stands there in its place when told again. */
  formula(address: string, text: string, worked: Worked): this {
    const at = this.formulas.findIndex((each) => each.sheet === this.sheet && each.address === address);
    const formula = { sheet: this.sheet, address, text, worked };
    if (at < 0) this.formulas.push(formula);
    else this.formulas[at] = formula;
    return this;
  }

  typedAt(address: string): CellContent | undefined {
    return this.typed.get(`${this.sheet}!${address}`);
  }

  /** What a cell holds when everything is worked out. */
  valueAt(address: string): CellContent {
    const { values, origin } = this.build().sheets.find(({ name }) => name === this.sheet)!;
    const [from, at] = [cellOf(origin), cellOf(address)];
    return values[at.row - from.row][at.column - from.column];
  }

  textAt(address: string): string | undefined {
    return this.formulas.find((each) => each.sheet === this.sheet && each.address === address)?.text;
  }

  /** Another text in the place of a formula, with the value it then has. */
  retext(address: string, change: (text: string) => string, worked: Worked): this {
    return this.formula(address, change(this.textAt(address)!), worked);
  }

  /** A value typed over a formula. */
  overwrite(address: string, value: CellContent): this {
    this.formulas.splice(
      this.formulas.findIndex((each) => each.sheet === this.sheet && each.address === address),
      1,
    );
    return this.type(address, value);
  }

  /** A value that was saved and is no longer what the formula gives. */
  save(address: string, value: CellContent): this {
    this.saved.set(`${this.sheet}!${address}`, value);
    return this;
  }

  table(name: string, range: string, columns: string[]): this {
    const known = this.tables.get(this.sheet) ?? [];
    this.tables.set(this.sheet, [...known, { name, range, columns }]);
    return this;
  }

  build(): WorkbookContent {
    const values = new Map<string, CellContent>(this.typed);
    const spills: { sheet: string; anchor: string; range: string }[] = [];
    for (const { sheet, address, worked } of this.formulas) {
      const get = (of: string) => incoming(values.get(of.includes("!") ? of : `${sheet}!${of}`));
      const result = worked(get);
      const matrix = Array.isArray(result) ? (result as unknown[][]) : [[result]];
      this.place(values, spills, sheet, address, matrix);
    }
    for (const [key, value] of this.saved) values.set(key, value);
    return {
      names: this.names,
      sheets: this.sheets.map((name) => ({
        name,
        ...this.arrays(name, values),
        spills: spills.filter(({ sheet }) => sheet === name).map(({ anchor, range }) => ({ anchor, range })),
        tables: this.tables.get(name) ?? [],
      })),
    };
  }

  /** A result that finds something in its way shows an error, as any sheet does. */
  private place(
    values: Map<string, CellContent>,
    spills: { sheet: string; anchor: string; range: string }[],
    sheet: string,
    address: string,
    matrix: unknown[][],
  ): void {
    const { row, column } = cellOf(address);
    const places = matrix.flatMap((cells, i) =>
      cells.map((cell, j) => ({ key: `${sheet}!${a1({ row: row + i, column: column + j })}`, cell })),
    );
    if (places.slice(1).some(({ key }) => this.typed.has(key))) {
      values.set(`${sheet}!${address}`, { error: "#SPILL!" });
      return;
    }
    for (const { key, cell } of places) values.set(key, outgoing(cell));
    if (places.length > 1) {
      const end = a1({ row: row + matrix.length - 1, column: column + matrix[0].length - 1 });
      spills.push({ sheet, anchor: address, range: `${address}:${end}` });
    }
  }

  private arrays(sheet: string, values: ReadonlyMap<string, CellContent>) {
    const addresses = [...values.keys()]
      .filter((key) => key.startsWith(`${sheet}!`))
      .map((key) => key.slice(sheet.length + 1));
    const cells = addresses.map(cellOf);
    const from = {
      row: Math.min(...cells.map(({ row }) => row)),
      column: Math.min(...cells.map(({ column }) => column)),
    };
    const rows = Math.max(...cells.map(({ row }) => row)) - from.row + 1;
    const columns = Math.max(...cells.map(({ column }) => column)) - from.column + 1;
    const texts = new Map(
      this.formulas.filter((each) => each.sheet === sheet).map(({ address, text }) => [address, text]),
    );
    const each = <T>(of: (address: string) => T) =>
      Array.from({ length: rows }, (_, i) =>
        Array.from({ length: columns }, (_, j) => of(a1({ row: from.row + i, column: from.column + j }))),
      );
    return {
      origin: a1(from),
      values: each((address) => values.get(`${sheet}!${address}`) ?? null),
      formulas: each((address) => texts.get(address)),
    };
  }
}

/** The host hands the code of an error on, and no message. */
function incoming(value: CellContent | undefined): unknown {
  if (value === undefined) return null;
  return typeof value === "object" && value !== null ? { code: value.error } : value;
}

function outgoing(cell: unknown): CellContent {
  if (!isCellError(cell)) return cell as CellContent;
  const { code, message } = cell as { code: string; message?: string };
  return message === undefined ? { error: code } : { error: code, message };
}

/** A call of one of our functions on single cells. */
export function one(name: string, ...cells: unknown[]): unknown {
  return frontDoors[name](...cells.map((cell) => [[cell ?? null]]))[0][0];
}

/** A call on ranges, cell lists of one column each. */
export function many(name: string, ...args: unknown[]): unknown[][] {
  return frontDoors[name](...args.map((arg) => (Array.isArray(arg) ? arg.map((cell) => [cell]) : [[arg ?? null]])));
}

/** The addresses of a column from one row to another. */
export function column(letter: string, from: number, to: number): string[] {
  return Array.from({ length: to - from + 1 }, (_, i) => `${letter}${from + i}`);
}
