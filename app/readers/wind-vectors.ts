const RADIANS = Math.PI / 180;

/**
 * Speed and direction from components.
 * @param u eastward, v northward: where the air goes, any unit
 * @returns speed in the same unit; `from` in degrees true, 0 ≤ from < 360, NaN for a calm
 */
export function windFromComponents(u: number, v: number): { speed: number; from: number } {
  const speed = Math.hypot(u, v);
  if (!(speed > 0)) return { speed, from: NaN };
  return { speed, from: normalDegrees(Math.atan2(-u, -v) / RADIANS) };
}

/** Components of a wind that blows from `from` (degrees true): u = −s sin θ, v = −s cos θ. */
export function componentsOfWind(speed: number, from: number): { u: number; v: number } {
  return { u: -speed * Math.sin(from * RADIANS), v: -speed * Math.cos(from * RADIANS) };
}

/** The same direction in 0 ≤ d < 360; 360 becomes 0. */
export function normalDegrees(degrees: number): number {
  const turned = ((degrees % 360) + 360) % 360;
  return turned === 360 ? 0 : turned;
}
