import type { OpeningSheet } from "./opening-sheet";

/** An invented sweep: five pressures by eight powers, each with density and temperature as a probe might give them. */
const runs = [2, 4, 6, 10, 20].flatMap((pressure) =>
  [100, 150, 200, 250, 300, 350, 400, 500].map((power) => ({
    pressure,
    power,
    density: toDigits(1.3e14 * power * pressure ** 0.35, 3),
    temperature: toDigits(4.4 * pressure ** -0.2 + power / 2000, 3),
  })),
);

/** Readings as they come: one typed with its unit, and one where the meter was out of range. */
const densities = runs.map(({ density }, i) => (i === 4 ? "5e10 cm^-3" : i === 10 ? "OL" : density));

export const preClean: OpeningSheet = {
  name: "Pre-clean",
  title: "Argon pre-clean chamber: ions at the wafer over power and pressure",
  about: [
    "Invented probe readings of the plasma body. Change any typed cell and the columns beside it follow.",
    "Run 11 holds the OL of a meter out of range: only its own row shows an error. Select an error cell to read why.",
  ],
  settings: [
    { key: "ion", label: "Ion", value: "Ar+" },
    { key: "area", label: "Wafer area, cm²", value: 707 },
  ],
  rows: runs.length,
  columns: [
    { key: "run", heading: "Run", width: 44, typed: runs.map((_, i) => i + 1) },
    { key: "pressure", heading: "Pressure", unit: "mTorr", width: 66, typed: runs.map(({ pressure }) => pressure) },
    { key: "power", heading: "Power", unit: "W", width: 56, typed: runs.map(({ power }) => power) },
    { key: "n", heading: "Density", unit: "m⁻³", width: 84, format: "0.00E+00", typed: densities },
    {
      key: "T_e",
      heading: "Electron temperature",
      unit: "eV",
      width: 86,
      format: "0.00",
      typed: runs.map(({ temperature }) => temperature),
    },
    {
      key: "debye",
      heading: "Debye length",
      unit: "mm",
      format: "0.0000",
      fills: ({ n, T_e }) => `=SHEATH.DEBYELENGTH(${n},${T_e},,"mm")`,
    },
    {
      key: "bohm",
      heading: "Bohm speed",
      unit: "m/s",
      format: "0",
      fills: ({ T_e, ion }) => `=SHEATH.BOHMSPEED(${T_e},${ion})`,
    },
    {
      key: "floating",
      heading: "Floating wall",
      unit: "V",
      format: "0.00",
      fills: ({ T_e, ion }) => `=SHEATH.FLOATINGPOTENTIAL(${T_e},${ion})`,
    },
    {
      key: "flux",
      heading: "Ion flux",
      unit: "m⁻² s⁻¹",
      format: "0.00E+00",
      fills: ({ n, T_e, ion }) => `=SHEATH.WALLFLUX(${n},${T_e},${ion})`,
    },
    {
      key: "density",
      heading: "Ion current density",
      unit: "mA/cm²",
      width: 80,
      format: "0.000",
      fills: ({ n, T_e, ion }) => `=SHEATH.IONCURRENTDENSITY(${n},${T_e},${ion},,,,"mA/cm^2")`,
    },
    {
      key: "current",
      heading: "Current to wafer",
      unit: "A",
      format: "0.00",
      each: ({ density, area }) => `=${density}*${area}/1000`,
    },
    {
      key: "check",
      heading: "Model limits",
      width: 240,
      format: "words",
      fills: ({ n, T_e, ion }) => `=SHEATH.LIMITCHECK("IONCURRENTDENSITY",${n},${T_e},${ion})`,
    },
  ],
};

function toDigits(value: number, digits: number): number {
  return Number(value.toPrecision(digits));
}
