import { version } from "../../functions/version";
import { readReport, reportCells, reportLook, reportSheet } from "../findings/report";
import { readersCopy, readersFile, writeReadersCopy } from "../findings/readers-copy";
import { counted } from "../findings/words";
import { download } from "./download";
import { writeBook } from "../workbook/xlsx-write";
import type { Found, Source } from "./findings-found";
import { keepView } from "./findings-keep";

import { h } from "./h";
import { labels } from "./labels";
import { section } from "./section";
import { today } from "./today";

/** What can be done with what was found: a report, values in place of formulas, a copy for others. */
export function actionsView(found: Found, lookAgain: (source: Source) => void): HTMLElement {
  const said = h("p", { class: "said", role: "status" });
  const button = (label: string, act: () => Promise<string>) =>
    h("button", { type: "button", class: "quiet", click: () => void attempt(said, act) }, label);
  const isLive = found.workbook.capabilities.has("write");
  if (found.look.calls === 0 && found.kept.length === 0) return h("div");
  return section(
    labels.passOn,
    h(
      "div",
      { class: "buttons" },
      isLive && button(labels.writeReport, () => writeReport(found)),
      button(labels.readersCopy, () => (isLive ? copyIntoSheets(found) : saveCopy(found))),
    ),
    said,
    isLive && found.workbook.capabilities.has("settings") ? keepView(found, lookAgain) : undefined,
  );
}

async function attempt(said: HTMLElement, act: () => Promise<string>): Promise<void> {
  said.textContent = "Writing…";
  try {
    said.textContent = await act();
  } catch (error) {
    said.textContent = `That did not work: ${error instanceof Error ? error.message : String(error)}`;
  }
}

/** The notes are read once more: they may have been written since the look. */
async function writeReport({ workbook, look, accepted, changes }: Found): Promise<string> {
  const before = readReport(await workbook.read());
  const cells = reportCells({ look, accepted, changes, version, date: today(), before });
  await workbook.replaceSheet(reportSheet, cells, reportLook(cells));
  const kept = before && before.notes.length > 0 ? ` Your ${counted(before.notes.length, "note")} stayed.` : "";
  return `Written to the sheet “${reportSheet}”.${kept}`;
}

async function copyIntoSheets({ workbook, look }: Found): Promise<string> {
  const made = await writeReadersCopy(workbook, readersCopy(look));
  return `Made ${made.map((name) => `“${name}”`).join(", ")}. The sheets they come from are as they were.`;
}

async function saveCopy({ file, look }: Found): Promise<string> {
  const name = download(
    writeBook(readersFile(file!.book, look)),
    `${file!.name.replace(/\.xls[xm]?$/i, "")} for readers`,
  );
  return `A copy with values in place of formulas went to your downloads as ${name}. The file itself is as it was.`;
}
