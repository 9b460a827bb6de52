import { debyeLength } from "../edge/model";
import { distance, dropAtEnd, field, ionDensity, ionSpeed } from "./nonlinear-sheath";

/** One point inside the sheath, SI; the ion density counts charges, Z n_i. */
export interface ProfilePoint {
  x: number;
  potential: number;
  field: number;
  ionDensity: number;
  electronDensity: number;
  /** Ion speed over u_B. */
  speed: number;
}

/**
 * The nonlinear sheath from the wall to where its net charge falls to 1 % of e n_edge. From point to point the potential
 * changes by the same factor: that resolves the edge, where it is a fraction of T_e, and the wall, where it may be 10⁵ T_e.
 * For drops of dropAtEnd(u_ratio) T_e and more.
 */
export function sheathProfile(
  V_s: number,
  n_edge: number,
  T_e: number,
  u_ratio: number,
  points: number,
): ProfilePoint[] {
  const debye = debyeLength(n_edge, T_e);
  const wall = V_s / T_e;
  const span = Math.log(dropAtEnd(u_ratio) / wall);
  let eta = wall;
  let depth = 0;
  return Array.from({ length: points }, (_, i) => {
    const next = wall * Math.exp((span * i) / (points - 1));
    if (next < eta) depth += distance(next, eta, u_ratio);
    eta = next;
    return {
      x: debye * depth,
      potential: -T_e * eta,
      field: (T_e / debye) * field(eta, u_ratio),
      ionDensity: n_edge * ionDensity(eta, u_ratio),
      electronDensity: n_edge * Math.exp(-eta),
      speed: ionSpeed(eta, u_ratio),
    };
  });
}
