/** What crosses between the grid's formula engine and a custom function, and how each side spells it. */
import type { Nullable } from "@univerjs/core";
import {
  ArrayValueObject,
  BooleanValueObject,
  ErrorType,
  ErrorValueObject,
  NumberValueObject,
  StringValueObject,
  type BaseValueObject,
} from "@univerjs/preset-sheets-core";
import { hostError, isHostError } from "../host";

/** An argument as the host hands it over: a matrix, also for one cell. */
export function toMatrix(argument: BaseValueObject): unknown[][] {
  if (!argument.isArray()) return [[toHost(argument)]];
  const array = argument as ArrayValueObject;
  const columns = array.getColumnCount();
  return Array.from({ length: array.getRowCount() }, (_, row) =>
    Array.from({ length: columns }, (_, column) => toHost(array.get(row, column))),
  );
}

function toHost(value: Nullable<BaseValueObject>): unknown {
  if (!value || value.isNull()) return null;
  // Like the host, the code alone: a message does not travel from cell to cell.
  if (value.isError()) return hostError(String(value.getValue()));
  return value.getValue();
}

/** A result as the grid takes it: one cell as a value, more as a spill. */
export function toGrid(result: unknown): BaseValueObject {
  const matrix = Array.isArray(result) ? (result as unknown[][]) : [[result]];
  const rowCount = matrix.length;
  const columnCount = matrix[0]?.length ?? 0;
  if (rowCount === 0 || columnCount === 0) return ErrorValueObject.create(ErrorType.VALUE);
  if (rowCount === 1 && columnCount === 1) return toValueObject(matrix[0][0]);
  const calculateValueList = matrix.map((row) => row.map(toValueObject));
  return ArrayValueObject.create({
    calculateValueList,
    rowCount,
    columnCount,
    unitId: "",
    sheetId: "",
    row: -1,
    column: -1,
  });
}

function toValueObject(cell: unknown): BaseValueObject {
  // Made as text, not parsed: "1/2" must not become a date.
  if (typeof cell === "string") return StringValueObject.create(cell);
  if (typeof cell === "boolean") return BooleanValueObject.create(cell);
  if (typeof cell === "number")
    return Number.isFinite(cell) ? NumberValueObject.create(cell) : ErrorValueObject.create(ErrorType.NUM);
  // The host shows a null in a result as 0.
  if (cell === null || cell === undefined) return NumberValueObject.create(0);
  return ErrorValueObject.create(isHostError(cell) ? (cell.code as ErrorType) : ErrorType.VALUE);
}
