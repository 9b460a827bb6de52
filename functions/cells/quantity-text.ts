import { Fault, badInput } from "./fault";
import type { Quantity } from "./quantities";
import { k_B } from "../matter/constants";
import { parseUnit, type Unit } from "./units";

/** How a unit's numbers become those of a quantity: own = scale · value + offset. */
export interface Conversion {
  scale: number;
  offset: number;
}

/** A number with a unit behind it, in the spellings people type: "1e11 cm^-3", "10¹⁷ m⁻³", "3,5 eV", "1×10^17 /m3". */
export function readQuantityText(name: string, quantity: Quantity, text: string): number | Fault {
  const typed = text.trim();
  const parts = numberAndUnit(typed);
  if (!parts) return notANumber(name, quantity, typed);
  const { value, unitText } = parts;
  if (Number.isNaN(value)) {
    if (dateText.test(typed)) return wrongUnit(name, quantity, typed, typed);
    return badInput(
      name,
      `"${typed}" may mean a thousand or a decimal`,
      `write the decimal point as a dot, such as ${quantity.example}`,
    );
  }
  if (unitText === "") return value;
  const conversion = conversionTo(quantity, unitText);
  return conversion ? value * conversion.scale + conversion.offset : wrongUnit(name, quantity, typed, unitText);
}

/** The number in front of a unit, NaN where its comma could be read two ways; undefined where the text begins with none. */
export function numberAndUnit(text: string): { value: number; unitText: string } | undefined {
  const typed = text.trim();
  const parts = plainNumber.exec(typeset.test(typed) ? withAsciiPowers(typed) : typed);
  if (!parts || parts[1] === "") return undefined;
  const [, digits, exponent, unitText] = parts;
  const decimal = decimalPoint(digits);
  return { value: decimal === undefined ? NaN : Number(exponent ? `${decimal}e${exponent}` : decimal), unitText };
}

const plainNumber = /^([+-]?(?:\d[\d.,]*|[.,]\d+))(?:[eE]([+-]?\d+))?\s*(.*)$/;

/**
 * Reads quantity text for one input, remembering the last unit: the rows of a column mostly share it, and then only
 * the number in front is left to read.
 */
export function quantityTextReader(name: string, quantity: Quantity): (text: string) => number | Fault {
  let suffix = "";
  let conversion: Conversion = { scale: 1, offset: 0 };
  return (text) => {
    if (suffix !== "" && text.endsWith(suffix) && !baseTwoOrSixteen(text)) {
      const digits = text.slice(0, -suffix.length);
      const value = Number(digits);
      if (value - value === 0 && digits.trim() !== "") return value * conversion.scale + conversion.offset;
    }
    const value = readQuantityText(name, quantity, text);
    const unit = value instanceof Fault ? undefined : plainNumber.exec(text)?.[3];
    const known = unit ? conversionTo(quantity, unit.trim()) : undefined;
    if (unit && known) [suffix, conversion] = [unit, known];
    return value;
  };
}

/** Number() would take "0x1F" for 31. */
function baseTwoOrSixteen(text: string): boolean {
  const second = text.charCodeAt(1) | 32;
  return second === 120 || second === 98 || second === 111;
}

