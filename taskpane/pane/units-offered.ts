import { conversionTo } from "../../functions/cells/quantity-text";
import type { Quantity } from "../../functions/cells/quantities";

/** Units the trade writes results in; those that fit a quantity are offered for it, and a formula takes any other. */
// prettier-ignore
const candidates = [
  "m", "cm", "mm", "um", "nm",
  "m/s", "km/s", "cm/s", "nm/min",
  "V", "mV", "kV",
  "eV", "keV", "K", "J",
  "m^-3", "cm^-3",
  "Hz", "kHz", "MHz", "GHz", "rad/s",
  "s", "ms", "us", "ns",
  "A", "mA", "uA",
  "A/m^2", "mA/cm^2", "uA/cm^2", "A/cm^2",
  "m^-2 s^-1", "cm^-2 s^-1",
  "W/m^2", "W/cm^2", "MW/m^2",
  "V/m", "V/cm", "kV/cm",
  "F/m^2", "pF/cm^2",
  "ohm m^2", "ohm cm^2",
  "m^2", "cm^2", "mm^2",
  "Pa", "mTorr", "Torr", "mbar",
  "T", "mT", "G",
  "kg", "g", "u",
  "kg/m^3", "g/cm^3",
  "deg", "rad",
];

/** The quantity's own unit first. */
export function unitsOffered(quantity: Quantity): string[] {
  const fitting = candidates.filter((unit) => unit !== quantity.unit && conversionTo(quantity, unit) !== undefined);
  return [quantity.unit, ...fitting];
}
