import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { uniformOrTiny } from "../../tests/factories/uniform";
import { driftTrack } from "./drift-track";
import { geodesicDistance } from "./measure-box";
import { offsetPosition } from "./offset-position";

describe("offsetPosition", () => {
  it("moves a degree of longitude along the equator in 111 319.49 m (π a / 180, WGS 84)", () => {
    const [longitude, latitude] = offsetPosition(10, 0, 111_319.490793, 0);
    expect(longitude).toBeCloseTo(11, 9);
    expect(latitude).toBeCloseTo(0, 12);
  });

  it("stays put without a displacement", () => {
    expect(offsetPosition(10, 50, 0, 0)).toEqual([10, 50]);
  });

  it("continues across the antimeridian", () => {
    expect(offsetPosition(179.9, -17, 30_000, 0)[0]).toBeGreaterThan(180);
  });

  it("ends as far away as it was sent", () => {
    const metres = uniformOrTiny(-200_000, 200_000);
    fc.assert(
      fc.property(metres, metres, uniformOrTiny(-80, 80), (east, north, latitude) => {
        const end = offsetPosition(5, latitude, east, north);
        expect(geodesicDistance([5, latitude], end)).toBeCloseTo(Math.hypot(east, north), 5);
      }),
    );
  });
});

describe("driftTrack", () => {
  it("starts where it starts and marks full days, between records too", () => {
    const hours = [0, 10, 20, 30, 48];
    const track = driftTrack(
      "Pens",
      [8, 54],
      hours.map((h) => h * 3600),
      hours.map((h) => 100 * h),
      hours.map(() => 0),
    );
    expect(track.line[0]).toEqual([8, 54]);
    expect(track.line).toHaveLength(5);
    expect(track.dayMarks.map(({ label }) => label)).toEqual(["1 d", "2 d"]);
    expect(geodesicDistance([8, 54], track.dayMarks[0].position)).toBeCloseTo(2400, 3);
    expect(track.dayMarks[1].position).toEqual(track.line[4]);
  });

  it("has no marks below a day", () => {
    expect(driftTrack("short", [0, 0], [0, 3600], [0, 100], [0, 0]).dayMarks).toEqual([]);
  });
});
