import type { Storm } from "~/db/models/storm.server";
import type { Tenant } from "~/db/scoped.server";
import { loadSeries } from "~/storms/load-series.server";
import { windowOf } from "~/storms/storm-window";
import type { SamplePlace } from "./find-samples";
import { standing, sampleKey } from "./overrides";
import { judgeSeries, qualityInputs, type QualityInputs } from "./quality-inputs.server";

/** A storm's series, judged, with all that they were judged by. */
export async function loadQuality(tenant: Tenant, storm: Storm) {
  const [records, series] = await Promise.all([
    tenant.records.list({ where: { stormId: storm.id, state: "confirmed" }, order: [["createdAt", "ASC"]] }),
    loadSeries(tenant, storm.id),
  ]);
  const inputs = await qualityInputs(tenant, storm, records);
  const judged = judgeSeries(series, inputs);
  return { window: windowOf(storm), records, series, inputs, judged, setAt: overrideFinder(inputs.overrides) };
}

export type LoadedQuality = Awaited<ReturnType<typeof loadQuality>>;
type Overrides = QualityInputs["overrides"];

/** The override that stands on a sample and holds for its value; null where there is none. */
function overrideFinder(overrides: Overrides) {
  const byRecord = new Map<string, ReadonlyMap<string, Overrides[number]>>();
  for (const { recordId } of overrides) {
    if (!byRecord.has(recordId))
      byRecord.set(recordId, standing(overrides.filter((each) => each.recordId === recordId)));
  }
  return ({ judged: { recordId, channel, time, values }, k }: SamplePlace) => {
    const override = byRecord.get(recordId)?.get(sampleKey(channel, time[k]));
    return override && override.flag !== null && override.value === values[k] ? override : null;
  };
}
