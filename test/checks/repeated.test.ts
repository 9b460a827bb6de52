import { describe, expect, test } from "vitest";
import { Fault } from "../../functions/cells/fault";
import { repeated } from "../../functions/checks/repeated";

const column = [[1e16], [1e17]];
const cell = [[3]];
/** What the host puts behind the arguments of every function. */
const invocation = { functionName: "LIMITCHECK", setResult: undefined };

describe("the ranges of a repeating parameter", () => {
  test("come from the host as one array of matrices", () => {
    expect(repeated([[column, cell]])).toEqual([column, cell]);
    expect(repeated([[cell]])).toEqual([cell]);
  });

  test("come from other callers one after another", () => {
    expect(repeated([column, cell])).toEqual([column, cell]);
    expect(repeated([cell])).toEqual([cell]);
  });

  test("do not include the host's invocation object", () => {
    expect(repeated([[column, cell], invocation])).toEqual([column, cell]);
    expect(repeated([column, cell, invocation])).toEqual([column, cell]);
    expect(repeated([invocation])).toEqual([]);
  });

  test("keep the place of an argument left out between two others", () => {
    expect(repeated([[column, null, cell]])).toEqual([column, null, cell]);
    expect(repeated([column, undefined, cell])).toEqual([column, undefined, cell]);
    expect(repeated([[null, cell]])).toEqual([null, cell]);
  });

  test("may be a lone error cell", () => {
    const error = new Fault("#N/A", "no solution");
    expect(repeated([error])).toEqual([error]);
  });
});
