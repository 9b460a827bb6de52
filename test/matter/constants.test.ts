import * as mathjs from "mathjs";
import { expect, test } from "vitest";
import { constants } from "../../functions/matter/constants";

/**
 * mathjs, a general-purpose library, carries CODATA 2018. The defined constants are the same there; the measured ones
 * moved by less than the tolerance, which a slip in any digit that matters would exceed.
 */
const others: Record<string, [mathjs.Unit, string, number]> = {
  e: [mathjs.elementaryCharge, "C", 0],
  k_B: [mathjs.boltzmann, "J/K", 0],
  h: [mathjs.planckConstant, "J s", 0],
  c: [mathjs.speedOfLight, "m/s", 0],
  N_A: [mathjs.avogadro, "mol^-1", 0],
  m_e: [mathjs.electronMass, "kg", 2e-9],
  eps0: [mathjs.electricConstant, "F/m", 1e-9],
  u: [mathjs.atomicMass, "kg", 2e-9],
};

test.each(constants.map((each) => [each.symbol, each.value] as const))("%s agrees with mathjs", (symbol, value) => {
  const [other, unit, tolerance] = others[symbol];
  expect(Math.abs(value / other.toNumber(unit) - 1)).toBeLessThanOrEqual(tolerance + 1e-15);
});

test("no constant's uncertainty reaches its ninth digit", () => {
  for (const { value, uncertainty } of constants) expect(uncertainty / value).toBeLessThan(1e-9);
});
