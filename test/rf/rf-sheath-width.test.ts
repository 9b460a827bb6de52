import { describe, expect, test } from "vitest";
import { judgeAll } from "../../functions/cells/verdict";
import { LIMITCHECK } from "../../functions/checks/functions";
import { RFSHEATHWIDTH as entry } from "../../functions/rf/entries";
import { RFSHEATHWIDTH } from "../../functions/rf/functions";

describe("RFSHEATHWIDTH", () => {
  test("an RF sheath swells to 1.36 times the width of a steady Child sheath", () => {
    // Source: Lieberman 1988; 3.22809 mm is the Child width at 300 V, 10¹⁶ m⁻³, 3 eV (recomputed with mpmath).
    const [s_m] = RFSHEATHWIDTH([[300]], [[1e16]], [[3]], [["mm"]])[0];
    expect(s_m / 3.22809).toBeCloseTo(Math.sqrt(50 / 27), 5);
    expect(Math.sqrt(50 / 27)).toBeCloseTo(1.36, 2);
  });

  test("the width grows with the voltage to the power 3/4", () => {
    const [[thin], [wide]] = RFSHEATHWIDTH([[100], [1600]], [[1e16]], [[3]]);
    expect(wide / thin).toBeCloseTo(8, 12);
  });

  test("a drop of 30 T_e holds, one below 10 T_e fails", () => {
    const word = (V_dc: number) => judgeAll(entry, [V_dc, 1e16, 3])[0].word;
    expect([-90, 60, 20].map(word)).toEqual(["holds", "marginal", "fails"]);
  });

  test("a width for ions that fall freely names the path they need: three of it", () => {
    const told = LIMITCHECK([["RFSHEATHWIDTH"]], [[250]], [[6e15]], [[3]])[0][0] as string;
    const least = Number(/^not tested: give the ions' mean free path .* should be ([\d.]+) m or more/.exec(told)![1]);
    expect(least / (RFSHEATHWIDTH([[250]], [[6e15]], [[3]])[0][0] as number)).toBeCloseTo(3, 1);
  });
});
