import { bringBack, isUntouched, keepAsValues, type Kept } from "../findings/keep";
import type { Fill } from "../findings/fill";
import { counted } from "../findings/words";
import type { Found, Source } from "./findings-found";
import { placesView } from "./findings-places";
import { h } from "./h";
import { labels } from "./labels";

/** Results that become values and remember their formulas, and the way back. */
export function keepView(found: Found, lookAgain: (source: Source) => void): HTMLElement {
  const said = h("p", { class: "said", role: "status" });
  const again = () => lookAgain({ workbook: found.workbook });
  const attempt = async (act: () => Promise<string | undefined>) => {
    try {
      const problem = await act();
      if (problem === undefined) again();
      else said.textContent = problem;
    } catch (error) {
      said.textContent = `That did not work: ${error instanceof Error ? error.message : String(error)}`;
    }
  };
  return h(
    "details",
    { class: "keep", open: found.kept.length > 0 },
    h("summary", {}, labels.keepAsValues),
    h(
      "p",
      { class: "hint" },
      "The results stay as plain values for readers without the add-in; the workbook remembers the formulas, and they can be brought back as they were.",
    ),
    found.kept.length > 0 && keptList(found, attempt),
    found.look.fills.length > 0 && chooseFills(found, attempt),
    said,
  );
}

type Attempt = (act: () => Promise<string | undefined>) => Promise<void>;

function chooseFills(found: Found, attempt: Attempt): HTMLElement {
  const boxes = found.look.fills.map((fill, i): [Fill, HTMLInputElement, HTMLElement] => {
    const box = h("input", { type: "checkbox", id: `wallfall-keep-${i}` });
    const words = `${fill.range} on ${fill.sheet}: ${[...new Set(fill.calls)].join(", ")}`;
    return [fill, box, h("li", {}, box, h("label", { for: box.id }, words))];
  });
  const keep = async () => {
    const chosen = boxes.filter(([, box]) => box.checked).map(([fill]) => fill);
    if (chosen.length === 0) return "Choose first which results become values.";
    await keepAsValues(found.workbook, found.look.book, chosen);
    return undefined;
  };
  return h(
    "div",
    {},
    h("ul", { class: "choices", "aria-label": labels.results }, ...boxes.map(([, , line]) => line)),
    h("button", { type: "button", class: "quiet", click: () => void attempt(keep) }, labels.keepChosen),
  );
}

function keptList(found: Found, attempt: Attempt): HTMLElement {
  const lines = found.kept.map((kept) => {
    let warned = false;
    const back = async () => {
      const content = await found.workbook.read();
      if (!warned && !isUntouched(content, kept)) {
        warned = true;
        return `${kept.cells} on ${kept.sheet} no longer holds what was kept: somebody has changed it, or rows have moved. Press again to put the formulas there all the same.`;
      }
      await bringBack(found.workbook, kept);
      return undefined;
    };
    return h(
      "li",
      { class: "finding" },
      h(
        "p",
        { class: "where" },
        ...placesView(found.workbook, kept.sheet, kept.cells),
        h("span", { class: "on" }, ` on ${kept.sheet}, ${kept.functions}, as values`),
      ),
      h(
        "button",
        { type: "button", class: "quiet", "aria-label": labelOf(kept), click: () => void attempt(back) },
        labels.bringBack,
      ),
    );
  });
  return h("ul", { class: "found-list", "aria-label": counted(found.kept.length, "kept result") }, ...lines);
}

function labelOf({ sheet, cells }: Kept): string {
  return `${labels.bringBack}: ${cells} on ${sheet}`;
}
