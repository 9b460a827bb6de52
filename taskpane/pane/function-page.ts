import { isTable, type Entry } from "../../functions/cells/entry";
import { frontDoors } from "../../functions/front-doors";
import type { Source } from "../../functions/sources";
import type { Workbook } from "../workbook/workbook";
import { equationView } from "./equation";
import { fieldView, unitChoice, type FieldView } from "./field-view";
import { argumentsOf, fieldsOf, resultUnit, signature } from "./fields";
import { formulaProblem, formulaText, type FieldText } from "./formula";
import { h } from "./h";
import { labels } from "./labels";
import { limitsView, verdictLine } from "./limits-view";
import { problemOf, resultView } from "./result-view";
import { doubts, standings, summary } from "./standing";
import { typedText } from "./typed";
import { breakable } from "./breakable";
import type { Words } from "./words";
import { writeView } from "./write-view";

/** What was typed on each function's page, kept while the pane lives. */
export type Drafts = Map<string, string[]>;

/** All there is to know of one function, and the function itself at the values typed in. */
export function functionPage(
  entry: Entry<any>,
  words: Words | undefined,
  drafts: Drafts,
  workbook: Workbook,
): HTMLElement {
  const limits = h("div");
  const calculation = calculationView(entry, words, drafts, workbook, (next) => limits.replaceChildren(next));
  return h(
    "article",
    { class: "page" },
    h("nav", { "aria-label": "Back" }, h("a", { class: "back", href: "#" }, labels.allFunctions)),
    h("h2", { tabindex: -1 }, entry.name),
    words?.meaning && h("p", { class: "lead" }, words.meaning),
    h("code", { class: "signature" }, ...breakable(signature(entry))),
    section(labels.limits, limits),
    ...calculation,
    ...facts(entry),
  );
}

function section(title: string, ...content: (Node | string | undefined)[]): HTMLElement {
  return h("section", {}, h("h3", {}, title), ...content);
}

/** The form, its result, and the formula that would give the same in a cell; all follow the fields as they change. */
function calculationView(
  entry: Entry<any>,
  words: Words | undefined,
  drafts: Drafts,
  workbook: Workbook,
  showLimits: (limits: HTMLElement) => void,
): HTMLElement[] {
  const fields = fieldsOf(entry, words);
  const draft = drafts.get(entry.name) ?? fields.map((_, i) => typedText(entry.example[i]));
  const views = fields.flatMap(({ input, ...field }, i) =>
    input ? [fieldView({ ...field, input }, draft[i] ?? "")] : [],
  );
  const unit =
    entry.takesUnit && !isTable(entry.result) ? unitChoice(entry.result, draft[views.length] ?? "") : undefined;
  const controls = [...views.map(({ control }) => control), ...(unit ? [unit] : [])];
  const outcome = h("div", { class: "outcome", id: "wallfall-outcome", role: "status" });
  const write = writeView(workbook);

  const texts = (): FieldText[] =>
    fields.map(({ name, input }, i) => ({ name, text: controls[i].value, block: input?.kind === "block" }));
  const update = () => {
    const typed = texts();
    drafts.set(
      entry.name,
      typed.map(({ text }) => text),
    );
    const args = argumentsOf(typed);
    const result = frontDoors[entry.name](...args);
    const standing = standings(entry, args);
    showLimits(limitsView(standing));
    markFields(entry, views, args, problemOf(result));
    const sum = summary(standing);
    outcome.replaceChildren(
      resultView(entry, result, resultUnit(entry, unit?.value ?? "")),
      ...(sum ? [verdictLine(sum.verdict.word, sum.text)] : []),
    );
    const formula = formulaText(entry.name, typed);
    write.offer(formula, formulaProblem(formula, typed));
  };
  const soon = later(() => attempt(update, outcome));
  attempt(update, outcome);

  const unitField = unit && h("div", { class: "unit-choice" }, h("label", { for: unit.id }, labels.unit), unit);
  const form = h(
    "form",
    { input: soon, submit: (event: Event) => event.preventDefault() },
    ...views.map(({ element }) => element),
  );
  unit?.addEventListener("input", soon);
  return [
    ...(views.length > 0 ? [section(labels.inputs, form)] : []),
    h("section", { class: "result" }, h("h3", {}, labels.result), outcome, unitField, write.element),
  ];
}

/** A message begins with the name of the input it is about: that field is marked. */
function markFields(
  entry: Entry<any>,
  views: readonly FieldView[],
  args: readonly unknown[],
  problem: string | undefined,
): void {
  const doubted = doubts(entry, args);
  entry.inputs.forEach(({ name }: { name: string }, i: number) => {
    const refused = problem !== undefined && new RegExp(`^${name}(:| is blank)`).test(problem);
    views[i].mark(doubted.get(name), refused);
  });
}

/** A bug in one function is told in its place; the fields and the rest of the pane stay alive. */
function attempt(act: () => void, place: HTMLElement): void {
  try {
    act();
  } catch (error) {
    place.replaceChildren(h("p", { class: "problem" }, brokenText(error)));
  }
}

export function brokenText(error: unknown): string {
  return `This page is broken here (${error instanceof Error ? error.message : String(error)}). Please report it; the other functions are not affected.`;
}

/** Long enough that a sweep of keystrokes is computed once, short enough to feel live. */
function later(act: () => void): () => void {
  let timer: ReturnType<typeof setTimeout> | undefined;
  return () => {
    clearTimeout(timer);
    timer = setTimeout(act, 80);
  };
}

function facts(entry: Entry<any>): HTMLElement[] {
  const equation = equationView(entry.name);
  return [
    ...(equation ? [section(labels.equation, equation)] : []),
    section(labels.accuracy, h("p", {}, `${entry.accuracy[0].toUpperCase()}${entry.accuracy.slice(1)}.`)),
    section(labels.sources, h("ul", { class: "sources" }, ...sourcesOf(entry).map(sourceView))),
    section(
      labels.changes,
      h(
        "ul",
        { class: "changes" },
        ...Object.entries(entry.changes).map(([version, change]) => h("li", {}, h("b", {}, version), ` ${change}`)),
      ),
    ),
  ];
}

/** Those of the model and those of its limits, each once. */
function sourcesOf(entry: Entry<any>): Source[] {
  return [...new Set([...entry.sources, ...entry.limits.map(({ source }) => source)])];
}

function sourceView({ key, text }: Source): HTMLElement {
  return h("li", {}, h("b", {}, key), ` ${text}`);
}
