import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { uniform } from "../../../tests/factories/uniform";
import { cycloneSurfaceWind } from "./surface-wind";
import { cycloneRain } from "./rain-climatology";
import { CYCLONE_PROFILES, DEFAULT_TRACK_PARAMETERS, type TrackParameters } from "./track-parameters";
import { fromCentre, trackReader, type CycloneFix } from "./track-state";
import { trackWind } from "./track-wind";

const HOUR = 3600;
const KNOT = 1852 / 3600;
const fix = (hour: number, latitude: number, longitude: number, told: Partial<CycloneFix> = {}): CycloneFix => ({
  time: hour * HOUR,
  latitude,
  longitude,
  maxWind: 50,
  centralPressure: 950,
  radiusOfMaximumWind: 40_000,
  ambientPressure: 1010,
  ...told,
});
const still = (latitude: number) => [fix(0, latitude, 150), fix(24, latitude, 150)];
const parameters = (given: Partial<TrackParameters> = {}): TrackParameters => ({
  ...DEFAULT_TRACK_PARAMETERS,
  ...given,
});
const speedAt = (fixes: CycloneFix[], given: TrackParameters, latitude: number, longitude: number, hour = 6) => {
  const { u, v } = trackWind(fixes, given, { latitude, longitude }, [hour * HOUR]);
  return Math.hypot(u[0], v[0]);
};
const profile = fc.constantFrom(...CYCLONE_PROFILES);

