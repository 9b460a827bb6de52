/**
 * The least-squares problem Σ w (y − Σ x_j β_j)² in a few unknowns, gathered point by point. Every unknown is scaled by the
 * size of its own column, so that columns of very different size lose no digits.
 */
export class NormalEquations {
  private readonly matrix: Float64Array;
  private readonly right: Float64Array;

  constructor(readonly unknowns: number) {
    this.matrix = new Float64Array(unknowns * unknowns);
    this.right = new Float64Array(unknowns);
  }

  add(x: ArrayLike<number>, y: number, weight: number): void {
    const n = this.unknowns;
    for (let j = 0; j < n; j++) {
      const weighted = weight * x[j];
      this.right[j] += weighted * y;
      for (let k = 0; k <= j; k++) this.matrix[j * n + k] += weighted * x[k];
    }
  }

  /** The unknowns and the inverse matrix, their covariance where the weights are 1/variance; undefined where they are not determined. */
  solve(): { solution: Float64Array; covariance: Float64Array } | undefined {
    const n = this.unknowns;
    const scale = Float64Array.from({ length: n }, (_, j) => Math.sqrt(this.matrix[j * n + j]));
    if (scale.some((size) => !(size > 0) || !Number.isFinite(size))) return undefined;
    const lower = this.cholesky(scale);
    if (!lower) return undefined;
    const covariance = new Float64Array(n * n);
    for (let j = 0; j < n; j++) {
      const unit = new Float64Array(n);
      unit[j] = 1;
      const column = solveWith(lower, unit, n);
      for (let k = 0; k < n; k++) covariance[k * n + j] = column[k] / (scale[j] * scale[k]);
    }
    const scaled = solveWith(
      lower,
      this.right.map((value, j) => value / scale[j]),
      n,
    );
    return { solution: scaled.map((value, j) => value / scale[j]), covariance };
  }

  /** Cholesky's factor of the scaled matrix; undefined where two columns say the same to 13 digits. */
  private cholesky(scale: Float64Array): Float64Array | undefined {
    const n = this.unknowns;
    const lower = new Float64Array(n * n);
    for (let j = 0; j < n; j++) {
      for (let k = 0; k <= j; k++) {
        let sum = this.matrix[j * n + k] / (scale[j] * scale[k]);
        for (let i = 0; i < k; i++) sum -= lower[j * n + i] * lower[k * n + i];
        if (j !== k) lower[j * n + k] = sum / lower[k * n + k];
        else if (sum > 1e-13) lower[j * n + j] = Math.sqrt(sum);
        else return undefined;
      }
    }
    return lower;
  }
}

function solveWith(lower: Float64Array, right: Float64Array, n: number): Float64Array {
  const x = Float64Array.from(right);
  for (let j = 0; j < n; j++) {
    for (let k = 0; k < j; k++) x[j] -= lower[j * n + k] * x[k];
    x[j] /= lower[j * n + j];
  }
  for (let j = n - 1; j >= 0; j--) {
    for (let k = j + 1; k < n; k++) x[j] -= lower[k * n + j] * x[k];
    x[j] /= lower[j * n + j];
  }
  return x;
}
