import "@univerjs/preset-sheets-core/lib/index.css";
import "./trial.css";
import { mountPane } from "../pane/mount";
import { trialWorkbook } from "../workbook/trial";
import { layOut } from "./books/lay-out";
import { openingSheets } from "./books/opening-sheets";
import { moveFocusWithF6 } from "./focus";
import { createGrid } from "./grid/grid";
import { loadFunctions } from "./host";
import { mountStatusLine } from "./status-line";
import { mountTabs } from "./tabs";

const part = (id: string) => document.getElementById(id)!;

async function start(): Promise<void> {
  const functions = await loadFunctions();
  const dark = matchMedia("(prefers-color-scheme: dark)");
  const grid = createGrid(part("grid"), functions, layOut(openingSheets, dark.matches), [], dark.matches);
  dark.addEventListener("change", () => grid.setDark(dark.matches));
  await grid.drawn;
  mountTabs(part("tabs"), grid);
  mountStatusLine(part("status"), grid);
  const workbook = trialWorkbook(grid);
  mountPane(part("pane"), workbook);
  // For the browser's console, and for tests, which can't read the cells off a canvas.
  Object.assign(window, { wallfallWorkbook: workbook });
  moveFocusWithF6(part("pane"), grid);
}

start().catch((error: unknown) => {
  part("status").textContent =
    `The sheet could not be opened: ${error instanceof Error ? error.message : String(error)}`;
});
