import { expect, test } from "vitest";
import { entryNamed } from "../../functions/catalogue";
import { frontDoors } from "../../functions/front-doors";
import { stretchesOf } from "../../taskpane/sweep/stretches";

function stretches(name: string, swept: number, values: number[], others: Record<number, unknown>) {
  const entry = entryNamed(name)!;
  const args = entry.inputs.map((_, i) => (i === swept ? values.map((value) => [value]) : [[others[i] ?? null]]));
  return { found: stretchesOf(entry, args, swept, frontDoors[name](...args)), args };
}

// Child's law at T_e = 3 eV: the limit list asks for V_s/T_e of 300 and gives it up below 30.
test("Child's law fails, is marginal and holds over neighbouring stretches of the voltage", () => {
  const { found } = stretches("SHEATHWIDTH", 0, [30, 60, 90, 300, 600, 900, 3000], { 1: 1e16, 2: 3, 4: 0.1 });
  expect(found).toMatchObject([
    { first: 0, last: 1, word: "fails" },
    { first: 2, last: 4, word: "marginal", reason: expect.stringContaining("between 30 and 300") },
    { first: 5, last: 6, word: "holds", reason: "" },
  ]);
});

test("rows without a value are one stretch, with the reason of the first", () => {
  const { found } = stretches("EDGEDECAYLENGTH", 3, [1000, 2000, 4000], { 0: 1e16, 1: 3, 2: "Ar+" });
  expect(found).toMatchObject([
    { first: 0, last: 1, word: "no value", reason: expect.stringMatching(/Below the Bohm speed/) },
    { first: 2, last: 2, word: "holds" },
  ]);
});

test("values that are doubted are marked with what may have been meant", () => {
  const { found } = stretches("DEBYELENGTH", 0, [1e11, 1e16], { 1: 3 });
  expect(found).toMatchObject([{ word: "doubtful input", reason: "cm⁻³ meant?" }, { word: "holds" }]);
});

test("each word is the one that LIMITCHECK writes beside that row", () => {
  const values = [1, 3, 10, 30, 100, 300, 1000, 3000];
  for (const [name, swept, others] of [
    ["SHEATHWIDTH", 0, { 1: 1e16, 2: 3, 3: "collisional", 4: 1e-3 }],
    ["FLOATINGPOTENTIAL", 0, { 1: "Ar+" }],
    ["WALLHEATFLUX", 1, { 0: 1e17, 2: "Xe+" }],
    ["IONENERGYSPREAD", 0, { 1: 100, 2: 5e-3, 3: 13.56e6, 4: "Ar+" }],
  ] as const) {
    const { found, args } = stretches(name, swept, values, others);
    const written = frontDoors.LIMITCHECK([[name]], args).map(([cell]) => String(cell).split(":")[0]);
    const told = values.map((_, i) => found.find(({ first, last }) => i >= first && i <= last)!.word);
    expect(
      told.map((word) => (word === "no value" ? "fails" : word)),
      name,
    ).toEqual(written);
  }
});
