import type { Cast } from "~/db/models/cast.server";
import type { Tenant } from "~/db/scoped.server";
import { fromBlob } from "~/db/typed-array.server";
import type { CastAnswers, CastReading } from "~/readers/casts/cast-reading";
import { readCast } from "~/readers/casts/read-cast";
import { UnreadableFile } from "~/readers/reading";
import { Recent } from "~/estimates/recent";
import { notFound } from "~/services/guard.server";
import { keepOriginal, type Original } from "~/storms/original.server";
import { StormRefusal } from "~/storms/refusal";
import type { CastLevels } from "./describe-cast";
import type { SalinityScale } from "./water-density";

/** A reading is a pure function of its key, so that it never goes stale; a sheet asks for the same one several times. */
const recent = new Recent<CastReading>(4);

const LEVELS = ["depth", "temperature", "salinity"] as const satisfies (keyof Cast)[];

/** The cast that the address names, in this project; else 404. */
export async function castOf(tenant: Tenant, projectId: string, castId: string): Promise<Cast> {
  return (await tenant.casts.find(castId, { where: { projectId } })) ?? notFound();
}

/** The cast that a column stands on, without its levels; null for one that was typed. */
export async function castBehind(tenant: Tenant, columnId: string): Promise<Cast | null> {
  return tenant.casts.first({ where: { waterColumnId: columnId }, without: LEVELS });
}

function readOriginal({ bytes, name }: Pick<Original, "bytes" | "name">, answers: CastAnswers): CastReading {
  return readCast({ bytes, fileName: name, answers });
}

/**
 * Begins a cast: nothing counts before its sheet is confirmed.
 * @throws StormRefusal where nothing can be read, before anything is saved
 */
export async function startCast(tenant: Tenant, projectId: string, original: Original, userId: string): Promise<Cast> {
  try {
    readOriginal(original, {});
  } catch (error) {
    if (!(error instanceof UnreadableFile)) throw error;
    const messages = error.problems.map(({ message }) => message);
    throw new StormRefusal(
      [`${original.name}: nothing was saved.`, ...messages],
      original.origin === "file" ? "file" : "pasted",
    );
  }
  return tenant.write(async (inner) => {
    const source = await keepOriginal(inner, projectId, original, userId);
    return inner.casts.create({
      projectId,
      sourceFileId: source.id,
      name: original.name.slice(0, 255),
      origin: original.origin,
      answers: {},
      waterColumnId: null,
      provenance: null,
      length: 0,
      depth: null,
      temperature: null,
      salinity: null,
      createdBy: userId,
    });
  });
}

/**
 * The cast's file read with its answers, or with others to see what they would change.
 * @throws UnreadableFile where the answers leave nothing to read
 */
export async function readStoredCast(
  tenant: Tenant,
  cast: Cast,
  answers: CastAnswers = cast.answers,
): Promise<CastReading> {
  const key = JSON.stringify([tenant.organisationId, cast.sourceFileId, cast.name, answers]);
  const known = recent.get(key);
  if (known) return known;
  const source = (await tenant.sourceFiles.find(cast.sourceFileId)) ?? notFound();
  const reading = readOriginal({ bytes: source.bytes, name: cast.name }, answers);
  recent.set(key, reading);
  return reading;
}

/** The levels of a confirmed cast. */
export function levelsOf(cast: Cast, salinityScale: SalinityScale): CastLevels {
  const { depth, temperature, salinity, length } = cast;
  if (!depth || !temperature || !salinity) throw new Error(`Cast ${cast.id} has no levels: it is not confirmed.`);
  return {
    depth: fromBlob(depth, length),
    temperature: fromBlob(temperature, length),
    salinity: fromBlob(salinity, length),
    salinityScale,
  };
}

/** The casts of a project without their levels, in the order they came. */
export async function listCasts(tenant: Tenant, projectId: string): Promise<Cast[]> {
  return tenant.casts.list({
    where: { projectId },
    order: [["createdAt", "ASC"]],
    without: LEVELS,
  });
}

/** The original behind a cast, without its bytes. */
export async function originalFactsOf(tenant: Tenant, { sourceFileId }: Pick<Cast, "sourceFileId">) {
  const source = await tenant.sourceFiles.find(sourceFileId, { without: ["bytes"] });
  return source && { id: source.id, name: source.name, size: source.size, sha256: source.sha256 };
}
