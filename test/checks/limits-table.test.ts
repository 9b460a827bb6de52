import { describe, expect, test } from "vitest";
import { LIMITS } from "../../functions/checks/functions";
import { limitsTable } from "../../functions/checks/limits-table";
import { directoryOf, NOLIMITS, OHMICDROP } from "./fakes";

const directory = directoryOf(OHMICDROP, NOLIMITS);
const table = (...cells: unknown[]) =>
  limitsTable(
    directory,
    "OHMICDROP",
    cells.map((cell) => [[cell]]),
  );

describe("the table of limits", () => {
  test("has a row for each: assumption, measure, value, bounds, verdict", () => {
    expect(table(1e16, 2, 5, "round")).toEqual([
      ["the plasma is warm", "T_e/eV", 2, "holds from 3 up, fails below 1", "marginal"],
      ["the body is small", "size/m", 5, "holds up to 0.1, fails above 1", "fails: the body is too large"],
      ["the body is round", "roundness", 1, "holds from 1 up, else fails", "holds"],
    ]);
  });

  test("says what to give where a limit could not be tested, and where one does not apply", () => {
    expect(table(1e16, 5).map((row) => row[4])).toEqual([
      "holds",
      "not tested: give size",
      "not tested: does not apply here",
    ]);
  });

  test("begins with the model's own reason where there is no solution, and with doubtful inputs", () => {
    const rows = table(1e11, 600);
    expect(rows[0]).toEqual(["the model has a solution", "", "", "", "fails: Above 500 eV there is no solution"]);
    expect(rows[1][4]).toBe("doubtful input: n_e 1e11 m⁻³; cm⁻³ meant?");
    expect(rows).toHaveLength(5);
  });

  test("of a function without limits says so", () => {
    expect(limitsTable(directory, "NOLIMITS", [[[2]]])).toEqual([
      ["NOLIMITS states no limits", "", "", "", "not tested"],
    ]);
  });

  test("takes one set of inputs, and points to the function for columns", () => {
    const [[error]] = limitsTable(directory, "OHMICDROP", [[[1e16], [1e17]], [[3]]]) as { message: string }[][];
    expect(error.message).toBe(
      "inputs: LIMITS takes one set of them; give single cells, or use LIMITCHECK for a column.",
    );
  });

  test("is an error where an input is, and empty where all are", () => {
    expect(table("OL", 3)).toMatchObject([[{ code: "#VALUE!" }]]);
    expect(table(1e16, 3, 7)).toMatchObject([[{ code: "#VALUE!" }]]);
    expect(table(null, null)).toEqual([[""]]);
    expect(LIMITS([["NOSUCH"]], [[1]])).toMatchObject([[{ code: "#VALUE!" }]]);
  });

  test("ends the same for a real function", () => {
    expect(LIMITS([["bohmratio"]], [[3000]], [[3]], [["Ar+"]], [[0.1]])).toEqual([
      [
        "ions enter at the Bohm speed or faster",
        "u_0/u_B",
        expect.closeTo(3000 / (2691.831 * Math.sqrt(1 + 0.1 / 3)), 5),
        "holds from 1 up, else fails",
        "holds",
      ],
      expect.anything(),
    ]);
  });
});
