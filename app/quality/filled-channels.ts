import type { ChannelName } from "~/readers/reading";
import type { FilledSeries } from "./fill-gaps";
import { MISSING, NOT_EVALUATED, type Flags } from "./flags";

export type FilledChannels = ReadonlyMap<ChannelName, FilledSeries>;

/** Values of another channel at the times of this one; NaN where it has none. */
export function valuesAt(time: Float64Array, other: FilledSeries | undefined): Float64Array {
  const values = new Float64Array(time.length).fill(Number.NaN);
  if (!other) return values;
  let next = 0;
  time.forEach((seconds, k) => {
    while (next < other.time.length && other.time[next] < seconds) next++;
    if (other.time[next] === seconds) values[k] = other.values[next];
  });
  return values;
}

/** A value that was kept out of a test is not missing, it was not evaluated. */
export function onPresent(flags: Flags, values: Float64Array): Flags {
  return flags.map((flag, k) => (flag === MISSING && !Number.isNaN(values[k]) ? NOT_EVALUATED : flag));
}
