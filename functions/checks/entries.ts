import type { Cells } from "../cells/broadcast";
import { entry, type Family } from "../cells/entry";
import { blockInput, type Input } from "../cells/inputs";
import { CP } from "../sources";
import type { Directory } from "./directory";
import { limitCheck } from "./limit-check";

const first = { "1.0.0": "first version" };

/** The checks look at other functions, so the catalogue hands itself to them. */
export function checksOver(directory: Directory) {
  const LIMITCHECK = entry("LIMITCHECK", {
    inputs: [cellsInput("function_name")],
    repeats: optionalCells("inputs"),
    result: { columns: [{ name: "verdict", unit: "" }] },
    compute: (names, ...inputs: unknown[]) => limitCheck(directory, names, inputs),
    equation: "",
    sources: [CP],
    changes: first,
    example: ["DEBYELENGTH", 1e16, 3],
    accuracy: "bounds are compared with the measure as computed",
  });

  const family: Family = { title: "Checks: whether to believe the others", entries: [LIMITCHECK] };
  return { LIMITCHECK, family };
}

/** A range as it stands, errors and blanks included: a check has something to say of those too. */
function cellsInput(name: string): Input<Cells> {
  return { ...blockInput<Cells>(name, (cells) => cells), seesErrors: true };
}

function optionalCells(name: string): Input<Cells | undefined> {
  return { ...cellsInput(name), optional: true };
}
