import UnitMath from "unitmath/src/Unit.js";
import { e, k_B, u } from "../matter/constants";

/**
 * Units as people type them. The dimension algebra is UnitMath's; the unit list is ours, so that the constants are the
 * ones the models use and no unit exists that a plasma engineer would not expect ("G" is gauss, "u" a mass).
 */
const si = { prefixes: "SHORT" } as const;

const definitions = {
  skipBuiltIns: true,
  baseQuantities: ["CYCLE"],
  quantities: {},
  unitSystems: { si: {} },
  prefixes: {
    NONE: { "": 1 },
    SHORT: { "": 1, d: 0.1, c: 1e-2, m: 1e-3, u: 1e-6, n: 1e-9, p: 1e-12, f: 1e-15, k: 1e3, M: 1e6, G: 1e9, T: 1e12 },
  },
  units: {
    m: { quantity: "LENGTH", ...si, value: 1 },
    kg: { quantity: "MASS", prefixes: "NONE", value: 1 },
    g: { ...si, value: "0.001 kg" },
    s: { quantity: "TIME", ...si, value: 1 },
    A: { quantity: "CURRENT", ...si, value: 1 },
    K: { quantity: "TEMPERATURE", ...si, value: 1 },
    mol: { quantity: "AMOUNT_OF_SUBSTANCE", ...si, value: 1 },
    rad: { quantity: "ANGLE", ...si, value: 1 },
    // A frequency in cycles is not an angular one: the cycle is a dimension of its own.
    cycle: { quantity: "CYCLE", prefixes: "NONE", value: 1 },
    Hz: { ...si, value: "1 cycle/s" },
    deg: { prefixes: "NONE", value: `${Math.PI / 180} rad` },
    min: { prefixes: "NONE", value: "60 s" },
    hour: { prefixes: "NONE", value: "3600 s" },
    N: { ...si, value: "1 kg m/s^2" },
    Pa: { ...si, value: "1 kg m^-1 s^-2" },
    bar: { ...si, value: "1e5 Pa" },
    Torr: { ...si, value: `${101325 / 760} Pa` },
    atm: { prefixes: "NONE", value: "101325 Pa" },
    J: { ...si, value: "1 kg m^2/s^2" },
    W: { ...si, value: "1 J/s" },
    C: { ...si, value: "1 A s" },
    V: { ...si, value: "1 W/A" },
    F: { ...si, value: "1 C/V" },
    ohm: { ...si, value: "1 V/A" },
    S: { ...si, value: "1 A/V" },
    T: { ...si, value: "1 V s/m^2" },
    G: { ...si, value: "1e-4 T" },
    eV: { ...si, value: `${e} J` },
    u: { prefixes: "NONE", value: `${u} kg` },
    angstrom: { prefixes: "NONE", value: "1e-10 m" },
    inch: { prefixes: "NONE", value: "0.0254 m" },
    percent: { prefixes: "NONE", value: "0.01" },
  },
};

const unitMath = UnitMath.config({ definitions });

/** A unit read from text: SI value = scale · value + offset. */
export interface Unit {
  text: string;
  scale: number;
  offset: number;
  /** Exponents of the base dimensions, as one comparable string. */
  dimension: string;
}

/** Spellings that differ from the unit's own symbol, matched as whole words. */
const spellings: Record<string, string> = {
  torr: "Torr",
  mtorr: "mTorr",
  TORR: "Torr",
  mTORR: "mTorr",
  millitorr: "mTorr",
  gauss: "G",
  Gauss: "G",
  kgauss: "kG",
  tesla: "T",
  Tesla: "T",
  ev: "eV",
  EV: "eV",
  kev: "keV",
  KeV: "keV",
  KV: "kV",
  kv: "kV",
  v: "V",
  volt: "V",
  volts: "V",
  Volt: "V",
  Volts: "V",
  pa: "Pa",
  kpa: "kPa",
  hz: "Hz",
  khz: "kHz",
  KHz: "kHz",
  mhz: "MHz",
  Mhz: "MHz",
  ghz: "GHz",
  amu: "u",
  Da: "u",
  kelvin: "K",
  Kelvin: "K",
  degree: "deg",
  degrees: "deg",
  radian: "rad",
  radians: "rad",
  sec: "s",
  second: "s",
  seconds: "s",
  minute: "min",
  minutes: "min",
  hr: "hour",
  h: "hour",
  hours: "hour",
  Angstrom: "angstrom",
  micron: "um",
  microns: "um",
  mbars: "mbar",
  Ohm: "ohm",
  ohms: "ohm",
  in: "inch",
  amp: "A",
  amps: "A",
  pct: "percent",
  cc: "cm^3",
  meter: "m",
  metre: "m",
};

