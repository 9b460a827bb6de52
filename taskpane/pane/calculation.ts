import { isTable, type Entry } from "../../functions/cells/entry";
import { frontDoors } from "../../functions/front-doors";
import type { Workbook } from "../workbook/workbook";
import { brokenView } from "./broken";
import { fieldView, outcomeId, unitChoice, type FieldView } from "./field-view";
import { argumentsOf, exampleTexts, fieldsOf, resultUnit } from "./fields";
import { formulaProblem, formulaText, type FieldText } from "./formula";
import { h } from "./h";
import { labels } from "./labels";
import { limitsView, verdictLine } from "./limits-view";
import { problemOf, resultView } from "./result-view";
import { section } from "./section";
import { doubts, standings, summary } from "./standing";
import type { Words } from "./words";
import { writeView } from "./write-view";

/** What was typed on each function's page, kept while the pane lives. */
export type Drafts = Map<string, string[]>;

/** The form, its result, and the formula that would give the same in a cell; all follow the fields as they change. */
export function calculationView(
  entry: Entry<any>,
  words: Words | undefined,
  drafts: Drafts,
  workbook: Workbook,
  showLimits: (limits: HTMLElement) => void,
): HTMLElement[] {
  const fields = fieldsOf(entry, words);
  const draft = drafts.get(entry.name) ?? exampleTexts(entry, fields);
  const views = fields.flatMap(({ input, ...field }, i) =>
    input ? [fieldView({ ...field, input }, draft[i] ?? "")] : [],
  );
  const unit =
    entry.takesUnit && !isTable(entry.result) ? unitChoice(entry.result, draft[views.length] ?? "") : undefined;
  const controls = [...views.map(({ control }) => control), ...(unit ? [unit] : [])];
  const outcome = h("div", { id: outcomeId, role: "status" });
  const verdict = h("div", { role: "status" });
  const write = writeView(workbook);

  const texts = (): FieldText[] => fields.map(({ name, takes }, i) => ({ name, text: controls[i].value, takes }));
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
    outcome.replaceChildren(resultView(entry, result, resultUnit(entry, unit?.value ?? "")));
    verdict.replaceChildren(...(sum ? [verdictLine(sum.verdict.word, sum.text)] : []));
    const formula = formulaText(entry.name, typed);
    write.offer(formula, formulaProblem(formula, typed));
  };
  const refresh = () => {
    try {
      update();
    } catch (error) {
      outcome.replaceChildren(brokenView(error));
      verdict.replaceChildren();
    }
  };
  const soon = later(refresh);
  refresh();

  const form = h(
    "form",
    { input: soon, submit: (event: Event) => event.preventDefault() },
    ...views.map(({ element }) => element),
  );
  unit?.addEventListener("input", soon);
  return [
    ...(views.length > 0 ? [section(labels.inputs, form)] : []),
    h(
      "section",
      { class: "result" },
      h("h3", {}, labels.result),
      h("div", { class: "outcome" }, outcome, unit && h("label", { class: "unseen", for: unit.id }, labels.unit), unit),
      verdict,
    ),
    write.element,
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

/** Long enough that a sweep of keystrokes is computed once, short enough to feel live. */
function later(act: () => void): () => void {
  let timer: ReturnType<typeof setTimeout> | undefined;
  return () => {
    clearTimeout(timer);
    timer = setTimeout(act, 80);
  };
}
