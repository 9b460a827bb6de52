/**
 * The collisionless sheath of cold ions and Boltzmann electrons, without units: drops η = −φ/T_e against the edge,
 * distances in λ_D, densities in n_edge, the field in T_e/λ_D; μ ≥ 1 is the ions' speed at the edge over u_B.
 * Poisson's equation dε/dη·ε = ρ has the first integral ½ε² = μ²(√(1 + 2η/μ²) − 1) + e^(−η) − 1, and the distance is
 * ∫dη/ε. Riemann, J. Phys. D 24 (1991) 493, §2; Lieberman & Lichtenberg, §6.2.
 */
import { chebyshev } from "../numerics/chebyshev";
import { gaussLegendre, integrate } from "../numerics/gauss-legendre";
import { findRoot } from "../numerics/root";

/** Ion speed over u_B where the potential has dropped by η: energy conservation. */
export function ionSpeed(eta: number, mu: number): number {
  return mu * Math.sqrt(1 + (2 * eta) / mu / mu);
}

/** Charge density of the ions: flux conservation. */
export function ionDensity(eta: number, mu: number): number {
  return 1 / Math.sqrt(1 + (2 * eta) / mu / mu);
}

/**
 * Net charge density ρ = (1 + 2η/μ²)^(−1/2) − e^(−η), in full relative accuracy: it begins as η² at μ = 1. Far from the
 * edge the two terms hardly cancel and stand as they are.
 */
export function netCharge(eta: number, mu: number): number {
  const w = Math.sqrt(1 + (2 * eta) / mu / mu);
  if (eta > 1) return 1 / w - Math.exp(-eta);
  const ions = (2 * (w + 2)) / (mu ** 4 * w * (1 + w) ** 2);
  const electrons = 0.5 - eta * exponentialRest(eta);
  return eta * (excess(mu) + eta * (ions - electrons));
}

/** Field ε = √(2[μ²(√(1 + 2η/μ²) − 1) + e^(−η) − 1]) towards the wall. */
export function field(eta: number, mu: number): number {
  return eta * steepness(eta, mu);
}

/**
 * ε/η, which is the slope of ln η: distances are ∫ d(ln η)/steepness. Its square is δ + (⅔η − …) with δ = 1 − 1/μ²; the
 * terms that cancel near the edge are taken out of the bracket by hand, since μ²(w − 1) = 2η/(1 + w) with w the root.
 */
export function steepness(eta: number, mu: number): number {
  const w = Math.sqrt(1 + (2 * eta) / mu / mu);
  if (eta > 2) return Math.sqrt(2 * ((2 * eta) / (1 + w) + Math.expm1(-eta))) / eta;
  const ions = (w + 3) / (mu ** 4 * (1 + w) ** 3);
  return Math.sqrt(excess(mu) + 2 * eta * (ions - exponentialRest(eta)));
}

/** dε/dη = ρ/ε: the slope of the wall field with the drop; √δ at the edge itself. */
export function fieldSlope(eta: number, mu: number): number {
  return eta === 0 ? Math.sqrt(excess(mu)) : netCharge(eta, mu) / eta / steepness(eta, mu);
}

/** δ = 1 − 1/μ², which keeps its digits near 1. */
function excess(mu: number): number {
  return ((mu - 1) / mu) * ((mu + 1) / mu);
}

/** (½ − S)/η with S = (e^(−η) − 1 + η)/η², as Σ(−η)^k/(k + 3)!. */
function exponentialRest(eta: number): number {
  let sum = 0;
  for (let k = inverseFactorials.length - 1; k >= 0; k--) sum = inverseFactorials[k] - eta * sum;
  return sum;
}

/** 1/3!, 1/4!, … as far as they count at η = 2. */
const inverseFactorials = Float64Array.from({ length: 21 }, (_, k) => {
  let factorial = 1;
  for (let i = 2; i <= k + 3; i++) factorial *= i;
  return 1 / factorial;
});

/** Distance between two drops, low < high. */
export function distance(low: number, high: number, mu: number): number {
  let sum = 0;
  if (low < edgeEnds) sum += edgeReach(low, mu) - edgeReach(Math.min(high, edgeEnds), mu);
  if (low < electronsEnd && high > edgeEnds) {
    sum += quadrature(Math.max(low, edgeEnds), Math.min(high, electronsEnd), mu);
  }
  if (high > electronsEnd) sum += farDistance(Math.max(low, electronsEnd), high, mu);
  return sum;
}

/**
 * In ln η the integrand 1/steepness is smooth from the edge to the wall for every μ: its poles and branch points stay
 * 1.6 or more off the real axis. Twenty points on three units of ln η, or eight on half a unit, leave less than 1e-15.
 */
function quadrature(low: number, high: number, mu: number): number {
  const span = Math.log1p((high - low) / low);
  return integrate((t) => 1 / steepness(low * Math.exp(t), mu), 0, span, span > 0.5 ? twenty : eight, 3);
}

const twenty = gaussLegendre(20);
const eight = gaussLegendre(8);

/** Beyond this drop e^(−η) is below the last bit, and the distance has a closed form. */
const electronsEnd = 38;

