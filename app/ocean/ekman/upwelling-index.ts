import { requireFinite } from "../guards";
import { ekmanTransport } from "./transport";

/**
 * Upwelling index: Ekman transport away from the shore through 100 m of coast; positive is upwelling.
 * @param stress N/m² @param latitude degrees @param offshoreTo direction of the open sea, degrees true @param waterDensity kg/m³
 * @returns m³/s per 100 m of shore
 * @throws OceanError EQUATORIAL within 2 degrees; INVALID_INPUT
 * @see Bakun (1973), NOAA Technical Report NMFS SSRF-671
 */
export function upwellingIndex(
  stress: { x: number; y: number },
  latitude: number,
  offshoreTo: number,
  waterDensity: number,
): number {
  requireFinite({ offshoreTo });
  const M = ekmanTransport(stress, latitude, waterDensity);
  const azimuth = (offshoreTo * Math.PI) / 180;
  return 100 * (M.x * Math.sin(azimuth) + M.y * Math.cos(azimuth));
}
