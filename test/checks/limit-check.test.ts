import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { LIMITCHECK } from "../../functions/checks/functions";
import { limitCheck } from "../../functions/checks/limit-check";
import { directoryOf, FREEFALL, NOLIMITS, OHMICDROP } from "./fakes";

const directory = directoryOf(OHMICDROP, NOLIMITS);
const column = (...cells: unknown[]) => cells.map((cell) => [cell]);
const check = (...args: unknown[]) => limitCheck(directory, [["OHMICDROP"]], args);
/** One call with single cells. */
const one = (...cells: unknown[]) => check(...cells.map((cell) => [[cell]]))[0][0] as string & { message: string };

describe("one verdict", () => {
  test("the worst of the limits is told, with its measure and bounds", () => {
    expect(one(1e16, 5, 0.05)).toBe("holds");
    expect(one(1e16, 2, 0.05)).toBe("marginal: T_e/eV 2 (3…1)");
    expect(one(1e16, 2, 5)).toBe("fails: the body is too large: size/m 5 (0.1…1)");
  });

  test("a limit that holds outranks one that could not be tested", () => {
    expect(one(1e16, 5)).toBe("holds");
  });

  test("what a model stands on outranks a limit that holds while it could not be tested, and no other verdict", () => {
    const fall = (...cells: unknown[]) =>
      limitCheck(
        directoryOf(FREEFALL),
        [["FREEFALL"]],
        cells.map((cell) => [[cell]]),
      )[0][0];
    expect(fall(300)).toBe("not tested: give path");
    expect(fall(300, 4)).toBe("holds");
    expect(fall(20)).toBe("marginal: V/V 20 (30…3)");
    expect(fall(1)).toMatch(/^fails: the voltage is low/);
    expect(fall(300, 0.5)).toMatch(/^fails: something is in the way/);
  });

  test("a measure just short of a bound is told in digits that show it", () => {
    expect(one(1e16, 2.9999, 0.05)).toBe("marginal: T_e/eV 2.9999 (3…1)");
  });

  test("a model without a solution fails with its own reason", () => {
    expect(one(1e16, 600, 0.05)).toBe("fails: Above 500 eV there is no solution");
  });

  test("a result that is no number fails", () => {
    expect(limitCheck(directory, [["NOLIMITS"]], [[[0]]])[0][0]).toMatch(/^fails: NOLIMITS: the result is larger than/);
  });

  test("inputs that the model refuses give its error", () => {
    expect(one(1e16, 5, 7).message).toBe("size: seven is taken; type another.");
  });

  test("a function without limits is not tested, and says so", () => {
    expect(limitCheck(directory, [["NOLIMITS"]], [[[2]]])[0][0]).toBe("not tested: NOLIMITS states no limits");
  });

  test("where no limit applies, that is said", () => {
    expect(LIMITCHECK([["EDGERATIO"]], [["free"]])[0][0]).toBe("not tested: no limit of EDGERATIO applies here");
  });

  test("where nothing could be tested, the input to give is named", () => {
    expect(LIMITCHECK([["BOHMSPEED"]], [[3]], [["Ar+"]])[0][0]).toBe("not tested: give T_i");
  });
});

describe("doubtful inputs", () => {
  test("a bare number outside its plausible band is told with what may have been meant", () => {
    expect(one(1e11, 5, 0.05)).toBe("doubtful input: n_e 1e11 m⁻³; cm⁻³ meant?");
  });

  test("a stated unit is taken at its word", () => {
    expect(one("1e5 cm^-3", 5, 0.05)).toBe("holds");
  });

  test("a doubt outranks a marginal limit", () => {
    expect(one(1e11, 2, 0.05)).toMatch(/^doubtful input: n_e/);
  });

  test("a failing row tells its doubtful input too, since the one often causes the other", () => {
    expect(one(1e11, 0.5, 0.05)).toBe(
      "fails: the plasma is cold: T_e/eV 0.5 (3…1); doubtful input: n_e 1e11 m⁻³; cm⁻³ meant?",
    );
  });

  test("a blank and a default are not doubted", () => {
    expect(one(1e16, 5, null, null)).toBe("holds");
  });
});

