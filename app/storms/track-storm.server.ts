import type { SourceFile } from "~/db/models/source-file.server";
import type { Storm } from "~/db/models/storm.server";
import type { Tenant } from "~/db/scoped.server";
import { DEFAULT_TRACK_PARAMETERS } from "~/ocean/cyclone/track-parameters";
import { OceanError } from "~/ocean/errors";
import { UnreadableFile } from "~/readers/reading";
import { readTrack } from "~/readers/tracks/read-track";
import type { TrackAnswers, TrackReading } from "~/readers/tracks/track-reading";
import { keepOriginal, sha256Of, type Original } from "./original.server";
import { StormRefusal } from "./refusal";
import { refitWindow } from "./set-window.server";
import { freeName, STORM_NAME_LENGTH } from "./storm-name";
import { LONGEST_TRACK_DAYS, MOST_FIXES, type StormTrack } from "./storm-track";
import { trackSeries } from "./track-series";

const DAY = 86_400;

interface Saved {
  by: string;
  /** ISO UTC */
  at: string;
}

/** @throws StormRefusal for what is no track: what, where and what to do */
function readOriginalTrack({ bytes, name }: Pick<Original, "bytes" | "name">, answers: TrackAnswers): TrackReading {
  try {
    return readTrack({ bytes, fileName: name, answers });
  } catch (error) {
    if (!(error instanceof UnreadableFile)) throw error;
    const messages = error.problems.map(({ message }) => message);
    throw new StormRefusal([`${name}: nothing was saved.`, ...messages], "file");
  }
}

function trackOf(reading: TrackReading, original: Pick<Original, "bytes">, saved: Saved): StormTrack {
  const { storm, fixes, averagingMinutes, formatLabel, fileName } = reading;
  return {
    cyclone: `${storm.name} ${storm.id}`.trim(),
    fixes,
    averagingMinutes,
    parameters: {
      ...DEFAULT_TRACK_PARAMETERS,
      // A ten-minute mean is what the profiles give.
      averagingFactor: averagingMinutes === 10 ? 1 : DEFAULT_TRACK_PARAMETERS.averagingFactor,
    },
    source: { formatLabel, fileName, sha256: sha256Of(original.bytes) },
    edited: false,
    savedBy: saved.by,
    savedAt: saved.at,
  };
}

/** @throws StormRefusal for a track that no wind can be computed from */
function requireWind(track: StormTrack, field: string): void {
  const { fixes } = track;
  if (fixes.length < 2) throw new StormRefusal("A track needs at least two fixes; this one has one.", field);
  if (fixes.length > MOST_FIXES)
    throw new StormRefusal(`A track may have ${MOST_FIXES} fixes; this one has ${fixes.length}.`, field);
  if (fixes[fixes.length - 1].time - fixes[0].time > LONGEST_TRACK_DAYS * DAY) {
    throw new StormRefusal(`A track may last ${LONGEST_TRACK_DAYS} days.`, field);
  }
  try {
    trackSeries(track, [fixes[0].longitude, fixes[0].latitude]);
  } catch (error) {
    if (!(error instanceof OceanError)) throw error;
    throw new StormRefusal(error.message, field);
  }
}

async function createStorm(
  tenant: Tenant,
  projectId: string,
  name: string,
  given: { proposed: string; track: StormTrack | null; trackFileId: string | null },
): Promise<Storm> {
  const taken = new Set((await tenant.storms.list({ where: { projectId } })).map((storm) => storm.name));
  if (taken.has(name)) throw new StormRefusal(`Another storm of this project is named "${name}".`, "name");
  const storm = await tenant.storms.create({
    projectId,
    name: name || freeName(given.proposed.slice(0, STORM_NAME_LENGTH), taken),
    startsAt: null,
    endsAt: null,
    track: given.track,
    trackFileId: given.trackFileId,
  });
  await refitWindow(tenant, storm);
  return storm;
}

/**
 * Begins a storm with a track's file. Where the file leaves a question open, the storm waits for its answer.
 * @throws StormRefusal before anything is saved
 */
export async function startTrackStorm(
  tenant: Tenant,
  projectId: string,
  request: { name: string; original: Original; saved: Saved },
): Promise<Storm> {
  const { name, original, saved } = request;
  const reading = readOriginalTrack(original, {});
  const open = reading.questions.some(({ needed }) => needed);
  const track = open ? null : trackOf(reading, original, saved);
  if (track) requireWind(track, "file");
  return tenant.write(async (inner) => {
    const source = await keepOriginal(inner, projectId, original, saved.by);
    const proposed = open
      ? original.name.replace(/\.[^.]*$/, "") || "Cyclone"
      : `Cyclone ${track?.cyclone ?? ""}`.trim();
    return createStorm(inner, projectId, name, { proposed, track, trackFileId: source.id });
  });
}

/** Begins a storm with fixes that were typed. @throws StormRefusal */
export async function typeTrackStorm(
  tenant: Tenant,
  projectId: string,
  request: { name: string; fixes: StormTrack["fixes"]; saved: Saved },
): Promise<Storm> {
  const { name, fixes, saved } = request;
  const track: StormTrack = {
    cyclone: "",
    fixes,
    averagingMinutes: null,
    parameters: DEFAULT_TRACK_PARAMETERS,
    source: null,
    edited: false,
    savedBy: saved.by,
    savedAt: saved.at,
  };
  requireWind(track, "fixes");
  return tenant.write((inner) =>
    createStorm(inner, projectId, name, { proposed: "Cyclone from a typed track", track, trackFileId: null }),
  );
}

async function trackFileOf(tenant: Tenant, storm: Storm): Promise<SourceFile | null> {
  return storm.trackFileId === null ? null : tenant.sourceFiles.find(storm.trackFileId);
}

/** The questions of a track's file while no track was taken from it; none after. */
export async function openTrackQuestions(tenant: Tenant, storm: Storm): Promise<TrackReading["questions"]> {
  const file = storm.track ? null : await trackFileOf(tenant, storm);
  return file ? readOriginalTrack(file, {}).questions : [];
}

/** Takes the track from the storm's file by the answers given. @throws StormRefusal */
export async function answerTrack(tenant: Tenant, storm: Storm, answers: TrackAnswers, saved: Saved): Promise<void> {
  const file = await trackFileOf(tenant, storm);
  if (!file) throw new StormRefusal("This storm has no track's file.");
  const reading = readOriginalTrack(file, answers);
  const unanswered = reading.questions.find(({ needed }) => needed);
  if (unanswered) throw new StormRefusal("Choose one.", unanswered.key);
  const track = trackOf(reading, file, saved);
  requireWind(track, reading.questions[0]?.key ?? "storm");
  await saveTrack(tenant, storm, track);
}

/** Keeps a track and its parameters; the window stays where the track still reaches. @throws StormRefusal */
export async function saveTrack(tenant: Tenant, storm: Storm, track: StormTrack): Promise<void> {
  requireWind(track, "fixes");
  await tenant.write(async (inner) => {
    await inner.storms.update(storm.id, { track });
    const saved = await inner.storms.find(storm.id);
    if (saved) await refitWindow(inner, saved);
  });
}
