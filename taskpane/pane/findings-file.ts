import { fileWorkbook } from "../workbook/file";
import { readBook } from "../workbook/xlsx-read";
import type { Source } from "./findings-found";
import { h } from "./h";
import { labels } from "./labels";

/** The workbook in a file that was chosen or dropped: read in the page, sent nowhere, never changed. */
export async function openFile(file: File): Promise<Source> {
  const bytes = new Uint8Array(await file.arrayBuffer());
  return { workbook: fileWorkbook(bytes), file: { name: file.name, book: readBook(bytes) } };
}

/** A button that asks for a file. */
export function fileChooser(open: (file: File) => void, isMain: boolean): HTMLElement {
  const chooser = h("input", { type: "file", accept: ".xlsx,.xlsm", hidden: true, "aria-label": labels.chooseFile });
  chooser.addEventListener("change", () => {
    const file = chooser.files?.[0];
    // The same file may be chosen again.
    chooser.value = "";
    if (file) open(file);
  });
  const button = h(
    "button",
    { type: "button", class: isMain ? undefined : "quiet", click: () => chooser.click() },
    labels.chooseFile,
  );
  return h("div", { class: "chooser" }, button, chooser);
}

/** Takes files dropped anywhere on an element. */
export function acceptFiles(place: HTMLElement, open: (file: File) => void): void {
  const holdsFile = ({ dataTransfer }: DragEvent) => dataTransfer?.types.includes("Files") ?? false;
  place.addEventListener("dragover", (event) => {
    if (!holdsFile(event)) return;
    event.preventDefault();
    place.classList.add("taking");
  });
  place.addEventListener("dragleave", ({ relatedTarget }) => {
    if (!(relatedTarget instanceof Node) || !place.contains(relatedTarget)) place.classList.remove("taking");
  });
  place.addEventListener("drop", (event) => {
    if (!holdsFile(event)) return;
    event.preventDefault();
    place.classList.remove("taking");
    const file = event.dataTransfer?.files[0];
    if (file) open(file);
  });
}
