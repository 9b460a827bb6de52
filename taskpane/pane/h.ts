/** Elements without a framework and without markup in strings: text stays text wherever it came from. */
export type Child = Node | string | undefined | false;
type Listener = (event: any) => void;
export type Attributes = Record<string, string | number | boolean | Listener | undefined>;

export function h<K extends keyof HTMLElementTagNameMap>(
  tag: K,
  attributes: Attributes = {},
  ...children: Child[]
): HTMLElementTagNameMap[K] {
  return fill(document.createElement(tag), attributes, children);
}

export function svg<K extends keyof SVGElementTagNameMap>(
  tag: K,
  attributes: Attributes = {},
  ...children: Child[]
): SVGElementTagNameMap[K] {
  return fill(document.createElementNS("http://www.w3.org/2000/svg", tag), attributes, children);
}

function fill<E extends Element>(element: E, attributes: Attributes, children: Child[]): E {
  for (const [name, value] of Object.entries(attributes)) {
    if (typeof value === "function") element.addEventListener(name, value);
    else setAttribute(element, name, value);
  }
  element.append(...present(children));
  return element;
}

/** Sets an attribute; undefined and false take it away. */
export function setAttribute(element: Element, name: string, value: string | number | boolean | undefined): void {
  if (value === undefined || value === false) element.removeAttribute(name);
  else element.setAttribute(name, value === true ? "" : String(value));
}

export function present(children: readonly Child[]): (Node | string)[] {
  return children.filter((child) => child !== undefined && child !== false);
}
