import { a1, cellOf, cornersOf, type Cell } from "../../taskpane/workbook/address";
import { hostObject, type Batch } from "./host-object";

interface Content {
  formula: unknown;
  value: unknown;
  type: string;
}

interface Table {
  name: string;
  range: string;
  columns: string[];
}

const empty: Content = { formula: "", value: "", type: "Empty" };
const missing = () => ({ isNullObject: true });

/** As much of the host's workbook as the adapter touches. */
export class FakeHost {
  readonly sheets = new Map<string, Map<string, Content>>();
  readonly settings = new Map<string, unknown>();
  /** Looks by range, such as "Sheet!A1:B2". */
  readonly formats = new Map<string, Record<string, unknown>>();
  readonly tables: Record<string, Table[]> = {};
  readonly complaints: string[] = [];
  readonly charts: Record<string, unknown>[] = [];
  names: Record<string, string> = {};
  shown = { sheet: "", address: "A1" };
  mostCellsAtOnce = 0;
  private readonly spills = new Map<string, string>();
  private readonly listeners = new Set<() => Promise<void>>();

  constructor(sheets: Record<string, unknown[][]>) {
    for (const [name, rows] of Object.entries(sheets)) {
      this.sheets.set(name, new Map());
      rows.forEach((cells, row) => cells.forEach((value, column) => this.set(name, a1({ row, column }), value, value)));
    }
  }

  set(sheet: string, address: string, formula: unknown, value: unknown, type: string = typeof value): void {
    this.cells(sheet).set(address, { formula, value, type });
  }

  /** A formula that fills a range; whether the host repeats it in the filled cells is not known. */
  spill(sheet: string, anchor: string, formula: string, values: unknown[][], repeated = false): void {
    const from = cellOf(anchor);
    const to = { row: from.row + values.length - 1, column: from.column + values[0].length - 1 };
    addresses(from, to).forEach((row, i) =>
      row.forEach((address, j) =>
        this.set(sheet, address, address === anchor || repeated ? formula : values[i][j], values[i][j]),
      ),
    );
    this.spills.set(`${sheet}!${anchor}`, `${anchor}:${a1(to)}`);
  }

  /** What was typed into the cells of a row. */
  row(sheet: string, number: number): unknown[] {
    const row = number - 1;
    const used = [...this.cells(sheet).keys()].map(cellOf).filter((cell) => cell.row === row);
    return used.sort((a, b) => a.column - b.column).map((cell) => this.cells(sheet).get(a1(cell))!.formula);
  }

  async select(sheet: string, address: string): Promise<void> {
    this.shown = { sheet, address };
    for (const listener of this.listeners) await listener();
  }

  /** Excel.run: a batch in a context of its own, or in one that is given. */
  readonly run = async (first: any, second?: any) => (second ? second(first) : first(this.context()));

  private context() {
    const batch: Batch = { waiting: [], complaints: this.complaints };
    const context = { sync: async () => batch.waiting.splice(0).forEach((act) => act()) };
    return Object.assign(context, { workbook: this.workbook(batch, context) });
  }

  private workbook(batch: Batch, context: object) {
    const { settings } = this;
    return {
      getActiveCell: () => this.range(batch, this.shown.sheet, this.shown.address),
      onSelectionChanged: {
        add: (listener: () => Promise<void>) => {
          batch.waiting.push(() => this.listeners.add(listener));
          return { context, remove: () => batch.waiting.push(() => this.listeners.delete(listener)) };
        },
      },
      worksheets: hostObject(batch, () => ({ items: [...this.sheets.keys()].map((name) => this.sheet(batch, name)) }), {
        getItem: (name: string) => this.sheet(batch, name),
        getItemOrNullObject: (name: string) =>
          this.sheets.has(name) ? this.sheet(batch, name) : hostObject(batch, missing),
        add: (name: string) => {
          this.sheets.set(name, new Map());
          return this.sheet(batch, name);
        },
      }),
      names: hostObject(batch, () => ({
        items: Object.entries(this.names).map(([name, formula]) => ({ name, formula })),
      })),
      settings: {
        add: (key: string, value: unknown) => batch.waiting.push(() => settings.set(key, value)),
        getItemOrNullObject: (key: string) =>
          hostObject(batch, () => (settings.has(key) ? { value: settings.get(key) } : missing())),
      },
    };
  }

