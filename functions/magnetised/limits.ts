import type { Limit } from "../cells/entry";
import { c, e } from "../matter/constants";
import type { Ion } from "../matter/ion";
import { CP, S00 } from "../sources";

/** The gyroradius here is that of Newton's mechanics: at eT = Mc²/50 it is 1 % short. */
export function slowParticles(of: (...values: any[]) => [T: number, particle: Ion]): Limit {
  return {
    assumption: "the particles are far slower than light",
    measure: "eT/(Mc²)",
    value: (...values) => {
      const [T, particle] = of(...values);
      return (e * T) / (particle.mass * c * c);
    },
    holds: 0.02,
    fails: 0.2,
    reason: "the particles are relativistic, and their gyroradius is larger",
    source: CP,
  };
}

/**
 * The magnetic presheath can't take more than the floating drop. Without the ion that drop is known only within limits:
 * ln √(M/(2πm(1 + T_i/T_e))) is 2.49 for hydrogen with T_i = T_e and 5.43 for cold tungsten ions.
 */
export function withinFloatingDrop(of: (...values: any[]) => number): Limit {
  return {
    assumption: "the drop is less than the whole floating drop",
    measure: "drop/T_e",
    value: of,
    holds: 2.49,
    fails: 5.43,
    reason: "no ion floats this far below the plasma, so no Debye sheath is left (GRAZINGLIMIT)",
    source: S00,
  };
}
