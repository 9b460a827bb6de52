import { prettyUnit } from "../../functions/cells/format";
import type { Input } from "../../functions/cells/inputs";
import type { Quantity } from "../../functions/cells/quantities";
import type { Field } from "./fields";
import { h, setAttribute } from "./h";
import { inputFacts, unitOf } from "./input-facts";
import { labels } from "./labels";
import { unitsOffered } from "./units-offered";

/** A control with its words, and the two things that can be said of what stands in it. */
export interface FieldView {
  element: HTMLElement;
  control: HTMLInputElement | HTMLSelectElement | HTMLTextAreaElement;
  /** Shows why the value is doubted, and whether the function refused it. */
  mark(doubt: string | undefined, refused: boolean): void;
}

/** Where the result and its message stand: a refused field is described by it. */
export const outcomeId = "wallfall-outcome";

type Control = FieldView["control"];

/** How more than one cell is typed into a field. */
const typing: Record<Field["takes"], string> = {
  cell: "",
  range: "a range: commas between cells, a line for each row",
  arguments: "a line for each argument; in a range commas between columns, semicolons between rows",
};

export function fieldView({ name, meaning, takes, input }: Field & { input: Input }, text: string): FieldView {
  const id = `wallfall-input-${name}`;
  const many = takes !== "cell";
  const unit = many ? "" : unitOf(input);
  const facts = [many ? unitOf(input) : "", inputFacts(input), typing[takes]].filter((fact) => fact !== "").join("; ");
  const doubtNote = h("p", { class: "doubt", id: `${id}-doubt`, hidden: true });
  const control = controlFor(input, id, text);
  const element = h(
    "div",
    { class: "field" },
    h(
      "div",
      { class: "naming" },
      h(
        "label",
        { for: id },
        h("span", { class: "symbol" }, name),
        input.optional && h("span", { class: "optional" }, ` ${labels.optional}`),
      ),
      h("p", { class: "meaning", id: `${id}-meaning` }, meaning),
    ),
    h(
      "div",
      { class: "entry" },
      control,
      unit !== "" && h("span", { class: "unit", id: `${id}-unit` }, unit),
      facts !== "" && h("p", { class: "facts", id: `${id}-facts` }, facts),
    ),
    doubtNote,
  );
  const standing = [unit !== "" && `${id}-unit`, `${id}-meaning`, facts !== "" && `${id}-facts`];
  const describe = (...more: (string | false)[]) =>
    control.setAttribute("aria-describedby", [...standing, ...more].filter((each) => each !== false).join(" "));
  describe();
  const mark = (doubt: string | undefined, refused: boolean) => {
    doubtNote.hidden = doubt === undefined;
    doubtNote.textContent = doubt === undefined ? "" : `${labels.doubtfulInput}: ${doubt}`;
    setAttribute(control, "aria-invalid", refused && "true");
    describe(doubt !== undefined && `${id}-doubt`, refused && outcomeId);
  };
  return { element, control, mark };
}

function controlFor(input: Input, id: string, text: string): Control {
  if (input.kind === "words") return choice(id, input.words ?? [], input.optional, text);
  if (input.kind === "flag") return choice(id, ["TRUE", "FALSE"], input.optional, text);
  const plain = { id, spellcheck: "false", autocomplete: "off", autocapitalize: "off" };
  if (input.kind === "block") {
    const area = h("textarea", { ...plain, rows: Math.min(8, text.split("\n").length) });
    area.value = text;
    return area;
  }
  const field = h("input", { ...plain, type: "text" });
  field.value = text;
  return field;
}

function choice(id: string, words: readonly string[], optional: boolean, text: string): HTMLSelectElement {
  const blank = optional || text === "" ? [h("option", { value: "" }, `(${labels.blank})`)] : [];
  const select = h("select", { id }, ...blank, ...words.map((word) => h("option", { value: word }, word)));
  select.value = words.find((word) => word.toLowerCase() === text.toLowerCase()) ?? "";
  return select;
}

/** The unit in which the result is wanted: blank is the function's own. */
export function unitChoice(quantity: Quantity, text: string): HTMLSelectElement {
  const [own, ...others] = unitsOffered(quantity);
  const select = h(
    "select",
    { id: "wallfall-unit" },
    h("option", { value: "" }, prettyUnit(own)),
    ...others.map((unit) => h("option", { value: unit }, prettyUnit(unit))),
  );
  select.value = text;
  return select;
}
