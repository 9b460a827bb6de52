import { bohmSpeed, debyeLength, plasmaFrequency } from "../edge/model";
import { e, eps0 } from "../matter/constants";
import type { Ion } from "../matter/ion";
import { bohmWidth, dropAt, field, fieldSlope } from "./nonlinear-sheath";

/** Ways to reckon a width; drops and voltages in this file are magnitudes in V, temperatures in eV, all else SI. */
export const sheathModels = ["child", "matrix", "full", "collisional"] as const;
export type SheathModel = (typeof sheathModels)[number];

/** How ions move under a space-charge law. */
export const ionMotions = ["collisionless", "collisional"] as const;
export type IonMotion = (typeof ionMotions)[number];

/** Child width (√2/3) λ_D (2V/T_e)^(3/4): ions from the edge at u_B, no electrons. LL §6.3. */
export function childWidth(V_s: number, n_edge: number, T_e: number): number {
  return (Math.SQRT2 / 3) * debyeLength(n_edge, T_e) * power3Halves(Math.sqrt((2 * V_s) / T_e));
}

/** Matrix width λ_D √(2V/T_e): the ions still where they were when the electrons left. LL §6.3. */
export function matrixWidth(V_s: number, n_edge: number, T_e: number): number {
  return debyeLength(n_edge, T_e) * Math.sqrt((2 * V_s) / T_e);
}

/** From the wall to where the net charge is 1 % of e n_edge, electrons included; for drops of bohmEnd T_e and more. R91. */
export function fullWidth(V_s: number, n_edge: number, T_e: number): number {
  return debyeLength(n_edge, T_e) * bohmWidth(V_s / T_e);
}

/**
 * Width [(2/3)(5/3)^(3/2) (ε₀/(e n)) √(2λ_i/(πT_e)) V^(3/2)]^(2/5) with a constant ion mean free path, written with
 * ε₀/(e n) = λ_D²/T_e. LL §6.5.
 */
export function collisionalWidth(V_s: number, n_edge: number, T_e: number, lambda_i: number): number {
  const debye = debyeLength(n_edge, T_e);
  const current = collisionalCoefficient * Math.sqrt(2 * (lambda_i / debye)) * power3Halves(V_s / T_e);
  return debye * power2Fifths(current);
}

/** Child's law has 4/9; the law for a constant mean free path (2/3)(5/3)^(3/2)/√π before √(λ_i/s). LL §6.3, §6.5. */
export const childCoefficient = 4 / 9;
export const collisionalCoefficient = ((2 / 3) * power3Halves(5 / 3)) / Math.sqrt(Math.PI);

/** Child's law J = (4/9) ε₀ √(2Ze/M) V^(3/2)/s² in A/m². */
export function childCurrent(V_s: number, s: number, ion: Ion): number {
  return (childCoefficient * perveance(V_s, ion)) / s / s;
}

/** J = (2/3)(5/3)^(3/2) ε₀ √(2Zeλ_i/(πM)) V^(3/2)/s^(5/2) in A/m². */
export function collisionalCurrent(V_s: number, s: number, ion: Ion, lambda_i: number): number {
  return ((collisionalCoefficient * perveance(V_s, ion)) / s / s) * Math.sqrt(lambda_i / s);
}

/** The width through which Child's law brings J: its inverse. */
export function widthFromCurrent(V_s: number, J: number, ion: Ion): number {
  return Math.sqrt((childCoefficient * perveance(V_s, ion)) / J);
}

/** The inverse of the collisional law. */
export function collisionalWidthFromCurrent(V_s: number, J: number, ion: Ion, lambda_i: number): number {
  const sSquared = (collisionalCoefficient * perveance(V_s, ion)) / J;
  return lambda_i * power2Fifths(sSquared / lambda_i / lambda_i);
}

/** ε₀ √(2Ze/M) V^(3/2) in A: what every space-charge law divides by the square of its width. */
export function perveance(V_s: number, ion: Ion): number {
  return eps0 * V_s * Math.sqrt(((2 * ion.charge * e) / ion.mass) * V_s);
}

/** Field at the wall in V/m, from the first integral of Poisson's equation. LL §6.2. */
export function wallField(V_s: number, n_edge: number, T_e: number, u_ratio: number): number {
  return (T_e / debyeLength(n_edge, T_e)) * field(V_s / T_e, u_ratio);
}

/** Potential against the edge in V at a distance x from the wall. */
export function sheathPotential(x: number, V_s: number, n_edge: number, T_e: number, u_ratio: number): number {
  return 0 - T_e * dropAt(x / debyeLength(n_edge, T_e), V_s / T_e, u_ratio);
}

/** Charge response dQ/dV = e n_edge[(1 + 2η/μ²)^(−1/2) − e^(−η)]/E_wall in F/m², Q = ε₀ E_wall the charge in the sheath. */
export function sheathCapacitance(V_s: number, n_edge: number, T_e: number, u_ratio: number): number {
  return (eps0 / debyeLength(n_edge, T_e)) * fieldSlope(V_s / T_e, u_ratio);
}

/** Time 3 s √(M/(2ZeV)) an ion at rest at the edge takes through a Child sheath. LL §11.1. */
export function ionTransitTime(V_s: number, s: number, ion: Ion): number {
  return 3 * s * Math.sqrt(ion.mass / (2 * ion.charge * e * V_s));
}

/** ω_pi t with ω_pi = √(Z e² n_edge/(ε₀M)): ions of charge Z are n_edge/Z. */
export function ionPhase(n_edge: number, ion: Ion, t: number): number {
  return 2 * Math.PI * plasmaFrequency(n_edge / ion.charge, ion.mass, ion.charge) * t;
}

/**
 * Width s₀(1 + ⅔ω_pi t)^(1/3) at a time t after the voltage is switched on, s₀ the matrix width: Child's law carries away
 * the ions that the growing sheath uncovers. Growth ends at the Child width. Lieberman, J. Appl. Phys. 66 (1989) 2926.
 */
export function pulsedWidth(V_s: number, n_edge: number, T_e: number, ion: Ion, t: number): number {
  const s_0 = matrixWidth(V_s, n_edge, T_e);
  const grown = s_0 * Math.cbrt(1 + (2 / 3) * ionPhase(n_edge, ion, t));
  return Math.max(s_0, Math.min(grown, childWidth(V_s, n_edge, T_e)));
}

/** The way ions at the Bohm speed go in a time, over the Child width: the inflow that pulsedWidth leaves out. */
export function inflow(V_s: number, n_edge: number, T_e: number, ion: Ion, t: number): number {
  return (bohmSpeed(T_e, ion) * t) / childWidth(V_s, n_edge, T_e);
}

function power3Halves(x: number): number {
  return x * Math.sqrt(x);
}

/** x^(2/5); one Newton step makes good that 0.4 is no double, which shows far from 1. */
function power2Fifths(x: number): number {
  const root = x ** 0.4;
  const again = (x / (root * root)) ** 2 / root;
  return again > 0 && again < Infinity ? root * (1 + (again - 1) / 5) : root;
}
