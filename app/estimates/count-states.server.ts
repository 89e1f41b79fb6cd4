import { STATE_NAMES, type StateKind } from "./estimate-state";
import { loadLedger } from "./load-ledger.server";
import type { Tenant } from "~/db/scoped.server";

const ORDER: StateKind[] = ["running", "queued", "current", "outOfDate", "failed"];

/** `4 current · 1 out of date`: the state of a project's estimates in a few words. */
export async function countStates(tenant: Tenant, projectId: string): Promise<string> {
  const project = await tenant.projects.find(projectId);
  const cells = project ? (await loadLedger(tenant, project)).cells : [];
  const counted = ORDER.flatMap((kind) => {
    const count = cells.filter(({ state }) => state.kind === kind).length;
    return count > 0 ? [`${count} ${STATE_NAMES[kind]}`] : [];
  });
  return counted.join(" · ") || "none run yet";
}
