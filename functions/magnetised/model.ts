import { bohmSpeed } from "../edge/model";
import { e, m_e } from "../matter/constants";
import type { Ion } from "../matter/ion";

/** Thermal gyroradius √(eTM)/(ZeB) in m; T in eV, B in T. NRL. */
export function gyroradius(T: number, B: number, particle: Ion): number {
  return Math.sqrt((T * particle.mass) / e) / (particle.charge * B);
}

/**
 * Width √6 (u_B/ω_ci) cos θ in m of the layer that turns ions from the field towards the wall, ω_ci = ZeB/M; θ in degrees
 * between field and wall. Chodura (1982); Stangeby (2000).
 */
export function magneticPresheathWidth(T_e: number, ion: Ion, B: number, angle: number, T_i: number): number {
  const omega_ci = (ion.charge * e * B) / ion.mass;
  return Math.sqrt(6) * (bohmSpeed(T_e, ion, T_i) / omega_ci) * cosine(angle);
}

/** Potential drop −T_e ln sin θ across that layer, a magnitude in V; θ in degrees between field and wall. Stangeby (2000). */
export function magneticPresheathDrop(T_e: number, angle: number): number {
  // Near the normal sin θ rounds to 1, while cos²θ keeps its digits.
  return angle > 45
    ? -0.5 * T_e * Math.log1p(-(cosine(angle) ** 2))
    : -T_e * Math.log(Math.sin((angle * Math.PI) / 180));
}

/**
 * Angle asin √(2π(m/M)(Z + T_i/T_e)) in degrees between field and wall below which the magnetic presheath carries the
 * whole floating drop; NaN for an ion so light that no angle does. Stangeby, Nucl. Fusion 52 (2012) 083012.
 */
export function grazingLimit(ion: Ion, temperatureRatio: number): number {
  const sine = Math.sqrt(2 * Math.PI * (m_e / ion.mass) * (ion.charge + temperatureRatio));
  return (Math.asin(sine) * 180) / Math.PI;
}

/** The cosine of an angle up to 90° in degrees, exactly 0 at the normal. */
function cosine(degrees: number): number {
  return Math.sin(((90 - degrees) * Math.PI) / 180);
}
