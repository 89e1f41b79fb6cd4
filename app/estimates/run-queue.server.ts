/**
 * Estimates wait here for a worker, the organisations by turns, so that a large ledger of one does not keep the others.
 * The database holds what waits: after a stop the queue is made again from it.
 */
import { gatherScenario } from "./gather-scenario.server";
import type { RunInputs } from "./inputs-register";
import { closePool, runInPool } from "./pool.server";
import { resultIsStored, storeResult } from "./result-store.server";
import { tooLong } from "./time-limit";
import type { Estimate } from "~/db/models/estimate.server";
import { forOrganisation, type Tenant } from "~/db/scoped.server";
import { unfinishedEstimates } from "~/db/unscoped.server";
import type { Scenario, ScenarioProblem } from "~/ocean/scenario";
import { ENGINE_VERSION } from "~/ocean/version";
import { config } from "~/services/config.server";
import { log } from "~/services/log.server";
import { onShutdown } from "~/services/shutdown.server";

/** Organisation → its estimates, first come first served. */
const waiting = new Map<string, string[]>();
const underWay = new Set<Promise<void>>();
let stopping = false;
let registered = false;

/** Puts estimates that stand as `queued` in the database in line. Returns at once. */
export function enqueue(organisationId: string, estimateIds: string[]): void {
  if (!registered) {
    registered = true;
    onShutdown("estimates", stopQueue);
  }
  const line = waiting.get(organisationId) ?? [];
  line.push(...estimateIds.filter((id) => !line.includes(id)));
  waiting.set(organisationId, line);
  startMore();
}

/** After a start: what was queued or running when the process ended is run again. */
export async function resumeEstimates(): Promise<void> {
  for (const { organisationId, id } of await unfinishedEstimates()) {
    await forOrganisation(organisationId).estimates.update(id, { state: "queued" });
    enqueue(organisationId, [id]);
  }
}

/** Settles when nothing is waiting or under way. */
export async function queueIsEmpty(): Promise<void> {
  while (underWay.size > 0) await Promise.all(underWay);
}

/** What is under way stays `running` in the database, to be resumed. */
async function stopQueue(): Promise<void> {
  stopping = true;
  waiting.clear();
  await closePool();
  await Promise.all(underWay);
  stopping = false;
  registered = false;
}

/** The next in turn: its organisation goes to the end of the round. */
function takeNext(): { organisationId: string; id: string } | undefined {
  for (const [organisationId, line] of waiting) {
    const id = line.shift();
    waiting.delete(organisationId);
    if (line.length > 0) waiting.set(organisationId, line);
    if (id !== undefined) return { organisationId, id };
  }
  return undefined;
}

function startMore(): void {
  while (!stopping && underWay.size < config().workerThreads) {
    const next = takeNext();
    if (!next) return;
    const work = runOne(next.organisationId, next.id)
      .catch((error: unknown) => log().error({ err: error, estimate: next.id }, "an estimate could not be run"))
      .finally(() => {
        underWay.delete(work);
        startMore();
      });
    underWay.add(work);
  }
}

/** Claims a queued estimate; null where another run has it, or it is gone. */
async function claim(tenant: Tenant, id: string): Promise<Estimate | null> {
  return tenant.write(async (inner) => {
    const estimate = await inner.estimates.find(id);
    if (estimate?.state !== "queued") return null;
    await inner.estimates.update(id, { state: "running", startedAt: new Date(), finishedAt: null });
    return estimate;
  });
}

interface Ending {
  problems: ScenarioProblem[] | null;
  inputHash: string | null;
  inputs: RunInputs | null;
}

/** One that was queued anew meanwhile keeps waiting. */
async function finish(tenant: Tenant, id: string, { problems, inputHash, inputs }: Ending): Promise<void> {
  await tenant.write(async (inner) => {
    if ((await inner.estimates.find(id))?.state !== "running") return;
    await inner.estimates.update(id, {
      state: problems ? "failed" : "done",
      problems,
      inputHash,
      inputs,
      engineVersion: ENGINE_VERSION,
      finishedAt: new Date(),
    });
  });
}

const FAULT: ScenarioProblem = {
  path: "",
  code: "FAULT",
  message:
    "The run broke off by a fault on our side, which has been recorded. Run it again; if it fails once more, tell us.",
};
const GONE: ScenarioProblem = {
  path: "",
  code: "GONE",
  message: "The study box, storm, water column or method sheet of this estimate is no longer there.",
};

async function problemsOfRun(tenant: Tenant, scenario: Scenario): Promise<ScenarioProblem[] | null> {
  const outcome = await runInPool(scenario);
  if ("problems" in outcome) return outcome.problems;
  await storeResult(tenant, outcome.response);
  return null;
}

async function runOne(organisationId: string, id: string): Promise<void> {
  const tenant = forOrganisation(organisationId);
  const estimate = await claim(tenant, id);
  if (!estimate) return;
  let running: Scenario | null = null;
  let ending: Ending = { problems: [FAULT], inputHash: null, inputs: null };
  try {
    const project = await tenant.projects.find(estimate.projectId);
    const gathered = project && (await gatherScenario(tenant, estimate, project.timeZone));
    if (!gathered) {
      await finish(tenant, id, { ...ending, problems: [GONE] });
      return;
    }
    const { scenario, hash: inputHash, parts, assumptions, register, problems } = gathered;
    ending = { problems: [FAULT], inputHash, inputs: { parts, assumptions, register } };
    if (!scenario || !inputHash || problems.length > 0) {
      ending.problems = problems;
    } else if (await resultIsStored(tenant, { inputHash, engineVersion: ENGINE_VERSION })) {
      ending.problems = null;
    } else {
      running = scenario;
      ending.problems = await problemsOfRun(tenant, scenario);
    }
  } catch (error) {
    if (stopping) return;
    if (running && error instanceof Error && error.name === "AbortError") ending.problems = [tooLong(running)];
    else log().error({ err: error, estimate: id, organisation: organisationId }, "an estimate broke off");
  }
  await finish(tenant, id, ending);
}
