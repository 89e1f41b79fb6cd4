import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { ChannelName } from "~/readers/reading";
import type { ChannelSeries } from "./channel-series";
import { mergeSources, type GroupSource } from "./merge-sources";

const HOUR = 3600;
const hours = (from: number, to: number, step = 1) =>
  Array.from({ length: Math.floor((to - from) / step) + 1 }, (_, k) => from + k * step);
const series = (at: number[], value: number, channel: ChannelName = "windSpeed"): ChannelSeries => ({
  channel,
  unit: "m/s",
  time: Float64Array.from(at, (hour) => hour * HOUR),
  values: new Float64Array(at.length).fill(value),
});
const source = (recordId: string, channels: ChannelSeries[], period: Partial<GroupSource> = {}): GroupSource => ({
  recordId,
  startsAt: null,
  endsAt: null,
  channels,
  ...period,
});
const inHours = (merged: ReturnType<typeof mergeSources>) =>
  merged.stretches.map(({ recordId, startsAt, endsAt }) => [recordId, startsAt / HOUR, endsAt / HOUR]);

describe("records joined by priority", () => {
  it("fill before, after and in a long pause of the first, and nowhere else", () => {
    const first = source("a", [series([...hours(10, 20), ...hours(40, 50)], 1)]);
    const second = source("b", [series(hours(0, 60), 2)]);
    const merged = mergeSources([first, second]);
    expect(inHours(merged)).toEqual([
      ["b", 0, 9],
      ["a", 10, 20],
      ["b", 21, 39],
      ["a", 40, 50],
      ["b", 51, 60],
    ]);
    expect(merged.channels[0].time.length).toBe(61);
  });

  it("leave a pause of up to three steps closed", () => {
    const first = source("a", [series([0, 1, 2, 5, 6, 7], 1)]);
    expect(inHours(mergeSources([first, source("b", [series(hours(0, 7), 2)])]))).toEqual([["a", 0, 7]]);
  });

  it("count only within their period", () => {
    const first = source("a", [series(hours(0, 30), 1)], { startsAt: 10 * HOUR, endsAt: 20 * HOUR });
    const second = source("b", [series(hours(0, 30), 2)], { endsAt: 25 * HOUR });
    expect(inHours(mergeSources([first, second]))).toEqual([
      ["b", 0, 9],
      ["a", 10, 20],
      ["b", 21, 25],
    ]);
  });

  it("bring a wind's direction and gust with its speed, never one instrument's speed with another's direction", () => {
    const first = source("a", [series(hours(0, 5), 1), series(hours(0, 5), 90, "windFrom")]);
    const second = source("b", [series(hours(0, 10), 2), series(hours(0, 10), 180, "windFrom")]);
    const [speed, from] = mergeSources([first, second]).channels;
    expect(Array.from(from.values)).toEqual(Array.from(speed.values, (value) => value * 90));
  });

  it("let a held rate of the first run to the end of its step", () => {
    const first = source("a", [series(hours(0, 3), 1, "rain")]);
    const second = source("b", [series(hours(0, 6, 0.5), 2, "rain")]);
    expect(inHours(mergeSources([first, second]))).toEqual([
      ["a", 0, 3],
      ["b", 4, 6],
    ]);
  });

  it("give each moment once, in order, from the first record that has it, whatever the records", () => {
    const record = fc.uniqueArray(fc.nat(200), { minLength: 1, maxLength: 60 }).map((at) => at.sort((a, b) => a - b));
    fc.assert(
      fc.property(fc.array(record, { minLength: 1, maxLength: 4 }), (records) => {
        const merged = mergeSources(records.map((at, index) => source(String(index), [series(at, index)])));
        const { time, values } = merged.channels[0];
        for (let k = 1; k < time.length; k++) expect(time[k]).toBeGreaterThan(time[k - 1]);
        // All of the first record is there, unchanged.
        const own = new Map(Array.from(time, (at, k) => [at / HOUR, values[k]]));
        expect(records[0].every((at) => own.get(at) === 0)).toBe(true);
        expect(merged.stretches.reduce((sum, { samples }) => sum + samples, 0)).toBe(time.length);
      }),
    );
  });
});
