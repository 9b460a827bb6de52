/** A number as it stands in a message: three or four significant digits, powers of ten where they help. */
export function format(value: number, digits = 3): string {
  if (!Number.isFinite(value)) return value > 0 ? "∞" : value < 0 ? "−∞" : "no number";
  if (value === 0) return "0";
  const size = Math.abs(value);
  if (size < 1e5 && size >= 1e-3) return String(Number(value.toPrecision(digits)));
  const text = value.toExponential(digits - 1);
  const [mantissa, power] = text.split("e");
  const short = mantissa.includes(".") ? mantissa.replace(/\.?0+$/, "") : mantissa;
  return `${short}e${Number(power)}`;
}

/** A unit as print shows it: "m^-3" → "m⁻³". */
export function prettyUnit(unit: string): string {
  return unit
    .replace(/\^(-?[\d.]+)/g, (_, power: string) =>
      power.includes(".") ? `^${power}` : [...power].map((c) => (c === "-" ? "⁻" : "⁰¹²³⁴⁵⁶⁷⁸⁹"[Number(c)])).join(""),
    )
    .replace(/\bohm\b/g, "Ω")
    .replace(/\bdeg\b/g, "°")
    .replace(/\bum\b/g, "µm");
}
