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

/** degrees, beyond 1.2 radii of maximum wind */
const OUTER_INFLOW = 25;

/** Angle between the wind and the circle about the centre, degrees, towards the centre. Sobey-type, from memory. */
export function inflowAngle(r: number, radiusOfMaximumWind: number): number {
  const x = r / radiusOfMaximumWind;
  if (x < 1) return 10 * x;
  if (x < 1.2) return 10 + 75 * (x - 1);
  return OUTER_INFLOW;
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
  const speedAround = motion.reduction * holland1980(cyclone, Math.hypot(dx, dy)).v;
  return turnedAndCarried(speedAround, cyclone, motion, dx, dy);
}

/** How a wind that blows around a centre is turned towards it and carried along with it. */
export interface Carriage {
  /** m/s */
  translationSpeed: number;
  /** degrees true, the way it goes */
  translationTo: number;
  /** Inflow angle in the outer vortex, degrees; default 25. Further in it shrinks in proportion. */
  outerInflow?: number;
  /** Share of the translation that is added; default 1. */
  asymmetry?: number;
}

/**
 * Wind around a centre, turned inwards and added to the centre's own motion.
 * @param speedAround m/s at the surface, ≥ 0
 * @param centre latitude, degrees: its sign gives the sense of rotation; radius of maximum wind, m
 * @param dx, dy place less centre, m, east and north
 * @returns u, v m/s towards east and north; speed m/s
 * @see Sobey-type inflow and Jelesnianski-type translation (both from memory)
 */
export function turnedAndCarried(
  speedAround: number,
  centre: { latitude: number; radiusOfMaximumWind: number },
  carriage: Carriage,
  dx: number,
  dy: number,
): { u: number; v: number; speed: number } {
  const { translationSpeed, translationTo, outerInflow = OUTER_INFLOW, asymmetry = 1 } = carriage;
  const r = Math.hypot(dx, dy);
  const Rm = centre.radiusOfMaximumWind;
  const inflow = inflowAngle(r, Rm) * (outerInflow / OUTER_INFLOW);
  const side = centre.latitude >= 0 ? 1 : -1;
  const flow = Math.atan2(dy, dx) + (side * (90 + inflow) * Math.PI) / 180;
  const carried = (asymmetry * translationSpeed * r * Rm) / (r * r + Rm * Rm);
  const heading = (translationTo * Math.PI) / 180;
  const u = speedAround * Math.cos(flow) + carried * Math.sin(heading);
  const v = speedAround * Math.sin(flow) + carried * Math.cos(heading);
  return { u, v, speed: Math.hypot(u, v) };
}
