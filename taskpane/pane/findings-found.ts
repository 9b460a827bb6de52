import type { LookedThrough } from "../findings/look-through";
import type { Workbook } from "../workbook/workbook";
import type { FileBook } from "../workbook/xlsx-book";

/** What is looked through: the open workbook, or a saved one by its file name. */
export interface Source {
  workbook: Workbook;
  file?: { name: string; book: FileBook };
}

export type Found = Source & LookedThrough;
