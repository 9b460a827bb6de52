/** One element of a small XML part. Prefixes of element names are dropped; those of attributes stay ("r:id"). */
export interface Element {
  name: string;
  attributes: Readonly<Record<string, string>>;
  children: Element[];
  /** The text directly inside. */
  text: string;
}

const tokens =
  /<!--[\s\S]*?-->|<\?[\s\S]*?\?>|<!\[CDATA\[([\s\S]*?)\]\]>|<(\/?)(?:[\w.-]+:)?([\w.-]+)([^>]*?)(\/?)>|([^<]+)/g;

/** Enough of XML for the parts of a workbook file; its sheets' cells are read by quicker means. */
export function parseXml(xml: string): Element {
  const root: Element = { name: "", attributes: {}, children: [], text: "" };
  const open = [root];
  for (const [, cdata, closes, name, attributes, isEmpty, text] of xml.matchAll(tokens)) {
    const inside = open.at(-1)!;
    if (cdata !== undefined) inside.text += cdata;
    else if (text !== undefined) inside.text += unescapeXml(text);
    else if (closes) {
      if (open.length > 1) open.pop();
    } else if (name) {
      const element: Element = { name, attributes: attributesOf(attributes), children: [], text: "" };
      inside.children.push(element);
      if (!isEmpty) open.push(element);
    }
  }
  return root.children[0] ?? root;
}

export function attributesOf(text: string): Record<string, string> {
  const found: Record<string, string> = {};
  for (const [, name, double, single] of text.matchAll(/([\w:.-]+)\s*=\s*(?:"([^"]*)"|'([^']*)')/g))
    found[name] = unescapeXml(double ?? single);
  return found;
}

export function child(element: Element | undefined, name: string): Element | undefined {
  return element?.children.find((each) => each.name === name);
}

export function childrenOf(element: Element | undefined, name: string): Element[] {
  return element?.children.filter((each) => each.name === name) ?? [];
}

const named: Record<string, string> = { amp: "&", lt: "<", gt: ">", quot: '"', apos: "'" };

export function unescapeXml(text: string): string {
  if (!text.includes("&")) return text;
  return text.replace(/&(?:#x([\da-f]+)|#(\d+)|(\w+));/gi, (whole, hex, decimal, name) =>
    name ? (named[name] ?? whole) : String.fromCodePoint(hex ? parseInt(hex, 16) : Number(decimal)),
  );
}

const marks: Record<string, string> = {
  "&": "&amp;",
  "<": "&lt;",
  ">": "&gt;",
  '"': "&quot;",
  "\n": "&#10;",
  "\r": "&#13;",
  "\t": "&#9;",
};

export function escapeXml(text: string): string {
  // eslint-disable-next-line no-control-regex -- XML has no way to write these.
  return text.replace(/[\x00-\x08\x0b\x0c\x0e-\x1f]/g, "").replace(/[&<>"\n\r\t]/g, (mark) => marks[mark]);
}

/** `<name a="1">inside</name>`; attributes that are undefined are left out. */
export function tag(name: string, attributes: Record<string, string | number | undefined>, inside = ""): string {
  const written = Object.entries(attributes)
    .filter(([, value]) => value !== undefined)
    .map(([key, value]) => ` ${key}="${escapeXml(String(value))}"`)
    .join("");
  return inside ? `<${name}${written}>${inside}</${name}>` : `<${name}${written}/>`;
}
