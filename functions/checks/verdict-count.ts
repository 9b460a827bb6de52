import type { Cells } from "../cells/broadcast";
import { isCellError } from "../cells/host";

/** The words that a check may begin with, and what a count of them is called. */
const counted = {
  fails: "fail",
  "doubtful input": "doubtful",
  marginal: "marginal",
  holds: "hold",
  "not tested": "not tested",
} as const;
type Word = keyof typeof counted;

const words = Object.keys(counted) as Word[];
const beginning = new RegExp(`^(${words.join("|")})(?::\\s*(.*))?$`, "is");

/**
 * What the checks in these ranges come to: "12 hold, 1 marginal", or "2 of 12 fail: " with the first reason. The 12 are
 * those tested; "not tested" is counted apart. An error fails. Cells that hold no check are passed over.
 */
export function countVerdicts(ranges: readonly (Cells | undefined)[]): string {
  const counts = Object.fromEntries(words.map((word) => [word, 0])) as Record<Word, number>;
  let reason: string | undefined;
  for (const cell of ranges.flatMap((range) => range ?? []).flat()) {
    const check = isCellError(cell) ? { word: "fails" as const, reason: errorText(cell) } : checkIn(cell);
    if (!check) continue;
    counts[check.word]++;
    if (check.word === "fails") reason ??= check.reason;
  }
  const tested = words.reduce((sum, word) => (word === "not tested" ? sum : sum + counts[word]), 0);
  if (tested + counts["not tested"] === 0) return "nothing checked";
  const say = (...which: Word[]) => which.filter((word) => counts[word] > 0).map((word) => said(word, counts[word]));
  if (counts.fails === 0) return say("holds", "marginal", "doubtful input", "not tested").join(", ");
  const failing = `${counts.fails} of ${tested} ${counts.fails === 1 ? "fails" : "fail"}: ${reason}`;
  return [failing, say("marginal", "doubtful input", "not tested").join(", ")].filter(Boolean).join("; ");
}

function said(word: Word, count: number): string {
  return `${count} ${word === "holds" && count === 1 ? "holds" : counted[word]}`;
}

function checkIn(cell: unknown): { word: Word; reason: string } | undefined {
  const found = typeof cell === "string" ? beginning.exec(cell.trim()) : null;
  return found ? { word: found[1].toLowerCase() as Word, reason: found[2] || "no reason given" } : undefined;
}

/** The host tells the code of an incoming error, and not always its message. */
function errorText(cell: unknown): string {
  const { code, message } = cell as { code?: string; message?: string };
  return [code ?? "an error", message].filter(Boolean).join(" ");
}
