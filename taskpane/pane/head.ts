import { h, svg } from "./h";
import { labels } from "./labels";

/** The name under the potential that falls towards the wall. */
export function head(): HTMLElement {
  return h("div", { class: "head" }, fall(), h("h1", {}, labels.product), h("p", {}, labels.subtitle));
}

const width = 1200;
const height = 76;
const top = 10;
const bottom = 70;
const layer = 104;
const wallAt = width - 9;

/** Flat in the plasma, then Child's law φ ∝ −(1 − x/s)^(4/3) through the layer to the wall, which is hatched as in a drawing. */
function fall(): SVGElement {
  const points = Array.from({ length: 41 }, (_, step) => {
    const depth = step / 40;
    return `${(wallAt - layer * (1 - depth)).toFixed(1)} ${(top + (bottom - top) * depth ** (4 / 3)).toFixed(2)}`;
  });
  const hatching = Array.from({ length: 11 }, (_, i) => `M${wallAt} ${i * 8}L${width} ${i * 8 - 9}`);
  return svg(
    "svg",
    { class: "fall", viewBox: `0 0 ${width} ${height}`, preserveAspectRatio: "xMaxYMin slice", "aria-hidden": "true" },
    svg("path", { class: "hatching", d: hatching.join("") }),
    svg("path", { class: "wall", d: `M${wallAt} 0V${height}` }),
    svg("path", { class: "potential", d: `M0 ${top}L${points.join("L")}` }),
  );
}
