import fc from "fast-check";
import { expect, test } from "vitest";
import { catalogue } from "../../functions/catalogue";
import { argumentsOf, exampleTexts, fieldsOf } from "../../taskpane/pane/fields";
import { readTyped, readTypedArguments, readTypedBlock, typedRows, typedText } from "../../taskpane/pane/typed";

test("a typed number is the number a cell would hold", () => {
  expect(readTyped(" 1e16 ").cell).toBe(1e16);
  expect(readTyped("5%").cell).toBe(0.05);
  expect(readTyped("").cell).toBeNull();
  expect(readTyped("FALSE").cell).toBe(false);
});

test("text with a unit stays text, and quotes make text of anything", () => {
  expect(readTyped("5 mTorr").cell).toBe("5 mTorr");
  expect(readTyped('"5"').cell).toBe("5");
  expect(readTyped('"a ""b"""').cell).toBe('a "b"');
});

test("any cell value comes back from how one would type it", () => {
  const value = fc.oneof(fc.double({ noNaN: true, noDefaultInfinity: true }), fc.boolean(), fc.string());
  fc.assert(
    fc.property(value, (cell) => {
      expect(readTyped(typedText(cell)).cell).toBe(Object.is(cell, -0) ? 0 : cell);
    }),
    { numRuns: 500 },
  );
});

test("any range comes back from how one would type it", () => {
  const cell = fc.oneof(fc.integer(), fc.string({ unit: fc.constantFrom(...'a",; \t\n1') }));
  const width = fc.integer({ min: 1, max: 3 });
  const range = width.chain((n) =>
    fc.array(fc.array(cell, { minLength: n, maxLength: n }), { minLength: 1, maxLength: 3 }),
  );
  fc.assert(
    fc.property(range, (cells) => {
      const values = (typed: { cell: unknown }[][]) => typed.map((row) => row.map((each) => each.cell));
      expect(values(readTypedBlock(typedRows(cells, "\n")))).toEqual(cells);
      expect(readTypedArguments(`1\n${typedRows(cells, "; ")}`).map(values)).toEqual([[[1]], cells]);
    }),
    { numRuns: 500 },
  );
});

test.each(catalogue.map((entry) => [entry.name, entry] as const))(
  "%s gets its example back from its form",
  (_, entry) => {
    const fields = fieldsOf(entry, undefined);
    const texts = exampleTexts(entry, fields);
    const args = argumentsOf(fields.map(({ name, takes }, i) => ({ name, takes, text: texts[i] })));
    const wanted = entry.example.map((cell) => (Array.isArray(cell) ? cell : [[cell]]));
    expect(args.slice(0, wanted.length)).toEqual(wanted);
    expect(
      args
        .slice(wanted.length)
        .flat(2)
        .every((cell) => cell === null),
    ).toBe(true);
  },
);
