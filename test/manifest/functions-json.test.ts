import { describe, expect, test } from "vitest";
import { catalogue } from "../../functions/catalogue";
import { readBuilt } from "./built";

interface Declared {
  id: string;
  name: string;
  helpUrl: string;
}

const metadata = JSON.parse(readBuilt("functions.json"));
const declared: Declared[] = metadata.functions;

test("functions.json declares the functions of the catalogue, and each under its own name", () => {
  expect(declared.map(({ id }) => id).sort()).toEqual(catalogue.map(({ name }) => name).sort());
  for (const { id, name } of declared) expect(name).toBe(id);
});

test("an error in one cell of a range does not take the whole call down", () => {
  expect(metadata.allowErrorForDataTypeAny).toBe(true);
});

test("every function's help link opens its own page of the pane, under the origin of the build", () => {
  for (const { id, helpUrl } of declared) expect(helpUrl).toBe(`https://localhost:3000/taskpane.html#${id}`);
});

describe("ids the host takes", () => {
  test.each(declared.map(({ id }) => id))("%s", (id) => expect(problemOf(id)).toBeUndefined());

  test.each(["AB", "A-B", "Ä12", "XFD1048576", "ABC123", "a1", "R1C1", "RC"])("and one it does not: %s", (id) =>
    expect(problemOf(id)).toBeDefined(),
  );

  test.each(["XFE1", "ABC1048577", "ABCD1", "A_1", "LIMITS.2"])("at the edge of what it takes: %s", (id) =>
    expect(problemOf(id)).toBeUndefined(),
  );
});

/** The platform's documentation: letters, digits, underscores and full stops; three characters; not like a cell. */
function problemOf(id: string): string | undefined {
  if (!/^[A-Za-z0-9_.]+$/.test(id)) return "takes letters, digits, _ and . alone";
  if (id.length < 3) return "is shorter than three characters";
  if (isCell(id)) return "reads as a cell";
  return undefined;
}

/** Up to XFD1048576, or in the notation of rows and columns. */
function isCell(id: string): boolean {
  const [, letters, digits] = /^([A-Z]{1,3})(\d{1,7})$/i.exec(id) ?? [];
  if (!letters) return /^R\d*C\d*$/i.test(id);
  const column = [...letters.toUpperCase()].reduce((sum, letter) => sum * 26 + letter.charCodeAt(0) - 64, 0);
  return column <= 16384 && Number(digits) >= 1 && Number(digits) <= 1048576;
}
