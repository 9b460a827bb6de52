import type { Workbook } from "./workbook";

const refuse = () => Promise.reject(new Error("there is no workbook here"));

/** The pane as a plain page: documentation and calculation, no sheet. */
export const noWorkbook: Workbook = {
  capabilities: new Set(),
  selection: () => Promise.resolve(undefined),
  onSelection: () => () => undefined,
  isFilled: () => Promise.resolve(false),
  write: refuse,
  goTo: refuse,
  read: refuse,
  replaceSheet: refuse,
  copySheet: refuse,
  addChart: refuse,
  getSetting: () => Promise.resolve(undefined),
  setSetting: refuse,
};
