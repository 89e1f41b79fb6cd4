import type { StormRecord } from "~/db/models/record.server";
import type { SourceFile } from "~/db/models/source-file.server";
import type { Storm } from "~/db/models/storm.server";
import type { Tenant } from "~/db/scoped.server";
import { notFound } from "~/services/guard.server";

/** The storm that the address names, in this project; else 404. */
export async function stormOf(tenant: Tenant, projectId: string, stormId: string): Promise<Storm> {
  return (await tenant.storms.find(stormId, { where: { projectId } })) ?? notFound();
}

/** The record that the address names, in this storm; else 404. */
export async function recordOf(tenant: Tenant, stormId: string, recordId: string): Promise<StormRecord> {
  return (await tenant.records.find(recordId, { where: { stormId } })) ?? notFound();
}

/** The original that the address names, in this project; else 404. */
export async function sourceFileOf(tenant: Tenant, projectId: string, fileId: string): Promise<SourceFile> {
  return (await tenant.sourceFiles.find(fileId, { where: { projectId } })) ?? notFound();
}
