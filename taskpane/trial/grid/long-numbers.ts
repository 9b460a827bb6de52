import { InterceptorEffectEnum } from "@univerjs/core";
import {
  INTERCEPTOR_POINT,
  InterceptCellContentPriority,
  type SheetInterceptorService,
} from "@univerjs/preset-sheets-core";

/**
 * Shows a number without a format of its own in the room of a cell, as sheets do: the grid writes out all its digits, of
 * which a narrow column then shows the first, so that 1e16 looks like 1e12. What the cell holds stays as it is.
 */
export function shortenNumbers(interceptors: SheetInterceptorService): void {
  interceptors.intercept(INTERCEPTOR_POINT.CELL_CONTENT, {
    effect: InterceptorEffectEnum.Value,
    // After the formats, which leave text behind.
    priority: InterceptCellContentPriority.NUMFMT - 1,
    handler: (cell, _location, next) => next(typeof cell?.v === "number" ? { ...cell, v: shortened(cell.v) } : cell),
  });
}

const longest = 11;

/** 1e16 as "1E+16", 0.0016358502603 as "0.00163585"; short numbers stay numbers. */
export function shortened(value: number): number | string {
  if (String(value).length <= longest && Math.abs(value) < 1e11) return value;
  const size = Math.abs(value);
  if (size >= 1e-4 && size < 1e11) return Number(value.toPrecision(7));
  const [mantissa, power] = value.toExponential(5).split("e");
  const digits = mantissa.replace(/\.?0+$/, "");
  return `${digits}E${power[0]}${power.slice(1).padStart(2, "0")}`;
}
