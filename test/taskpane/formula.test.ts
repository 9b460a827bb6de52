import { LexerTreeBuilder } from "@univerjs/engine-formula";
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { formulaProblem, formulaText, type FieldText } from "../../taskpane/pane/formula";

const cell = (text: string): FieldText => ({ name: "x", text, takes: "cell" });
const range = (text: string): FieldText => ({ name: "x", text, takes: "range" });
const further = (text: string): FieldText => ({ name: "x", text, takes: "arguments" });
const written = (...fields: FieldText[]) => formulaText("F", fields);

// The literals of a formula as ECMA-376 part 1, 18.17.2 has them (from memory): text in doubled quotes, numbers with a
// decimal point whatever the language, array constants with commas across and semicolons down.
describe("a formula carries its literals as typed", () => {
  test.each([
    ["1e16", "=SHEATH.F(1E16)"],
    ["-1.50E-3", "=SHEATH.F(-1.50E-3)"],
    [".5", "=SHEATH.F(0.5)"],
    ["5.", "=SHEATH.F(5)"],
    ["+3", "=SHEATH.F(3)"],
    ["5 %", "=SHEATH.F(5%)"],
    ["true", "=SHEATH.F(TRUE)"],
    ["Ar+", '=SHEATH.F("Ar+")'],
    ['"Ar+"', '=SHEATH.F("Ar+")'],
    ['"5"', '=SHEATH.F("5")'],
    ['12" wafer', '=SHEATH.F("12"" wafer")'],
    ["1e11 cm^-3", '=SHEATH.F("1e11 cm^-3")'],
    ["=A1", '=SHEATH.F("=A1")'],
    ["1,5", '=SHEATH.F("1,5")'],
    ["−50", '=SHEATH.F("−50")'],
    ["1e999", '=SHEATH.F("1e999")'],
  ])("%s becomes %s", (text, formula) => expect(written(cell(text))).toBe(formula));

  test("a blank argument keeps its place, and blanks at the end go", () => {
    expect(formulaText("DEBYELENGTH", ["1e16", "3", " ", "mm"].map(cell))).toBe('=SHEATH.DEBYELENGTH(1E16,3,,"mm")');
    expect(written(cell("1"), cell(""), cell(""))).toBe("=SHEATH.F(1)");
    expect(written(cell(""))).toBe("=SHEATH.F()");
  });

  test("a range becomes an array constant, a single cell of one does not", () => {
    expect(written(range("Ar+, 0.6\nHe+, 40%"))).toBe('=SHEATH.F({"Ar+",0.6;"He+",0.4})');
    expect(written(range("1\t2\n\n3\t"), cell("4"))).toBe("=SHEATH.F({1,2;3},4)");
    expect(written(range("1,,3"))).toBe('=SHEATH.F({1,"",3})');
    expect(written(range("DEBYELENGTH"))).toBe('=SHEATH.F("DEBYELENGTH")');
  });

  test("further arguments take a line each, and an empty line keeps its place", () => {
    expect(written(cell("A"), further("1e16\n\n3, 4\n"))).toBe('=SHEATH.F("A",1E16,,{3,4})');
    expect(written(further('1, 2; 3, 4\n"a; b"'))).toBe('=SHEATH.F({1,2;3,4},"a; b")');
  });

  test("whatever is typed, a spreadsheet's own lexer reads the arguments back", () => {
    const lexer = new LexerTreeBuilder();
    const text = fc.string({ unit: fc.constantFrom(...'ab1"(),;{} +-=%^!&µ⁻.') });
    fc.assert(
      fc.property(text, (typed) => {
        const plain = typed.trim();
        fc.pre(plain !== "" && !/^[+-]?[\d.]+\s*%?$/.test(plain) && !/^".*"$/s.test(plain));
        const nodes = lexer.sequenceNodesBuilder(written(cell("7"), cell(typed), cell("8"))) ?? [];
        const tokens = nodes.map((node) => (typeof node === "string" ? node : node.token));
        expect(tokens).toEqual(["SHEATH.F", "(", "7", ",", `"${plain}"`, ",", "8", ")"]);
      }),
      { numRuns: 500 },
    );
  });
});

describe("a formula that a sheet would refuse is refused first", () => {
  const problem = (...fields: FieldText[]) => formulaProblem(written(...fields), fields);

  // Limits of the host's cells: 8,192 characters a formula, 255 a text literal (its public specifications, from memory).
  test("text of 255 characters goes in, text of 256 does not", () => {
    expect(problem(cell("a".repeat(255)))).toBeUndefined();
    expect(problem(cell("a".repeat(256)))).toMatch(/^x: text inside a formula has at most 255/);
  });

  test("more than 8,192 characters are too many", () => {
    expect(problem(range("1,".repeat(4000)))).toBeUndefined();
    expect(problem(range("12,".repeat(4000)))).toMatch(/a cell takes 8192/);
  });

  test("lines of different lengths are no range", () => {
    expect(problem(range("1, 2\n3"))).toMatch(/^x: the lines have different numbers/);
    expect(problem(further("1, 2\n3"))).toBeUndefined();
    expect(problem(further("1, 2; 3"))).toMatch(/^x: the lines have different numbers/);
  });
});
