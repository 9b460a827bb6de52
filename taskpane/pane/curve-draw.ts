import { line } from "d3-shape";
import type { Stretch } from "../sweep/stretches";
import { asksForLogarithm, axisFor, characterWidth, type Axis } from "./curve-axis";
import { panelsOf, type Curve, type Trace } from "./curve-data";
import { svg } from "./h";
import { numberText } from "./number-text";

const titleHeight = 26;
const panelHeight = 136;
const gap = 36;
const footHeight = 40;
const wallWidth = 9;

interface Frame {
  left: number;
  right: number;
  top: number;
  bottom: number;
}

/** A plot as wide as told: a panel for each unit, one above the other over the same x. */
export function drawCurve(curve: Curve, width: number): SVGElement {
  const panels = panelsOf(curve).map((traces, i) => {
    const top = titleHeight + i * (panelHeight + gap);
    const y = axisFor(
      traces.flatMap(({ values }) => values),
      {
        pixels: [top + panelHeight, top],
        logarithmic: asksForLogarithm(traces),
        vertical: true,
        unit: traces[0].unit,
      },
    );
    return { traces, top, y };
  });
  const longest = Math.max(...panels.flatMap(({ y }) => y.ticks.map(({ label }) => label.length)));
  const left = Math.ceil(longest * characterWidth + 8 + (curve.fromWall ? wallWidth : 0));
  const frame = { left, right: width - 16, top: titleHeight, bottom: panels.at(-1)!.top + panelHeight };
  const x = axisFor(curve.alone ? [...curve.x.values, curve.alone.x] : curve.x.values, {
    pixels: [frame.left, frame.right],
    logarithmic: curve.logarithmicX,
    vertical: false,
    unit: curve.x.unit,
  });
  return svg(
    "svg",
    { viewBox: `0 0 ${width} ${frame.bottom + footHeight}`, width, height: frame.bottom + footHeight },
    hatchings(),
    ...panels.flatMap(({ traces, top, y }) =>
      drawPanel(curve, traces, x, y, { ...frame, top, bottom: top + panelHeight }),
    ),
    ...(curve.fromWall ? wall(frame) : []),
    ...foot(curve, x, frame),
  );
}

function drawPanel(curve: Curve, traces: readonly Trace[], x: Axis, y: Axis, frame: Frame): SVGElement[] {
  const { left, right, top, bottom } = frame;
  return [
    ...(curve.stretches ?? []).flatMap((stretch) => band(curve, stretch, x, frame)),
    ...y.ticks.map(({ at, label }) =>
      svg("path", { class: label ? "rule" : "rule minor", d: `M${left} ${at}H${right}` }),
    ),
    ...y.ticks.map(({ at, label }) =>
      svg("text", { x: left - (curve.fromWall ? wallWidth : 0) - 6, y: at + 4, "text-anchor": "end" }, label),
    ),
    svg("path", { class: "axis", d: `M${left} ${top}V${bottom}H${right}` }),
    ...(curve.alone ? lonePeak(curve.alone, x, frame) : []),
    ...(curve.stretches ?? []).flatMap((stretch) => word(curve, stretch, traces[0], x, y, frame)),
    ...traces.map((trace, i) => svg("path", { class: `trace trace-${i}`, d: through(curve.x, trace, x, y) })),
    ...title(traces, y.unit, curve.fromWall ? left + 8 : left, top - 10),
  ];
}

function through({ values: xs }: Trace, { values: ys }: Trace, x: Axis, y: Axis): string {
  const points = xs.map((value, i): [number, number] => [x.at(value), y.at(ys[i])]);
  const path = line<[number, number]>()
    .defined(([, height]) => Number.isFinite(height))
    .x(([across]) => across)
    .y(([, height]) => height)
    .digits(2);
  return path(points) ?? "";
}

/** "potential, V"; where traces share the panel, each behind a piece of its line. */
function title(traces: readonly Trace[], unit: string, left: number, y: number): SVGElement[] {
  const ending = unit === "" ? "" : `, ${unit}`;
  if (traces.length === 1) return [svg("text", { class: "name", x: left, y }, traces[0].name + ending)];
  let at = left;
  return traces.flatMap(({ name }, i) => {
    const text = i === traces.length - 1 ? name + ending : name;
    const from = at;
    at += 30 + (text.length + 2) * characterWidth;
    return [
      svg("path", { class: `key trace trace-${i}`, d: `M${from} ${y - 4}h24` }),
      svg("text", { class: "name", x: from + 30, y }, text),
    ];
  });
}

