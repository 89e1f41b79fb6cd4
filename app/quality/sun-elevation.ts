const RADIANS = Math.PI / 180;
const SECONDS_PER_DAY = 86_400;
/** 2000-01-01T12:00:00Z, s since 1970-01-01T00:00:00Z. */
const J2000 = 946_728_000;

/**
 * Elevation of the sun's centre above the horizon, without refraction, good to about 0.02° between 1950 and 2050.
 * @param seconds since 1970-01-01T00:00:00Z
 * @param place [longitude, latitude] in degrees, east and north positive
 * @returns degrees, −90 to 90
 * Source: The Astronomical Almanac, low-precision formulas for the sun and Greenwich mean sidereal time; from memory.
 */
export function sunElevation(seconds: number, [longitude, latitude]: readonly [number, number]): number {
  const days = (seconds - J2000) / SECONDS_PER_DAY;
  const anomaly = (357.528 + 0.9856003 * days) * RADIANS;
  const ecliptic = (280.46 + 0.9856474 * days + 1.915 * Math.sin(anomaly) + 0.02 * Math.sin(2 * anomaly)) * RADIANS;
  const obliquity = (23.439 - 0.0000004 * days) * RADIANS;
  const declination = Math.asin(Math.sin(obliquity) * Math.sin(ecliptic));
  const rightAscension = Math.atan2(Math.cos(obliquity) * Math.sin(ecliptic), Math.cos(ecliptic));
  const sidereal = (280.46062 + 360.98564737 * days + longitude) * RADIANS;
  const hourAngle = sidereal - rightAscension;
  const sine =
    Math.sin(latitude * RADIANS) * Math.sin(declination) +
    Math.cos(latitude * RADIANS) * Math.cos(declination) * Math.cos(hourAngle);
  return Math.asin(Math.min(1, Math.max(-1, sine))) / RADIANS;
}
