import { requireFinite, requireNotNegative } from "../guards";
import { holland1980, type Cyclone } from "./holland-1980";

export interface CycloneMotion {
  /** m/s */
  translationSpeed: number;
  /** degrees true, the way it goes */
  translationTo: number;
  /** Wind at 10 m over gradient wind. 0.9 within 100 km over sea (Knaff et al. 2011, as quoted). */
  reduction: number;
}

/** Angle between the wind and the circle about the centre, degrees, towards the centre. Sobey-type, from memory. */
export function inflowAngle(r: number, radiusOfMaximumWind: number): number {
  const x = r / radiusOfMaximumWind;
  if (x < 1) return 10 * x;
  if (x < 1.2) return 10 + 75 * (x - 1);
  return 25;
}

/**
 * Wind at 10 m around a moving cyclone: strongest to the right of its way in the north, to the left in the south.
 * @param dx, dy place less centre, m, east and north
 * @returns u, v m/s towards east and north; speed m/s
 * @throws OceanError INVALID_INPUT
 * @see Holland (1980); translation as in Jelesnianski-type models (from memory)
 */
export function cycloneSurfaceWind(
  cyclone: Cyclone,
  motion: CycloneMotion,
  dx: number,
  dy: number,
): { u: number; v: number; speed: number } {
  requireFinite({ dx, dy, translationTo: motion.translationTo });
  requireNotNegative({ translationSpeed: motion.translationSpeed, reduction: motion.reduction });
  const r = Math.hypot(dx, dy);
  const Rm = cyclone.radiusOfMaximumWind;
  const speedAround = motion.reduction * holland1980(cyclone, r).v;
  const inflow = inflowAngle(r, Rm);
  const side = cyclone.latitude >= 0 ? 1 : -1;
  const flow = Math.atan2(dy, dx) + (side * (90 + inflow) * Math.PI) / 180;
  const carried = (motion.translationSpeed * r * Rm) / (r * r + Rm * Rm);
  const heading = (motion.translationTo * Math.PI) / 180;
  const u = speedAround * Math.cos(flow) + carried * Math.sin(heading);
  const v = speedAround * Math.sin(flow) + carried * Math.cos(heading);
  return { u, v, speed: Math.hypot(u, v) };
}
