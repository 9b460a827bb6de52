import "./findings-look.css";
import { version } from "../../functions/version";
import { accept as acceptFinding, readAccepted } from "../findings/accepted";
import { lookThrough, openFindings } from "../findings/look-through";
import { Cancelled } from "../findings/pace";
import { counted, lookText } from "../findings/words";
import type { Workbook } from "../workbook/workbook";
import { actionsView } from "./findings-actions";
import { acceptFiles, fileChooser, openFile } from "./findings-file";
import type { Found, Source } from "./findings-found";
import { findingsList, overview, type Accept } from "./findings-list";
import { moreOf } from "./findings-more";
import { h } from "./h";
import { labels } from "./labels";
import { today } from "./today";
import type { View } from "./view";

export const findingsHome = "findings";

/** The second view: looks through the whole workbook when asked, and shows what is the matter where. */
export function findingsView(workbook: Workbook, pane: HTMLElement): View {
  const findings = new FindingsView(workbook);
  acceptFiles(pane, (file) => {
    location.hash = findingsHome;
    void findings.lookAt(() => openFile(file));
  });
  return {
    label: labels.findings,
    home: findingsHome,
    opens: (address) => address === findingsHome,
    show: () => findings.element,
  };
}

class FindingsView {
  private readonly said = h("p", { class: "said", role: "status" });
  private readonly place = h("div");
  readonly element: HTMLElement;
  private looking: AbortController | undefined;

  constructor(private readonly workbook: Workbook) {
    this.element = h(
      "article",
      { class: "findings" },
      h("h2", { class: "unseen", tabindex: -1 }, labels.findings),
      this.place,
      this.said,
    );
    this.showStart();
  }

  private get isLive(): boolean {
    return this.workbook.capabilities.has("read");
  }

  private showStart(before?: HTMLElement): void {
    this.place.replaceChildren(
      ...(before ? [before] : []),
      h(
        "p",
        { class: "lead" },
        "Computes every call of these functions again from the cells it reads, and says which results lie outside a limit, " +
          "which inputs are doubtful, and what is stale, broken or typed over. Nothing is changed.",
      ),
      ...this.buttons(),
    );
  }

  private buttons(): HTMLElement[] {
    const chooser = fileChooser((file) => void this.lookAt(() => openFile(file)), !this.isLive);
    const hint = h(
      "p",
      { class: "hint" },
      "An .xlsx file, chosen or dropped on this pane: read here, sent nowhere, never changed.",
    );
    const file = h("div", { class: "saved" }, chooser, hint);
    if (!this.isLive) return [file];
    const press = () => void this.lookAt(async () => ({ workbook: this.workbook }));
    return [h("button", { type: "button", class: "look", click: press }, labels.lookThrough), file];
  }

  /** Looks through what `open` gives, with progress and a way to stop. */
  async lookAt(open: () => Promise<Source>): Promise<void> {
    this.looking?.abort();
    const stop = (this.looking = new AbortController());
    const progress = h("progress", { max: 1, value: 0, "aria-label": labels.looking });
    const cancel = h("button", { type: "button", class: "quiet", click: () => stop.abort() }, labels.stop);
    this.said.textContent = "";
    this.place.replaceChildren(h("div", { class: "looking" }, h("p", {}, labels.looking), progress, cancel));
    cancel.focus();
    try {
      const source = await open();
      const found = await lookThrough(source.workbook, version, (done) => (progress.value = done), stop.signal);
      this.showFound({ ...source, ...found });
    } catch (error) {
      if (this.looking === stop)
        this.showStart(error instanceof Cancelled || stop.signal.aborted ? undefined : problem(error));
      if (stop.signal.aborted) this.said.textContent = "Stopped. Nothing was changed.";
    }
  }

  private showFound(found: Found, focusOn?: string): void {
    const open = openFindings(found);
    const name = found.file?.name;
    const accept: Accept = async (finding, reason) => {
      await acceptFinding(found.workbook, finding, reason, today());
      await this.refresh(found, finding.key);
    };
    this.place.replaceChildren(
      h(
        "p",
        { class: "sum" },
        h("b", {}, open.length === 0 ? "No open findings" : counted(open.length, "open finding")),
        name === undefined ? "" : ` in ${name}`,
      ),
      h("p", { class: "looked" }, lookText(found.look)),
      overview(found) ?? "",
      ...findingsList(found, accept),
      ...moreOf(found),
      actionsView(found, (source) => void this.lookAt(async () => source)),
      h("div", { class: "again" }, ...this.buttons()),
    );
    const item =
      focusOn === undefined ? undefined : this.place.querySelector<HTMLElement>(`[data-key="${focusOn}"] button`);
    (item ?? this.element.querySelector<HTMLElement>("h2"))?.focus();
  }

  /** What was accepted is read again from the workbook, where others may have been at work too. */
  private async refresh(found: Found, key: string): Promise<void> {
    this.showFound({ ...found, accepted: await readAccepted(found.workbook) }, key);
  }
}

function problem(error: unknown): HTMLElement {
  return h("p", { class: "problem", role: "alert" }, error instanceof Error ? error.message : String(error));
}
