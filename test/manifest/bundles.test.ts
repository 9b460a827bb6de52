import { gzipSync } from "node:zlib";
import { expect, test } from "vitest";
import { allowVendor, fromVendor } from "../../manifest/build/host-library.js";
import { isPermissive } from "../../manifest/build/licences.js";
import { policy } from "../../manifest/build/policy.js";
import { readBuilt } from "./built";

test("functions.js is at most 60 KB gzipped", () => {
  expect(gzipSync(readBuilt("functions.js"), { level: 9 }).length).toBeLessThanOrEqual(60 * 1024);
});

/** Traces that the trial sheet's grid and the host of its interface leave in any bundle they are in. */
const grid = /univer-|UniverInstance|__REACT_DEVTOOLS/;

test("the trial sheet's grid stays out of the add-in's bundles", () => {
  const holdingIt = ["functions.js", "taskpane.js", "trial.js"].filter((bundle) => grid.test(readBuilt(bundle)));
  expect(holdingIt).toEqual(["trial.js"]);
});

test("the functions hold no way to run text as code, or to ask anyone for anything", () => {
  const ways =
    /\beval\(|new Function\(|importScripts|\bfetch\(|XMLHttpRequest|WebSocket|sendBeacon|localStorage|indexedDB/;
  expect(ways.exec(readBuilt("functions.js"))?.[0]).toBeUndefined();
});

test("the pages of the build run under a policy that names no origin but their own", () => {
  expect(readBuilt("policy.txt").trim()).toBe(policy);
  expect(policy).toMatch(/^default-src 'none'/);
  expect(policy).not.toMatch(/https?:|\*|unsafe-eval/);
});

test("a page may take the host library from its vendor, and its policy then lets that one address in", () => {
  const page = fromVendor(
    `<!doctype html><html><head><meta http-equiv="Content-Security-Policy" content="${policy}"><script src="office.js"></script><script src="taskpane.js"></script></head></html>`,
  );
  expect(page).toContain('<script src="https://appsforoffice.microsoft.com/lib/1/hosted/office.js"></script>');
  expect(page).toContain('<script src="taskpane.js"></script>');
  expect(page).toContain(allowVendor(policy));
  expect(allowVendor(policy)).toContain("script-src 'self' https://appsforoffice.microsoft.com;");
});

test("what ships is listed with its terms", () => {
  const listed = readBuilt("licences.txt");
  for (const shipped of ["unitmath", "@microsoft/office-js", "@univerjs/core", "react", "@fontsource/stix-two-math"]) {
    expect(listed).toMatch(new RegExp(`^${shipped} [\\d.]+ \\(`, "m"));
  }
  expect(listed).toContain("MIT License");
  expect(listed).not.toContain("webpack ");
});

test("terms that ask for more than a notice are refused, and a choice of terms is as good as its best", () => {
  for (const licence of ["MIT", "Apache-2.0", "(MIT OR GPL-3.0-only)", "MIT AND ISC"]) {
    expect(isPermissive("some-package", licence), licence).toBe(true);
  }
  for (const licence of [
    "GPL-3.0-only",
    "LGPL-2.1-or-later",
    "AGPL-3.0",
    "MPL-2.0",
    "MIT AND GPL-2.0-only",
    "SEE LICENSE IN X",
    "none stated",
  ]) {
    expect(isPermissive("some-package", licence), licence).toBe(false);
  }
});
