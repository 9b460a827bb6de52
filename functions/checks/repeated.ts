import { isCellError } from "../cells/host";

/**
 * The ranges given for a repeating parameter. The host hands them over as one array of matrices, and puts its invocation
 * object behind the arguments of every function; other callers spread the matrices.
 */
export function repeated(args: readonly unknown[]): unknown[] {
  const [first] = args;
  const ranges = isListOfRanges(first) ? (first as unknown[]) : args;
  return ranges.filter((range) => typeof range !== "object" || !range || Array.isArray(range) || isCellError(range));
}

/** One level deeper than a matrix; a place left out is null there. */
function isListOfRanges(argument: unknown): boolean {
  return Array.isArray(argument) && argument.some((range) => Array.isArray(range) && range.some(Array.isArray));
}
