import type { FileStyle } from "../../workbook/xlsx-book";

export type Look = "title" | "note" | "heading" | "unit" | "label" | "typed" | "calculated" | "words";

const line = "#c3a9b8";
const quiet = "#565d69";

/** As in the opening example: what is typed is tinted, slanted and framed; what is calculated is plain. */
const looks: Record<Look, FileStyle> = {
  title: { bold: true, size: 14 },
  note: { colour: quiet },
  heading: { bold: true, across: "right", wrapped: true, down: "bottom" },
  unit: { colour: quiet, across: "right", borders: { bottom: { line: "medium" } } },
  label: { colour: quiet },
  typed: {
    italic: true,
    colour: "#74174c",
    ground: "#faf3f7",
    across: "right",
    borders: { bottom: { line: "dotted", colour: line }, right: { line: "dotted", colour: line } },
  },
  calculated: { across: "right" },
  words: {},
};

/** The styles of all samples, each once, by their place. */
class Places {
  readonly styles: FileStyle[] = [{}];
  private readonly known = new Map<string, number>();

  at(look: Look, format?: string): number {
    const key = `${look} ${format ?? ""}`;
    if (!this.known.has(key)) {
      this.known.set(key, this.styles.length);
      this.styles.push(format ? { ...looks[look], format } : looks[look]);
    }
    return this.known.get(key)!;
  }
}

export const places = new Places();
