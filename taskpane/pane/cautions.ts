import { h } from "./h";
import { labels } from "./labels";

/** Said once on every page: what a number from a model can never be. */
export function cautions(): HTMLElement {
  return h(
    "section",
    { class: "cautions", "aria-labelledby": "wallfall-cautions" },
    h("h2", { id: "wallfall-cautions" }, labels.cautions),
    h(
      "p",
      {},
      "Plasma walls mean high voltage, RF power, vacuum and hot parts, and each of them can injure or kill. The numbers " +
        "here are estimates within a stated model, never a clearance to touch, open or energise anything. Follow the " +
        "local codes, and leave the work to people licensed and trained for it.",
    ),
  );
}
