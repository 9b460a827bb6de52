import { entry, type Family } from "../cells/entry";
import { badInput } from "../cells/fault";
import { prettyUnit } from "../cells/format";
import { ionInput, optional, quantityInput, wordInput, type Input } from "../cells/inputs";
import { quantities } from "../cells/quantities";
import { readSwing } from "../cells/quantity-text";
import { parseUnit, type Unit } from "../cells/units";
import { constants } from "../matter/constants";
import { CIAAW, CODATA } from "../sources";
import { built, version } from "../version";
import { convertUnit } from "./model";

const first = { "1.0.0": "first version" };

export const IONMASS = entry("IONMASS", {
  inputs: [ionInput()],
  result: quantities.mass,
  compute: (ion) => ion.mass,
  equation: String.raw`M = \sum_j N_j A_j u - Z m_e`,
  twin: "it looks atomic weights up",
  sources: [CIAAW, CODATA],
  changes: first,
  example: ["Ar+"],
  accuracy: "as good as the atomic weights: natural abundances vary from about the fifth digit on",
});

const symbols = constants.map(({ symbol }) => symbol);

export const CONSTANT = entry("CONSTANT", {
  inputs: [wordInput("name", symbols)],
  result: quantities.number,
  compute: (name) => constants.find(({ symbol }) => symbol === name)!.value,
  equation: String.raw`e,\ m_e,\ k_B,\ \varepsilon_0,\ u,\ h,\ c,\ N_A`,
  twin: "it looks a constant up",
  sources: [CODATA],
  changes: first,
  example: ["eps0"],
  accuracy: "the recommended values themselves",
});

export const UNIT = entry("UNIT", {
  inputs: [bareNumber("value"), unitInput("from"), optional(unitInput("to"))],
  result: quantities.number,
  compute: (value, from, to) => {
    const target = to ?? ownUnit(from);
    const converted = convertUnit(value, from, target, parseUnit("K")!.dimension, parseUnit("J")!.dimension);
    return (
      converted ??
      badInput("to", `"${target.text}" measures something else than "${from.text}"`, adviceFor(from, target))
    );
  },
  equation: String.raw`x_\mathrm{to} = x_\mathrm{from}\,\frac{[\mathrm{from}]}{[\mathrm{to}]}`,
  twin: "it reads units as text",
  sources: [CODATA],
  changes: first,
  example: [1e11, "cm^-3"],
  accuracy: "one factor, 4 ulp",
});

/** Rows of ABOUT; the front door knows how many functions there are. */
export function aboutRows(functionCount: number): (string | number)[][] {
  return [
    ["Wallfall version", version],
    ["constants", "CODATA 2022"],
    ["functions", functionCount],
    ["built", built],
  ];
}

export const ABOUT = entry("ABOUT", {
  inputs: [],
  result: {
    columns: [
      { name: "item", unit: "" },
      { name: "value", unit: "" },
    ],
  },
  compute: () => aboutRows(0),
  equation: "",
  twin: "it computes nothing",
  sources: [CODATA],
  changes: first,
  example: [],
  accuracy: "exact",
});

export const helpers: Family = { title: "Helpers", entries: [IONMASS, CONSTANT, UNIT, ABOUT] };

/** A number whose unit stands elsewhere: "5 %" beside "%" would be converted twice. */
function bareNumber(name: string): Input<number> {
  const number = quantityInput(name, quantities.number);
  return {
    ...number,
    read: (cell) =>
      typeof cell === "string" && cell.includes("%")
        ? badInput(name, `"${cell.trim()}" carries a unit of its own`, "type the number alone, and its unit in from")
        : number.read(cell),
  };
}

/** Text that names a unit, the amplitudes of an oscilloscope included. */
function unitInput(name: string): Input<Unit> {
  return {
    name,
    optional: false,
    blank: undefined,
    zeroIsValue: false,
    least: 1,
    most: 0,
    kind: "text",
    example: '"cm^-3"',
    read: (cell) => {
      const wanted = 'type a unit such as "cm^-3", "mTorr" or "K"';
      if (typeof cell !== "string") return badInput(name, "a unit is text", wanted);
      const swing = readSwing(cell);
      const unit = swing ? { ...parseUnit("V")!, ...swing, text: cell } : parseUnit(cell.trim());
      return unit ?? badInput(name, `"${cell.trim().slice(0, 40)}" is not a unit known here`, wanted);
    },
  };
}

/** The unit that our functions read a bare number of this dimension in; SI where they have none of it. */
function ownUnit(from: Unit): Unit {
  const own = Object.values(quantities)
    .map(({ unit }) => parseUnit(unit))
    .find((unit) => unit?.dimension === from.dimension);
  return own ?? { text: "SI", scale: 1, offset: 0, dimension: from.dimension };
}

function adviceFor(from: Unit, target: Unit): string {
  const cycles = parseUnit("Hz")!.dimension;
  const radians = parseUnit("rad/s")!.dimension;
  const both = [from.dimension, target.dimension];
  if (both.includes(cycles) && both.includes(radians)) {
    return "cycles and radians are not mixed silently: write the factor 2π into the formula";
  }
  return `type a unit that ${prettyUnit(from.text)} converts to`;
}
