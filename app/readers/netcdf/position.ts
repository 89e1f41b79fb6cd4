import { formatPosition } from "~/area/format-coordinates";

export interface LatLon {
  /** Degrees north. */
  latitude: number;
  /** Degrees east; any turn of the circle. */
  longitude: number;
}

const RADIANS = Math.PI / 180;
/** Mean radius of the Earth, km. Source: Moritz, Geodetic Reference System 1980 (R₁). */
const EARTH_RADIUS = 6371.0088;

/** Distance on a sphere, km: good to half a percent, which settles which of two places is nearer. */
export function distanceKm(a: LatLon, b: LatLon): number {
  const north = Math.sin(((b.latitude - a.latitude) * RADIANS) / 2) ** 2;
  const east = Math.sin(((b.longitude - a.longitude) * RADIANS) / 2) ** 2;
  const chord = north + Math.cos(a.latitude * RADIANS) * Math.cos(b.latitude * RADIANS) * east;
  return 2 * EARTH_RADIUS * Math.asin(Math.min(1, Math.sqrt(chord)));
}

/** The shorter way round from one longitude to another, −180 to 180 degrees, whichever turn each is written in. */
export function eastwardBy(from: number, to: number): number {
  return ((((to - from + 180) % 360) + 360) % 360) - 180;
}

/**
 * Reads `LAT,LON` in decimal degrees.
 * @returns null where the text is no position on Earth
 */
export function positionFromText(text: string): LatLon | null {
  const match = /^\s*([+-]?\d+(?:\.\d+)?)\s*,\s*([+-]?\d+(?:\.\d+)?)\s*$/.exec(text);
  if (match === null) return null;
  const [latitude, longitude] = [Number(match[1]), Number(match[2])];
  return Math.abs(latitude) <= 90 && Math.abs(longitude) <= 360 ? { latitude, longitude } : null;
}

/** `44.500° N 63.400° W` */
export function positionLabel({ latitude, longitude }: LatLon): string {
  return formatPosition([longitude, latitude]);
}
