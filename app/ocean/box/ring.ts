import type { Position } from "../scenario";

/** Metres in a degree of latitude, mean Earth radius 6371008.8 m (IUGG). */
export const METRES_PER_DEGREE = (Math.PI / 180) * 6371008.8;

/** The ring with longitudes that never jump, so that a box across the antimeridian stays in one piece. */
function unwrapped(ring: readonly Position[]): Position[] {
  const [first] = ring;
  let before = first[0];
  return ring.map(([longitude, latitude]) => {
    before += ((((longitude - before + 180) % 360) + 360) % 360) - 180;
    return [before, latitude];
  });
}

/** Signed sums of the shoelace rule in a plane of degrees about the ring's first corner. */
function shoelace(ring: readonly Position[]): { area2: number; x: number; y: number } {
  const corners = unwrapped(ring);
  const [x0, y0] = corners[0];
  let area2 = 0;
  let x = 0;
  let y = 0;
  for (let k = 0; k < corners.length; k++) {
    const next = corners[(k + 1) % corners.length];
    const ax = corners[k][0] - x0;
    const ay = corners[k][1] - y0;
    const bx = next[0] - x0;
    const by = next[1] - y0;
    const cross = ax * by - bx * ay;
    area2 += cross;
    x += (ax + bx) * cross;
    y += (ay + by) * cross;
  }
  return { area2, x, y };
}

/**
 * The sense of a ring seen with north up, also across the antimeridian.
 * @param ring [longitude, latitude] in degrees, at least one corner
 * @returns 1 anticlockwise, -1 clockwise, 0 where nothing is enclosed
 */
export function ringSense(ring: readonly Position[]): number {
  return Math.sign(shoelace(ring).area2);
}

/** Area enclosed, m², in the equirectangular plane at the ring's mean latitude: good to 1 % for boxes up to some 100 km. */
export function ringArea(ring: readonly Position[]): number {
  const squareDegrees = Math.abs(shoelace(ring).area2) / 2;
  const centre = ringCentre(ring)[1];
  return squareDegrees * METRES_PER_DEGREE ** 2 * Math.cos((centre * Math.PI) / 180);
}

/** Centre of area, [longitude, latitude]; the mean corner where nothing is enclosed. */
export function ringCentre(ring: readonly Position[]): Position {
  const { area2, x, y } = shoelace(ring);
  const [x0, y0] = ring[0];
  if (Math.abs(area2) < 1e-14) {
    const corners = unwrapped(ring);
    const mean = (axis: 0 | 1) => corners.reduce((sum, corner) => sum + corner[axis], 0) / corners.length;
    return [mean(0), mean(1)];
  }
  return [x0 + x / (3 * area2), y0 + y / (3 * area2)];
}
