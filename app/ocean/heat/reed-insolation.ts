import { OceanError } from "../errors";
import { requireNotNegative, requireFinite } from "../guards";

/**
 * Daily mean insolation under cloud: Q = Q_clear (1 - 0.62 C + 0.0019 β) where C ≥ 0.25. Not for hours.
 * @param clearSky W/m², daily mean @param cloud 0…1 @param noonAltitude of the sun, degrees
 * @returns W/m²
 * @throws OceanError INVALID_INPUT
 * @see Reed (1977), Journal of Physical Oceanography 7:482-485 (from memory)
 */
export function reedInsolation(clearSky: number, cloud: number, noonAltitude: number): number {
  requireNotNegative({ clearSky, cloud });
  requireFinite({ noonAltitude });
  if (cloud > 1) throw new OceanError("INVALID_INPUT", `Cloud cover must lie within 0…1; it is ${cloud}.`);
  return cloud < 0.25 ? clearSky : clearSky * (1 - 0.62 * cloud + 0.0019 * noonAltitude);
}
