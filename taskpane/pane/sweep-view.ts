import "./sweep-look.css";
import type { Entry } from "../../functions/cells/entry";
import { sweptInputs } from "../sweep/offered";
import { runSweep } from "../sweep/run";
import type { Stretch } from "../sweep/stretches";
import type { Sweep } from "../sweep/table";
import type { Workbook } from "../workbook/workbook";
import type { Curve } from "./curve-data";
import { curveView } from "./curve-view";
import { quantity } from "./curve-unit";
import { h } from "./h";
import { labels } from "./labels";
import { mark } from "./limits-view";
import { draftValues, sweepForm, usualDraft, type SweepDraft } from "./sweep-form";
import { copySweep, writeSweep } from "./sweep-write";
import type { Typed } from "./typed";
import { answered } from "./write-view";

/** The part of a page that runs one input through many values. */
export interface SweepView {
  element: HTMLElement;
  /** Takes over what stands in the page's own form. */
  follow(typed: readonly Typed[], unit: Typed): void;
}

/** What was typed for each function's sweep, and whether it stands open, while the pane lives. */
const drafts = new Map<string, { draft?: SweepDraft; open: boolean }>();

/** Undefined for a function that nothing can be swept of. */
export function sweepView(entry: Entry<any>, workbook: Workbook): SweepView | undefined {
  const swept = sweptInputs(entry);
  if (swept.length === 0) return undefined;
  const kept = drafts.get(entry.name) ?? { open: false };
  drafts.set(entry.name, kept);
  const canWrite = workbook.capabilities.has("write");
  let form: ReturnType<typeof sweepForm> | undefined;
  let values: { typed: readonly Typed[]; unit: Typed } | undefined;
  let ready: Sweep | undefined;
  const preview = curveView(`${entry.name} ${labels.overSweep}`);
  const problem = h("p", { class: "problem", role: "status", hidden: true });
  const said = h("p", { class: "said", role: "status" });
  const press = async () => {
    if (!ready || !kept.draft) return;
    said.textContent = await answered(canWrite ? writeSweep(workbook, ready, kept.draft.spacing) : copySweep(ready));
  };
  const button = h("button", { type: "button", click: press }, canWrite ? labels.writeTable : labels.copyTable);

  const update = () => {
    if (!values || !form || !element.open) return;
    const draft = (kept.draft = form.draft());
    const outcome = sweepOf(entry, draft, values);
    said.textContent = "";
    ready = typeof outcome === "string" ? undefined : outcome.sweep;
    problem.hidden = typeof outcome !== "string";
    problem.textContent = typeof outcome === "string" ? outcome : "";
    button.disabled = typeof outcome === "string";
    if (typeof outcome === "string") preview.show(undefined);
    else preview.show(outcome.curve, stretchList(outcome.curve));
  };
  const open = () => {
    kept.open = element.open;
    if (!values || !element.open) return;
    const usual = (i: number) => usualDraft(entry, i, values!.typed[i].cell);
    if (!form) {
      form = sweepForm(entry, swept, kept.draft ?? usual(swept[0]), usual, update);
      body.replaceChildren(form.element, problem, preview.element, button, said);
    }
    update();
  };
  const body = h("div");
  const element = h(
    "details",
    { class: "sweep", open: kept.open, toggle: open },
    h("summary", {}, h("h3", {}, labels.sweep)),
    body,
  );
  return {
    element,
    follow(typed, unit) {
      values = { typed, unit };
      open();
    },
  };
}

function sweepOf(
  entry: Entry<any>,
  draft: SweepDraft,
  form: { typed: readonly Typed[]; unit: Typed },
): { sweep: Sweep; curve: Curve } | string {
  const values = draftValues(entry, draft);
  if (typeof values === "string") return values;
  const sweep: Sweep = { entry, swept: draft.swept, values, ...form };
  const curve = runSweep(sweep, draft.spacing);
  return typeof curve === "string" ? curve : { sweep, curve };
}

/** The stretches of the preview in words, each under the mark of its verdict. */
function stretchList({ x, stretches = [] }: Curve): HTMLElement[] {
  const told = stretches.filter(({ word, reason }) => word !== "not tested" || reason !== "");
  if (told.length === 0) return [];
  const range = ({ first, last }: Stretch) =>
    first === last
      ? `at ${quantity(x.values[first], x.unit)}`
      : `${quantity(x.values[first], x.unit)} to ${quantity(x.values[last], x.unit)}`;
  const items = told.map((stretch) =>
    h(
      "li",
      {},
      mark(stretch.word === "no value" ? "fails" : stretch.word === "doubtful input" ? "marginal" : stretch.word),
      h("span", {}, h("b", {}, stretch.word), ` ${range(stretch)}`, stretch.reason && `: ${stretch.reason}`),
    ),
  );
  return [h("ul", { class: "stretches" }, ...items)];
}
