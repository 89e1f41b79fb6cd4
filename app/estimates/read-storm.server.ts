import { scenarioStorm } from "./build-scenario";
import { partHash } from "./input-parts";
import type { RegisteredRecord } from "./inputs-register";
import { Recent } from "./recent";
import { readForcing, type ReadForcing } from "./storm-forcing";
import type { Storm } from "~/db/models/storm.server";
import type { Tenant } from "~/db/scoped.server";
import { fromBlob } from "~/db/typed-array.server";
import type { ScenarioStorm } from "~/ocean/scenario";
import type { SampledChannels } from "~/quality/samples";

/** A storm's series as the engine will take them. */
export interface StormReading extends ReadForcing {
  scenarioStorm: ScenarioStorm | null;
  /** Hash of `scenarioStorm`, and of what stands in its way, which a longer window may bring without another sample. */
  hash: string | null;
  records: RegisteredRecord[];
}

type Series = Omit<StormReading, "records">;

const recent = new Recent<Series>(64);

async function channelsOf(tenant: Tenant, stormId: string): Promise<SampledChannels> {
  const rows = await tenant.series.list({ where: { stormId } });
  return Object.fromEntries(
    rows.map(({ channel, time, values, length }) => [
      channel,
      { time: fromBlob(time, length), values: fromBlob(values, length) },
    ]),
  );
}

/**
 * Reads a storm's series from the database, or from memory while no row of them changed.
 * @param zone names times in messages
 */
export async function readStorm(
  tenant: Tenant,
  storm: Storm,
  heatInterpolation: "linear" | "hold",
  zone: string,
): Promise<StormReading> {
  const [rows, recordRows] = await Promise.all([
    tenant.series.list({ where: { stormId: storm.id }, without: ["time", "values"], order: [["channel", "ASC"]] }),
    tenant.records.list({ where: { stormId: storm.id, state: "confirmed" }, order: [["createdAt", "ASC"]] }),
  ]);
  const files = await tenant.sourceFiles.list({
    where: { id: recordRows.flatMap(({ sourceFileId }) => sourceFileId ?? []) },
    without: ["bytes"],
  });
  const records = recordRows.map(({ name, origin, sourceFileId, provenance }): RegisteredRecord => {
    const file = files.find(({ id }) => id === sourceFileId);
    return { name, origin, sourceFileId, fileName: file?.name ?? null, sha256: file?.sha256 ?? null, provenance };
  });
  const windRecord = rows.find(({ channel }) => channel === "windSpeed")?.recordId;
  const windHeight = recordRows.find(({ id }) => id === windRecord)?.provenance?.windHeight ?? null;
  const { startsAt, endsAt } = storm;
  const key = JSON.stringify([
    [tenant.organisationId, storm.id, startsAt, endsAt, windHeight, heatInterpolation, zone],
    rows.map(({ id, updatedAt }) => [id, updatedAt]),
  ]);
  const known = recent.get(key);
  if (known) return { ...known, records };
  const channels = await channelsOf(tenant, storm.id);
  const read = readForcing({ channels, windHeight, startsAt, endsAt, heatInterpolation }, zone);
  const asked = read.forcing && scenarioStorm(read.forcing);
  const series: Series = {
    ...read,
    scenarioStorm: asked,
    hash: asked && partHash(read.problems.length > 0 ? [asked, read.problems] : asked),
  };
  recent.set(key, series);
  return { ...series, records };
}
