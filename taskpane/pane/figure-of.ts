import type { Entry } from "../../functions/cells/entry";
import { readInputs } from "../../functions/cells/evaluate";
import { Fault } from "../../functions/cells/fault";
import { fieldAtWall } from "./figure-field-line";

/** A drawing made from the values in the form: what it shows in words, and the drawing itself. */
export interface Figure {
  words: string;
  drawing: SVGElement;
}

type Values = Readonly<Record<string, unknown>>;
type Maker = (values: Values, result: unknown) => Figure | undefined;

const atAngle: Maker = ({ angle }) => (typeof angle === "number" ? fieldAtWall(angle) : undefined);

/** The functions whose pages have a figure. */
const makers: Readonly<Record<string, Maker | undefined>> = {
  WALLFLUX: atAngle,
  IONCURRENTDENSITY: atAngle,
  WALLHEATFLUX: atAngle,
  MAGNETICPRESHEATHWIDTH: atAngle,
  MAGNETICPRESHEATHDROP: atAngle,
  GRAZINGLIMIT: (_values, angle) => (typeof angle === "number" ? fieldAtWall(angle, true) : undefined),
};

/** The figure of a function at these arguments; undefined where it has none, or its values can't be used. */
export function figureOf(entry: Entry<any>, args: readonly unknown[]): Figure | undefined {
  const maker = makers[entry.name];
  if (!maker) return undefined;
  const reading = readInputs(entry.inputs, args);
  if (reading instanceof Fault || reading.odd?.[0]) return undefined;
  const values = reading.columns.map((column) => column.values[0]);
  const named = Object.fromEntries(entry.inputs.map(({ name }: { name: string }, i: number) => [name, values[i]]));
  return maker(named, entry.compute(...values));
}
