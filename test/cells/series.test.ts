import { describe, expect, test } from "vitest";
import { Fault } from "../../functions/cells/fault";
import { quantities } from "../../functions/cells/quantities";
import { seriesInput, type Series } from "../../functions/cells/series";

const current = seriesInput("I", quantities.current);
const read = (cells: unknown[]) => current.read(cells.map((cell) => [cell])) as Series;
const refusal = (cells: unknown[]) => (current.read(cells.map((cell) => [cell])) as unknown as Fault).message;

describe("a column as an instrument writes it", () => {
  test("numbers, numbers with a unit and decimal commas are numbers", () => {
    expect([...read([1, "2 mA", "3,5 uA", "−4e-3"]).values]).toEqual([1, 2e-3, 3.5e-6, -4e-3]);
  });

  test("blanks and zeros are marked alike, since the host sends an empty cell as either", () => {
    expect([...read([0, null, "", "0", 1]).blank]).toEqual([1, 1, 1, 0, 0]);
  });

  test("words for no reading, #N/A and the numbers that stand for it are counted", () => {
    const series = read(["OL", "n/a", "+OL", { code: "#N/A" }, 9.91e37, "-9.9E37", 5]);
    expect(series.unread).toBe(6);
    expect(series.word).toBe("OL");
    expect([...series.values].filter((each) => !Number.isNaN(each))).toEqual([5]);
  });

  test("an error other than #N/A is remembered by its row", () => {
    expect([...read([1, { code: "#REF!" }, 2]).errors]).toEqual([1]);
  });

  test("a heading's unit holds for the bare numbers below it, until the next heading", () => {
    for (const heading of ["I (mA)", "I [mA]", "Probe current / mA", "I, mA", "I/mA"]) {
      const series = read([heading, 1, "2", "3 A"]);
      expect([...series.values].slice(1), heading).toEqual([1e-3, 2e-3, 3]);
      expect(series.unit).toBe("mA");
      expect([...series.heading]).toEqual([1, 0, 0, 0]);
    }
    expect([...read(["I (mA)", 1, "I (uA)", 1]).values].filter((each) => !Number.isNaN(each))).toEqual([1e-3, 1e-6]);
  });

  test("a heading without a unit, or with one in brackets that is none, changes nothing", () => {
    expect([...read(["Current", 2]).values][1]).toBe(2);
    expect([...read(["I (probe 1)", 2]).values][1]).toBe(2);
  });

  test("a heading of another quantity, a unit of another quantity and TRUE are refused", () => {
    expect(refusal(["V (V)", 1])).toMatch(/^I: "V \(V\)" heads a column that is not a current/);
    expect(refusal([1, "2 V"])).toMatch(/^Row 2, I: /);
    expect(refusal([1, true])).toMatch(/^I: row 2 holds neither a number nor text/);
  });

  test("one row serves as well as one column, and a table is refused", () => {
    expect([...(current.read([[1, 2, 3]]) as Series).values]).toEqual([1, 2, 3]);
    expect(
      current.read([
        [1, 2],
        [3, 4],
      ] as never),
    ).toBeInstanceOf(Fault);
  });
});
