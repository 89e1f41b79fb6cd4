import { requireLatitude, requireNotNegative } from "../guards";

/**
 * Sea pressure from depth.
 * @param depth m, positive down, ≥ 0
 * @param latitude degrees
 * @returns dbar
 * @throws OceanError INVALID_INPUT
 * @see Saunders (1981), Journal of Physical Oceanography 11:573-574
 */
export function pressureFromDepth(depth: number, latitude: number): number {
  requireNotNegative({ depth });
  requireLatitude(latitude);
  const c1 = (5.92 + 5.25 * Math.sin((Math.abs(latitude) * Math.PI) / 180) ** 2) * 1e-3;
  return (1 - c1 - Math.sqrt((1 - c1) ** 2 - 8.84e-6 * depth)) / 4.42e-6;
}
