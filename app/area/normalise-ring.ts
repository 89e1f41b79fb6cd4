import { booleanClockwise, lineString } from "@turf/turf";
import type { Position } from "~/ocean/scenario";
import { openRing, samePlace, unwrapRing, wrapLongitude } from "./ring";

/**
 * The one form in which a box is kept (RFC 7946): closed, counter-clockwise, without repeated corners, longitudes in
 * ±180. The first corner stays the first. A ring across the antimeridian stays one ring whose longitudes change sign;
 * `unwrapRing` makes it a plane figure again.
 * @param ring [longitude, latitude] in degrees, open or closed, in either sense
 * @returns a closed ring; empty when given nothing
 */
export function normaliseRing(ring: readonly Position[]): Position[] {
  const corners = withoutRepeats(openRing(ring)).map(([longitude, latitude]): Position => [
    wrapLongitude(longitude),
    latitude,
  ]);
  if (corners.length === 0) return [];
  const [first, ...others] = corners;
  const closed = [...corners, first];
  const turned = booleanClockwise(lineString(unwrapRing(closed))) ? [first, ...others.reverse(), first] : closed;
  return turned.map(([longitude, latitude]) => [longitude, latitude]);
}

function withoutRepeats(corners: Position[]): Position[] {
  return corners.filter(([longitude, latitude], i) => {
    if (i === 0) return true;
    const [longitudeBefore, latitudeBefore] = corners[i - 1];
    return !samePlace(longitude, latitude, longitudeBefore, latitudeBefore);
  });
}
