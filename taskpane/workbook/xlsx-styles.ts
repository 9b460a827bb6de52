import { lines, type FileStyle, type Line, type Side } from "./xlsx-book";
import { child, childrenOf, parseXml, tag, type Element } from "./xml";

const main = "http://schemas.openxmlformats.org/spreadsheetml/2006/main";
const sides = ["left", "right", "top", "bottom"] as const;

/** Number formats by their fixed numbers, ECMA-376 part 1, 18.8.30; the dates are those of an English reader. */
const fixedFormats: Record<number, string> = {
  1: "0",
  2: "0.00",
  3: "#,##0",
  4: "#,##0.00",
  9: "0%",
  10: "0.00%",
  11: "0.00E+00",
  12: "# ?/?",
  13: "# ??/??",
  14: "m/d/yyyy",
  15: "d-mmm-yy",
  16: "d-mmm",
  17: "mmm-yy",
  18: "h:mm AM/PM",
  19: "h:mm:ss AM/PM",
  20: "h:mm",
  21: "h:mm:ss",
  22: "m/d/yyyy h:mm",
  37: "#,##0 ;(#,##0)",
  38: "#,##0 ;[Red](#,##0)",
  39: "#,##0.00;(#,##0.00)",
  40: "#,##0.00;[Red](#,##0.00)",
  45: "mm:ss",
  46: "[h]:mm:ss",
  47: "mm:ss.0",
  48: "##0.0E+0",
  49: "@",
};

/** styles.xml for the styles of a book. */
export function stylesXml(styles: readonly FileStyle[]): string {
  const formats = new Pool(
    Object.fromEntries(Object.entries(fixedFormats).map(([id, code]) => [code, Number(id)])),
    164,
  );
  const fonts = new Pool({ [fontXml({})]: 0 }, 1);
  const fills = new Pool({ [fillXml("none")]: 0, [fillXml("gray125")]: 1 }, 2);
  const borders = new Pool({ [borderXml({})]: 0 }, 1);
  const formatsOf = styles.map((style) => {
    const { format, ground, across, down, wrapped } = style;
    const horizontal = { horizontal: across, vertical: down, wrapText: wrapped ? 1 : undefined };
    const isAligned = Object.values(horizontal).some((each) => each !== undefined);
    const ids = {
      numFmtId: format === undefined || format === "General" ? 0 : formats.at(format),
      fontId: fonts.at(fontXml(style)),
      fillId: ground ? fills.at(fillXml("solid", ground)) : 0,
      borderId: borders.at(borderXml(style.borders ?? {})),
      xfId: 0,
    };
    const applied = {
      applyNumberFormat: ids.numFmtId ? 1 : undefined,
      applyFont: ids.fontId ? 1 : undefined,
      applyFill: ids.fillId ? 1 : undefined,
      applyBorder: ids.borderId ? 1 : undefined,
      applyAlignment: isAligned ? 1 : undefined,
    };
    return tag("xf", { ...ids, ...applied }, isAligned ? tag("alignment", horizontal) : "");
  });
  const own = formats.added().map(([formatCode, numFmtId]) => tag("numFmt", { numFmtId, formatCode }));
  return tag(
    "styleSheet",
    { xmlns: main },
    (own.length > 0 ? counted("numFmts", own) : "") +
      counted("fonts", fonts.all()) +
      counted("fills", fills.all()) +
      counted("borders", borders.all()) +
      counted("cellStyleXfs", [tag("xf", { numFmtId: 0, fontId: 0, fillId: 0, borderId: 0 })]) +
      counted("cellXfs", formatsOf) +
      counted("cellStyles", [tag("cellStyle", { name: "Normal", xfId: 0, builtinId: 0 })]),
  );
}

function counted(name: string, items: readonly string[]): string {
  return tag(name, { count: items.length }, items.join(""));
}

/** Things by their number, each kept once. */
class Pool {
  private readonly ids: Map<string, number>;
  private readonly known: number;

  constructor(
    known: Record<string, number>,
    private next: number,
  ) {
    this.ids = new Map(Object.entries(known));
    this.known = this.ids.size;
  }

  at(item: string): number {
    if (!this.ids.has(item)) this.ids.set(item, this.next++);
    return this.ids.get(item)!;
  }

  all(): string[] {
    return [...this.ids.keys()];
  }

  added(): [string, number][] {
    return [...this.ids].slice(this.known);
  }
}

function fontXml({ bold, italic, underlined, size = 11, colour, font = "Calibri" }: FileStyle): string {
  return tag(
    "font",
    {},
    (bold ? "<b/>" : "") +
      (italic ? "<i/>" : "") +
      (underlined ? "<u/>" : "") +
      tag("sz", { val: size }) +
      (colour ? tag("color", { rgb: argb(colour) }) : "") +
      tag("name", { val: font }) +
      tag("family", { val: 2 }),
  );
}

function fillXml(patternType: string, ground?: string): string {
  return tag("fill", {}, tag("patternFill", { patternType }, ground ? tag("fgColor", { rgb: argb(ground) }) : ""));
}

