import { h } from "../../pane/h";
import { samples } from "../samples/list";
import type { Keeping } from "./keeper";
import type { WorkTitle } from "./work-store";

export interface Actions {
  openFile(file: File): void;
  openSample(path: string, title: string): void;
  openExample(): void;
  openEarlier(id: string): void;
  save(): void;
  forget(id: string): Promise<void>;
  earlier(): Promise<(WorkTitle & { isOpen: boolean })[]>;
}

/** The buttons beside the tabs: open, save, and what else there is to open. */
export function makeStrip(actions: Actions): { element: HTMLElement; showKeeping(keeping: Keeping): void } {
  const chooser = h("input", {
    type: "file",
    accept: ".xlsx,.xlsm",
    hidden: true,
    "aria-label": "Workbook to open",
    change: () => {
      const file = chooser.files?.[0];
      // The same file may be chosen again.
      chooser.value = "";
      if (file) actions.openFile(file);
    },
  });
  const state = h("span", { class: "keeping" });
  const list = h("div", { class: "more-list", id: "more" });
  list.hidden = true;
  const more = h(
    "button",
    { type: "button", "aria-expanded": "false", "aria-controls": "more", click: () => void toggle(list.hidden) },
    "Other workbooks",
  );
  const toggle = async (open: boolean) => {
    if (open) list.replaceChildren(...offers(actions, await actions.earlier(), () => void toggle(false)));
    list.hidden = !open;
    more.setAttribute("aria-expanded", String(open));
  };
  const element = h(
    "div",
    { class: "files", role: "group", "aria-label": "Workbooks" },
    state,
    chooser,
    h("button", { type: "button", click: () => chooser.click() }, "Open a workbook"),
    h("button", { type: "button", click: () => actions.save() }, "Save a copy"),
    more,
    list,
  );
  element.addEventListener("keydown", (event) => {
    if (event.key !== "Escape" || list.hidden) return;
    void toggle(false);
    more.focus();
  });
  document.addEventListener("pointerdown", (event) => {
    if (!list.hidden && event.target instanceof Node && !element.contains(event.target)) void toggle(false);
  });
  return { element, showKeeping: (keeping) => showKeeping(state, keeping) };
}

function offers(
  actions: Actions,
  earlier: readonly (WorkTitle & { isOpen: boolean })[],
  close: () => void,
): HTMLElement[] {
  const offer = (words: string, open: () => void) =>
    h(
      "button",
      {
        type: "button",
        click: () => {
          close();
          open();
        },
      },
      words,
    );
  const kept = earlier.map((work) => {
    const forget = h(
      "button",
      {
        type: "button",
        "aria-label": `Forget ${work.title}, ${when(work.changed)}`,
        click: async () => {
          if (!confirm(`Forget “${work.title}” of ${when(work.changed)}? It can't be brought back.`)) return;
          await actions.forget(work.id);
          row.remove();
        },
      },
      "Forget",
    );
    const said = `${work.title}, ${when(work.changed)}`;
    const row = work.isOpen
      ? h("p", {}, `${said}: open in another tab`)
      : h(
          "p",
          {},
          offer(said, () => actions.openEarlier(work.id)),
          forget,
        );
    return row;
  });
  return [
    h("h2", {}, "Samples"),
    ...samples.map(({ file, title }) =>
      h(
        "p",
        {},
        offer(title, () => actions.openSample(`samples/${file}`, title)),
      ),
    ),
    h(
      "p",
      {},
      offer("Opening example", () => actions.openExample()),
    ),
    h("h2", {}, "Kept in this browser"),
    ...(kept.length > 0 ? kept : [h("p", {}, "No earlier work.")]),
  ];
}

function when(time: number): string {
  return new Date(time).toLocaleString(undefined, { dateStyle: "medium", timeStyle: "short" });
}

function showKeeping(place: HTMLElement, keeping: Keeping): void {
  const said: Record<Keeping["is"], string> = {
    untouched: "",
    pending: "Keeping…",
    kept: "Kept in this browser",
    parted: "Another tab stored its own version; both are kept",
    refused: keeping.is === "refused" ? `Not kept: ${keeping.why}. Save a copy.` : "",
  };
  place.textContent = said[keeping.is];
  place.classList.toggle("problem", keeping.is === "refused");
}
