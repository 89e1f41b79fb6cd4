import { EARTH_ROTATION } from "../constants";
import { requireLatitude } from "../guards";

/**
 * Coriolis parameter f = 2 Ω sin φ.
 * @param latitude degrees, positive north
 * @returns 1/s, negative in the southern hemisphere
 * @throws OceanError INVALID_INPUT
 */
export function coriolis(latitude: number): number {
  requireLatitude(latitude);
  return 2 * EARTH_ROTATION * Math.sin((latitude * Math.PI) / 180);
}

/** Inertial period 2π/|f| in s for a Coriolis parameter in 1/s; null at the equator, where there is none. */
export function inertialPeriod(f: number): number | null {
  const period = (2 * Math.PI) / Math.abs(f);
  return Number.isFinite(period) ? period : null;
}
