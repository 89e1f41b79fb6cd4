import { exactSum } from "../series-statistics";
import { CAST_CHANNELS, type CastChannel, type CastChannelReading } from "./cast-reading";

/** Counts and extremes of a channel over all records of a cast, in its own unit. */
export function castStatistics(channel: CastChannel, values: Float64Array, from: string): CastChannelReading {
  const present = values.filter((value) => !Number.isNaN(value));
  const some = present.length > 0;
  return {
    unit: CAST_CHANNELS[channel],
    values,
    count: present.length,
    missing: values.length - present.length,
    mean: some ? exactSum(present) / present.length : null,
    min: some ? present.reduce((least, value) => Math.min(least, value), Infinity) : null,
    max: some ? present.reduce((most, value) => Math.max(most, value), -Infinity) : null,
    from,
  };
}
