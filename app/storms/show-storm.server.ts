import type { Storm } from "~/db/models/storm.server";
import type { Tenant } from "~/db/scoped.server";
import { namesOfUsers } from "~/db/unscoped.server";
import { CHANNELS } from "./channels";
import { loadSeries, type StormSeries } from "./load-series.server";
import type { RecordProvenance } from "./provenance";

/** A record as its storm's page lists it. */
export interface ShownRecord {
  id: string;
  name: string;
  origin: "file" | "pasted" | "constant";
  state: "reading" | "confirmed";
  provenance: RecordProvenance | null;
  confirmedByName: string | null;
  /** Labels of the channels that are in use from it now. */
  inUse: string[];
  source: { id: string; size: number; sha256: string } | null;
}

export interface ShownStorm {
  series: StormSeries[];
  records: ShownRecord[];
  /** m; of the record that the wind comes from. */
  windHeight: number | null;
  averagingMinutes: number | null;
  /** How many estimates would go with the storm. */
  estimates: number;
}

export async function showStorm(tenant: Tenant, storm: Storm): Promise<ShownStorm> {
  const [series, records, estimates] = await Promise.all([
    loadSeries(tenant, storm.id),
    tenant.records.list({ where: { stormId: storm.id }, order: [["createdAt", "ASC"]] }),
    tenant.estimates.count({ stormId: storm.id }),
  ]);
  const sourceIds = records.map(({ sourceFileId }) => sourceFileId).filter((id) => id !== null);
  const [sources, names] = await Promise.all([
    tenant.sourceFiles.list({ where: { id: sourceIds }, without: ["bytes"] }),
    namesOfUsers(records.map(({ provenance }) => provenance?.confirmedBy).filter((id) => id !== undefined)),
  ]);
  const wind = series.find(({ channel }) => channel === "windSpeed");
  const windProvenance = records.find(({ id }) => id === wind?.recordId)?.provenance;
  return {
    series,
    records: records.map(({ id, name, origin, state, provenance, sourceFileId }) => {
      const source = sources.find((candidate) => candidate.id === sourceFileId);
      return {
        id,
        name,
        origin,
        state,
        provenance,
        confirmedByName: (provenance && names.get(provenance.confirmedBy)) ?? null,
        inUse: series.filter(({ recordId }) => recordId === id).map(({ channel }) => CHANNELS[channel].label),
        source: source ? { id: source.id, size: source.size, sha256: source.sha256 } : null,
      };
    }),
    windHeight: windProvenance?.windHeight ?? null,
    averagingMinutes: windProvenance?.averagingMinutes ?? null,
    estimates,
  };
}
