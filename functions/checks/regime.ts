import { NotTested, type Limit } from "../cells/entry";
import { crossSections } from "../edge/cross-sections";
import { debyeLength, freeEdgeRatio, meanFreePath, plasmaFrequency } from "../edge/model";
import { childWidth, fullWidth } from "../layer/model";
import { bohmEnd } from "../layer/nonlinear-sheath";
import { gyroradius } from "../magnetised/model";
import type { Ion } from "../matter/ion";
import { CP, L88, LL, R91, type Source } from "../sources";
import { floatingPotential } from "../wall/model";

/** What is known of a plasma and its wall; n_e is that of the body. */
interface Situation {
  n_e: number;
  T_e: number;
  ion: Ion;
  p?: number;
  T_i?: number;
  V_s?: number | "floating";
  size?: number;
  B?: number;
  f?: number;
  lambda_i?: number;
}

type Measure = number | NotTested;

/** One limit for each assumption; that of the frequency has a form for slow and one for fast, of which one applies. */
export const regimeLimits: readonly Limit[] = [
  limit("collisionless sheath", "λ_i/s", (of) => ratio(ionPath(of), sheathWidth(of)), {
    holds: 3,
    fails: 1,
    reason: "ions collide inside the sheath",
    source: LL,
  }),
  limit("cold ions", "T_i/T_e", (of) => ratio(of.T_i ?? new NotTested("T_i"), of.T_e), {
    holds: 0.1,
    fails: 0.5,
    reason: "the ions are warm enough to change the Bohm speed",
    source: R91,
  }),
  limit("thin sheath", "size/s", (of) => ratio(of.size ?? new NotTested("size"), sheathWidth(of)), {
    holds: 10,
    fails: 3,
    reason: "the sheath is not thin against the body, so it is not plane",
    source: CP,
  }),
  limit("unmagnetised sheath", "ρ_i/s", (of) => ratio(bohmGyroradius(of), sheathWidth(of)), {
    holds: 10,
    fails: 1,
    reason: "the magnetic field turns the ions inside the sheath",
    source: CP,
  }),
  limit("steady or RF-averaged", "f/f_pi", (of) => slow(frequencyRatio(of)), {
    holds: 0.1,
    fails: 0.3,
    reason: "ions follow the voltage neither at once nor on average",
    source: L88,
  }),
  limit("steady or RF-averaged", "f/f_pi", (of) => fast(frequencyRatio(of)), {
    holds: 3,
    fails: 1,
    reason: "ions follow the voltage neither at once nor on average",
    source: L88,
  }),
  limit(
    "quasi-neutral body",
    "size/λ_D",
    (of) => ratio(of.size ?? new NotTested("size"), debyeLength(of.n_e, of.T_e)),
    {
      holds: 100,
      fails: 10,
      reason: "the body is only a few Debye lengths wide, so charges are not screened in it",
      source: CP,
    },
  ),
];

/** A limit on the arguments of REGIME in their order. */
function limit(
  assumption: string,
  measure: string,
  of: (situation: Situation) => Measure | undefined,
  bounds: { holds: number; fails: number; reason: string; source: Source },
): Limit {
  const value = (...[n_e, T_e, ion, p, T_i, V_s, size, B, f, lambda_i]: any[]) =>
    of({ n_e, T_e, ion, p, T_i, V_s, size, B, f, lambda_i });
  return { assumption, measure, value, ...bounds };
}

function ratio(above: Measure, below: Measure): Measure {
  const needs = [above, below].filter((each) => each instanceof NotTested).map((each) => each.needs);
  return needs.length > 0 ? new NotTested(needs.join(" and ")) : (above as number) / (below as number);
}

/** To where the net charge is 1 % of the edge density's; below the drop that has such a place, Child's law. */
function sheathWidth({ n_e, T_e, ion, T_i, V_s }: Situation): Measure {
  if (V_s === undefined) return new NotTested("V_s");
  const drop = Math.abs(V_s === "floating" ? floatingPotential(T_e, ion, T_i ?? 0, 0) : V_s);
  const width = drop / T_e >= bohmEnd ? fullWidth : childWidth;
  return width(drop, n_e * freeEdgeRatio, T_e);
}

/** As given, or from the pressure of the ion's own gas at 300 K where its cross-section is known. */
function ionPath({ ion, p, lambda_i }: Situation): Measure {
  if (lambda_i !== undefined) return lambda_i;
  const sigma = (crossSections as Record<string, number | undefined>)[ion.label.replace(/\+$/, "")];
  if (sigma === undefined) return new NotTested("lambda_i");
  return p === undefined ? new NotTested("p") : meanFreePath(p, sigma, 300);
}

/** Of an ion at the Bohm speed. */
function bohmGyroradius({ T_e, ion, B }: Situation): Measure {
  return B === undefined ? new NotTested("B") : gyroradius(ion.charge * T_e, B, ion);
}

/** Against the ion plasma frequency at the sheath edge. */
function frequencyRatio({ n_e, ion, f }: Situation): Measure {
  if (f === undefined) return new NotTested("f");
  return f / plasmaFrequency((n_e * freeEdgeRatio) / ion.charge, ion.mass, ion.charge);
}

/** Halfway, by ratio, from too fast to be steady (0.3) to too slow to be averaged (1). */
const between = 0.55;

function slow(found: Measure): Measure | undefined {
  return found instanceof NotTested || found < between ? found : undefined;
}

function fast(found: Measure): Measure | undefined {
  return found instanceof NotTested || found < between ? undefined : found;
}
