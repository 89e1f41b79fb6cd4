import { Piscina } from "piscina";
import type { EstimateOutcome } from "./estimate-outcome";
import { timeLimitSeconds } from "./time-limit";
import type { Scenario } from "~/ocean/scenario";
import { config } from "~/services/config.server";

let pool: Piscina<Scenario, EstimateOutcome> | undefined;

function workers(): Piscina<Scenario, EstimateOutcome> {
  pool ??= new Piscina<Scenario, EstimateOutcome>({
    filename: config().estimateWorkerFile,
    minThreads: 0,
    maxThreads: config().workerThreads,
    idleTimeout: 30_000,
  });
  return pool;
}

/** @throws an AbortError at the time limit; whatever the worker threw and did not mean to */
export function runInPool(scenario: Scenario): Promise<EstimateOutcome> {
  return workers().run(scenario, { signal: AbortSignal.timeout(1000 * timeLimitSeconds(scenario)) });
}

/** Stops the workers; what they were at is rejected. */
export async function closePool(): Promise<void> {
  const open = pool;
  pool = undefined;
  await open?.destroy();
}
