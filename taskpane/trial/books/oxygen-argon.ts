import { normalNumbers, xoshiro128 } from "../../../functions/numerics/random";
import type { Column, OpeningSheet } from "./opening-sheet";

/** n₋/n_e in the body: 0, then ten to the decade from 0.1 to 10. */
const electronegativities = [0, ...Array.from({ length: 20 }, (_, i) => toDigits(0.1 * 10 ** ((i + 1) / 10), 3))];

/** The share of argon among the positive ions, a pair of rows each. */
const argonShares = [0.02, 0.1, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9, 0.98];

/**
 * An invented probability function as a probe gives it, with the bulk's temperature falling off towards the inelastic
 * thresholds, 2 % noise and a floor of it that drowns the tail. The seed is part of the invention: the data never change.
 */
const points = 200;
const energies = Array.from({ length: points }, (_, i) => toDigits(0.2 + 0.19 * i, 4));
const eepf = noisy(energies.map((E) => 7.5e15 * Math.exp(-E / 2.9 - (E / 24) ** 2)));

function noisy(values: readonly number[]): number[] {
  const noise = normalNumbers(xoshiro128([2, 7, 18, 28]));
  return values.map((value) => toDigits(value * (1 + 0.02 * noise()) + values[0] * 4e-6 * noise(), 4));
}

const negativeIons = inTable(electronegativities.length, [
  {
    key: "alpha_b",
    heading: "n₋/n_e in the body",
    group: "Negative ions: from the body to the edge and the wall",
    width: 86,
    typed: electronegativities,
  },
  {
    key: "n_e",
    heading: "Electrons in the body",
    unit: "m⁻³",
    width: 84,
    format: "0.00E+00",
    each: ({ n_plus, alpha_b }) => `=${n_plus}/(1+${alpha_b})`,
  },
  {
    key: "alpha_s",
    heading: "n₋/n_e at the edge",
    width: 84,
    format: "0.0000",
    fills: ({ alpha_b, gamma }) => `=SHEATH.NEGATIVEIONEDGE(${alpha_b},${gamma})`,
  },
  { key: "drop", heading: "Drop over T_e", width: 84, format: "0.0000" },
  { key: "ratio", heading: "n_e edge over body", width: 80, format: "0.0000" },
  { key: "u", heading: "Speed over u_B", width: 80, format: "0.0000" },
  {
    key: "n_edge",
    heading: "Electrons at the edge",
    unit: "m⁻³",
    width: 84,
    format: "0.00E+00",
    each: ({ n_e, ratio }) => `=${n_e}*${ratio}`,
  },
  {
    key: "negativeFlux",
    heading: "Positive-ion flux",
    unit: "m⁻² s⁻¹",
    width: 84,
    format: "0.00E+00",
    fills: ({ n_edge, T_e, ion, alpha_s, gamma }) =>
      `=SHEATH.NEGATIVEIONFLUX(${n_edge},${T_e},${ion},${alpha_s},${gamma})`,
  },
  {
    key: "V_f",
    heading: "Floating wall",
    unit: "V",
    format: "0.00",
    fills: ({ T_e, ion, alpha_s, gamma }) => `=SHEATH.NEGATIVEIONPOTENTIAL(${T_e},${ion},${alpha_s},${gamma})`,
  },
  {
    key: "negativeCheck",
    heading: "Limits",
    width: 120,
    format: "words",
    fills: ({ T_e, ion, alpha_s, gamma }) =>
      `=SHEATH.LIMITCHECK("NEGATIVEIONPOTENTIAL",${T_e},${ion},${alpha_s},${gamma})`,
  },
]);

const gasMix = inTable(2 * argonShares.length, [
  {
    key: "mixIon",
    heading: "Ions",
    group: "Gas mix: one call for each pair of ions, with the fractions beside them",
    width: 56,
    typed: argonShares.flatMap(() => ["Ar+", "O2+"]),
  },
  {
    key: "fraction",
    heading: "Fraction of n_e",
    width: 78,
    format: "0.00",
    typed: argonShares.flatMap((share) => [share, toDigits(1 - share, 3)]),
  },
  {
    key: "speedOf",
    heading: "Ion",
    width: 48,
    every: 2,
    fills: ({ T_e, mixIon, fraction, rule }) => `=SHEATH.IONMIXSPEEDS(${T_e},${mixIon},${fraction},${rule})`,
  },
  { key: "speed", heading: "Speed at the edge", unit: "m/s", format: "0" },
  { key: "speedRatio", heading: "Over its own u_B", width: 80, format: "0.000" },
  {
    key: "fluxOf",
    heading: "Ion",
    width: 48,
    every: 2,
    fills: ({ n_plus, T_e, mixIon, fraction, rule }) =>
      `=SHEATH.IONMIXFLUXES(${n_plus},${T_e},${mixIon},${fraction},${rule})`,
  },
  { key: "flux", heading: "Flux to the wall", unit: "m⁻² s⁻¹", width: 84, format: "0.00E+00" },
  { key: "J", heading: "Current density", unit: "A/m²", width: 78, format: "0.00" },
  {
    key: "mixCheck",
    heading: "Limits",
    width: 150,
    format: "words",
    every: 2,
    fills: ({ n_plus, T_e, mixIon, fraction, rule }) =>
      `=SHEATH.LIMITCHECK("IONMIXFLUXES",${n_plus},${T_e},${mixIon},${fraction},${rule})`,
  },
]);

