import { openOf, readAccepted, type Accepted } from "../findings/accepted";
import { changesSince, type Change } from "../findings/changes";
import { keptAreas, readKept, type Kept } from "../findings/keep";
import { look, type Look } from "../findings/look";
import { readReport, type Report } from "../findings/report";
import type { Finding } from "../findings/finding";
import type { Workbook } from "../workbook/workbook";
import type { FileBook } from "../workbook/xlsx-book";

/** What is looked through: the open workbook, or a saved one by its file name. */
export interface Source {
  workbook: Workbook;
  file?: { name: string; book: FileBook };
}

/** What a look came to, with what the workbook remembers of earlier ones. */
export interface Found extends Source {
  look: Look;
  accepted: Accepted;
  kept: readonly Kept[];
  report: Report | undefined;
  changes: readonly Change[];
}

/** Reading is the shorter part of a look. */
const reading = 0.3;

export async function lookThrough(
  source: Source,
  version: string,
  progress: (done: number) => void,
  signal: AbortSignal,
): Promise<Found> {
  const { workbook } = source;
  const content = await workbook.read((done) => progress(done * reading), signal);
  const [accepted, kept] = [await readAccepted(workbook), await readKept(workbook)];
  const found = await look(content, {
    progress: (done) => progress(reading + done * (1 - reading)),
    signal,
    kept: keptAreas(kept),
  });
  const report = readReport(content);
  const changes = report ? changesSince(report.snapshot, found, version) : [];
  return { ...source, look: found, accepted, kept, report, changes };
}

export function openFindings({ look, accepted }: Found): Finding[] {
  return openOf(look.findings, accepted);
}
