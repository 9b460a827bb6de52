import {
  BooleanNumber,
  BorderStyleTypes,
  HorizontalAlign,
  invertColorByMatrix,
  VerticalAlign,
  WrapStrategy,
  type IStyleData,
} from "@univerjs/core";

interface Palette {
  ground: string;
  ink: string;
  quiet: string;
  line: string;
  typedInk: string;
  typedGround: string;
}

const light: Palette = {
  ground: "#ffffff",
  ink: "#1d2129",
  quiet: "#565d69",
  line: "#c3a9b8",
  typedInk: "#74174c",
  typedGround: "#faf3f7",
};

const dark: Palette = {
  ground: "#1f2124",
  ink: "#e7e8ea",
  quiet: "#a6acb7",
  line: "#5c4552",
  typedInk: "#eba6cb",
  typedGround: "#2c2129",
};

export type Look =
  "head" | "title" | "about" | "label" | "group" | "band" | Heading | "unit" | "typed" | "calculated" | "words";
type Heading = "heading" | "wordsHeading";

/** How the cells of the opening sheets look. Typed cells have slanted figures and a dotted frame beside their tint. */
export function looksFor(isDark: boolean): Record<Look, IStyleData> {
  const { ground, ink, quiet, line, typedInk, typedGround } = isDark ? inverted(dark) : light;
  const text: IStyleData = { fs: 10, cl: { rgb: ink }, vt: VerticalAlign.MIDDLE };
  const aside: IStyleData = { ...text, cl: { rgb: quiet } };
  const right = { ht: HorizontalAlign.RIGHT };
  const border = (s: BorderStyleTypes, rgb: string) => ({ s, cl: { rgb } });
  const bare = { bg: { rgb: ground } };
  const heading = { ...text, bl: BooleanNumber.TRUE, vt: VerticalAlign.BOTTOM, tb: WrapStrategy.WRAP };
  const dotted = border(BorderStyleTypes.DOTTED, line);
  return {
    head: { ...text, ...bare },
    title: { ...text, ...bare, fs: 14, bl: BooleanNumber.TRUE },
    about: { ...aside, ...bare },
    label: { ...aside, ...bare, ...right },
    group: { ...text, ...bare, bl: BooleanNumber.TRUE },
    band: { ...aside, ...bare, fs: 9, bd: { b: border(BorderStyleTypes.THIN, line) } },
    heading: { ...heading, ...right },
    wordsHeading: heading,
    unit: { ...aside, ...right, fs: 9, bd: { b: border(BorderStyleTypes.MEDIUM, ink) } },
    typed: {
      ...text,
      ...right,
      it: BooleanNumber.TRUE,
      cl: { rgb: typedInk },
      bg: { rgb: typedGround },
      bd: { b: dotted, r: dotted },
    },
    calculated: { ...text, ...right },
    words: text,
  };
}

/** In the dark the grid inverts every colour of a cell; inverted beforehand, ours come out as chosen. */
function inverted(palette: Palette): Palette {
  const entries = Object.entries(palette).map(([name, colour]) => [name, hex(invertColorByMatrix(rgb(colour)))]);
  return Object.fromEntries(entries) as Palette;
}

function rgb(colour: string): [number, number, number] {
  const at = (i: number) => parseInt(colour.slice(i, i + 2), 16);
  return [at(1), at(3), at(5)];
}

function hex(parts: readonly number[]): string {
  const byte = (part: number) => Math.round(Math.min(255, Math.max(0, part)));
  return `#${parts.map((part) => byte(part).toString(16).padStart(2, "0")).join("")}`;
}
