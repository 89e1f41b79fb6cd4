import { scenarioStorm } from "./build-scenario";
import { partHash } from "./input-parts";
import type { RegisteredRecord } from "./inputs-register";
import { Recent } from "./recent";
import { readForcing, type ReadForcing } from "./storm-forcing";
import { throughTrack } from "./through-track";
import { usedForcing } from "./used-forcing";
import type { Storm } from "~/db/models/storm.server";
import type { Tenant } from "~/db/scoped.server";
import { namesOfUsers } from "~/db/unscoped.server";
import type { Position, ScenarioStorm } from "~/ocean/scenario";
import { judgeSeries, qualityInputs } from "~/quality/quality-inputs.server";
import { registerQuality, type RegisteredQuality } from "~/quality/register-quality";
import { loadSeries } from "~/storms/load-series.server";
import { TRACK_WIND_HEIGHT } from "~/storms/track-series";
import { windowOf } from "~/storms/storm-window";

/** A storm's series as the engine will take them. */
export interface StormReading extends ReadForcing {
  scenarioStorm: ScenarioStorm | null;
  /** Hash of `scenarioStorm`, and of what stands in its way, which a longer window may bring without another sample. */
  hash: string | null;
  records: RegisteredRecord[];
  quality: RegisteredQuality;
}

type Series = Omit<StormReading, "records">;

const recent = new Recent<Series>(64);

/**
 * Reads a storm's series from the database, or from memory while nothing that it depends on changed.
 * @param zone names times in messages
 * @param place where a track's wind is computed, [longitude, latitude]; nothing else depends on it
 * @param leaveOutSuspect as the storm says; the other way round to see what it makes
 */
export async function readStorm(
  tenant: Tenant,
  storm: Storm,
  heatInterpolation: "linear" | "hold",
  zone: string,
  place: Position | null,
  leaveOutSuspect: boolean = storm.leaveOutSuspect,
): Promise<StormReading> {
  const [rows, recordRows] = await Promise.all([
    tenant.series.list({ where: { stormId: storm.id }, without: ["time", "values"], order: [["channel", "ASC"]] }),
    tenant.records.list({ where: { stormId: storm.id, state: "confirmed" }, order: [["createdAt", "ASC"]] }),
  ]);
  const files = await tenant.sourceFiles.list({
    where: { id: recordRows.flatMap(({ sourceFileId }) => sourceFileId ?? []) },
    without: ["bytes"],
  });
  const records = recordRows.map(({ id: recordId, name, origin, sourceFileId, provenance }): RegisteredRecord => {
    const file = files.find(({ id }) => id === sourceFileId);
    return {
      id: recordId,
      name,
      origin,
      sourceFileId,
      fileName: file?.name ?? null,
      sha256: file?.sha256 ?? null,
      provenance,
    };
  });
  const windRecord = rows.find(({ channel }) => channel === "windSpeed")?.recordId;
  const windHeight = recordRows.find(({ id }) => id === windRecord)?.provenance?.windHeight ?? null;
  const { startsAt, endsAt, missingAccepted } = storm;
  const inputs = await qualityInputs(tenant, storm, recordRows);
  const key = JSON.stringify([
    [tenant.organisationId, storm.id, startsAt, endsAt, windHeight, heatInterpolation, zone],
    [leaveOutSuspect, missingAccepted, storm.projectId, inputs.thresholdsVersion, inputs.place],
    inputs.overrides.map(({ id }) => id),
    storm.track && [storm.updatedAt, place],
    rows.map(({ id, updatedAt }) => [id, updatedAt]),
  ]);
  const known = recent.get(key);
  if (known) return { ...known, records };
  const judged = judgeSeries(await loadSeries(tenant, storm.id), inputs);
  const window = windowOf(storm);
  const used = usedForcing(judged, window, { leaveOutSuspect, missingAccepted });
  const tracked = throughTrack(used.channels, storm, place);
  const { channels } = tracked;
  const height = tracked.parametric ? TRACK_WIND_HEIGHT : windHeight;
  const read = readForcing({ channels, windHeight: height, startsAt, endsAt, heatInterpolation }, zone);
  const problems = [...used.problems, ...read.problems];
  const asked = read.forcing && {
    ...scenarioStorm(read.forcing),
    ...(tracked.cyclone && { cyclone: tracked.cyclone }),
  };
  const names = await namesOfUsers(inputs.overrides.map(({ createdBy }) => createdBy));
  const series: Series = {
    forcing: read.forcing,
    problems,
    assumptions: [...tracked.assumptions, ...read.assumptions, ...used.assumptions],
    scenarioStorm: asked,
    hash: asked && partHash(problems.length > 0 ? [asked, problems] : asked),
    quality: registerQuality(judged, window, { ...inputs, leaveOutSuspect, missingAccepted, names }),
  };
  recent.set(key, series);
  return { ...series, records };
}
