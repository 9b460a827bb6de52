import { NotTested, type Limit } from "../cells/entry";
import { CP, R91 } from "../sources";
import { debyeLength } from "./model";

/** Cold ions: what a blank T_i leaves open. A T_i that is given enters the result, and the assumption is gone. */
export function coldIons(T_i: (...values: any[]) => number | undefined): Limit {
  return {
    assumption: "the ions are cold, or their temperature is given",
    measure: "T_i/T_e left out",
    value: (...values) => (T_i(...values) === undefined ? new NotTested("T_i") : 0),
    holds: 0.1,
    fails: 0.5,
    reason: "the ion temperature left out changes the Bohm speed",
    source: R91,
  };
}

/** Enough electrons in a Debye sphere for a plasma rather than a few charges. */
export function manyInDebyeSphere(of: (...values: any[]) => [n: number, T_e: number]): Limit {
  return {
    assumption: "a Debye sphere holds many electrons",
    measure: "(4/3)π n_e λ_D³",
    value: (...values) => {
      const [n, T_e] = of(...values);
      return (4 / 3) * Math.PI * n * debyeLength(n, T_e) ** 3;
    },
    holds: 10,
    fails: 1,
    reason: "a Debye sphere holds hardly an electron, so there is no collective screening",
    source: CP,
  };
}
