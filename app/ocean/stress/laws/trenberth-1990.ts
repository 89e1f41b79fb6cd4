/**
 * Drag coefficient of Trenberth, Large & Olson (1990), as used for the coastal upwelling indices of the Pacific Fisheries Environmental Laboratory.
 * The steps at 3 and 10 m/s are as published.
 * @param wind10 m/s
 */
export function trenberth1990(wind10: number): number {
  if (wind10 <= 1) return 2.18e-3;
  if (wind10 < 3) return (0.62 + 1.56 / wind10) * 1e-3;
  if (wind10 < 10) return 1.14e-3;
  return (0.49 + 0.065 * wind10) * 1e-3;
}
