import type { ChannelName } from "~/readers/reading";

/** Samples of one channel: seconds since 1970-01-01T00:00:00Z, ascending, and a value for each. */
export interface Samples {
  time: ArrayLike<number>;
  values: ArrayLike<number>;
}

export type SampledChannels = Partial<Record<ChannelName, Samples>>;
