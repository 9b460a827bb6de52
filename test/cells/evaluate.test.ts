import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { entry } from "../../functions/cells/entry";
import { evaluate } from "../../functions/cells/evaluate";
import { Fault, noSolution } from "../../functions/cells/fault";
import { optional, quantityInput, wordInput } from "../../functions/cells/inputs";
import { quantities } from "../../functions/cells/quantities";
import { CP } from "../../functions/sources";

const facts = { equation: "", sources: [CP], changes: {}, example: [], accuracy: "" };

/** n·V, so that each cell of a result tells which cells it came from; no solution at 13 V. */
const product = entry("PRODUCT", {
  ...facts,
  inputs: [
    quantityInput("n", quantities.density),
    quantityInput("V", quantities.voltage),
    optional(quantityInput("a", quantities.length), 1),
  ],
  result: quantities.length,
  compute: (n, V, a) => (V === 13 ? noSolution("Nothing at 13 V.") : n * V * a),
});
const on = (...args: unknown[]) => evaluate(product, args);
const messages = (result: unknown[][]) => result.flat().map((cell) => (cell as Fault).message ?? cell);

describe("ranges broadcast", () => {
  test("a single cell gives a single cell", () => expect(on([[2]], [[3]])).toEqual([[6]]));
  test("a lone value counts as a cell", () => expect(on(2, 3)).toEqual([[6]]));
  test("a column with a single cell gives a column", () => expect(on([[2], [3]], [[5]])).toEqual([[10], [15]]));
  test("a row with a single cell gives a row", () => expect(on([[2, 3]], [[5]])).toEqual([[10, 15]]));
  test("a column with a row gives a table", () => {
    expect(on([[2], [3]], [[5, 7, 11]])).toEqual([
      [10, 14, 22],
      [15, 21, 33],
    ]);
  });
  test("equal shapes go element by element", () => {
    expect(
      on(
        [
          [2, 3],
          [4, 5],
        ],
        [
          [6, 7],
          [8, 9],
        ],
      ),
    ).toEqual([
      [12, 21],
      [32, 45],
    ]);
  });
  test("a table with a column repeats the column", () => {
    expect(
      on(
        [
          [2, 3],
          [4, 5],
        ],
        [[10], [100]],
      ),
    ).toEqual([
      [20, 30],
      [400, 500],
    ]);
  });
  test("other shapes are refused with both in the message", () => {
    const [[cell]] = on([[1], [2], [3]], [[1], [2]]);
    expect((cell as Fault).message).toMatch(
      /^V: a range of 2 rows by 1 column does not match n of 3 rows by 1 column; select/,
    );
  });
  test("broadcasting equals calling cell by cell", () => {
    const number = fc.double({ min: 1e-3, max: 1e3, noNaN: true });
    fc.assert(
      fc.property(
        fc.array(number, { minLength: 1, maxLength: 6 }),
        fc.array(number, { minLength: 1, maxLength: 6 }),
        (rows, columns) => {
          const table = on(
            rows.map((n) => [n]),
            [columns],
          );
          rows.forEach((n, i) => columns.forEach((V, j) => expect(table[i][j]).toEqual(on([[n]], [[V]])[0][0])));
        },
      ),
    );
  });
});

describe("blanks", () => {
  test.each([[0], [null], [""], ["  "], [undefined]])("%j is a blank density", (blank) => {
    expect(messages(on([[1], [blank]], [[5], [6]]))[1]).toMatch(/^n is blank or 0; type a value such as 1e16 m\^-3/);
  });
  test("zero is a voltage", () => expect(on([[2]], [[0]])).toEqual([[0]]));
  test("a row whose inputs are all blank returns an empty text, not null and not 0", () => {
    expect(on([[2], [null]], [[5], [null]])[1][0]).toBe("");
    expect(on([[2], [0]], [[5], [0]])[1][0]).toBe("");
  });
  test("a cell shared by all rows does not make an empty row half filled", () => {
    expect(on([[2], [null]], [[5]])).toEqual([[10], [""]]);
  });
  test("a single call on blank cells is empty too", () => expect(on([[null]], [[null]])).toEqual([[""]]));
  test("a blank optional argument takes its default", () => {
    for (const blank of [undefined, null, [[null]], [[""]], [[0]]]) expect(on([[2]], [[3]], blank)).toEqual([[6]]);
  });
  test("a blank in an optional column takes its default in that row", () => {
    expect(on([[2], [2]], [[3], [3]], [[5], [null]])).toEqual([[30], [6]]);
  });
});

