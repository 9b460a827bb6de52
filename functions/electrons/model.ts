import { bohmSpeed } from "../edge/model";
import { e, m_e } from "../matter/constants";
import type { Ion } from "../matter/ion";

/**
 * Floating potential in V against the sheath edge with two Maxwellian groups of electrons, `hot` the hot group's share of
 * the density at the edge: Σ f_k ¼v̄_k exp(V/T_k) = u_B, where u_B = √(ZeT_s/M) and 1/T_s = Σ f_k/T_k is what the generalised
 * Bohm criterion asks (Riemann 1991). Positive or NaN for ions so light that no wall below the edge floats.
 *
 * The logarithm of the left side is convex in V. Newton's method, started where one group alone would float, which is
 * never below the root, therefore falls monotonically onto it for any ratio of the temperatures.
 */
export function twoGroupFloatingPotential(T_c: number, T_h: number, hot: number, ion: Ion): number {
  if (hot === 0) return oneGroup(T_c, ion);
  if (hot === 1) return oneGroup(T_h, ion);
  const cold = 1 - hot;
  const T_s = 1 / (cold / T_c + hot / T_h);
  // ln of f_k ¼v̄_k/u_B, the current of each group over the ions' at V = 0.
  const a = Math.log(cold * Math.sqrt(T_c / T_s)) + logExcess(ion);
  const b = Math.log(hot * Math.sqrt(T_h / T_s)) + logExcess(ion);
  let V = Math.min(-a * T_c, -b * T_h);
  for (let i = 0; i < 100; i++) {
    const p = a + V / T_c;
    const q = b + V / T_h;
    const top = Math.max(p, q);
    const [x, y] = [Math.exp(p - top), Math.exp(q - top)];
    const step = ((top + Math.log(x + y)) * (x + y)) / (x / T_c + y / T_h);
    V -= step;
    if (!(step > 4 * Number.EPSILON * Math.abs(V))) break;
  }
  return V;
}

/** −T ln[v̄/(4u_B)], with one group. */
function oneGroup(T: number, ion: Ion): number {
  return -T * logExcess(ion);
}

/** ln of v̄_e/(4u_B) at one temperature, ½ ln(M/(2πmZ)). */
function logExcess(ion: Ion): number {
  return 0.5 * Math.log(ion.mass / (2 * Math.PI * m_e * ion.charge));
}

/**
 * What an isotropic probability function F(E), in eV^(−3/2) m⁻³, says of its electrons. M holds its integrals ∫ F E^p dE
 * for p = −1/2, 1/2, 1 and 3/2. LL.
 */
type Integrals = ArrayLike<number>;

/** Density ∫ √E F dE in m⁻³. */
export function eepfDensity(M: Integrals): number {
  return M[1];
}

/** Mean energy ⟨E⟩ in eV. */
export function eepfMeanEnergy(M: Integrals): number {
  return M[3] / M[1];
}

/** Effective temperature ⅔⟨E⟩ in eV. */
export function eepfTemperature(M: Integrals): number {
  return (2 / 3) * eepfMeanEnergy(M);
}

/** Screening temperature 2/⟨1/E⟩ in eV, which sets the Bohm speed. Riemann (1991). */
export function eepfScreening(M: Integrals): number {
  return (2 * M[1]) / M[0];
}

/** Random flux ¼ n⟨v⟩ = ¼ √(2e/m) ∫ E F dE in m⁻² s⁻¹. */
export function eepfFlux(M: Integrals): number {
  return speedOfOneEv * 0.25 * M[2];
}

/**
 * Ion flux, times Z, over ¼ √(2e/m): n u_B with the Bohm speed of the screening temperature. It is what the integral
 * ∫ (E + V) F dE over E > −V comes to at a floating wall, in eV^(1/2) m⁻³. Riemann (1991).
 */
export function eepfIonDemand(M: Integrals, ion: Ion): number {
  return (eepfDensity(M) * bohmSpeed(eepfScreening(M), ion)) / (0.25 * speedOfOneEv);
}

/** Speed √(2e/m) in m/s of an electron of 1 eV. */
const speedOfOneEv = Math.sqrt((2 * e) / m_e);
