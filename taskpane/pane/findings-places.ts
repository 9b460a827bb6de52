import type { Workbook } from "../workbook/workbook";
import { h, type Child } from "./h";

/** So many ranges are shown before the rest is counted. */
const most = 6;

/** Ranges of cells, each a way to go there where there is a sheet to go to. */
export function placesView(workbook: Workbook, sheet: string, cells: string): Child[] {
  const ranges = cells.split(", ");
  const shown = ranges.slice(0, most).flatMap((range, i) => [i > 0 && " ", placeView(workbook, sheet, range)]);
  return ranges.length > most ? [...shown, ` and ${ranges.length - most} more`] : shown;
}

function placeView(workbook: Workbook, sheet: string, range: string): HTMLElement {
  if (!workbook.capabilities.has("write")) return h("code", { class: "place" }, range);
  return h(
    "button",
    {
      type: "button",
      class: "place",
      "aria-label": `${range} on ${sheet}, go there`,
      click: () => void workbook.goTo({ sheet, address: range.split(":")[0] }),
    },
    range,
  );
}
