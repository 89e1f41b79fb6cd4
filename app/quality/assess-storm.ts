/** All tests of a storm's series: a pure function of series and thresholds, made again whenever it is asked for. */
import type { ChannelName } from "~/readers/reading";
import type { ChannelSeries } from "~/storms/channel-series";
import { assessChannel, type TestResult } from "./assess-channel";
import { assessRelations } from "./assess-relations";
import { fillGaps, type FilledSeries, type Gap } from "./fill-gaps";
import { valuesAt, type FilledChannels } from "./filled-channels";
import { MISSING, NOT_EVALUATED, type Flags } from "./flags";
import { rollUp } from "./roll-up";
import type { Thresholds } from "./thresholds";

/** A channel with its flags, at its own times and those at which a sample is missing. */
export interface AssessedChannel {
  channel: ChannelName;
  unit: string;
  /** Seconds since 1970-01-01T00:00:00Z, ascending. */
  time: Float64Array;
  /** NaN where missing. */
  values: Float64Array;
  gaps: Gap[];
  /** s; null for fewer than two samples. */
  step: number | null;
  /** The tests that were made. */
  tests: TestResult[];
  /** Of all tests together. */
  flags: Flags;
}

export interface StormInput {
  series: readonly ChannelSeries[];
  thresholds: Thresholds;
  /** Channels that a person set to one value. */
  constants: ReadonlySet<ChannelName>;
  /** [longitude, latitude] of the study area in degrees; null where there is none yet. */
  place: readonly [number, number] | null;
}

/** @returns the channels in the order of `series` */
export function assessStorm({ series, thresholds, constants, place }: StormInput): AssessedChannel[] {
  const entries = series.map(({ channel, unit, ...samples }) => ({ channel, unit, own: fillGaps(samples) }));
  const filled: FilledChannels = new Map(entries.map(({ channel, own }) => [channel, own]));
  return entries.map(({ channel, unit, own }) => {
    const constant = constants.has(channel);
    const limits = thresholds.channels[channel];
    const tests = assessChannel({ channel, own, filled, limits, constant });
    if (!constant) tests.push(...assessRelations({ channel, own, filled, thresholds, place }));
    const results = tests.map(({ flags }) => flags);
    const natural = channel === "windFrom" ? calms(own, filled) : () => false;
    const flags = rollUp(results, own.values.length).map((flag, k) => {
      if (!Number.isNaN(own.values[k])) return flag;
      return natural(k) ? NOT_EVALUATED : MISSING;
    });
    return { channel, unit, ...own, tests, flags };
  });
}

/** A calm has no direction, so none is missing. */
function calms(own: FilledSeries, filled: FilledChannels): (k: number) => boolean {
  const speed = valuesAt(own.time, filled.get("windSpeed"));
  return (k) => speed[k] === 0;
}
