/** The pane on its page: beside a workbook where a host opens it, alone where a browser does. */
import { mountPane } from "./pane/mount";
import { workbookOfHost } from "./workbook/host";
import { noWorkbook } from "./workbook/none";

/** A browser answers at once that there is no host; a host that is slow gets its pane later. */
const patience = 2000;

async function start(root: HTMLElement): Promise<void> {
  const host = workbookOfHost();
  const inTime = await Promise.race([host, pause(patience)]);
  mountPane(root, inTime ?? noWorkbook);
  const late = await host;
  if (late && !inTime) mountPane(root, late);
}

function pause(milliseconds: number): Promise<undefined> {
  return new Promise((resolve) => setTimeout(resolve, milliseconds, undefined));
}

void start(document.querySelector<HTMLElement>("#pane")!);
