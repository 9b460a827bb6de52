import { isTable, type Entry } from "../../functions/cells/entry";
import { frontDoors } from "../../functions/front-doors";
import type { Workbook } from "../workbook/workbook";
import { brokenView } from "./broken";
import { curveOf } from "./curve-data";
import { curveView } from "./curve-view";
import { fieldView, outcomeId, unitChoice, type FieldView } from "./field-view";
import { argumentsOf, exampleTexts, fieldsOf, resultUnit } from "./fields";
import { figureOf } from "./figure-of";
import { figureView } from "./figure-view";
import { formulaProblem, formulaText, type FieldText } from "./formula";
import { h } from "./h";
import { labels } from "./labels";
import { limitsView, verdictLine } from "./limits-view";
import { plainCellsView } from "./plain-cells-view";
import { problemOf, resultView } from "./result-view";
import { section } from "./section";
import { doubts, standings, summary } from "./standing";
import { sweepView } from "./sweep-view";
import { readTyped } from "./typed";
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
  const curve = curveView(entry.name);
  const figure = h("div");
  const write = writeView(workbook);
  const sweep = sweepView(entry, workbook);

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
    const problem = problemOf(result);
    const doubted = doubts(entry, args);
    markFields(entry, views, doubted, problem);
    const sum = summary(standing, [...doubted.keys()]);
    if (unit) unit.hidden = problem !== undefined;
    outcome.replaceChildren(resultView(entry, result, resultUnit(entry, unit?.value ?? "")));
    verdict.replaceChildren(...(sum ? [verdictLine(sum.word, sum.text)] : []));
    const drawn = figureOf(entry, args);
    figure.replaceChildren(...(drawn ? [figureView(drawn)] : []));
    curve.show(curveOf(entry, result));
    const read = typed.map(({ text }) => readTyped(text));
    sweep?.follow(read.slice(0, entry.inputs.length), read[entry.inputs.length] ?? readTyped(""));
    const formula = formulaText(entry.name, typed);
    write.offer(formula, formulaProblem(formula, typed));
  };
  const plain = plainCellsView(entry, workbook, () => argumentsOf(texts()));
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
  const shown = h(
    "section",
    { class: "result" },
    h("h3", {}, labels.result),
    curve.element,
    h("div", { class: "outcome" }, outcome, unit && h("label", { class: "unseen", for: unit.id }, labels.unit), unit),
    verdict,
  );
  form.addEventListener("focusin", ({ target }) => clear(target as HTMLElement, shown));
  return [
    ...(views.length > 0 ? [section(labels.inputs, form, figure)] : []),
    shown,
    write.element,
    ...(plain ? [plain] : []),
    ...(sweep ? [sweep.element] : []),
  ];
}

/** The result stays in sight below the inputs, but never over the one that has the focus. */
function clear(control: HTMLElement, result: HTMLElement): void {
  const covered = control.getBoundingClientRect().bottom > result.getBoundingClientRect().top;
  if (covered) control.scrollIntoView?.({ block: "center" });
}

/** A message begins with the name of the input it is about: that field is marked. */
function markFields(
  entry: Entry<any>,
  views: readonly FieldView[],
  doubted: ReadonlyMap<string, string>,
  problem: string | undefined,
): void {
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
