import { plainScenario } from "./scenario-arbitrary";
import { fitContext, type FitContext } from "~/ocean/fit/fit-context";
import { runModel } from "~/ocean/models/run-model";
import type { Scenario } from "~/ocean/scenario";

/** What the indicators see of the plain storm, with some of it changed. */
export function plainFitContext(change: Partial<FitContext> = {}, scenario: Scenario = plainScenario()): FitContext {
  return { ...fitContext(scenario, runModel(scenario)), ...change };
}

/** The plain storm's place with some of it changed. */
export function fitPlace(change: Partial<FitContext["place"]>): FitContext["place"] {
  return { ...plainFitContext().place, ...change };
}

/** The plain storm's method with some of it changed. */
export function fitMethod(change: Partial<FitContext["method"]>): FitContext["method"] {
  return { ...plainFitContext().method, ...change };
}