/** The wall at x = 0 as a drawing has it: a thick line, hatched on the side of the solid. */
function wall({ left, top, bottom }: Frame): SVGElement[] {
  const strokes = Array.from({ length: Math.ceil((bottom - top) / 8) }, (_, i) => top + 8 * i);
  const hatching = strokes.map((y) => `M${left - wallWidth} ${Math.min(y + wallWidth, bottom)}L${left} ${y}`);
  return [
    svg("path", { class: "hatching", d: hatching.join("") }),
    svg("path", { class: "wall", d: `M${left} ${top}V${bottom}` }),
  ];
}

function foot({ x: { name }, fromWall }: Curve, x: Axis, { left, right, bottom }: Frame): SVGElement[] {
  const labelled = x.ticks.filter(({ label }) => label !== "");
  const what = `${name}${fromWall ? " from the wall" : ""}${x.unit === "" ? "" : `, ${x.unit}`}`;
  return [
    svg("path", { class: "axis", d: labelled.map(({ at }) => `M${at} ${bottom}v4`).join("") }),
    ...labelled.map(({ at, label }) => svg("text", { x: at, y: bottom + 17, "text-anchor": "middle" }, label)),
    svg("text", { class: "name", x: (left + right) / 2, y: bottom + 35, "text-anchor": "middle" }, what),
  ];
}

/** What arrives all at once has no height of its own: an arrow up, with its share. */
function lonePeak({ name, x: at, share }: NonNullable<Curve["alone"]>, x: Axis, { top, bottom }: Frame): SVGElement[] {
  const across = x.at(at);
  return [
    svg("path", { class: "alone", d: `M${across} ${bottom}V${top + 1}m-4 7l4 -7l4 7` }),
    svg("text", { x: across - 8, y: top + 10, "text-anchor": "end" }, `${name} ${numberText(share, 3)}`),
  ];
}

const marked: Partial<Record<Stretch["word"], string>> = {
  fails: "closed",
  "no value": "closed",
  marginal: "sparse",
  "doubtful input": "sparse",
};

/** A stretch where a limit doesn't hold: hatched like a wall where it fails, thinly so where it is marginal. */
function band(curve: Curve, stretch: Stretch, x: Axis, { top, bottom }: Frame): SVGElement[] {
  const [from, to] = endsOf(curve, stretch, x);
  const size = { x: from, y: top, width: to - from, height: bottom - top };
  const isLast = stretch.last === curve.x.values.length - 1;
  const border = x.at(curve.x.values[0]) < x.at(curve.x.values.at(-1)!) ? to : from;
  const pattern = marked[stretch.word];
  return [
    ...(pattern ? [svg("rect", { ...size, class: "band", fill: `url(#wallfall-${pattern})` })] : []),
    ...(isLast ? [] : [svg("path", { class: "border", d: `M${border} ${top}V${bottom}` })]),
  ];
}

/** The word of a stretch where there is room for it, away from the curve. */
function word(curve: Curve, stretch: Stretch, trace: Trace, x: Axis, y: Axis, { top, bottom }: Frame): SVGElement[] {
  const [from, to] = endsOf(curve, stretch, x);
  const isAll = curve.stretches?.length === 1;
  if ((isAll && stretch.word === "not tested") || stretch.word.length * characterWidth + 8 > to - from) return [];
  const height = y.at(trace.values[Math.round((stretch.first + stretch.last) / 2)]);
  const at = height < (top + bottom) / 2 ? bottom - 8 : top + 14;
  return [svg("text", { class: "word", x: (from + to) / 2, y: at, "text-anchor": "middle" }, stretch.word)];
}

/** Pixels from left to right; neighbours meet halfway between their last and first values. */
function endsOf({ x: { values } }: Curve, { first, last }: Stretch, x: Axis): [number, number] {
  const between = (i: number, j: number) =>
    (x.at(values[Math.max(0, i)]) + x.at(values[Math.min(j, values.length - 1)])) / 2;
  const ends = [first === 0 ? x.at(values[0]) : between(first - 1, first), between(last, last + 1)];
  return [Math.min(...ends), Math.max(...ends)];
}

function hatchings(): SVGElement {
  const pattern = (name: string, size: number, d: string) =>
    svg(
      "pattern",
      { id: `wallfall-${name}`, width: size, height: size, patternUnits: "userSpaceOnUse" },
      svg("path", { class: "hatching", d }),
    );
  return svg(
    "defs",
    {},
    pattern("closed", 8, "M-2 10L10 -2M-2 2L2 -2M6 10L10 6"),
    pattern("sparse", 24, "M-2 26L26 -2"),
  );
}
