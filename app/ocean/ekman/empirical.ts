import type { RangeWarning } from "../errors";
import { requireNotNegative, requireRotation } from "../guards";

/**
 * Ekman's empirical surface current V0 = 0.0127 U10/√sin|φ| and depth D_E = 7.6 U10/√sin|φ|.
 * V0 stands on a drag coefficient of 2.6e-3 and is an upper, historical value.
 * @param wind10 m/s, 5…20 @param latitude degrees, at least 10 from the equator
 * @returns V0 in m/s, DE in m
 * @throws OceanError EQUATORIAL within 2 degrees; INVALID_INPUT
 * @see Ekman (1905), as in Stewart's open textbook (constants from memory)
 */
export function ekmanEmpirical(wind10: number, latitude: number): { V0: number; DE: number; warnings: RangeWarning[] } {
  requireNotNegative({ wind10 });
  requireRotation(latitude);
  const root = Math.sqrt(Math.sin((Math.abs(latitude) * Math.PI) / 180));
  const warnings: RangeWarning[] = [];
  if (Math.abs(latitude) < 10) {
    const message = `Latitude ${latitude}° is nearer to the equator than the 10° that Ekman's empirical scales hold to.`;
    warnings.push({ code: "OUT_OF_RANGE", message, value: latitude, threshold: 10 });
  }
  return { V0: (0.0127 * wind10) / root, DE: (7.6 * wind10) / root, warnings };
}
