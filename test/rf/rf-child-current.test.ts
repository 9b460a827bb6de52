import { describe, expect, test } from "vitest";
import { judgeAll } from "../../functions/cells/verdict";
import { LIMITCHECK } from "../../functions/checks/functions";
import { eps0, e, u } from "../../functions/matter/constants";
import type { Ion } from "../../functions/matter/ion";
import { RFCHILDCURRENT as entry } from "../../functions/rf/entries";
import { RFCHILDCURRENT } from "../../functions/rf/functions";
import * as model from "../../functions/rf/model";

const argon: Ion = { mass: 39.95 * u, charge: 1, label: "Ar+" };
const current = (...cells: unknown[]) => (RFCHILDCURRENT as any)(...cells.map((cell) => [[cell]]))[0][0];

describe("RFCHILDCURRENT", () => {
  test("an RF sheath carries 50/27 of the current that Child's law allows at the same voltage and width", () => {
    // Source: Lieberman 1988; Child's law written out: (4/9) ε₀ √(2e/M) V^(3/2)/s².
    const child = ((4 / 9) * eps0 * Math.sqrt((2 * e) / argon.mass) * 300 ** 1.5) / 0.005 ** 2;
    expect(model.rfChildCurrent(300, 0.005, argon) / child).toBeCloseTo(50 / 27, 13);
  });

  test("the current that a plasma supplies fills the sheath to its largest width", () => {
    // e n_edge u_B through RFSHEATHWIDTH: the two laws are one. Lieberman 1988.
    const [n_edge, T_e] = [1e16, 3];
    const s_m = model.rfSheathWidth(300, n_edge, T_e);
    const supplied = e * n_edge * Math.sqrt((e * T_e) / argon.mass);
    expect(model.rfChildCurrent(300, s_m, argon) / supplied).toBeCloseTo(1, 13);
  });

  test("both laws give one current where λ_i is 0.24 of the width", () => {
    const path = (model.collisionlessCoefficient / model.collisionalCoefficient) ** 2;
    expect(path).toBeCloseTo(0.24, 2);
    expect(
      model.rfChildCurrentCollisional(300, 0.005, argon, path * 0.005) / model.rfChildCurrent(300, 0.005, argon),
    ).toBeCloseTo(1, 13);
  });

  test("collisions cost current: the collisional law falls with the square root of the path", () => {
    expect(
      model.rfChildCurrentCollisional(300, 0.005, argon, 1e-4) /
        model.rfChildCurrentCollisional(300, 0.005, argon, 4e-4),
    ).toBeCloseTo(0.5, 13);
  });

  test("the collisional law asks for the mean free path that it lacks", () => {
    expect(current(300, 0.005, "Ar+", "collisional").message).toMatch(
      /^lambda_i: it is blank while model is "collisional"/,
    );
  });

  test("a model word that is not known is answered with the two that are", () => {
    expect(current(300, 0.005, "Ar+", "child").message).toMatch(/"collisionless" or "collisional"/);
  });

  test("the default is the collisionless law, in A/m² or the unit asked for", () => {
    expect(current(-300, "5 mm", "Ar+", null, null, "mA/cm^2")).toBeCloseTo(
      model.rfChildCurrent(300, 0.005, argon) / 10,
      4,
    );
  });

  test("each law is judged by the mean free path, and not at all without one", () => {
    const words = (word: string, path?: number) =>
      judgeAll(entry, [300, 0.005, argon, word, path])
        .filter(({ limit }) => limit.measure === "λ_i/s_m")
        .map((each) => each.word);
    expect(words("collisionless", 0.05)).toEqual(["holds"]);
    expect(words("collisionless", 0.001)).toEqual(["fails"]);
    expect(words("collisional", 4e-4)).toEqual(["holds"]);
    expect(words("collisional", 1e-3)).toEqual(["marginal"]);
    expect(words("collisional", 2e-3)).toEqual(["fails"]);
    expect(words("collisionless")).toEqual(["not tested"]);
  });

  test("what it takes of the frequency is told, and does not keep a law with its path from holding", () => {
    const frequency = judgeAll(entry, [300, 0.005, argon, "collisionless", 0.05]).at(-1)!;
    expect(frequency.needs).toMatch(/^the frequency, which should be 3 times the ions' plasma frequency/);
    expect(LIMITCHECK([["RFCHILDCURRENT"]], [[300]], [[0.005]], [["Ar+"]], [[""]], [[0.05]])).toEqual([["holds"]]);
  });
});
