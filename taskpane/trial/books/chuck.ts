import type { Column, OpeningSheet } from "./opening-sheet";

/** Bias readings of an invented chuck against ground: 20 to the decade, from −20 V to −2 kV. */
const readings = Array.from({ length: 41 }, (_, i) => -Number((20 * 10 ** (i / 20)).toPrecision(3)));

const checkWidth = 104;

/** A width by one model, and beside it whether that model may be believed there. */
function width(model: string, heading: string, group?: string): Column[] {
  const takesPath = model !== "matrix";
  return [
    {
      key: model,
      heading,
      unit: "mm",
      group,
      width: 78,
      format: "0.000",
      fills: ({ V_w, n_edge, T_e, lambda_i }) =>
        `=SHEATH.SHEATHWIDTH(${V_w},${n_edge},${T_e},"${model}",${takesPath ? lambda_i : ""},"mm")`,
    },
    check(
      `${model}Check`,
      ({ V_w, n_edge, T_e, lambda_i }) =>
        `"SHEATHWIDTH",${V_w},${n_edge},${T_e},"${model}"${takesPath ? `,${lambda_i}` : ""}`,
    ),
  ];
}

function check(key: string, inputs: (range: Readonly<Record<string, string>>) => string): Column {
  return {
    key,
    heading: "Limits",
    width: checkWidth,
    format: "words",
    fills: (range) => `=SHEATH.LIMITCHECK(${inputs(range)})`,
  };
}

const profile: Column[] = [
  {
    key: "x",
    heading: "",
    group: "Inside the sheath at the bias chosen above",
    width: 80,
    format: "0.000E+00",
    titled: true,
    fills: ({ bias, V_plasma, T_e, n_edge }) =>
      `=SHEATH.SHEATHPROFILE(SHEATH.WALLTOEDGE(${bias},${V_plasma},${T_e}),${n_edge},${T_e},,40,TRUE)`,
  },
  { key: "potential", heading: "", width: 92, format: "0.00", titled: true },
  { key: "field", heading: "", width: 80, format: "0.00E+00", titled: true },
  { key: "n_i", heading: "", width: 88, format: "0.00E+00", titled: true },
  { key: "n_e", heading: "", width: 80, format: "0.00E+00", titled: true },
  { key: "speed", heading: "", width: 80, format: "0.00", titled: true },
];

export const chuck: OpeningSheet = {
  name: "Chuck",
  title: "Biased wafer chuck in argon: what the wall sees from 20 V to 2 kV",
  about: [
    "Invented readings. The tool reads the chuck against ground; the sheath begins where the plasma potential has fallen by the presheath.",
    "Every model stands beside its own limits: a width next to “fails” is a number, not an answer. Change any typed cell.",
  ],
  settings: [
    { key: "ion", label: "Ion", value: "Ar+" },
    { key: "n_bulk", label: "Density of the body, m⁻³", value: 3e16, format: "0.00E+00" },
    { key: "T_e", label: "Electron temperature, eV", value: 3.2, format: "0.00" },
    { key: "V_plasma", label: "Plasma against ground, V", value: 18 },
    { key: "p", label: "Argon pressure", value: "1 mTorr" },
    {
      key: "n_edge",
      label: "Density at the edge, m⁻³",
      format: "0.00E+00",
      value: ({ n_bulk }) => `=${n_bulk}*SHEATH.EDGERATIO("free")`,
    },
    {
      key: "lambda_i",
      label: "Ion mean free path, m",
      format: "0.0000",
      value: ({ p }) => `=SHEATH.MEANFREEPATH(${p},"Ar")`,
    },
    { key: "bias", label: "Profile at a bias of, V", value: -400 },
    {
      key: "all",
      label: "All limits below",
      format: "words",
      value: (range) =>
        `=SHEATH.VERDICT(${["full", "child", "matrix", "collisional", "field", "energy", "heat"].map((of) => range[`${of}Check`]).join(",")})`,
    },
  ],
  rows: readings.length,
  columns: [
    { key: "step", heading: "Step", width: 44, typed: readings.map((_, i) => i + 1) },
    {
      key: "V_wall",
      heading: "Chuck to ground",
      unit: "V",
      width: 92,
      format: "0.0",
      typed: readings,
    },
    {
      key: "V_w",
      heading: "Wall to edge",
      unit: "V",
      format: "0.0",
      fills: ({ V_wall, V_plasma, T_e }) => `=SHEATH.WALLTOEDGE(${V_wall},${V_plasma},${T_e})`,
    },
    ...width("full", "Full", "Width of the sheath, by four models"),
    ...width("child", "Child law"),
    ...width("matrix", "Ion matrix"),
    ...width("collisional", "Collisional"),
    {
      key: "E",
      heading: "Field at the wall",
      unit: "kV/cm",
      group: "At the wall",
      format: "0.000",
      fills: ({ V_w, n_edge, T_e }) => `=SHEATH.WALLFIELD(${V_w},${n_edge},${T_e},,"kV/cm")`,
    },
    check("fieldCheck", ({ V_w, n_edge, T_e }) => `"WALLFIELD",${V_w},${n_edge},${T_e}`),
    {
      key: "energy",
      heading: "Impact energy",
      unit: "eV",
      format: "0.0",
      fills: ({ V_w, T_e, ion }) => `=SHEATH.IONIMPACTENERGY(${T_e},${ion},,${V_w})`,
    },
    check("energyCheck", ({ V_w, T_e, ion }) => `"IONIMPACTENERGY",${T_e},${ion},,${V_w}`),
    {
      key: "q",
      heading: "Heat flux",
      unit: "W/cm²",
      format: "0.000",
      fills: ({ V_w, n_bulk, T_e, ion }) => `=SHEATH.WALLHEATFLUX(${n_bulk},${T_e},${ion},,${V_w},,,,,"W/cm^2")`,
    },
    check("heatCheck", ({ V_w, n_bulk, T_e, ion }) => `"WALLHEATFLUX",${n_bulk},${T_e},${ion},,${V_w}`),
    { key: "gap", heading: "", gap: true, width: 24 },
    ...profile,
  ],
};
