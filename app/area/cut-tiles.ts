import { type LandPolygon, type LandRing, measureRing, type RingPoints, ringArea } from "./land-rings";

/** Units across a tile. At zoom 8 one unit is 38 m at the equator, so data good to 100 m keep their shape. */
export const TILE_EXTENT = 4096;
/** Units by which a tile reaches over its neighbours, so that lines join across tiles. */
export const TILE_BUFFER = 64;
export const MAX_ZOOM = 8;

/** Points that move the line by less than this many units are left out above the last zoom. */
const SIMPLIFY_UNITS = 3;
/** Islands and lakes smaller than these squares (units) are left out above the last zoom. */
const SMALLEST_ISLAND_UNITS = 4;
const SMALLEST_LAKE_UNITS = 8;

/** Squared distance in the world square that no zoom level needs resolved. */
export const FINEST_WEIGHT = (SIMPLIFY_UNITS / (TILE_EXTENT * 2 ** (MAX_ZOOM - 1))) ** 2;

/** Rings in tile units, [x, y][] closed; outer rings clockwise on the screen, each followed by its holes. */
export type TileRings = [number, number][][];

export interface LandTile {
  z: number;
  x: number;
  y: number;
  rings: TileRings;
  /** The tile and all below it are land throughout. */
  allLand: boolean;
}

/**
 * Cuts land into the tiles of zoom 0 to 8, depth first so that just one branch is in memory at a time. Tiles without
 * land are not given; below a tile that is all land nothing more is cut (`allLand`), the caller repeats it.
 */
export function* cutTiles(polygons: LandPolygon[], z = 0, x = 0, y = 0): Generator<LandTile> {
  if (polygons.length === 0) return;
  const tile: LandTile = { z, x, y, rings: tileRings(polygons, z, x, y), allLand: coversTile(polygons, z, x, y) };
  if (tile.rings.length > 0) yield tile;
  if (tile.allLand || z === MAX_ZOOM) return;
  for (const column of [2 * x, 2 * x + 1]) {
    const [west, east] = bufferedSpan(z + 1, column);
    const strip = clipPolygons(polygons, 0, west, east);
    for (const row of [2 * y, 2 * y + 1]) {
      const [north, south] = bufferedSpan(z + 1, row);
      yield* cutTiles(clipPolygons(strip, 1, north, south), z + 1, column, row);
    }
  }
}

/** From and to of a tile's column or row in the world square, buffer included. */
function bufferedSpan(z: number, index: number): [number, number] {
  const size = 1 / 2 ** z;
  const margin = (TILE_BUFFER / TILE_EXTENT) * size;
  return [index * size - margin, (index + 1) * size + margin];
}

/** True for a lone polygon without holes whose every corner is a corner of the tile with its buffer. */
function coversTile(polygons: LandPolygon[], z: number, x: number, y: number): boolean {
  if (polygons.length !== 1 || polygons[0].length !== 1) return false;
  const [west, east] = bufferedSpan(z, x);
  const [north, south] = bufferedSpan(z, y);
  const { points } = polygons[0][0];
  for (let i = 0; i < points.length; i += 3) {
    if (points[i] !== west && points[i] !== east) return false;
    if (points[i + 1] !== north && points[i + 1] !== south) return false;
  }
  return Math.abs(ringArea(points)) > 0.999999 * (east - west) * (south - north);
}

/** Weight of the points that clipping makes: always kept. */
const CLIPPED = Infinity;

/** Keeps what lies between two lines across an axis (0: x, 1: y). Rings wholly inside are shared, not copied. */
function clipPolygons(polygons: LandPolygon[], axis: 0 | 1, from: number, to: number): LandPolygon[] {
  const kept: LandPolygon[] = [];
  for (const polygon of polygons) {
    const outer = polygon[0];
    if (lowest(outer, axis) >= from && highest(outer, axis) <= to) {
      kept.push(polygon);
      continue;
    }
    const rings: LandPolygon = [];
    for (const ring of polygon) {
      if (lowest(ring, axis) > to || highest(ring, axis) < from) {
        if (ring === outer) break;
        continue;
      }
      const inside = lowest(ring, axis) >= from && highest(ring, axis) <= to;
      const clipped = inside ? ring : clipRing(ring, axis, from, to);
      if (clipped) rings.push(clipped);
      else if (ring === outer) break;
    }
    if (rings.length > 0) kept.push(rings);
  }
  return kept;
}

