import type { Grid } from "./grid/grid";

/** Tab belongs to the cells, as in any sheet, so F6 leads out of the grid to the pane and back. */
export function moveFocusWithF6(pane: HTMLElement, grid: Grid): void {
  let left: HTMLElement | null = null;
  pane.tabIndex = -1;
  // Before the grid sees the key.
  addEventListener(
    "keydown",
    (event) => {
      if (event.key !== "F6" || event.altKey || event.ctrlKey || event.metaKey) return;
      event.preventDefault();
      event.stopImmediatePropagation();
      const at = document.activeElement;
      if (at instanceof HTMLElement && pane.contains(at)) {
        left = at;
        grid.focus();
      } else (left?.isConnected ? left : (pane.querySelector<HTMLElement>("input") ?? pane)).focus();
    },
    true,
  );
}
