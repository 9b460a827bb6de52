import "@univerjs/preset-sheets-core/lib/index.css";
import "./trial.css";
import { h } from "../pane/h";
import { mountPane } from "../pane/mount";
import { trialWorkbook } from "../workbook/trial";
import { layOut } from "./books/lay-out";
import { openingSheets } from "./books/opening-sheets";
import { newBookId } from "./files/book-data";
import { Keeper } from "./files/keeper";
import { mountFiles } from "./files/mount";
import { rememberWork } from "./files/tab";
import { moveFocusWithF6 } from "./focus";
import { createGrid } from "./grid/grid";
import { loadFunctions } from "./host";
import { mountStatusLine } from "./status-line";
import { mountTabs } from "./tabs";

const part = (id: string) => document.getElementById(id)!;

async function start(): Promise<void> {
  const dark = matchMedia("(prefers-color-scheme: dark)");
  const example = () => ({ data: { ...layOut(openingSheets, dark.matches), id: newBookId() }, tables: [] });
  const [functions, { keeper, resumed }] = await Promise.all([loadFunctions(), keptWork()]);
  const { data, tables } = resumed?.work ?? example();
  const grid = createGrid(part("grid"), functions, data, tables, dark.matches);
  dark.addEventListener("change", () => grid.setDark(dark.matches));
  await grid.drawn;
  mountTabs(part("tabs"), grid);
  const places = { row: part("below"), strip: part("below"), sheet: part("sheet") };
  const notice = mountFiles(places, grid, keeper, example);
  if (resumed && resumed.how !== "reload") notice.say(comeBack[resumed.how](resumed.work.title));
  keeper.watch(grid);
  mountStatusLine(part("status"), grid);
  const workbook = trialWorkbook(grid);
  mountPane(part("pane"), workbook);
  // For the browser's console, and for tests, which can't read the cells off a canvas.
  Object.assign(window, { wallfallWorkbook: workbook });
  moveFocusWithF6(part("pane"), grid);
}

async function keptWork() {
  const keeper = await Keeper.start();
  return { keeper, resumed: await keeper.resume() };
}

const comeBack = {
  left: (title: string) => `“${title}” is open as you left it. The opening example is under Other workbooks.`,
  copy: (title: string) => `“${title}” is open in another tab too. This is a copy of it with changes of its own.`,
};

start().catch((error: unknown) => {
  const why = error instanceof Error ? error.message : String(error);
  const startAnew = () => {
    rememberWork(newBookId());
    location.reload();
  };
  const other = h("button", { type: "button", click: startAnew }, "Open the opening example");
  part("status").replaceChildren(`The sheet could not be opened: ${why} Kept work stays kept. `, other);
});
