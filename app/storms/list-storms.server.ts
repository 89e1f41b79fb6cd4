import { measureBox } from "~/area/measure-box";
import type { Storm } from "~/db/models/storm.server";
import type { StudyBox } from "~/db/models/study-box.server";
import type { Tenant } from "~/db/scoped.server";
import { FORCING_CHANNELS } from "~/quality/gap-rule";
import { loadSeries } from "./load-series.server";
import { withTrack } from "./track-series";
import { windowOf, type StormWindow } from "./storm-window";
import { summariseStorm, type Peak } from "./storm-summary";

export interface StormLine {
  id: string;
  name: string;
  window: StormWindow | null;
  peakWind: Peak | null;
  /** mm; null without a rain record. */
  rainTotal: number | null;
  /** Name of the storm that this one is a scenario of. */
  scenarioOf: string | null;
  /** Where the wind comes from a track: what it is, and of which box the figures are. */
  trackAt: string | null;
  records: { id: string; name: string; state: "reading" | "confirmed" }[];
  /** Pauses that are too long for an estimate to bridge. */
  gaps: number;
}

/** The storms of a project, the latest first; those that still wait for their first record come before. */
export async function listStorms(tenant: Tenant, projectId: string): Promise<StormLine[]> {
  const storms = await tenant.storms.list({ where: { projectId }, order: [["createdAt", "ASC"]] });
  const box = await tenant.studyBoxes.first({
    where: { projectId },
    order: [
      ["createdAt", "ASC"],
      ["id", "ASC"],
    ],
  });
  const lines = await Promise.all(storms.map((storm) => describe(tenant, storm, box)));
  const startOf = (line: StormLine) => line.window?.startsAt ?? Number.POSITIVE_INFINITY;
  return lines.sort((a, b) => (startOf(a) === startOf(b) ? 0 : startOf(b) - startOf(a)));
}

async function describe(tenant: Tenant, storm: Storm, box: StudyBox | null): Promise<StormLine> {
  const [records, recorded] = await Promise.all([
    tenant.records.list({ where: { stormId: storm.id }, order: [["createdAt", "ASC"]] }),
    loadSeries(tenant, storm.id, FORCING_CHANNELS),
  ]);
  const series = withTrack(recorded, storm.track, box && measureBox(box.polygon).centroid);
  const window = windowOf(storm);
  const summary = window && summariseStorm(series, window);
  return {
    id: storm.id,
    name: storm.name,
    window,
    peakWind: summary?.peakWind ?? null,
    rainTotal: summary?.rainTotal ?? null,
    scenarioOf: records.find(({ provenance }) => provenance?.scenario)?.provenance?.scenario?.of ?? null,
    trackAt: trackLine(storm, box),
    records: records.map(({ id, name, state }) => ({ id, name, state })),
    gaps: summary?.gaps.length ?? 0,
  };
}

function trackLine({ track, trackFileId }: Storm, box: StudyBox | null): string | null {
  if (track) return box ? `parametric wind from a track, at ${box.name}` : "parametric wind from a track";
  return trackFileId === null ? null : "a track that waits for an answer";
}