function borderXml(borders: NonNullable<FileStyle["borders"]>): string {
  const each = (side: Side) => {
    const border = borders[side];
    if (!border) return `<${side}/>`;
    return tag(side, { style: border.line }, tag("color", border.colour ? { rgb: argb(border.colour) } : { auto: 1 }));
  };
  return tag("border", {}, sides.map(each).join("") + "<diagonal/>");
}

function argb(colour: string): string {
  return `FF${colour.replace("#", "").toUpperCase()}`;
}

/** The styles of a file's cells, by the number that cells give. */
export function readStyles(styles: string | undefined, theme: string | undefined): FileStyle[] {
  if (!styles) return [{}];
  const sheet = parseXml(styles);
  const colours = themeColours(theme);
  const formats = new Map(
    childrenOf(child(sheet, "numFmts"), "numFmt").map(({ attributes }) => [
      Number(attributes.numFmtId),
      attributes.formatCode,
    ]),
  );
  const fonts = childrenOf(child(sheet, "fonts"), "font").map((font, _, [usual]) => readFont(font, usual, colours));
  const fills = childrenOf(child(sheet, "fills"), "fill").map((fill) => readFill(fill, colours));
  const borders = childrenOf(child(sheet, "borders"), "border").map((border) => readBorders(border, colours));
  return childrenOf(child(sheet, "cellXfs"), "xf").map((xf): FileStyle => {
    const { numFmtId, fontId, fillId, borderId } = xf.attributes;
    const id = Number(numFmtId ?? 0);
    const font = fonts[Number(fontId ?? 0)];
    return clean({
      format: formats.get(id) ?? fixedFormats[id],
      ...font,
      ground: fills[Number(fillId ?? 0)],
      borders: borders[Number(borderId ?? 0)],
      ...readAlignment(child(xf, "alignment")),
    });
  });
}

function clean<T extends object>(facts: T): T {
  return Object.fromEntries(Object.entries(facts).filter(([, value]) => value !== undefined)) as T;
}

/** What a font adds to the usual one of the file: its name and size go without saying. */
function readFont(font: Element, usual: Element, colours: readonly string[]): FileStyle {
  const isOn = (name: string) => {
    const found = child(font, name);
    return found && !/^(0|false|none)$/.test(found.attributes.val ?? "") ? true : undefined;
  };
  const valueOf = (of: Element, name: string) => child(of, name)?.attributes.val;
  const unlessUsual = (name: string) =>
    valueOf(font, name) === valueOf(usual, name) ? undefined : valueOf(font, name);
  return {
    bold: isOn("b"),
    italic: isOn("i"),
    underlined: isOn("u"),
    size: Number(unlessUsual("sz")) || undefined,
    font: unlessUsual("name"),
    colour: readColour(child(font, "color"), colours),
  };
}

function readFill(fill: Element, colours: readonly string[]): string | undefined {
  const pattern = child(fill, "patternFill");
  if (!pattern || ["none", "gray125", undefined].includes(pattern.attributes.patternType)) return undefined;
  return readColour(child(pattern, "fgColor"), colours);
}

function readBorders(border: Element, colours: readonly string[]): FileStyle["borders"] {
  const found = sides.flatMap((side) => {
    const edge = child(border, side);
    const line = lines.find((each) => each === edge?.attributes.style) as Line | undefined;
    return line && line !== "none" ? [[side, clean({ line, colour: readColour(child(edge, "color"), colours) })]] : [];
  });
  return found.length > 0 ? (Object.fromEntries(found) as FileStyle["borders"]) : undefined;
}

function readAlignment(alignment: Element | undefined): FileStyle {
  const { horizontal, vertical, wrapText } = alignment?.attributes ?? {};
  return {
    across: (["left", "center", "right"] as const).find((each) => each === horizontal),
    down: (["top", "center", "bottom"] as const).find((each) => each === vertical),
    wrapped: wrapText === "1" || wrapText === "true" ? true : undefined,
  };
}

/** Dark 1 and light 1 change places against the order in which a theme lists them, and so do the second ones. */
function themeColours(theme: string | undefined): string[] {
  const scheme = theme && child(child(parseXml(theme), "themeElements"), "clrScheme");
  const listed = (scheme ? scheme.children : []).map((each) => {
    const colour = each.children[0]?.attributes ?? {};
    return `#${(colour.lastClr ?? colour.val ?? "000000").toLowerCase()}`;
  });
  const [dark1, light1, dark2, light2, ...others] = listed;
  return dark1 ? [light1, dark1, light2, dark2, ...others] : [];
}

function readColour(colour: Element | undefined, theme: readonly string[]): string | undefined {
  const { rgb, theme: place, tint } = colour?.attributes ?? {};
  if (rgb) return `#${rgb.slice(-6).toLowerCase()}`;
  const base = place === undefined ? undefined : theme[Number(place)];
  return base && tinted(base, Number(tint ?? 0));
}

/** Mixed with white, or with black where the tint is negative; ECMA-376 tints the lightness, which is close. */
function tinted(colour: string, tint: number): string {
  const target = tint < 0 ? 0 : 255;
  const mixed = [1, 3, 5].map((at) => {
    const part = parseInt(colour.slice(at, at + 2), 16);
    return Math.round(part + (target - part) * Math.abs(tint));
  });
  return `#${mixed.map((part) => part.toString(16).padStart(2, "0")).join("")}`;
}
