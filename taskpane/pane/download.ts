const kind = "application/vnd.openxmlformats-officedocument.spreadsheetml.sheet";

/** Hands bytes to the browser as a file to save; returns its name. */
export function download(bytes: Uint8Array, title: string): string {
  const name = `${title.replace(/[\\/:*?"<>|]+/g, " ").trim() || "Workbook"}.xlsx`;
  const address = URL.createObjectURL(new Blob([bytes as BlobPart], { type: kind }));
  const link = document.createElement("a");
  link.href = address;
  link.download = name;
  link.click();
  // The browser has begun to read by then.
  setTimeout(() => URL.revokeObjectURL(address), 60_000);
  return name;
}
