import { families } from "../../functions/catalogue";
import { h } from "./h";
import { labels } from "./labels";
import { search } from "./search";
import { firstSentence, type Words } from "./words";

/** All functions by family, and the search over them. */
export function functionList(
  words: ReadonlyMap<string, Words>,
  query: string,
  remember: (query: string) => void,
): HTMLElement {
  const found = h("div", { class: "found" });
  const count = h("p", { class: "count", role: "status" });
  const field = h("input", {
    id: "wallfall-search",
    type: "search",
    autocomplete: "off",
    spellcheck: "false",
    "aria-describedby": "wallfall-search-hint",
  });
  field.value = query;
  const show = () => {
    remember(field.value);
    const wanted = field.value.trim();
    const matches = search(searchables(words), wanted);
    count.textContent = wanted === "" ? "" : countText(matches.length, wanted);
    found.replaceChildren(
      ...(wanted === ""
        ? byFamily(words)
        : [
            list(
              matches.map(({ name }) => name),
              words,
            ),
          ]),
    );
  };
  field.addEventListener("input", show);
  show();
  return h(
    "div",
    { class: "catalogue", keydown: (event: KeyboardEvent) => steer(event, field) },
    h(
      "div",
      { class: "search", role: "search" },
      h("label", { for: field.id }, labels.search),
      field,
      h("p", { class: "hint", id: "wallfall-search-hint" }, labels.searchHint),
    ),
    count,
    found,
  );
}

function searchables(words: ReadonlyMap<string, Words>) {
  return families.flatMap(({ title, entries }) =>
    entries.map(({ name }) => ({ name, family: title, words: words.get(name) })),
  );
}

function byFamily(words: ReadonlyMap<string, Words>): HTMLElement[] {
  return families.map(({ title, entries }) =>
    h(
      "section",
      {},
      h("h2", {}, title),
      list(
        entries.map(({ name }) => name),
        words,
      ),
    ),
  );
}

function list(names: readonly string[], words: ReadonlyMap<string, Words>): HTMLElement {
  return h("ul", { class: "functions" }, ...names.map((name) => h("li", {}, link(name, words.get(name)))));
}

function link(name: string, words: Words | undefined): HTMLElement {
  return h("a", { href: `#${name}` }, h("b", {}, name), " ", h("span", {}, firstSentence(words?.meaning ?? "")));
}

function countText(count: number, query: string): string {
  if (count === 0) return `No function has “${query}” in its name, meaning or inputs.`;
  return count === 1 ? "1 function" : `${count} functions`;
}

/** Down and up go through the list, Enter in the search opens the first, Escape clears it. */
function steer(event: KeyboardEvent, field: HTMLInputElement): void {
  const links = [...(event.currentTarget as HTMLElement).querySelectorAll<HTMLAnchorElement>(".functions a")];
  const at = links.indexOf(document.activeElement as HTMLAnchorElement);
  const inField = document.activeElement === field;
  const next =
    event.key === "ArrowDown"
      ? links[at + 1]
      : event.key === "ArrowUp" && !inField
        ? (links[at - 1] ?? field)
        : undefined;
  if (next) {
    next.focus();
    event.preventDefault();
  } else if (inField && event.key === "Enter" && links.length > 0) {
    links[0].click();
  } else if (inField && event.key === "Escape" && field.value !== "") {
    field.value = "";
    field.dispatchEvent(new Event("input"));
    event.preventDefault();
  }
}
