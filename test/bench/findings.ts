/** What looking through a workbook costs: for a formula that repeats down a column, and for one that is like no other. */
import { look } from "../../taskpane/findings/look";
import type { WorkbookContent } from "../../taskpane/workbook/workbook";
import { frontDoors } from "../../functions/front-doors";
import type { Row } from "./measure";

export async function findings(): Promise<Row[]> {
  const half = await timed(workbook(50_000, false));
  const repeated = await timed(workbook(100_000, false));
  const distinct = await timed(workbook(20_000, true));
  return [
    { what: "100,000 formulas of one relative form", value: repeated, unit: "ms" },
    { what: "one more repeated formula", value: (repeated / 100_000) * 1000, unit: "µs" },
    { what: "one more distinct formula", value: (distinct / 20_000) * 1000, unit: "µs" },
    growth(repeated / half),
  ];
}

function growth(value: number): Row {
  return {
    what: "100,000 formulas against 50,000",
    value,
    unit: "× the time",
    claim: "≤ 2.6: linear",
    holds: value <= 2.6,
  };
}

/** The quickest of some: what else the machine does, and the compiler's first time, must not count. */
async function timed(content: WorkbookContent): Promise<number> {
  let least = Infinity;
  for (let i = 0; i < 4; i++) {
    const start = performance.now();
    await look(content);
    least = Math.min(least, performance.now() - start);
  }
  return least;
}

/** A sheet with nothing the matter: two inputs and a call in every row. */
function workbook(rows: number, isDistinct: boolean): WorkbookContent {
  const inputs = Array.from({ length: rows }, (_, i) => [1e16 * (1 + i / rows), 3 + i / rows]);
  const widths = frontDoors.DEBYELENGTH(
    inputs.map(([n]) => [n]),
    inputs.map(([, T]) => [T]),
  ) as number[][];
  const values = inputs.map((row, i) => [...row, widths[i][0] * (isDistinct ? i + 1 : 1)]);
  const formulas = inputs.map((_, i) => {
    const call = `=SHEATH.DEBYELENGTH(A${i + 1},B${i + 1})`;
    return [undefined, undefined, isDistinct ? `${call}*${i + 1}` : call];
  });
  return { names: {}, sheets: [{ name: "Bench", origin: "A1", values, formulas, spills: [], tables: [] }] };
}
