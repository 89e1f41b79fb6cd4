import type { StormRecord } from "~/db/models/record.server";
import type { Storm } from "~/db/models/storm.server";
import type { Tenant } from "~/db/scoped.server";
import { channelsIn } from "./confirm-record.server";
import type { ChannelSeries } from "./channel-series";
import { groupOf } from "./channels";
import { constantSeries } from "./constant-record.server";
import { refuseInScenario } from "./copy-as-scenario.server";
import { loadSeries, storeSeries } from "./load-series.server";
import { dropIfUnused } from "./original.server";
import { readRecord } from "./read-record.server";
import { refitWindow } from "./set-window.server";
import { windowOf } from "./storm-window";

/**
 * Takes a record out of its storm, with its series and, where no other record uses it, its original. What it had replaced is
 * read again from the record that had it before.
 * @throws StormRefusal in a scenario
 */
export async function removeRecord(tenant: Tenant, storm: Storm, record: StormRecord): Promise<void> {
  await tenant.write(async (inner) => {
    await refuseInScenario(inner, storm.id);
    await inner.records.remove({ id: record.id });
    await bringBackReplaced(inner, storm);
    await refitWindow(inner, storm);
    await dropIfUnused(inner, [record.sourceFileId]);
  });
}

/** Takes a storm away with all its records, series and estimates. */
export async function removeStorm(tenant: Tenant, storm: Storm): Promise<void> {
  await tenant.write(async (inner) => {
    const records = await inner.records.list({ where: { stormId: storm.id } });
    await inner.storms.remove({ id: storm.id });
    await dropIfUnused(inner, [storm.trackFileId, ...records.map(({ sourceFileId }) => sourceFileId)]);
  });
}

async function bringBackReplaced(tenant: Tenant, storm: Storm): Promise<void> {
  const present = new Set((await loadSeries(tenant, storm.id)).map(({ channel }) => groupOf(channel)));
  const confirmed = await tenant.records.list({
    where: { stormId: storm.id, state: "confirmed" },
    order: [["updatedAt", "DESC"]],
  });
  for (const record of confirmed) {
    const once = new Set(record.provenance?.channels.map(({ channel }) => channel));
    const missing = [...once].filter((channel) => !present.has(groupOf(channel)));
    if (missing.length === 0) continue;
    for (const series of await seriesOf(tenant, storm, record)) {
      if (!missing.includes(series.channel)) continue;
      await storeSeries(tenant, { stormId: storm.id, recordId: record.id }, series);
      present.add(groupOf(series.channel));
    }
  }
}

async function seriesOf(tenant: Tenant, storm: Storm, record: StormRecord): Promise<ChannelSeries[]> {
  const window = windowOf(storm);
  const constant = record.provenance?.constant;
  if (constant) return window ? [constantSeries(constant, window)] : [];
  const reading = await readRecord(tenant, record);
  return reading ? channelsIn(reading) : [];
}
