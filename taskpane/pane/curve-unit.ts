import { prettyUnit } from "../../functions/cells/format";
import { numberText } from "./number-text";

/** A unit in which a value has few digits: how many of the plain unit it is, and its name. */
export interface ScaledUnit {
  factor: number;
  text: string;
  /** A unit of its own, such as mm, and no mere power of ten. */
  named: boolean;
}

const prefixes: Record<number, string> = { 9: "G", 6: "M", 3: "k", [-3]: "m", [-6]: "µ", [-9]: "n", [-12]: "p" };
const takesPrefix = /^(m|V|eV|s|A|Hz|Pa|T|W|F|ohm)(?=$|\/| )/;

/** With a prefix where the unit may have one, else with a power of ten. */
export function scaledUnit(unit: string, size: number): ScaledUnit {
  const plain: ScaledUnit = { factor: 1, text: prettyUnit(unit), named: true };
  const mayHavePrefix = takesPrefix.test(unit);
  if (size === 0 || (size >= (mayHavePrefix ? 0.1 : 0.01) && size < 1e4)) return plain;
  const power = 3 * Math.floor(Math.log10(size) / 3);
  const factor = Number(`1e${power}`);
  const prefix = mayHavePrefix ? prefixes[power] : undefined;
  if (prefix) return { factor, text: prefix + plain.text, named: true };
  return { factor, text: `${powerOfTen(power)} ${plain.text}`.trimEnd(), named: false };
}

/** A value with its unit as it stands in a sentence. */
export function quantity(value: number, unit: string): string {
  const { factor, text, named } = scaledUnit(unit, Math.abs(value));
  return named ? spaced(numberText(value / factor, 4), text) : spaced(numberText(value, 4), prettyUnit(unit));
}

/** "−300 to −0.339 V": both ends in the unit that suits the larger, where it suits the smaller, too. */
export function span(first: number, last: number, unit: string): string {
  const { factor, text, named } = scaledUnit(unit, Math.max(Math.abs(first), Math.abs(last)));
  const isFar = first !== 0 && last !== 0 && Math.abs(Math.log10(Math.abs(last / first))) > 4;
  const [by, name] = named && !isFar ? [factor, text] : [1, prettyUnit(unit)];
  return spaced(`${numberText(first / by, 4)} to ${numberText(last / by, 4)}`, name);
}

/** Of all units the degree alone follows its number without a space (SI Brochure, 5.4.3). */
function spaced(number: string, unit: string): string {
  return unit === "" || unit === "°" ? number + unit : `${number} ${unit}`;
}

export function powerOfTen(power: number): string {
  const digits = [...String(power)].map((digit) => (digit === "-" ? "⁻" : "⁰¹²³⁴⁵⁶⁷⁸⁹"[Number(digit)])).join("");
  return `10${digits}`;
}
