import { expect, test } from "vitest";
import { accept, openOf, readAccepted, standingOf } from "../../taskpane/findings/accepted";
import { look } from "../../taskpane/findings/look";
import { cleanBooks } from "./clean-books";
import { memoryWorkbook } from "./memory-workbook";

const badBook = () => cleanBooks["argon pre-clean"]().on("Chamber").type("C10", 3e10);

async function found(book = badBook()) {
  const { workbook } = memoryWorkbook(book.build());
  const { findings } = await look(await workbook.read());
  return { workbook, findings, doubt: findings.find(({ cause }) => cause === "doubtful")! };
}

test("a finding accepted with a reason no longer counts, and the reason stays in the workbook", async () => {
  const { workbook, findings, doubt } = await found();
  await accept(workbook, doubt, "Low-density run, probe checked", "2026-05-04");
  const accepted = await readAccepted(workbook);
  expect(standingOf(doubt, accepted)).toBe("accepted");
  expect(accepted[doubt.key]).toMatchObject({ reason: "Low-density run, probe checked", date: "2026-05-04" });
  expect(openOf(findings, accepted)).toEqual(findings.filter((each) => each !== doubt));
  await accept(workbook, doubt, undefined, "2026-05-05");
  expect(openOf(findings, await readAccepted(workbook))).toEqual(findings);
});

test("once the finding changes, it is open again", async () => {
  const { workbook, doubt } = await found();
  await accept(workbook, doubt, "known", "2026-05-04");
  const accepted = await readAccepted(workbook);
  for (const other of [badBook().type("C10", 4e10), badBook().type("C12", 3e10)]) {
    const changed = (await found(other)).doubt;
    expect(changed.key).toBe(doubt.key);
    expect(standingOf(changed, accepted)).toBe("changed");
  }
  expect(standingOf((await found()).doubt, accepted)).toBe("accepted");
});

test("a setting that something else wrote counts as nothing accepted", async () => {
  const { workbook, doubt } = await found();
  for (const text of ["", "not json", "[1]", "null", '{"__proto__":{"print":"x"}}']) {
    await workbook.setSetting("accepted", text);
    expect(standingOf(doubt, await readAccepted(workbook))).toBe("open");
  }
});
