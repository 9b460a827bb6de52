/** A result as print shows it: seven significant digits, powers of ten where they help, a true minus. */
export function numberText(value: number, digits = 7): string {
  if (value === 0) return "0";
  const size = Math.abs(value);
  const text = size >= 1e6 || size < 1e-3 ? value.toExponential(digits - 1) : value.toPrecision(digits);
  const [mantissa, power] = text.replace("-", "−").split("e");
  const short = mantissa.includes(".") ? mantissa.replace(/\.?0+$/, "") : mantissa;
  if (power === undefined) return short;
  const factor = short.replace(/^(−?)1$/, "$1");
  return `${factor}${/\d/.test(factor) ? " × " : ""}10${superscript(power)}`;
}

function superscript(power: string): string {
  return [...power.replace("+", "")].map((c) => ("−-".includes(c) ? "⁻" : "⁰¹²³⁴⁵⁶⁷⁸⁹"[Number(c)])).join("");
}
