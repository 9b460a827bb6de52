import { describe, expect, test } from "vitest";
import { catalogue } from "../functions/catalogue";
import { Fault } from "../functions/cells/fault";
import { isCellError } from "../functions/cells/host";
import { frontDoors } from "../functions/front-doors";

/** Calls that work: each bad call below changes one argument of its function in the middle one of three rows. */
const good: Record<string, unknown[]> = {
  DEBYELENGTH: [1e16, 3],
  BOHMSPEED: [3, "Ar+", 0.1, 1],
  MEANFREEPATH: [0.7, 1e-18, 300],
  COLLISIONALBOHMSPEED: [3, "Ar+", 1e16, 1e-3],
  EDGEDECAYLENGTH: [1e16, 3, "Ar+", 4000],
  EDGERATIO: ["slab", 0.1, 0.01],
  PRESHEATHDROP: [3, 0.6],
  WALLTOEDGE: [-120, 25, 3],
  WALLFLUX: [1e17, 3, "Ar+", 0.1, 0.6, 45],
  FLOATINGPOTENTIAL: [3, "Ar+", 0.1, 0.2],
  IONMASS: ["Ar+"],
  UNIT: [5, "mTorr", "Pa"],
  CONSTANT: ["e"],
  PLASMAFREQUENCY: [1e16, "Ar+"],
  WALLFIELD: [300, 1e16, 3, 1],
  EROSIONRATE: [1e20, 0.5, "Si", 2330, "nm/min"],
  CHILDCURRENT: [300, 1e-3, "Ar+"],
  RFCHILDCURRENT: [300, 5e-3, "Ar+"],
  NEGATIVEIONBOHMSPEED: [3, "Ar+", 1, 15],
};

type Case = [call: string, position: number, given: unknown, says: RegExp];

const error = (code: string) => ({ code });

