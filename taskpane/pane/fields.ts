import { isTable, type Entry } from "../../functions/cells/entry";
import type { Input } from "../../functions/cells/inputs";
import { typedArguments, type FieldText } from "./formula";
import { typedRows, typedText } from "./typed";
import type { Words } from "./words";

/** One argument of a function as the form asks for it. */
export interface Field {
  name: string;
  meaning: string;
  /** Undefined for the unit of the result, which is no input of the model. */
  input: Input | undefined;
  takes: FieldText["takes"];
}

/** The inputs in order, those that may follow any number of times, and the unit of the result. */
export function fieldsOf(entry: Entry<any>, words: Words | undefined): Field[] {
  const field = (name: string, input: Input | undefined, takes: Field["takes"]): Field => {
    const meaning = words?.parameters.find((parameter) => parameter.name === name)?.meaning ?? "";
    return { name, meaning, input, takes };
  };
  const { inputs, repeats, takesUnit } = entry;
  return [
    ...inputs.map((input: Input) => field(input.name, input, input.kind === "block" ? "range" : "cell")),
    ...(repeats ? [field(repeats.name, repeats, "arguments")] : []),
    ...(takesUnit ? [field("unit", undefined, "cell")] : []),
  ];
}

/** SHEATH.DEBYELENGTH(n_e, T_e, [T_i], [unit]) */
export function signature(entry: Entry<any>): string {
  const names = fieldsOf(entry, undefined).map(({ name, input, takes }) => {
    if (takes === "arguments") return `${name}…`;
    return input && !input.optional ? name : `[${name}]`;
  });
  return `SHEATH.${entry.name}(${names.join(", ")})`;
}

/** The entry's example as one would type it into these fields. */
export function exampleTexts(entry: Entry<any>, fields: readonly Field[]): string[] {
  return fields.map(({ takes }, i) =>
    takes === "arguments" ? entry.example.slice(i).map(typedLine).join("\n") : typedText(entry.example[i]),
  );
}

function typedLine(cell: unknown): string {
  return typedRows(Array.isArray(cell) ? cell : [[cell]], "; ");
}

/** The fields as the arguments that the function's front door gets from a sheet. */
export function argumentsOf(fields: readonly FieldText[]): unknown[] {
  return fields
    .flatMap(typedArguments)
    .map((rows) => (rows.length === 0 ? null : rows.map((row) => row.map(({ cell }) => cell))));
}

/** The unit in which a result is returned. */
export function resultUnit(entry: Entry<any>, unitText: string): string {
  return isTable(entry.result) ? "" : unitText.trim() || entry.result.unit;
}
