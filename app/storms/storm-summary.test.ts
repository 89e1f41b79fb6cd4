import { describe, expect, it } from "vitest";
import type { ChannelName } from "~/readers/reading";
import type { ChannelSeries } from "./channel-series";
import { summariseStorm } from "./storm-summary";

const HOUR = 3600;

function series(channel: ChannelName, hours: number[], values: number[]): ChannelSeries {
  return {
    channel,
    unit: "",
    time: Float64Array.from(hours, (hour) => hour * HOUR),
    values: Float64Array.from(values),
  };
}

describe("the summary of a storm", () => {
  const wind = series("windSpeed", [0, 1, 2, 3, 4], [3, 8, 31, 9, 40]);
  const from = series("windFrom", [0, 1, 2, 3, 4], [200, 210, 220, 230, 240]);

  it("knows the strongest wind inside the window only, and where it came from", () => {
    const { peakWind, peakWindFrom } = summariseStorm([wind, from], { startsAt: 0, endsAt: 3 * HOUR });
    expect(peakWind).toEqual({ value: 31, at: 2 * HOUR });
    expect(peakWindFrom).toBe(220);
  });

  it("tells no rain from no record of rain", () => {
    const window = { startsAt: 0, endsAt: 2 * HOUR };
    expect(summariseStorm([wind], window).rainTotal).toBeNull();
    expect(summariseStorm([wind, series("rain", [0, 1, 2], [0, 0, 0])], window).rainTotal).toBe(0);
  });

  it("lists pauses of more than 6 h, at the ends of the window too", () => {
    const sparse = series("windSpeed", [8, 9, 16, 17], [1, 1, 1, 1]);
    const { gaps } = summariseStorm([sparse], { startsAt: 0, endsAt: 20 * HOUR });
    expect(gaps.map(({ from: start, to }) => [start / HOUR, to / HOUR])).toEqual([
      [0, 8],
      [9, 16],
    ]);
  });

  it("lets a daily gauge pause for a day", () => {
    const daily = series("rain", [0, 24, 48, 72], [1, 2, 3, 4]);
    expect(summariseStorm([daily], { startsAt: 0, endsAt: 72 * HOUR }).gaps).toEqual([]);
  });
});
