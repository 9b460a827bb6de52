import { format } from "../../functions/cells/format";
import type { Figure } from "./figure-of";
import { svg } from "./h";

const width = 288;
const height = 168;
const wallAt = 262;
/** Where the field line meets the wall: a little below the middle, since it comes from above. */
const foot = 130;
const reach = 300;

/**
 * A field line that comes down to the wall, with the angle between them, in degrees. The angle is taken from the face of
 * the wall, not from its normal, which is drawn beside it for that reason.
 */
export function fieldAtWall(angle: number, limit = false): Figure {
  const theta = (angle * Math.PI) / 180;
  // Farther out where the angle is small, so that its arc still shows.
  const arcRadius = Math.min(80, Math.max(50, 8 / theta));
  /** A point so far from the foot, up along a line at an angle to the wall. */
  const along = (length: number, turn = theta) =>
    `${round(wallAt - length * Math.sin(turn))} ${round(foot - length * Math.cos(turn))}`;
  const [labelX, labelY] = [wallAt - arcRadius * Math.sin(theta), foot - arcRadius * Math.cos(theta)];
  const drawing = svg(
    "svg",
    { viewBox: `0 0 ${width} ${height}`, width, height },
    svg("defs", {}, svg("clipPath", { id: "wallfall-solid-side" }, svg("rect", { width: wallAt, height }))),
    svg("path", { class: "hatching", d: strokes() }),
    svg("path", { class: "wall", d: `M${wallAt} 0V${height}` }),
    svg("path", { class: "normal", d: `M${wallAt} ${foot}H${wallAt - 120}` }),
    svg("text", { x: wallAt - 126, y: foot + 4, "text-anchor": "end" }, "normal"),
    svg("path", { class: "trace", "clip-path": "url(#wallfall-solid-side)", d: `M${along(reach)}L${along(0)}` }),
    svg("path", { class: "trace", d: arrowhead(theta) }),
    svg("path", { class: "angle", d: `M${along(arcRadius)}A${arcRadius} ${arcRadius} 0 0 1 ${along(arcRadius, 0)}` }),
    svg(
      "text",
      { class: "name", x: labelX - 8, y: labelY + (angle > 60 ? -8 : 0), "text-anchor": "end" },
      `${format(angle, 4)}°`,
    ),
    ...nameOfLine(theta),
  );
  return { words: wordsFor(angle, limit), drawing };
}

function wordsFor(angle: number, limit: boolean): string {
  const degrees = `${format(angle, 4)}°`;
  if (limit) return `The flattest field line that leaves a Debye sheath: ${degrees} from the face of the wall.`;
  if (angle === 90) return "The field line meets the wall head-on: 90° from its face, along its normal.";
  return `The field line meets the wall at ${degrees} from its face, which is ${format(90 - angle, 4)}° from its normal.`;
}

/** "B" beside the line, where it has left the angle behind. */
function nameOfLine(theta: number): SVGElement[] {
  const length = Math.min(150, (foot - 14) / Math.max(Math.cos(theta), 1e-9));
  const [x, y] = [wallAt - length * Math.sin(theta), foot - length * Math.cos(theta)];
  return [
    svg("text", { class: "name field", x: round(x - 10), y: round(Math.max(14, y - 6)), "text-anchor": "end" }, "B"),
  ];
}

function arrowhead(theta: number): string {
  const tip: [number, number] = [wallAt - 2 * Math.sin(theta), foot - 2 * Math.cos(theta)];
  const barb = (turn: number) =>
    `${round(tip[0] - 11 * Math.sin(theta + turn))} ${round(tip[1] - 11 * Math.cos(theta + turn))}`;
  return `M${barb(0.42)}L${round(tip[0])} ${round(tip[1])}L${barb(-0.42)}`;
}

function strokes(): string {
  const lines = Array.from(
    { length: Math.ceil(height / 8) + 2 },
    (_, i) => `M${wallAt} ${i * 8}L${wallAt + 9} ${i * 8 - 9}`,
  );
  return lines.join("");
}

function round(pixels: number): number {
  return Math.round(pixels * 100) / 100;
}