describe("wind of a track", () => {
  it("is that of the single cyclone's formulas, on a straight way (independent computation)", () => {
    const fixes = [fix(0, -18, 150), fix(12, -18, 149)];
    const given = parameters({ B: 1.4 });
    const state = trackReader(fixes)(6 * HOUR);
    const place = { latitude: -18.3, longitude: 149.2 };
    const { dx, dy } = fromCentre(state, place);
    const expected = cycloneSurfaceWind(
      {
        centralPressure: 95_000,
        ambientPressure: 101_000,
        radiusOfMaximumWind: 40_000,
        B: 1.4,
        latitude: -18,
        airDensity: 1.15,
      },
      { translationSpeed: state.translationSpeed, translationTo: state.translationTo, reduction: 0.9 },
      dx,
      dy,
    );
    const { u, v, rain } = trackWind(fixes, given, place, [6 * HOUR]);
    expect(u[0]).toBeCloseTo(expected.u, 9);
    expect(v[0]).toBeCloseTo(expected.v, 9);
    expect(rain?.[0]).toBeCloseTo(cycloneRain(Math.hypot(dx, dy) / 1000, 50 / KNOT), 9);
  });

  it("of a storm that stays is the same all round at one distance", () => {
    fc.assert(
      fc.property(profile, uniform(-40, 40), uniform(0.05, 4), uniform(0, 360), (id, latitude, degrees, bearing) => {
        const fixes = still(latitude);
        const east = trackWind(fixes, parameters({ profile: id }), aside(latitude, degrees, 90), [0]);
        const other = trackWind(fixes, parameters({ profile: id }), aside(latitude, degrees, bearing), [0]);
        expect(other.distance[0]).toBeCloseTo(east.distance[0], 3);
        expect(Math.hypot(other.u[0], other.v[0])).toBeCloseTo(Math.hypot(east.u[0], east.v[0]), 6);
        expect(other.pressure[0]).toBeCloseTo(east.pressure[0], 6);
      }),
    );
  });

  it("is mirrored on the other hemisphere", () => {
    fc.assert(
      fc.property(profile, uniform(3, 40), uniform(-3, 3), uniform(-3, 3), uniform(-2, 2), (id, at, dx, dy, way) => {
        const mirror = (side: 1 | -1) =>
          trackWind(
            [fix(0, side * at, 150), fix(24, side * (at + way), 151)],
            parameters({ profile: id }),
            { latitude: side * (at + dy), longitude: 150 + dx },
            [6 * HOUR],
          );
        const [north, south] = [mirror(1), mirror(-1)];
        expect(south.u[0]).toBeCloseTo(north.u[0], 6);
        expect(south.v[0]).toBeCloseTo(-north.v[0], 6);
        expect(south.rain?.[0]).toBeCloseTo(north.rain?.[0] ?? Number.NaN, 9);
      }),
    );
  });

  it("is strongest to the right of the way in the north, to the left in the south", () => {
    for (const [latitude, stronger, weaker] of [
      [20, 150.4, 149.6],
      [-20, 149.6, 150.4],
    ]) {
      const northward = [fix(0, latitude, 150), fix(12, latitude + 2, 150)];
      const middle = latitude + 1;
      expect(speedAt(northward, parameters(), middle, stronger)).toBeGreaterThan(
        speedAt(northward, parameters(), middle, weaker) + 3,
      );
    }
  });

  it("keeps the track's strength: the strongest 10-minute wind is 0.93 of the 1-minute one, within 4 % (Holland's B)", () => {
    const fixes = still(15);
    const strongest = Math.max(
      ...Array.from({ length: 60 }, (_, k) => speedAt(fixes, parameters(), 15, 150 + 0.02 + k * 0.01)),
    );
    expect(strongest / (0.93 * 50)).toBeGreaterThan(0.96);
    expect(strongest / (0.93 * 50)).toBeLessThan(1.001);
  });

  it("goes on across 180°, without a jump", () => {
    const fixes = [fix(0, -18, 179.5), fix(12, -18, -179.5)];
    const middle = trackReader(fixes)(6 * HOUR);
    expect(middle.longitude).toBeCloseTo(180, 9);
    expect(middle.translationTo).toBeCloseTo(90, 0);
    expect(middle.translationSpeed).toBeCloseTo(105_700 / (12 * HOUR), 1);
    expect(fromCentre(middle, { latitude: -18, longitude: -179.9 }).dx).toBeCloseTo(10_575, -2);
  });

  it("is calm at the centre of a storm that stays, and where the pressure is not low", () => {
    expect(speedAt(still(15), parameters(), 15, 150)).toBe(0);
    const weak = still(15).map((entry) => ({ ...entry, centralPressure: 1012 }));
    expect(speedAt(weak, parameters(), 15.3, 150)).toBe(0);
  });

  it("does without a maximum wind, or with B without a pressure; without both it is refused", () => {
    const windless = still(15).map((entry) => ({ ...entry, maxWind: null }));
    expect(speedAt(windless, parameters(), 15.36, 150)).toBeGreaterThan(20);
    const unpressed = still(15).map((entry) => ({ ...entry, centralPressure: null }));
    expect(speedAt(unpressed, parameters({ B: 1.4 }), 15.36, 150)).toBeGreaterThan(40);
    expect(() => speedAt(unpressed, parameters(), 15.36, 150)).toThrow(/No fix has a central pressure/);
    expect(() => speedAt([fix(0, 15, 150)], parameters(), 15, 150)).toThrow(/at least two fixes/);
    expect(() => speedAt([fix(6, 15, 150), fix(6, 16, 150)], parameters(), 15, 150)).toThrow(/fix 2 does not/);
  });
});

/** A place at a number of degrees of the great circle from 150° E. */
function aside(latitude: number, degrees: number, bearing: number): { latitude: number; longitude: number } {
  const [lat, arc, to] = [latitude, degrees, bearing].map((angle) => (angle * Math.PI) / 180);
  const reached = Math.asin(Math.sin(lat) * Math.cos(arc) + Math.cos(lat) * Math.sin(arc) * Math.cos(to));
  const turn = Math.atan2(
    Math.sin(to) * Math.sin(arc) * Math.cos(lat),
    Math.cos(arc) - Math.sin(lat) * Math.sin(reached),
  );
  return { latitude: (reached * 180) / Math.PI, longitude: 150 + (turn * 180) / Math.PI };
}
