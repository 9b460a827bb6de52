/**
 * Stands in for UnitMath's own table of units in the build. units.ts replaces every unit of that table by ours, so it
 * would only be carried along; the base quantities are what our definitions are made of.
 */
export const baseQuantities = ["MASS", "LENGTH", "TIME", "CURRENT", "TEMPERATURE", "AMOUNT_OF_SUBSTANCE", "ANGLE"];
export const quantities = {};
export const unitSystems = {};
export const prefixes = { NONE: { "": 1 } };
export const units = {};