  private sheet(batch: Batch, name: string): object {
    const range = (from: Cell, to: Cell) => this.range(batch, name, `${a1(from)}:${a1(to)}`);
    return hostObject(batch, () => (this.cells(name), {}), {
      copy: () => {
        batch.waiting.push(() => this.sheets.set(`${name} (2)`, new Map(this.cells(name))));
        return this.sheet(batch, `${name} (2)`);
      },
      "set name": (other: string) =>
        batch.waiting.push(() => {
          this.sheets.set(other, this.cells(name));
          this.sheets.delete(name);
        }),
      activate: () => batch.waiting.push(() => (this.shown = { ...this.shown, sheet: name })),
      getRange: (address = "A1:XFD1048576") => this.range(batch, name, address),
      getRangeByIndexes: (row: number, column: number, height: number, width: number) =>
        range({ row, column }, { row: row + height - 1, column: column + width - 1 }),
      getUsedRangeOrNullObject: () => {
        const used = [...this.cells(name).keys()].map(cellOf);
        if (used.length === 0) return hostObject(batch, missing);
        return range(corner(used, Math.min), corner(used, Math.max));
      },
      charts: {
        add: (kind: string, source: { at: string }, seriesBy: string) => this.chart(batch, kind, source.at, seriesBy),
      },
      tables: hostObject(batch, () => ({
        items: (this.tables[name] ?? []).map(({ columns, ...table }) => ({
          name: table.name,
          columns: { items: columns.map((column) => ({ name: column })) },
          getRange: () => this.range(batch, name, table.range),
        })),
      })),
      name,
    });
  }

  private range(batch: Batch, sheet: string, address: string): object {
    const { from, to } = cornersOf(address);
    const size = { rowCount: to.row - from.row + 1, columnCount: to.column - from.column + 1 };
    const content = () => {
      const area = size.rowCount * size.columnCount;
      this.mostCellsAtOnce = Math.max(this.mostCellsAtOnce, area);
      const contents = addresses(from, to).map((row) => row.map((each) => this.cells(sheet).get(each) ?? empty));
      const pick = (key: keyof Content) => contents.map((row) => row.map((cell) => cell[key]));
      return { values: pick("value"), formulas: pick("formula"), valueTypes: pick("type") };
    };
    const place = { rowIndex: from.row, columnIndex: from.column, ...size, address: `'${sheet}'!${address}` };
    // Only what is asked for is made: a whole sheet has more cells than there is memory.
    const facts = (asked: ReadonlySet<string>) => (asked.has("formulas") ? { ...place, ...content() } : place);
    return hostObject(batch, facts, {
      at: `${sheet}!${address}`,
      format: this.format(`${sheet}!${address}`),
      worksheet: hostObject(batch, () => ({ name: sheet })),
      clear: () => batch.waiting.push(() => this.cells(sheet).clear()),
      select: () => batch.waiting.push(() => (this.shown = { sheet, address })),
      getSpillingToRangeOrNullObject: () => {
        const filled = this.spills.get(`${sheet}!${address}`);
        return filled ? this.range(batch, sheet, filled) : hostObject(batch, missing);
      },
      "set formulas": (formulas: unknown[][]) => batch.waiting.push(() => this.type(sheet, from, formulas)),
    });
  }

  private format(place: string): Record<string, unknown> {
    const format = this.formats.get(place) ?? { font: {} };
    this.formats.set(place, format);
    return format;
  }

  /** What is set on a chart before the next sync. */
  private chart(batch: Batch, kind: string, source: string, seriesBy: string) {
    const chart = {
      title: { text: "" },
      legend: { visible: true },
      axes: {
        categoryAxis: { title: { text: "" }, scaleType: "Linear" },
        valueAxis: { title: { text: "" }, scaleType: "Linear" },
      },
      setPosition: (from: string, to: string) => Object.assign(chart, { position: `${from}:${to}` }),
    };
    batch.waiting.push(() => this.charts.push(Object.assign(chart, { kind, source, seriesBy })));
    return chart;
  }

  private cells(sheet: string): Map<string, Content> {
    const cells = this.sheets.get(sheet);
    if (!cells) throw new Error("ItemNotFound");
    return cells;
  }

  private type(sheet: string, from: Cell, formulas: unknown[][]): void {
    formulas.forEach((row, i) =>
      row.forEach((formula, j) => {
        const address = a1({ row: from.row + i, column: from.column + j });
        if (formula !== null) this.set(sheet, address, formula, formula);
      }),
    );
  }
}

function addresses(from: Cell, to: Cell): string[][] {
  return Array.from({ length: to.row - from.row + 1 }, (_, i) =>
    Array.from({ length: to.column - from.column + 1 }, (_, j) => a1({ row: from.row + i, column: from.column + j })),
  );
}

function corner(cells: readonly Cell[], best: (a: number, b: number) => number): Cell {
  return cells.reduce((a, b) => ({ row: best(a.row, b.row), column: best(a.column, b.column) }));
}
