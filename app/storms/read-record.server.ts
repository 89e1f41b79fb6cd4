import type { StormRecord } from "~/db/models/record.server";
import type { Tenant } from "~/db/scoped.server";
import { readPastedGrid } from "~/readers/paste-grid";
import { readSeries } from "~/readers/read-series";
import type { ReadingAnswers, SeriesReading } from "~/readers/reading";
import { sha256Of, type Original } from "./original.server";
import { cachedReading } from "./reading-cache.server";

function read({ name, bytes, origin }: Original, answers: ReadingAnswers): SeriesReading {
  return origin === "pasted"
    ? readPastedGrid({ text: new TextDecoder().decode(bytes), answers })
    : readSeries({ bytes, fileName: name, answers });
}

function keyOf(sha256: string, name: string, origin: Original["origin"], answers: ReadingAnswers): string {
  return JSON.stringify([sha256, name, origin, answers]);
}

/** @throws UnreadableFile */
export function readOriginal(original: Original, answers: ReadingAnswers): SeriesReading {
  const key = keyOf(sha256Of(original.bytes), original.name, original.origin, answers);
  return cachedReading(key, () => read(original, answers));
}

/** The original behind a record, without having been read; null for a constant, and in a scenario, which is not read anew. */
export async function originalOf(tenant: Tenant, record: StormRecord): Promise<Original | null> {
  if (record.sourceFileId === null || record.origin === "constant" || record.provenance?.scenario) return null;
  const source = await tenant.sourceFiles.find(record.sourceFileId);
  return source && { name: record.name, bytes: source.bytes, origin: record.origin };
}

/**
 * A record's file read with its answers, or with others to see what they would change.
 * @returns null for a constant, which has no file, and in a scenario
 * @throws UnreadableFile where the answers leave nothing to read
 */
export async function readRecord(
  tenant: Tenant,
  record: StormRecord,
  answers: ReadingAnswers = record.answers,
): Promise<SeriesReading | null> {
  const original = await originalOf(tenant, record);
  return original && readOriginal(original, answers);
}
