import { standingOf } from "../findings/accepted";
import { causes, type Cause } from "../findings/causes";
import type { Finding } from "../findings/finding";
import { openFindings } from "../findings/look-through";
import { counted, countText } from "../findings/words";
import type { Acceptance } from "../findings/accepted";
import { acceptView } from "./findings-accept";
import type { Found } from "./findings-found";
import { causeMark } from "./findings-mark";
import { placesView } from "./findings-places";
import { h, type Child } from "./h";
import { labels } from "./labels";
import { verdictLine } from "./limits-view";

/** Sets or takes back the reason for which a finding may stand; undefined takes it back. */
export type Accept = (finding: Finding, reason: string | undefined) => Promise<void>;

/** All findings by cause, those that were accepted last. */
export function findingsList(found: Found, accept: Accept): HTMLElement[] {
  const open = openFindings(found);
  const accepted = found.look.findings.filter((each) => standingOf(each, found.accepted) === "accepted");
  return [
    ...(open.length === 0
      ? [nothing(found)]
      : byCause(open).map(([cause, group]) => groupView(cause, group, found, accept))),
    ...(accepted.length === 0
      ? []
      : [
          h(
            "section",
            { class: "group" },
            h("h3", {}, labels.accepted, countBadge(accepted.length)),
            items(accepted, found, accept),
          ),
        ]),
  ];
}

function nothing({ look }: Found): HTMLElement {
  if (look.calls === 0) return h("p", {}, "There is nothing here to judge.");
  const rest = look.notFollowed.length > 0 ? " of what could be followed" : "";
  return h(
    "div",
    { class: "group" },
    verdictLine(
      "holds",
      `Nothing is the matter${rest}: no limit is passed, and every saved value is what a new calculation gives.`,
    ),
  );
}

function byCause(findings: readonly Finding[]): [Cause, Finding[]][] {
  return (Object.keys(causes) as Cause[])
    .map((cause): [Cause, Finding[]] => [cause, findings.filter((each) => each.cause === cause)])
    .filter(([, group]) => group.length > 0);
}

/** Each cause with its number, and a way to where its findings stand. */
export function overview(found: Found): HTMLElement | undefined {
  const groups = byCause(openFindings(found));
  if (groups.length < 2) return undefined;
  const lines = groups.map(([cause, group]) =>
    h(
      "li",
      {},
      h(
        "button",
        { type: "button", class: "cause", click: () => goToGroup(cause) },
        causeMark(cause),
        h("span", {}, causes[cause]),
        h("b", {}, String(group.length)),
      ),
    ),
  );
  return h("ul", { class: "causes" }, ...lines);
}

function goToGroup(cause: Cause): void {
  const heading = document.getElementById(groupId(cause));
  heading?.scrollIntoView({ block: "start" });
  heading?.focus({ preventScroll: true });
}

function groupId(cause: Cause): string {
  return `wallfall-findings-${cause}`;
}

function groupView(cause: Cause, group: readonly Finding[], found: Found, accept: Accept): HTMLElement {
  return h(
    "section",
    { class: "group", "data-cause": cause },
    h(
      "h3",
      { id: groupId(cause), tabindex: -1 },
      causeMark(cause),
      h("span", {}, causes[cause]),
      countBadge(group.length),
    ),
    items(group, found, accept),
  );
}

function countBadge(count: number): HTMLElement {
  return h("span", { class: "number" }, String(count));
}

/** So many findings of one cause are shown at first: a pane of thousands helps nobody. */
const atFirst = 40;

function items(group: readonly Finding[], found: Found, accept: Accept): HTMLElement {
  const list = h(
    "ul",
    { class: "found-list" },
    ...group.slice(0, atFirst).map((finding) => item(finding, found, accept)),
  );
  const rest = group.slice(atFirst);
  if (rest.length === 0) return list;
  const more = h("button", { type: "button", class: "quiet" }, `Show ${counted(rest.length, "more finding")}`);
  more.addEventListener("click", () => {
    const shown = rest.map((finding) => item(finding, found, accept));
    list.append(...shown);
    more.remove();
    shown[0].querySelector<HTMLElement>("button, a")?.focus();
  });
  return h("div", {}, list, more);
}

function item(finding: Finding, found: Found, accept: Accept): HTMLElement {
  const { sheet, cells, what, detail } = finding;
  const acceptance: Acceptance | undefined = found.accepted[finding.key];
  const standing = standingOf(finding, found.accepted);
  const count = countText(finding);
  const canAccept = found.workbook.capabilities.has("settings");
  return h(
    "li",
    { class: "finding", "data-key": finding.key },
    h(
      "p",
      { class: "where" },
      ...placesView(found.workbook, sheet, cells),
      h("span", { class: "on" }, ` on ${sheet}${count === "" ? "" : `, ${count}`}`),
    ),
    h("p", { class: "what" }, capital(what), what.endsWith("?") ? "" : "."),
    (detail !== undefined || finding.functions.length > 0) && h("p", { class: "detail" }, ...detailOf(finding)),
    finding.from &&
      h(
        "p",
        { class: "detail" },
        "From ",
        ...placesView(found.workbook, finding.from.sheet, finding.from.cells),
        finding.from.sheet === sheet ? "" : ` on ${finding.from.sheet}`,
      ),
    standing === "changed" &&
      h("p", { class: "detail" }, `Accepted on ${acceptance.date} as: ${acceptance.reason}. It has changed since.`),
    standing === "accepted" && h("p", { class: "detail" }, `${acceptance.reason} (${acceptance.date})`),
    canAccept && acceptView(finding, standing === "accepted", accept),
  );
}

/** How far, and the functions, each a way to its page. */
function detailOf({ detail, functions }: Finding): Child[] {
  const links = functions.flatMap((name, i) => [i > 0 && ", ", h("a", { href: `#${name}` }, name)]);
  return [detail !== undefined && `${detail} `, links.length > 0 && h("span", { class: "calls" }, ...links)];
}

/** Codes of errors keep their case, and so do symbols, which are short. */
function capital(text: string): string {
  const plain = text.replace(/\.$/, "");
  return /^(a |[a-z]{3,}[\s,:])/.test(plain) ? plain[0].toUpperCase() + plain.slice(1) : plain;
}