describe("errors", () => {
  test("one bad row never spoils the rest", () => {
    const result = on([[2], ["OL"], [3]], [[5], [5], [5]]);
    expect([result[0][0], result[2][0]]).toEqual([10, 15]);
    expect((result[1][0] as Fault).code).toBe("#VALUE!");
  });
  test("an incoming error passes through in its own row with its code", () => {
    const result = on([[2], [{ code: "#DIV/0!" }], [3]], [[5], [5], [5]]);
    expect(result[1][0]).toMatchObject({ code: "#DIV/0!" });
    expect([result[0][0], result[2][0]]).toEqual([10, 15]);
  });
  test("an incoming message is kept", () => {
    expect(on([[new Fault("#N/A", "why")]], [[1]])[0][0]).toMatchObject({ code: "#N/A", message: "why" });
  });
  test("errors that the host refuses from a function are told in words", () => {
    expect(on([[{ code: "#REF!" }]], [[1]])[0][0]).toMatchObject({
      code: "#VALUE!",
      message: expect.stringContaining("#REF!"),
    });
  });
  test("where the model has no solution the code is #N/A", () => {
    expect(on([[1], [1]], [[13], [2]])).toEqual([
      [expect.objectContaining({ code: "#N/A", message: "Nothing at 13 V." })],
      [2],
    ]);
  });
  test("neither infinity nor NaN reaches a cell", () => {
    const result = on([[1e308], [1]], [[1e300], [1]]);
    expect(result[0][0]).toMatchObject({ code: "#N/A" });
    expect(result[1][0]).toBe(1);
  });
  test("a bug in one row stays there and says so", () => {
    const fragile = entry("FRAGILE", {
      ...facts,
      inputs: [quantityInput("n", quantities.density)],
      result: quantities.number,
      compute: (n) => {
        if (n === 2) throw new Error("oops");
        return n;
      },
    });
    const result = evaluate(fragile, [[[1], [2], [3]]]);
    expect([result[0][0], result[2][0]]).toEqual([1, 3]);
    expect((result[1][0] as Fault).message).toContain("oops");
  });
});

describe("the output unit", () => {
  test("converts the result", () => expect(on([[2]], [[3]], null, [["mm"]])).toEqual([[6000]]));
  test("may differ by row", () => expect(on([[2], [2]], [[3], [3]], null, [["mm"], [null]])).toEqual([[6000], [6]]));
  test("of another dimension is refused by name", () => {
    expect(messages(on([[2]], [[3]], null, [["eV"]]))[0]).toBe(
      'unit: "eV" is a unit of energy; the result is a length, so type a unit such as m.',
    );
  });
  test("that is a number is refused", () =>
    expect(messages(on([[2]], [[3]], null, [[5]]))[0]).toMatch(/^unit: a unit is text/));
});

describe("words", () => {
  const choice = entry("CHOICE", {
    ...facts,
    inputs: [wordInput("shape", ["free", "slab"])],
    result: quantities.number,
    compute: (shape) => (shape === "slab" ? 1 : 2),
  });
  test("in any case", () => expect(evaluate(choice, [[["SLAB"], ["Free "]]])).toEqual([[1], [2]]));
  test("that are unknown are refused with the list", () => {
    expect(messages(evaluate(choice, [[["sphere"]]]))[0]).toBe(
      'shape: "sphere" is not one of its words; type "free" or "slab".',
    );
  });
});

describe("long columns", () => {
  test("keep their rows apart when buffers are used again", () => {
    const column = (from: number) => Array.from({ length: 2000 }, (_, i) => [from + i]);
    const first = on(column(1), [[2]]);
    const again = on(column(5), [[3]]);
    expect(first[1999][0]).toBe(4000);
    expect(again[1999][0]).toBe(3 * 2004);
    expect(first[0][0]).toBe(2);
  });
});
