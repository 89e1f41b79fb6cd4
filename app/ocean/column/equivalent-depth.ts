/**
 * Depth of a slab that would have done the same work against a linear stratification: h = (12 ΔPE/(ρ0 N²))^(1/3).
 * @param before, after density, one value a cell, kg/m³ @param cellSize m
 * @param N2 buoyancy frequency squared at the start, 1/s² @param rho0 kg/m³ @param gravity m/s²
 * @returns m; 0 where no work was done
 */
export function equivalentDepth(
  before: Float64Array,
  after: Float64Array,
  { cellSize, N2, rho0, gravity }: { cellSize: number; N2: number; rho0: number; gravity: number },
): number {
  let raised = 0;
  for (let k = 0; k < before.length; k++) raised -= gravity * (after[k] - before[k]) * (k + 0.5) * cellSize * cellSize;
  return Math.cbrt(Math.max(0, (12 * raised) / (rho0 * N2)));
}
