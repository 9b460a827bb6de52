import type { FileBook } from "../../workbook/xlsx-book";
import { places } from "./looks";
import type { SampleSheet } from "./sample-sheet";

export function bookOf(...sheets: SampleSheet[]): FileBook {
  return { sheets: sheets.map((sheet) => sheet.done()), names: [], styles: places.styles, leftOut: [] };
}
