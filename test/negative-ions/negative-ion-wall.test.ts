import { describe, expect, test } from "vitest";
import { judgeAll } from "../../functions/cells/verdict";
import { bohmSpeed } from "../../functions/edge/model";
import { e } from "../../functions/matter/constants";
import { parseIon, type Ion } from "../../functions/matter/ion";
import { NEGATIVEIONFLUX as flux, NEGATIVEIONPOTENTIAL as potential } from "../../functions/negative-ions/entries";
import {
  NEGATIVEIONBOHMSPEED,
  NEGATIVEIONEDGE,
  NEGATIVEIONFLUX,
  NEGATIVEIONPOTENTIAL,
} from "../../functions/negative-ions/functions";
import { floatingPotential, ionFlux } from "../../functions/wall/model";

const call = (front: (...cells: any[]) => any[][], ...cells: unknown[]) =>
  front(...cells.map((cell) => [[cell]]))[0][0];
const argon = parseIon("Ar+") as Ion;
const doubly = parseIon("Ar^2+") as Ion;

describe("NEGATIVEIONBOHMSPEED", () => {
  test("without negative ions it is the Bohm speed", () => {
    expect(call(NEGATIVEIONBOHMSPEED, 3, "Ar^2+", 0, 20)).toBe(bohmSpeed(3, doubly));
  });

  test("negative ions as hot as the electrons leave the Bohm speed alone", () => {
    expect(call(NEGATIVEIONBOHMSPEED, 3, "Ar+", 2, 1) / bohmSpeed(3, argon)).toBeCloseTo(1, 14);
  });

  test("with negative ions alone the speed is √(eT₋/M)", () => {
    // Source: Boyd & Thompson 1959: T₋ takes the place of T_e.
    expect(call(NEGATIVEIONBOHMSPEED, 3, "Ar+", 1e12, 30) / bohmSpeed(0.1, argon)).toBeCloseTo(1, 10);
  });

  test("at α_s = 1 and γ = 15 the ions enter at √(2/16) of the Bohm speed", () => {
    // Source: the formula by hand.
    expect(call(NEGATIVEIONBOHMSPEED, 3, "Ar+", 1, 15) / bohmSpeed(3, argon)).toBeCloseTo(Math.sqrt(2 / 16), 14);
  });

  test("the speed is where the charge density stops falling faster than the ions thin out", () => {
    // The Bohm condition itself: d(n₊)/dV = d(n_e + n₋)/dV at the edge, differentiated numerically.
    const [T_e, alpha, gamma] = [3, 0.7, 12];
    const u = call(NEGATIVEIONBOHMSPEED, T_e, "Ar+", alpha, gamma);
    const negative = (V: number) => Math.exp(V / T_e) + alpha * Math.exp((gamma * V) / T_e);
    const positive = (V: number) => (1 + alpha) / Math.sqrt(1 - (2 * e * V) / (argon.mass * u * u));
    const h = 1e-6;
    const slope = (f: (V: number) => number) => (f(h) - f(-h)) / (2 * h);
    expect(slope(positive) / slope(negative)).toBeCloseTo(1, 7);
  });
});

describe("NEGATIVEIONFLUX", () => {
  test("without negative ions it is the plain wall flux", () => {
    expect(call(NEGATIVEIONFLUX, 1e16, 3, "Ar^2+", 0, 20) / ionFlux(1e16, 3, doubly, 0, 90)).toBeCloseTo(1, 14);
  });

  test("positive ions outnumber electrons by 1 + α_s, and bring that at their slower speed", () => {
    expect(call(NEGATIVEIONFLUX, 1e16, 3, "Ar+", 1, 15) / ionFlux(1e16, 3, argon, 0, 90)).toBeCloseTo(
      2 * Math.sqrt(2 / 16),
      14,
    );
  });

  test("a plasma so cold and dense that a Debye sphere holds hardly an electron fails", () => {
    expect(judgeAll(flux, [1e22, 0.01, argon, 0.1, 5]).map(({ word }) => word)).toEqual(["holds", "fails"]);
  });
});

describe("NEGATIVEIONPOTENTIAL", () => {
  test("without negative ions it is the floating potential", () => {
    expect(call(NEGATIVEIONPOTENTIAL, 3, "Ar+", 0, 20) / floatingPotential(3, argon, 0, 0)).toBeCloseTo(1, 14);
  });

  test("electrons and ions that arrive at the floating wall carry equal charge", () => {
    const V_f = call(NEGATIVEIONPOTENTIAL, 3, "Ar+", 2, 15);
    const electrons = 0.25 * 1e16 * Math.sqrt((8 * e * 3) / (Math.PI * 9.1093837139e-31)) * Math.exp(V_f / 3);
    expect(electrons / call(NEGATIVEIONFLUX, 1e16, 3, "Ar+", 2, 15)).toBeCloseTo(1, 12);
  });

  test("fewer electrons than the ions' charge leave no floating wall, and the message says so", () => {
    expect(call(NEGATIVEIONPOTENTIAL, 3, "Ar+", 1000, 15).message).toMatch(/no wall floats .* smaller alpha_s/);
  });

  test("it may be given in the unit asked for", () => {
    expect(call(NEGATIVEIONPOTENTIAL, 3, "Ar+", 1, 15, "mV")).toBeCloseTo(
      1000 * call(NEGATIVEIONPOTENTIAL, 3, "Ar+", 1, 15),
      9,
    );
  });

  test("cold negative ions never reach the wall; as hot as the electrons they do", () => {
    const word = (gamma: number) => judgeAll(potential, [3, argon, 0.1, gamma])[0].word;
    expect([20, 1].map(word)).toEqual(["holds", "marginal"]);
    expect(judgeAll(potential, [3, argon, 20, 0.5])[0].word).toBe("fails");
  });

  test("an edge that is one of three fails the check", () => {
    const [, middle] = NEGATIVEIONEDGE([[2]], [[15]]) as number[][];
    expect(judgeAll(potential, [3, argon, middle[0], 15])[1].word).toBe("fails");
    expect(judgeAll(potential, [3, argon, 10, 15])[1].word).toBe("holds");
  });
});
