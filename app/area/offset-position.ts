import geographiclib from "geographiclib-geodesic";
import type { Position } from "~/ocean/scenario";
import { bearingOf } from "~/units/compass";

/**
 * Where something is after a displacement over the sea: one geodesic of the WGS 84 ellipsoid that leaves at the
 * displacement's bearing.
 * @param longitude degrees east
 * @param latitude degrees north
 * @param eastMetres m, positive eastward
 * @param northMetres m, positive northward
 * @returns [longitude, latitude]; longitude continues across ±180 (e.g. 180.3), so that a track stays one line
 */
export function offsetPosition(longitude: number, latitude: number, eastMetres: number, northMetres: number): Position {
  const bearing = bearingOf(eastMetres, northMetres);
  if (bearing === null) return [longitude, latitude];
  const { Geodesic } = geographiclib;
  const end = Geodesic.WGS84.Direct(
    latitude,
    longitude,
    bearing,
    Math.hypot(eastMetres, northMetres),
    Geodesic.LATITUDE | Geodesic.LONGITUDE | Geodesic.LONG_UNROLL,
  );
  return [end.lon2 ?? longitude, end.lat2 ?? latitude];
}
