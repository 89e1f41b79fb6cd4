/** Areas, distances and bearings against Debian's python3-geographiclib. Run where the library is installed. */
import { describe, expect, it } from "vitest";
import { geodesicDistance, measureBox } from "~/area/measure-box";
import { offsetPosition } from "~/area/offset-position";
import type { Position } from "~/ocean/scenario";
import { mulberry32 } from "~/ocean/statistics/mulberry32";
import { askReference, pythonWith, worst } from "./reference";

const found = pythonWith("geographiclib");
const python = found ?? "";

describe.skipIf(!found)("geodesy against python3-geographiclib", () => {
  it("measures area and perimeter of seeded boxes to rounding, across the antimeridian too", () => {
    const random = mulberry32(7);
    const rings = Array.from({ length: 300 }, (): Position[] => {
      const [west, south] = [360 * random() - 180, 156 * random() - 80];
      const [width, height] = [0.01 + 4 * random(), 0.01 + 4 * random()];
      const east = ((west + width + 540) % 360) - 180;
      return [
        [west, south],
        [east, south],
        [east, south + height],
        [west, south + height],
      ];
    });
    const answer = askReference(python, { ask: "polygons", rings });
    const measured = rings.map(measureBox);
    const areas = measured.map(({ areaKm2 }) => areaKm2 * 1e6);
    const perimeters = measured.map(({ perimeterKm }) => perimeterKm * 1e3);
    expect(worst(areas, answer.list("area"), 1)).toBeLessThan(1e-9);
    expect(worst(perimeters, answer.list("perimeter"), 1)).toBeLessThan(1e-12);
  });

  it("measures distances to rounding, and puts a drift where its length and bearing say", () => {
    const random = mulberry32(8);
    const drifts = Array.from({ length: 300 }, () => ({
      start: [360 * random() - 180, 160 * random() - 80] satisfies Position,
      east: 60_000 * (random() - 0.5),
      north: 60_000 * (random() - 0.5),
    }));
    const ends = drifts.map(({ start, east, north }) => offsetPosition(start[0], start[1], east, north));
    const pairs = drifts.map(({ start }, k) => [start, ends[k]]);
    const answer = askReference(python, { ask: "lines", pairs });
    const distances = drifts.map(({ start }, k) => geodesicDistance(start, ends[k]));
    expect(worst(distances, answer.list("distance"), 1)).toBeLessThan(1e-9);
    const lengths = drifts.map(({ east, north }) => Math.hypot(east, north));
    expect(worst(lengths, answer.list("distance"), 1)).toBeLessThan(1e-9);
    answer.list("bearing").forEach((bearing, k) => {
      const { east, north } = drifts[k];
      const expected = (Math.atan2(east, north) * 180) / Math.PI;
      const turn = (((bearing ?? NaN) - expected + 540) % 360) - 180;
      expect(Math.abs(turn)).toBeLessThan(1e-6);
    });
  });
});
