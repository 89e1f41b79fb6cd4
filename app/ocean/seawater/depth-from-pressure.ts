import { requireLatitude, requireNotNegative } from "../guards";

/**
 * Depth from sea pressure: the inverse of `pressureFromDepth`.
 * @param p dbar, ≥ 0 @param latitude degrees
 * @returns m, positive down
 * @throws OceanError INVALID_INPUT
 * @see Saunders (1981), Journal of Physical Oceanography 11:573-574
 */
export function depthFromPressure(p: number, latitude: number): number {
  requireNotNegative({ p });
  requireLatitude(latitude);
  const c1 = (5.92 + 5.25 * Math.sin((Math.abs(latitude) * Math.PI) / 180) ** 2) * 1e-3;
  return (1 - c1) * p - 2.21e-6 * p * p;
}
