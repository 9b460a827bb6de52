/// <reference types="office-js" />
import { officeWorkbook } from "./office";
import type { Workbook } from "./workbook";

/** The workbook the host has open; undefined where there is no host, or one without sheets. */
export async function workbookOfHost(): Promise<Workbook | undefined> {
  // A page saved without the host library has no Office at all.
  if (typeof Office === "undefined") return undefined;
  const { host } = await Office.onReady();
  return host === Office.HostType.Excel ? officeWorkbook() : undefined;
}
