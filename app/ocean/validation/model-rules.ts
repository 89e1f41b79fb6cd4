import { placeOf } from "../box/place";
import { EQUATORIAL_LIMIT } from "../guards";
import { defaultCellSize, defaultTimeStep } from "../method/defaults";
import type { Scenario, ScenarioProblem } from "../scenario";
import { secondsOf } from "../time-stamps";

/** Steps of one estimate that are still worth waiting for. */
const MOST_STEPS = 5e6;
const MOST_CELL_STEPS = 2e9;

/** What the chosen model needs beyond a sound scenario. */
export function modelRules(scenario: Scenario): ScenarioProblem[] {
  const { box, water, method = {} } = scenario;
  const model = method.model ?? "slab";
  const problems: ScenarioProblem[] = [];
  const needs = (path: string, message: string) => problems.push({ path, code: "INVALID_INPUT", message });

  const latitude = placeOf(box).latitude;
  if (model === "budget" && method.ekman !== "finiteDepth" && Math.abs(latitude) < EQUATORIAL_LIMIT) {
    const message = `At ${latitude.toFixed(2)}° the steady Ekman balance of model budget does not hold (within ${EQUATORIAL_LIMIT}° of the equator); use model slab or column.`;
    problems.push({ path: box.polygon ? "box.polygon" : "box.latitude", code: "EQUATORIAL", message });
  }
  if ((model === "coastal" || method.ekman === "finiteDepth") && box.waterDepth === undefined) {
    needs("box.waterDepth", "This method needs the water depth of the box.");
  }
  if (model === "coastal" && box.shoreNormal === undefined) {
    needs("box.shoreNormal", "Model coastal needs the direction of the shore normal, degrees true, pointing offshore.");
  }
  if (model === "column" && !("cast" in water) && !water.below) {
    needs("water.below", "Model column needs a cast, or the temperature and salinity of the water below the layer.");
  }
  return problems.length > 0 ? problems : workProblems(scenario);
}

function workProblems(scenario: Scenario): ScenarioProblem[] {
  const { storm, method = {}, ensemble } = scenario;
  const model = method.model ?? "slab";
  const duration = (secondsOf(storm.time[storm.time.length - 1]) ?? 0) - (secondsOf(storm.time[0]) ?? 0);
  const steps = storm.time.length + duration / (method.timeStep ?? defaultTimeStep(model));
  const runs = ensemble ? ensemble.members + 1 : 1;
  const cells =
    model === "column"
      ? (method.maxDepth ?? scenario.box.waterDepth ?? 200) / (method.cellSize ?? defaultCellSize())
      : 1;
  if (steps <= MOST_STEPS && steps * runs * cells <= MOST_CELL_STEPS) return [];
  const message =
    "This would take too many steps; use a longer time step, larger cells, fewer members or a shorter storm.";
  return [{ path: "method.timeStep", code: "INVALID_INPUT", message }];
}
