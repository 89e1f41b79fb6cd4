import type { MemoRevision } from "~/db/models/memo-revision.server";
import type { Memo } from "~/db/models/memo.server";
import type { Project } from "~/db/models/project.server";
import type { Tenant } from "~/db/scoped.server";
import { notFound } from "~/services/guard.server";

/** The issued revision that the address names, inside its memo and its project; else 404. */
export async function currentRevision(
  tenant: Tenant,
  project: Project,
  params: { memo?: string; revision?: string },
): Promise<{ memo: Memo; revision: MemoRevision }> {
  const memo = await tenant.memos.find(params.memo ?? "", { where: { projectId: project.id } });
  if (!memo) notFound();
  const revision = await tenant.memoRevisions.find(params.revision ?? "", { where: { memoId: memo.id } });
  if (!revision) notFound();
  return { memo, revision };
}
