import type { Cause } from "../findings/causes";
import { svg } from "./h";
import { mark } from "./limits-view";

const wall = "M20 0V14";

/**
 * Marks in the manner of the verdicts, what comes towards a wall: lost on the way where there is no result, in pieces
 * where it is doubtful, twice where two things should be one. The words always stand beside them.
 */
const strokes = {
  lost: [wall, "M0 7H5M8 3.5L15 10.5M15 3.5L8 10.5"],
  doubtful: [wall, "M0 7H3M6 7H9M12 7H15"],
  twice: [wall, "M0 4H12M0 10H12"],
} as const;

const marks: Record<Cause, keyof typeof strokes | "fails" | "marginal"> = {
  error: "lost",
  passed: "lost",
  spill: "lost",
  newer: "lost",
  fails: "fails",
  check: "fails",
  stale: "twice",
  overwritten: "twice",
  inconsistent: "twice",
  doubtful: "doubtful",
  heading: "doubtful",
  blank: "doubtful",
  marginal: "marginal",
};

export function causeMark(cause: Cause): SVGElement {
  const kind = marks[cause];
  if (kind === "fails" || kind === "marginal") return mark(kind);
  const drawn = strokes[kind].map((d) => svg("path", { d }));
  return svg("svg", { class: "mark", viewBox: "0 0 28 14", "aria-hidden": "true" }, ...drawn);
}
