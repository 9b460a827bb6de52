import type { ThemeService } from "@univerjs/core";

/** The grid's accent, in the pane's hue so that both read as one page. */
const accent = {
  50: "#fbf4f8",
  100: "#f6e7ef",
  200: "#eccfdf",
  300: "#deadc6",
  400: "#c5729d",
  500: "#a63f78",
  600: "#8b1e5c",
  700: "#74174c",
  800: "#5e123e",
  900: "#4a0e30",
};

export function applyAccent(themes: ThemeService): void {
  themes.setTheme({ ...themes.getCurrentTheme(), primary: accent });
}
