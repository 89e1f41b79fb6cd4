import type { MemoRevision } from "~/db/models/memo-revision.server";
import type { Tenant } from "~/db/scoped.server";

/** The label of the memo's latest revision, where this one no longer is it. */
export async function supersededBy(
  tenant: Tenant,
  revision: Pick<MemoRevision, "memoId" | "sequence">,
): Promise<string | null> {
  const latest = await tenant.memoRevisions.first({
    where: { memoId: revision.memoId },
    order: [["sequence", "DESC"]],
    without: ["pdf", "document"],
  });
  return latest && latest.sequence > revision.sequence ? latest.label : null;
}
