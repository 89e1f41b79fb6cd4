import { ProblemList } from "../problem-list";
import { UnreadableFile } from "../reading";
import { openText, type SourceFile } from "../source-file";
import { isoFromSeconds } from "../stamp-text";
import { isArchiveCsv, readArchiveCsv } from "./archive-csv";
import { isDeckText, readDeckText } from "./deck-text";
import { isHeadedText, readHeadedText } from "./headed-text";
import type { RawFix, RawTracks } from "./raw-track";
import type { TrackAnswers, TrackFix, TrackQuestion, TrackReading, TrackStorm } from "./track-reading";

interface TrackForm {
  id: string;
  label: string;
  recognises: (source: SourceFile) => boolean;
  read: (source: SourceFile, answers: TrackAnswers, problems: ProblemList) => RawTracks;
}

const FORMS: readonly TrackForm[] = [
  {
    id: "trackDeck",
    label: "best track, deck text",
    recognises: isDeckText,
    read: (source, _, problems) => readDeckText(source, problems),
  },
  {
    id: "trackHeaded",
    label: "best track, text with a header a storm",
    recognises: isHeadedText,
    read: (source, _, problems) => readHeadedText(source, problems),
  },
  { id: "trackArchive", label: "best track, archive CSV", recognises: isArchiveCsv, read: readArchiveCsv },
];

/** Whether a text is unmistakably a best track. */
export function isTrackText(source: SourceFile): boolean {
  return FORMS.some(({ recognises }) => recognises(source));
}

/**
 * Reads a best track: positions, strongest wind, central pressure and wind radii of one cyclone. Of a file with several
 * storms the one that was answered, else the longest, with the question open.
 * @param input.answers the same bytes, name and answers give the same reading
 * @returns fixes ascending in time, in SI units; longitudes within -180…180
 * @throws UnreadableFile where nothing can be read; its `problems` say why and what to do
 */
export function readTrack(input: { bytes: Uint8Array; fileName: string; answers?: TrackAnswers }): TrackReading {
  const { bytes, fileName, answers = {} } = input;
  const problems = new ProblemList();
  const source = openText(bytes, fileName, problems);
  const form = source && FORMS.find(({ recognises }) => recognises(source));
  if (!source || !form) {
    if (source) {
      problems.add(
        "error",
        "noTrack",
        `“${fileName}” is no best track of a known form`,
        "Give deck text, the hurricane database's text, or the archive's CSV.",
      );
    }
    throw new UnreadableFile(problems.toArray());
  }
  const raw = form.read(source, answers, problems);
  const storms = stormsOf(raw.fixes);
  const longest = [...storms].sort((a, b) => b.fixes - a.fixes)[0];
  const storm = storms.find(({ id }) => id === answers.storm) ?? longest;
  if (!storm) {
    problems.add("error", "onlyHeader", `“${fileName}” has no fixes`, "Give a file with the storm's positions.");
    throw new UnreadableFile(problems.toArray());
  }
  const own = raw.fixes.filter(({ stormId }) => stormId === storm.id);
  const fixes = joined(own);
  const question = stormQuestion(storms, storm, answers);
  return {
    kind: "track",
    format: form.id,
    formatLabel: form.label,
    fileName,
    rows: raw.fixes.length,
    storms,
    storm,
    order: orderOf(own),
    duplicates: own.length - fixes.length,
    fixes,
    averagingMinutes: raw.averagingMinutes,
    understood: [
      { what: "Format", taken: form.label, confidence: "by content" },
      {
        what: "Storm",
        taken: `${storm.id} ${storm.name}`.trim(),
        confidence: answers.storm ? "answered" : "by content",
      },
      { what: "Time zone", taken: "UTC", confidence: "by the format" },
      ...(own.length > fixes.length
        ? [
            {
              what: "Lines of one time",
              taken: `${own.length} lines joined to ${fixes.length} fixes: they add wind radii`,
              confidence: "by the format" as const,
            },
          ]
        : []),
      ...raw.understood,
    ],
    questions: [...(question ? [question] : []), ...raw.questions],
    problems: problems.toArray(),
  };
}

function stormsOf(records: readonly RawFix[]): TrackStorm[] {
  return [...new Set(records.map(({ stormId }) => stormId))].map((id) => {
    const own = records.filter(({ stormId }) => stormId === id);
    const times = own.map(({ fix }) => fix.time);
    // A storm is named late, and by numbers or words for its stage before.
    const named = own.findLast(({ stormName }) => stormName !== "");
    return {
      id,
      name: named?.stormName ?? "",
      fixes: new Set(times).size,
      first: isoFromSeconds(Math.min(...times)),
      last: isoFromSeconds(Math.max(...times)),
    };
  });
}

/** One fix a time, ascending: later lines of a time add wind radii, and what the first did not tell. */
function joined(records: readonly RawFix[]): TrackFix[] {
  const byTime = new Map<number, TrackFix>();
  for (const { fix } of records) {
    const known = byTime.get(fix.time);
    byTime.set(
      fix.time,
      known
        ? {
            ...known,
            maxWind: known.maxWind ?? fix.maxWind,
            centralPressure: known.centralPressure ?? fix.centralPressure,
            radiusOfMaximumWind: known.radiusOfMaximumWind ?? fix.radiusOfMaximumWind,
            ambientPressure: known.ambientPressure ?? fix.ambientPressure,
            radii: [...known.radii, ...fix.radii],
          }
        : fix,
    );
  }
  return [...byTime.values()].sort((a, b) => a.time - b.time);
}

function orderOf(records: readonly RawFix[]): TrackReading["order"] {
  const steps = records.slice(1).map(({ fix }, k) => fix.time - records[k].fix.time);
  if (steps.every((step) => step >= 0)) return "ascending";
  return steps.every((step) => step <= 0) ? "descending" : "unsorted";
}

function stormQuestion(storms: readonly TrackStorm[], storm: TrackStorm, answers: TrackAnswers): TrackQuestion | null {
  if (storms.length < 2) return null;
  return {
    key: "storm",
    needed: answers.storm === undefined,
    message: `The file has ${storms.length} storms. Which one is wanted?`,
    options: storms.map(({ id, name, fixes, first }) => ({
      value: id,
      label: `${id} ${name}, ${fixes} fixes from ${first ?? "an unknown time"}`,
    })),
    suggestion: storm.id,
    ...(answers.storm !== undefined && { answer: answers.storm }),
  };
}
