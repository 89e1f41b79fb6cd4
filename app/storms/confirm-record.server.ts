import type { StormRecord } from "~/db/models/record.server";
import type { Storm } from "~/db/models/storm.server";
import type { Tenant } from "~/db/scoped.server";
import { CHANNEL_NAMES, type SeriesReading } from "~/readers/reading";
import { presentSamples, type ChannelSeries } from "./channel-series";
import { channelsOf, groupLabel, groupOf, type ChannelGroup } from "./channels";
import { loadSeries, storeSeries } from "./load-series.server";
import { mayConfirm, openMatters } from "./open-matters";
import type { RecordProvenance } from "./provenance";
import { readRecord } from "./read-record.server";
import { StormRefusal } from "./refusal";
import { setWindow } from "./set-window.server";
import type { StormWindow } from "./storm-window";

/** What to do with a channel that the storm already has from another record. */
export type Choice = "replace" | "keep";

export interface Confirmation {
  window: StormWindow;
  choices: Partial<Record<ChannelGroup, Choice>>;
  confirmedBy: string;
  /** ISO UTC */
  confirmedAt: string;
  /** The project's, to say in it what is wrong with the window. */
  zone: string;
}

/** The channels of a reading that hold at least one value. */
export function channelsIn(reading: SeriesReading): ChannelSeries[] {
  return CHANNEL_NAMES.flatMap((channel) => {
    const read = reading.channels[channel];
    return (read && presentSamples(channel, read, reading.time)) ?? [];
  });
}

export function provenanceOf(
  reading: SeriesReading,
  stored: readonly ChannelSeries[],
  { confirmedBy, confirmedAt }: Pick<Confirmation, "confirmedBy" | "confirmedAt">,
): RecordProvenance {
  const hasWind = stored.some(({ channel }) => groupOf(channel) === "wind");
  return {
    formatLabel: reading.formatLabel,
    rows: reading.rows,
    first: reading.first ?? "",
    last: reading.last ?? "",
    zone: reading.zone,
    windHeight: hasWind ? reading.windHeight : null,
    averagingMinutes: hasWind ? reading.averagingMinutes : null,
    medianStepSeconds: reading.medianStepSeconds,
    understood: reading.understood,
    steps: reading.steps,
    dropped: reading.dropped,
    channels: stored.map(({ channel }) => {
      const { unit, count, missing, fromColumns } = reading.channels[channel]!;
      return { channel, unit, count, missing, fromColumns };
    }),
    confirmedBy,
    confirmedAt,
  };
}

/**
 * Turns a reading into series of its storm, all or nothing.
 * @throws StormRefusal while a question is open, a bad row is neither mended nor left out, or a choice is missing
 */
export async function confirmRecord(
  tenant: Tenant,
  storm: Storm,
  record: StormRecord,
  confirmation: Confirmation,
): Promise<void> {
  const reading = await readRecord(tenant, record);
  if (!reading) throw new StormRefusal("A constant has no reading sheet.");
  if (!mayConfirm(openMatters(reading))) {
    throw new StormRefusal("Questions are open: answer them on this sheet first. Nothing was taken over.");
  }
  await tenant.write(async (inner) => {
    const others = (await loadSeries(inner, storm.id)).filter(({ recordId }) => recordId !== record.id);
    const groups = new Set(others.map(({ channel }) => groupOf(channel)));
    const brought = channelsIn(reading);
    const undecided = [...new Set(brought.map(({ channel }) => groupOf(channel)))].filter(
      (group) => groups.has(group) && confirmation.choices[group] === undefined,
    );
    if (undecided.length > 0) {
      throw new StormRefusal(
        `The storm already has ${undecided.map(groupLabel).join(", ")} from another record. Choose for each which of the two to use.`,
        `choice-${undecided[0]}`,
      );
    }
    const wanted = brought.filter(({ channel }) => {
      const group = groupOf(channel);
      return !groups.has(group) || confirmation.choices[group] === "replace";
    });
    if (wanted.length === 0) {
      throw new StormRefusal("Nothing would be taken from this record: the storm keeps every channel it has.");
    }
    const replaced = new Set(wanted.map(({ channel }) => groupOf(channel)));
    await inner.series.remove({ stormId: storm.id, recordId: record.id });
    for (const group of replaced) await inner.series.remove({ stormId: storm.id, channel: channelsOf(group) });
    for (const series of wanted) await storeSeries(inner, { stormId: storm.id, recordId: record.id }, series);
    await inner.records.update(record.id, {
      state: "confirmed",
      provenance: provenanceOf(reading, wanted, confirmation),
    });
    const kept = others.filter(({ channel }) => !replaced.has(groupOf(channel)));
    await setWindow(inner, storm, [...kept, ...wanted], confirmation.window, confirmation.zone);
  });
}
