/** Names for what the grid leaves nameless, and its canvases out of the order of the Tab key: they lead nowhere. */
export function keepPartsNamed(container: HTMLElement): void {
  // Parts come late, and some only for a while.
  new MutationObserver(() => nameParts(container)).observe(container, { childList: true, subtree: true });
}

function nameParts(container: HTMLElement): void {
  const all = (selector: string) => [...container.querySelectorAll(selector)];
  set(all("input[type=text]"), { "aria-label": "Address of the selected cell" });
  set(all("a[aria-haspopup=dialog]"), { role: "button", "aria-label": "Defined names" });
  set(
    all("button:not([aria-label])").filter((button) => !button.textContent?.trim()),
    { "aria-label": "Taller formula bar" },
  );
  set(all("canvas"), { tabindex: "-1" });
  all("section[aria-live]").forEach((section, i) => set([section], { "aria-label": `Notices ${i + 1}` }));
}

function set(elements: readonly Element[], attributes: Record<string, string>): void {
  for (const element of elements)
    for (const [name, value] of Object.entries(attributes)) element.setAttribute(name, value);
}
