import { h } from "./h";

/** A bug is told in its place, and stays there: the rest of the pane goes on. */
export function brokenView(error: unknown): HTMLElement {
  const what = error instanceof Error ? error.message : String(error);
  return h(
    "p",
    { class: "problem" },
    `This page is broken here (${what}). Please report it; the other functions are not affected.`,
  );
}
