import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { ChannelName } from "~/readers/reading";
import type { ChannelSeries } from "./channel-series";
import { onCommonAxis } from "./common-axis";

function series(channel: ChannelName, time: number[], values: number[]): ChannelSeries {
  return { channel, unit: "", time: Float64Array.from(time), values: Float64Array.from(values) };
}

describe("channels on one axis", () => {
  it("keeps every channel's own samples as they are", () => {
    const times = fc.uniqueArray(fc.integer({ min: 0, max: 200 }), { minLength: 1, maxLength: 40 });
    fc.assert(
      fc.property(times, times, (a, b) => {
        const sorted = [a, b].map((list) => [...list].sort((x, y) => x - y));
        const given = [
          series(
            "windSpeed",
            sorted[0],
            sorted[0].map((time) => time / 7),
          ),
          series(
            "rain",
            sorted[1],
            sorted[1].map((time) => time % 5),
          ),
        ];
        const { time, values } = onCommonAxis(given);
        given.forEach((channel, index) =>
          channel.time.forEach((at, sample) => {
            expect(values[index][time.indexOf(at)]).toBe(channel.values[sample]);
          }),
        );
      }),
    );
  });

  it("holds rain and interpolates wind between their samples", () => {
    const { time, values } = onCommonAxis([
      series("windSpeed", [0, 10, 20], [0, 10, 20]),
      series("rain", [5, 15], [4, 8]),
    ]);
    expect(Array.from(time)).toEqual([0, 5, 10, 15, 20]);
    expect(Array.from(values[0])).toEqual([0, 5, 10, 15, 20]);
    expect(Array.from(values[1])).toEqual([Number.NaN, 4, 4, 8, Number.NaN]);
  });

  it("turns a direction the shorter way round north (trap 8)", () => {
    const { values } = onCommonAxis([series("windFrom", [0, 10], [350, 10]), series("rain", [5], [0])]);
    expect(values[0][1]).toBe(0);
  });

  it("leaves a long pause open", () => {
    const { values } = onCommonAxis([
      series("windSpeed", [0, 1, 2, 50, 51], [1, 1, 1, 1, 1]),
      series("rain", [25], [0]),
    ]);
    expect(values[0][3]).toBeNaN();
  });
});
