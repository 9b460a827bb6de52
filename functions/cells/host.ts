/**
 * The two places where the sheet's host shows through: how an error stands in a cell, and how one arrives. In the host
 * both are CustomFunctions.Error; outside it (the pane as a plain page, tests, the command line) a Fault serves as is.
 */
import { Fault } from "./fault";

export interface CellError {
  code: string;
  message?: string;
}

type HostError = new (code: string, message?: string) => CellError;

function hostError(): HostError | undefined {
  return (globalThis as { CustomFunctions?: { Error?: HostError } }).CustomFunctions?.Error;
}

/** A fault as the host wants it in a returned matrix. */
export function toCellError(fault: Fault): CellError {
  const Host = hostError();
  return Host ? new Host(fault.code, fault.message) : fault;
}

/** Whether an argument's cell holds an error: the host's own object, a Fault, or a typed error value. */
export function isCellError(cell: unknown): boolean {
  return typeof cell === "object" && cell !== null && codeOf(cell) !== undefined;
}

function codeOf(cell: object): string | undefined {
  const { code, basicValue, errorCode } = cell as { code?: unknown; basicValue?: unknown; errorCode?: unknown };
  return [code, basicValue, errorCode].find((each): each is string => typeof each === "string" && each.startsWith("#"));
}

const returnable = new Set(["#VALUE!", "#N/A", "#DIV/0!", "#NUM!", "#NULL!"]);

/** An incoming error as it goes on in its own row. The host refuses #NAME? and #REF! from a function: those are told. */
export function passOn(cell: unknown, name: string): CellError {
  const { message } = cell as { message?: string };
  const code = codeOf(cell as object)!;
  if (!returnable.has(code))
    return toCellError(new Fault("#VALUE!", `${name}: the cell holds ${code}; mend that cell first.`));
  const Host = hostError();
  if (cell instanceof Fault) return toCellError(cell);
  return Host ? new Host(code, message || undefined) : { code, message };
}
