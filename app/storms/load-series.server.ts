import type { Series } from "~/db/models/series.server";
import type { Tenant } from "~/db/scoped.server";
import { fromBlob, toBlob } from "~/db/typed-array.server";
import { CHANNEL_NAMES, type ChannelName } from "~/readers/reading";
import type { ChannelSeries } from "./channel-series";

/** A channel as it is stored, with the record it came from. */
export interface StormSeries extends ChannelSeries {
  recordId: string;
}

function decode({ channel, unit, recordId, length, time, values }: Series): StormSeries {
  return { channel, unit, recordId, time: fromBlob(time, length), values: fromBlob(values, length) };
}

/** The channels of a storm, in the order they are listed everywhere. */
export async function loadSeries(
  tenant: Tenant,
  stormId: string,
  channels: readonly ChannelName[] = CHANNEL_NAMES,
): Promise<StormSeries[]> {
  const rows = await tenant.series.list({ where: { stormId, channel: [...channels] } });
  return rows.map(decode).sort((a, b) => CHANNEL_NAMES.indexOf(a.channel) - CHANNEL_NAMES.indexOf(b.channel));
}

/** Stores one channel; inside a writing transaction, with the channel's former row already gone. */
export async function storeSeries(
  tenant: Tenant,
  owner: { stormId: string; recordId: string },
  { channel, unit, time, values }: ChannelSeries,
): Promise<void> {
  await tenant.series.create({
    ...owner,
    channel,
    unit,
    length: time.length,
    time: toBlob(time),
    values: toBlob(values),
  });
}
