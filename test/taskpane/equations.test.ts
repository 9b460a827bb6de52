import { DOMParser } from "@xmldom/xmldom";
import { describe, expect, test } from "vitest";
import { catalogue } from "../../functions/catalogue";
import { equations } from "../../taskpane/equations";

describe.each(catalogue.filter(({ equation }) => equation !== "").map(({ name }) => name))("%s", (name) => {
  const mathml = equations[name];

  test("its equation is MathML that an XML parser reads, without styles of its own", () => {
    const read = new DOMParser({
      onError: (level, message) => {
        throw new Error(`${level}: ${message}`);
      },
    }).parseFromString(`<div>${mathml}</div>`, "text/xml");
    expect(read.getElementsByTagName("math").length).toBeGreaterThan(0);
    expect(read.getElementsByTagName("merror").length).toBe(0);
    expect(mathml).not.toMatch(/\sstyle=/);
  });

  test("no line of it is a torn piece: brackets close where they open", () => {
    for (const [line] of mathml.matchAll(/<math.*?<\/math>/gs)) {
      const text = line.replace(/<[^>]*>/g, "");
      expect(text.split("(").length, text).toBe(text.split(")").length);
      expect(text.trim()).not.toBe("");
    }
  });
});
