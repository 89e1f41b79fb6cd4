import type { Tenant } from "~/db/scoped.server";
import { countStates } from "~/estimates/count-states.server";

export interface ProjectPart {
  part: "area" | "storms" | "water" | "estimates" | "memos";
  name: string;
  state: string;
}

function counted(count: number, one: string, many: string, none: string): string {
  return count === 0 ? none : `${count} ${count === 1 ? one : many}`;
}

async function stormState(tenant: Tenant, projectId: string): Promise<string> {
  const storms = await tenant.storms.list({ where: { projectId } });
  const waiting = storms.filter((storm) => storm.startsAt === null).length;
  const all = counted(storms.length, "storm", "storms", "none yet");
  return waiting > 0 ? `${all} · ${waiting} to confirm` : all;
}

async function memoState(tenant: Tenant, projectId: string): Promise<string> {
  const memos = await tenant.memos.list({ where: { projectId } });
  if (memos.length === 0) return "none yet";
  const latest = await tenant.memoRevisions.first({
    where: { memoId: memos.map((memo) => memo.id) },
    order: [["issuedAt", "DESC"]],
    without: ["pdf", "document"],
  });
  return latest ? `Revision ${latest.label} issued` : counted(memos.length, "draft", "drafts", "");
}

/** The five parts in the order of the work, each with its own state in a word or a count. */
export async function projectParts(tenant: Tenant, projectId: string): Promise<ProjectPart[]> {
  const where = { projectId };
  const [boxes, storms, columns, estimates, memos] = await Promise.all([
    tenant.studyBoxes.count(where),
    stormState(tenant, projectId),
    tenant.waterColumns.count(where),
    countStates(tenant, projectId),
    memoState(tenant, projectId),
  ]);
  return [
    { part: "area", name: "Area", state: counted(boxes, "box", "boxes", "no box yet") },
    { part: "storms", name: "Storms", state: storms },
    { part: "water", name: "Water", state: counted(columns, "column", "columns", "no column yet") },
    { part: "estimates", name: "Estimates", state: estimates },
    { part: "memos", name: "Memos", state: memos },
  ];
}
