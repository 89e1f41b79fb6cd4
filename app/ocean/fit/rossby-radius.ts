import { coriolis } from "../ekman/coriolis";
import { requireNotNegative, requireRotation } from "../guards";

/**
 * Internal Rossby radius c/|f|: how far from a shore the shore steers the water above a step in density.
 * @param waveSpeed of long internal waves, m/s @param latitude degrees
 * @returns m
 * @throws OceanError EQUATORIAL, INVALID_INPUT
 * @see common practice, no source
 */
export function rossbyRadius(waveSpeed: number, latitude: number): number {
  requireNotNegative({ waveSpeed });
  requireRotation(latitude);
  return waveSpeed / Math.abs(coriolis(latitude));
}
