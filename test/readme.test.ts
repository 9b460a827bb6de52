import { readFileSync } from "node:fs";
import { expect, test } from "vitest";
import { functionTable, readmeTable } from "./readme-table";

test("the README lists the functions there are, in their own words", async () => {
  expect(readmeTable(readFileSync("README.md", "utf8")), "run `npm run readme`").toBe(await functionTable());
});
