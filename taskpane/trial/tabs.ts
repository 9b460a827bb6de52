import { h } from "../pane/h";
import type { Grid } from "./grid/grid";

/** A tab for every sheet under the grid; arrow keys move between them, as in any list of tabs. */
export function mountTabs(place: HTMLElement, grid: Grid): void {
  const { api } = grid;
  const show = () => {
    const { workbook } = grid;
    const hadFocus = place.contains(document.activeElement);
    const active = workbook.getActiveSheet().getSheetId();
    const sheets = workbook.getSheets().filter((sheet) => !sheet.isSheetHidden());
    const tabs = sheets.map((sheet) => {
      const selected = sheet.getSheetId() === active;
      return h(
        "button",
        {
          type: "button",
          role: "tab",
          "aria-selected": String(selected),
          "aria-controls": "grid",
          tabindex: selected ? 0 : -1,
          click: () => void workbook.setActiveSheet(sheet),
        },
        sheet.getSheetName(),
      );
    });
    place.replaceChildren(...tabs);
    if (hadFocus) tabs[sheets.findIndex((sheet) => sheet.getSheetId() === active)]?.focus();
  };
  place.addEventListener("keydown", (event) => {
    const { workbook } = grid;
    const sheets = workbook.getSheets().filter((sheet) => !sheet.isSheetHidden());
    const active = workbook.getActiveSheet().getSheetId();
    const next = moved(
      event.key,
      sheets.findIndex((sheet) => sheet.getSheetId() === active),
      sheets.length,
    );
    if (next === undefined) return;
    event.preventDefault();
    workbook.setActiveSheet(sheets[next]);
  });
  for (const event of [
    api.Event.ActiveSheetChanged,
    api.Event.SheetCreated,
    api.Event.SheetDeleted,
    api.Event.SheetMoved,
    api.Event.SheetNameChanged,
  ])
    api.addEvent(event, show);
  grid.onOpened(show);
  show();
}

function moved(key: string, from: number, count: number): number | undefined {
  if (key === "ArrowRight") return (from + 1) % count;
  if (key === "ArrowLeft") return (from + count - 1) % count;
  if (key === "Home") return 0;
  return key === "End" ? count - 1 : undefined;
}
