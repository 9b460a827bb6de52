import { m_e, u } from "./constants";
import { FormulaError, formulaWeight } from "./formula";

/** One kind of positive ion: mass in kg (the electrons removed), charge number Z ≥ 1, and how it is written. */
export interface Ion {
  mass: number;
  charge: number;
  label: string;
}

/** The electron where a function takes "electrons unless an ion is named". */
export const electron: Ion = { mass: m_e, charge: 1, label: "electron" };

/** A singly charged ion of the given mass in u: the mass of the ion itself. */
export function ionOfMass(massInU: number): Ion {
  return { mass: massInU * u, charge: 1, label: `${massInU} u` };
}

const superscripts: Record<string, string> = { "⁺": "+", "⁻": "-", "²": "2", "³": "3", "⁴": "4", "⁵": "5", "⁶": "6" };

/**
 * An ion by formula. Digits belong to the formula ("N2+" is the molecular ion), multiple charge is "Xe++", "Xe^2+" or
 * "Xe+2", no sign means singly charged. "Xe2+" could mean either for a noble gas and is refused with both spellings.
 */
export function parseIon(text: string): Ion | FormulaError {
  const typed = text
    .trim()
    .replace(/−/g, "-")
    .replace(
      /([²³⁴-⁶]?)([⁺⁻])/g,
      (_, digit: string, sign: string) => `^${superscripts[digit] ?? ""}${superscripts[sign]}`,
    )
    .replace(/[₀-₉]/g, (digit) => String(digit.charCodeAt(0) - 0x2080));
  const parts = /^(.*?)(?:\^(\d+)\+|\^\+(\d*)|(\++)|\+(\d+))?$/.exec(typed)!;
  const [, formula, caretDigits, caretPlus, pluses, plusDigits] = parts;
  const apart = /^([A-Z][A-Za-z\d]*)\s*(?:\s|\()(\d*)\+\)?$/.exec(typed);
  if (apart) {
    const spelled = apart[2] ? `${apart[1]}^${apart[2]}+` : `${apart[1]}+`;
    return new FormulaError("has its charge where it can't be read", `type "${spelled}"`);
  }
  if (/-|\^/.test(formula)) {
    return new FormulaError("is not a positive ion", 'type a formula such as "Ar+", "N2+" or "Xe^2+"');
  }
  const pair = /^(He|Ne|Ar|Kr|Xe|Rn)2$/.exec(formula);
  if (pair && !caretDigits && !caretPlus && !plusDigits && (pluses?.length ?? 1) === 1) {
    const gas = pair[1];
    return new FormulaError(
      "could mean two things",
      `type "${gas}^2+" for the doubly charged ion or "(${gas}2)+" for the molecular ion`,
    );
  }
  const charge = Number(caretDigits ?? plusDigits ?? (caretPlus || undefined) ?? (pluses?.length || 1));
  const weight = formulaWeight(formula);
  if (weight instanceof FormulaError) return weight;
  const mass = weight * u - charge * m_e;
  if (!(charge >= 1) || !(mass > 0) || charge > weight) return new FormulaError(`cannot carry the charge ${charge}`);
  return { mass, charge, label: charge === 1 ? `${formula}+` : `${formula}^${charge}+` };
}
