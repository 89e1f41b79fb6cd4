import { describe, expect, it } from "vitest";
import { epochSeconds, zoneClock } from "~/units/format-time";
import { timeTicks } from "./time-ticks";

const from = epochSeconds("2026-11-03T00:00:00Z");
const labels = (hours: number, width: number, zone = "UTC") =>
  timeTicks(from, from + hours * 3600, width, zoneClock(zone)).map((tick) => tick.label);

describe("timeTicks", () => {
  it("names days and hours by the room there is", () => {
    expect(labels(48, 300)).toEqual(["11-03", "12h", "11-04", "12h", "11-05"]);
    expect(labels(48, 150)).toEqual(["11-03", "11-04", "11-05"]);
    expect(labels(6, 320)).toEqual(["11-03", "01h", "02h", "03h", "04h", "05h", "06h"]);
    expect(labels(24 * 30, 280)).toEqual(["11-03", "11-08", "11-13", "11-18", "11-23", "11-28", "12-03"]);
  });

  it("names the date within a day without midnight", () => {
    const noon = from + 12 * 3600;
    const ticks = timeTicks(noon, noon + 3 * 3600, 200, zoneClock("UTC"));
    expect(ticks.map((tick) => tick.label)).toEqual(["11-03 12h", "13h", "14h", "15h"]);
  });

  it("follows the zone's wall clock, not UTC", () => {
    expect(labels(24, 100, "Asia/Kolkata")).toEqual(["12h", "11-04"]);
  });

  it("names months over years", () => {
    expect(labels(24 * 1000, 300)).toEqual(["2027-01", "2027-07", "2028-01", "2028-07", "2029-01", "2029-07"]);
  });

  it("never crowds the axis", () => {
    for (const hours of [1, 7, 30, 121, 500, 5000, 200_000]) {
      for (const width of [276, 576, 896]) {
        const ticks = labels(hours, width);
        expect(ticks.length, `${hours} h on ${width} px`).toBeLessThanOrEqual(Math.floor(width / 40) + 1);
      }
    }
  });
});
