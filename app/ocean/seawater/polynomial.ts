/**
 * Σ c x^i y^j over rows [i, j, c].
 * @param terms rows of powers and coefficient
 */
export function polynomial2(terms: readonly (readonly number[])[], x: number, y: number): number {
  let sum = 0;
  for (const [i, j, c] of terms) sum += c * x ** i * y ** j;
  return sum;
}

/** Σ c x^i y^j z^k over rows [i, j, k, c]. */
export function polynomial3(terms: readonly (readonly number[])[], x: number, y: number, z: number): number {
  let sum = 0;
  for (const [i, j, k, c] of terms) sum += c * x ** i * y ** j * z ** k;
  return sum;
}

/** Σ c[n] x^n, lowest power first. */
export function polynomial(coefficients: readonly number[], x: number): number {
  let sum = 0;
  for (let n = coefficients.length - 1; n >= 0; n--) sum = sum * x + coefficients[n];
  return sum;
}
