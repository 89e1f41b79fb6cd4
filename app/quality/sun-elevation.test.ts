import { describe, expect, it } from "vitest";
import { sunElevation } from "./sun-elevation";

const at = (iso: string) => Date.parse(iso) / 1000;
/** Highest the sun gets on a day at a place. */
const noon = (day: string, place: [number, number]) =>
  Math.max(...Array.from({ length: 1440 }, (_, minute) => sunElevation(at(`${day}T00:00:00Z`) + minute * 60, place)));

// Geometry: at noon the sun stands at 90° less the distance between latitude and declination. Declinations of the
// solstices (the obliquity of the ecliptic, 23.436° in 2026) and equinoxes: by definition.
describe("the sun's elevation", () => {
  it.each([
    ["2026-06-21", 40, 90 - 40 + 23.436],
    ["2026-12-21", 40, 90 - 40 - 23.436],
    ["2026-12-21", -33, 90 - 33 + 23.436],
    ["2026-06-21", 80, 90 - 80 + 23.436],
  ])("at noon of %s in %d°", (day, latitude, expected) => {
    expect(noon(day, [15, latitude])).toBeCloseTo(expected, 1);
  });

  it("is on the horizon at six o'clock of mean sun on the equinox, but for the equation of time", () => {
    // March equinox 2026: 20 March, 14:46 UTC; the equation of time is then about -7.4 minutes (1.9°), from memory.
    expect(Math.abs(sunElevation(at("2026-03-20T06:07:30Z"), [0, 0]))).toBeLessThan(0.3);
  });

  it("turns with the earth: 15° of longitude are an hour", () => {
    const here = sunElevation(at("2026-09-01T10:00:00Z"), [0, 20]);
    expect(sunElevation(at("2026-09-01T09:00:00Z"), [15, 20])).toBeCloseTo(here, 1);
  });
});
