import { isTable, type Entry } from "../../functions/cells/entry";
import type { Input } from "../../functions/cells/inputs";
import { conversionTo } from "../../functions/cells/quantity-text";
import type { Twin } from "../../functions/cells/twin";
import { constants } from "../../functions/matter/constants";
import type { Ion } from "../../functions/matter/ion";
import { namesIn } from "./references";

/** One row of a call in plain cells; its formula still speaks of names. */
export interface Row {
  what: string;
  value?: number | string;
  formula?: string;
  unit?: string;
  /** The name under which formulas know the value. */
  name?: string;
  /** Which of a list's values it is. */
  item?: number;
}

/** An input as it was read: in its own unit, an ion as mass and charge, a default in full. */
export function inputRows(input: Input, value: unknown, { blanks = {} }: Twin): Row[] {
  const { name, kind, quantity } = input;
  if (Array.isArray(value)) return listRows(name, value);
  if (isIon(value)) return [{ what: name, value: value.label }, ...ionRows([value])];
  // What a surface is made of is read as the mass of one formula unit.
  if (kind === "text") return [massRow(`one unit of ${name}`, value as number)];
  const known = value === undefined || value === Infinity ? blanks[name] : (value as number | string);
  if (known === undefined) return [{ what: `${name} (left blank)`, name, unit: quantity?.unit }];
  return [{ what: name, name, value: known, unit: typeof known === "string" ? undefined : quantity?.unit }];
}

/** A range that is one argument: the ions of a mixture, or the numbers beside them. */
function listRows(name: string, values: unknown[]): Row[] {
  if (values.every(isIon)) return ionRows(values);
  return values.map((value, item) => ({ what: `${name} ${item + 1}`, name, item, value: value as number }));
}

function isIon(value: unknown): value is Ion {
  return typeof value === "object" && value !== null && "charge" in value;
}

/** Masses stand together and charges stand together, so that formulas can take each as a range. */
function ionRows(ions: Ion[]): Row[] {
  return [
    ...ions.map(({ label, mass }, item) => ({ ...massRow(label, mass), item })),
    ...ions.map(({ label, charge }, item) => ({ what: `Z, charge of ${label}`, name: "Z", value: charge, item })),
  ];
}

function massRow(of: string, mass: number): Row {
  return { what: `M, mass of ${of}`, name: "M", value: mass, unit: "kg" };
}

/** The constants that the formulas name, unless an input or a step has the name. */
export function constantRows(twin: Twin, inputs: readonly Row[]): Row[] {
  const own = new Set([...inputs, ...(twin.steps ?? [])].map(({ name }) => name));
  const used = new Set(formulasOf(twin).flatMap(namesIn));
  return constants
    .filter(({ symbol }) => used.has(symbol) && !own.has(symbol))
    .map(({ symbol, name, value, unit }) => ({ what: `${symbol}, ${name} (CODATA 2022)`, name: symbol, value, unit }));
}

function formulasOf({ steps = [], formula }: Twin): string[] {
  return [...steps.map((step) => step.formula), ...(typeof formula === "string" ? [formula] : Object.values(formula))];
}

export function stepRows({ steps = [] }: Twin): Row[] {
  return steps.map(({ name, unit, formula }) => ({ what: name, name, formula, unit }));
}

/** The result, in the function's own unit and then in the one that was asked for; or a table's, ion by ion. */
export function resultRows(entry: Entry<any>, { formula }: Twin, unit: string, ions: readonly Ion[]): Row[] {
  const { name, result } = entry;
  if (typeof formula === "string" && !isTable(result)) {
    const own = { what: name, name: "result", formula, unit: result.unit };
    const { scale, offset } = conversionTo(result, unit) ?? { scale: 1, offset: 0 };
    const converted = offset === 0 ? `result/${scale}` : `(result-${offset})/${scale}`;
    return scale === 1 && offset === 0 ? [own] : [own, { what: name, formula: converted, unit }];
  }
  const columns = isTable(result) ? result.columns.filter(({ name }) => formulaOf(formula, name)) : [];
  return ions.flatMap(({ label }, item) =>
    columns.map(({ name, unit }) => ({ what: `${name} of ${label}`, formula: formulaOf(formula, name), unit, item })),
  );
}

function formulaOf(formula: Twin["formula"], column: string): string | undefined {
  return typeof formula === "string" ? undefined : formula[column];
}
