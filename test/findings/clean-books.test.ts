import { describe, expect, test } from "vitest";
import { look } from "../../taskpane/findings/look";
import { cleanBooks } from "./clean-books";

describe.each(Object.entries(cleanBooks))("the clean book of the %s", (_, make) => {
  test("has nothing the matter, and every call of it is followed", async () => {
    const { findings, notFollowed, calls } = await look(make().build());
    expect(findings).toEqual([]);
    expect(notFollowed).toEqual([]);
    expect(calls).toBeGreaterThan(30);
  });
});
