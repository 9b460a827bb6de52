import { bohmSpeed } from "../edge/model";
import { e, m_e } from "../matter/constants";
import type { Ion } from "../matter/ion";

/**
 * Electron density I/(r e A u_B (1+γ)) in m⁻³ of the plasma's body from the ion current of a probe with a thin sheath, r the
 * density ratio of edge and body, γ its electron emission per ion; I in A, area A in m². LL §6.6.
 */
export function probeDensity(
  I: number,
  area: number,
  T_e: number,
  ion: Ion,
  edge_ratio: number,
  gamma: number,
): number {
  return Math.abs(I) / (edge_ratio * e * area * bohmSpeed(T_e, ion) * (1 + gamma));
}

/** From where the plasma potential counts: the body, or the sheath edge, which leaves the presheath's drop out. */
export const probeReferences = ["plasma", "edge"] as const;
export type ProbeReference = (typeof probeReferences)[number];

/** (V_p − V_f)/T_e = ln(√(M/(2πmZ))/r), r the density ratio across the presheath, 1 from the edge. LL §6.6. */
export function floatingDepth(ion: Ion, edge_ratio: number): number {
  return 0.5 * Math.log(ion.mass / (2 * Math.PI * m_e * ion.charge)) - Math.log(edge_ratio);
}

/**
 * Ion current A n e (√2/π) √(ZeV/M) in A of a thin wire that attracts ions by V volts, by their orbital motion; its area is
 * 2π r l. Mott-Smith & Langmuir (1926); Chen (2003).
 */
export function orbitalCurrent(V: number, n_bulk: number, radius: number, length: number, ion: Ion): number {
  return n_bulk * orbitalCurrentPerDensity(V, radius, length, ion);
}

/** Density in m⁻³ at which that current is I. */
export function orbitalDensity(I: number, V: number, radius: number, length: number, ion: Ion): number {
  return Math.abs(I) / orbitalCurrentPerDensity(V, radius, length, ion);
}

function orbitalCurrentPerDensity(V: number, radius: number, length: number, ion: Ion): number {
  return 2 * Math.SQRT2 * radius * length * e * Math.sqrt((ion.charge * e * Math.abs(V)) / ion.mass);
}
