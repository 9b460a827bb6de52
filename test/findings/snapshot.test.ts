import fc from "fast-check";
import { expect, test } from "vitest";
import { listed, told, unlisted } from "../../taskpane/findings/snapshot";

const content = fc.oneof(
  fc.double({ noNaN: true, noDefaultInfinity: true }),
  fc.string(),
  fc.boolean(),
  fc.constant(null),
  fc.constantFrom({ code: "#N/A" }, { code: "#DIV/0!" }),
);

test("a list of contents is read back as it was told, whatever stands in the cells", () => {
  fc.assert(
    fc.property(fc.array(content, { minLength: 1, maxLength: 30 }), (cells) => {
      const values = cells.map(told);
      expect(unlisted(listed(values))).toEqual(values);
    }),
  );
});

test("numbers are told with all their digits", () => {
  fc.assert(
    fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (value) => {
      expect(Number(told(value))).toBe(value + 0);
    }),
  );
});

test("a list too long for a cell is told by a fingerprint that another list does not have", () => {
  const values = Array.from({ length: 5000 }, (_, i) => String(1e16 + i));
  const list = listed(values);
  expect(list.length).toBeLessThan(100);
  expect(unlisted(list)).toBeUndefined();
  expect(listed([...values.slice(0, -1), "0"])).not.toBe(list);
});
