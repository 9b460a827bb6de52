import { standingOf } from "./accepted";
import { causes, type Cause } from "./causes";
import type { Finding } from "./finding";
import { openFindings, type LookedThrough } from "./look-through";
import { counted, countText, findingText, lookText, placeText } from "./words";

/** The findings as a table for a terminal. */
export function textReport(name: string, found: LookedThrough): string {
  const { look, accepted, report, changes } = found;
  const open = openFindings(found);
  const set = look.findings.filter((finding) => standingOf(finding, accepted) === "accepted");
  return [
    `${name}: ${lookText(look)}`,
    open.length === 0 ? "No findings." : `${counted(open.length, "finding")}.`,
    ...byCause(open),
    ...part(
      `Accepted: ${set.length}`,
      set.map((finding) => [...row(finding), accepted[finding.key].reason]),
    ),
    ...part(
      "Not followed, so neither computed again nor judged",
      look.notFollowed.map(({ sheet, cells, count, why }) => [`${sheet}!${placeText({ cells })}`, String(count), why]),
    ),
    ...part(
      "Changed since the report in the workbook",
      changes.map(({ sheet, cells, what, why }) => [`${sheet}!${placeText({ cells })}`, what, why.join("; ")]),
    ),
    ...(report && report.snapshot.length > 0 && changes.length === 0 ? ["Nothing has changed since its report."] : []),
  ].join("\n");
}

function part(title: string, rows: string[][]): string[] {
  return rows.length === 0 ? [] : ["", title, ...table(rows)];
}

function byCause(findings: readonly Finding[]): string[] {
  return (Object.keys(causes) as Cause[]).flatMap((cause) => {
    const group = findings.filter((each) => each.cause === cause);
    return group.length === 0 ? [] : ["", `${causes[cause]}: ${group.length}`, ...table(group.map(row))];
  });
}

function row(finding: Finding): string[] {
  const functions = finding.functions.length > 3 ? [...finding.functions.slice(0, 3), "…"] : finding.functions;
  return [`${finding.sheet}!${placeText(finding)}`, countText(finding), functions.join(", "), findingText(finding)];
}

/** Columns as wide as their longest cell; the last is not padded. */
function table(rows: readonly (readonly string[])[]): string[] {
  const clean = rows.map((cells) => cells.map(oneLine));
  const widths = clean[0].map((_, i) => Math.max(...clean.map((cells) => cells[i].length)));
  return clean.map(
    (cells) => `  ${cells.map((cell, i) => (i === cells.length - 1 ? cell : cell.padEnd(widths[i]))).join("  ")}`,
  );
}

/** Text of a workbook can hold anything: control characters would steer the terminal. */
function oneLine(text: string): string {
  // eslint-disable-next-line no-control-regex
  return text.replace(/[\u0000-\u001f\u007f-\u009f\u2028\u2029]+/g, " ");
}
