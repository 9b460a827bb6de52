import { BooleanNumber } from "@univerjs/core";
import { FunctionType, type IFunctionInfo, type IFunctionParam } from "@univerjs/preset-sheets-core";
import type { Declaration, Parameter, WordList } from "../host";

/** What the formula editor shows of a function while it is typed, out of functions.json. */
export function parameterHelp(declared: Declaration, gridName: string, enums: readonly WordList[]): IFunctionInfo {
  return {
    functionName: gridName,
    functionType: FunctionType.User,
    description: declared.description,
    abstract: declared.description,
    functionParameter: declared.parameters.map((parameter) => parameterInfo(parameter, enums)),
  };
}

function parameterInfo(parameter: Parameter, enums: readonly WordList[]): IFunctionParam {
  const words = enums.find(({ id }) => id === parameter.customEnumId)?.values.map(({ stringValue }) => stringValue);
  return {
    name: parameter.name,
    detail: parameter.description ?? "",
    example: words ? words.map((word) => `"${word}"`).join(" or ") : parameter.name,
    require: parameter.optional ? BooleanNumber.FALSE : BooleanNumber.TRUE,
    repeat: parameter.repeating ? BooleanNumber.TRUE : BooleanNumber.FALSE,
  };
}
