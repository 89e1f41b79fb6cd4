import { mercatorX, mercatorY } from "./mercator";

/** x, y, weight, x, y, weight, … of a closed ring (first point repeated), in units of the world square. */
export type RingPoints = number[];

export interface LandRing {
  /** Triples; a point's weight is the squared distance by which leaving it out would move the line. */
  points: RingPoints;
  minX: number;
  minY: number;
  maxX: number;
  maxY: number;
  /** Area of the whole ring before any clipping, in units of the world square. */
  area: number;
}

/** Outer ring first, then its holes. */
export type LandPolygon = LandRing[];

/** How far land that ends at 180° is carried on past the world's edge, so that no coast is drawn along the seam. */
const SEAM_OVERHANG = 0.5 / 360;

/** The source has simplified most of its lakes to triangles, which tell nothing of their shape: they count as land. */
const FEWEST_LAKE_POINTS = 5;

/**
 * Projects a GeoJSON polygon (longitude, latitude in degrees) to the world square and weighs every point for
 * simplification. Lakes of three corners are left out.
 * @param finest squared distance (world-square units) below which points need no weight
 */
export function projectPolygon(rings: readonly (readonly (readonly number[])[])[], finest: number): LandPolygon {
  return rings
    .filter((ring, i) => i === 0 || ring.length >= FEWEST_LAKE_POINTS)
    .map((ring) => projectRing(ring, finest));
}

function projectRing(ring: readonly (readonly number[])[], finest: number): LandRing {
  const points: RingPoints = [];
  for (let i = 0; i < ring.length; i++) {
    const [longitude, latitude] = ring[i];
    const x = mercatorX(longitude);
    const y = mercatorY(latitude);
    if (x > 0 && x < 1) {
      points.push(x, y, 0);
      continue;
    }
    // On the seam: keep the exact crossing, and carry the land on outside the world square.
    const outside = x <= 0 ? x - SEAM_OVERHANG : x + SEAM_OVERHANG;
    const before = ring[i === 0 ? ring.length - 2 : i - 1];
    const after = ring[i === ring.length - 1 ? 1 : i + 1];
    if (Math.abs(before[0]) < 180) points.push(x, y, 0);
    points.push(outside, y, 0);
    if (Math.abs(after[0]) < 180) points.push(x, y, 0);
  }
  closeRing(points);
  weighPoints(points, finest);
  return measureRing(points, Math.abs(ringArea(points)));
}

function closeRing(points: RingPoints): void {
  const last = points.length - 3;
  if (points[0] !== points[last] || points[1] !== points[last + 1]) points.push(points[0], points[1], 0);
}

/** Wraps points with their bounding box. */
export function measureRing(points: RingPoints, area: number): LandRing {
  let minX = Infinity;
  let minY = Infinity;
  let maxX = -Infinity;
  let maxY = -Infinity;
  for (let i = 0; i < points.length; i += 3) {
    const x = points[i];
    const y = points[i + 1];
    if (x < minX) minX = x;
    if (x > maxX) maxX = x;
    if (y < minY) minY = y;
    if (y > maxY) maxY = y;
  }
  return { points, minX, minY, maxX, maxY, area };
}

/** Signed area of a closed ring of triples (shoelace), positive when it turns clockwise on the screen (y down). */
export function ringArea(points: RingPoints): number {
  let twice = 0;
  for (let i = 0; i + 5 < points.length; i += 3) twice += points[i] * points[i + 4] - points[i + 3] * points[i + 1];
  return twice / 2;
}

/**
 * Douglas–Peucker (Cartographica 10(2), 1973, 112–122) run once for all zoom levels: instead of dropping points it
 * writes into each the squared distance at which it would be kept.
 */
function weighPoints(points: RingPoints, finest: number): void {
  const last = points.length - 3;
  points[2] = Infinity;
  points[last + 2] = Infinity;
  const open = [0, last];
  while (open.length > 0) {
    const to = open.pop() as number;
    const from = open.pop() as number;
    const furthest = furthestPoint(points, from, to, finest);
    if (furthest < 0) continue;
    if (furthest - from > 3) open.push(from, furthest);
    if (to - furthest > 3) open.push(furthest, to);
  }
}

/** Marks and returns the point furthest from the chord, or -1 when all lie within `finest`. */
function furthestPoint(points: RingPoints, from: number, to: number, finest: number): number {
  const ax = points[from];
  const ay = points[from + 1];
  const dx = points[to] - ax;
  const dy = points[to + 1] - ay;
  const lengthSquared = dx * dx + dy * dy;
  let furthest = -1;
  let greatest = finest;
  for (let i = from + 3; i < to; i += 3) {
    let x = points[i] - ax;
    let y = points[i + 1] - ay;
    if (lengthSquared > 0) {
      const along = Math.max(0, Math.min(1, (x * dx + y * dy) / lengthSquared));
      x -= along * dx;
      y -= along * dy;
    }
    const distance = x * x + y * y;
    if (distance > greatest) {
      greatest = distance;
      furthest = i;
    }
  }
  if (furthest >= 0) points[furthest + 2] = greatest;
  return furthest;
}
