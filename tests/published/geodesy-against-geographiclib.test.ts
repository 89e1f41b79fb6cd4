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
  it("measures area and perimeter of seeded polygons to rounding, notched ones and across the antimeridian too", () => {
    const random = mulberry32(7);
    const rings = Array.from({ length: 300 }, (): Position[] => {
      const [centre, middle] = [360 * random() - 180, 156 * random() - 78];
      const corners = 3 + Math.floor(9 * random());
      // A star about its centre: any turn and any reach for each corner, so that some sides fold inwards.
      return Array.from({ length: corners }, (_, k) => {
        const angle = (2 * Math.PI * (k + 0.8 * random())) / corners;
        const reach = 0.01 + 2 * random();
        const longitude = centre + (reach * Math.cos(angle)) / Math.cos((middle * Math.PI) / 180);
        return [((longitude + 540) % 360) - 180, middle + reach * Math.sin(angle)];
      });
    });
    const answer = askReference(python, { ask: "polygons", rings });
    const measured = rings.map(measureBox);
    const areas = measured.map(({ areaKm2 }) => areaKm2 * 1e6);
    expect(worst(areas, answer.list("area"), 1e6)).toBeLessThan(1e-12);
    const perimeters = measured.map(({ perimeterKm }) => perimeterKm * 1e3);
    expect(worst(perimeters, answer.list("perimeter"))).toBeLessThan(1e-12);
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
    expect(worst(distances, answer.list("distance"), 1)).toBeLessThan(1e-11);
    const lengths = drifts.map(({ east, north }) => Math.hypot(east, north));
    expect(worst(lengths, answer.list("distance"), 1)).toBeLessThan(1e-11);
    answer.list("bearing").forEach((bearing, k) => {
      const { east, north } = drifts[k];
      const expected = (Math.atan2(east, north) * 180) / Math.PI;
      const turn = (((bearing ?? NaN) - expected + 540) % 360) - 180;
      expect(Math.abs(turn)).toBeLessThan(1e-6);
    });
  });
});
