import type { ChannelName } from "~/readers/reading";
import { medianStep, type ChannelSeries } from "./channel-series";
import { CHANNELS } from "./channels";

/** What one record brings to a group of channels, and when it may count. */
export interface GroupSource {
  recordId: string;
  /** Seconds since 1970-01-01T00:00:00Z; null: from its first sample, to its last. */
  startsAt: number | null;
  endsAt: number | null;
  /** The first of them leads: where it has samples, the record covers the group. */
  channels: ChannelSeries[];
}

/** From when to when a record is the one in use, both included. */
export interface SourceStretch {
  recordId: string;
  startsAt: number;
  endsAt: number;
  /** Samples of the leading channel. */
  samples: number;
}

interface Interval {
  from: number;
  to: number;
}

/** Longer pauses than this many of a record's own steps are open to the record behind it. */
const STEPS_BRIDGED = 3;

/**
 * Joins records of the same quantity: each moment is told by the first record in order that covers it, and a later one
 * only fills what the earlier ones leave open, before, after, and in pauses of more than three of their steps.
 * @param sources in order of priority
 * @returns one series a channel, times ascending; and the stretches in order of time
 */
export function mergeSources(sources: readonly GroupSource[]): {
  channels: ChannelSeries[];
  stretches: SourceStretch[];
} {
  const parts: { recordId: string; channels: ChannelSeries[] }[] = [];
  let taken: Interval[] = [];
  for (const source of sources) {
    const inPeriod = source.channels.map((series) =>
      kept(series, (time) => time >= (source.startsAt ?? -Infinity) && time <= (source.endsAt ?? Infinity)),
    );
    const [leading] = inPeriod;
    if (!leading || leading.time.length === 0) continue;
    const free = (time: number) => !covers(taken, time);
    parts.push({ recordId: source.recordId, channels: inPeriod.map((series) => kept(series, free)) });
    taken = union(taken, coverageOf(leading));
  }
  const names = new Set(parts.flatMap(({ channels }) => channels.map(({ channel }) => channel)));
  return {
    channels: [...names].flatMap((channel) => joined(channel, parts)),
    stretches: stretchesOf(parts),
  };
}

function kept(series: ChannelSeries, holds: (time: number) => boolean): ChannelSeries {
  const indices: number[] = [];
  series.time.forEach((time, index) => {
    if (holds(time)) indices.push(index);
  });
  return {
    ...series,
    time: Float64Array.from(indices, (index) => series.time[index]),
    values: Float64Array.from(indices, (index) => series.values[index]),
  };
}

/** Where a record has something to say: samples no further apart than three steps, and for held values one step more. */
function coverageOf({ channel, time }: ChannelSeries): Interval[] {
  const step = medianStep(time) ?? 0;
  const after = CHANNELS[channel].between === "hold" ? step : 0;
  const intervals: Interval[] = [];
  for (const at of time) {
    const last = intervals.at(-1);
    // A held value ends where the next would have begun, which is no longer its own.
    if (last && at - last.to <= STEPS_BRIDGED * step) last.to = at;
    else intervals.push({ from: at, to: at });
  }
  return intervals.map(({ from, to }) => ({ from, to: after === 0 ? to : to + after - 1 }));
}

function covers(intervals: readonly Interval[], time: number): boolean {
  let [low, high] = [0, intervals.length];
  while (low < high) {
    const middle = (low + high) >> 1;
    if (intervals[middle].to < time) low = middle + 1;
    else high = middle;
  }
  return low < intervals.length && intervals[low].from <= time;
}

function union(a: readonly Interval[], b: readonly Interval[]): Interval[] {
  const all = [...a, ...b].map((interval) => ({ ...interval })).sort((x, y) => x.from - y.from);
  const merged: Interval[] = [];
  for (const interval of all) {
    const last = merged.at(-1);
    if (last && interval.from <= last.to) last.to = Math.max(last.to, interval.to);
    else merged.push(interval);
  }
  return merged;
}

function joined(channel: ChannelName, parts: readonly { channels: ChannelSeries[] }[]): ChannelSeries[] {
  const series = parts.flatMap(({ channels }) =>
    channels.filter((part) => part.channel === channel && part.time.length > 0),
  );
  if (series.length === 0) return [];
  const samples = series
    .flatMap(({ time, values }) => Array.from(time, (at, index) => ({ at, value: values[index] })))
    .sort((a, b) => a.at - b.at);
  return [
    {
      channel,
      unit: series[0].unit,
      time: Float64Array.from(samples, ({ at }) => at),
      values: Float64Array.from(samples, ({ value }) => value),
    },
  ];
}

function stretchesOf(parts: readonly { recordId: string; channels: ChannelSeries[] }[]): SourceStretch[] {
  const marks = parts
    .flatMap(({ recordId, channels }) => Array.from(channels[0].time, (at) => ({ at, recordId })))
    .sort((a, b) => a.at - b.at);
  const stretches: SourceStretch[] = [];
  for (const { at, recordId } of marks) {
    const last = stretches.at(-1);
    if (last?.recordId === recordId) {
      last.endsAt = at;
      last.samples += 1;
    } else stretches.push({ recordId, startsAt: at, endsAt: at, samples: 1 });
  }
  return stretches;
}
