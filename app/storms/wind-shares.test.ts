import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { ChannelName } from "~/readers/reading";
import type { ChannelSeries } from "./channel-series";
import { windShares } from "./wind-shares";

const HOUR = 3600;
const CLASSES = [0, 5, 10];

function hourly(channel: ChannelName, values: number[], hours = values.map((_, hour) => hour)): ChannelSeries {
  return {
    channel,
    unit: "",
    time: Float64Array.from(hours, (hour) => hour * HOUR),
    values: Float64Array.from(values),
  };
}

describe("how long the wind blew, from where and how hard", () => {
  const window = { startsAt: 0, endsAt: 4 * HOUR };

  it("counts each sample for the time it stands for, half of it at an end of the window", () => {
    const shares = windShares(
      [hourly("windSpeed", [4, 6, 12, 11, 0.2]), hourly("windFrom", [0, 11, 12, 348.7, 90])],
      window,
      CLASSES,
    );
    expect(shares?.total).toBe(4 * HOUR);
    expect(shares?.calm).toBe(HOUR / 2);
    // 11° is nearer to north than to north-north-east, 12° is not; 348.7° belongs to north-north-west.
    expect(shares?.sectors[0]).toEqual([HOUR / 2, HOUR, 0]);
    expect(shares?.sectors[1]).toEqual([0, 0, HOUR]);
    expect(shares?.sectors[15]).toEqual([0, 0, HOUR]);
  });

  it("says for each threshold how long the wind was as strong, and for how long on end", () => {
    const speed = hourly("windSpeed", [10, 10, 3, 12, 5]);
    expect(windShares([speed], window, CLASSES)?.exceedance).toEqual([
      { threshold: 5, time: 3 * HOUR, longest: 1.5 * HOUR },
      { threshold: 10, time: 2.5 * HOUR, longest: 1.5 * HOUR },
    ]);
  });

  it("breaks a spell at a gap, and lets nobody stand for its middle", () => {
    const speed = hourly("windSpeed", [8, 8, 8, 8, 8], [0, 1, 2, 10, 11]);
    const shares = windShares([speed], { startsAt: 0, endsAt: 11 * HOUR }, CLASSES);
    expect(shares?.total).toBe(4 * HOUR);
    expect(shares?.exceedance[0]).toEqual({ threshold: 5, time: 4 * HOUR, longest: 2.5 * HOUR });
  });

  it("sets wind without a direction apart", () => {
    const shares = windShares(
      [hourly("windSpeed", [6, 6, 6]), hourly("windFrom", [90, 90], [0, 2])],
      { startsAt: 0, endsAt: 2 * HOUR },
      CLASSES,
    );
    expect(shares?.directionless).toBe(HOUR);
    expect(shares?.sectors[4]).toEqual([0, HOUR, 0]);
  });

  it("has nothing to say without wind in the window", () => {
    expect(windShares([hourly("rain", [1, 2])], window, CLASSES)).toBeNull();
    expect(windShares([hourly("windSpeed", [5], [9])], window, CLASSES)).toBeNull();
  });

  it("loses no time: calm, without direction and the sectors make the whole", () => {
    const sample = fc.record({
      pause: fc.integer({ min: 60, max: 40_000 }),
      speed: fc.double({ min: 0, max: 70, noNaN: true }),
      from: fc.option(fc.double({ min: 0, max: 360, noNaN: true })),
    });
    fc.assert(
      fc.property(fc.array(sample, { minLength: 1, maxLength: 60 }), (samples) => {
        let at = 0;
        const timed = samples.map((one) => ({ ...one, at: (at += one.pause) }));
        const directed = timed.filter(({ from }) => from !== null);
        const shares = windShares(
          [
            hourly(
              "windSpeed",
              timed.map(({ speed }) => speed),
              timed.map((one) => one.at / HOUR),
            ),
            hourly(
              "windFrom",
              directed.map(({ from }) => from!),
              directed.map((one) => one.at / HOUR),
            ),
          ],
          { startsAt: 0, endsAt: at + HOUR },
          CLASSES,
        )!;
        const inSectors = shares.sectors.flat().reduce((sum, time) => sum + time, 0);
        expect(inSectors + shares.calm + shares.directionless).toBeCloseTo(shares.total, 3);
        expect(shares.total).toBeLessThanOrEqual(at + HOUR);
        for (const { time, longest } of shares.exceedance) expect(longest).toBeLessThanOrEqual(time + 1e-6);
      }),
    );
  });
});
