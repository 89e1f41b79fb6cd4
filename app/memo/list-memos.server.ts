import type { Project } from "~/db/models/project.server";
import type { Tenant } from "~/db/scoped.server";
import { namesOfUsers } from "~/db/unscoped.server";
import { formatDate } from "~/units/format-time";
import { memoNumber } from "./memo-number";

/** A project's memos with their issued revisions, newest first. */
export async function listMemos(tenant: Tenant, project: Project) {
  const memos = await tenant.memos.list({ where: { projectId: project.id }, order: [["number", "DESC"]] });
  const revisions = await tenant.memoRevisions.list({
    where: { memoId: memos.map(({ id }) => id) },
    order: [["sequence", "DESC"]],
    without: ["pdf", "document"],
  });
  const names = await namesOfUsers(memos.map(({ originatorId }) => originatorId));
  return memos.map(({ id, number, title, originatorId }) => ({
    id,
    number: memoNumber(project.jobNumber, number),
    title,
    originator: names.get(originatorId) ?? "",
    revisions: revisions
      .filter(({ memoId }) => memoId === id)
      .map(({ id: revision, label, purpose, issuedAt }) => ({
        id: revision,
        label,
        purpose,
        issued: formatDate(issuedAt, project.timeZone),
      })),
  }));
}
