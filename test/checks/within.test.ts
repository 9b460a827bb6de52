import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { WITHIN } from "../../functions/checks/functions";

const within = (...cells: unknown[]) => {
  const [[cell]] = (WITHIN as (...args: any[]) => any[][])(...cells.map((cell) => [[cell]]));
  return typeof cell === "object" ? cell.message : cell;
};

describe("a comparison", () => {
  test("holds inside the tolerance and tells both numbers outside", () => {
    expect(within(3.0, 2.9, null, 0.1)).toBe("holds");
    expect(within(3.1, 2.9, null, 0.1)).toBe("fails: 3.1 against 2.9 ± 0.1");
    expect(within(3.1, 2.9, null, 0.1, "sheath width")).toBe("fails: sheath width: 3.1 against 2.9 ± 0.1");
  });

  test("holds exactly at the tolerance, although 3.1 − 2.9 is a little more than 0.2 in binary", () => {
    expect(3.1 - 2.9 > 0.2).toBe(true);
    expect(within(3.1, 2.9, null, 0.2)).toBe("holds");
    expect(within(3.1001, 2.9, null, 0.2)).toMatch(/^fails/);
  });

  test("takes a typed 5 %, which arrives as 0.05, relative to the reference", () => {
    expect(within(105, 100, 0.05)).toBe("holds");
    expect(within(95, 100, "5 %")).toBe("holds");
    expect(within(105.5, 100, 0.05)).toBe("fails: 106 against 100 ± 5");
    expect(within(-105, -100, 0.05)).toBe("holds");
  });

  test("allows the larger of two tolerances", () => {
    expect(within(1.04, 1, 0.05, 0.01)).toBe("holds");
    expect(within(0.05, 0.01, 0.05, 0.1)).toBe("holds");
    expect(within(1.055, 1, 0.05, 0.01)).toBe("fails: 1.055 against 1 ± 0.05");
  });

  test("shows as many digits as the difference needs", () => {
    expect(within(3.0000001, 3, 1e-9)).toBe("fails: 3.0000001 against 3 ± 3e-9");
  });

  test("without a tolerance is refused", () => {
    expect(within(3, 3)).toBe('rel_tol: neither rel_tol nor abs_tol is given; type a tolerance such as "5 %".');
    expect(within(3, 3, null, -1)).toMatch(/^abs_tol: -1 is negative/);
    expect(within(3, 3, -0.1)).toMatch(/^rel_tol: -0.1 is below/);
    // 5 for 5 % would let anything up to six times the reference hold.
    expect(within(9, 3, 5)).toBe("rel_tol: 5 is above the highest value; type a number of at most 1, such as 5 %.");
    expect(within(9, 3, "200 %")).toMatch(/^rel_tol: "200 %" is above/);
  });
});

describe("units", () => {
  test("of both sides are converted, and the message speaks in the reference's", () => {
    expect(within("3.1 mm", "0.0031 m", 1e-12)).toBe("holds");
    expect(within("3.1 mm", "2.9 mm", null, "100 µm")).toBe("fails: 3.1 mm against 2.9 ± 0.1 mm");
    expect(within("1e11 cm^-3", "1e17 m^-3", 1e-12)).toBe("holds");
  });

  test("stand in all amounts or in none", () => {
    expect(within(3.1, "2.9 mm", 0.1)).toBe(
      "value: it has no unit beside one in mm; write units in all of them or in none.",
    );
    expect(within("3.1 mm", 2.9, 0.1)).toMatch(/^reference: it has no unit beside one in mm/);
    expect(within("3.1 mm", "2.9 mm", null, 0.1)).toMatch(/^abs_tol: it has no unit beside one in mm/);
  });

  test("of different kinds are refused", () => {
    expect(within("3.1 mm", "2.9 V", 0.1)).toBe("value: mm does not convert to V; type it in V.");
  });

  test("a tolerance of 5 °C is one of 5 K", () => {
    expect(within("24.9 °C", "20 °C", null, "5 °C")).toBe("holds");
    expect(within("24.9 °C", "20 °C", null, "5 K")).toBe("holds");
    expect(within("298.05 K", "20 °C", null, "5 °C")).toBe("holds");
    expect(within("25.1 °C", "20 °C", null, "5 °C")).toBe("fails: 25.1 °C against 20 ± 5 °C");
  });

  test("a relative tolerance of a temperature is one of its absolute temperature", () => {
    // 2 % of 293.15 K are 5.863 K.
    expect(within("25.8 °C", "20 °C", 0.02)).toBe("holds");
    expect(within("25.9 °C", "20 °C", 0.02)).toMatch(/^fails/);
  });

  test("electronvolts and kelvin stand for each other", () => {
    expect(within("3 eV", "34813.5 K", 1e-5)).toBe("holds");
  });
});

describe("cells", () => {
  test("each row is compared on its own", () => {
    const cells = WITHIN([[1], ["OL"], [1.2], [{ code: "#DIV/0!" }], [""]], [[1], [1], [1], [1], [""]], [[0.05]]);
    expect(cells.map(([cell]) => (typeof cell === "object" ? cell.code : cell))).toEqual([
      "holds",
      "#VALUE!",
      "fails: 1.2 against 1 ± 0.05",
      "#DIV/0!",
      "",
    ]);
  });

  test.each([
    ["OL", /instrument's word for no reading/],
    ["about 3", /"about 3" is not a number/],
    [true, /neither number nor text/],
    ["3 furlong", /"furlong" is not a unit known here/],
  ])("%o is no amount", (cell, says) => expect(within(cell, 3, 0.1)).toMatch(says));

  test("agrees with a comparison by hand", () => {
    const number = fc.double({ min: -1e6, max: 1e6, noNaN: true });
    const tolerance = fc.double({ min: 1e-3, max: 1, noNaN: true });
    fc.assert(
      fc.property(number, number, tolerance, tolerance, (value, reference, r, a) => {
        const allowed = Math.max(r * Math.abs(reference), a);
        const gap = Math.abs(value - reference);
        if (Math.abs(gap - allowed) < 1e-9 * allowed) return;
        expect(within(value, reference, r, a).startsWith(gap < allowed ? "holds" : "fails")).toBe(true);
      }),
      { seed: 2 },
    );
  });
});
