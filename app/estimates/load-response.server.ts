import { estimateState, type EstimateState } from "./estimate-state";
import { gatherScenario } from "./gather-scenario.server";
import type { InputsRegister } from "./inputs-register";
import { resultsOf } from "./load-ledger.server";
import { readResponse, resultIsStored } from "./result-store.server";
import type { StormForcing } from "./storm-forcing";
import type { Estimate } from "~/db/models/estimate.server";
import type { Project } from "~/db/models/project.server";
import type { Tenant } from "~/db/scoped.server";
import { namesOfUsers } from "~/db/unscoped.server";
import type { Response } from "~/ocean/response";
import { ENGINE_VERSION } from "~/ocean/version";

export interface LoadedResponse {
  estimate: Estimate;
  /** Name of the person who asked for the last run. */
  requestedBy: string;
  state: EstimateState;
  /** To the inputs as they are now where there is one, else of the last run; null where there is none. */
  response: Response | null;
  /** What `response` stands on; where there is none, the inputs as they are. */
  register: InputsRegister;
  assumptions: string[];
  /** Null where the storm's series are no longer those of the response. */
  forcing: StormForcing | null;
}

/**
 * An estimate of a project with its response.
 * @param profiles false leaves the column's profiles in the database
 * @returns null where the project has no such estimate
 */
export async function loadResponse(
  tenant: Tenant,
  project: Pick<Project, "id" | "timeZone">,
  estimateId: string,
  { profiles = true } = {},
): Promise<LoadedResponse | null> {
  const estimate = await tenant.estimates.find(estimateId, { where: { projectId: project.id } });
  const now = estimate && (await gatherScenario(tenant, estimate, project.timeZone));
  if (!estimate || !now) return null;
  const responseStored =
    now.hash !== null && (await resultIsStored(tenant, { inputHash: now.hash, engineVersion: ENGINE_VERSION }));
  const parts = estimate.inputs?.parts ?? null;
  const state = estimateState(
    { state: estimate.state, problems: estimate.problems, parts, engineVersion: estimate.engineVersion },
    { parts: now.parts, engineVersion: ENGINE_VERSION, responseStored },
  );
  let response: Response | null = null;
  for (const key of resultsOf(estimate, now.hash)) response ??= await readResponse(tenant, key, { profiles });
  const stands = response && response.inputs !== now.hash && estimate.inputs ? estimate.inputs : now;
  const sameStorm = !response || response.inputs === now.hash || parts?.storm === now.parts?.storm;
  return {
    estimate,
    requestedBy: (await namesOfUsers([estimate.requestedBy])).get(estimate.requestedBy) ?? "",
    state,
    response,
    register: stands.register,
    assumptions: stands.assumptions,
    forcing: sameStorm ? now.forcing : null,
  };
}
