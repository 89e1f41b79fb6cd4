import { requireLatitude } from "../guards";

/**
 * Acceleration of gravity at the sea surface.
 * @param latitude degrees, -90…90
 * @returns m/s²
 * @throws OceanError INVALID_INPUT
 * @see IOC, SCOR and IAPSO (2010), appendix D (Moritz 2000)
 */
export function gravityAt(latitude: number): number {
  requireLatitude(latitude);
  const s2 = Math.sin((latitude * Math.PI) / 180) ** 2;
  return 9.780327 * (1 + (5.2792e-3 + 2.32e-5 * s2) * s2);
}
