import fc from "fast-check";
import { expect, test } from "vitest";
import { a1 } from "../../taskpane/workbook/address";
import { firstFilled } from "../../taskpane/workbook/filled";
import { fakeWorkbook } from "./fake-workbook";

const from = { sheet: "Chamber", address: "C4" };

test("a block of empty cells takes one question, however large it is", async () => {
  const { workbook } = fakeWorkbook({ B4: 1, C3: 1, F4: 1, C2004: 1 });
  let asked = 0;
  const counting = { ...workbook, isFilled: (place: typeof from) => (asked++, workbook.isFilled(place)) };
  expect(await firstFilled(counting, from, 2000, 3)).toBeUndefined();
  expect(asked).toBe(1);
});

test("the first filled cell in reading order is found wherever others are filled", async () => {
  const cell = fc.record({ row: fc.integer({ min: 0, max: 11 }), column: fc.integer({ min: 0, max: 11 }) });
  await fc.assert(
    fc.asyncProperty(fc.array(cell, { maxLength: 12 }), async (cells) => {
      const { workbook } = fakeWorkbook(Object.fromEntries(cells.map((each) => [a1(each), 1])));
      const inside = cells.filter(({ row, column }) => row >= 3 && row < 8 && column >= 2 && column < 6);
      const [first] = inside.sort((a, b) => a.row - b.row || a.column - b.column);
      const found = await firstFilled(workbook, from, 5, 4);
      expect(found?.address).toBe(first && a1(first));
    }),
  );
});
