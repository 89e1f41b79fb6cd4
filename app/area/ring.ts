import { bbox, multiPoint } from "@turf/turf";
import type { Position } from "~/ocean/scenario";

/** Corners of a polygon in order, without the first one repeated at the end. */
export function openRing(ring: readonly Position[]): Position[] {
  if (ring.length < 2) return [...ring];
  const [firstLongitude, firstLatitude] = ring[0];
  const [lastLongitude, lastLatitude] = ring[ring.length - 1];
  return samePlace(firstLongitude, firstLatitude, lastLongitude, lastLatitude) ? ring.slice(0, -1) : [...ring];
}

/** Whether two positions are one place: longitudes a whole turn apart are. */
export function samePlace(longitudeA: number, latitudeA: number, longitudeB: number, latitudeB: number): boolean {
  return latitudeA === latitudeB && (longitudeA - longitudeB) % 360 === 0;
}

/**
 * Corners with longitudes that never jump by more than 180° from one to the next, so that a ring across the
 * antimeridian can be treated as a figure in the plane.
 * @param ring open or closed, longitudes in degrees in any turn
 * @returns as many corners; the first keeps its longitude, others may leave ±180
 */
export function unwrapRing(ring: readonly Position[]): Position[] {
  const unwrapped: Position[] = [];
  let before = ring.length > 0 ? ring[0][0] : 0;
  for (const [longitude, latitude] of ring) {
    before += shortestTurn(longitude - before);
    unwrapped.push([before, latitude]);
  }
  return unwrapped;
}

/** A difference of longitudes, brought to -180…180 degrees; what is there already is not touched. */
export function shortestTurn(difference: number): number {
  if (Math.abs(difference) <= 180) return difference;
  return difference - 360 * Math.round(difference / 360);
}

/** A longitude of any turn in -180…180 degrees; what is there already is not touched. */
export function wrapLongitude(longitude: number): number {
  return shortestTurn(longitude);
}

export interface RingExtent {
  west: number;
  east: number;
  south: number;
  north: number;
}

/** Extent in degrees; across the antimeridian `east` is above 180 (or `west` below -180). */
export function ringExtent(ring: readonly Position[]): RingExtent {
  const [west, south, east, north] = bbox(multiPoint(unwrapRing(ring)));
  return { west, east, south, north };
}
