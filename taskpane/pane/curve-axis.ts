import { scaleLinear, scaleLog } from "d3-scale";
import { prettyUnit } from "../../functions/cells/format";
import type { Trace } from "./curve-data";
import { powerOfTen, scaledUnit } from "./curve-unit";
import { numberText } from "./number-text";

/** An axis of a plot: where a value stands, and what is written along it. */
export interface Axis {
  /** Pixels; NaN where the axis has no place for the value. */
  at(value: number): number;
  /** Lines across the plot; those without a label are minor. */
  ticks: Tick[];
  /** The unit that the labels count: "mm", "10¹⁵ m⁻³". */
  unit: string;
}

interface Tick {
  at: number;
  label: string;
}

/** What is asked of an axis. */
export interface Wanted {
  /** Pixels from and to; a vertical axis runs from the higher number up. */
  pixels: [number, number];
  logarithmic: boolean;
  vertical: boolean;
  unit: string;
}

/** Width of a character of the labels, as the style sheet sets them, and the height of a line of them. */
export const characterWidth = 7.6;
const lineHeight = 18;

/** A logarithmic axis, where the values ask for one: all above zero, and each trace over two decades at least. */
export function asksForLogarithm(traces: readonly Trace[]): boolean {
  return traces.every(({ values }) => {
    const [low, high] = extent(values);
    return low > 0 && high / low >= 100;
  });
}

export function extent(values: readonly number[]): [low: number, high: number] {
  return values.reduce<[number, number]>(
    ([low, high], value) => (Number.isNaN(value) ? [low, high] : [Math.min(low, value), Math.max(high, value)]),
    [Infinity, -Infinity],
  );
}

/** The axis for some values. Upwards it may reach beyond them, to round numbers or to zero where that is near. */
export function axisFor(values: readonly number[], wanted: Wanted): Axis {
  const [low, high] = extent(values);
  const length = Math.abs(wanted.pixels[1] - wanted.pixels[0]);
  const count = Math.max(2, Math.round(length / (wanted.vertical ? 34 : 70)));
  return wanted.logarithmic ? logarithmic([low, high], count, wanted) : linear([low, high], count, wanted);
}

function logarithmic(ends: [number, number], count: number, { pixels, unit, vertical }: Wanted): Axis {
  const label = Math.abs(Math.log10(ends[1] / ends[0])) > 6 ? powerText : (value: number) => numberText(value);
  const scale = scaleLog(ends, pixels);
  if (vertical) scale.nice();
  const values = scale.ticks(count);
  const labelled = (mantissas: readonly number[]): Tick[] =>
    values.map((value) => ({
      at: scale(value),
      label: mantissas.includes(mantissaOf(value)) ? label(value) : "",
    }));
  const choices = mantissaChoices.map(labelled);
  return {
    at: scale,
    ticks: choices.find((ticks) => keepApart(ticks, vertical)) ?? choices.at(-1)!,
    unit: prettyUnit(unit),
  };
}

/** Which ticks of each decade get a label, where there is room for them. */
const mantissaChoices = [[1, 2, 3, 5], [1, 3], [1]];

function mantissaOf(value: number): number {
  const size = Math.abs(value);
  return Math.round(size / 10 ** Math.floor(Math.log10(size) + 1e-9));
}

/** Over many decades each label is a power of ten. */
function powerText(value: number): string {
  return (value < 0 ? "−" : "") + powerOfTen(Math.round(Math.log10(Math.abs(value))));
}

function keepApart(ticks: readonly Tick[], vertical: boolean): boolean {
  const labels = ticks.filter(({ label }) => label !== "");
  return labels.slice(1).every(({ at, label }, i) => {
    const room = vertical ? lineHeight : ((label.length + labels[i].label.length) / 2 + 1.5) * characterWidth;
    return Math.abs(at - labels[i].at) >= room;
  });
}

function linear([low, high]: [number, number], count: number, { pixels, unit, vertical }: Wanted): Axis {
  const { factor, text } = scaledUnit(unit, Math.max(Math.abs(low), Math.abs(high)));
  const [from, to] = vertical ? roomy(low, high) : [low, high];
  const scale = scaleLinear([from / factor, to / factor], pixels);
  if (vertical) scale.nice(count);
  const label = scale.tickFormat(count);
  return {
    at: (value) => scale(value / factor),
    ticks: scale.ticks(count).map((value) => ({ at: scale(value), label: label(value) })),
    unit: text,
  };
}

/** Down or up to zero where that costs no more than the curve itself; a level curve gets room above and below. */
function roomy(low: number, high: number): [number, number] {
  if (low === high) return low === 0 ? [-1, 1] : [low - Math.abs(low) / 2, high + Math.abs(high) / 2];
  const span = high - low;
  if (low > 0 && low <= span) return [0, high];
  if (high < 0 && -high <= span) return [low, 0];
  return [low, high];
}
