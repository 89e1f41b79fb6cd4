import { describe, expect, it } from "vitest";
import { fitWindow, proposeWindow, readWallClock, wallClock, windowProblems, withinWindow } from "./storm-window";
import { windowCautions } from "./window-cautions";
import type { ChannelSeries } from "./channel-series";

const HOUR = 3600;
const DAY = 24 * HOUR;
const START = Date.UTC(2026, 10, 1) / 1000;

function hourly(channel: "windSpeed" | "rain", hours: number, peakAt: number): ChannelSeries {
  return {
    channel,
    unit: channel === "rain" ? "mm/h" : "m/s",
    time: Float64Array.from({ length: hours }, (_, hour) => START + hour * HOUR),
    values: Float64Array.from({ length: hours }, (_, hour) => 20 - Math.abs(hour - peakAt) * 0.01),
  };
}

describe("the window proposed for a record", () => {
  it("is the whole record up to 15 days", () => {
    expect(proposeWindow([hourly("windSpeed", 121, 60)])).toEqual({ startsAt: START, endsAt: START + 120 * HOUR });
  });

  it("runs from 3 days before the strongest wind to 2 days after it in a longer record", () => {
    const peak = 1000;
    expect(proposeWindow([hourly("windSpeed", 3000, peak)])).toEqual({
      startsAt: START + peak * HOUR - 3 * DAY,
      endsAt: START + peak * HOUR + 2 * DAY,
    });
  });

  it("is cut where the record begins or ends", () => {
    expect(proposeWindow([hourly("windSpeed", 3000, 10)])).toEqual({
      startsAt: START,
      endsAt: START + 10 * HOUR + 2 * DAY,
    });
  });

  it("follows the heaviest rain where there is no wind", () => {
    expect(proposeWindow([hourly("rain", 3000, 1500)])?.startsAt).toBe(START + 1500 * HOUR - 3 * DAY);
  });

  it("is none without a sample", () => {
    expect(proposeWindow([])).toBeNull();
  });
});

describe("a window against its data", () => {
  const limits = { startsAt: START, endsAt: START + DAY };

  it("must end after it starts", () => {
    expect(windowProblems({ startsAt: START, endsAt: START }, limits, "UTC")).toEqual([
      { field: "endsAt", message: "The end must come after the start." },
    ]);
  });

  it("must lie within the wind record, told in the project's zone", () => {
    const problems = windowProblems({ startsAt: START - HOUR, endsAt: START + 2 * DAY }, limits, "America/Recife");
    expect(problems.map(({ field }) => field)).toEqual(["startsAt", "endsAt"]);
    expect(problems[0].message).toContain("2026-10-31 21:00 America/Recife");
    expect(problems[1].message).toContain("2026-11-01 21:00 America/Recife");
  });

  it("is cut to what is left of the data, or lost with it", () => {
    expect(fitWindow({ startsAt: START - DAY, endsAt: START + HOUR }, limits)).toEqual({
      startsAt: START,
      endsAt: START + HOUR,
    });
    expect(fitWindow({ startsAt: START + 3 * DAY, endsAt: START + 4 * DAY }, limits)).toBeNull();
  });

  it("trap 21: is told where it cuts off spin-up or what follows the strongest wind", () => {
    const window = { startsAt: START, endsAt: START + 3 * DAY };
    expect(windowCautions(window, START + DAY)).toEqual([]);
    expect(windowCautions(window, START + 5 * HOUR)[0]).toContain("begins 5\u00a0h before its strongest wind");
    expect(windowCautions(window, START + 3 * DAY - 2 * HOUR)[0]).toContain("ends 2\u00a0h after its strongest wind");
  });

  it("takes the samples at both of its ends", () => {
    const { time } = withinWindow(hourly("windSpeed", 48, 0), { startsAt: START + HOUR, endsAt: START + 3 * HOUR });
    expect(Array.from(time, (seconds) => (seconds - START) / HOUR)).toEqual([1, 2, 3]);
  });
});

describe("wall-clock times", () => {
  it("go through a zone and back", () => {
    const read = readWallClock("2026-07-04 09:30", "Europe/Dublin");
    expect(read).toEqual({ seconds: Date.UTC(2026, 6, 4, 8, 30) / 1000 });
    expect("seconds" in read && wallClock(read.seconds, "Europe/Dublin")).toBe("2026-07-04 09:30");
  });

  it("are refused where the change of clocks repeats the hour (trap 14)", () => {
    expect(readWallClock("2026-10-25 01:30", "Europe/Dublin")).toEqual({
      problem: expect.stringContaining("clocks change"),
    });
  });

  it("are refused where the change of clocks leaves the hour out (trap 14)", () => {
    expect(readWallClock("2026-03-29 01:30", "Europe/Dublin")).toEqual({
      problem: expect.stringContaining("clocks change"),
    });
  });

  it.each(["", "yesterday", "2026-13-01 00:00", "04/11/2026 20:00"])("are refused for %j, with an example", (text) => {
    expect(readWallClock(text, "UTC")).toEqual({ problem: expect.stringContaining("2026-11-04 20:00") });
  });
});
