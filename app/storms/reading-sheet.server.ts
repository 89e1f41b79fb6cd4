import { measureBox } from "~/area/measure-box";
import type { StormRecord } from "~/db/models/record.server";
import type { Storm } from "~/db/models/storm.server";
import type { Tenant } from "~/db/scoped.server";
import type { Position } from "~/ocean/scenario";
import { UnreadableFile, type ReadingAnswers, type SeriesReading } from "~/readers/reading";
import type { ChannelSeries } from "./channel-series";
import { groupLabel, groupOf, type ChannelGroup } from "./channels";
import { channelsIn } from "./confirm-record.server";
import { loadSeries } from "./load-series.server";
import { readRecord } from "./read-record.server";
import { StormRefusal } from "./refusal";
import { proposeWindow, windowOf, type StormWindow } from "./storm-window";

/** Channels that the storm already has from another record: the person says which to use. */
export interface Conflict {
  group: ChannelGroup;
  label: string;
  /** Name of the record that holds it now. */
  heldBy: string;
}

export interface ReadingSheet {
  reading: SeriesReading;
  series: ChannelSeries[];
  /** The storm's own window, else what the record proposes; null where it has no values. */
  window: StormWindow | null;
  /** Whether `window` is a proposal. */
  proposed: boolean;
  conflicts: Conflict[];
  /** Other places of the project where the same bytes are in use. */
  alsoIn: string[];
  /** Middle of the project's first study box, [longitude, latitude] in degrees; null where it has none. */
  boxCentre: Position | null;
}

/** Everything a reading sheet shows; null for a constant, which has none. */
export async function readingSheet(tenant: Tenant, storm: Storm, record: StormRecord): Promise<ReadingSheet | null> {
  const reading = await readRecord(tenant, record);
  if (!reading) return null;
  const series = channelsIn(reading);
  const own = windowOf(storm);
  return {
    reading,
    series,
    window: own ?? proposeWindow(series),
    proposed: own === null,
    conflicts: await conflictsOf(tenant, storm, record, series),
    alsoIn: await otherUses(tenant, record),
    boxCentre: await centreOfFirstBox(tenant, storm.projectId),
  };
}

async function conflictsOf(
  tenant: Tenant,
  storm: Storm,
  record: StormRecord,
  series: readonly ChannelSeries[],
): Promise<Conflict[]> {
  const records = await tenant.records.list({ where: { stormId: storm.id } });
  const brought = new Set(series.map(({ channel }) => groupOf(channel)));
  const held = new Map<ChannelGroup, Conflict>();
  for (const { channel, recordId } of await loadSeries(tenant, storm.id)) {
    const group = groupOf(channel);
    if (recordId === record.id || !brought.has(group)) continue;
    const heldBy = records.find(({ id }) => id === recordId)?.name ?? "another record";
    held.set(group, { group, label: groupLabel(group), heldBy });
  }
  return [...held.values()];
}

async function centreOfFirstBox(tenant: Tenant, projectId: string): Promise<Position | null> {
  const [box] = await tenant.studyBoxes.list({ where: { projectId }, order: [["createdAt", "ASC"]], limit: 1 });
  return box === undefined ? null : measureBox(box.polygon).centroid;
}

async function otherUses(tenant: Tenant, record: StormRecord): Promise<string[]> {
  if (record.sourceFileId === null) return [];
  const others = (await tenant.records.list({ where: { sourceFileId: record.sourceFileId } })).filter(
    ({ id }) => id !== record.id,
  );
  const names = others.map(async ({ stormId, name }) => {
    const storm = await tenant.storms.find(stormId);
    return `${storm?.name ?? "another storm"} (as ${name})`;
  });
  return Promise.all(names);
}

/**
 * Keeps other answers for a record and reads it again.
 * @throws StormRefusal where these answers leave nothing to read; the former ones stay
 */
export async function changeAnswers(
  tenant: Tenant,
  record: StormRecord,
  answers: ReadingAnswers,
): Promise<SeriesReading | null> {
  try {
    const reading = await readRecord(tenant, record, answers);
    await tenant.records.update(record.id, { answers });
    return reading;
  } catch (error) {
    if (!(error instanceof UnreadableFile)) throw error;
    throw new StormRefusal([
      "With these answers nothing can be read:",
      ...error.problems.map(({ message }) => message),
    ]);
  }
}

/** The direction at the strongest wind, to be drawn in both senses; as written, whatever the answer now is. */
export function sampleDirection(reading: SeriesReading): number | null {
  const speed = reading.channels.windSpeed?.values;
  const from = reading.channels.windFrom?.values;
  if (!speed || !from) return null;
  let strongest = -1;
  from.forEach((direction, index) => {
    if (!Number.isFinite(direction) || !Number.isFinite(speed[index])) return;
    if (strongest < 0 || speed[index] > speed[strongest]) strongest = index;
  });
  if (strongest < 0) return null;
  const turned = reading.columns.some(({ role }) => role === "windTowards");
  return turned ? (from[strongest] + 180) % 360 : from[strongest];
}
