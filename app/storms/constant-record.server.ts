import type { Storm } from "~/db/models/storm.server";
import type { Tenant } from "~/db/scoped.server";
import { CHANNEL_UNITS } from "~/readers/reading";
import type { ChannelSeries } from "./channel-series";
import { channelsOf, groupLabel, groupOf } from "./channels";
import { constantLabel, type ConstantKind } from "./constant-kinds";
import { refuseInScenario } from "./copy-as-scenario.server";
import { loadSeries, storeSeries } from "./load-series.server";
import type { ConstantForcing, RecordProvenance } from "./provenance";
import { StormRefusal } from "./refusal";
import { windowOf, type StormWindow } from "./storm-window";

const HOUR = 3600;

/** A value a full hour from the start of the window to its end, so that no reader of the series takes it for a gap. */
export function constantSeries({ channel, value }: ConstantForcing, { startsAt, endsAt }: StormWindow): ChannelSeries {
  const full = Math.ceil((endsAt - startsAt) / HOUR);
  const time = Float64Array.from({ length: full + 1 }, (_, hour) => Math.min(startsAt + hour * HOUR, endsAt));
  return { channel, unit: CHANNEL_UNITS[channel], time, values: new Float64Array(time.length).fill(value) };
}

function provenanceOf(
  constant: ConstantForcing,
  series: ChannelSeries,
  label: string,
  confirmed: { by: string; at: string },
): RecordProvenance {
  const iso = (seconds: number) => new Date(seconds * 1000).toISOString();
  return {
    formatLabel: "constant over the storm's window",
    rows: series.time.length,
    first: iso(series.time[0]),
    last: iso(series.time[series.time.length - 1]),
    zone: "UTC",
    windHeight: null,
    averagingMinutes: null,
    medianStepSeconds: HOUR,
    understood: [{ what: groupLabel(groupOf(constant.channel)), taken: label, confidence: "answered" }],
    steps: [],
    dropped: [],
    channels: [
      { channel: constant.channel, unit: series.unit, count: series.time.length, missing: 0, fromColumns: [] },
    ],
    constant,
    confirmedBy: confirmed.by,
    confirmedAt: confirmed.at,
  };
}

export interface ConstantRequest {
  kind: ConstantKind;
  /** As typed, in the kind's unit. */
  value: number;
  /** Whether to take the place of a channel that is there. */
  replace: boolean;
  confirmedBy: string;
  /** ISO UTC */
  confirmedAt: string;
}

/**
 * A constant rain or heat over the storm's window, as a record like any other.
 * @throws StormRefusal where the storm has no window yet, or has the channel from another record
 */
export async function addConstant(tenant: Tenant, storm: Storm, request: ConstantRequest): Promise<void> {
  const { kind, value, replace, confirmedBy, confirmedAt } = request;
  const window = windowOf(storm);
  if (!window) throw new StormRefusal("The storm has no window yet: confirm a record with wind first.");
  const constant: ConstantForcing = {
    channel: kind.channel,
    value: value * kind.toSi,
    asWritten: { value, unit: kind.unit },
  };
  const series = constantSeries(constant, window);
  await tenant.write(async (inner) => {
    await refuseInScenario(inner, storm.id);
    const channel = channelsOf(groupOf(kind.channel));
    const [there] = await loadSeries(inner, storm.id, channel);
    if (there && !replace) {
      const holder = await inner.records.find(there.recordId);
      throw new StormRefusal(
        `The storm already has ${groupLabel(groupOf(kind.channel))} from ${holder?.name ?? "another record"}. Tick the box to use the constant in its place.`,
        "replace",
      );
    }
    await inner.series.remove({ stormId: storm.id, channel });
    const record = await inner.records.create({
      stormId: storm.id,
      sourceFileId: null,
      name: constantLabel(kind, value),
      origin: "constant",
      state: "confirmed",
      answers: {},
      provenance: provenanceOf(constant, series, constantLabel(kind, value), { by: confirmedBy, at: confirmedAt }),
      createdBy: confirmedBy,
    });
    await storeSeries(inner, { stormId: storm.id, recordId: record.id }, series);
  });
}

/** Stretches the constants of a storm over a new window; those that another record has replaced stay aside. */
export async function fillConstants(tenant: Tenant, stormId: string, window: StormWindow): Promise<void> {
  for (const record of await tenant.records.list({ where: { stormId, origin: "constant" } })) {
    const { provenance } = record;
    if (!provenance?.constant) continue;
    const removed = await tenant.series.remove({ stormId, recordId: record.id });
    if (removed === 0) continue;
    const series = constantSeries(provenance.constant, window);
    await storeSeries(tenant, { stormId, recordId: record.id }, series);
    const by = { by: provenance.confirmedBy, at: provenance.confirmedAt };
    const { steps, scenario } = provenance;
    await tenant.records.update(record.id, {
      provenance: {
        ...provenanceOf(provenance.constant, series, record.name, by),
        steps,
        ...(scenario && { scenario }),
      },
    });
  }
}
