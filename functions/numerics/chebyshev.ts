/**
 * A smooth function on [a, b] as a Chebyshev series of so many terms, interpolated at the Chebyshev points and summed by
 * Clenshaw's recurrence (Press et al., Numerical Recipes, 3rd ed. 2007, §5.8). For a function that is analytic around
 * the interval the error falls geometrically with the terms, down to a few units in the last place of its largest value.
 */
export function chebyshev(f: (x: number) => number, a: number, b: number, terms: number): (x: number) => number {
  const middle = (a + b) / 2;
  const half = (b - a) / 2;
  // Whole turns are taken off while the angle is a whole number, so that no digit is lost to them.
  const cosine = (j: number, k: number) => Math.cos((Math.PI * ((j * (2 * k + 1)) % (4 * terms))) / (2 * terms));
  const values = Array.from({ length: terms }, (_, k) => f(middle + half * cosine(1, k)));
  const coefficients = Float64Array.from({ length: terms }, (_, j) => {
    const sum = values.reduce((total, value, k) => total + value * cosine(j, k), 0);
    return ((j === 0 ? 1 : 2) / terms) * sum;
  });
  return (x) => {
    const t = (x - middle) / half;
    let later = 0;
    let latest = 0;
    for (let j = terms - 1; j > 0; j--) [later, latest] = [latest, 2 * t * latest - later + coefficients[j]];
    return t * latest - later + coefficients[0];
  };
}
