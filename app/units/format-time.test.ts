import fc from "fast-check";
import { Temporal } from "temporal-polyfill";
import { describe, expect, it } from "vitest";
import { epochSeconds, formatDate, formatPeriod, formatTime, zoneClock } from "./format-time";

describe("formatTime", () => {
  it("names the zone", () => {
    expect(formatTime("2026-11-04T20:00:00Z", "UTC")).toBe("2026-11-04 20:00 UTC");
    expect(formatTime("2026-11-04T20:00:00Z", "Asia/Kolkata")).toBe("2026-11-05 01:30 Asia/Kolkata");
    expect(formatTime(0, "America/Lima")).toBe("1969-12-31 19:00 America/Lima");
    expect(formatTime("2026-11-04T20:00:00Z", "+05:30")).toBe("2026-11-05 01:30 +05:30");
  });

  it("follows summer time", () => {
    expect(formatTime("2026-10-25T00:30:00Z", "Europe/Dublin")).toBe("2026-10-25 01:30 Europe/Dublin");
    expect(formatTime("2026-10-25T01:30:00Z", "Europe/Dublin")).toBe("2026-10-25 01:30 Europe/Dublin");
    expect(formatTime("2026-10-25T02:30:00Z", "Europe/Dublin")).toBe("2026-10-25 02:30 Europe/Dublin");
  });

  it("rounds to the minute rather than cutting", () => {
    expect(formatTime("2026-11-04T19:59:45Z", "UTC")).toBe("2026-11-04 20:00 UTC");
  });

  it("says so when there is no time", () => {
    expect(formatTime(null, "UTC")).toBe("no time");
    expect(formatTime("soon", "UTC")).toBe("no time");
    expect(formatTime(1e18, "UTC")).toBe("no time");
    expect(formatDate(undefined, "UTC")).toBe("no date");
  });

  it("refuses a zone that does not exist", () => {
    expect(() => formatTime(0, "Mars/Olympus")).toThrow(RangeError);
  });

  it("gives days and periods", () => {
    expect(formatDate("2026-11-04T20:00:00Z", "Asia/Kolkata")).toBe("2026-11-05 Asia/Kolkata");
    expect(formatPeriod("2026-11-03T00:00:00Z", "2026-11-08T00:00:00Z", "UTC")).toBe(
      "2026-11-03 00:00 to 2026-11-08 00:00 UTC",
    );
  });
});

describe("zoneClock", () => {
  it("writes ISO times that stand by themselves", () => {
    const seconds = epochSeconds("2026-10-25T01:30:00Z");
    expect(zoneClock("UTC").iso(seconds)).toBe("2026-10-25T01:30:00Z");
    expect(zoneClock("Europe/Berlin").iso(seconds)).toBe("2026-10-25T02:30:00+01:00");
    expect(zoneClock("Europe/Berlin").iso(seconds - 3600)).toBe("2026-10-25T02:30:00+02:00");
  });

  it("agrees with the calendar at any moment of any zone, in any order", () => {
    const zones = ["UTC", "Europe/Dublin", "America/St_Johns", "Asia/Kathmandu", "Australia/Lord_Howe", "+05:30"];
    fc.assert(
      fc.property(fc.constantFrom(...zones), fc.array(fc.integer({ min: 0, max: 2.5e9 })), (zone, moments) => {
        const clock = zoneClock(zone);
        for (const seconds of moments) {
          const calendar = Temporal.Instant.fromEpochMilliseconds(seconds * 1000).toZonedDateTimeISO(zone);
          expect(clock.iso(seconds).slice(0, 19)).toBe(calendar.toPlainDateTime().toString({ smallestUnit: "second" }));
          expect(epochSeconds(clock.iso(seconds))).toBe(seconds);
        }
      }),
    );
  });

  it("changes its offset at the very second (Europe/Dublin, 2026-10-25 01:00 UTC)", () => {
    const change = epochSeconds("2026-10-25T01:00:00Z");
    const clock = zoneClock("Europe/Dublin");
    for (const seconds of [change - 1, change, change - 1, change + 1]) {
      expect(clock.iso(seconds).endsWith(seconds < change ? "+01:00" : "+00:00")).toBe(true);
    }
  });

  it("finds local midnights across a change of the clock", () => {
    const ticks = zoneClock("Europe/Berlin").multiples(
      epochSeconds("2026-10-23T23:00:00Z"),
      epochSeconds("2026-10-27T00:00:00Z"),
      24,
    );
    expect(ticks.map((tick) => new Date(tick.seconds * 1000).toISOString())).toEqual([
      "2026-10-24T22:00:00.000Z",
      "2026-10-25T23:00:00.000Z",
      "2026-10-26T23:00:00.000Z",
    ]);
  });

  it("finds full hours in a zone off by three quarters", () => {
    const from = epochSeconds("2026-11-04T00:00:00Z");
    const ticks = zoneClock("Asia/Kathmandu").multiples(from, from + 86_400, 12);
    expect(ticks.map((tick) => [tick.day, tick.hour])).toEqual([
      [4, 12],
      [5, 0],
    ]);
    expect(ticks[0]?.seconds).toBe(epochSeconds("2026-11-04T06:15:00Z"));
  });
});
