/**
 * Ion–neutral cross-sections in m² for ions of a few eV in their own gas. A biased sheath has faster ions and longer
 * paths: type an area instead of the gas then.
 */
export const crossSections = {
  /** Lieberman & Lichtenberg, λ_i = 1/(330 p) cm with p in Torr at room temperature: 1.0e-18 m². */
  Ar: 1.0e-18,
  /** Charge exchange of xenon, 87.3 − 13.6 log₁₀(E/eV) Å² (Miller et al., J. Appl. Phys. 91 (2002) 984, from memory) at 3 eV. */
  Xe: 8.08e-19,
} as const;
