import { expect, test } from "vitest";
import { fault, fuzz, generator, randomCall } from "./fuzz";

test("any call with any cells ends in numbers, texts and worded errors", () => {
  // Time is not asserted here: a busy machine would fail it. The fuzz target on the command line does that.
  expect(fuzz(30_000, 20261201, Infinity)).toEqual([]);
});

test("the same seed makes the same calls", () => {
  const [a, b] = [generator(5), generator(5)];
  expect(randomCall(a)).toEqual(randomCall(b));
});

test("what is wrong with an answer is noticed", () => {
  expect(fault({ name: "NOSUCH", args: [] })).toMatch(/^threw/);
  expect(fault({ name: "DEBYELENGTH", args: [[[1e16]], [[3]]] }, -1)).toMatch(/^took/);
});