/** With p = √(2μ²(w − 1) − 2), the field without electrons, the distance is that of p³/(6μ²) + (1 + 1/μ²) p. */
function farDistance(low: number, high: number, mu: number): number {
  const [w1, w2] = [ionSpeed(low, mu), ionSpeed(high, mu)].map((speed) => speed / mu);
  const [p1, p2] = [electronFreeField(low, w1), electronFreeField(high, w2)];
  const step = (4 * (high - low)) / (w1 + w2) / (p1 + p2);
  return step * ((p1 * p1 + p1 * p2 + p2 * p2) / (6 * mu * mu) + 1 + 1 / (mu * mu));
}

function electronFreeField(eta: number, w: number): number {
  return Math.sqrt((4 * eta) / (1 + w) - 2);
}

/** The drop at a distance below a high one, still without electrons: the one real root p of the cubic above. */
function farDrop(wall: number, x: number, mu: number): number {
  const p = electronFreeField(wall, ionSpeed(wall, mu) / mu);
  const reach = (p * p * p) / (6 * mu * mu) + (1 + 1 / (mu * mu)) * p - x;
  const a = 2 * (mu * mu + 1);
  const root = 2 * Math.sqrt(a) * Math.sinh(Math.asinh((3 * mu * mu * reach) / a ** 1.5) / 3);
  const energy = root * root + 2;
  return (energy / 4) * (2 + energy / (2 * mu * mu));
}

/** Below this drop the square of the steepness is δ + aη to the last bit. */
const edgeEnds = 1e-17;

/**
 * Indefinite distance to the edge where the steepness is √(δ + aη): (2/√δ) asinh √(δ/(aη)), which tends to 2/√(aη) at the
 * Bohm speed, where a = ⅔. Where δ alone decides, a must only stay above zero.
 */
function edgeReach(eta: number, mu: number): number {
  const z = Math.sqrt(excess(mu) / (edgeSlope(mu) * eta));
  return (2 / Math.sqrt(edgeSlope(mu) * eta)) * (z > 0 ? Math.asinh(z) / z : 1);
}

/** The inverse of edgeReach: 0 where it is too small for a number. */
function edgeDrop(reach: number, mu: number): number {
  const root = Math.sqrt(excess(mu));
  const half = (root * reach) / 2;
  const y = half > 0 ? root / Math.sinh(half) : 2 / reach;
  return (y * y) / edgeSlope(mu);
}

function edgeSlope(mu: number): number {
  return Math.max(1 / mu ** 4 - 1 / 3, 0.1);
}

/** The drop at a distance x from a wall that lies `wall` below the edge: where distance(drop, wall) is x. */
export function dropAt(x: number, wall: number, mu: number): number {
  if (x === 0 || wall === 0) return wall;
  const far = wall > electronsEnd ? farDistance(electronsEnd, wall, mu) : 0;
  return x < far ? farDrop(wall, x, mu) : nearDrop(x - far, Math.min(wall, electronsEnd), mu);
}

/**
 * Newton's method on the depth t = ln(start/η), whose derivative by x is the steepness. The distance is carried along
 * from step to step. It grows faster than t at both ends and slowest between, so that a step too far is made good by the
 * next; the bound on the step only guards the first one.
 */
function nearDrop(x: number, start: number, mu: number): number {
  let t = firstDepth(x, start, mu);
  if (t === Infinity) return 0;
  let eta = start * Math.exp(-t);
  let missing = x - distance(eta, start, mu);
  for (let tries = 0; tries < 60; tries++) {
    const step = Math.max(-t, Math.min(2, missing * steepness(eta, mu)));
    const next = start * Math.exp(-(t + step));
    missing -= step < 0 ? -distance(eta, next, mu) : step > 0 ? distance(next, eta, mu) : 0;
    t += step;
    eta = next;
    if (Math.abs(step) < 1e-12) break;
  }
  return eta;
}

/** Towards the edge the closed form is close; between, the depth goes roughly with the distance. */
function firstDepth(x: number, start: number, mu: number): number {
  const top = Math.min(start, 0.1);
  const down = start > top ? distance(top, start, mu) : 0;
  if (x < down) return (Math.log(start / top) * x) / down;
  return Math.log(start / edgeDrop(edgeReach(top, mu) + x - down, mu));
}

/** Net charge at which the sheath is said to end. */
const endCharge = 0.01;

/** The drop nearest the edge at which the net charge density is 1 % of n_edge: 0.11307 at the Bohm speed. */
export function dropAtEnd(mu: number): number {
  return findRoot((eta) => netCharge(eta, mu) - endCharge, 0.005, 0.2);
}

/** Where a sheath entered at the Bohm speed ends. */
export const bohmEnd = dropAtEnd(1);

/**
 * Distance from the wall to where the sheath ends, at the Bohm speed; for drops of bohmEnd and more. It depends on η
 * alone, so a series made once from the quadrature serves every row: distance over ln(η/η_end), which keeps its relative
 * accuracy down to the shortest sheath. With 48 terms it is the quadrature to 1e-13, with 36 to 1e-12.
 */
export function bohmWidth(eta: number): number {
  series ??= chebyshev((t) => distance(bohmEnd, bohmEnd * Math.exp(t), 1) / t, 0, logSpan(electronsEnd), 48);
  if (eta <= electronsEnd) return logSpan(eta) * series(logSpan(eta));
  nearWidth ??= distance(bohmEnd, electronsEnd, 1);
  return nearWidth + farDistance(electronsEnd, eta, 1);
}

let series: ((t: number) => number) | undefined;
let nearWidth: number | undefined;

function logSpan(eta: number): number {
  return Math.log1p((eta - bohmEnd) / bohmEnd);
}
