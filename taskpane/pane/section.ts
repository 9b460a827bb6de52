import { h, type Child } from "./h";

export function section(title: string, ...content: Child[]): HTMLElement {
  return h("section", {}, h("h3", {}, title), ...content);
}
