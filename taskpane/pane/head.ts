import { h, svg } from "./h";
import { labels } from "./labels";

/** The name under the potential that falls towards the wall. */
export function head(): HTMLElement {
  return h("div", { class: "head" }, fall(), h("h1", {}, labels.product), h("p", {}, labels.subtitle));
}

const width = 1200;
const height = 72;
const top = 10;
const bottom = 66;
const layer = 150;

/** Flat in the plasma, then Child's law φ ∝ −(1 − x/s)^(4/3) through the layer; drawn to its right edge, where the wall is. */
function fall(): SVGElement {
  const points: string[] = [];
  for (let step = 0; step <= 60; step++) {
    const depth = step / 60;
    const x = width - 6 - layer * (1 - depth);
    points.push(`${x.toFixed(1)} ${(top + (bottom - top) * depth ** (4 / 3)).toFixed(2)}`);
  }
  return svg(
    "svg",
    { class: "fall", viewBox: `0 0 ${width} ${height}`, preserveAspectRatio: "xMaxYMid slice", "aria-hidden": "true" },
    svg("path", { class: "potential", d: `M0 ${top}L${points.join("L")}` }),
    svg("path", { class: "wall", d: `M${width - 3} 0V${height}` }),
  );
}
