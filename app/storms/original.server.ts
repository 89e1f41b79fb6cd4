import { createHash } from "node:crypto";
import type { SourceFile } from "~/db/models/source-file.server";
import type { Tenant } from "~/db/scoped.server";

/** What a person handed over, byte for byte. */
export interface Original {
  name: string;
  bytes: Uint8Array;
  origin: "file" | "pasted";
}

export function sha256Of(bytes: Uint8Array): string {
  return createHash("sha256").update(bytes).digest("hex");
}

/** Keeps the original once a project: the same bytes handed over again are the same row. */
export async function keepOriginal(
  tenant: Tenant,
  projectId: string,
  original: Original,
  uploadedBy: string,
): Promise<SourceFile> {
  const sha256 = sha256Of(original.bytes);
  const known = await tenant.sourceFiles.first({ where: { projectId, sha256 }, without: ["bytes"] });
  if (known) return known;
  return tenant.sourceFiles.create({
    projectId,
    name: original.name.slice(0, 255),
    sha256,
    size: original.bytes.byteLength,
    bytes: Buffer.from(original.bytes.buffer, original.bytes.byteOffset, original.bytes.byteLength),
    uploadedBy,
  });
}

/** Originals that no record, no cast and no track uses any more go, so that nothing is kept that no page can reach. */
export async function dropIfUnused(tenant: Tenant, sourceFileIds: Iterable<string | null>): Promise<void> {
  for (const id of new Set(sourceFileIds)) {
    if (id === null) continue;
    const users = [
      tenant.records.count({ sourceFileId: id }),
      tenant.casts.count({ sourceFileId: id }),
      tenant.storms.count({ trackFileId: id }),
    ];
    const used = (await Promise.all(users)).some((count) => count > 0);
    if (!used) await tenant.sourceFiles.remove({ id });
  }
}
