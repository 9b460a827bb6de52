import type { Entry } from "../../functions/cells/entry";
import type { Input } from "../../functions/cells/inputs";
import { usualEnds, valuesTyped, type Ends } from "../sweep/offered";
import { fewest, most, spacings, type Spacing } from "../sweep/values";
import { h, type Child } from "./h";
import { unitOf } from "./input-facts";
import { labels } from "./labels";
import { readTyped, typedText, type Cell } from "./typed";

/** What is asked of a sweep, as it was typed. */
export interface SweepDraft {
  swept: number;
  from: string;
  to: string;
  count: string;
  spacing: Spacing;
}

const usualCount = "25";

export function usualDraft(entry: Entry<any>, swept: number, typed: Cell): SweepDraft {
  const { from, to, spacing }: Ends = usualEnds(entry.inputs[swept], typed);
  return { swept, from: typedText(from), to: typedText(to), count: usualCount, spacing };
}

export function draftValues(
  { inputs }: Entry<any>,
  { swept, from, to, count, spacing }: SweepDraft,
): number[] | string {
  const cells = { from: readTyped(from).cell, to: readTyped(to).cell, count: readTyped(count).cell };
  return valuesTyped(inputs[swept], { ...cells, spacing });
}

export interface SweepForm {
  element: HTMLElement;
  draft(): SweepDraft;
}

/** Which input runs, from where to where, and in how many steps. Another input begins with its own usual ends. */
export function sweepForm(
  entry: Entry<any>,
  swept: readonly number[],
  draft: SweepDraft,
  usual: (swept: number) => SweepDraft,
  changed: () => void,
): SweepForm {
  const input = choice(
    "input",
    swept.map((i) => [String(i), entry.inputs[i].name]),
    String(draft.swept),
  );
  const from = text("from", draft.from);
  const to = text("to", draft.to);
  const count = text("count", draft.count);
  const spacing = choice(
    "spacing",
    spacings.map((word) => [word, labels[word]]),
    draft.spacing,
  );
  const units = [h("span", { class: "unit" }), h("span", { class: "unit" })];
  const showUnit = () => units.forEach((unit) => (unit.textContent = sweptUnit(entry.inputs[Number(input.value)])));
  showUnit();
  input.addEventListener("input", () => {
    const next = usual(Number(input.value));
    [from.value, to.value, spacing.value] = [next.from, next.to, next.spacing];
    showUnit();
  });
  const element = h(
    "form",
    { class: "sweep-form", input: changed, submit: (event: Event) => event.preventDefault() },
    field(labels.sweptInput, input),
    field(labels.from, from, units[0]),
    field(labels.to, to, units[1]),
    field(labels.values, count),
    field(labels.steps, spacing),
  );
  return {
    element,
    draft: () => ({
      swept: Number(input.value),
      from: from.value,
      to: to.value,
      count: count.value,
      spacing: spacing.value as Spacing,
    }),
  };
}

function sweptUnit(input: Input): string {
  const unit = input.kind === "ion" ? "u" : unitOf(input);
  return unit === "" ? "" : `, ${unit}`;
}

function field(label: string, control: HTMLElement, unit?: Child): HTMLElement {
  return h("div", { class: "sweep-field" }, h("label", { for: control.id }, label, unit), control);
}

function text(name: string, value: string): HTMLInputElement {
  const control = h("input", { id: `wallfall-sweep-${name}`, type: "text", autocomplete: "off", spellcheck: "false" });
  if (name === "count") Object.assign(control, { inputMode: "numeric", title: `${fewest} to ${most}` });
  control.value = value;
  return control;
}

function choice(name: string, options: [value: string, text: string][], value: string): HTMLSelectElement {
  const control = h(
    "select",
    { id: `wallfall-sweep-${name}` },
    ...options.map(([value, text]) => h("option", { value }, text)),
  );
  control.value = value;
  return control;
}
