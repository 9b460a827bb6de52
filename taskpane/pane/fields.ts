import { isTable, type Entry } from "../../functions/cells/entry";
import type { Input } from "../../functions/cells/inputs";
import type { FieldText } from "./formula";
import { readTyped, readTypedBlock } from "./typed";
import type { Words } from "./words";

/** One argument of a function as the form asks for it. */
export interface Field {
  name: string;
  meaning: string;
  /** Undefined for the unit of the result, which is no input of the model. */
  input: Input | undefined;
}

/** The inputs in order, and the unit of the result last where the function takes one. */
export function fieldsOf(entry: Entry<any>, words: Words | undefined): Field[] {
  const meaningOf = (name: string) => words?.parameters.find((parameter) => parameter.name === name)?.meaning ?? "";
  const inputs: Field[] = entry.inputs.map((input: Input) => ({
    name: input.name,
    meaning: meaningOf(input.name),
    input,
  }));
  return entry.takesUnit ? [...inputs, { name: "unit", meaning: meaningOf("unit"), input: undefined }] : inputs;
}

/** SHEATH.DEBYELENGTH(n_e, T_e, [T_i], [unit]) */
export function signature(entry: Entry<any>): string {
  const names = fieldsOf(entry, undefined).map(({ name, input }) => (input && !input.optional ? name : `[${name}]`));
  return `SHEATH.${entry.name}(${names.join(", ")})`;
}

/** The fields as the arguments that the function's front door gets from a sheet. */
export function argumentsOf(fields: readonly FieldText[]): unknown[] {
  return fields.map(({ text, block }) => {
    if (block) {
      const rows = readTypedBlock(text);
      return rows.length === 0 ? null : rows.map((row) => row.map(({ cell }) => cell));
    }
    return [[readTyped(text).cell]];
  });
}

/** The unit in which a result is returned. */
export function resultUnit(entry: Entry<any>, unitText: string): string {
  return isTable(entry.result) ? "" : unitText.trim() || entry.result.unit;
}