const cases: Case[] = [
  // Blank where a value is needed
  ["DEBYELENGTH", 0, null, /^n_e is blank or 0; type a value such as 1e16 m\^-3\.$/],
  ["DEBYELENGTH", 0, 0, /^n_e is blank/],
  ["DEBYELENGTH", 1, "", /^T_e is blank or 0; type a value such as 3 eV\.$/],
  ["BOHMSPEED", 1, null, /^ion is blank; type a value such as "Ar\+"\.$/],
  ["UNIT", 1, "", /^from is blank; type a value such as "cm\^-3"\.$/],
  ["EROSIONRATE", 2, null, /^formula is blank; type a value such as "Si"\.$/],
  ["NEGATIVEIONBOHMSPEED", 3, null, /^gamma is blank or 0; type a value such as 15\.$/],
  // Below zero, zero, beyond the range
  ["DEBYELENGTH", 0, -1e16, /^n_e: -1e16 is below the lowest value; type a density above 0/],
  ["DEBYELENGTH", 1, -3, /^T_e: -3 is below/],
  ["DEBYELENGTH", 1, "-3 eV", /^T_e: "-3 eV" is below/],
  ["BOHMSPEED", 2, -0.1, /^T_i: -0.1 is below the lowest value; type a temperature of at least 0 eV/],
  ["BOHMSPEED", 3, 5, /^gamma_i: 5 is above the highest value/],
  ["BOHMSPEED", 3, 0.5, /^gamma_i: 0.5 is below the lowest value; type a ratio of at least 1, such as 1.5\.$/],
  ["WALLFIELD", 3, 0.5, /^u_ratio: 0.5 is below the lowest value; type a ratio of at least 1, such as 1.5\.$/],
  ["PRESHEATHDROP", 1, 1.5, /^edge_ratio: 1.5 is above the highest value; type a ratio of at most 1/],
  ["PRESHEATHDROP", 1, "150 %", /^edge_ratio: "150 %" is above/],
  ["WALLFLUX", 5, 120, /^angle: 120 is above the highest value; type an angle of at most 90 deg, such as 5 deg\.$/],
  ["MEANFREEPATH", 0, -5, /^p: -5 is below/],
  ["FLOATINGPOTENTIAL", 3, -0.1, /^delta_e: -0.1 is below/],
  // Text that is no quantity
  ["DEBYELENGTH", 0, "high", /^n_e: "high" is not a density; type a density such as 1e16 m\^-3/],
  ["DEBYELENGTH", 0, "OL", /^n_e: "OL" is an instrument's word for no reading/],
  ["DEBYELENGTH", 0, "n/a", /instrument's word/],
  ["DEBYELENGTH", 0, "-----", /instrument's word/],
  ["MEANFREEPATH", 0, "NaN", /instrument's word/],
  ["DEBYELENGTH", 0, "2026-12-01", /^n_e: "2026-12-01" looks like a date/],
  ["DEBYELENGTH", 0, "1/2/2026", /looks like a date/],
  ["DEBYELENGTH", 0, true, /^n_e: TRUE is not a number/],
  ["DEBYELENGTH", 1, false, /^T_e: FALSE is not a number/],
  ["DEBYELENGTH", 0, "1,500", /may mean a thousand or a decimal/],
  ["DEBYELENGTH", 0, "1e16 m^-3 to 1e17", /is not a unit known here/],
  ["DEBYELENGTH", 0, "1e16 1e17 m^-3", /is not a unit known here/],
  ["DEBYELENGTH", 0, "=A1", /is not a density/],
  ["DEBYELENGTH", 0, Infinity, /^n_e: ∞ is not a finite number/],
  ["DEBYELENGTH", 0, NaN, /is not a finite number/],
  // Units of something else
  ["DEBYELENGTH", 0, "5 mTorr", /"mTorr" is a unit of pressure, not a unit of density/],
  ["DEBYELENGTH", 0, "1e16 m^-2", /not a unit of density/],
  ["DEBYELENGTH", 0, "1e10 cm3", /"cm3" is a unit of volume, not a unit of density; type a density such as 1e16 m\^-3/],
  ["DEBYELENGTH", 1, "3 V", /"V" is a unit of voltage, not a unit of temperature/],
  ["DEBYELENGTH", 1, "5 %", /"%" is a unit of ratio/],
  [
    "MEANFREEPATH",
    0,
    "5 mT",
    /^p: "mT" is a unit of magnetic field, not a unit of pressure; write mTorr if that is meant/,
  ],
  ["MEANFREEPATH", 2, "25 C", /^T_g: "C" is a unit of charge, not a unit of temperature; write °C if that is meant\.$/],
  ["EROSIONRATE", 4, "A/min", /^unit: .* the result is an erosion rate, so write Å\/min if that is meant\.$/],
  ["MEANFREEPATH", 0, "10 sccm", /"sccm" in "10 sccm" is not a unit known here/],
  ["MEANFREEPATH", 1, "1e-18 m", /"m" is a unit of length, not a unit of cross-section/],
  ["COLLISIONALBOHMSPEED", 3, "1 mm^2", /not a unit of length/],
  ["WALLTOEDGE", 0, "100 Vpp", /not a unit known here/],
  ["WALLFLUX", 4, "0.6 m", /^edge_ratio: "m" is a unit of length/],
  ["WALLFLUX", 5, "1 sr", /^angle: "sr" in "1 sr" is not a unit known here/],
  // Ions
  ["BOHMSPEED", 1, "Ar2+", /"Ar\^2\+" for the doubly charged ion or "\(Ar2\)\+" for the molecular ion/],
  ["BOHMSPEED", 1, "Ar 2+", /^ion: "Ar 2\+" has its charge where it can't be read; type "Ar\^2\+"\.$/],
  ["BOHMSPEED", 1, "Xe(2+)", /type "Xe\^2\+"\.$/],
  ["BOHMSPEED", 1, "N2 +", /type "N2\+"\.$/],
  ["BOHMSPEED", 1, "argon", /is a name; type the symbol "Ar"/],
  ["BOHMSPEED", 1, "ar+", /nearest symbols: Ar/],
  ["BOHMSPEED", 1, "Qz+", /no element "Qz"/],
  ["BOHMSPEED", 1, "O-", /is not a positive ion/],
  ["BOHMSPEED", 1, "H^2+", /cannot carry the charge 2/],
  ["BOHMSPEED", 1, 6.6e-26, /^ion: 6.6e-26 u is no mass of an ion/],
  ["BOHMSPEED", 1, -40, /no mass of an ion/],
  ["BOHMSPEED", 1, true, /^ion: TRUE is not a number; type a formula such as "Ar\+" or a mass in u/],
  ["BOHMSPEED", 1, 46357, /no mass of an ion/],
  ["IONMASS", 0, "C4F8 plasma", /is not a chemical formula/],
  ["PLASMAFREQUENCY", 1, "e-", /is not a positive ion/],
  // Words
  ["EDGERATIO", 0, "sphere", /^shape: "sphere" is not one of its words; type "free", "slab" or "cylinder"/],
  ["EDGERATIO", 0, 3, /^shape: 3 is not one of its words/],
  ["CONSTANT", 0, "G", /^name: "G" is not one of its words/],
  ["MEANFREEPATH", 1, "SF6", /there is no cross-section here for "SF6"; type an area such as 1e-18 m\^2, or Ar or Xe/],
  ["UNIT", 2, "K", /measures something else than "mTorr"/],
  ["UNIT", 1, "furlong", /"furlong" is not a unit known here/],
  ["UNIT", 1, 5, /^from: a unit is text/],
  // No solution
  ["EDGEDECAYLENGTH", 3, 1000, /Below the Bohm speed 2692 m\/s the potential oscillates.*\(BOHMRATIO tells\)\.$/],
  ["FLOATINGPOTENTIAL", 3, 0.99, /space-charge limit|EMISSIONLIMIT/],
  // Too large for a cell
  ["MEANFREEPATH", 0, 1e-320, /larger than any number a cell can hold/],
  // Incoming errors
  ["DEBYELENGTH", 0, error("#REF!"), /the cell holds #REF!; mend that cell first/],
  ["DEBYELENGTH", 0, error("#NAME?"), /the cell holds #NAME\?/],
];

const rowOf = (call: string, position: number, given: unknown) =>
  good[call].map((cell, i) => (i === position ? given : cell));
const columns = (rows: unknown[][]) => rows[0].map((_, i) => rows.map((row) => [row[i]]));

test("there are at least sixty of them", () => expect(cases.length).toBeGreaterThanOrEqual(60));

describe("a bad call says what to type instead, and its neighbours keep their values", () => {
  test.each(cases)("%s, argument %i: %o", (call, position, given, says) => {
    const rows = [good[call], rowOf(call, position, given), good[call]];
    const result = frontDoors[call](...columns(rows));
    const alone = frontDoors[call](...good[call].map((cell) => [[cell]]))[0][0];
    expect(isCellError(alone), JSON.stringify(alone)).toBe(false);
    expect([result[0][0], result[2][0]]).toEqual([alone, alone]);
    expect(isCellError(result[1][0]), JSON.stringify(result[1][0])).toBe(true);
    expect(result[1][0].message).toMatch(says);
    expect(["#VALUE!", "#N/A"]).toContain(result[1][0].code);
  });

  test.each(["#DIV/0!", "#NUM!", "#NULL!", "#N/A", "#VALUE!"])("an incoming %s stays in its row", (code) => {
    const result = frontDoors.DEBYELENGTH([[1e16], [error(code)], [1e16]], [[3]]);
    expect(result[1][0]).toMatchObject({ code });
    expect(result[0]).toEqual(result[2]);
  });

  test.each(catalogue.flatMap((entry) => entry.inputs.map((input) => [entry.name, input.name, input] as const)))(
    "%s, %s: what a message suggests is a value there",
    (_function, _name, input) => {
      const { example } = input;
      if (example === undefined) return;
      const typed = example.replace(/^"|"$/g, "");
      const value = input.read(input.kind === "block" ? [[typed]] : typed);
      expect(value instanceof Fault ? value.message : "").toBe("");
    },
  );

  test("ranges that do not match are refused with both shapes", () => {
    const [[cell]] = frontDoors.DEBYELENGTH([[1e16], [1e16], [1e16]], [[3], [3]]);
    expect(cell.message).toMatch(/2 rows by 1 column does not match n_e of 3 rows by 1 column/);
  });
});

describe("slips that are numbers like any other get a doubtful-input verdict", () => {
  test.each([
    ["DEBYELENGTH", 0, 1e11, /^doubtful input: n_e 1e11 m⁻³; cm⁻³ meant\?/],
    ["DEBYELENGTH", 1, 35000, /^doubtful input: T_e 35000 eV; K meant\?/],
    ["MEANFREEPATH", 0, 50, /^doubtful input: p 50 Pa; mTorr meant\?/],
    ["MEANFREEPATH", 2, 25, /^doubtful input: T_g 25 K; °C or eV meant\?/],
    ["COLLISIONALBOHMSPEED", 3, 25, /^doubtful input: lambda_i 25 m; mm meant\?/],
    ["CHILDCURRENT", 1, 1.5, /^doubtful input: s 1.5 m; mm meant\?/],
    ["RFCHILDCURRENT", 1, 5, /^doubtful input: s_m 5 m; mm meant\?/],
    ["DEBYELENGTH", 0, 46357, /^doubtful input: n_e 46400 m⁻³/],
    ["EDGEDECAYLENGTH", 3, 4, /doubtful input: u_0 4 m\/s; km\/s meant\?/],
  ] as Case[])("%s, argument %i: %o", (call, position, given, says) => {
    const rows = [good[call], rowOf(call, position, given)];
    const verdicts = frontDoors.LIMITCHECK([[call]], columns(rows));
    expect(verdicts[1][0]).toMatch(says);
    expect(verdicts[0][0]).not.toMatch(/doubtful/);
  });
});
