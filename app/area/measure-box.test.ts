import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { uniformOrTiny } from "../../tests/factories/uniform";
import { geodesicDistance, measureBox } from "./measure-box";
import { shortestTurn } from "./ring";
import type { Position } from "~/ocean/scenario";

const box = (west: number, south: number, east: number, north: number): Position[] => [
  [west, south],
  [east, south],
  [east, north],
  [west, north],
];

/** Boxes of 0.01 to 4 degrees anywhere a box may lie, the antimeridian included. */
const boxes = fc
  .record({
    west: uniformOrTiny(-180, 180),
    south: uniformOrTiny(-80, 76),
    width: uniformOrTiny(0.01, 4),
    height: uniformOrTiny(0.01, 4),
  })
  .map(({ west, south, width, height }) => box(west, south, west + width, south + height));

describe("measureBox", () => {
  it("gives an octant an eighth of the WGS 84 ellipsoid, 510 065 621.724 km² in all (from a and f, closed form)", () => {
    // Surface of an oblate ellipsoid: 2π a² (1 + (1 − e²)/e artanh e).
    const a = 6378.137;
    const f = 1 / 298.257223563;
    const e = Math.sqrt(f * (2 - f));
    const surface = 2 * Math.PI * a ** 2 * (1 + ((1 - e ** 2) / e) * Math.atanh(e));
    expect(surface).toBeCloseTo(510_065_621.724, 2);
    const octant: Position[] = [
      [0, 0],
      [90, 0],
      [45, 90],
    ];
    expect(measureBox(octant).areaKm2).toBeCloseTo(surface / 8, 3);
  });

  it("knows a degree of longitude at the equator, π a / 180 with a = 6378.137 km (WGS 84)", () => {
    expect(geodesicDistance([0, 0], [1, 0]) / 1000).toBeCloseTo((Math.PI * 6378.137) / 180, 6);
  });

  it("knows the length of the meridian's first degree, 110.574 km (WGS 84 table values, e.g. NGA.SIG.0012)", () => {
    expect(geodesicDistance([0, 0], [0, 1]) / 1000).toBeCloseTo(110.574, 3);
  });

  it("puts the centroid of a rectangle on its meridian, a little towards the wider parallel", () => {
    const { centroid } = measureBox(box(10, 50, 12, 52));
    expect(centroid[0]).toBeCloseTo(11, 10);
    expect(centroid[1]).toBeLessThan(51);
    expect(centroid[1]).toBeGreaterThan(50.97);
  });

  it("gives f and inertial period at the centroid: 30° has 1 sidereal day (23.934 h)", () => {
    const { f, inertialPeriodHours } = measureBox(box(-0.001, 29.999, 0.001, 30.001));
    expect(f).toBeCloseTo(7.292115e-5, 9);
    expect(inertialPeriodHours).toBeCloseTo(23.934, 2);
  });

  it("has no inertial period on the equator", () => {
    expect(measureBox(box(0, -1, 1, 1)).inertialPeriodHours).toBeNull();
  });

  it("refuses fewer than three corners", () => {
    expect(() =>
      measureBox([
        [0, 0],
        [1, 1],
        [0, 0],
      ]),
    ).toThrow("at least 3 corners, not 2");
  });

  it("does not depend on the sense, the first corner, closing, or the turn of longitude", () => {
    fc.assert(
      fc.property(boxes, fc.integer({ min: 0, max: 3 }), fc.constantFrom(-360, 0, 360), (ring, start, turn) => {
        const measured = measureBox(ring);
        const moved = [...ring.slice(start), ...ring.slice(0, start)].reverse();
        const other = measureBox([...moved, moved[0]].map(([x, y]): Position => [x + turn, y]));
        expect(other.areaKm2).toBeCloseTo(measured.areaKm2, 6);
        expect(other.perimeterKm).toBeCloseTo(measured.perimeterKm, 6);
        expect(other.centroid[1]).toBeCloseTo(measured.centroid[1], 8);
        expect(shortestTurn(other.centroid[0] - measured.centroid[0])).toBeCloseTo(0, 8);
      }),
    );
  });

  it("measures the same across the antimeridian as anywhere on that parallel", () => {
    fc.assert(
      fc.property(boxes, uniformOrTiny(-180, 180), (ring, away) => {
        const wrapped = ring.map(([x, y]): Position => [((x + away + 540) % 360) - 180, y]);
        const [here, there] = [measureBox(ring), measureBox(wrapped)];
        expect(there.areaKm2 / here.areaKm2).toBeCloseTo(1, 6);
        expect(there.widthKm / here.widthKm).toBeCloseTo(1, 6);
        expect(there.f).toBeCloseTo(here.f, 12);
      }),
    );
  });
});
