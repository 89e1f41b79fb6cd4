import type { Project } from "~/db/models/project.server";
import type { Tenant } from "~/db/scoped.server";
import { estimateCode } from "~/estimates/estimate-code";
import { stateSentence } from "~/estimates/estimate-state";
import { loadLedger } from "~/estimates/load-ledger.server";

/** The estimates that a memo of this project can point at. */
export async function estimateChoices(tenant: Tenant, project: Project) {
  const { cells, boxes, storms } = await loadLedger(tenant, project);
  return cells.map(({ estimate, state }) => {
    const box = boxes.find(({ id }) => id === estimate.studyBoxId)?.name ?? "";
    const storm = storms.find((entry) => entry.storm.id === estimate.stormId)?.storm.name ?? "";
    return {
      id: estimate.id,
      code: estimateCode(project.jobNumber, estimate.number),
      name: `${box}, ${storm}`,
      state: stateSentence(state),
    };
  });
}
