import { requireFinite } from "../guards";

/**
 * Direction that a vector points towards.
 * @param u east @param v north, any one unit
 * @returns degrees true, 0 ≤ direction < 360; null for no motion
 * @throws OceanError INVALID_INPUT
 */
export function directionTowards(u: number, v: number): number | null {
  requireFinite({ u, v });
  if (u === 0 && v === 0) return null;
  const degrees = (Math.atan2(u, v) * 180) / Math.PI;
  const turned = degrees < 0 ? degrees + 360 : degrees;
  // An angle of -1e-17 degrees rounds to exactly 360 when turned.
  return turned >= 360 ? 0 : turned;
}
