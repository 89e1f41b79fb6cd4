import { medianOf } from "../scan-column";
import type { Space } from "./cf-space";
import { distanceKm, eastwardBy, type LatLon } from "./position";

/** One cell of a grid, or one station: where along each dimension, and its share of the value. */
export interface Cell {
  indices: ReadonlyMap<string, number>;
  weight: number;
  position: LatLon;
}

/** A grid's cells near a place, nearest first, with the distance in km. */
export interface NearCell extends Cell {
  distance: number;
}

type GridSpace = Extract<Space, { kind: "grid" | "curved" }>;

/** Cells each way from the nearest in which a cell of sea is looked for. */
const REACH = 3;

/** Cells about the one nearest to a place, nearest first. */
export function nearCells(space: GridSpace, place: LatLon): NearCell[] {
  const cells = space.kind === "grid" ? windowOfGrid(space, place) : windowOfCurve(space, place);
  return cells
    .map((cell) => ({ ...cell, distance: distanceKm(cell.position, place) }))
    .filter(({ distance }) => !Number.isNaN(distance))
    .sort((a, b) => a.distance - b.distance);
}

/** Whether the cell nearest to a place is so far that the place lies beyond the grid; inside a cell it is half a diagonal at most. */
export function isBeyond(near: readonly NearCell[]): boolean {
  const [first] = near;
  if (first === undefined) return true;
  const neighbours = near.filter((cell) =>
    [...cell.indices].every(([dimension, index]) => Math.abs(index - (first.indices.get(dimension) ?? NaN)) <= 1),
  );
  const diagonal = Math.max(...neighbours.map(({ position }) => distanceKm(first.position, position)));
  return diagonal > 0 && first.distance > 0.75 * diagonal;
}

function windowOfGrid(space: Extract<Space, { kind: "grid" }>, place: LatLon): Cell[] {
  const { latitudes, longitudes } = space;
  const row = nearestIndex(latitudes, (value) => Math.abs(value - place.latitude));
  const column = nearestIndex(longitudes, (value) => Math.abs(eastwardBy(value, place.longitude)));
  const cells: Cell[] = [];
  for (const northward of around(row, latitudes.length, false)) {
    for (const eastward of around(column, longitudes.length, isAround(longitudes))) {
      cells.push(cellOfGrid(space, northward, eastward, 1));
    }
  }
  return cells;
}

function cellOfGrid(space: Extract<Space, { kind: "grid" }>, row: number, column: number, weight: number): Cell {
  return {
    indices: new Map([
      [space.rows, row],
      [space.columns, column],
    ]),
    weight,
    position: { latitude: space.latitudes[row] ?? NaN, longitude: space.longitudes[column] ?? NaN },
  };
}

function windowOfCurve(space: Extract<Space, { kind: "curved" }>, place: LatLon): Cell[] {
  const { latitudes, longitudes, width } = space;
  let nearest = 0;
  let least = Infinity;
  for (let index = 0; index < latitudes.length; index += 1) {
    const away = distanceKm({ latitude: latitudes[index] ?? NaN, longitude: longitudes[index] ?? NaN }, place);
    if (away < least) [nearest, least] = [index, away];
  }
  const cells: Cell[] = [];
  for (const row of around(Math.floor(nearest / width), Math.floor(latitudes.length / width), false)) {
    for (const column of around(nearest % width, width, false)) {
      const index = row * width + column;
      cells.push({
        indices: new Map([
          [space.rows, row],
          [space.columns, column],
        ]),
        weight: 1,
        position: { latitude: latitudes[index] ?? NaN, longitude: longitudes[index] ?? NaN },
      });
    }
  }
  return cells;
}

function nearestIndex(values: Float64Array, away: (value: number) => number): number {
  let nearest = 0;
  for (let index = 1; index < values.length; index += 1)
    if (away(values[index] ?? NaN) < away(values[nearest] ?? NaN)) nearest = index;
  return nearest;
}

/** Indices about one, round the seam of a grid that goes around the Earth. */
function around(index: number, length: number, wraps: boolean): number[] {
  const found = new Set<number>();
  for (let step = -REACH; step <= REACH; step += 1) {
    const at = index + step;
    if (wraps) found.add((at + length) % length);
    else if (at >= 0 && at < length) found.add(at);
  }
  return [...found];
}

function isAround(longitudes: Float64Array): boolean {
  const step = medianOf(longitudes.slice(1).map((value, index) => Math.abs(value - (longitudes[index] ?? NaN))));
  const gap = eastwardBy(longitudes.at(-1) ?? NaN, longitudes[0] ?? NaN);
  return longitudes.length > 2 && Math.abs(Math.abs(gap) - step) < 0.5 * step;
}

/**
 * The four cells about a place with their shares by distance along each axis; axes may run either way, and longitudes
 * be written 0 to 360 or −180 to 180.
 * @returns null where the place is not between cells
 */
export function bilinearCells(space: GridSpace, place: LatLon): Cell[] | null {
  if (space.kind === "curved") return null;
  const rows = bracket(space.latitudes.map((value) => value - place.latitude));
  const columns = bracket(space.longitudes.map((value) => eastwardBy(place.longitude, value)));
  if (rows === null || columns === null) return null;
  return rows.flatMap((row) =>
    columns
      .map((column) => cellOfGrid(space, row.index, column.index, row.share * column.share))
      .filter(({ weight }) => weight > 0),
  );
}

/** The two values about zero, and the share of each; null where all lie on one side or far apart. */
function bracket(away: Float64Array): { index: number; share: number }[] | null {
  let below = -1;
  let above = -1;
  for (let index = 0; index < away.length; index += 1) {
    const value = away[index] ?? NaN;
    if (value <= 0 && (below < 0 || value > (away[below] ?? NaN))) below = index;
    if (value >= 0 && (above < 0 || value < (away[above] ?? NaN))) above = index;
  }
  if (below < 0 || above < 0) return null;
  if (below === above) return [{ index: below, share: 1 }];
  const [low, high] = [away[below] ?? NaN, away[above] ?? NaN];
  // Two sides of a regional grid, not two neighbours.
  if (high - low > 90) return null;
  return [
    { index: below, share: high / (high - low) },
    { index: above, share: -low / (high - low) },
  ];
}
