import { xoshiro128 } from "../../../functions/numerics/random";
import type { FileBook } from "../../workbook/xlsx-book";
import { bookOf } from "./book";
import { SampleSheet, type Cells } from "./sample-sheet";

const readings = 500;
const first = 5;
const last = first + readings - 1;
const table = "ProbeLog";
const columns = [
  "Reading",
  "Pressure Pa",
  "Density m-3",
  "Temperature eV",
  "Debye length mm",
  "Ion flux m-2 s-1",
  "Flux over mean",
  "Limits",
];

/** An invented log: the chamber drifts through its pressures while a probe reads, with scatter of a few per cent. */
export function probeLog(): FileBook {
  const sheet = new SampleSheet("Log");
  sheet.widths = [70, 90, 100, 110, 120, 130, 110, 200];
  sheet.frozenRows = first - 1;
  sheet.heights[first - 2] = 40;
  sheet.type("A1", "Probe log of 500 readings, as a table", "title");
  sheet.type(
    "A2",
    "Invented readings in argon. In a table each row has calls of its own: a spreadsheet lets no formula fill one.",
    "note",
  );
  columns.forEach((name, at) => sheet.type(`${"ABCDEFGH"[at]}${first - 1}`, name, "heading"));
  const random = uniform();
  for (let row = first; row <= last; row++) putReading(sheet, row, random);
  putFluxes(sheet);
  sheet.tables.push({ name: table, range: `A${first - 1}:H${last}`, columns: tableColumns() });
  return bookOf(sheet, summarySheet(sheet));
}

const inRow = (column: string) => `${table}[[#This Row],[${column}]]`;
const fluxOverMean = `=${inRow("Ion flux m-2 s-1")}/AVERAGE(${table}[Ion flux m-2 s-1])`;

function putReading(sheet: SampleSheet, row: number, random: () => number): void {
  const i = row - first;
  const scatter = (size: number) => 1 + size * (random() + random() + random() - 1.5);
  const pressure = 0.6 + 1.8 * (0.5 - 0.5 * Math.cos(i / 60));
  sheet.type(`A${row}`, i + 1);
  sheet.type(`B${row}`, toDigits(pressure * scatter(0.02), 3), "typed", "0.00");
  sheet.type(`C${row}`, toDigits(3e16 * pressure ** 0.4 * scatter(0.06), 3), "typed", "0.00E+00");
  sheet.type(`D${row}`, toDigits(3.4 * pressure ** -0.18 * scatter(0.04), 3), "typed", "0.00");
  const [n, T_e] = [named(sheet, "C", row), named(sheet, "D", row)];
  sheet.call(`E${row}`, "DEBYELENGTH", [n, T_e, undefined, "mm"], "calculated", "0.0000");
  sheet.call(`F${row}`, "WALLFLUX", [n, T_e, "Ar+"], "calculated", "0.00E+00");
  sheet.call(`H${row}`, "LIMITCHECK", ["WALLFLUX", n, T_e, "Ar+"], "words");
}

/** A cell of the table's own row, as a formula in a table names it. */
function named(sheet: SampleSheet, letter: string, row: number): Cells {
  return sheet.at(`${letter}${row}`, inRow(columns["ABCDEFGH".indexOf(letter)]));
}

function putFluxes(sheet: SampleSheet): void {
  const mean = average(sheet.numbers(`F${first}:F${last}`));
  for (let row = first; row <= last; row++)
    sheet.native(`G${row}`, fluxOverMean, sheet.number(`F${row}`) / mean, "calculated", "0.000");
}

function tableColumns() {
  const [n, T_e] = [inRow(columns[2]), inRow(columns[3])];
  const formulas: Record<string, string> = {
    [columns[4]]: `=SHEATH.DEBYELENGTH(${n},${T_e},,"mm")`,
    [columns[5]]: `=SHEATH.WALLFLUX(${n},${T_e},"Ar+")`,
    [columns[6]]: fluxOverMean,
    [columns[7]]: `=SHEATH.LIMITCHECK("WALLFLUX",${n},${T_e},"Ar+")`,
  };
  return columns.map((name) => (formulas[name] ? { name, formula: formulas[name] } : { name }));
}

function summarySheet(log: SampleSheet): SampleSheet {
  const sheet = new SampleSheet("Summary");
  sheet.widths = [260, 140];
  sheet.type("A1", "The log in a few numbers", "title");
  const [densities, fluxes] = [log.numbers(`C${first}:C${last}`), log.numbers(`F${first}:F${last}`)];
  const rows: [label: string, formula: string, value: number, format: string][] = [
    ["Readings", `=COUNT(${table}[Reading])`, readings, "0"],
    ["Mean density, m⁻³", `=AVERAGE(${table}[Density m-3])`, average(densities), "0.00E+00"],
    ["Lowest ion flux, m⁻² s⁻¹", `=MIN(${table}[Ion flux m-2 s-1])`, Math.min(...fluxes), "0.00E+00"],
    ["Highest ion flux, m⁻² s⁻¹", `=MAX(${table}[Ion flux m-2 s-1])`, Math.max(...fluxes), "0.00E+00"],
  ];
  rows.forEach(([label, formula, value, format], i) =>
    sheet.type(`A${3 + i}`, label, "label").native(`B${3 + i}`, formula, value, "calculated", format),
  );
  sheet.type("A8", "Whether the fluxes may be believed", "label");
  sheet.call("B8", "VERDICT", [log.at(`H${first}:H${last}`, `${table}[Limits]`)], "words");
  return sheet;
}

function average(values: readonly number[]): number {
  return values.reduce((sum, value) => sum + value, 0) / values.length;
}

function toDigits(value: number, digits: number): number {
  return Number(value.toPrecision(digits));
}

/** Between 0 and 1, the same numbers in every build. */
function uniform(): () => number {
  const bits = xoshiro128([500, 2, 3, 4]);
  for (let i = 0; i < 20; i++) bits();
  return () => bits() / 2 ** 32;
}
