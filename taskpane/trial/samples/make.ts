import { writeBook } from "../../workbook/xlsx-write";
import { chuckBias } from "./chuck-bias";
import type { samples } from "./list";
import { probeLog } from "./probe-log";
import { wallHeat } from "./wall-heat";

const books: Record<(typeof samples)[number]["file"], typeof chuckBias> = {
  "chuck-bias.xlsx": chuckBias,
  "probe-log.xlsx": probeLog,
  "wall-heat.xlsx": wallHeat,
};

/** The sample workbooks by file name, with every value computed: the build puts them beside the pages. */
export function makeSamples(): Record<string, Uint8Array> {
  return Object.fromEntries(Object.entries(books).map(([file, book]) => [file, writeBook(book())]));
}
