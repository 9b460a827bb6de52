import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { VERDICT } from "../../functions/checks/functions";

const verdict = (...cells: unknown[]) => (VERDICT as (...args: any[]) => any[][])(cells.map((cell) => [cell]))[0][0];
const times = (count: number, cell: unknown) => Array.from({ length: count }, () => cell);

describe("what checks come to", () => {
  test("all that hold are counted, the marginal and doubtful apart", () => {
    expect(verdict(...times(12, "holds"))).toBe("12 hold");
    expect(verdict("holds")).toBe("1 holds");
    expect(verdict(...times(12, "holds"), "marginal: s/λ_i 0.2 (0.1…0.3)")).toBe("12 hold, 1 marginal");
    expect(verdict("holds", "doubtful input: n_e 1e11 m⁻³; cm⁻³ meant?")).toBe("1 holds, 1 doubtful");
    expect(verdict("marginal: x", "marginal")).toBe("2 marginal");
  });

  test("where some fail, their number among those tested and the first reason stand first", () => {
    expect(verdict(...times(10, "holds"), "fails: width: 3.1 against 2.9 ± 0.1", "fails: other")).toBe(
      "2 of 12 fail: width: 3.1 against 2.9 ± 0.1",
    );
    expect(verdict("holds", "fails: too thick", "marginal: x", "not tested: give p")).toBe(
      "1 of 3 fails: too thick; 1 marginal, 1 not tested",
    );
  });

  test("those not tested are counted apart, and are no success", () => {
    expect(verdict("holds", "not tested: give p", "not tested")).toBe("1 holds, 2 not tested");
    expect(verdict("not tested: give p")).toBe("1 not tested");
  });

  test("an error fails, with what is known of it", () => {
    expect(verdict("holds", { code: "#N/A", message: "no solution above 3 V" })).toBe(
      "1 of 2 fails: #N/A no solution above 3 V",
    );
    expect(verdict({ code: "#DIV/0!" })).toBe("1 of 1 fails: #DIV/0!");
    expect(verdict({ code: "#NAME?" })).toBe("1 of 1 fails: #NAME?");
  });

  test("blanks, headings, numbers and other text are passed over", () => {
    expect(verdict("verdict", "", null, 3, true, "holds", "holdsalot", "it fails: really", "Fails to start")).toBe(
      "1 holds",
    );
  });

  test("nothing at all is said to be nothing", () => {
    expect(verdict("", null)).toBe("nothing checked");
    expect(VERDICT()).toEqual([["nothing checked"]]);
    expect(VERDICT([["heading"], [""]])).toEqual([["nothing checked"]]);
  });

  test("ranges of any shape are counted together, spread or in the host's one array", () => {
    const ranges = [[["holds", "holds"]], [["holds"], ["marginal: x"]], null];
    expect(VERDICT(...(ranges as any))).toEqual([["3 hold, 1 marginal"]]);
    expect(VERDICT(ranges as any, { functionName: "VERDICT" } as any)).toEqual([["3 hold, 1 marginal"]]);
  });

  test("a reason over several lines is told whole", () => {
    expect(verdict("fails: one\ntwo")).toBe("1 of 1 fails: one\ntwo");
  });

  test("the counts add up to the checks that went in", () => {
    const check = fc.constantFrom("holds", "marginal: x", "fails: y", "doubtful input: z", "not tested: give p", "", 7);
    fc.assert(
      fc.property(fc.array(check, { maxLength: 40 }), (cells) => {
        const said = String(verdict(...cells, ""));
        const isCheck = cells.filter((cell) => typeof cell === "string" && cell !== "");
        const tested = isCheck.filter((cell) => !String(cell).startsWith("not tested")).length;
        const numbers = [...said.matchAll(/(\d+)(?: of (\d+))?/g)];
        const failing = numbers.find((number) => number[2] !== undefined);
        if (failing) expect(Number(failing[2])).toBe(tested);
        else expect(numbers.reduce((sum, [, count]) => sum + Number(count), 0)).toBe(isCheck.length);
      }),
      { seed: 3 },
    );
  });
});
