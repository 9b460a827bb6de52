import "./curve-look.css";
import type { Curve } from "./curve-data";
import { drawCurve } from "./curve-draw";
import { curveWords } from "./curve-words";
import { h, setAttribute } from "./h";
import { labels } from "./labels";

/** A figure that redraws itself to the room it has; what it shows stands below it in words. */
export interface CurveView {
  element: HTMLElement;
  show(curve: Curve | undefined, more?: readonly HTMLElement[]): void;
}

/** Where the width can't be known, as outside a browser. */
const usualWidth = 480;

let count = 0;

export function curveView(of: string): CurveView {
  const id = `wallfall-curve-${++count}`;
  const plot = h("div", { class: "plot" });
  const words = h("p", { id });
  const more = h("div");
  const element = h("figure", { class: "curve", hidden: true }, plot, h("figcaption", {}, words, more));
  let shown: Curve | undefined;
  const draw = () => {
    if (!shown) return;
    const drawn = drawCurve(shown, plot.clientWidth || usualWidth);
    for (const [name, value] of Object.entries({
      role: "img",
      "aria-label": `${labels.curveOf} ${of}`,
      "aria-describedby": id,
    }))
      setAttribute(drawn, name, value);
    plot.replaceChildren(drawn);
  };
  if (typeof ResizeObserver !== "undefined") new ResizeObserver(draw).observe(plot);
  return {
    element,
    show(curve, details = []) {
      shown = curve;
      element.hidden = curve === undefined;
      words.textContent = curve ? curveWords(curve) : "";
      more.replaceChildren(...details);
      draw();
    },
  };
}
