import type { FileBook } from "../../workbook/xlsx-book";
import { bookOf } from "./book";
import { SampleSheet } from "./sample-sheet";

/** Invented tiles around a deuterium plasma: density, temperatures, area, and what their thermocouples made of the heat. */
const tiles: [tile: string, n_bulk: number, T_e: number, T_i: number, area: number, measured: number][] = [
  ["Inner 1", 2.2e18, 14, 10, 0.031, 1.03],
  ["Inner 2", 3.1e18, 17, 12, 0.031, 0.96],
  ["Inner 3", 4.6e18, 19, 15, 0.028, 1.05],
  ["Floor 1", 6.0e18, 22, 18, 0.024, 0.97],
  ["Floor 2", 7.4e18, 25, 20, 0.024, 1.02],
  ["Floor 3", 6.6e18, 23, 19, 0.024, 0.95],
  ["Outer 1", 5.1e18, 20, 16, 0.028, 1.04],
  ["Outer 2", 3.4e18, 18, 13, 0.031, 0.98],
  ["Outer 3", 2.5e18, 15, 11, 0.031, 1.01],
];
const first = 8;
const last = first + tiles.length - 1;
const total = last + 2;

export function wallHeat(): FileBook {
  const sheet = new SampleSheet("Budget");
  sheet.widths = [80, 84, 92, 56, 92, 72, 96, 84, 110, 96, 96, 96, 200];
  sheet.frozenRows = first - 1;
  sheet.heights[5] = 40;
  sheet.type("A1", "Wall heat-load budget: nine tiles, each with its check", "title");
  sheet.type("A2", "Invented tiles. Heat by ions and electrons alone: light from the plasma is not in it.", "note");
  sheet.type("A4", "Relative standard uncertainty of these columns", "label");
  [0.15, 0.1, undefined, 0.2].forEach((u, i) => u !== undefined && sheet.type(`${"BCDE"[i]}5`, u, "typed", "0%"));
  sheet.type("H3", "Agreement asked for", "label").type("L3", 0.1, "typed", "0%");
  sheet.type("H4", "Power the cooling takes, kW", "label").type("L4", 900, "typed");
  const headings = [
    ["Tile", ""],
    ["Density", "m⁻³"],
    ["Electron temperature", "eV"],
    ["Ion", ""],
    ["Ion temperature", "eV"],
    ["Area", "m²"],
    ["Heat flux", "MW/m²"],
    ["Power", "kW"],
    ["Measured flux", "MW/m²"],
    ["Agreement", ""],
    ["Heat flux", "W/m²"],
    ["Standard uncertainty", "W/m²"],
    ["Model limits", ""],
  ];
  headings.forEach(([heading, unit], i) => {
    const column = "ABCDEFGHIJKLM"[i];
    sheet.type(`${column}6`, heading, "heading").type(`${column}7`, unit, "unit");
  });
  putTiles(sheet);
  putTotals(sheet);
  return bookOf(sheet);
}

function putTiles(sheet: SampleSheet): void {
  const column = (letter: string) => sheet.at(`${letter}${first}:${letter}${last}`);
  tiles.forEach(([tile, n_bulk, T_e, T_i, area], i) => {
    const row = first + i;
    sheet.type(`A${row}`, tile).type(`B${row}`, n_bulk, "typed", "0.00E+00").type(`C${row}`, T_e);
    sheet.type(`D${row}`, "D+").type(`E${row}`, T_i).type(`F${row}`, area, "typed", "0.000");
  });
  const inputs = ["B", "C", "D", "E"].map(column);
  const megawatts = [...inputs, undefined, undefined, undefined, undefined, undefined, "MW/m^2"];
  sheet.call(`G${first}`, "WALLHEATFLUX", megawatts, "calculated", "0.00");
  tiles.forEach(([, , , , area, measured], i) => {
    const row = first + i;
    const flux = sheet.number(`G${row}`);
    sheet.native(`H${row}`, `=G${row}*F${row}*1000`, flux * area * 1000, "calculated", "0.0");
    sheet.type(`I${row}`, Number((flux * measured).toPrecision(3)), "typed", "0.00");
  });
  sheet.call(`J${first}`, "WITHIN", [column("I"), column("G"), sheet.at("$L$3")], "words");
  sheet.call(
    `K${first}`,
    "UNCERTAINTY",
    ["WALLHEATFLUX", sheet.at(`B${first}:E${last}`), sheet.at("$B$5:$E$5"), undefined, undefined, "value"],
    "calculated",
    "0.00E+00",
  );
  sheet.call(
    `L${first}`,
    "UNCERTAINTY",
    ["WALLHEATFLUX", sheet.at(`B${first}:E${last}`), sheet.at("$B$5:$E$5"), undefined, undefined, "u"],
    "calculated",
    "0.0E+00",
  );
  sheet.call(`M${first}`, "LIMITCHECK", ["WALLHEATFLUX", ...inputs], "words");
}

function putTotals(sheet: SampleSheet): void {
  const powers = sheet.numbers(`H${first}:H${last}`);
  const sum = powers.reduce((so, power) => so + power, 0);
  const areas = tiles.map(([, , , , area]) => area);
  const deviations = areas.map((area, i) => sheet.number(`L${first + i}`) * area);
  const u = Math.sqrt(deviations.reduce((so, each) => so + each * each, 0)) / 1000;
  const columns = { u: `L${first}:L${last}`, area: `F${first}:F${last}` };
  sheet.type(`A${total}`, "Sum of powers, kW", "label");
  sheet.native(`H${total}`, `=SUM(H${first}:H${last})`, sum, "calculated", "0.0");
  sheet.type(`A${total + 1}`, "Its standard uncertainty where the tiles' are independent, kW", "label");
  sheet.native(
    `H${total + 1}`,
    `=SQRT(SUMPRODUCT(${columns.u},${columns.area},${columns.u},${columns.area}))/1000`,
    u,
    "calculated",
    "0.0",
  );
  sheet.type(`A${total + 2}`, "Share of what the cooling takes", "label");
  sheet.native(`H${total + 2}`, `=H${total}/$L$4`, sum / sheet.number("L4"), "calculated", "0%");
  sheet.type(`A${total + 4}`, "All agreements and limits together", "label");
  sheet.call(`H${total + 4}`, "VERDICT", [sheet.at(`J${first}:J${last}`), sheet.at(`M${first}:M${last}`)], "words");
}
