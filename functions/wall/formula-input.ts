import { badInput } from "../cells/fault";
import { textInput, type Input } from "../cells/inputs";
import { u } from "../matter/constants";
import { FormulaError, formulaWeight } from "../matter/formula";

const wanted = 'type a formula such as "Si" or "Al2O3", or a mass in u';

/** What a surface is made of, as the mass in kg of one formula unit; a number is that mass in u, for a mixture. */
export function formulaInput(name: string): Input<number> {
  return {
    ...textInput(name, wanted, '"Si"'),
    read: (cell) => {
      if (typeof cell === "number")
        return cell > 0.5 && cell < 5000 ? cell * u : badInput(name, `${cell} u is no mass of a formula unit`, wanted);
      if (typeof cell !== "string") return badInput(name, "the cell holds no text", wanted);
      const weight = formulaWeight(cell.trim());
      return weight instanceof FormulaError
        ? badInput(name, `"${cell.trim()}" ${weight.problem}`, weight.advice ?? wanted)
        : weight * u;
    },
  } as Input<number>;
}
