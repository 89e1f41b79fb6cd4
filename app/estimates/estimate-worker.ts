/** Runs in a worker thread: the engine and nothing else. Its refusals come back as values. */
import type { EstimateOutcome } from "./estimate-outcome";
import { estimate } from "~/ocean/estimate";
import type { Scenario } from "~/ocean/scenario";
import { ScenarioInvalid } from "~/ocean/scenario-invalid";

export default function runEstimate(scenario: Scenario): EstimateOutcome {
  try {
    return { response: estimate(scenario) };
  } catch (error) {
    if (error instanceof ScenarioInvalid) return { problems: error.problems };
    throw error;
  }
}
