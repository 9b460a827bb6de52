import { isTable, type Entry, type Table } from "../../functions/cells/entry";
import type { Result } from "../../functions/cells/evaluate";
import type { Stretch } from "../sweep/stretches";

/** Numbers along a curve; NaN where there is none. */
export interface Trace {
  name: string;
  unit: string;
  values: readonly number[];
}

export interface Curve {
  x: Trace;
  y: readonly Trace[];
  logarithmicX: boolean;
  /** Whether x is counted from the wall, which is then drawn at 0. */
  fromWall: boolean;
  /** What arrives all at one x, beside the curve. */
  alone?: { name: string; x: number; share: number };
  /** Where along x the limits of a model hold and where they don't. */
  stretches?: readonly Stretch[];
}

/** The curve that a spilled table makes; undefined for a table that makes none. */
export function curveOf({ result: kind }: Entry<any>, result: Result): Curve | undefined {
  if (!isTable(kind) || !kind.curve) return undefined;
  const { columns, curve } = kind;
  const indexOf = (name: string) => columns.findIndex((column) => column.name === name);
  const at = indexOf(curve.x);
  const alone = curve.alone === undefined ? -1 : indexOf(curve.alone);
  const isNumber = (cell: unknown): cell is number => typeof cell === "number";
  // A title row has no numbers, and a refused call neither.
  const rows = result.filter((row) => isNumber(row[at]));
  const inLine = rows.filter((row) => !row[alone]);
  const beside = rows.find((row) => row[alone]);
  if (inLine.length < 2) return undefined;
  const trace = (i: number): Trace => ({
    ...columns[i],
    values: inLine.map((row) => (isNumber(row[i]) ? row[i] : NaN)),
  });
  return {
    x: trace(at),
    y: curve.y.map(indexOf).map(trace),
    logarithmicX: false,
    fromWall: isDistance(columns[at]),
    alone: beside && { name: columns[alone].name, x: beside[at] as number, share: beside[alone] as number },
  };
}

/** Every distance in this catalogue is measured from the wall. */
function isDistance({ unit }: Table["columns"][number]): boolean {
  return unit === "m";
}

/** Traces that share a unit share an axis. */
export function panelsOf({ y }: Curve): Trace[][] {
  const panels = new Map<string, Trace[]>();
  for (const trace of y) panels.set(trace.unit, [...(panels.get(trace.unit) ?? []), trace]);
  return [...panels.values()];
}
