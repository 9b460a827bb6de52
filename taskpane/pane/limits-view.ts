import type { Limit } from "../../functions/cells/entry";
import type { Word } from "../../functions/cells/verdict";
import { h, svg } from "./h";
import { labels } from "./labels";
import { numberText } from "./number-text";
import type { Standing } from "./standing";

/** The limits with what each says at the inputs of the moment. */
export function limitsView(standings: readonly Standing[]): HTMLElement {
  if (standings.length === 0) return h("p", {}, "None that its inputs could test.");
  return h("ul", { class: "limits" }, ...standings.map(limitView));
}

function limitView({ limit, verdict }: Standing): HTMLElement {
  if (typeof verdict === "string") {
    const text = verdict === "does not apply" ? labels.doesNotApply : `${labels.notTested}: give the inputs`;
    return item("not tested", text, limit, bounds(limit));
  }
  const { word, value, needs } = verdict;
  const text = word === "not tested" ? `${labels.notTested}: give ${needs}` : word;
  const measured = value === undefined ? bounds(limit) : `is ${numberText(value, 3)}; ${bounds(limit)}`;
  return item(word, text, limit, measured, word === "fails" || word === "marginal" ? limit.reason : undefined);
}

function item(word: Word, text: string, limit: Limit, measured: string, reason?: string): HTMLElement {
  return h(
    "li",
    { class: "limit", "data-verdict": word },
    verdictLine(word, text),
    h(
      "p",
      { class: "assumption" },
      capital(limit.assumption),
      " ",
      h("span", { class: "source" }, `(${limit.source.key})`),
    ),
    h("p", { class: "measure" }, h("span", { class: "symbol" }, limit.measure), ` ${measured}`),
    reason !== undefined && h("p", { class: "reason" }, capital(reason), "."),
  );
}

/** "holds up to 0.1, fails above 0.5": the bounds in the order in which the measure meets them. */
function bounds(limit: Limit): string {
  const [holds, fails] = [numberText(limit.holds, 3), numberText(limit.fails, 3)];
  if (limit.holds === limit.fails) return `holds from ${holds} up, else fails`;
  return limit.holds > limit.fails
    ? `holds from ${holds} up, fails below ${fails}`
    : `holds up to ${holds}, fails above ${fails}`;
}

/** A verdict in words with its mark. */
export function verdictLine(word: Word, text: string): HTMLElement {
  return h("p", { class: "verdict" }, mark(word), " ", h("span", {}, text));
}

/**
 * The wall and what comes towards it: it stops short where a limit holds, touches where it is marginal, and goes through
 * where it fails; where nothing is known there is only the wall. The word always stands beside it.
 */
export function mark(word: Word): SVGElement {
  return svg(
    "svg",
    { class: "mark", viewBox: "0 0 28 14", "aria-hidden": "true" },
    ...strokes[word].map((d) => svg("path", { d })),
  );
}

const wall = "M20 0V14";
const strokes: Record<Word, string[]> = {
  holds: [wall, "M0 7H12"],
  marginal: [wall, "M0 7H19"],
  fails: ["M20 0V3.5M20 10.5V14", "M0 7H28M24 3.5L28 7L24 10.5"],
  "not tested": [wall],
};

function capital(text: string): string {
  // Symbols such as λ_i keep their case: only a plain word is capitalised.
  return /^[a-z]+(?=[\s,-])/.test(text) ? text[0].toUpperCase() + text.slice(1) : text;
}
