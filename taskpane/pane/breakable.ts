import { h } from "./h";

/** Text of a formula with places where a narrow pane may break it: after a bracket, a comma or a dot. */
export function breakable(text: string): (Node | string)[] {
  return text.split(/(?<=[(,.])/).flatMap((part) => [part, h("wbr")]);
}
