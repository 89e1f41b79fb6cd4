import { CAUTION } from "./caution";
import { runEnsemble } from "./ensemble/run-ensemble";
import { OceanError } from "./errors";
import { fitContext } from "./fit/fit-context";
import { fitNotes } from "./fit/fit-notes";
import { recommendModel } from "./fit/recommend-model";
import { headlineOf } from "./headline/headline";
import { responseSeries } from "./headline/response-series";
import { responseColumn } from "./headline/response-column";
import { inputHash } from "./input-hash";
import { describeMethod } from "./method/resolve-method";
import { runModel } from "./models/run-model";
import type { Response } from "./response";
import type { Scenario } from "./scenario";
import { ScenarioInvalid } from "./scenario-invalid";
import { validateScenario } from "./validate-scenario";
import { ENGINE_VERSION } from "./version";

/**
 * What a storm does to the water of a box: the whole model on one page.
 *
 *   box      → latitude, Coriolis parameter, shore
 *   water    → Conservative Temperature and Absolute Salinity of the layer and what lies beneath
 *   storm    → wind at 10 m, interpolated as a vector → stress; rain; heat
 *   method   → every choice that was not made takes its default, and says so
 *   stress   → motion of the layer: steady Ekman, slab or coastal balance; or of every cell of a column
 *   heat, rain → temperature and salinity of the layer, or of every cell
 *   all of it → series, headline figures, triggers, fit notes
 *   members   → the same with uncertain inputs varied: a band beside every figure and series, and what they depend on
 *
 * @throws ScenarioInvalid with every problem found, each with its path, code and what to do
 */
export function estimate(scenario: Scenario): Response {
  const problems = validateScenario(scenario);
  if (problems.length > 0) throw new ScenarioInvalid(problems);
  const run = refusing(() => runModel(scenario));
  const series = responseSeries(scenario, run);
  const fit = fitContext(scenario, run);
  const ensemble = refusing(() => runEnsemble(scenario, run, headlineOf(scenario, run, series)));
  const { model: recommendedModel, reason: recommendation } = recommendModel(fit);
  return {
    ...ensemble,
    series,
    ...(run.column && { column: responseColumn(scenario, run.column) }),
    fitNotes: fitNotes(fit),
    recommendedModel,
    recommendation,
    method: describeMethod(run.method, scenario.method ?? {}),
    budgets: { heat: run.layer.heat, salt: run.layer.salt, momentum: run.motion.momentum },
    inputs: inputHash(scenario),
    engine: ENGINE_VERSION,
    caution: CAUTION,
  };
}

/** A refusal from within a formula becomes a problem of the scenario. */
function refusing<Result>(work: () => Result): Result {
  try {
    return work();
  } catch (error) {
    if (!(error instanceof OceanError)) throw error;
    throw new ScenarioInvalid([{ path: error.path, code: error.code, message: error.message }]);
  }
}
