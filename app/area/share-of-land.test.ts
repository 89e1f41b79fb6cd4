import { describe, expect, it } from "vitest";
import { cutTiles, FINEST_WEIGHT, MAX_ZOOM, type TileRings } from "./cut-tiles";
import { projectPolygon } from "./land-rings";
import { shareOfLand, tilesUnder } from "./share-of-land";
import type { Position } from "~/ocean/scenario";

const rectangle = (west: number, south: number, east: number, north: number): Position[] => [
  [west, south],
  [east, south],
  [east, north],
  [west, north],
];

/** Land as the server would read it, by tile. */
function landOf(...polygons: Position[][]) {
  const tiles = new Map<string, TileRings>();
  for (const tile of cutTiles(polygons.map((ring) => projectPolygon([[...ring, ring[0]]], FINEST_WEIGHT)))) {
    if (tile.z === MAX_ZOOM) tiles.set(`${tile.x}/${tile.y}`, tile.rings);
  }
  const across = 2 ** MAX_ZOOM;
  return ({ x, y }: { x: number; y: number }) => tiles.get(`${(x + across) % across}/${y}`);
}

describe("shareOfLand", () => {
  const coast = landOf(rectangle(10, 40, 12, 42));

  it.each<[string, Position[], number]>([
    ["open sea", rectangle(20, 40, 21, 41), 0],
    ["a box half on land, by longitude", rectangle(11.5, 40.5, 12.5, 41.5), 0.5],
    ["a box a quarter on land", rectangle(11.75, 40.5, 12.75, 41.5), 0.25],
    ["a small box astride the coast", rectangle(11.97, 41, 12.03, 41.002), 0.5],
    [
      "a triangle with a corner of a ninth at sea",
      [
        [11, 40.5],
        [12.5, 41],
        [11, 41.5],
      ],
      1 - 1 / 9,
    ],
  ])("tells %s", (_, ring, share) => {
    expect(shareOfLand(ring, MAX_ZOOM, coast)).toBeCloseTo(share, 2);
  });

  it("weighs by area on the sphere, not on the map: a coast along a parallel", () => {
    const south = landOf(rectangle(9, 40, 14, 62));
    const share = (sin(62) - sin(60)) / (sin(64) - sin(60));
    expect(shareOfLand(rectangle(10, 60, 12, 64), MAX_ZOOM, south)).toBeCloseTo(share, 3);
  });

  it("works across the antimeridian, in either way of writing longitudes", () => {
    const both = landOf(rectangle(179, 10, 180, 12), rectangle(-180, 10, -179.5, 12));
    const ring = rectangle(179, 10.5, 181, 11.5);
    const signed = ring.map(([x, y]): Position => [x > 180 ? x - 360 : x, y]);
    expect(shareOfLand(ring, MAX_ZOOM, both)).toBeCloseTo(0.75, 2);
    expect(shareOfLand(signed, MAX_ZOOM, both)).toBeCloseTo(0.75, 2);
  });

  it("is one inland", () => {
    expect(shareOfLand(rectangle(10.5, 40.5, 11.5, 41.5), MAX_ZOOM, coast)).toBe(1);
  });
});

describe("tilesUnder", () => {
  it("lists the tiles that a box touches, columns beyond the last where it reaches over the antimeridian", () => {
    expect(tilesUnder(rectangle(0.1, 0.1, 0.2, 0.2), 8)).toEqual([{ x: 128, y: 127 }]);
    expect(tilesUnder(rectangle(179.9, 0.1, 180.1, 0.2), 8)).toEqual([
      { x: 255, y: 127 },
      { x: 256, y: 127 },
    ]);
  });
});

function sin(degrees: number): number {
  return Math.sin((degrees * Math.PI) / 180);
}
