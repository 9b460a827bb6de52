import type { Entry } from "../cells/entry";
import { badInput, Fault } from "../cells/fault";
import { format } from "../cells/format";
import { isCellError, passOn, type CellError } from "../cells/host";
import { nearest } from "./nearest";

/** The catalogue as the checks see it. It is handed to them, since it holds their own entries too. */
export interface Directory {
  named(name: string): Entry | undefined;
  all(): readonly Entry[];
}

/** The function that a cell names, or what to type there instead. */
export function functionIn(directory: Directory, cell: unknown): Entry | CellError {
  if (isCellError(cell)) return passOn(cell, "function_name");
  const typed = typeof cell === "string" ? cell.trim() : "";
  const wanted = 'type the name of a function, such as "DEBYELENGTH"';
  if (typed === "") {
    const given =
      typeof cell === "number" && cell !== 0 ? `${format(cell)} is not the name of a function` : "it is blank";
    return badInput("function_name", given, wanted);
  }
  const found = directory.named(typed);
  if (!found) {
    const names = directory.all().map(({ name }) => name);
    const near = nearest(typed.replace(/^SHEATH\.|\(.*$/gi, ""), names);
    return badInput(
      "function_name",
      `there is no function "${typed.slice(0, 40)}"`,
      near.length === 1 ? `type ${near[0]}` : `type one of ${near.join(", ")}`,
    );
  }
  if (found.repeats) {
    return badInput("function_name", `${found.name} is itself a check`, "name a function that computes something");
  }
  return found;
}

export function isEntry(found: Entry | CellError): found is Entry {
  return "compute" in found;
}

/** More arguments than the function takes, its [unit] included, were not meant for it. */
export function tooManyInputs(entry: Entry, args: readonly unknown[]): Fault | undefined {
  const takes = entry.inputs.length + (entry.takesUnit ? 1 : 0);
  if (args.length <= takes) return undefined;
  const names = entry.inputs.map(({ name }) => name).join(", ");
  return badInput(
    "inputs",
    `${entry.name} takes ${takes} at most and ${args.length} are given`,
    `give ${names || "none"}`,
  );
}
