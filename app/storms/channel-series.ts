import type { ChannelName, ChannelReading } from "~/readers/reading";

/** One channel of a storm: only samples that have a value; `time` in seconds since 1970-01-01T00:00:00Z, ascending. */
export interface ChannelSeries {
  channel: ChannelName;
  unit: string;
  time: Float64Array;
  values: Float64Array;
}

/** A channel of a reading without its missing samples; null where none is left. */
export function presentSamples(
  channel: ChannelName,
  reading: ChannelReading,
  time: Float64Array,
): ChannelSeries | null {
  const kept: number[] = [];
  reading.values.forEach((value, index) => {
    if (Number.isFinite(value)) kept.push(index);
  });
  if (kept.length === 0) return null;
  return {
    channel,
    unit: reading.unit,
    time: Float64Array.from(kept, (index) => time[index]),
    values: Float64Array.from(kept, (index) => reading.values[index]),
  };
}

/** The middle of the steps between times, in seconds; null for fewer than two. */
export function medianStep(time: ArrayLike<number>): number | null {
  if (time.length < 2) return null;
  const steps = Float64Array.from({ length: time.length - 1 }, (_, index) => time[index + 1] - time[index]).sort();
  return steps[Math.floor((steps.length - 1) / 2)];
}

/** Index of the first time that is not before `seconds`; the length where all are. */
export function firstNotBefore(time: ArrayLike<number>, seconds: number): number {
  let [low, high] = [0, time.length];
  while (low < high) {
    const middle = (low + high) >> 1;
    if (time[middle] < seconds) low = middle + 1;
    else high = middle;
  }
  return low;
}
