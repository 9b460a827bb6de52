import { badInput, Fault } from "../cells/fault";
import { format, prettyUnit } from "../cells/format";
import type { Input } from "../cells/inputs";
import { isInstrumentWord, numberAndUnit } from "../cells/quantity-text";
import { parseUnit, type Unit } from "../cells/units";
import { convertUnit } from "../helpers/model";

/** A number as it stands in a cell, with its unit where one is written. */
export interface Amount {
  value: number;
  unit?: Unit;
}

/**
 * Whether a value lies within a tolerance of a reference: the larger of rel_tol · |reference| and abs_tol. Units stand
 * in all amounts or in none; the comparison is made in the reference's. Temperatures differ by differences, and a
 * relative tolerance of one is relative to its absolute temperature.
 */
export function within(
  value: Amount,
  reference: Amount,
  rel_tol: number,
  abs_tol: Amount | undefined,
  label: string | undefined,
): string | Fault {
  const target = reference.unit;
  const measured = inUnit("value", value, target);
  const allowed =
    abs_tol === undefined
      ? 0
      : inUnit("abs_tol", withoutOffset(abs_tol), withoutOffset({ value: 0, unit: target }).unit);
  if (measured instanceof Fault) return measured;
  if (allowed instanceof Fault) return allowed;
  if (allowed < 0) return badInput("abs_tol", `${format(allowed)} is negative`, "type a tolerance above 0");
  if (rel_tol === 0 && allowed === 0) {
    return badInput("rel_tol", "neither rel_tol nor abs_tol is given", 'type a tolerance such as "5 %"');
  }
  const size = target ? Math.abs(reference.value + target.offset / target.scale) : Math.abs(reference.value);
  const tolerance = Math.max(rel_tol * size, allowed);
  if (isClose(measured, reference.value, tolerance)) return "holds";
  const said = comparison(measured, reference.value, tolerance, target ? ` ${prettyUnit(target.text)}` : "");
  return label ? `fails: ${label}: ${said}` : `fails: ${said}`;
}

/** A tolerance that is met exactly holds, although 3.1 − 2.9 is a few ulp more than 0.2. */
function isClose(value: number, reference: number, tolerance: number): boolean {
  return Math.abs(value - reference) <= tolerance + 4 * Number.EPSILON * Math.max(Math.abs(value), Math.abs(reference));
}

/** With so many digits that the numbers shown don't hold either. */
function comparison(value: number, reference: number, tolerance: number, unit: string): string {
  for (let digits = 3; ; digits++) {
    const [v, r, t] = [value, reference, tolerance].map((each) => format(each, digits));
    if (digits < 15 && isClose(Number(v), Number(r), Number(t))) continue;
    return `${v}${unit} against ${r} ± ${t}${unit}`;
  }
}

function withoutOffset({ value, unit }: Amount): Amount {
  return { value, unit: unit && { ...unit, offset: 0 } };
}

function inUnit(name: string, { value, unit }: Amount, target: Unit | undefined): number | Fault {
  if (!unit && !target) return value;
  if (!unit || !target) {
    const [bare, other] = unit ? ["reference", unit.text] : [name, target!.text];
    return badInput(bare, `it has no unit beside one in ${other}`, "write units in all of them or in none");
  }
  const converted = convertUnit(value, unit, target, parseUnit("K")!.dimension, parseUnit("J")!.dimension);
  if (converted !== undefined) return converted;
  return badInput(
    name,
    `${prettyUnit(unit.text)} does not convert to ${prettyUnit(target.text)}`,
    `type it in ${prettyUnit(target.text)}`,
  );
}

/** Any number, with or without any unit. */
export function amountInput(name: string): Input<Amount> {
  return {
    name,
    optional: false,
    blank: undefined,
    zeroIsValue: true,
    least: 1,
    most: 0,
    kind: "text",
    read: (cell) => readAmount(name, cell),
  };
}

function readAmount(name: string, cell: unknown): Amount | Fault {
  const wanted = 'type a number, or one with its unit such as "3 mm"';
  if (typeof cell === "number") {
    return Number.isFinite(cell) ? { value: cell } : badInput(name, `${format(cell)} is not a finite number`, wanted);
  }
  if (typeof cell !== "string") return badInput(name, "the cell holds neither number nor text", wanted);
  const typed = cell.trim().slice(0, 40);
  const parts = numberAndUnit(cell);
  if (!parts || !Number.isFinite(parts.value)) {
    const what = isInstrumentWord(typed) ? "is an instrument's word for no reading" : "is not a number";
    return badInput(name, `"${typed}" ${what}`, wanted);
  }
  if (parts.unitText === "") return { value: parts.value };
  const unit = parseUnit(parts.unitText);
  return unit ? { value: parts.value, unit } : badInput(name, `"${parts.unitText}" is not a unit known here`, wanted);
}
