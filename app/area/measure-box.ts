import { centerOfMass, polygon } from "@turf/turf";
import geographiclib from "geographiclib-geodesic";
import { coriolis, inertialPeriod } from "~/ocean/ekman/coriolis";
import type { Position } from "~/ocean/scenario";
import { openRing, ringExtent, unwrapRing, wrapLongitude } from "./ring";

export interface BoxMeasures {
  /** km² on the WGS 84 ellipsoid, always positive. */
  areaKm2: number;
  /** km along geodesics. */
  perimeterKm: number;
  centroid: Position;
  /** West to east along the box's middle, km. */
  widthKm: number;
  /** South to north along the box's middle, km. */
  heightKm: number;
  /** Coriolis parameter at the centroid, 1/s; negative in the southern hemisphere. */
  f: number;
  /** Hours at the centroid; null on the equator, where there is none. */
  inertialPeriodHours: number | null;
}

const { WGS84 } = geographiclib.Geodesic;

const METRES_PER_KILOMETRE = 1000;
const SQUARE_METRES_PER_SQUARE_KILOMETRE = 1e6;
const SECONDS_PER_HOUR = 3600;

/**
 * Measures a box. Sides are geodesics of the WGS 84 ellipsoid (C. F. F. Karney, Algorithms for geodesics,
 * J. Geodesy 87, 2013, 43–55, doi:10.1007/s00190-012-0578-z).
 * @param ring [longitude, latitude] in degrees, at least 3 corners, open or closed, either sense, also across ±180;
 *   not around a pole
 * @throws RangeError for fewer than 3 corners
 */
export function measureBox(ring: readonly Position[]): BoxMeasures {
  const corners = openRing(ring);
  if (corners.length < 3) throw new RangeError(`A box needs at least 3 corners, not ${corners.length}.`);
  const geodesics = WGS84.Polygon(false);
  for (const [longitude, latitude] of corners) geodesics.AddPoint(latitude, longitude);
  const { area = 0, perimeter } = geodesics.Compute(false, true);
  const centroid = centroidOf(corners);
  const { west, east, south, north } = ringExtent(corners);
  const f = coriolis(centroid[1]);
  const period = inertialPeriod(f);
  return {
    areaKm2: Math.abs(area) / SQUARE_METRES_PER_SQUARE_KILOMETRE,
    perimeterKm: perimeter / METRES_PER_KILOMETRE,
    centroid,
    widthKm: geodesicDistance([west, (south + north) / 2], [east, (south + north) / 2]) / METRES_PER_KILOMETRE,
    heightKm: geodesicDistance([(west + east) / 2, south], [(west + east) / 2, north]) / METRES_PER_KILOMETRE,
    f,
    inertialPeriodHours: period === null ? null : period / SECONDS_PER_HOUR,
  };
}

/** Length of the geodesic between two positions on the WGS 84 ellipsoid, m. */
export function geodesicDistance(from: Position, to: Position): number {
  return WGS84.Inverse(from[1], from[0], to[1], to[0]).s12 ?? 0;
}

/** Area centroid in the sinusoidal projection (equal-area on the sphere) about the box's middle meridian. */
function centroidOf(corners: readonly Position[]): Position {
  const unwrapped = unwrapRing(corners);
  const { west, east, south, north } = ringExtent(corners);
  const [originLongitude, originLatitude] = [(west + east) / 2, (south + north) / 2];
  const plane = unwrapped.map(([longitude, latitude]): Position => [
    (longitude - originLongitude) * Math.cos((latitude * Math.PI) / 180),
    latitude - originLatitude,
  ]);
  const [x, y] = centerOfMass(polygon([[...plane, plane[0]]])).geometry.coordinates;
  const latitude = originLatitude + y;
  return [wrapLongitude(originLongitude + x / Math.cos((latitude * Math.PI) / 180)), latitude];
}
