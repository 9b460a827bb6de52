import { BaseFunction, type BaseValueObject } from "@univerjs/preset-sheets-core";
import { hostError, type Declaration, type HostFunction } from "../host";
import { toGrid, toMatrix } from "./cells";
import type { Messages } from "./messages";

/** The namespace under which the manifest registers the functions. */
export const namespace = "SHEATH";

export type GridFunction = new (name: string) => BaseFunction;

/** A class for the grid's formula engine that calls one custom function as the host does. */
export function gridFunction(declared: Declaration, call: HostFunction, messages: Messages): GridFunction {
  return class extends BaseFunction {
    /** Quoted text reaches the function as text: "5 %" and "1/2" are for the function to read. */
    override isArgumentsIgnoreNumberPattern() {
      return true;
    }

    override calculate(...values: BaseValueObject[]) {
      const result = callAsHost(declared, call, values);
      messages.keep(this.subUnitId ?? "", this.row, this.column, Array.isArray(result) ? result : [[result]]);
      return toGrid(result);
    }
  };
}

/** Whatever goes wrong becomes an error cell: an exception would end the calculation of the whole workbook. */
function callAsHost(declared: Declaration, call: HostFunction, values: BaseValueObject[]): unknown {
  try {
    const tooMany = checkCount(declared, values.length);
    return tooMany ?? call(...hostArguments(declared, values));
  } catch (error) {
    return hostError("#VALUE!", error instanceof Error ? error.message : String(error));
  }
}

/**
 * Every parameter gets an argument, null where it was left out, a repeating one all its ranges as one array of matrices;
 * behind them comes the invocation, as custom-functions-runtime.js appends it to every call.
 */
export function hostArguments({ id, parameters }: Declaration, values: BaseValueObject[]): unknown[] {
  const invocation = { functionName: id };
  const matrices = values.map((value) => (isLeftOut(value) ? null : toMatrix(value)));
  const fixed = parameters.filter(({ repeating }) => !repeating).length;
  const args: unknown[] = Array.from({ length: fixed }, (_, i) => matrices[i] ?? null);
  if (fixed < parameters.length)
    args.push(matrices.length > fixed ? matrices.slice(fixed).map((each) => each ?? [[null]]) : null);
  return [...args, invocation];
}

/** Nothing between two commas, as against a reference to an empty cell. */
function isLeftOut(value: BaseValueObject): boolean {
  return !value.isArray() && value.isNull();
}

function checkCount({ name, parameters }: Declaration, count: number): unknown {
  if (count <= parameters.length || parameters.some(({ repeating }) => repeating)) return undefined;
  const most = parameters.length === 1 ? "1 argument" : `${parameters.length} arguments`;
  return hostError("#VALUE!", `${name} takes at most ${most}; here are ${count}.`);
}
