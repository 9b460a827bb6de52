import { e, eps0, k_B, m_e } from "../matter/constants";
import type { Ion } from "../matter/ion";

/** Electron Debye length √(ε₀T_e/(e n_e)) in m; n_e in m⁻³, T_e in eV. NRL Plasma Formulary. */
export function debyeLength(n_e: number, T_e: number): number {
  return Math.sqrt((eps0 / e) * (T_e / n_e));
}

/** Debye length with singly charged ions screening too, 1/λ² = 1/λ_e² + 1/λ_i²; T_i in eV, 0 leaves the ions out. */
export function debyeLengthWithIons(n_e: number, T_e: number, T_i: number): number {
  return T_i > 0 ? debyeLength(n_e, T_e) / Math.sqrt(1 + T_e / T_i) : debyeLength(n_e, T_e);
}

/** Plasma frequency √(n q²/(ε₀ m))/2π in Hz of a species of density n in m⁻³. NRL. */
export function plasmaFrequency(n: number, mass: number, charge: number): number {
  return (Math.sqrt(n / (eps0 * mass)) * (charge * e)) / (2 * Math.PI);
}

/** Mean free path k_B T_g/(p σ) in m; p in Pa, σ in m², T_g in K. Kinetic theory of gases. */
export function meanFreePath(p: number, sigma: number, T_g: number): number {
  return (k_B * T_g) / p / sigma;
}

/** Bohm speed √(e(Z T_e + γ_i T_i)/M) in m/s; temperatures in eV. Riemann, J. Phys. D 24 (1991) 493. */
export function bohmSpeed(T_e: number, ion: Ion, T_i = 0, gamma_i = 1): number {
  return Math.sqrt((e * (ion.charge * T_e + gamma_i * T_i)) / ion.mass);
}

/** Bohm speed where ions collide, u_B (1 + πλ_D/(2λ_i))^(−1/2). Lieberman & Lichtenberg. */
export function collisionalBohmSpeed(T_e: number, ion: Ion, n_edge: number, lambda_i: number): number {
  return bohmSpeed(T_e, ion) / Math.sqrt(1 + (Math.PI / 2) * (debyeLength(n_edge, T_e) / lambda_i));
}

/**
 * Decay length λ_D/√(1 − (u_B/u_0)²) in m of the linearised Poisson equation at the edge, for ions entering at u_0 above
 * the Bohm speed; NaN at or below it. The difference is factored so that it keeps its digits near the Bohm speed. R91.
 */
export function edgeDecayLength(n_edge: number, T_e: number, ion: Ion, u_0: number): number {
  const u_B = bohmSpeed(T_e, ion);
  return debyeLength(n_edge, T_e) / Math.sqrt(((u_0 - u_B) / u_0) * ((u_0 + u_B) / u_0));
}

export const edgeShapes = ["free", "slab", "cylinder"] as const;
export type EdgeShape = (typeof edgeShapes)[number];

/** The density ratio where a cold, collisionless presheath of no particular geometry ends: a drop of T_e/2. */
export const freeEdgeRatio = Math.exp(-0.5);

/** n_edge/n_bulk; size is the slab's gap or the cylinder's radius, λ_i = ∞ the collisionless limit. LL §5.3. */
export function edgeRatio(shape: EdgeShape, size: number, lambda_i: number): number {
  if (shape === "slab") return 0.86 / Math.sqrt(3 + size / (2 * lambda_i));
  if (shape === "cylinder") return 0.8 / Math.sqrt(4 + size / lambda_i);
  return freeEdgeRatio;
}

/** Potential drop across the presheath, −T_e ln(edge_ratio), a magnitude in V. */
export function presheathDrop(T_e: number, edge_ratio: number): number {
  return -T_e * Math.log(edge_ratio);
}

/** Wall potential against the sheath edge from two readings against ground. */
export function wallToEdge(V_wall: number, V_plasma: number, T_e: number, edge_ratio: number): number {
  return V_wall - V_plasma + presheathDrop(T_e, edge_ratio);
}

/** Mean speed √(8eT_e/(πm)) of Maxwellian electrons in m/s; T_e in eV. */
export function meanElectronSpeed(T_e: number): number {
  return Math.sqrt((8 * e * T_e) / (Math.PI * m_e));
}
