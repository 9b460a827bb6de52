import type { Finding } from "../findings/finding";
import type { Accept } from "./findings-list";
import { h } from "./h";
import { labels } from "./labels";

/** The button that accepts a finding, and the reason that it asks for; or the one that opens it again. */
export function acceptView(finding: Finding, isAccepted: boolean, accept: Accept): HTMLElement {
  const place = h("div", { class: "accept" });
  const said = h("p", { class: "said", role: "status" });
  const attempt = async (reason: string | undefined) => {
    try {
      await accept(finding, reason);
    } catch (error) {
      said.textContent = `That did not work: ${error instanceof Error ? error.message : String(error)}`;
    }
  };
  const closed = () =>
    h(
      "button",
      {
        type: "button",
        class: "quiet",
        "aria-label": `${isAccepted ? labels.openAgain : labels.accept}: ${finding.what}, ${finding.cells}`,
        click: () => (isAccepted ? void attempt(undefined) : ask()),
      },
      isAccepted ? labels.openAgain : `${labels.accept}…`,
    );
  const close = () => {
    const button = closed();
    place.replaceChildren(button, said);
    button.focus();
  };
  const ask = () => {
    const id = `wallfall-reason-${finding.key}`;
    const reason = h("input", { id, type: "text", autocomplete: "off" });
    const submit = (event: Event) => {
      event.preventDefault();
      const typed = reason.value.trim();
      if (typed === "") {
        reason.setAttribute("aria-invalid", "true");
        said.textContent = "Say why it may stand: the next reader will ask.";
        reason.focus();
      } else void attempt(typed);
    };
    const form = h(
      "form",
      { submit, keydown: (event: KeyboardEvent) => event.key === "Escape" && close() },
      h("label", { for: id }, labels.reason),
      reason,
      h(
        "div",
        { class: "buttons" },
        h("button", { type: "submit" }, labels.accept),
        h("button", { type: "button", class: "quiet", click: close }, labels.cancel),
      ),
    );
    place.replaceChildren(form, said);
    reason.focus();
  };
  place.replaceChildren(closed(), said);
  return place;
}
