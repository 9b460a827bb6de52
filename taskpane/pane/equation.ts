import { equations } from "../equations";
import { h } from "./h";
import { labels } from "./labels";

/** The equation as the build typeset it; undefined where the catalogue has none. */
export function equationView(name: string): HTMLElement | undefined {
  const mathml = equations[name];
  if (!mathml) return undefined;
  const parsed = new DOMParser().parseFromString(trusted(mathml), "text/html");
  // Wide equations scroll inside their own box, which the keyboard must be able to reach.
  return h(
    "div",
    { class: "equation", tabindex: 0, role: "group", "aria-label": `${labels.equationOf} ${name}` },
    ...parsed.body.children,
  );
}

interface TrustedTypes {
  createPolicy(name: string, rules: { createHTML(text: string): string }): { createHTML(text: string): string };
}

/** Lets through what the build made and nothing else, also where a page's policy asks for Trusted Types. */
const rules = {
  createHTML(text: string): string {
    if (!Object.values(equations).includes(text)) throw new TypeError("not an equation of this build");
    return text;
  },
};

const policy =
  (globalThis as { trustedTypes?: TrustedTypes }).trustedTypes?.createPolicy("wallfall-equations", rules) ?? rules;

function trusted(mathml: string): string {
  return policy.createHTML(mathml);
}
