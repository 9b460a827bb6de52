import "./files.css";
import { FileProblem } from "../../workbook/xlsx-book";
import { readBook } from "../../workbook/xlsx-read";
import { writeBook } from "../../workbook/xlsx-write";
import type { Grid } from "../grid/grid";
import { toGridBook, type GridBook } from "./book-data";
import { download } from "../../pane/download";
import { acceptDrops } from "./drop";
import { toFileBook } from "./file-book";
import type { Keeper } from "./keeper";
import { Notice } from "./notice";
import { makeStrip } from "./strip";

export interface Places {
  /** Takes the notice, above the row of tabs. */
  row: HTMLElement;
  /** Takes the buttons. */
  strip: HTMLElement;
  /** Where files may be dropped. */
  sheet: HTMLElement;
}

/** Opening, saving and coming back to workbooks: all of it in the page, nothing is sent anywhere. */
export function mountFiles(places: Places, grid: Grid, keeper: Keeper, openingExample: () => GridBook): Notice {
  const notice = new Notice(places.row);

  /** Whether what is open now is safe, or may go. */
  const mayLeave = async () => {
    await grid.workbook.endEditingAsync(true);
    await keeper.flush();
    return (
      !keeper.isAtRisk ||
      confirm(
        `Your work can't be kept: ${reason(keeper)}. Save a copy first, or it is lost. Open another workbook all the same?`,
      )
    );
  };

  const openBytes = async (bytes: Uint8Array, title: string) => {
    const book = readBook(bytes);
    if (!(await mayLeave())) return notice.say("");
    const hadWork = keeper.keeping.is === "kept" || keeper.keeping.is === "parted";
    const { data, tables } = toGridBook(book, title);
    grid.open(data, tables);
    await keeper.begin(title, true);
    notice.say(
      [`“${title}” is open.`, leftOut(book.leftOut), hadWork && "Your earlier work is under Other workbooks."]
        .filter(Boolean)
        .join(" "),
    );
  };

  const openFile = (file: File) =>
    attempt(notice, `Reading ${file.name}…`, async () =>
      openBytes(new Uint8Array(await file.arrayBuffer()), baseName(file.name)),
    );

  const strip = makeStrip({
    openFile,
    openSample: (path, title) =>
      attempt(notice, `Reading ${title}…`, async () => {
        const response = await fetch(path);
        if (!response.ok) throw new FileProblem("The sample isn't in this build; run the build anew.");
        await openBytes(new Uint8Array(await response.arrayBuffer()), title);
      }),
    save: () =>
      attempt(notice, "Writing the file…", async () => {
        await grid.workbook.endEditingAsync(true);
        await grid.calculated();
        const name = download(writeBook(toFileBook(grid)), keeper.title);
        notice.say(`A copy went to your downloads as ${name}.`);
      }),
    openExample: () =>
      attempt(notice, "", async () => {
        if (!(await mayLeave())) return;
        const { data, tables } = openingExample();
        grid.open(data, tables);
        await keeper.begin("Opening example", false);
        notice.say("The opening example is back as it was at first. Your own work is under Other workbooks.");
      }),
    openEarlier: (id) =>
      attempt(notice, "", async () => {
        if (!(await mayLeave())) return;
        const work = await keeper.take(id);
        if (!work) return notice.say("that work is open in another tab; go on there.", true);
        grid.open(work.data, work.tables);
        notice.say(`“${work.title}” is open again.`);
      }),
    forget: (id) => keeper.forget(id),
    earlier: () => keeper.earlier(),
  });
  places.strip.append(strip.element);
  keeper.onKeeping(strip.showKeeping);
  acceptDrops(places.sheet, openFile);
  return notice;
}

function reason({ keeping }: Keeper): string {
  return keeping.is === "refused" ? keeping.why : "the browser does not answer";
}

/** Runs what may fail, after the page had time to say what it is about. */
async function attempt(notice: Notice, meanwhile: string, run: () => Promise<void>): Promise<void> {
  notice.say(meanwhile);
  await new Promise((resolve) => setTimeout(resolve, 30));
  try {
    await run();
    if (meanwhile && notice.says(meanwhile)) notice.say("");
  } catch (error) {
    if (!(error instanceof FileProblem)) console.warn(error);
    notice.say(error instanceof Error ? error.message : String(error), true);
  }
}

function leftOut(things: readonly string[]): string {
  if (things.length === 0) return "";
  const listed = things.length > 1 ? `${things.slice(0, -1).join(", ")} and ${things.at(-1)}` : things[0];
  return `The file also holds ${listed}: not shown here, nor in a saved copy. The file itself stays as it is.`;
}

function baseName(fileName: string): string {
  return fileName.replace(/\.xls[xm]?$/i, "");
}
