import type { WaterColumn } from "~/db/models/water-column.server";
import type { Tenant } from "~/db/scoped.server";
import { estimateCode } from "~/estimates/estimate-code";
import { notFound } from "~/services/guard.server";
import type { TwoLayers } from "./water-density";

/** The column that the address names, in this project; else 404. */
export async function columnOf(tenant: Tenant, projectId: string, columnId: string): Promise<WaterColumn> {
  return (await tenant.waterColumns.find(columnId, { where: { projectId } })) ?? notFound();
}

export function twoLayersOf(column: WaterColumn): TwoLayers {
  const { temperature, salinity, salinityScale, layerDepth, belowTemperature, belowSalinity } = column;
  const known = belowTemperature !== null && belowSalinity !== null;
  const below = known ? { temperature: belowTemperature, salinity: belowSalinity } : null;
  return { temperature, salinity, salinityScale, layerDepth, below };
}

/** The estimates that a column carries, by the codes they are called by; in order. */
export async function estimatesOn(tenant: Tenant, jobNumber: string, columnId: string): Promise<string[]> {
  const estimates = await tenant.estimates.list({ where: { waterColumnId: columnId }, order: [["number", "ASC"]] });
  return estimates.map(({ number }) => estimateCode(jobNumber, number));
}