type Row = (i: number) => Readonly<Record<string, string>>;

const moments = ({ energy, eepf }: ReturnType<Row>) => `SHEATH.EEPFMOMENTS(${energy},${eepf})`;

/** A line of what the points come to; the moments themselves are filled in by one formula. */
interface Reading {
  name: string;
  format: string;
  value?: (range: ReturnType<Row>, row: Row) => string;
}

const readings: readonly Reading[] = [
  { name: "Density, m⁻³", format: "0.000E+00" },
  { name: "Mean energy, eV", format: "0.000" },
  { name: "Effective temperature, eV", format: "0.000" },
  { name: "Screening temperature, eV", format: "0.000" },
  { name: "Random flux, m⁻² s⁻¹", format: "0.000E+00" },
  { name: "Points used", format: "0", value: (range) => `=INDEX(${moments(range)},1,11)` },
  { name: "Last energy used, eV", format: "0.00", value: (range) => `=INDEX(${moments(range)},1,12)` },
  {
    name: "Bohm speed from screening, m/s",
    format: "0",
    value: ({ ion }, row) => `=SHEATH.BOHMSPEED(${row(3).value},${ion})`,
  },
  {
    name: "Floating wall, as measured, V",
    format: "0.00",
    value: ({ energy, eepf, ion }) => `=SHEATH.EEPFFLOATING(${energy},${eepf},${ion})`,
  },
  {
    name: "Floating wall, were it Maxwellian, V",
    format: "0.00",
    value: ({ ion }, row) => `=SHEATH.FLOATINGPOTENTIAL(${row(2).value},${ion})`,
  },
  {
    name: "Limits of the moments",
    format: "words",
    value: ({ energy, eepf }) => `=SHEATH.LIMITCHECK("EEPFMOMENTS",${energy},${eepf})`,
  },
  {
    name: "Limits of the floating wall",
    format: "words",
    value: ({ energy, eepf, ion }) => `=SHEATH.LIMITCHECK("EEPFFLOATING",${energy},${eepf},${ion})`,
  },
  { name: "What was done to the points", format: "words", value: (range) => `=INDEX(${moments(range)},1,13)` },
];

const measured: Column[] = [
  {
    key: "energy",
    heading: "Electron energy",
    unit: "eV",
    group: "Measured electrons: 200 points of a probe, and what they come to",
    format: "0.00",
    typed: energies,
  },
  { key: "eepf", heading: "Probability function", unit: "eV⁻³ᐟ² m⁻³", width: 92, format: "0.000E+00", typed: eepf },
  {
    key: "what",
    heading: "From the points",
    width: 220,
    rows: readings.length,
    format: "words",
    each: (_, i) => readings[i].name,
  },
  {
    key: "value",
    heading: "Value",
    width: 84,
    rows: readings.length,
    format: (i) => readings[i].format,
    fills: (range) => `=WRAPROWS(TAKE(${moments(range)},1,10),2)`,
    each: (_, i, row, range) => readings[i].value?.(range, row),
  },
  {
    key: "error",
    heading: "95 % bound",
    width: 84,
    rows: 5,
    format: (i) => readings[i].format.replace("0.000E", "0.0E"),
  },
];

export const oxygenArgon: OpeningSheet = {
  name: "Oxygen–argon",
  title: "Oxygen–argon RF source: negative ions, two gases, and electrons as measured",
  about: [
    "Invented. Fewer electrons are left as negative ions grow in number; the ratio T_e/T₋ decides how far they reach the wall.",
    "Change any typed cell. Above T_e/T₋ = 9.9 some discharges have three edges, which no single row can hold: the column then says so.",
  ],
  settings: [
    { key: "ion", label: "Positive ion", value: "O2+" },
    { key: "n_plus", label: "Positive ions, m⁻³", value: 6e16, format: "0.00E+00" },
    { key: "T_e", label: "Electron temperature, eV", value: 2.8, format: "0.00" },
    { key: "rule", label: "Ion speeds", value: "common" },
    { key: "T_n", label: "Negative ions, eV", value: 0.35, format: "0.00" },
    { key: "gamma", label: "T_e over T₋", format: "0.00", value: ({ T_e, T_n }) => `=${T_e}/${T_n}` },
  ],
  rows: points,
  columns: [...negativeIons, gap("gap1"), ...gasMix, gap("gap2"), ...measured],
};

function gap(key: string): Column {
  return { key, heading: "", gap: true, width: 24 };
}

/** Columns of a table that is shorter than the sheet. */
function inTable(rows: number, columns: readonly Column[]): Column[] {
  return columns.map((column) => ({ ...column, rows }));
}

function toDigits(value: number, digits: number): number {
  return Number(value.toPrecision(digits));
}
