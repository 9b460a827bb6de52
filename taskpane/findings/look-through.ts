import type { Workbook } from "../workbook/workbook";
import { openOf, readAccepted, type Accepted } from "./accepted";
import { changesSince, type Change } from "./changes";
import type { Finding } from "./finding";
import { keptAreas, readKept, type Kept } from "./keep";
import { look, type Look } from "./look";
import { readReport, type Report } from "./report";

/** What a look came to, with what the workbook remembers of earlier ones. */
export interface LookedThrough {
  look: Look;
  accepted: Accepted;
  kept: readonly Kept[];
  report: Report | undefined;
  changes: readonly Change[];
}

/** Reading is the shorter part of a look. */
const reading = 0.3;

/** Reads a workbook and looks through it; `version` is that of the functions. Throws Cancelled when the signal says so. */
export async function lookThrough(
  workbook: Workbook,
  version: string,
  progress: (done: number) => void,
  signal?: AbortSignal,
): Promise<LookedThrough> {
  const content = await workbook.read((done) => progress(done * reading), signal);
  const [accepted, kept] = [await readAccepted(workbook), await readKept(workbook)];
  const found = await look(content, {
    progress: (done) => progress(reading + done * (1 - reading)),
    signal,
    kept: keptAreas(kept),
  });
  const report = readReport(content);
  const changes = report ? changesSince(report.snapshot, found, version) : [];
  return { look: found, accepted, kept, report, changes };
}

export function openFindings({ look, accepted }: Pick<LookedThrough, "look" | "accepted">): Finding[] {
  return openOf(look.findings, accepted);
}
