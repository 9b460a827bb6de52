import { badInput, Fault } from "./fault";
import { format } from "./format";
import { isCellError, passOn } from "./host";
import { blockInput, type Input } from "./inputs";
import type { Quantity } from "./quantities";
import { article, conversionTo, isInstrumentWord, readQuantityText, type Conversion } from "./quantity-text";
import { parseUnit } from "./units";

/** A column as an instrument wrote it: numbers, and among them headings, words for "no reading", blanks, errors. */
export interface Series {
  /** The input's name, for messages. */
  name: string;
  /** One number per cell in the quantity's own unit; NaN where the cell has none. */
  values: Float64Array;
  /** Whether the cell is empty, or a 0 that may be an empty cell: the host sends both alike. */
  blank: Uint8Array;
  /** Whether the cell is a heading. */
  heading: Uint8Array;
  /** Cells that hold no number, such as "OL"; blanks and headings are not counted. */
  unread: number;
  /** What the first of them says. */
  word?: string;
  /** The unit that a heading names, where it isn't the quantity's own. */
  unit?: string;
  /** Cells that hold an error other than #N/A, which is how a sheet says "no reading". */
  errors: Set<number>;
}

/** A whole column (or row) that is one argument. */
export function seriesInput(name: string, quantity: Quantity): Input<Series> {
  return { ...blockInput(name, (cells) => readSeries(name, quantity, cells), quantity), seesErrors: true };
}

function readSeries(name: string, quantity: Quantity, rows: unknown[][]): Series | Fault {
  if (rows.length > 1 && rows[0].length > 1) {
    return badInput(
      name,
      `${rows.length} rows by ${rows[0].length} columns are more than one series`,
      "select one column",
    );
  }
  const cells = rows.length === 1 ? rows[0] : rows.map((row) => row[0]);
  const { length } = cells;
  const series: Series = {
    name,
    values: new Float64Array(length).fill(NaN),
    blank: new Uint8Array(length),
    heading: new Uint8Array(length),
    unread: 0,
    errors: new Set(),
  };
  const state = { series, quantity, inForce: undefined as Conversion | undefined, begun: false };
  for (let i = 0; i < length; i++) {
    const fault = readCell(state, cells[i], i);
    if (fault) return fault;
  }
  return series;
}

interface State {
  series: Series;
  quantity: Quantity;
  /** Conversion of bare numbers from the unit in the last heading. */
  inForce: Conversion | undefined;
  /** Whether a number has been met. */
  begun: boolean;
}

/** Instruments write 9.91e37 for "not a number" and 9.9e37 for "infinite": SCPI-1999, 7.2.1. */
const noReading = 9.9e37;

function readCell(state: State, cell: unknown, i: number): Fault | undefined {
  const { series } = state;
  if (typeof cell === "number" && Math.abs(cell) < noReading) {
    series.values[i] = own(cell, state.inForce);
    if (cell === 0) series.blank[i] = 1;
    else state.begun = true;
  } else if (typeof cell === "number") {
    countUnread(series, format(cell));
  } else if (cell === null || cell === undefined || (typeof cell === "string" && cell.trim() === "")) {
    series.blank[i] = 1;
  } else if (isCellError(cell)) {
    readError(series, cell, i);
  } else if (typeof cell === "string") {
    return readText(state, cell.trim(), i);
  } else {
    return badInput(series.name, `row ${i + 1} holds neither a number nor text`, "leave such cells out of the range");
  }
  return undefined;
}

function readError(series: Series, cell: unknown, i: number): void {
  const { code } = passOn(cell, series.name);
  if (code !== "#N/A") series.errors.add(i);
  countUnread(series, code);
}

function readText(state: State, text: string, i: number): Fault | undefined {
  const { series, quantity } = state;
  if (/^[+\-−]?[.,]?\d/.test(text)) {
    const value = readQuantityText(series.name, quantity, text);
    if (value instanceof Fault) return new Fault(value.code, `Row ${i + 1}, ${value.message}`);
    const bare = !/[^\d.,eE+\-−\s]/.test(text);
    if (Math.abs(value) >= noReading) countUnread(series, text);
    else series.values[i] = bare ? own(value, state.inForce) : value;
    state.begun = true;
    return undefined;
  }
  if (isInstrumentWord(text)) countUnread(series, text);
  else return readHeading(state, text, i);
  return undefined;
}

/** Text above the numbers is a heading, and so is a later one that names a unit; other text between numbers is no reading. */
function readHeading(state: State, text: string, i: number): Fault | undefined {
  const { series, quantity } = state;
  const unitText = unitInHeading(text);
  if (unitText === undefined || !parseUnit(unitText)) {
    if (state.begun) countUnread(series, text);
    else series.heading[i] = 1;
    return undefined;
  }
  series.heading[i] = 1;
  const conversion = conversionTo(quantity, unitText);
  if (!conversion) {
    const wanted = `select a column of ${quantity.name}, or mend its heading`;
    return badInput(series.name, `"${text}" heads a column that is not ${article(quantity.name)}`, wanted);
  }
  state.inForce = conversion;
  if (conversion.scale !== 1 || conversion.offset !== 0) series.unit = unitText;
  return undefined;
}

function countUnread(series: Series, text: string): void {
  series.unread++;
  series.word ??= text;
}

function own(value: number, inForce: Conversion | undefined): number {
  return inForce ? value * inForce.scale + inForce.offset : value;
}

/** "I (mA)", "I [mA]", "I / mA", "I, mA": the text where a heading names its unit. */
export function unitInHeading(text: string): string | undefined {
  return (/[([{]\s*(.+?)\s*[)\]}]\s*$/.exec(text) ?? /[/,]\s*([^/,]+)$/.exec(text))?.[1];
}
