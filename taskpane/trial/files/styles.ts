import {
  BooleanNumber,
  HorizontalAlign,
  VerticalAlign,
  WrapStrategy,
  type IStyleData,
  type Nullable,
} from "@univerjs/core";
import { lines, type FileStyle, type Side } from "../../workbook/xlsx-book";

/** How files and grid each say the same looks. */
const across = { left: HorizontalAlign.LEFT, center: HorizontalAlign.CENTER, right: HorizontalAlign.RIGHT };
const down = { top: VerticalAlign.TOP, center: VerticalAlign.MIDDLE, bottom: VerticalAlign.BOTTOM };
const sides = { left: "l", right: "r", top: "t", bottom: "b" } as const;
const sideNames = Object.keys(sides) as Side[];

export function gridStyle(style: FileStyle): IStyleData {
  const { format, bold, italic, underlined, size, font, colour, ground, borders, wrapped } = style;
  const edges = sideNames.flatMap((side) => {
    const border = borders?.[side];
    return border ? [[sides[side], { s: lines.indexOf(border.line), cl: { rgb: border.colour ?? "#000000" } }]] : [];
  });
  return {
    ...(format && { n: { pattern: format } }),
    ...(bold && { bl: BooleanNumber.TRUE }),
    ...(italic && { it: BooleanNumber.TRUE }),
    ...(underlined && { ul: { s: BooleanNumber.TRUE } }),
    ...(size && { fs: size }),
    ...(font && { ff: font }),
    ...(colour && { cl: { rgb: colour } }),
    ...(ground && { bg: { rgb: ground } }),
    ...(edges.length > 0 && { bd: Object.fromEntries(edges) }),
    ...(style.across && { ht: across[style.across] }),
    ...(style.down && { vt: down[style.down] }),
    ...(wrapped && { tb: WrapStrategy.WRAP }),
  };
}

export function fileStyle({ n, bl, it, ul, fs, ff, cl, bg, bd, ht, vt, tb }: IStyleData): FileStyle {
  const borders = sideNames.flatMap((side) => {
    const border = bd?.[sides[side]];
    const colour = hex(border?.cl?.rgb);
    return border?.s ? [[side, { line: lines[border.s], ...(colour && { colour }) }]] : [];
  });
  const [colour, ground] = [hex(cl?.rgb), hex(bg?.rgb)];
  const isAcross = sideOf(across, ht);
  const isDown = sideOf(down, vt);
  return {
    ...(n?.pattern && { format: n.pattern }),
    ...(bl && { bold: true }),
    ...(it && { italic: true }),
    ...(ul?.s && { underlined: true }),
    ...(fs && { size: fs }),
    ...(ff && { font: ff }),
    ...(colour && { colour }),
    ...(ground && { ground }),
    ...(borders.length > 0 && { borders: Object.fromEntries(borders) }),
    ...(isAcross && { across: isAcross }),
    ...(isDown && { down: isDown }),
    ...(tb === WrapStrategy.WRAP && { wrapped: true }),
  };
}

function sideOf<T extends Record<string, number>>(names: T, value: unknown): keyof T | undefined {
  return (Object.keys(names) as (keyof T)[]).find((name) => names[name] === value);
}

/** The grid also keeps colours as "rgb(1, 2, 3)". */
function hex(colour: Nullable<string>): string | undefined {
  if (!colour) return undefined;
  if (/^#[\da-f]{6}$/i.test(colour)) return colour.toLowerCase();
  const parts = /^rgba?\((\d+)[ ,]+(\d+)[ ,]+(\d+)/.exec(colour)?.slice(1);
  return parts && `#${parts.map((part) => Number(part).toString(16).padStart(2, "0")).join("")}`;
}
