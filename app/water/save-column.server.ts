import { UniqueConstraintError } from "sequelize";
import type { Tenant } from "~/db/scoped.server";
import type { WaterValues } from "./water-schema";

type Saved = { id: string; fieldErrors?: undefined } | { fieldErrors: { name: string[] } };

/** Stores a column; `id` null makes a new one. */
export async function saveColumn(
  tenant: Tenant,
  projectId: string,
  id: string | null,
  values: WaterValues,
): Promise<Saved> {
  const row = {
    name: values.name,
    source: values.source,
    temperature: values.temperature,
    salinity: values.salinity,
    salinityScale: values.salinityScale,
    layerDepth: values.layerDepth,
    belowTemperature: values.belowTemperature ?? null,
    belowSalinity: values.belowSalinity ?? null,
  };
  try {
    if (id === null) return await tenant.waterColumns.create({ projectId, ...row });
    await tenant.waterColumns.update(id, row);
    return { id };
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error;
    return { fieldErrors: { name: ["Another water column of this project has this name."] } };
  }
}
