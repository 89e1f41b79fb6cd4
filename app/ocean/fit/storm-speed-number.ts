import { coriolis } from "../ekman/coriolis";
import { requireNotNegative, requirePositive, requireRotation } from "../guards";

/**
 * Storm speed number S = π Vt/(4 |f| Rm): the inertial period over the time in which the wind of a passing cyclone turns.
 * About 1: the wind turns with the inertial motion; far below 1: a slow storm; far above 1: a push.
 * @param translationSpeed m/s @param radiusOfMaximumWind m @param latitude degrees
 * @returns dimensionless
 * @throws OceanError EQUATORIAL, INVALID_INPUT
 * @see Price, Sanford & Forristall (1994) (from memory)
 */
export function stormSpeedNumber(translationSpeed: number, radiusOfMaximumWind: number, latitude: number): number {
  requireNotNegative({ translationSpeed });
  requirePositive({ radiusOfMaximumWind });
  requireRotation(latitude);
  return (Math.PI * translationSpeed) / (4 * Math.abs(coriolis(latitude)) * radiusOfMaximumWind);
}