const typeset = /^−|^[+-]?[\d.,]*\s*(?:[×xX*·]\s*)?10\^?\(?[⁰¹²³⁴-⁹⁻⁺+\d-]|^[+-]?10\^/;

/** Typeset numbers: true minus, superscript powers, "1.5×10^17", "1.5 x 10^17", "10^17". */
function withAsciiPowers(text: string): string {
  return text
    .replace(/^−/, "-")
    .replace(/10([⁰¹²³⁴-⁹⁻⁺]+)/, (_, power: string) => `10^${fromSuperscript(power)}`)
    .replace(/^([+-]?[\d.,]+)\s*[×xX*·]\s*10\^?\(?([+-]?\d+)\)?/, "$1e$2")
    .replace(/^([+-]?)10\^\(?([+-]?\d+)\)?/, "$11e$2");
}

function fromSuperscript(power: string): string {
  return [...power].map((c) => (c === "⁻" ? "-" : c === "⁺" ? "" : "⁰¹²³⁴⁵⁶⁷⁸⁹".indexOf(c))).join("");
}

/** The digits with a decimal dot; undefined where a comma could be read two ways, as in "1,500". */
function decimalPoint(digits: string): string | undefined {
  const commas = digits.split(",").length - 1;
  const dots = digits.split(".").length - 1;
  if (commas === 0) return dots <= 1 ? digits : undefined;
  if (commas === 1 && dots === 0) {
    // Three digits behind a lone comma look like thousands, unless a zero leads: "0,125".
    return /,\d{3}$/.test(digits) && !/^[+-]?0,/.test(digits) ? undefined : digits.replace(",", ".");
  }
  return undefined;
}

const conversions = new WeakMap<Quantity, Map<string, Conversion | undefined>>();

/** How the named unit converts to the quantity's own; undefined where it is no unit or one of another dimension. */
export function conversionTo(quantity: Quantity, unitText: string): Conversion | undefined {
  let known = conversions.get(quantity);
  if (!known) conversions.set(quantity, (known = new Map()));
  const found = known.get(unitText);
  if (found || known.has(unitText)) return found;
  if (known.size > 1000) known.clear();
  const conversion = findConversion(quantity, unitText);
  known.set(unitText, conversion);
  return conversion;
}

function findConversion(quantity: Quantity, unitText: string): Conversion | undefined {
  if (quantity.amplitude) {
    const swing = readSwing(unitText);
    if (swing) return swing;
  }
  const unit = parseUnit(unitText);
  if (!unit) return undefined;
  if (quantity.unit === "") return unit.dimension === parseUnit("percent")!.dimension ? unit : undefined;
  const own = parseUnit(quantity.unit)!;
  if (unit.text === own.text) return { scale: 1, offset: 0 };
  if (quantity.angular && unit.dimension === parseUnit("rad/s")!.dimension) {
    return { scale: unit.scale / (2 * Math.PI * own.scale), offset: 0 };
  }
  const bridge = unit.dimension === own.dimension ? 1 : quantity.thermal ? thermalBridge(unit, own) : undefined;
  if (bridge === undefined) return undefined;
  return { scale: (unit.scale * bridge) / own.scale, offset: (unit.offset * bridge) / own.scale };
}

/** How an oscilloscope or a match network states an amplitude: "Vpp", "kV p-p", "Vrms", "V peak". */
export function readSwing(unitText: string): Conversion | undefined {
  const parts = /^(.*V)\s*_?(pp|p-p|pk-pk|peak-to-peak|rms|p|pk|peak|0-p|zero-to-peak)$/i.exec(unitText.trim());
  const unit = parts && parseUnit(parts[1]);
  if (!unit || unit.dimension !== parseUnit("V")!.dimension) return undefined;
  const kind = parts[2].toLowerCase();
  const factor = kind === "rms" ? Math.SQRT2 : /^(pp|p-p|pk-pk|peak-to-peak)$/.test(kind) ? 0.5 : 1;
  return { scale: unit.scale * factor, offset: 0 };
}

/** K to J is k_B, J to K its inverse; anything else is no temperature. */
function thermalBridge(from: Unit, to: Unit): number | undefined {
  const kelvin = parseUnit("K")!.dimension;
  const joule = parseUnit("J")!.dimension;
  if (from.dimension === kelvin && to.dimension === joule) return k_B;
  if (from.dimension === joule && to.dimension === kelvin) return 1 / k_B;
  return undefined;
}

const instrumentWords =
  /^(ol|o\.?l\.?|ovld|overload|over ?range|n\/?a|nan|inf|infinity|-+|err(or)?|\*+|\?+|none|null|open|sat)$/i;
const dateText = /^(\d{1,4}[-/.]\d{1,2}[-/.]\d{1,4}|\d{1,2}:\d{2})/;

/** Whether a text is what instruments write where they have no reading: "OL", "n/a", "---". */
export function isInstrumentWord(text: string): boolean {
  return instrumentWords.test(text.replace(/^[+-](?=\w)/, ""));
}

function notANumber(name: string, quantity: Quantity, typed: string): Fault {
  const expected = `type ${article(quantity.name)} such as ${quantity.example}`;
  if (isInstrumentWord(typed)) {
    return badInput(name, `"${typed}" is an instrument's word for no reading`, `leave the row blank or ${expected}`);
  }
  return badInput(name, `"${shorten(typed)}" is not ${article(quantity.name)}`, expected);
}

function wrongUnit(name: string, quantity: Quantity, typed: string, unitText: string): Fault {
  const expected = quantity.unit
    ? `type ${article(quantity.name)} such as ${quantity.example}`
    : "type a number without a unit";
  if (dateText.test(typed)) return badInput(name, `"${shorten(typed)}" looks like a date or a time`, expected);
  const unit = parseUnit(unitText);
  if (!unit) return badInput(name, `"${shorten(unitText)}" in "${shorten(typed)}" is not a unit known here`, expected);
  return badInput(
    name,
    `"${shorten(unitText)}" is ${kindOf(unit)}, not a unit of ${quantity.name || "number"}`,
    spelledOut(quantity, unitText) ?? expected,
  );
}

/** What a trade writes for short where the symbol is another unit's, and what is read for it. */
const shorthand: readonly [quantity: string, written: RegExp, read: string][] = [
  ["pressure", /^(m?)T$/, "$1Torr"],
  ["temperature", /^C$/, "°C"],
  ["erosion rate", /^A(?=\s*\/)/, "Å"],
];

function spelledOut(quantity: Quantity, unitText: string): string | undefined {
  const found = shorthand.find(([name, written]) => name === quantity.name && written.test(unitText));
  return found && `write ${unitText.replace(found[1], found[2])} if that is meant`;
}

/** The output unit that [unit] asks for, or why it can't be had. */
export function readOutputUnit(quantity: Quantity, text: string): Conversion | Fault {
  const conversion = conversionTo(quantity, text.trim());
  if (conversion) return conversion;
  const unit = parseUnit(text.trim());
  const given = unit ? `"${shorten(text)}" is ${kindOf(unit)}` : `"${shorten(text)}" is not a unit known here`;
  const wanted = spelledOut(quantity, text.trim()) ?? `type a unit such as ${quantity.unit}`;
  return badInput("unit", given, `the result is ${article(quantity.name)}, so ${wanted}`);
}

const kinds: [string, string][] = [
  ["m^-3", "density"],
  ["eV", "energy"],
  ["K", "temperature"],
  ["Pa", "pressure"],
  ["T", "magnetic field"],
  ["m", "length"],
  ["m^2", "area"],
  ["m^3", "volume"],
  ["V", "voltage"],
  ["V/m", "electric field"],
  ["A", "current"],
  ["A/m^2", "current density"],
  ["m/s", "speed"],
  ["s", "time"],
  ["Hz", "frequency in cycles"],
  ["rad/s", "angular frequency"],
  ["deg", "angle"],
  ["kg", "mass"],
  ["kg/m^3", "mass density"],
  ["m^-2 s^-1", "flux"],
  ["W", "power"],
  ["W/m^2", "heat flux"],
  ["F", "capacitance"],
  ["C", "charge"],
  ["ohm", "resistance"],
  ["percent", "ratio"],
];

function kindOf(unit: Unit): string {
  const kind = kinds.find(([text]) => parseUnit(text)!.dimension === unit.dimension);
  return kind ? `a unit of ${kind[1]}` : "a unit of another kind";
}

export function article(noun: string): string {
  return `${/^[aeiou]/.test(noun) ? "an" : "a"} ${noun}`;
}

function shorten(text: string): string {
  return text.length > 40 ? `${text.slice(0, 39)}…` : text;
}
