/** Rows of powers and coefficient, as tables of coefficients are published. */
export type Terms = readonly (readonly number[])[];

/**
 * Σ c x^i y^j over rows [i, j, c], made ready for many evaluations: the coefficients are laid out as a full grid
 * and summed by Horner's rule.
 */
export function polynomial2(terms: Terms): (x: number, y: number) => number {
  const nx = 1 + Math.max(...terms.map(([i]) => i));
  const ny = 1 + Math.max(...terms.map(([, j]) => j));
  const grid = new Float64Array(nx * ny);
  for (const [i, j, c] of terms) grid[i * ny + j] += c;
  return (x, y) => horner2(grid, 0, nx, ny, x, y);
}

/** Σ c x^i y^j z^k over rows [i, j, k, c], made ready for many evaluations. */
export function polynomial3(terms: Terms): (x: number, y: number, z: number) => number {
  const nx = 1 + Math.max(...terms.map(([i]) => i));
  const ny = 1 + Math.max(...terms.map(([, j]) => j));
  const nz = 1 + Math.max(...terms.map(([, , k]) => k));
  const grid = new Float64Array(nx * ny * nz);
  for (const [i, j, k, c] of terms) grid[(k * nx + i) * ny + j] += c;
  return (x, y, z) => {
    let sum = 0;
    for (let k = nz - 1; k >= 0; k--) sum = sum * z + horner2(grid, k * nx * ny, nx, ny, x, y);
    return sum;
  };
}

function horner2(grid: Float64Array, start: number, nx: number, ny: number, x: number, y: number): number {
  let sum = 0;
  for (let i = nx - 1; i >= 0; i--) {
    let row = 0;
    for (let j = ny - 1; j >= 0; j--) row = row * y + grid[start + i * ny + j];
    sum = sum * x + row;
  }
  return sum;
}

/** Σ c[n] x^n, lowest power first. */
export function polynomial(coefficients: readonly number[], x: number): number {
  let sum = 0;
  for (let n = coefficients.length - 1; n >= 0; n--) sum = sum * x + coefficients[n];
  return sum;
}
