import { FormulaError } from "../matter/formula";
import { ionOfMass, parseIon, type Ion } from "../matter/ion";
import { badInput, Fault } from "./fault";
import { format, prettyUnit } from "./format";
import { quantities, type Band, type Quantity } from "./quantities";
import { article, conversionTo, quantityTextReader, readQuantityText } from "./quantity-text";

/** What a function takes at one place: how its cells are read and what is said of them. */
export interface Input<T = unknown> {
  name: string;
  optional: boolean;
  /** What a blank stands for; only where optional. */
  blank: T | undefined;
  /** Where false, 0 counts as blank. */
  zeroIsValue: boolean;
  /** Closed interval of bare numbers that need no further look; empty where numbers have no quick way in. */
  least: number;
  most: number;
  /** Set for inputs that are a number with a unit. */
  quantity?: Quantity;
  /** What works there, as a message suggests it; a quantity brings its own. */
  example?: string;
  band?: Band;
  /** Set for inputs with a closed list of words. */
  words?: readonly string[];
  /** "ion" for chemical formulas, "flag" for TRUE or FALSE, "block" for a whole range read at once. */
  kind: "quantity" | "ion" | "words" | "flag" | "text" | "block";
  /** Set for a block that deals with error cells itself, so that one does not spoil the rest. */
  seesErrors?: true;
  /** The value in a cell that is neither blank nor an error; for a block, in all its cells. */
  read(cell: unknown): T | Fault;
}

/** Changes to a quantity for one input: its own range, band, example, or whether zero is a value there. */
export type Range = Partial<Pick<Quantity, "least" | "most" | "zeroIsValue" | "band" | "example">>;

/** A number, bare or with a unit. */
export function quantityInput(name: string, quantity: Quantity, range: Range = {}): Input<number> {
  const own = { ...quantity, ...range };
  const readText = quantityTextReader(name, own);
  return {
    name,
    optional: false,
    blank: undefined,
    zeroIsValue: own.zeroIsValue,
    least: own.least,
    most: own.most,
    quantity: own,
    example: own.example,
    band: own.band,
    kind: "quantity",
    read: (cell) => inRange(name, own, cell, typeof cell === "string" ? readText(cell) : cell),
  };
}

/** The value if it lies in the input's range; `cell` is what was typed, for the message. */
function inRange(name: string, quantity: Quantity, cell: unknown, value: unknown): number | Fault {
  if (value instanceof Fault) return value;
  const wanted = `type ${article(quantity.name)} such as ${quantity.example}`;
  if (typeof value !== "number") return notNumeric(name, value, wanted);
  if (!Number.isFinite(value)) return badInput(name, `${format(value)} is not a finite number`, wanted);
  if (value >= quantity.least && value <= quantity.most) return value;
  const given = typeof cell === "string" ? `"${cell.trim()}"` : format(value, 4);
  if (value < quantity.least)
    return badInput(
      name,
      `${given} is below the lowest value`,
      `type ${article(quantity.name)} ${atLeast(quantity)}, such as ${quantity.example}`,
    );
  return badInput(
    name,
    `${given} is above the highest value`,
    `type ${article(quantity.name)} of at most ${bound(quantity.most, quantity)}, such as ${quantity.example}`,
  );
}

function atLeast(range: Quantity): string {
  return range.least === Number.MIN_VALUE ? "above 0" : `of at least ${bound(range.least, range)}`;
}

function bound(value: number, quantity: Quantity): string {
  return quantity.unit ? `${format(value)} ${quantity.unit}` : format(value);
}

function notNumeric(name: string, value: unknown, wanted: string): Fault {
  if (typeof value === "boolean") return badInput(name, `${value ? "TRUE" : "FALSE"} is not a number`, wanted);
  return badInput(name, "the cell holds something that is neither number nor text", wanted);
}

/** A positive ion: a chemical formula, or the mass in u of a singly charged one. */
export function ionInput(name = "ion"): Input<Ion> {
  const known = new Map<string, Ion | Fault>();
  return {
    name,
    optional: false,
    blank: undefined,
    zeroIsValue: false,
    least: 1,
    most: 0,
    kind: "ion",
    example: '"Ar+"',
    band: { low: 1, high: 400, below: "kg meant? the mass is read in u", above: "the mass is read in u" },
    read(cell) {
      if (typeof cell === "number") return readIonMass(name, cell);
      if (typeof cell !== "string") return notNumeric(name, cell, wantedIon);
      const found = known.get(cell);
      if (found) return found;
      if (known.size > 500) known.clear();
      const ion = readIonText(name, cell);
      known.set(cell, ion);
      return ion;
    },
  };
}

const wantedIon = 'type a formula such as "Ar+" or a mass in u';

function readIonMass(name: string, mass: number): Ion | Fault {
  return mass > 1e-3 && mass < 5000
    ? ionOfMass(mass)
    : badInput(name, `${format(mass)} u is no mass of an ion`, wantedIon);
}

