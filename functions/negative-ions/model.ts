import { bohmSpeed, meanElectronSpeed } from "../edge/model";
import type { Ion } from "../matter/ion";

/**
 * Energy of a positive ion at the sheath edge per charge and T_e, (1+α)/(2(1+αγ)): also the potential drop from the body
 * to the edge. α = n₋/n_e at the edge, γ = T_e/T₋. Boyd & Thompson, Proc. R. Soc. A 252 (1959) 102.
 */
export function edgeDrop(alpha_s: number, gamma: number): number {
  return alpha_s < 1
    ? (0.5 * (1 + alpha_s)) / (1 + alpha_s * gamma)
    : (0.5 * (1 + 1 / alpha_s)) / (gamma + 1 / alpha_s);
}

/** Bohm speed √(Z eT_e(1+α)/(M(1+αγ))) in m/s with negative ions at the edge. BT59. */
export function negativeIonBohmSpeed(T_e: number, ion: Ion, alpha_s: number, gamma: number): number {
  return bohmSpeed(T_e, ion) * Math.sqrt(2 * edgeDrop(alpha_s, gamma));
}

/** Flux n_edge(1+α)u/Z of positive ions in m⁻² s⁻¹; n_edge the electron density. LL. */
export function negativeIonFlux(n_edge: number, T_e: number, ion: Ion, alpha_s: number, gamma: number): number {
  return (n_edge * (1 + alpha_s) * negativeIonBohmSpeed(T_e, ion, alpha_s, gamma)) / ion.charge;
}

/** Electron flux to an unbiased wall over the charge flux of the ions, v̄_e/(4(1+α)u). */
export function electronExcess(T_e: number, ion: Ion, alpha_s: number, gamma: number): number {
  return meanElectronSpeed(T_e) / (4 * (1 + alpha_s) * negativeIonBohmSpeed(T_e, ion, alpha_s, gamma));
}
