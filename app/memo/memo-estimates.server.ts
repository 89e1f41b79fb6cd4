/** What a memo points at, as it stands now. */
import type { Estimate } from "~/db/models/estimate.server";
import type { Project } from "~/db/models/project.server";
import type { Tenant } from "~/db/scoped.server";
import { gatherScenario, type GatheredScenario } from "~/estimates/gather-scenario.server";
import { stateSentence, type EstimateState } from "~/estimates/estimate-state";
import { loadLedger, resultsOf } from "~/estimates/load-ledger.server";
import { readResponse } from "~/estimates/result-store.server";
import type { Response } from "~/ocean/response";
import { estimatesOf } from "./save-memo.server";

export interface PointedEstimate {
  estimate: Estimate;
  code: string;
  state: EstimateState;
  gathered: GatheredScenario;
  /** To the inputs as they are where there is one, else of the last run; null before the first. */
  response: Response | null;
}

export function estimateCode(project: Pick<Project, "jobNumber">, number: number): string {
  return `${project.jobNumber}-${String(number).padStart(2, "0")}`;
}

async function latestResponse(tenant: Tenant, estimate: Estimate, hashNow: string | null): Promise<Response | null> {
  for (const key of resultsOf(estimate, hashNow)) {
    const response = await readResponse(tenant, key);
    if (response) return response;
  }
  return null;
}

/** In the memo's order; one that was deleted meanwhile is not among them. */
export async function pointedEstimates(tenant: Tenant, project: Project, memoId: string): Promise<PointedEstimate[]> {
  const { cells } = await loadLedger(tenant, project);
  const pointed: PointedEstimate[] = [];
  for (const id of await estimatesOf(tenant, memoId)) {
    const cell = cells.find(({ estimate }) => estimate.id === id);
    const gathered = cell && (await gatherScenario(tenant, cell.estimate, project.timeZone));
    if (!cell || !gathered) continue;
    const { estimate, state } = cell;
    const response = await latestResponse(tenant, estimate, gathered.hash);
    pointed.push({ estimate, code: estimateCode(project, estimate.number), state, gathered, response });
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
