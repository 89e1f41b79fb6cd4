import type { Storm } from "~/db/models/storm.server";
import type { Tenant } from "~/db/scoped.server";
import { loadSeries } from "~/storms/load-series.server";
import { windowOf } from "~/storms/storm-window";
import { overrideFinder } from "./override-finder";
import { judgeSeries, qualityInputs } from "./quality-inputs.server";

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
