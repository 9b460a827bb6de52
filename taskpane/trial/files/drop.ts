/** Opens a file that is dropped on an element, and shows that it may be. */
export function acceptDrops(place: HTMLElement, open: (file: File) => void): void {
  const holdsFile = (event: DragEvent) => event.dataTransfer?.types.includes("Files") ?? false;
  // Before the grid sees them; without a file it may drag what it likes.
  const on = (kind: "dragover" | "dragleave" | "drop", act: (event: DragEvent) => void) =>
    place.addEventListener(
      kind,
      (event) => {
        if (!holdsFile(event)) return;
        event.preventDefault();
        event.stopPropagation();
        act(event);
      },
      true,
    );
  on("dragover", () => place.classList.add("dropping"));
  on("dragleave", ({ relatedTarget }) => {
    if (!(relatedTarget instanceof Node) || !place.contains(relatedTarget)) place.classList.remove("dropping");
  });
  on("drop", ({ dataTransfer }) => {
    place.classList.remove("dropping");
    const file = dataTransfer?.files[0];
    if (file) open(file);
  });
}
