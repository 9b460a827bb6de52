import { format, prettyUnit } from "../../functions/cells/format";
import type { Input } from "../../functions/cells/inputs";
import { labels } from "./labels";

/** What an entry knows of an input that its description does not say: "above 0", "0 to 1; blank: 0.607". */
export function inputFacts(input: Input): string {
  return [rangeOf(input), blankOf(input)].filter((fact) => fact !== undefined).join("; ");
}

export function unitOf(input: Input): string {
  if (input.kind === "ion") return "";
  return prettyUnit(input.quantity?.unit ?? "");
}

function rangeOf({ kind, quantity, least, most }: Input): string | undefined {
  if (kind !== "quantity" || !quantity) return undefined;
  const open = most >= Number.MAX_VALUE;
  if (least <= -Number.MAX_VALUE) return open ? undefined : `at most ${format(most)}`;
  if (least === Number.MIN_VALUE) return open ? "above 0" : `above 0, at most ${format(most)}`;
  return open ? `${format(least)} or more` : `${format(least)} to ${format(most)}`;
}

function blankOf({ optional, blank, quantity }: Input): string | undefined {
  if (!optional || blank === undefined) return undefined;
  if (typeof blank === "number") {
    const unit = Number.isFinite(blank) && quantity?.unit ? ` ${prettyUnit(quantity.unit)}` : "";
    return `${labels.blank}: ${format(blank)}${unit}`;
  }
  if (typeof blank === "string") return `${labels.blank}: ${blank}`;
  if (typeof blank === "boolean") return `${labels.blank}: ${blank ? "TRUE" : "FALSE"}`;
  return undefined;
}
