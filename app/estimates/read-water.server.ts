import { castWater, twoLayerWater } from "./build-scenario";
import { partHash } from "./input-parts";
import type { RegisteredWater } from "./inputs-register";
import { Recent } from "./recent";
import type { Cast } from "~/db/models/cast.server";
import type { WaterColumn } from "~/db/models/water-column.server";
import type { Tenant } from "~/db/scoped.server";
import type { ScenarioWater } from "~/ocean/scenario";
import { castBehind, levelsOf, originalFactsOf } from "~/water/stored-cast.server";

/** A water column as the engine will take it. */
export interface WaterReading {
  column: WaterColumn;
  scenarioWater: ScenarioWater;
  /** Hash of `scenarioWater`. */
  hash: string;
  registered: RegisteredWater;
}

type Asked = Pick<WaterReading, "scenarioWater" | "hash">;

const recent = new Recent<Asked>(64);

/** Reads a column with the cast that it stands on, or from memory while no row of the two changed. */
export async function readWater(tenant: Tenant, column: WaterColumn): Promise<WaterReading> {
  const cast = await castBehind(tenant, column.id);
  const key = JSON.stringify([tenant.organisationId, column.id, column.updatedAt, cast?.id, cast?.updatedAt]);
  const asked = recent.get(key) ?? (await ask(tenant, column, cast));
  recent.set(key, asked);
  return { column, ...asked, registered: await register(tenant, column, cast) };
}

async function ask(tenant: Tenant, column: WaterColumn, cast: Cast | null): Promise<Asked> {
  const whole = cast && (await tenant.casts.find(cast.id));
  const scenarioWater = whole
    ? castWater(levelsOf(whole, column.salinityScale), whole.provenance?.layerDepth ?? null)
    : twoLayerWater(column);
  return { scenarioWater, hash: partHash(scenarioWater) };
}

async function register(tenant: Tenant, column: WaterColumn, cast: Cast | null): Promise<RegisteredWater> {
  const { name, source, temperature, salinity, salinityScale, layerDepth, belowTemperature, belowSalinity } = column;
  const layers = { temperature, salinity, salinityScale, layerDepth, belowTemperature, belowSalinity };
  if (!cast?.provenance) return { name, source, ...layers };
  const file = await originalFactsOf(tenant, cast);
  return {
    name,
    source,
    ...layers,
    cast: {
      levels: cast.length,
      sourceFileId: cast.sourceFileId,
      fileName: file?.name ?? cast.name,
      sha256: file?.sha256 ?? "",
      provenance: cast.provenance,
    },
  };
}
