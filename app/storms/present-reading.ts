import { CHANNEL_NAMES, type ChannelName, type ChannelReading, type SeriesReading } from "~/readers/reading";

/** What a reading sheet shows: everything but the samples themselves. */
export type PresentedReading = Omit<SeriesReading, "time" | "channels"> & {
  channels: (Omit<ChannelReading, "values"> & { channel: ChannelName })[];
};

export function presentReading(reading: SeriesReading): PresentedReading {
  const { time: _time, channels, ...rest } = reading;
  return {
    ...rest,
    channels: CHANNEL_NAMES.flatMap((channel) => {
      const read = channels[channel];
      if (!read) return [];
      const { values: _values, ...facts } = read;
      return [{ channel, ...facts }];
    }),
  };
}