describe("columns", () => {
  test("each row has its own verdict, error or blank", () => {
    const verdicts = check(column(1e16, "", 1e16, "OL", 1e11, 1e16), column(5, "", 2, 5, 5, null));
    expect(verdicts.map(([cell]) => (typeof cell === "object" ? cell.code : cell))).toEqual([
      "holds",
      "",
      "marginal: T_e/eV 2 (3…1)",
      "#VALUE!",
      "doubtful input: n_e 1e11 m⁻³; cm⁻³ meant?",
      "#VALUE!",
    ]);
  });

  test("a column against a row gives a table, and a doubt follows its own cell", () => {
    const table = check(column(1e16, 1e11), [[5, 2, 0.5]]);
    expect(table.map((row) => row.map((cell) => String(cell).slice(0, 8)))).toEqual([
      ["holds", "marginal", "fails: t"],
      ["doubtful", "doubtful", "fails: t"],
    ]);
  });

  test("a doubt in a row of inputs stands in its column", () => {
    const table = check([[1e16], [1e16]], [[5, 3]], [[0.05, 30]]);
    expect(table).toEqual([
      ["holds", expect.stringMatching(/too large.*doubtful input: size 30 m/)],
      ["holds", expect.stringMatching(/too large.*doubtful input: size 30 m/)],
    ]);
  });

  test("ranges that do not match are refused with both shapes", () => {
    const [[error]] = check(column(1, 2, 3), column(1, 2)) as { message: string }[][];
    expect(error.message).toMatch(/2 rows by 1 column does not match n_e of 3 rows by 1 column/);
  });

  test("an error in a cell stays in its row", () => {
    const verdicts = check(column(1e16, { code: "#DIV/0!" }), [[5]]);
    expect(verdicts[0][0]).toBe("holds");
    expect(verdicts[1][0]).toMatchObject({ code: "#DIV/0!" });
  });

  test("a column of names checks each row with its own function", () => {
    const verdicts = limitCheck(directory, column("OHMICDROP", "NOSUCH", "OHMICDROP"), [
      column(1e16, 1e16, 1e11),
      [[5]],
    ]);
    expect(verdicts[0][0]).toBe("holds");
    expect(verdicts[1][0]).toMatchObject({ code: "#VALUE!" });
    expect(verdicts[2][0]).toMatch(/^doubtful/);
  });

  test("every row of a column says what a call for it alone says", () => {
    const anyCell = fc.oneof(
      fc.constantFrom(null, "", 0, "OL", "1e16 m^-3", "3 eV", -1, 1e11, 1e16, 0.5, 2, 5, 700),
      fc.double({ noNaN: true }),
    );
    fc.assert(
      fc.property(fc.array(fc.tuple(anyCell, anyCell, anyCell), { minLength: 2, maxLength: 6 }), (rows) => {
        const args = [0, 1, 2].map((k) => rows.map((row) => [row[k]]));
        const together = check(...args);
        rows.forEach((row, i) => expect(together[i]).toEqual(check(...row.map((cell) => [[cell]]))[0]));
      }),
      { numRuns: 200, seed: 1 },
    );
  });
});

describe("the function's name", () => {
  test("may stand in any case, with or without the namespace", () => {
    for (const name of ["DEBYELENGTH", "debyelength", " Sheath.DebyeLength "]) {
      expect(LIMITCHECK([[name]], [[1e16]], [[3]])).toEqual([["holds"]]);
    }
  });

  test.each([
    ["DEBYELENGHT", /no function "DEBYELENGHT"; type DEBYELENGTH\.$/],
    ["SHEATH.BOHM", /type one of .*BOHMSPEED/],
    ["DEBYELENGTH(A1,B1)", /type DEBYELENGTH\.$/],
    [1e16, /1e16 is not the name of a function/],
    [12, /12 is not the name of a function; type the name/],
    ["LIMITCHECK", /LIMITCHECK is itself a check/],
  ])("%o is told what to type instead", (name, says) => {
    const [[error]] = LIMITCHECK([[name]], [[1e16]], [[3]]);
    expect(error.message).toMatch(says);
  });

  test("an error in its cell is passed on", () => {
    expect(LIMITCHECK([[{ code: "#N/A" }]], [[1e16]])[0][0]).toMatchObject({ code: "#N/A" });
  });

  test("left blank, there is nothing to check", () => {
    expect(LIMITCHECK([[null]], [[1e16]], [[3]])).toEqual([[""]]);
  });
});

describe("the checked function's arguments", () => {
  test("may come as one array of ranges, as the host gives them", () => {
    expect(LIMITCHECK([["DEBYELENGTH"]], [[[1e16]], [[3]]] as any, { functionName: "LIMITCHECK" } as any)).toEqual([
      ["holds"],
    ]);
  });

  test("may have one left out between others", () => {
    expect(LIMITCHECK([["EDGERATIO"]], [["slab"]], [[0.1]], null as any)[0][0]).toBe("not tested: give lambda_i");
    expect(LIMITCHECK([["DEBYELENGTH"]], [[1e16]], [[3]], null as any, [["mm"]])).toEqual([["holds"]]);
  });

  test("may end with the unit of the result, which changes nothing", () => {
    expect(LIMITCHECK([["DEBYELENGTH"]], [[1e16]], [[3]], [[0.1]], [["furlong"]])).toEqual([["holds"]]);
  });

  test("more of them than it takes are refused with their names", () => {
    const [[error]] = LIMITCHECK([["DEBYELENGTH"]], [[1e16]], [[3]], [[0.1]], [["mm"]], [[1]]);
    expect(error.message).toBe("inputs: DEBYELENGTH takes 4 at most and 5 are given; give n_e, T_e, T_i.");
  });
});
