/**
 * Spherical Mercator as web tiles use it (EPSG:3857), scaled so that the world square is 0…1 in x (180° W to 180° E)
 * and 0…1 in y (85.0511° N down to 85.0511° S).
 */

/** Latitude of the world square's upper and lower edge, degrees: atan(sinh π). */
export const MERCATOR_LATITUDE_LIMIT = (Math.atan(Math.sinh(Math.PI)) * 180) / Math.PI;

/** Beyond this the projection runs to infinity; latitudes are held here, still outside the world square. */
const HELD_LATITUDE = 89;

/** @returns x across the world square; not wrapped, so longitude 190° gives a value above 1. */
export function mercatorX(longitude: number): number {
  return longitude / 360 + 0.5;
}

/** @returns y down the world square; latitudes beyond ±89° count as ±89°. */
export function mercatorY(latitude: number): number {
  const held = Math.max(-HELD_LATITUDE, Math.min(HELD_LATITUDE, latitude));
  const sine = Math.sin((held * Math.PI) / 180);
  return 0.5 - (0.25 * Math.log((1 + sine) / (1 - sine))) / Math.PI;
}
