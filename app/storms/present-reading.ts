import { CHANNEL_NAMES, type ChannelName, type ChannelReading, type SeriesReading } from "~/readers/reading";

/** What a reading sheet shows: everything but the samples themselves. */
export type PresentedReading = Omit<SeriesReading, "time" | "channels"> & {
  channels: (Omit<ChannelReading, "values"> & { channel: ChannelName })[];
};

export function presentReading(reading: SeriesReading): PresentedReading {
  const { channels, ...facts } = reading;
  return {
    ...without(facts, "time"),
    channels: CHANNEL_NAMES.flatMap((channel) => {
      const read = channels[channel];
      return read ? [{ channel, ...without(read, "values") }] : [];
    }),
  };
}

function without<T extends object, Key extends keyof T & string>(given: T, key: Key): Omit<T, Key> {
  return Object.fromEntries(Object.entries(given).filter(([name]) => name !== key)) as Omit<T, Key>;
}
