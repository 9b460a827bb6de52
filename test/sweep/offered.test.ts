import { expect, test } from "vitest";
import { catalogue, entryNamed } from "../../functions/catalogue";
import { readTyped, typedText } from "../../taskpane/pane/typed";
import { sweptInputs, usualEnds, valuesTyped } from "../../taskpane/sweep/offered";

const inputsOf = (name: string) => sweptInputs(entryNamed(name)!).map((i) => entryNamed(name)!.inputs[i].name);

test("numbers and ion masses can be swept, words and flags not", () => {
  expect(inputsOf("SHEATHWIDTH")).toEqual(["V_s", "n_edge", "T_e", "lambda_i"]);
  expect(inputsOf("EMISSIONLIMIT")).toEqual(["ion"]);
});

test("what spills a table for every set of inputs, takes whole ranges or gives text is not swept", () => {
  for (const name of [
    "SHEATHPROFILE",
    "NEGATIVEIONEDGE",
    "IONMIXFLUXES",
    "EEPFMOMENTS",
    "REGIME",
    "WITHIN",
    "LIMITCHECK",
  ])
    expect(inputsOf(name), name).toEqual([]);
});

test("every other function of one number or one row offers a sweep", () => {
  const without = catalogue.filter((entry) => sweptInputs(entry).length === 0).map(({ name }) => name);
  expect(without.length).toBeLessThan(catalogue.length / 3);
});

test("the usual ends of every sweep are values that its input takes", () => {
  for (const entry of catalogue) {
    for (const i of sweptInputs(entry)) {
      const ends = usualEnds(entry.inputs[i], readTyped(typedText(entry.example[i])).cell);
      const values = valuesTyped(entry.inputs[i], { ...ends, count: 5 });
      expect(values, `${entry.name} ${entry.inputs[i].name}`).toHaveLength(5);
    }
  }
});

test("the usual ends lie a decade to either side of the value in the form, as far as that is plausible", () => {
  const [V_s] = entryNamed("SHEATHWIDTH")!.inputs;
  expect(usualEnds(V_s, 300)).toEqual({ from: 30, to: 3000, spacing: "logarithmic" });
  const angle = entryNamed("MAGNETICPRESHEATHDROP")!.inputs[1];
  expect(usualEnds(angle, 30)).toMatchObject({ from: 3, to: 90 });
  const work = entryNamed("RICHARDSONCURRENT")!.inputs[1];
  expect(usualEnds(work, 4.5)).toMatchObject({ from: 1, to: 8 });
});

test("a value of zero is swept upwards in linear steps, since it has no decades", () => {
  const V_rf = entryNamed("RFFLOATINGSHIFT")!.inputs[0];
  expect(usualEnds(V_rf, 0)).toMatchObject({ from: 0, spacing: "linear" });
});

test("ends typed with a unit are read in the input's own", () => {
  const p = entryNamed("MEANFREEPATH")!.inputs[0];
  const typed = { from: "1 mTorr", to: "10 mTorr", count: 2, spacing: "linear" } as const;
  // 1 Torr = 101325/760 Pa, NIST SP 811.
  expect(valuesTyped(p, typed)).toEqual([0.101325 / 0.76, 1.01325 / 0.76].map((pascal) => expect.closeTo(pascal, 12)));
});

test.each([
  ["SHEATHWIDTH", 1, "1e16 kg", "1e17", /n_edge: "kg" is a unit of mass/],
  ["SHEATHWIDTH", 0, null, "10", /V_s needs both ends/],
  ["BOHMSPEED", 1, "Ar+", "100", /masses in u/],
  ["WALLHEATFLUX", 4, "floating", "-10", /runs over numbers/],
])("%s, input %d: from %s to %s is refused with what to type instead", (name, i, from, to, said) => {
  expect(valuesTyped(entryNamed(name)!.inputs[i], { from, to, count: 5, spacing: "linear" })).toMatch(said);
});
