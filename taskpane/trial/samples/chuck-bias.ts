import type { FileBook } from "../../workbook/xlsx-book";
import { bookOf } from "./book";
import { SampleSheet } from "./sample-sheet";

/** Readings of an invented chuck's bias against ground, in V. */
const biases = Array.from({ length: 24 }, (_, i) => -75 - 25 * i);
const first = 10;
const last = first + biases.length - 1;

export function chuckBias(): FileBook {
  const study = studySheet();
  return bookOf(study, summarySheet(study));
}

function studySheet(): SampleSheet {
  const sheet = new SampleSheet("Bias study");
  sheet.widths = [88, 112, 88, 104, 96, 104, 240];
  sheet.frozenRows = first - 1;
  sheet.heights[7] = 56;
  sheet.type("A1", "Chuck bias study: how far the sheath reaches and how hard ions strike", "title");
  sheet.type(
    "A2",
    "Invented readings. Change a tinted cell and all columns follow: one call in row 10 fills a column.",
    "note",
  );
  putSettings(sheet);
  const headings = [
    ["Bias reading", "V"],
    ["Wall below the sheath edge", "V"],
    ["Sheath width", "mm"],
    ["Width over Debye length", ""],
    ["Mean field", "kV/m"],
    ["Ion energy at the wall", "eV"],
    ["Limits of the width's model", ""],
  ];
  headings.forEach(([heading, unit], i) => {
    const column = "ABCDEFG"[i];
    sheet.type(`${column}8`, heading, "heading").type(`${column}9`, unit, "unit");
  });
  putColumns(sheet);
  return sheet;
}

function putSettings(sheet: SampleSheet): void {
  const settings: [label: string, value: string | number, format?: string][] = [
    ["Plasma potential, V", 18],
    ["Density at the sheath edge, m⁻³", 2e16, "0.00E+00"],
    ["Electron temperature, eV", 3.2, "0.0"],
    ["Ion", "Ar+"],
    ["Mean free path of ions, m", 0.06],
  ];
  settings.forEach(([label, value, format], i) =>
    sheet.type(`A${3 + i}`, label, "label").type(`D${3 + i}`, value, "typed", format),
  );
}

function putColumns(sheet: SampleSheet): void {
  biases.forEach((bias, i) => sheet.type(`A${first + i}`, bias));
  const [plasma, n_edge, T_e, ion, lambda_i] = [3, 4, 5, 6, 7].map((row) => sheet.at(`$D$${row}`));
  const [readings, walls] = ["A", "B"].map((letter) => sheet.at(`${letter}${first}:${letter}${last}`));
  sheet.type("E3", "Debye length, mm", "label");
  sheet.call("G3", "DEBYELENGTH", [n_edge, T_e, undefined, "mm"], "calculated", "0.0000");
  sheet.call(`B${first}`, "WALLTOEDGE", [readings, plasma, T_e], "calculated", "0.0");
  sheet.call(`C${first}`, "SHEATHWIDTH", [walls, n_edge, T_e, "full", undefined, "mm"], "calculated", "0.000");
  for (let row = first; row <= last; row++) {
    const [wall, width] = [sheet.number(`B${row}`), sheet.number(`C${row}`)];
    sheet.native(`D${row}`, `=C${row}/$G$3`, width / sheet.number("G3"), "calculated", "0.0");
    sheet.native(`E${row}`, `=-B${row}/C${row}`, -wall / width, "calculated", "0.0");
  }
  sheet.call(`F${first}`, "IONIMPACTENERGY", [T_e, ion, undefined, walls], "calculated", "0.0");
  sheet.call(`G${first}`, "LIMITCHECK", ["SHEATHWIDTH", walls, n_edge, T_e, "full", lambda_i], "words");
}

function summarySheet(study: SampleSheet): SampleSheet {
  const sheet = new SampleSheet("Summary");
  sheet.widths = [260, 120];
  sheet.type("A1", "What the study comes to", "title");
  const column = (letter: string) => `'${study.name}'!${letter}${first}:${letter}${last}`;
  const largest = (letter: string) => Math.max(...study.numbers(`${letter}${first}:${letter}${last}`));
  const rows: [label: string, formula: string, value: number, format: string][] = [
    ["Widest sheath, mm", `=MAX(${column("C")})`, largest("C"), "0.00"],
    ["Largest mean field, kV/m", `=MAX(${column("E")})`, largest("E"), "0.0"],
    ["Highest ion energy, eV", `=MAX(${column("F")})`, largest("F"), "0"],
  ];
  rows.forEach(([label, formula, value, format], i) =>
    sheet.type(`A${3 + i}`, label, "label").native(`B${3 + i}`, formula, value, "calculated", format),
  );
  sheet.type("A7", "Whether the width's model may be believed", "label");
  sheet.call("B7", "VERDICT", [study.at(`G${first}:G${last}`)], "words");
  return sheet;
}
