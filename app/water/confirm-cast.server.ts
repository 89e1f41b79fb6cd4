import type { Cast } from "~/db/models/cast.server";
import type { Tenant } from "~/db/scoped.server";
import { toBlob } from "~/db/typed-array.server";
import type { CastReading } from "~/readers/casts/cast-reading";
import { StormRefusal } from "~/storms/refusal";
import { provenanceOf, type CastProvenance } from "./cast-provenance";
import { describeCast, type CastDescription, type CastLevels } from "./describe-cast";
import { saveColumn } from "./save-column.server";
import { readStoredCast } from "./stored-cast.server";

/** degrees; pressure at a depth changes by less than 0.6 % with latitude. */
const MIDDLE_LATITUDE = 45;

/** The chosen half as arrays. */
export function levelsIn({ samples, salinityScale }: CastReading): CastLevels {
  return {
    depth: Float64Array.from(samples, ({ depth }) => depth),
    temperature: Float64Array.from(samples, ({ temperature }) => temperature),
    salinity: Float64Array.from(samples, ({ salinity }) => salinity),
    salinityScale,
  };
}

export function describeReading(reading: CastReading, layerDepth: number | null): CastDescription {
  return describeCast(levelsIn(reading), reading.latitude ?? MIDDLE_LATITUDE, layerDepth);
}

/** Whether nothing stands between a reading and its confirmation. */
export function mayConfirm({ questions, problems, samples }: CastReading): boolean {
  const open = questions.some(({ needed }) => needed) || problems.some(({ severity }) => severity === "error");
  return !open && samples.length > 1;
}

export interface CastConfirmation extends Pick<CastProvenance, "layerDepth" | "confirmedBy" | "confirmedAt"> {
  name: string;
  /** Where the numbers come from, in the consultant's words. */
  source: string;
}

/**
 * Turns a cast into a water column, or renews the one it belongs to; all or nothing.
 * @returns id of the column
 * @throws StormRefusal while a question is open or the name is taken
 */
export async function confirmCast(
  tenant: Tenant,
  projectId: string,
  cast: Cast,
  { name, source, ...confirmed }: CastConfirmation,
): Promise<string> {
  const reading = await readStoredCast(tenant, cast);
  if (!mayConfirm(reading)) {
    throw new StormRefusal("Questions are open: answer them on this sheet first. Nothing was taken over.");
  }
  const levels = levelsIn(reading);
  const { below, ...layer } = describeReading(reading, confirmed.layerDepth).twoLayers;
  return tenant.write(async (inner) => {
    const saved = await saveColumn(inner, projectId, cast.waterColumnId, {
      name,
      source,
      ...layer,
      belowTemperature: below?.temperature,
      belowSalinity: below?.salinity,
    });
    if (saved.fieldErrors) throw new StormRefusal(saved.fieldErrors.name, "name");
    await inner.casts.update(cast.id, {
      waterColumnId: saved.id,
      provenance: provenanceOf(reading, confirmed),
      length: levels.depth.length,
      depth: toBlob(levels.depth),
      temperature: toBlob(levels.temperature),
      salinity: toBlob(levels.salinity),
    });
    return saved.id;
  });
}
