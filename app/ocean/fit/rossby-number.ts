import { coriolis } from "../ekman/coriolis";
import { requireNotNegative, requirePositive, requireRotation } from "../guards";

/**
 * Rossby number U/(|f| L) of a current in a box: large where the water crosses the box before the Earth's rotation turns it.
 * @param speed m/s @param length m @param latitude degrees
 * @returns dimensionless
 * @throws OceanError EQUATORIAL, INVALID_INPUT
 * @see common practice, no source
 */
export function rossbyNumber(speed: number, length: number, latitude: number): number {
  requireNotNegative({ speed });
  requirePositive({ length });
  requireRotation(latitude);
  return speed / (Math.abs(coriolis(latitude)) * length);
}
