import { m_e } from "../matter/constants";
import type { Ion } from "../matter/ion";
import { findRoot } from "../numerics/root";

/** The emitting wall at which the field at its face has just vanished: more emission only returns to the wall. */
export interface EmissionLimit {
  /** Largest yield δ_c that a floating wall can sustain. */
  delta: number;
  /** Potential drop −φ_w/T_e from the sheath edge to the wall. */
  drop: number;
  /** Energy of the ions at the edge per charge, ½Mu_0²/(Z e T_e): a little above the ½ of Bohm. */
  edgeEnergy: number;
}

/**
 * The space-charge limit of emission, Hobbs & Wesson, Plasma Phys. 9 (1967) 85: cold ions, Boltzmann primaries,
 * secondaries that leave the wall at rest. It depends on M/Z alone. Undefined for M/Z ≤ 2πm, where no wall floats
 * below the edge even without emission.
 *
 * With densities in units of that of the ions' charge at the edge, primaries a and secondaries s there, ε = edgeEnergy
 * and η = drop:
 *   neutral edge           a + s = 1
 *   marginal Bohm          a − s/(2η) = 1/(2ε)
 *   no field at the wall   2ε(√(1+η/ε) − 1) = a(1 − e^(−η)) + 2sη
 *   no net current         (1−δ) a e^(−η) = √(4πεZm/M),  δ/(1−δ) √(εZm/(ηM)) = s
 * The first three leave one curve ε(η) that knows nothing of the ion; along it the last two give √(Zm/M) and δ.
 */
export function emissionLimit(ion: Ion): EmissionLimit | undefined {
  const massPerCharge = ion.mass / ion.charge;
  if (massPerCharge === last?.massPerCharge) return last.limit;
  let limit = known.get(massPerCharge);
  if (!limit && !known.has(massPerCharge)) {
    if (known.size >= 1000) known.clear();
    known.set(massPerCharge, (limit = solve(Math.sqrt(m_e / massPerCharge))));
  }
  last = { massPerCharge, limit };
  return limit;
}

/** Long columns repeat one ion, or a few. */
const known = new Map<number, EmissionLimit | undefined>();
let last: { massPerCharge: number; limit: EmissionLimit | undefined } | undefined;

/** √(Zm/M) falls from 1/√(2π) at η → 0 to zero, for infinitely heavy ions, at η = 1.02528. */
const [leastDrop, mostDrop] = [1e-3, 1.0254];

function solve(root: number): EmissionLimit | undefined {
  const drop = findRoot((eta) => alongCurve(eta).root - root, leastDrop, mostDrop);
  if (Number.isNaN(drop)) return undefined;
  const { edgeEnergy, flux } = alongCurve(drop);
  return { delta: flux / (flux + root), drop, edgeEnergy };
}

/** At a drop η: ε, √(Zm/M), and the emitted flux in the same units, √(Zm/M) δ/(1−δ). */
function alongCurve(eta: number) {
  const passed = -Math.expm1(-eta);
  const secondaries = (epsilon: number) => (1 - 0.5 / epsilon) / (1 + 0.5 / eta);
  const wallPressure = (epsilon: number) => {
    const s = secondaries(epsilon);
    return (2 * eta) / (1 + Math.sqrt(1 + eta / epsilon)) - (1 - s) * passed - 2 * s * eta;
  };
  // Without emission ε = ½ and the field points into the wall; far above, secondaries alone would turn it round.
  const edgeEnergy = findRoot(wallPressure, 0.5, 5);
  const s = secondaries(edgeEnergy);
  const flux = s * Math.sqrt(eta / edgeEnergy);
  const root = ((1 - s) * Math.exp(-eta)) / Math.sqrt(4 * Math.PI * edgeEnergy) - flux;
  return { edgeEnergy, flux, root };
}
