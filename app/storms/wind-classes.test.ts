import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { DEFAULT_UNITS } from "~/units/unit-choices";
import { windClasses } from "./wind-classes";

const KNOT = 1852 / 3600;

describe("classes of wind speed", () => {
  it("are round in the unit they are read in", () => {
    expect(windClasses(24.3, DEFAULT_UNITS)).toEqual([0, 5, 10, 15, 20]);
    const knots = windClasses(24.3, { ...DEFAULT_UNITS, speed: "kn" });
    expect(knots.map((bound) => Math.round((bound / KNOT) * 1e6) / 1e6)).toEqual([0, 10, 20, 30, 40]);
  });

  it("begin at nothing, rise, and none begins beyond the peak", () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 120, noNaN: true }), (peak) => {
        const classes = windClasses(peak, DEFAULT_UNITS);
        expect(classes[0]).toBe(0);
        classes.slice(1).forEach((bound, index) => expect(bound).toBeGreaterThan(classes[index]));
        expect(classes.at(-1)).toBeLessThanOrEqual(peak);
        expect(classes.length).toBeLessThanOrEqual(13);
      }),
    );
  });
});
