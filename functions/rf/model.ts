import { bohmSpeed } from "../edge/model";
import { childWidth, ionTransitTime, perveance } from "../layer/model";
import { e } from "../matter/constants";
import type { Ion } from "../matter/ion";
import { logBesselI0 } from "../numerics/bessel";

/**
 * Shift of the floating potential −T_e ln I₀(V_rf/T_e) in V that a sinusoidal voltage of amplitude V_rf across the
 * sheath brings. Garscadden & Emeleus, Proc. Phys. Soc. 79 (1962) 535.
 */
export function rfFloatingShift(V_rf: number, T_e: number): number {
  if (V_rf === 0) return 0;
  const x = V_rf / T_e;
  // ln I₀(x) = x − ½ln(2πx) + …: from here on the logarithm is below the last bit, and x itself may overflow.
  return x > 1e18 ? -V_rf : -T_e * logBesselI0(x);
}

/**
 * Full width of the ion energy distribution at an RF-driven wall, (8 Z V_rf/(3 ω s)) √(2ZeV_dc/M) in eV for ions that
 * need many periods to cross. The energy can't swing further than the voltage, 2 Z V_rf, which slow RF reaches.
 * Benoit-Cattin & Bernard, J. Appl. Phys. 39 (1968) 5723.
 */
export function ionEnergySpread(V_dc: number, V_rf: number, s: number, f: number, ion: Ion): number {
  const omega = 2 * Math.PI * f;
  return Math.min(2, 8 / (omega * ionTransitTime(V_dc, s, ion))) * ion.charge * V_rf;
}

/**
 * The two coefficients come from one set of time-averaged equations (Lieberman 1988, 1989): a sinusoidal current of
 * amplitude J̃ through a cold-ion sheath that empties of electrons once a period. With φ the phase at which the electron
 * edge passes x, s₀ = J̃/(eωn_edge) and E₀ = J̃/(ε₀ω), its motion obeys dx/dφ = s₀ (n_edge/n) sin φ and the mean field is
 * Ē = E₀ f/π with f = sin φ − φ cos φ; n_edge/n is the ion speed over u_B. Ions that fall freely through the mean potential
 * give V = (9π²/32)H²T_e and s_m = (5π/12)H s₀ with H = s₀²/(πλ_D²), and J s_m²/(ε₀ √(2Ze/M) V^(3/2)) becomes
 * (25/144)/(√2 (9/32)^(3/2)) = 200/243. Ions with a constant mean free path have the speed √(2Zeλ_iĒ/(πM)), which leaves
 * √π I₁^(5/2)/I₂^(3/2), I₁ and I₂ the integrals of f^(1/2) sin φ and f^(3/2) sin φ from 0 to π. The printed 1.68 is that
 * number rounded.
 */
export const collisionlessCoefficient = 200 / 243;
export const collisionalCoefficient = 1.6781480371439115;

/** Ion current density that an RF sheath of largest width s_m carries, (200/243) ε₀ √(2Ze/M) V^(3/2)/s_m² in A/m². L88. */
export function rfChildCurrent(V_dc: number, s_m: number, ion: Ion): number {
  return (collisionlessCoefficient * perveance(V_dc, ion)) / s_m / s_m;
}

/** The same with a constant mean free path, 1.678148 ε₀ √(2Ze/M) V^(3/2) λ_i^(1/2)/s_m^(5/2) in A/m². L89. */
export function rfChildCurrentCollisional(V_dc: number, s_m: number, ion: Ion, lambda_i: number): number {
  return ((collisionalCoefficient * perveance(V_dc, ion)) / s_m / s_m) * Math.sqrt(lambda_i / s_m);
}

/** Slope resistance T_e/(e n_edge u_B) in Ω m² of a floating wall. LL; the derivative of the wall's characteristic. */
export function sheathResistance(n_edge: number, T_e: number, ion: Ion): number {
  return T_e / (e * n_edge * bohmSpeed(T_e, ion));
}

/** Largest width √(50/27) times the Child width, s_m in m. L88. */
export function rfSheathWidth(V_dc: number, n_edge: number, T_e: number): number {
  return Math.sqrt(50 / 27) * childWidth(V_dc, n_edge, T_e);
}