const superscripts = "⁰¹²³⁴⁵⁶⁷⁸⁹";

/** The text with every usual spelling brought to the one the unit algebra reads: "cm⁻³", "cm-3", "/cm3" → "cm^-3". */
export function normalizeUnit(text: string): string {
  return text
    .trim()
    .replace(/[µμ]/g, "u")
    .replace(/Å/g, "angstrom")
    .replace(/Å/g, "angstrom")
    .replace(/Ω|Ω/g, "ohm")
    .replace(/%/g, "percent")
    .replace(/°\s*C\b|℃/g, "degC")
    .replace(/°\s*K\b/g, "K")
    .replace(/°/g, "deg")
    .replace(/[⁰¹²³⁴-⁹]/g, (digit) => String(superscripts.indexOf(digit)))
    .replace(/⁻|−/g, "-")
    .replace(/⁺/g, "+")
    .replace(/\*\*/g, "^")
    .replace(/[·×⋅]/g, "*")
    .replace(/\bper\b/g, "/")
    .replace(/[A-Za-z]+/g, (word) => (Object.hasOwn(spellings, word) ? spellings[word] : word))
    .replace(/([A-Za-z])\s?([-+]?\d)/g, (_, letter: string, power: string) => `${letter}^${power.replace("+", "")}`)
    .replace(
      // "eV^(-3/2)" and "eV^-3/2" are powers; "m^2/4" would not be a unit anyway.
      /\^\s*\(?\s*\+?(-?\d+(?:\.\d+)?)(?:\s*\/\s*(\d+))?(?:\s*\))?/g,
      (_, top: string, bottom = "1") => `^${Number(top) / Number(bottom)}`,
    );
}

const cache = new Map<string, Unit | undefined>();
const cacheLimit = 2000;

/** The unit written in the text, or undefined where it is none. Results are remembered: sweeps repeat their units. */
export function parseUnit(text: string): Unit | undefined {
  const known = cache.get(text);
  if (known || cache.has(text)) return known;
  if (cache.size >= cacheLimit) cache.clear();
  const unit = readUnit(text);
  cache.set(text, unit);
  return unit;
}

function readUnit(text: string): Unit | undefined {
  const normal = withoutSlashes(normalizeUnit(text));
  if (normal === "degC") return { text, scale: 1, offset: 273.15, dimension: dimensionOf("K") };
  // A number inside a unit ("16 m^-3") is a slip in the number before it, never a factor.
  if (normal === "" || /[^A-Za-z0-9^*. -]|(?:^|[\s*])[\d.]/.test(normal)) return undefined;
  try {
    const scale = snap(unitMath(1, normal).getNormalizedValue());
    if (!Number.isFinite(scale) || scale <= 0) return undefined;
    return { text, scale, offset: 0, dimension: dimensionOf(normal) };
  } catch {
    return undefined;
  }
}

function dimensionOf(normal: string): string {
  return Array.from(unitMath(1, normal).dimension, (power) => round(power)).join(",");
}

/** "A/cm^2/K^2" and "A/(cm^2 K^2)" as "A cm^-2 K^-2": all that follows a slash, up to the next, divides. */
function withoutSlashes(unit: string): string {
  const [top, ...divisors] = unit.replace(/[()]/g, " ").split("/");
  const inverted = divisors.map((part) =>
    part.replace(/([A-Za-z]+)(?:\^(-?[\d.]+))?/g, (_, name: string, power = "1") => `${name}^${-Number(power)}`),
  );
  return [top.trim() === "1" ? "" : top, ...inverted].join(" ").trim();
}

/** Products of decimal prefixes land an ulp beside the decimal that is meant: (0.01)^-3 is 1e6. */
function snap(scale: number): number {
  const decimal = Number(scale.toPrecision(12));
  return Math.abs(decimal - scale) <= 1e-15 * scale ? decimal : scale;
}

/** Powers such as 0.1 + 0.2 must compare equal to 0.3, and −0 to 0. */
function round(power: number): number {
  return Math.round((power ?? 0) * 1e9) / 1e9 + 0;
}

/** k_B T = e T_eV: the equivalence that lets a temperature be typed in K or in eV. */
export const kelvinPerElectronvolt = e / k_B;
