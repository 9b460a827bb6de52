import { chuck } from "./chuck";
import type { OpeningSheet } from "./opening-sheet";
import { oxygenArgon } from "./oxygen-argon";
import { preClean } from "./pre-clean";

/** The sheets of the trial workbook, in the order of their tabs. */
export const openingSheets: readonly OpeningSheet[] = [preClean, chuck, oxygenArgon];
