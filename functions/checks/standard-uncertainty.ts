import { badInput, Fault } from "../cells/fault";
import { format } from "../cells/format";
import { isCellError, passOn, type CellError } from "../cells/host";
import type { Input } from "../cells/inputs";
import { quantities } from "../cells/quantities";
import { conversionTo, numberAndUnit, readQuantityText } from "../cells/quantity-text";

/** The two cells that state the standard uncertainty of one argument. */
export interface Stated {
  relative: unknown;
  absolute: unknown;
}

/**
 * Standard uncertainty of an argument in its own unit. A relative and an absolute one are independent contributions and
 * add in quadrature, JCGM 100:2008, 4.3 and 5.1.2.
 */
export function standardUncertainty(input: Input, value: number, stated: Stated): number | CellError {
  const relative = readStated("rel_unc", stated.relative, readRatio);
  if (typeof relative !== "number") return relative;
  const absolute = readStated("abs_unc", stated.absolute, (cell) => readDifference(input, cell));
  if (typeof absolute !== "number") return absolute;
  return Math.hypot(relative * value, absolute);
}

function readStated(name: string, cell: unknown, read: (cell: number | string) => number | Fault): number | CellError {
  if (isUnstated(cell)) return 0;
  if (isCellError(cell)) return passOn(cell, name);
  const wanted = "type a standard uncertainty of 0 or more";
  if (typeof cell !== "number" && typeof cell !== "string") return badInput(name, "the cell holds no number", wanted);
  const value = read(cell);
  if (typeof value === "number" && !(value >= 0 && Number.isFinite(value))) {
    return badInput(name, `${format(value)} is no uncertainty`, wanted);
  }
  return value;
}

/** Blank and zero alike: no uncertainty is stated. */
export function isUnstated(cell: unknown): boolean {
  return cell === null || cell === undefined || cell === 0 || (typeof cell === "string" && cell.trim() === "");
}

/** More than the value itself is 5 typed for 5 %. */
function readRatio(cell: number | string): number | Fault {
  const ratio = typeof cell === "number" ? cell : readQuantityText("rel_unc", quantities.ratio, cell);
  if (ratio instanceof Fault || !(ratio > 1)) return ratio;
  return badInput(
    "rel_unc",
    `${format(ratio)} is ${format(100 * ratio)} % of the value`,
    'type one such as 0.05 or "5 %"',
  );
}

/** A difference of temperatures is a difference: 5 °C are 5 K. */
function readDifference({ name, quantity }: Input, cell: number | string): number | Fault {
  if (typeof cell === "number") return cell;
  const parts = numberAndUnit(cell);
  const conversion = parts?.unitText && quantity ? conversionTo(quantity, parts.unitText) : undefined;
  if (parts && conversion) return parts.value * conversion.scale;
  return readQuantityText(`abs_unc of ${name}`, quantity ?? quantities.number, cell);
}
