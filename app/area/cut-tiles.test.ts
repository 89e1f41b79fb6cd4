import { VectorTile } from "@mapbox/vector-tile";
import { PbfReader } from "pbf";
import { describe, expect, it } from "vitest";
import { LAND_LAYER } from "./basemap";
import { cutTiles, FINEST_WEIGHT, type LandTile, MAX_ZOOM, TILE_BUFFER, TILE_EXTENT } from "./cut-tiles";
import { encodeLandTile } from "./encode-land-tile";
import { projectPolygon } from "./land-rings";
import { MERCATOR_LATITUDE_LIMIT, mercatorX, mercatorY } from "./mercator";

type Ring = [number, number][];

/** A square of 4 degrees with a lake of one degree in its middle. */
const island: Ring[] = [
  [
    [1, 1],
    [5, 1],
    [5, 5],
    [1, 5],
    [1, 1],
  ],
  [
    [2.5, 2.5],
    [2.5, 3.5],
    [3.5, 3.5],
    [3.5, 2.5],
    [2.5, 2.5],
  ],
];

function cut(...polygons: Ring[][]): LandTile[] {
  return [...cutTiles(polygons.map((polygon) => projectPolygon(polygon, FINEST_WEIGHT)))];
}

/** Land of a tile in units squared, its buffer cut away, by counting units on a coarse grid (even-odd rule). */
function landUnits(tile: LandTile): number {
  const step = 8;
  let inside = 0;
  for (let x = step / 2; x < TILE_EXTENT; x += step) {
    for (let y = step / 2; y < TILE_EXTENT; y += step) if (isLand(tile, x, y)) inside += step * step;
  }
  return inside;
}

function isLand(tile: LandTile, x: number, y: number): boolean {
  let crossings = 0;
  for (const ring of tile.rings) {
    for (let i = 0; i + 1 < ring.length; i++) {
      const [[x1, y1], [x2, y2]] = [ring[i], ring[i + 1]];
      if (y1 <= y !== y2 <= y && x < x1 + ((y - y1) / (y2 - y1)) * (x2 - x1)) crossings += 1;
    }
  }
  return crossings % 2 === 1;
}

function signedArea(ring: Ring): number {
  return ring.slice(0, -1).reduce((sum, [x, y], i) => sum + x * ring[i + 1][1] - ring[i + 1][0] * y, 0) / 2;
}

describe("Mercator", () => {
  it("puts the corners of the world square where EPSG:3857 has them", () => {
    expect([mercatorX(-180), mercatorX(0), mercatorX(180)]).toEqual([0, 0.5, 1]);
    expect(mercatorY(0)).toBe(0.5);
    expect(mercatorY(MERCATOR_LATITUDE_LIMIT)).toBeCloseTo(0, 14);
    expect(MERCATOR_LATITUDE_LIMIT).toBeCloseTo(85.051129, 6);
    // Snyder (1987), Map Projections, eq. 7-2: y = ln tan(π/4 + φ/2).
    const y = Math.log(Math.tan(Math.PI / 4 + (54.4 * Math.PI) / 360));
    expect(mercatorY(54.4)).toBeCloseTo(0.5 - y / (2 * Math.PI), 14);
  });
});

describe("cutTiles", () => {
  const tiles = cut(island);

  it("gives only tiles that land touches, each once", () => {
    const keys = tiles.map(({ z, x, y }) => `${z}/${x}/${y}`);
    expect(new Set(keys).size).toBe(keys.length);
    const deepest = tiles.filter(({ z }) => z === MAX_ZOOM);
    for (const { x, y } of deepest) {
      expect((x + 1 + TILE_BUFFER / TILE_EXTENT) / 256).toBeGreaterThanOrEqual(mercatorX(1));
      expect((x - TILE_BUFFER / TILE_EXTENT) / 256).toBeLessThanOrEqual(mercatorX(5));
      expect((y - TILE_BUFFER / TILE_EXTENT) / 256).toBeLessThanOrEqual(mercatorY(1));
    }
  });

  it("keeps the area of the land, lake taken out, at every zoom", () => {
    const width = (from: number, to: number) => mercatorX(to) - mercatorX(from);
    const height = (from: number, to: number) => mercatorY(from) - mercatorY(to);
    const area = width(1, 5) * height(1, 5) - width(2.5, 3.5) * height(2.5, 3.5);
    for (const zoom of [5, 6, 7, 8]) {
      const units = tiles.filter(({ z }) => z === zoom).reduce((sum, tile) => sum + landUnits(tile), 0);
      expect(units / (TILE_EXTENT * 2 ** zoom) ** 2 / area).toBeCloseTo(1, 2);
    }
  });

  it("turns outer rings clockwise on the screen and holes the other way (vector tile specification 2.1, 4.3.4.4)", () => {
    const whole = tiles.find(({ z }) => z === 5);
    expect(whole?.rings).toHaveLength(2);
    expect(signedArea(whole?.rings[0] ?? [])).toBeGreaterThan(0);
    expect(signedArea(whole?.rings[1] ?? [])).toBeLessThan(0);
  });

  it("stops below a tile that is all land", () => {
    const continent = cut([
      [
        [-90, -60],
        [90, -60],
        [90, 60],
        [-90, 60],
        [-90, -60],
      ],
    ]);
    const solid = continent.filter(({ allLand }) => allLand);
    expect(solid.length).toBeGreaterThan(0);
    for (const { z, x, y } of solid) {
      const below = continent.filter(
        (tile) => tile.z > z && tile.x >> (tile.z - z) === x && tile.y >> (tile.z - z) === y,
      );
      expect(below).toEqual([]);
    }
  });

  it("draws no coast along the antimeridian: land that ends there is carried on into the buffer", () => {
    const eastern = cut([
      [
        [178, 10],
        [180, 10],
        [180, 12],
        [178, 12],
        [178, 10],
      ],
    ]);
    const edge = eastern.filter(({ z, x }) => z === 6 && x === 63);
    expect(edge.length).toBeGreaterThan(0);
    for (const { rings } of edge) {
      const furthest = Math.max(...rings.flat().map(([x]) => x));
      expect(furthest).toBe(TILE_EXTENT + TILE_BUFFER);
    }
  });

  it("leaves out islets of less than four units above the last zoom and keeps them there", () => {
    const side = 0.0025;
    const islet = cut([
      [
        [20, 20],
        [20 + side, 20],
        [20 + side, 20 + side],
        [20, 20 + side],
        [20, 20],
      ],
    ]);
    expect(islet.map(({ z }) => z)).toEqual([MAX_ZOOM]);
  });
});

describe("encodeLandTile", () => {
  it("is read back by an independent decoder, coordinate by coordinate", () => {
    for (const tile of cut(island).filter(({ z }) => z >= 4)) {
      const layer = new VectorTile(new PbfReader(encodeLandTile(tile.rings))).layers[LAND_LAYER];
      expect(layer.extent).toBe(TILE_EXTENT);
      expect(layer.length).toBe(1);
      const feature = layer.feature(0);
      expect(feature.type).toBe(3);
      expect(feature.loadGeometry().map((ring) => ring.map(({ x, y }) => [x, y]))).toEqual(tile.rings);
    }
  });
});
