import "./figure-look.css";
import type { Figure } from "./figure-of";
import { h } from "./h";

/** A figure as the page shows it. Its words are its name, so that they are not read twice. */
export function figureView({ words, drawing }: Figure): HTMLElement {
  drawing.setAttribute("role", "img");
  drawing.setAttribute("aria-label", words);
  return h("figure", { class: "drawing" }, drawing, h("figcaption", { "aria-hidden": "true" }, words));
}
