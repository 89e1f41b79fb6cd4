import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { uniformOrTiny as number } from "../../../tests/factories/uniform";
import { dragLaw } from "../stress/drag-law";
import { averagingFactor, convertAveraging } from "./averaging";
import { windComponents } from "./components";
import { directionTowards } from "./direction-to";
import { logLawWind10 } from "./log-law";
import { powerLawWind10 } from "./power-law";

describe("wind", () => {
  it("blows towards the opposite of where it comes from", () => {
    fc.assert(
      fc.property(number(0.01, 80), number(0, 359.999), (speed, from) => {
        const { u, v } = windComponents(speed, from);
        expect(Math.hypot(u, v)).toBeCloseTo(speed, 9);
        const towards = directionTowards(u, v) ?? Number.NaN;
        const difference = (towards - from - 180 + 720) % 360;
        expect(Math.min(difference, 360 - difference)).toBeLessThan(1e-9);
        expect(towards).toBeLessThan(360);
      }),
    );
    expect(directionTowards(0, 0)).toBeNull();
    expect(directionTowards(-1e-20, 1)).toBeLessThan(360);
  });

  it("stays as it is at 10 m, grows upwards from below and shrinks downwards from above", () => {
    fc.assert(
      fc.property(number(0, 60), number(0.2, 60), (speed, height) => {
        const wind10 = logLawWind10(speed, height, dragLaw("smith1980"));
        expect(Number.isFinite(wind10)).toBe(true);
        if (height < 10) expect(wind10).toBeGreaterThanOrEqual(speed);
        else expect(wind10).toBeLessThanOrEqual(speed);
      }),
    );
    expect(logLawWind10(17, 10, dragLaw("smith1980"))).toBe(17);
    expect(powerLawWind10(17, 10)).toEqual({ wind10: 17, warnings: [] });
    expect(powerLawWind10(17, 8).warnings).toEqual([]);
    expect(powerLawWind10(17, 3).warnings).toMatchObject([{ code: "OUT_OF_RANGE", threshold: 8 }]);
    expect(powerLawWind10(17, 12.5).warnings).toMatchObject([{ code: "OUT_OF_RANGE", threshold: 12 }]);
  });

  it("settles where a drag law jumps", () => {
    const wind10 = logLawWind10(10.2, 4, dragLaw("largePond1981"));
    expect(Math.abs(wind10 - 11)).toBeLessThan(0.3);
  });

  it("changes its averaging period there and back", () => {
    fc.assert(
      fc.property(number(1, 60), number(1, 36000), number(1, 36000), (speed, a, b) => {
        expect(convertAveraging(convertAveraging(speed, a, b), b, a)).toBeCloseTo(speed, 9);
      }),
    );
    // The two branches meet at an hour within 3e-4.
    expect(averagingFactor(3600)).toBeCloseTo(averagingFactor(3600.001), 3);
  });
});
