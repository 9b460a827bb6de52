import * as mathjs from "mathjs";
import { describe, expect, test } from "vitest";
import { Fault } from "../../functions/cells/fault";
import { quantities, type Quantity } from "../../functions/cells/quantities";
import { conversionTo, readQuantityText } from "../../functions/cells/quantity-text";
import { parseUnit } from "../../functions/cells/units";

const read = (quantity: Quantity, text: string) => readQuantityText("x", quantity, text);

describe("spellings of one unit mean the same", () => {
  test.each([
    [
      quantities.density,
      1e17,
      [
        "1e11 cm^-3",
        "1e11 cm-3",
        "1e11 cm⁻³",
        "1e11 /cm3",
        "1e11/cm^3",
        "1e11 1/cm3",
        "1E+11 cm**-3",
        "1e11 per cm3",
        "1e11/cc",
        "1e11 per cc",
        "10^11 cm-3",
        "10¹¹ cm⁻³",
        "1×10^11 cm^-3",
        "1 x 10^11 cm-3",
        "1*10^11 cm-3",
        "1.0·10¹¹ cm⁻³",
      ],
    ],
    [quantities.pressure, 0.666611842105263, ["5 mTorr", "5mtorr", "5 mTORR", "0.005 Torr", "5e-3 torr"]],
    [quantities.magneticField, 0.02, ["200 G", "200 gauss", "200 Gauss", "0.2 kG", "20 mT", "0.02 tesla"]],
    [quantities.length, 1e-6, ["1 um", "1 µm", "1 μm", "1 micron", "10000 Å", "1e-4 cm", "1000nm"]],
    [quantities.currentDensity, 10, ["1 mA/cm2", "1 mA/cm^2", "1 mA cm^-2", "1 mA·cm⁻²", "10 A/m²"]],
    [quantities.erosionRate, 1e-10 / 60, ["1 Å/min", "1 angstrom/min", "0.1 nm/min"]],
    [quantities.frequency, 13.56e6, ["13.56 MHz", "13.56 mhz", "13560 kHz", "13.56e6 hz"]],
    [quantities.temperature, 3, ["3 eV", "3 ev", "3000 meV", "3,0 eV", "0.003 keV", "+3 eV"]],
    [
      quantities.amplitude,
      150,
      ["300 Vpp", "300 V pp", "0.3 kVpp", "300 V p-p", "150 V", "150 Vp", "150 V peak", `${150 / Math.SQRT2} Vrms`],
    ],
    [quantities.probability, 1e21, ["1e15 eV^-1.5 cm^-3", "1e15 eV^(-3/2) cm⁻³", "1e21 eV^-1.5 m^-3"]],
    [quantities.richardson, 602000, ["60.2 A cm^-2 K^-2", "60.2 A/cm²/K²", "60.2 A/(cm^2 K^2)"]],
    [quantities.gasTemperature, 298.15, ["298.15 K", "25 °C", "25 degC"]],
    [quantities.ratio, 0.05, ["5 %", "5%", "0.05"]],
  ] as [Quantity, number, string[]][])("%o", (quantity, value, texts) => {
    for (const text of texts) {
      const got = read(quantity, text);
      expect(got, text).not.toBeInstanceOf(Fault);
      expect(Math.abs((got as number) / value - 1), text).toBeLessThan(4e-15);
    }
  });
});

describe("conversions agree with mathjs, which shares no code", () => {
  test.each([
    ["Torr", "torr", 3e-6] /* rounded there */,
    ["mbar", "mbar"],
    ["atm", "atm"],
    ["bar", "bar"],
    ["angstrom", "angstrom"],
    ["inch", "inch"],
    ["hour", "hour"],
    ["min", "minute"],
    ["W", "W"],
    ["F", "F"],
    ["ohm", "ohm"],
    ["kV", "kV"],
    ["deg", "deg"],
  ] as [string, string, number?][])("%s", (ours, theirs, tolerance = 1e-15) => {
    const unit = mathjs.unit(1, theirs).toSI();
    expect(Math.abs(parseUnit(ours)!.scale / Number(unit.toNumeric(unit.formatUnits())) - 1)).toBeLessThan(tolerance);
  });
});

describe("temperature and energy stand for each other", () => {
  test("1 eV is 11604.518 K (CODATA 2022)", () => {
    expect(1 / conversionTo(quantities.temperature, "K")!.scale).toBeCloseTo(11604.51812, 4);
  });

  test("a gas at 0.025852 eV is at 300 K", () => {
    expect(read(quantities.gasTemperature, "0.025852 eV") as number).toBeCloseTo(300, 1);
  });

  test("a voltage is no temperature", () => {
    expect(read(quantities.temperature, "3 V")).toBeInstanceOf(Fault);
  });
});

describe("what is refused, and how", () => {
  test.each([
    [
      quantities.density,
      "5 mTorr",
      /"mTorr" is a unit of pressure, not a unit of density; type a density such as 1e16 m\^-3/,
    ],
    [quantities.density, "OL", /instrument's word/],
    [quantities.density, "n/a", /instrument's word/],
    [quantities.density, "---", /instrument's word/],
    [quantities.density, "high", /"high" is not a density; type a density such as/],
    [quantities.density, "1e16 foo", /"foo" .* is not a unit known here/],
    [quantities.density, "2026-12-01", /looks like a date/],
    [quantities.density, "12/1/2026", /looks like a date/],
    [quantities.density, "1.12.2026", /looks like a date/],
    [quantities.density, "12:30", /looks like a date or a time/],
    [quantities.density, "1,500 m^-3", /may mean a thousand or a decimal/],
    [quantities.density, "1.500.000 m^-3", /may mean a thousand/],
    [quantities.temperature, "5 %", /"%" is a unit of ratio/],
    [quantities.frequency, "8.5e7 rad/s", /angular frequency, not a unit of frequency/],
    [quantities.voltage, "300 Vpp", /not a unit known here/],
    [quantities.density, "16 m^-3 5", /not a unit known here/],
    [quantities.density, "1e16 0.5 m^-3", /not a unit known here/],
  ] as [Quantity, string, RegExp][])("%o %s", (quantity, text, message) => {
    const got = read(quantity, text);
    expect(got).toBeInstanceOf(Fault);
    expect((got as Fault).code).toBe("#VALUE!");
    expect((got as Fault).message).toMatch(message);
    expect((got as Fault).message).toMatch(/^x: /);
  });

  test.each([
    ["3,5 eV", 3.5],
    ["0,125 eV", 0.125],
    ["12,25 eV", 12.25],
  ])("the decimal comma of %s is plain", (text, value) => {
    expect(read(quantities.temperature, text)).toBe(value);
  });

  test("a unit that no word names is not taken from the language's own properties", () => {
    for (const word of ["constructor", "toString", "__proto__"]) expect(parseUnit(word)).toBeUndefined();
  });
});
