import { describe, expect, it } from "vitest";
import { graticule } from "./graticule";

describe("graticule", () => {
  it("takes the finest round step that leaves about six lines", () => {
    const { meridians, parallels } = graticule({ west: -9, east: -7, south: 53.6, north: 55 });
    expect(meridians.map(({ label }) => label)).toEqual([
      "9° W",
      "8° 40′ W",
      "8° 20′ W",
      "8° W",
      "7° 40′ W",
      "7° 20′ W",
      "7° W",
    ]);
    expect(parallels.map(({ label }) => label)).toEqual(["53° 40′ N", "54° N", "54° 20′ N", "54° 40′ N", "55° N"]);
  });

  it("goes on over the antimeridian", () => {
    const { meridians } = graticule({ west: 178, east: 182, south: -18, north: -15 });
    expect(meridians.map(({ at }) => at)).toEqual([178, 179, 180, 181, 182]);
    expect(meridians.map(({ label }) => label)).toEqual(["178° E", "179° E", "180°", "179° W", "178° W"]);
  });

  it("writes neither letter on the equator and the prime meridian", () => {
    const { meridians, parallels } = graticule({ west: -1, east: 1, south: -1, north: 1 });
    expect(meridians.find(({ at }) => at === 0)?.label).toBe("0°");
    expect(parallels.find(({ at }) => at === 0)?.label).toBe("0°");
  });

  it("has lines for the whole world and for a harbour", () => {
    expect(graticule({ west: -180, east: 180, south: -85, north: 85 }).meridians).toHaveLength(13);
    expect(graticule({ west: 8, east: 8.02, south: 54, north: 54.02 }).meridians.map(({ label }) => label)).toEqual([
      "8° E",
      "8° 01′ E",
    ]);
  });
});
