import { medianStep, type ChannelSeries } from "./channel-series";
import { CHANNELS } from "./channels";

/** Channels at the same times; NaN where a channel has nothing to say. */
export interface CommonAxis {
  /** Seconds since 1970-01-01T00:00:00Z, ascending. */
  time: Float64Array;
  values: Float64Array[];
}

/** Longer pauses than this many of a channel's own steps stay open. */
const STEPS_BRIDGED = 3;

/** Every time of any channel once, ascending. */
export function unionOfTimes(series: readonly Pick<ChannelSeries, "time">[]): Float64Array {
  const all = Float64Array.from(series.flatMap(({ time }) => Array.from(time))).sort();
  return all.filter((seconds, index) => index === 0 || seconds !== all[index - 1]);
}

/**
 * Brings channels to the union of their times, so that they can be drawn above one axis: their own samples unchanged, between
 * them linear, held or turned the shorter way round as the channel asks. Pauses of more than three steps stay NaN.
 */
export function onCommonAxis(series: readonly ChannelSeries[]): CommonAxis {
  const time = unionOfTimes(series);
  return { time, values: series.map((entry) => resample(entry, time)) };
}

function resample({ channel, time, values }: ChannelSeries, at: Float64Array): Float64Array {
  const longest = (medianStep(time) ?? 0) * STEPS_BRIDGED;
  const between = CHANNELS[channel].between;
  const resampled = new Float64Array(at.length).fill(Number.NaN);
  let before = -1;
  at.forEach((seconds, index) => {
    while (before + 1 < time.length && time[before + 1] <= seconds) before += 1;
    if (before < 0) return;
    if (time[before] === seconds) {
      resampled[index] = values[before];
      return;
    }
    const after = before + 1;
    if (after >= time.length || time[after] - time[before] > longest) return;
    const share = (seconds - time[before]) / (time[after] - time[before]);
    resampled[index] = interpolate(values[before], values[after], share, between);
  });
  return resampled;
}

function interpolate(from: number, to: number, share: number, between: "linear" | "hold" | "turn"): number {
  switch (between) {
    case "hold":
      return from;
    case "linear":
      return from + (to - from) * share;
    case "turn": {
      const turn = ((to - from + 540) % 360) - 180;
      return (from + turn * share + 360) % 360;
    }
  }
}
