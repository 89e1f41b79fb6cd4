import { wrapLongitude } from "./ring";

/** Spacing of graticule lines, degrees; below one degree in whole minutes. */
const STEPS = [30, 20, 10, 5, 2, 1, 30 / 60, 20 / 60, 10 / 60, 5 / 60, 2 / 60, 1 / 60];

export interface GraticuleLine {
  /** Degrees: longitude of a meridian (may leave ±180), or latitude of a parallel. */
  at: number;
  /** `8° W`, `54° 20′ N`. */
  label: string;
}

export interface Graticule {
  meridians: GraticuleLine[];
  parallels: GraticuleLine[];
}

export interface GeographicBounds {
  west: number;
  south: number;
  east: number;
  north: number;
}

/**
 * Meridians and parallels for a view, on round degrees or minutes.
 * @param bounds degrees; `east` above `west`, beyond ±180 where the view reaches over the antimeridian
 * @param most about so many lines along the wider way
 */
export function graticule(bounds: GeographicBounds, most = 6): Graticule {
  const span = Math.max(bounds.east - bounds.west, bounds.north - bounds.south);
  const step = STEPS.findLast((candidate) => span / candidate <= most) ?? STEPS[0];
  return {
    meridians: multiples(step, bounds.west, bounds.east).map((at) => ({ at, label: meridianLabel(at) })),
    parallels: multiples(step, bounds.south, bounds.north).map((at) => ({ at, label: parallelLabel(at) })),
  };
}

function multiples(step: number, from: number, to: number): number[] {
  const first = Math.ceil(from / step);
  const last = Math.floor(to / step);
  return Array.from({ length: Math.max(0, last - first + 1) }, (_, i) => ((first + i) * Math.round(step * 60)) / 60);
}

function meridianLabel(longitude: number): string {
  const wrapped = wrapLongitude(longitude);
  const hemisphere = wrapped === 0 || Math.abs(wrapped) === 180 ? "" : wrapped < 0 ? " W" : " E";
  return degreesAndMinutes(wrapped) + hemisphere;
}

function parallelLabel(latitude: number): string {
  return degreesAndMinutes(latitude) + (latitude === 0 ? "" : latitude < 0 ? " S" : " N");
}

function degreesAndMinutes(angle: number): string {
  const minutes = Math.round(Math.abs(angle) * 60);
  const whole = Math.floor(minutes / 60);
  return minutes % 60 === 0 ? `${whole}°` : `${whole}° ${String(minutes % 60).padStart(2, "0")}′`;
}
