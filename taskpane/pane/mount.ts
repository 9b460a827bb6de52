import "../look.css";
import type { Workbook } from "../workbook/workbook";
import { brokenView } from "./broken";
import { findingsView } from "./findings-view";
import { functionsView } from "./functions-view";
import { h, setAttribute } from "./h";
import { head } from "./head";
import { cautions } from "./cautions";
import { labels } from "./labels";
import type { View } from "./view";
import { loadWords, type Words } from "./words";

/** Puts the pane into an element: beside a sheet in the host, beside the trial sheet's grid, or alone on a page. */
export function mountPane(root: HTMLElement, workbook: Workbook): void {
  const place = h("div", { class: "view" });
  root.classList.add("wallfall");
  root.replaceChildren(head(), place, cautions());
  void loadWords()
    .catch((error: unknown) => {
      place.before(
        h(
          "p",
          { class: "problem" },
          `The descriptions could not be loaded (${String(error)}); the functions work all the same.`,
        ),
      );
      return new Map<string, Words>();
    })
    .then((words) => run(place, [functionsView(words, workbook), findingsView(workbook, root)]));
}

/** Shows the view that the address asks for, now and whenever the address changes. */
function run(place: HTMLElement, views: readonly View[]): void {
  const tabs = views.length > 1 ? viewTabs(views) : undefined;
  if (tabs) place.before(tabs);
  let shown: string | undefined;
  const show = () => {
    // A pane mounted anew leaves this one behind.
    if (shown !== undefined && !place.isConnected) return removeEventListener("hashchange", show);
    const address = addressNow();
    const view = views.find((each) => each.opens(address)) ?? views[0];
    place.replaceChildren(guarded(() => view.show(address)));
    tabs?.querySelectorAll("a").forEach((tab, i) => setAttribute(tab, "aria-current", views[i] === view && "page"));
    if (shown !== undefined) arrive(place, shown);
    shown = address;
  };
  addEventListener("hashchange", show);
  show();
}

function viewTabs(views: readonly View[]): HTMLElement {
  return h(
    "nav",
    { class: "tabs", "aria-label": labels.views },
    ...views.map(({ label, home }) => h("a", { href: `#${home}` }, label)),
  );
}

function addressNow(): string {
  try {
    return decodeURIComponent(location.hash.slice(1));
  } catch {
    return "";
  }
}

/** A page that throws shows why in its place, and the way to the others stays. */
function guarded(show: () => HTMLElement): HTMLElement {
  try {
    return show();
  } catch (error) {
    return h("div", {}, h("a", { class: "back", href: "#" }, labels.allFunctions), brokenView(error));
  }
}

/** Keyboard and screen reader follow to the new page's heading, and back to the link they left by. */
function arrive(place: HTMLElement, from: string): void {
  place.scrollIntoView?.({ block: "start" });
  const left = [...place.querySelectorAll<HTMLElement>("a")].find(
    (link) => link.getAttribute("href") === `#${from}` && from !== "",
  );
  (left ?? place.querySelector<HTMLElement>("h2[tabindex], input"))?.focus();
}
