import type { Cells } from "../cells/broadcast";
import { T_e, lambda_i } from "../cells/common-inputs";
import { entry, type Family } from "../cells/entry";
import {
  blockInput,
  ionInput,
  optional,
  quantityInput,
  quantityOrWord,
  textInput,
  wordInput,
  type Input,
} from "../cells/inputs";
import { quantities, type Quantity } from "../cells/quantities";
import { judge } from "../cells/verdict";
import { CP, GUM, GUM1, L88, LL, R91 } from "../sources";
import type { Directory } from "./directory";
import { limitCheck } from "./limit-check";
import { limitColumns, limitRow, limitsTable } from "./limits-table";
import { regimeLimits } from "./regime";
import { methods, uncertainty } from "./uncertainty";
import { countVerdicts } from "./verdict-count";
import { amountInput, within } from "./within";

const first = { "1.0.0": "first version" };
const asComputed = "bounds are compared with the measure as computed";
const verdict: Quantity = { ...quantities.number, name: "verdict" };

/** A 0 may be an empty cell, and a limit must not pass on what nobody gave. */
const given = { zeroIsValue: false };

const REGIME = entry("REGIME", {
  inputs: [
    quantityInput("n_e", quantities.density),
    T_e,
    ionInput(),
    optional(quantityInput("p", quantities.pressure)),
    optional(
      quantityInput("T_i", quantities.temperature, { least: 0, band: { low: 0, high: 290, above: "K meant?" } }),
    ),
    optional(quantityOrWord("V_s", quantities.drop, ["floating"], given)),
    optional(quantityInput("size", quantities.length)),
    optional(quantityInput("B", quantities.magneticField)),
    optional(quantityInput("f", quantities.frequency)),
    optional(lambda_i),
  ],
  result: { columns: limitColumns },
  compute: (...situation) => {
    const verdicts = regimeLimits.map((limit) => judge(limit, situation)).filter((each) => each !== undefined);
    return verdicts.map((each) => limitRow(each.limit, each));
  },
  equation: "",
  twin: "it judges limits",
  limits: regimeLimits,
  sources: [LL, R91, L88, CP],
  changes: first,
  example: [1e16, 3, "Ar+", 0.7, 0.05, "floating", 0.1, 0.001, 13.56e6],
  accuracy: asComputed,
});

const WITHIN = entry("WITHIN", {
  inputs: [
    amountInput("value"),
    amountInput("reference"),
    optional(quantityInput("rel_tol", quantities.notNegative, { most: 1, example: "5 %" }), 0),
    optional(amountInput("abs_tol")),
    optional(textInput("label", "type the label as text")),
  ],
  result: verdict,
  compute: within,
  equation: String.raw`|x - x_\mathrm{ref}| \le \max(r\,|x_\mathrm{ref}|,\ a)`,
  twin: "it answers in words",
  sources: [CP],
  changes: first,
  example: [3.1, 2.9, 0, 0.1, "sheath width, mm"],
  accuracy: "a tolerance met to the last digits holds",
});

const VERDICT = entry("VERDICT", {
  inputs: [],
  repeats: optionalCells("checks"),
  result: { columns: [{ name: "verdict", unit: "" }] },
  compute: (...ranges: (Cells | undefined)[]) => [[countVerdicts(ranges)]],
  equation: "",
  twin: "it counts words",
  sources: [CP],
  changes: first,
  example: [[["holds"], ["marginal: s/λ_i 0.2 (0.1…0.3)"], ["holds"]]],
  accuracy: "exact",
});

const functionName: Input<Cells> = { ...cellsInput("function_name"), example: '"DEBYELENGTH"' };

/** The checks that look at other functions: the catalogue hands itself to them. */
export function checksOver(directory: Directory) {
  const LIMITCHECK = entry("LIMITCHECK", {
    inputs: [functionName],
    repeats: optionalCells("inputs"),
    result: { columns: [{ name: "verdict", unit: "" }] },
    compute: (names, ...inputs: unknown[]) => limitCheck(directory, names, inputs),
    equation: "",
    twin: "it judges the limits of other functions",
    sources: [CP],
    changes: first,
    example: ["DEBYELENGTH", 1e16, 3],
    accuracy: asComputed,
  });

  const LIMITS = entry("LIMITS", {
    inputs: [functionName],
    repeats: optionalCells("inputs"),
    result: { columns: limitColumns },
    compute: ([[name]], ...inputs: unknown[]) => limitsTable(directory, name, inputs),
    equation: "",
    twin: "it judges the limits of other functions",
    sources: [CP],
    changes: first,
    example: ["BOHMRATIO", 3000, 3, "Ar+"],
    accuracy: asComputed,
  });

  const UNCERTAINTY = entry("UNCERTAINTY", {
    inputs: [
      functionName,
      cellsInput("values"),
      optionalCells("rel_unc"),
      optionalCells("abs_unc"),
      optional(wordInput("method", methods), "linear"),
      optional(textInput("part", 'type a column such as "u"')),
    ],
    result: { columns: ["value", "u", "shares"].map((name) => ({ name, unit: "" })) },
    compute: ([[name]], ...rest) => uncertainty(directory, name, ...rest),
    equation: String.raw`u^2 = \sum_i \left(\frac{\partial f}{\partial x_i}\right)^2 u_i^2`,
    twin: "it calls other functions many times",
    sources: [GUM, GUM1],
    changes: first,
    example: ["DEBYELENGTH", [[1e16, 3]], [[0.2, 0.1]]],
    accuracy: "linear: slopes to 1e-3 of u or refused; montecarlo: u to 0.3 %, from 1e5 draws of a fixed seed",
  });

  const family: Family = {
    title: "Checks: whether to believe the others",
    entries: [LIMITCHECK, LIMITS, REGIME, WITHIN, VERDICT, UNCERTAINTY],
  };
  return { LIMITCHECK, LIMITS, REGIME, WITHIN, VERDICT, UNCERTAINTY, family };
}

/** A range as it stands, errors and blanks included: a check has something to say of those too. */
function cellsInput(name: string): Input<Cells> {
  return { ...blockInput<Cells>(name, (cells) => cells), seesErrors: true };
}

function optionalCells(name: string): Input<Cells | undefined> {
  return optional(cellsInput(name));
}