function readIonText(name: string, text: string): Ion | Fault {
  if (/^\s*[\d.]/.test(text)) {
    const inU = conversionTo(quantities.mass, "u")!.scale;
    const mass = readQuantityText(name, quantities.mass, text);
    if (mass instanceof Fault) return badInput(name, `"${text.trim()}" is not an ion`, wantedIon);
    return /[A-Za-z]\s*$/.test(text) ? readIonMass(name, mass / inU) : readIonMass(name, mass);
  }
  const ion = parseIon(text);
  return ion instanceof FormulaError ? badInput(name, `"${text.trim()}" ${ion.problem}`, ion.advice ?? wantedIon) : ion;
}

/** One of a closed list of words, in any case. */
export function wordInput<const W extends readonly string[]>(name: string, words: W): Input<W[number]> {
  return {
    name,
    optional: false,
    blank: undefined,
    zeroIsValue: false,
    least: 1,
    most: 0,
    words,
    kind: "words",
    read: (cell) => {
      const typed = typeof cell === "string" ? cell.trim().toLowerCase() : undefined;
      const word = words.find((each) => each.toLowerCase() === typed);
      return word ?? badInput(name, `${said(cell)} is not one of its words`, `type ${listed(words)}`);
    },
  };
}

/** A number with a unit, or one of a few words that stand for a value only the model knows, such as "floating". */
export function quantityOrWord<const W extends readonly string[]>(
  name: string,
  quantity: Quantity,
  words: W,
  range: Range = {},
): Input<number | W[number]> {
  const number = quantityInput(name, quantity, range);
  return {
    ...number,
    words,
    read: (cell) => {
      const typed = typeof cell === "string" ? cell.trim().toLowerCase() : undefined;
      const word = words.find((each) => each.toLowerCase() === typed);
      if (word !== undefined) return word;
      const value = number.read(cell);
      return value instanceof Fault && typeof cell === "string"
        ? new Fault(value.code, value.message.replace(/\.$/, `, or ${listed(words)}.`))
        : value;
    },
  };
}

/** TRUE or FALSE. */
export function flagInput(name: string): Input<boolean> {
  return {
    name,
    optional: false,
    blank: undefined,
    zeroIsValue: true,
    least: 1,
    most: 0,
    kind: "flag",
    read: (cell) => {
      if (typeof cell === "boolean") return cell;
      if (cell === 0 || cell === 1) return cell === 1;
      const typed = typeof cell === "string" ? cell.trim().toLowerCase() : "";
      if (typed === "true" || typed === "false") return typed === "true";
      return badInput(name, `${said(cell)} is neither TRUE nor FALSE`, "type TRUE or FALSE");
    },
  };
}

/** Any text. */
export function textInput(name: string, wanted: string, example?: string): Input<string> {
  return {
    name,
    example,
    optional: false,
    blank: undefined,
    zeroIsValue: false,
    least: 1,
    most: 0,
    kind: "text",
    read: (cell) => (typeof cell === "string" ? cell.trim() : badInput(name, `${said(cell)} is not text`, wanted)),
  };
}

/** A whole range that is one argument, such as the energies of a measured distribution: never broadcast. */
export function blockInput<T>(name: string, read: (cells: unknown[][]) => T | Fault, of?: Quantity): Input<T> {
  return {
    name,
    optional: false,
    blank: undefined,
    zeroIsValue: true,
    least: 1,
    most: 0,
    quantity: of,
    example: of?.example,
    kind: "block",
    read: (cells) => read(cells as unknown[][]),
  };
}

/** The same input, left out or blank where the caller means `blank`. */
export function optional<T>(input: Input<T>, blank: T): Input<T>;
export function optional<T>(input: Input<T>): Input<T | undefined>;
export function optional<T>(input: Input<T>, blank?: T): Input<T | undefined> {
  return { ...input, optional: true, blank };
}

/** Why a bare number in this cell is doubted: "n_e 1e11 m⁻³; cm⁻³ meant?". A stated unit is taken at its word. */
export function doubtOf(input: Input, cell: unknown): string | undefined {
  if (typeof cell !== "number" || cell === 0 || !input.band) return undefined;
  const { low, high, below, above } = input.band;
  const size = input.least < 0 && input.least !== Number.MIN_VALUE ? cell : Math.abs(cell);
  const hint = size < low ? (below ?? "unusually small") : size > high ? (above ?? "unusually large") : undefined;
  if (hint === undefined) return undefined;
  const unit = input.kind === "ion" ? "u" : prettyUnit(input.quantity?.unit ?? "");
  return `${input.name} ${format(cell)} ${unit}`.trimEnd() + `; ${hint}`;
}

function said(cell: unknown): string {
  if (typeof cell === "string") return `"${cell.trim().slice(0, 40)}"`;
  if (typeof cell === "boolean") return cell ? "TRUE" : "FALSE";
  return typeof cell === "number" ? format(cell, 4) : "what the cell holds";
}

/** "edge" or "plasma"; "free", "slab" or "cylinder". */
export function listed(words: readonly string[]): string {
  const quoted = words.map((word) => `"${word}"`);
  return quoted.length < 2 ? quoted.join("") : `${quoted.slice(0, -1).join(", ")} or ${quoted.at(-1)}`;
}
