import type { FWorkbook } from "@univerjs/preset-sheets-core";
import type { CellAlertManagerService } from "@univerjs/preset-sheets-core";
import type { Contents } from "./contents";

/** The grid's own key for the pop-up over an error cell. */
const errorPopup = "SHEET_FORMULA_ALERT";

/** Puts the function's own message where the grid would explain the bare error code. */
export function showOwnMessages(
  popups: CellAlertManagerService,
  shown: () => { workbook: FWorkbook; contents: Contents },
): void {
  const show = popups.showAlert.bind(popups);
  popups.showAlert = (popup) => {
    if (popup.key !== errorPopup) return show(popup);
    const { subUnitId, row, col } = popup.location;
    const { workbook, contents } = shown();
    const sheet = workbook.getSheetBySheetId(subUnitId);
    const content = sheet && contents.value(sheet, { row, column: col });
    if (!content || typeof content !== "object" || !content.message) return show(popup);
    show({ ...popup, title: content.error, message: content.message, width: 320, height: 110 });
  };
}
