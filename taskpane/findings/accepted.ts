import type { Workbook } from "../workbook/workbook";
import type { Finding } from "./finding";

/** A reader's word that a finding is known and why it may stand. */
export interface Acceptance {
  reason: string;
  /** Of the day, "2026-05-04". */
  date: string;
  /** What the finding was then: once it differs, the acceptance no longer counts. */
  print: string;
}

export type Accepted = Readonly<Record<string, Acceptance>>;

const setting = "accepted";

export async function readAccepted(workbook: Workbook): Promise<Accepted> {
  try {
    const found: unknown = JSON.parse((await workbook.getSetting(setting)) ?? "{}");
    return isRecord(found) ? (found as Accepted) : {};
  } catch {
    return {};
  }
}

function isRecord(found: unknown): boolean {
  return typeof found === "object" && found !== null && !Array.isArray(found);
}

/** Keeps the reason in the workbook; without one the finding is open again. */
export async function accept(
  workbook: Workbook,
  { key, print }: Finding,
  reason: string | undefined,
  date: string,
): Promise<void> {
  // Read anew: another reader of the same workbook may have accepted something meanwhile.
  const others = Object.entries(await readAccepted(workbook)).filter(([other]) => other !== key);
  const accepted = reason === undefined ? others : [...others, [key, { reason, date, print }]];
  await workbook.setSetting(setting, JSON.stringify(Object.fromEntries(accepted)));
}

export type Standing = "open" | "accepted" | "changed";

/** "changed" is open again: it was accepted as something else than it is now. */
export function standingOf({ key, print }: Finding, accepted: Accepted): Standing {
  const acceptance = Object.hasOwn(accepted, key) ? accepted[key] : undefined;
  if (!acceptance) return "open";
  return acceptance.print === print ? "accepted" : "changed";
}

/** Those that count: not accepted, or accepted as something else. */
export function openOf(findings: readonly Finding[], accepted: Accepted): Finding[] {
  return findings.filter((finding) => standingOf(finding, accepted) !== "accepted");
}
