/** What a memo points at, as it stands now. */
import type { Project } from "~/db/models/project.server";
import type { Tenant } from "~/db/scoped.server";
import { estimateCode } from "~/estimates/estimate-code";
import { stateSentence } from "~/estimates/estimate-state";
import { loadResponse, type LoadedResponse } from "~/estimates/load-response.server";
import { estimatesOf } from "./save-memo.server";

export interface PointedEstimate extends LoadedResponse {
  code: string;
}

/** In the memo's order; one that was deleted meanwhile is not among them. */
export async function pointedEstimates(tenant: Tenant, project: Project, memoId: string): Promise<PointedEstimate[]> {
  const pointed: PointedEstimate[] = [];
  for (const id of await estimatesOf(tenant, memoId)) {
    const loaded = await loadResponse(tenant, project, id);
    if (loaded) pointed.push({ ...loaded, code: estimateCode(project.jobNumber, loaded.estimate.number) });
  }
  return pointed;
}

/** What stands in the way of issuing a memo that points at these. */
export function hindrancesOf(pointed: PointedEstimate[]): string[] {
  if (pointed.length === 0) return ["The memo points at no estimate."];
  return pointed
    .filter(({ state }) => state.kind !== "current")
    .map(({ code, state }) => `Estimate ${code} is ${stateSentence(state)}: run it from the ledger first.`);
}
