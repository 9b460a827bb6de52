import { fileURLToPath } from "node:url";
import { JSDOM } from "jsdom";

const library = fileURLToPath(new URL("../../node_modules/@microsoft/office-js/dist/", import.meta.url));
const noHost = fileURLToPath(new URL("../office/no-host.js", import.meta.url));
const vendor = "https://appsforoffice.microsoft.com";

const scripts = ["office.js", "custom-functions-runtime.js"];

/**
 * What those two load on the hosts that run custom functions (web, Windows, Mac), read off the loader in office.js: one
 * file for pages, one "core" file for the functions' runtime, and the library's own messages, which fall back to English.
 * Left out: other hosts, other languages, and telemetry, without which the library goes on.
 */
const loaded = [
  ...["excel-web-16.00", "excel-win32-16.01", "excel-mac-16.00"].flatMap((host) => [`${host}.js`, `${host}-core.js`]),
  "en-us/office_strings.js",
];

/** Where pages take the host library from. */
export function readOffice(text = "built") {
  if (text === "built" || text === "hosted") return text;
  throw new Error(`--env office=${text}: give built or hosted`);
}

/** The host library as files to copy; where pages take it from its vendor, only what the trial sheet runs on. */
export function hostLibrary(hosted) {
  const files = hosted ? ["custom-functions-runtime.js"] : [...scripts, ...loaded];
  return [
    ...files.map((file) => ({ from: library + file, to: file, info: { minimized: true } })),
    { from: noHost, to: "o15apptofilemappingtable.js", info: { minimized: true } },
  ];
}

/** A page that takes the host library from its vendor instead, with a policy that lets it. */
export function fromVendor(html) {
  const page = new JSDOM(html);
  const { document } = page.window;
  for (const script of document.querySelectorAll("script[src]")) {
    const src = script.getAttribute("src");
    if (scripts.includes(src)) script.setAttribute("src", `${vendor}/lib/1/hosted/${src}`);
  }
  for (const meta of document.querySelectorAll("meta[http-equiv='Content-Security-Policy' i]")) {
    meta.setAttribute("content", allowVendor(meta.getAttribute("content")));
  }
  return page.serialize();
}

/** The policy with the vendor's scripts let in. */
export function allowVendor(policy) {
  return policy.replace("script-src 'self'", `script-src 'self' ${vendor}`);
}