function lowest(ring: LandRing, axis: 0 | 1): number {
  return axis === 0 ? ring.minX : ring.minY;
}

function highest(ring: LandRing, axis: 0 | 1): number {
  return axis === 0 ? ring.maxX : ring.maxY;
}

/** Sutherland–Hodgman (Comm. ACM 17(1), 1974, 32–42) against both lines at once. */
function clipRing(ring: LandRing, axis: 0 | 1, from: number, to: number): LandRing | null {
  const { points } = ring;
  const out: RingPoints = [];
  for (let i = 0; i + 5 < points.length; i += 3) {
    const a = points[i + axis];
    const b = points[i + 3 + axis];
    if (a >= from && a <= to) out.push(points[i], points[i + 1], points[i + 2]);
    // A segment that runs right through crosses both lines, in the order in which it meets them.
    const first = a < b ? from : to;
    const second = a < b ? to : from;
    if (crosses(a, b, first)) pushCrossing(out, points, i, axis, first);
    if (crosses(a, b, second)) pushCrossing(out, points, i, axis, second);
  }
  if (out.length < 9) return null;
  const last = out.length - 3;
  if (out[0] !== out[last] || out[1] !== out[last + 1]) out.push(out[0], out[1], out[2]);
  return measureRing(out, ring.area);
}

function crosses(a: number, b: number, line: number): boolean {
  return (a < line && b > line) || (a > line && b < line);
}

function pushCrossing(out: RingPoints, points: RingPoints, i: number, axis: 0 | 1, line: number): void {
  const other = axis === 0 ? 1 : 0;
  const share = (line - points[i + axis]) / (points[i + 3 + axis] - points[i + axis]);
  const value = points[i + other] + (points[i + 3 + other] - points[i + other]) * share;
  if (axis === 0) out.push(line, value, CLIPPED);
  else out.push(value, line, CLIPPED);
}

function tileRings(polygons: LandPolygon[], z: number, x: number, y: number): TileRings {
  const scale = TILE_EXTENT * 2 ** z;
  const last = z === MAX_ZOOM;
  const weight = last ? 0 : (SIMPLIFY_UNITS / scale) ** 2;
  const smallestIsland = last ? 0 : (SMALLEST_ISLAND_UNITS / scale) ** 2;
  const smallestLake = last ? 0 : (SMALLEST_LAKE_UNITS / scale) ** 2;
  const rings: TileRings = [];
  for (const polygon of polygons) {
    if (polygon[0].area < smallestIsland) continue;
    const outer = quantise(polygon[0], scale, x, y, weight, true);
    if (!outer) continue;
    rings.push(outer);
    for (let i = 1; i < polygon.length; i++) {
      if (polygon[i].area < smallestLake) continue;
      const hole = quantise(polygon[i], scale, x, y, weight, false);
      if (hole) rings.push(hole);
    }
  }
  return rings;
}

/** Rounds a ring to tile units, without repeated points, in the turning sense wanted; null when nothing is left. */
function quantise(
  ring: LandRing,
  scale: number,
  column: number,
  row: number,
  weight: number,
  outer: boolean,
): [number, number][] | null {
  const { points } = ring;
  const out: [number, number][] = [];
  const shiftX = column * TILE_EXTENT;
  const shiftY = row * TILE_EXTENT;
  let lastX = NaN;
  let lastY = NaN;
  let twiceArea = 0;
  for (let i = 0; i < points.length; i += 3) {
    if (points[i + 2] < weight) continue;
    const x = Math.round(points[i] * scale - shiftX);
    const y = Math.round(points[i + 1] * scale - shiftY);
    if (x === lastX && y === lastY) continue;
    if (out.length > 0) twiceArea += lastX * y - x * lastY;
    out.push([x, y]);
    lastX = x;
    lastY = y;
  }
  if (out.length < 4 || twiceArea === 0) return null;
  // In y-down units a positive shoelace sum turns clockwise, which the tile format asks of outer rings.
  if (twiceArea > 0 !== outer) out.reverse();
  return out;
}
